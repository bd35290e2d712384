/** Figures of merit computed from counts: fringe visibility and its budget, Bell test, error rates, secret key, photon statistics, benchmark. */
package binspan.merit;

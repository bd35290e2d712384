/**
 * Figures of merit computed from counts: fringe visibility and its budget, Bell test, error rates, secret key, photon statistics, repeaterless bound.
 * Rates are in 1/s, error rates and visibilities are bare numbers, keys are in bits. Published methods that differ, such as the finite-key bounds, are
 * constants of an enumeration, each with its reference.
 */
package binspan.merit;

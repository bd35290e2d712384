/**
 * What light and fibre do to a pair before it is counted: joint spectrum, losses, dispersion, stray light, arrival times and their windows,
 * analyzer paths and two-photon coherence. SI units inside; angular frequencies are detunings from the band centres in rad/s.
 */
package binspan.optics;

package binspan.scenario;

/**
 * Measuring times.
 *
 * @param durationS wall-clock time of a key or Bell run, s
 * @param uptimeShare share of it in which the link works
 * @param fringePoints phase settings of a fringe scan
 * @param secondsPerPoint measuring time at each, s
 */
public record Acquisition(double durationS, double uptimeShare, int fringePoints, double secondsPerPoint) {}

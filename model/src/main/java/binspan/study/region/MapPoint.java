package binspan.study.region;

/**
 * A point of a map.
 *
 * @param x value of the first parameter, in its unit
 * @param y value of the second parameter
 */
public record MapPoint(double x, double y) {}

package binspan.planner.plot;

/**
 * A pair of values in the units of the axes.
 *
 * @param x along the horizontal axis
 * @param y along the vertical axis, NaN for a gap
 */
public record Point(double x, double y) {}

package binspan.planner.plot;

/**
 * A labelled value of an axis, for example the planned one.
 *
 * @param label what it is
 * @param value where it is
 */
public record Mark(String label, double value) {}

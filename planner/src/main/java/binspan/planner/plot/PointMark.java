package binspan.planner.plot;

/**
 * A labelled point of a map.
 *
 * @param label what it is, for example {@code as planned}
 * @param point where it is
 */
public record PointMark(String label, Point point) {}

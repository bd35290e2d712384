package binspan.planner.plot;

/**
 * A labelled rectangle on a map, for example a tolerance box.
 *
 * @param label what it is
 * @param x its sides along the horizontal axis
 * @param y its sides along the vertical axis
 */
public record BoxOutline(String label, Interval x, Interval y) {}

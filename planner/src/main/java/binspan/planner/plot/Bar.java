package binspan.planner.plot;

/**
 * A bar of a ranking.
 *
 * @param value its end; NaN for no bar
 * @param met whether what it shows meets the requirements: filled, otherwise hatched
 * @param text words at its end, empty for none
 */
public record Bar(double value, boolean met, String text) {}

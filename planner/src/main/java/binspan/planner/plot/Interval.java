package binspan.planner.plot;

/**
 * A stretch of an axis.
 *
 * @param lower lower end
 * @param upper upper end, not below the lower one
 */
public record Interval(double lower, double upper) {
    /** Checks the order of the ends. */
    public Interval {
        if (!(lower <= upper)) {
            throw new IllegalArgumentException("interval from " + lower + " to " + upper);
        }
    }
}

package binspan.planner.plot;

/**
 * A bar of a histogram.
 *
 * @param lower lower end
 * @param upper upper end, above the lower one
 * @param count how many lie between them
 */
public record Bin(double lower, double upper, double count) {
    /** Checks the order of the ends. */
    public Bin {
        if (!(lower < upper)) {
            throw new IllegalArgumentException("bin from " + lower + " to " + upper);
        }
    }
}

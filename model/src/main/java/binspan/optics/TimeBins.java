package binspan.optics;

/**
 * Bins of equal width along a time axis.
 *
 * @param start start of the first bin, s
 * @param width width of each bin, s, above 0
 * @param count number of bins, 1 or more
 */
public record TimeBins(double start, double width, int count) {
    /**
     * Checks the bins.
     *
     * @throws IllegalArgumentException if the width is not above 0 and finite, the start not finite or there is no bin
     */
    public TimeBins {
        if (!(Double.isFinite(start) && width > 0.0 && Double.isFinite(width) && count >= 1)) {
            throw new IllegalArgumentException("found " + count + " bins of " + width + " s from " + start
                    + " s; allowed 1 or more of finite width");
        }
    }

    /** Edge of a bin: the start of bin {@code index}, the end of all for the count, s. */
    public double edge(int index) {
        return start + index * width;
    }

    /** Middle of a bin, s. */
    public double middle(int index) {
        return start + (index + 0.5) * width;
    }

    /** End of the last bin, s. */
    public double end() {
        return edge(count);
    }

    /** One bin as a window. */
    public Window bin(int index) {
        return new Window(edge(index), edge(index + 1));
    }

    /** The same bins at a later time. */
    public TimeBins shifted(double later) {
        return new TimeBins(start + later, width, count);
    }
}

package binspan.optics;

/**
 * A time window about the mean arrival.
 *
 * @param from start, s
 * @param to end, s
 */
public record Window(double from, double to) {
    /**
     * A window of the given full width whose centre lies off the mean arrival.
     *
     * @param width full width, s
     * @param late how late the photons arrive against the centre, s
     */
    public static Window of(double width, double late) {
        return new Window(-width / 2.0 - late, width / 2.0 - late);
    }

    /** The same window at a later time. */
    public Window shifted(double later) {
        return new Window(from + later, to + later);
    }
}

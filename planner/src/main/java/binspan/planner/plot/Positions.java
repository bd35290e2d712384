package binspan.planner.plot;

import java.util.stream.DoubleStream;
import org.jfree.data.Range;

/** The stretch of positions that an axis shows. */
final class Positions {
    private static final double LEAST_SHARE = 1e-9;

    private Positions() {}

    /**
     * From the lowest to the highest value, with a margin where the axis states no end itself.
     *
     * @param axis its stated ends count first
     * @param values what has to be seen; values without a place are left out
     * @param margin share of the length to add at each end that is not stated
     */
    static Range of(Axis axis, DoubleStream values, double margin) {
        var found = values.map(axis::position).filter(Double::isFinite).summaryStatistics();
        boolean any = found.getCount() > 0;
        double lower = stated(axis, axis.lowest(), any ? found.getMin() : 0.0);
        double upper = stated(axis, axis.highest(), any ? found.getMax() : 1.0);
        if (!(upper - lower > LEAST_SHARE * Math.max(Math.abs(lower), Math.abs(upper)))) {
            double half = axis.logarithmic() ? 0.5 : lower == 0.0 ? 1.0 : 0.1 * Math.abs(lower);
            boolean zero = !axis.logarithmic() && lower == 0.0;
            lower = Double.isNaN(axis.lowest()) && !zero ? Math.min(lower, upper) - half : lower;
            upper = Double.isNaN(axis.highest()) ? Math.max(lower, upper) + half : upper;
            upper = upper > lower ? upper : lower + half;
        }
        return widened(axis, lower, upper, margin);
    }

    private static double stated(Axis axis, double end, double otherwise) {
        return Double.isNaN(end) ? otherwise : axis.position(end);
    }

    /** Values that cannot be negative do not get an axis that is. */
    private static Range widened(Axis axis, double lower, double upper, double margin) {
        double more = margin * (upper - lower);
        boolean touchesZero = !axis.logarithmic() && lower >= 0.0 && lower < more;
        double low = !Double.isNaN(axis.lowest()) ? lower : touchesZero ? 0.0 : lower - more;
        return new Range(low, Double.isNaN(axis.highest()) ? upper + more : upper);
    }
}

package binspan.prediction;

import java.util.DoubleSummaryStatistics;
import java.util.Locale;
import java.util.stream.DoubleStream;

/** A range of values: of a prediction over what is assumed, or of a report with its uncertainty. */
record Interval(double low, double high) {
    static Interval of(DoubleStream values) {
        DoubleSummaryStatistics statistics = values.summaryStatistics();
        return new Interval(statistics.getMin(), statistics.getMax());
    }

    static Interval about(double value, double error) {
        return new Interval(value - error, value + error);
    }

    boolean overlaps(Interval other) {
        return low <= other.high && other.low <= high;
    }

    double middle() {
        return (low + high) / 2.0;
    }

    String text() {
        return high - low < 1e-6 * Math.abs(high) ? figure(high) : figure(low) + " to " + figure(high);
    }

    static String figure(double value) {
        return Math.abs(value) >= 100.0
                ? String.format(Locale.ROOT, "%.1f", value)
                : String.format(Locale.ROOT, "%.4g", value);
    }
}

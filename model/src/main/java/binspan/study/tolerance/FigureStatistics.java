package binspan.study.tolerance;

import binspan.study.FigureColumn;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoublePredicate;

/**
 * How one figure of merit comes out over the builds.
 *
 * @param column the figure
 * @param mean mean of the finite values; NaN if there is none
 * @param standardDeviation their standard deviation (n - 1); NaN with fewer than two
 * @param quantiles values below which the {@link #SHARES} of the builds lie, infinite ones sorted in as such, those without the figure left out; linear
 *     between neighbours (type 7 of Hyndman and Fan, The American Statistician 50, 361, 1996); NaN if no build has the figure
 * @param infinite number of builds in which it is infinite
 * @param undefined number of builds in which it does not apply
 */
public record FigureStatistics(
        FigureColumn column,
        double mean,
        double standardDeviation,
        List<Double> quantiles,
        int infinite,
        int undefined) {
    /** Shares of the builds below the quantiles. */
    public static final List<Double> SHARES = List.of(0.01, 0.05, 0.25, 0.5, 0.75, 0.95, 0.99);

    /**
     * The statistics of a figure.
     *
     * @param values its value in every build; they are sorted
     */
    static FigureStatistics of(FigureColumn column, double[] values) {
        Arrays.sort(values);
        int undefined = count(values, Double::isNaN);
        int lowest = count(values, each -> each == Double.NEGATIVE_INFINITY);
        int highest = count(values, each -> each == Double.POSITIVE_INFINITY);
        int defined = values.length - undefined;
        double[] finite = Arrays.copyOfRange(values, lowest, defined - highest);
        double mean = mean(finite);
        return new FigureStatistics(
                column,
                mean,
                deviation(finite, mean),
                SHARES.stream().map(share -> quantile(values, defined, share)).toList(),
                lowest + highest,
                undefined);
    }

    private static int count(double[] values, DoublePredicate which) {
        return (int) Arrays.stream(values).filter(which).count();
    }

    /** The mean, exact where all values are equal. */
    private static double mean(double[] values) {
        double sum = 0.0;
        for (double each : values) {
            sum += each - values[0];
        }
        return values.length > 0 ? values[0] + sum / values.length : Double.NaN;
    }

    private static double deviation(double[] values, double mean) {
        double sum = 0.0;
        for (double each : values) {
            sum += (each - mean) * (each - mean);
        }
        return values.length > 1 ? Math.sqrt(sum / (values.length - 1)) : Double.NaN;
    }

    private static double quantile(double[] sorted, int count, double share) {
        if (count == 0) {
            return Double.NaN;
        }
        double place = share * (count - 1);
        int below = (int) place;
        double part = place - below;
        double low = sorted[below];
        return part == 0.0 || low == sorted[below + 1] ? low : low + part * (sorted[below + 1] - low);
    }
}

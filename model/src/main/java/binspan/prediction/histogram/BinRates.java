package binspan.prediction.histogram;

import java.util.Arrays;
import java.util.List;

/** Events per second in each bin of a histogram. */
public final class BinRates {
    private final double[] values;

    /** Takes an array that nobody changes any more. */
    BinRates(double[] values) {
        this.values = values;
    }

    /** The sum of several over the same bins. */
    static BinRates sum(List<BinRates> each) {
        double[] sum = each.get(0).toArray();
        for (BinRates rates : each.subList(1, each.size())) {
            for (int i = 0; i < sum.length; i++) {
                sum[i] += rates.values[i];
            }
        }
        return new BinRates(sum);
    }

    /** Number of bins. */
    public int count() {
        return values.length;
    }

    /** Events per second in a bin, 1/s. */
    public double at(int bin) {
        return values[bin];
    }

    /** Events per second in all bins, 1/s. */
    public double total() {
        return Arrays.stream(values).sum();
    }

    /**
     * Events per second in some bins.
     *
     * @param first first of them
     * @param end the one after the last
     */
    public double total(int first, int end) {
        return Arrays.stream(values, first, end).sum();
    }

    /** A copy of all values, 1/s. */
    public double[] toArray() {
        return values.clone();
    }

    /** Both added bin by bin. */
    public BinRates plus(BinRates other) {
        return sum(List.of(this, other));
    }
}

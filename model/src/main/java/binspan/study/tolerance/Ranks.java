package binspan.study.tolerance;

import java.util.Arrays;

/** Ranks of samples, equal values sharing the mean of theirs. */
final class Ranks {
    private Ranks() {}

    /** Twice the rank of every value, which is whole even where ranks are shared; ranks begin with 1. NaN is not allowed. */
    static int[] doubled(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        int[] ranks = new int[values.length];
        for (int i = 0; i < ranks.length; i++) {
            int first = firstNotBelow(sorted, values[i]);
            ranks[i] = first + firstAbove(sorted, first, values[i]) + 1;
        }
        return ranks;
    }

    private static int firstNotBelow(double[] sorted, double value) {
        int from = 0;
        int to = sorted.length;
        while (from < to) {
            int middle = (from + to) >>> 1;
            if (sorted[middle] < value) {
                from = middle + 1;
            } else {
                to = middle;
            }
        }
        return from;
    }

    /** The first above a value that stands at a place; one step where it stands there alone, a search where many are equal. */
    private static int firstAbove(double[] sorted, int place, double value) {
        int from = place;
        int to = place + 1;
        while (to < sorted.length && sorted[to] <= value) {
            from = to;
            to = (int) Math.min(sorted.length, 2L * to - place + 1);
        }
        while (from + 1 < to) {
            int middle = (from + to) >>> 1;
            if (sorted[middle] <= value) {
                from = middle;
            } else {
                to = middle;
            }
        }
        return to;
    }

    /**
     * The rank correlation of Spearman (1904): the linear correlation of the ranks, -1 to 1; NaN where all values of one side are equal.
     *
     * @param a doubled ranks of one side
     * @param b doubled ranks of the other, as many
     */
    static double correlation(int[] a, int[] b) {
        double mean = a.length + 1.0;
        double ab = 0.0;
        double aa = 0.0;
        double bb = 0.0;
        for (int i = 0; i < a.length; i++) {
            double da = a[i] - mean;
            double db = b[i] - mean;
            ab += da * db;
            aa += da * da;
            bb += db * db;
        }
        return ab / Math.sqrt(aa * bb);
    }
}

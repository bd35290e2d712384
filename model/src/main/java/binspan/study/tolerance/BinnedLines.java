package binspan.study.tolerance;

/** The mean of results given one parameter: a straight line of least squares in each of some bins of equally many samples along the parameter. */
final class BinnedLines {
    private final double[] x;
    private final int[] bin;
    private final int[] counts;
    private final double[] meanX;
    private final double[] meanY;
    private final double[] slope;
    private final int coefficients;

    /**
     * Fits the lines.
     *
     * @param x values of the parameter
     * @param ranks their doubled ranks; equal values share a bin, so that some bins may be empty
     * @param y results
     */
    BinnedLines(double[] x, int[] ranks, double[] y) {
        int bins = (int) Math.round(Math.cbrt(x.length));
        this.x = x;
        this.bin = ranks.clone();
        this.counts = new int[bins];
        for (int i = 0; i < bin.length; i++) {
            bin[i] = (int) ((bin[i] - 1L) * bins / (2L * bin.length));
            counts[bin[i]]++;
        }
        this.meanX = means(x);
        this.meanY = means(y);
        this.slope = new double[bins];
        this.coefficients = incline(y);
    }

    private double[] means(double[] values) {
        double[] means = new double[counts.length];
        for (int i = 0; i < values.length; i++) {
            means[bin[i]] += values[i];
        }
        for (int k = 0; k < means.length; k++) {
            means[k] /= counts[k];
        }
        return means;
    }

    /** Finds the slopes, 0 in a bin of equal values, and counts the coefficients. */
    private int incline(double[] y) {
        double[] xx = new double[counts.length];
        for (int i = 0; i < y.length; i++) {
            double deviation = x[i] - meanX[bin[i]];
            xx[bin[i]] += deviation * deviation;
            slope[bin[i]] += deviation * (y[i] - meanY[bin[i]]);
        }
        int number = 0;
        for (int k = 0; k < xx.length; k++) {
            slope[k] = xx[k] > 0.0 ? slope[k] / xx[k] : 0.0;
            number += Math.min(counts[k], xx[k] > 0.0 ? 2 : 1);
        }
        return number;
    }

    /** Number of coefficients of all lines. */
    int coefficients() {
        return coefficients;
    }

    /** The mean at the place of a sample. */
    double at(int sample) {
        int k = bin[sample];
        return meanY[k] + slope[k] * (x[sample] - meanX[k]);
    }
}

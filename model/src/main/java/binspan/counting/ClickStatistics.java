package binspan.counting;

/**
 * Click probabilities of threshold detectors under light of K equal Schmidt modes (K infinite: Poisson), all pair numbers included; complements are
 * computed without cancellation, so that 1e-12 is as exact as 0.1.
 *
 * <p>With detected photons n, noise clicks d and detected pairs c in a pair of windows: P0(a) = e^-d (1 + n/K)^-K and P0(a,b) =
 * e^-(d_a + d_b) [(1 + n_a/K)(1 + n_b/K) - c/K]^-K, where for a two-mode squeezed vacuum of mean mu the detected pairs are c = eta_a eta_b mu (1 +
 * mu/K). Method: Takeoka, Jin, Sasaki, New J. Phys. 17, 043030 (2015).
 */
public final class ClickStatistics {
    /** Below it the series of {@link #seriesLog1p} and {@link #seriesExpm1} are exact to rounding, and several times quicker. */
    private static final double SMALL = 0.02;

    /** Below it four terms are enough. */
    private static final double TINY = 1e-4;

    private ClickStatistics() {}

    /**
     * Natural logarithm of the probability of no click.
     *
     * @param photons mean detected photons n in the window
     * @param noise mean noise clicks d in the window
     * @param modes Schmidt number K, 1 or more, may be infinite
     */
    public static double logNoClick(double photons, double noise, double modes) {
        return Double.isInfinite(modes) ? -noise - photons : -noise - modes * Math.log1p(photons / modes);
    }

    /**
     * Probability of a click, 1 - P0.
     *
     * @param photons mean detected photons n in the window
     * @param noise mean noise clicks d in the window
     * @param modes Schmidt number K
     */
    public static double click(double photons, double noise, double modes) {
        double x = photons / modes;
        double exponent = x < SMALL && x > 0.0 ? noise + modes * seriesLog1p(x) : -logNoClick(photons, noise, modes);
        return exponent < SMALL ? -seriesExpm1(-exponent) : -Math.expm1(-exponent);
    }

    /**
     * How much more likely no click on both sides is than if the sides were independent: [1 - (c/K)/((1 + n_a/K)(1 + n_b/K))]^-K - 1.
     *
     * @param pairs mean detected pairs c
     * @param spread (1 + n_a/K)(1 + n_b/K); 1 for infinite K
     * @param modes Schmidt number K
     */
    public static double correlation(double pairs, double spread, double modes) {
        double exponent = Double.isInfinite(modes) ? pairs : exponent(pairs / (modes * spread), modes);
        return exponent < SMALL ? seriesExpm1(exponent) : Math.expm1(exponent);
    }

    /** -K log1p(-x). */
    private static double exponent(double x, double modes) {
        return -modes * (x < SMALL ? seriesLog1p(-x) : Math.log1p(-x));
    }

    /** ln(1 + x) for |x| below {@value #SMALL}; what is left out is below 1e-17 of it. */
    private static double seriesLog1p(double x) {
        double tail = Math.abs(x) < TINY
                ? 1.0 / 4
                : 1.0 / 4 - x * (1.0 / 5 - x * (1.0 / 6 - x * (1.0 / 7 - x * (1.0 / 8 - x * (1.0 / 9)))));
        return x * (1.0 - x * (1.0 / 2 - x * (1.0 / 3 - x * tail)));
    }

    /** e^x - 1 for |x| below {@value #SMALL}; what is left out is below 1e-17 of it. */
    private static double seriesExpm1(double x) {
        double tail = Math.abs(x) < TINY ? 1.0 / 24 : 1.0 / 24 + x * (1.0 / 120 + x * (1.0 / 720 + x * (1.0 / 5040)));
        return x * (1.0 + x * (1.0 / 2 + x * (1.0 / 6 + x * tail)));
    }

    /**
     * Mean pairs c of a bin as the click formula takes them, b = mu (1 + mu/K).
     *
     * @param meanPairs mean pairs mu of the bin
     * @param modes Schmidt number K
     */
    public static double bunched(double meanPairs, double modes) {
        return meanPairs * (1.0 + meanPairs / modes);
    }

    /**
     * Probability that both of two windows click.
     *
     * @param photonsA detected photons in the first
     * @param noiseA noise clicks in the first
     * @param photonsB detected photons in the second
     * @param noiseB noise clicks in the second
     * @param pairs detected pairs c
     * @param modes Schmidt number K
     */
    public static double coincidence(
            double photonsA, double noiseA, double photonsB, double noiseB, double pairs, double modes) {
        double clickA = click(photonsA, noiseA, modes);
        double clickB = click(photonsB, noiseB, modes);
        double spread = (1.0 + photonsA / modes) * (1.0 + photonsB / modes);
        return clickA * clickB + (1.0 - clickA) * (1.0 - clickB) * correlation(pairs, spread, modes);
    }
}

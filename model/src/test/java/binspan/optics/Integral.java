package binspan.optics;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.special.Erf;

/** Numerical integrals that the captures of the model are held against: adaptive, piece by piece between given breaks. */
final class Integral {
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final IterativeLegendreGaussIntegrator RULE =
            new IterativeLegendreGaussIntegrator(24, 1e-11, 1e-300, 2, 60);

    private Integral() {}

    /** Integral between the first and the last of increasing breaks; pieces of no more than rounding are left out. */
    static double over(UnivariateFunction function, double... breaks) {
        double rounding = 1e-20 * (breaks[breaks.length - 1] - breaks[0]);
        double sum = 0.0;
        for (int i = 0; i + 1 < breaks.length; i++) {
            double width = breaks[i + 1] - breaks[i];
            if (width > rounding && width > 1e-13 * Math.max(Math.abs(breaks[i]), Math.abs(breaks[i + 1]))) {
                sum += RULE.integrate(1_000_000, function, breaks[i], breaks[i + 1]);
            }
        }
        return sum;
    }

    /** Normal probability between two limits in units of the rms. */
    static double normal(double from, double to) {
        return 0.5 * Erf.erf(from / SQRT_TWO, to / SQRT_TWO);
    }

    /** Normal density. */
    static double density(double x) {
        return Math.exp(-x * x / 2.0) / Math.sqrt(2.0 * Math.PI);
    }
}

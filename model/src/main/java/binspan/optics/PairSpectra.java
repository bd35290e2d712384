package binspan.optics;

import org.apache.commons.numbers.gamma.Erfc;

/** Computes joint spectra; the formulas stand with {@link PairSpectrum}. */
public final class PairSpectra {
    private static final double SQRT_TWO_PI = Math.sqrt(2.0 * Math.PI);
    private static final double HARDLY_EVER = 1e-12;

    private PairSpectra() {}

    /** The joint spectrum of the given filters and pump. */
    public static PairSpectrum of(SpectrumInputs in) {
        if (in.pumpRms() == 0.0) {
            return continuous(in);
        }
        return in.alice().gaussian() && in.bob().gaussian() ? gaussian(in) : boxed(in);
    }

    /** Continuous pump: W_B = -W_A with the product of both transmissions as density, K infinite. */
    private static PairSpectrum continuous(SpectrumInputs in) {
        Passband both = in.alice().and(in.bob());
        double variance = both.variance();
        double area = both.area();
        return complete(
                in,
                variance,
                variance,
                -variance,
                area / in.alice().area(),
                area / in.bob().area());
    }

    /** Gaussian filters and pump: closed forms; h_BA = s_B / sqrt(s_A^2 + s_B^2 + s_P^2). */
    private static PairSpectrum gaussian(SpectrumInputs in) {
        double a = in.alice().variance();
        double b = in.bob().variance();
        double p = in.pumpRms() * in.pumpRms();
        double sum = a + b + p;
        return complete(in, a * (b + p) / sum, b * (a + p) / sum, -a * b / sum, Math.sqrt(b / sum), Math.sqrt(a / sum));
    }

    private static PairSpectrum boxed(SpectrumInputs in) {
        SpectralGrid grid = SpectralGrid.of(in.alice(), in.bob(), in.pumpRms(), 2);
        double aa = 0.0;
        double bb = 0.0;
        double ab = 0.0;
        for (int i = 0; i < grid.probability.length; i++) {
            double p = grid.probability[i];
            aa += p * grid.alice[i] * grid.alice[i];
            bb += p * grid.bob[i] * grid.bob[i];
            ab += p * grid.alice[i] * grid.bob[i];
        }
        boolean flat = in.alice().flat() && in.bob().flat();
        double pass = flat
                ? flatPartnerPass(in.alice().halfWidth(), in.bob().halfWidth(), in.pumpRms())
                : grid.mass / (SQRT_TWO_PI * in.pumpRms() * in.alice().area());
        return complete(
                in, aa, bb, ab, pass, pass * in.alice().area() / in.bob().area());
    }

    /** Two flat tops of full widths a, b: h_BA = (s_P/a)[I(p)+I(-p)-I(q)-I(-q)], p,q = (a+-b)/(2 s_P), I(y) = y Phi(y) + phi(y). */
    static double flatPartnerPass(double halfA, double halfB, double pumpRms) {
        double p = (halfA + halfB) / pumpRms;
        double q = (halfA - halfB) / pumpRms;
        return pumpRms / (2.0 * halfA) * (evenRamp(p) - evenRamp(q));
    }

    /** I(y) + I(-y) = y (Phi(y) - Phi(-y)) + 2 phi(y). */
    private static double evenRamp(double y) {
        double inside = 1.0 - Erfc.value(Math.abs(y) / Math.sqrt(2.0));
        return Math.abs(y) * inside + 2.0 * Math.exp(-y * y / 2.0) / SQRT_TWO_PI;
    }

    private static PairSpectrum complete(
            SpectrumInputs in, double aa, double bb, double ab, double bobPasses, double alicePasses) {
        double a = in.alice().variance();
        double b = in.bob().variance();
        double p = effectivePumpVariance(in, a);
        double detuned = detuning(in, a + b + in.pumpRms() * in.pumpRms());
        boolean measured = !Double.isNaN(in.measuredPartnerPass());
        return new PairSpectrum(
                in.alice(),
                in.bob(),
                in.pumpRms(),
                aa,
                bb,
                ab,
                schmidt(in, p, aa, bb, ab),
                Math.sqrt(1.0 + a / p),
                Math.sqrt(1.0 + b / p),
                measured ? in.measuredPartnerPass() : probability(bobPasses * detuned),
                measured ? in.measuredPartnerPass() : probability(alicePasses * detuned));
    }

    /** At most 1 in spite of rounding; centres that miss the pump by many widths leave so much that photon numbers stay finite. */
    private static double probability(double pass) {
        return Math.max(HARDLY_EVER, Math.min(1.0, pass));
    }

    /** Centres that miss energy conservation by m: exp(-(2 pi m)^2 / (2 (s_A^2 + s_B^2 + s_P^2))). */
    private static double detuning(SpectrumInputs in, double variance) {
        double m = 2.0 * Math.PI * in.energyMismatchHz();
        return Math.exp(-m * m / (2.0 * variance));
    }

    /** The pump variance that a measured g2 = 1 + 1/K_A implies through K_A^2 = 1 + s_A^2/s_P^2; otherwise the pulse's own. */
    private static double effectivePumpVariance(SpectrumInputs in, double a) {
        if (Double.isNaN(in.measuredG2())) {
            return in.pumpRms() * in.pumpRms();
        }
        double modes = 1.0 / (in.measuredG2() - 1.0);
        return a / (modes * modes - 1.0);
    }

    private static double schmidt(SpectrumInputs in, double p, double aa, double bb, double ab) {
        if (!Double.isNaN(in.statedSchmidt())) {
            return in.statedSchmidt();
        }
        if (!Double.isNaN(in.measuredG2())) {
            double x = in.alice().variance() / p;
            double y = in.bob().variance() / p;
            return 1.0 / Math.sqrt(1.0 / (1.0 + x) + 1.0 / (1.0 + y) - 1.0 / ((1.0 + x) * (1.0 + y)));
        }
        return in.pumpRms() == 0.0 ? Double.POSITIVE_INFINITY : 1.0 / Math.sqrt(1.0 - ab / aa * (ab / bb));
    }
}

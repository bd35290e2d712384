package binspan.optics;

/**
 * Loss of two-photon interference by imbalances that differ and by dispersion inside the analyzers: the modulus of the mean of exp(i d.W + i W'kW/2)
 * over the joint spectrum.
 *
 * <p>That a narrow window after strong dispersion selects part of the spectrum is left out: pessimistic, by less than 0.001 for mismatches under
 * 0.3 ps.
 */
public final class SpectralCoherence {
    private static final double PHASE_PER_PANEL = 8.0;
    private static final int MOST_PANELS = 64;

    private SpectralCoherence() {}

    /**
     * Mismatches and dispersions of the two analyzers.
     *
     * @param mismatchA alice's imbalance minus the pump's (continuous: minus any common value), s
     * @param mismatchB the same for bob, s
     * @param dispersionA group-delay dispersion of alice's long path minus her short one, s^2
     * @param dispersionB the same for bob, s^2
     */
    public record Mismatch(double mismatchA, double mismatchB, double dispersionA, double dispersionB) {
        boolean none() {
            return mismatchA == 0.0 && mismatchB == 0.0 && dispersionA == 0.0 && dispersionB == 0.0;
        }
    }

    /** The factor by which the visibility falls, 0 to 1. */
    public static double of(PairSpectrum spectrum, Mismatch m) {
        if (m.none()) {
            return 1.0;
        }
        if (spectrum.continuous() && spectrum.mirrored().gaussian()) {
            return continuous(spectrum, m);
        }
        return spectrum.gaussian() ? gaussian(spectrum, m) : averaged(spectrum, m);
    }

    /** q = 1 - i (k_A + k_B) s^2: |q|^(-1/2) |exp(-(T_A - T_B)^2 s^2/(2 q))|. */
    private static double continuous(PairSpectrum spectrum, Mismatch m) {
        double variance = spectrum.varianceA();
        double difference = m.mismatchA - m.mismatchB;
        double chirp = (m.dispersionA + m.dispersionB) * variance;
        double square = 1.0 + chirp * chirp;
        return Math.pow(square, -0.25) * Math.exp(-difference * difference * variance / (2.0 * square));
    }

    /** M = L - i k: |det(Sigma M)|^(-1/2) |exp(-d' M^-1 d/2)|. */
    private static double gaussian(PairSpectrum spectrum, Mismatch m) {
        double own = 1.0 / spectrum.alice().variance();
        double partner = 1.0 / spectrum.bob().variance();
        double p = spectrum.inversePump();
        double determinant = own * partner + p * (own + partner);
        double real = determinant - m.dispersionA * m.dispersionB;
        double imaginary = -((own + p) * m.dispersionB + (partner + p) * m.dispersionA);
        double square = real * real + imaginary * imaginary;
        double difference = m.mismatchA - m.mismatchB;
        double formReal =
                m.mismatchA * m.mismatchA * partner + m.mismatchB * m.mismatchB * own + p * difference * difference;
        double formImaginary = -(m.mismatchA * m.mismatchA * m.dispersionB + m.mismatchB * m.mismatchB * m.dispersionA);
        double exponent = (formReal * real + formImaginary * imaginary) / square;
        return Math.sqrt(determinant / Math.sqrt(square)) * Math.exp(-exponent / 2.0);
    }

    private static double averaged(PairSpectrum spectrum, Mismatch m) {
        double phase = largestPhase(spectrum, m);
        int refinement = phase < MOST_PANELS * PHASE_PER_PANEL ? 1 + (int) (phase / PHASE_PER_PANEL) : MOST_PANELS;
        SpectralGrid grid = SpectralGrid.of(spectrum.alice(), spectrum.bob(), spectrum.pumpRms(), refinement);
        double cosines = 0.0;
        double sines = 0.0;
        for (int i = 0; i < grid.probability.length; i++) {
            double wa = grid.alice[i];
            double wb = grid.bob[i];
            double angle =
                    m.mismatchA * wa + m.mismatchB * wb + 0.5 * (m.dispersionA * wa * wa + m.dispersionB * wb * wb);
            cosines += grid.probability[i] * Math.cos(angle);
            sines += grid.probability[i] * Math.sin(angle);
        }
        return Math.min(1.0, Math.hypot(cosines, sines));
    }

    /** Phase across one panel of the unrefined grid, about a third of the spectrum. */
    private static double largestPhase(PairSpectrum spectrum, Mismatch m) {
        double wa = 3.5 * Math.sqrt(spectrum.varianceA());
        double wb = 3.5 * Math.sqrt(spectrum.varianceB());
        double linear = Math.abs(m.mismatchA - m.mismatchB) * wa
                + Math.abs(m.mismatchA + m.mismatchB) * Math.max(spectrum.pumpRms(), 0.0);
        return linear + 0.5 * (Math.abs(m.dispersionA) * wa * wa + Math.abs(m.dispersionB) * wb * wb);
    }
}

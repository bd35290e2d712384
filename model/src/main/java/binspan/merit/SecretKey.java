package binspan.merit;

import binspan.counting.LinkCounts;

/**
 * Sifted and asymptotic secret key of entanglement-based key distribution.
 *
 * <p>Pulse pair, basis by slot: {@code Q_Z [1 - f h(e_Z) - h(e_ph(Z))]+ + Q_X [1 - f h(e_X) - h(e_ph(X))]+}, the phase part with both ports on both
 * sides only. Continuous pump and pulse train, two phase settings on each side: half of the central coincidences sift, each worth
 * {@code [1 - (1 + f) h(e_X)]+}; both ports are needed.
 *
 * @param siftedPhasePerSecond sifted bits of the phase basis, 1/s
 * @param siftedTimePerSecond sifted bits of the time basis, 1/s; NaN without a time basis
 * @param asymptoticPerSecond secret bits of an endless key, 1/s; NaN where the detected ports allow no key
 * @param errors error rates
 */
public record SecretKey(
        double siftedPhasePerSecond, double siftedTimePerSecond, double asymptoticPerSecond, ErrorRates errors) {

    private static final double LN_2 = Math.log(2.0);

    /**
     * The key of a link.
     *
     * @param counts counts
     * @param sifted what sifting keeps
     * @param errors error rates
     * @param efficiency error-correction efficiency f
     */
    public static SecretKey of(LinkCounts counts, SiftedRates sifted, ErrorRates errors, double efficiency) {
        if (!counts.hasTimeBasis()) {
            double half = sifted.central() / 2.0;
            double key = half * secretFraction(errors.phase(), errors.phase(), efficiency);
            return new SecretKey(half, Double.NaN, counts.bothPorts() ? key : Double.NaN, errors);
        }
        double key = sifted.time() * secretFraction(errors.time(), errors.phaseErrorOfTimeKey(), efficiency);
        if (counts.bothPorts()) {
            key += sifted.central() * secretFraction(errors.phase(), errors.phaseErrorOfPhaseKey(), efficiency);
        }
        return new SecretKey(sifted.central(), sifted.time(), key, errors);
    }

    /**
     * Secret bits per sifted bit, [1 - f h(e_bit) - h(e_phase)]+.
     *
     * @param bitError error rate of the bits, 0 to 1/2
     * @param phaseError their phase error, 0 to 1/2
     * @param efficiency error-correction efficiency f, 1 or more
     */
    public static double secretFraction(double bitError, double phaseError, double efficiency) {
        return Math.max(0.0, fraction(bitError, phaseError, efficiency));
    }

    /** The same before it is cut off at 0: negative where the errors cost more than the bits hold. */
    public static double fraction(double bitError, double phaseError, double efficiency) {
        return 1.0 - efficiency * binaryEntropy(bitError) - binaryEntropy(phaseError);
    }

    /** Binary entropy h(x) = -x log2 x - (1-x) log2(1-x), bits, for x in [0, 1]. */
    public static double binaryEntropy(double x) {
        if (x <= 0.0 || x >= 1.0) {
            return 0.0;
        }
        return -(x * Math.log(x) + (1.0 - x) * Math.log1p(-x)) / LN_2;
    }
}

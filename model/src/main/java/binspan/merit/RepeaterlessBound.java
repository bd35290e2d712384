package binspan.merit;

/** What no link without a repeater can exceed: -log2(1 - eta) secret bits per mode (Pirandola et al., Nat. Commun. 8, 15043 (2017)). */
public final class RepeaterlessBound {
    private static final double LN_2 = Math.log(2.0);

    private RepeaterlessBound() {}

    /**
     * Bits per mode.
     *
     * @param transmittance transmittance of the fibre between the two ends, 0 to 1; with the source inside the link the strict bound takes that of
     *     the worse arm
     * @return bits; infinite for a transmittance of 1
     */
    public static double bitsPerMode(double transmittance) {
        return -Math.log1p(-transmittance) / LN_2;
    }
}

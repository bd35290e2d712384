package binspan.merit;

/** Photon statistics that a calibration of the source measures. */
public final class PhotonStatistics {
    private PhotonStatistics() {}

    /**
     * Heralded g2(0) of one bin with a weak herald: [x^2 (1 + 1/K_A) + 2 x (1 + 1/K_x)]/(1 + x)^2, x = mu_b/(h_AB h_BA),
     * 1/K_x = (1/K + 1/K_A)/2.
     *
     * @param binPairs mean pairs mu_b of the bin
     * @param passProduct h_AB h_BA
     * @param modes Schmidt number K of the pair
     * @param armModes modes K_A of the heralded arm
     */
    public static double heraldedG2(double binPairs, double passProduct, double modes, double armModes) {
        double x = binPairs / passProduct;
        double mixed = (1.0 / modes + 1.0 / armModes) / 2.0;
        return (x * x * (1.0 + 1.0 / armModes) + 2.0 * x * (1.0 + mixed)) / ((1.0 + x) * (1.0 + x));
    }

    /**
     * Mean pairs that a naive calibration S_A S_B/(C f) would state; photons whose partner was filtered out make it mu/h^2 and more.
     *
     * @param singlesA recorded singles of alice, 1/s
     * @param singlesB recorded singles of bob, 1/s
     * @param coincidences coincidences of all slots, 1/s
     * @param cyclesPerSecond cycles, 1/s
     */
    public static double apparentMeanPairs(
            double singlesA, double singlesB, double coincidences, double cyclesPerSecond) {
        return singlesA * singlesB / (coincidences * cyclesPerSecond);
    }
}

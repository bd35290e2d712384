package binspan.optics;

/**
 * Spread of the arrival times by the light itself, about the slot centre: variances in s^2, detectors and clocks not included.
 *
 * <p>Gaussian spectra, exact: the pair has St = L/4 + B Sigma B with L the inverse covariance and B = diag(beta_A, beta_B); an arm's singles have
 * (1/s_X^2 + 1/s_P^2)/4 + beta_X^2 s_X^2, wider because the partner's filter does not select them. For flat tops these are the variances of the
 * shapes that the captures integrate.
 *
 * @param pairA variance of alice's photon of a pair
 * @param pairB variance of bob's photon of a pair
 * @param pairCovariance their covariance
 * @param singlesA variance of alice's singles; infinite for a continuous pump, whose photons come at any time
 * @param singlesB variance of bob's singles
 */
public record ArrivalTime(double pairA, double pairB, double pairCovariance, double singlesA, double singlesB) {
    /**
     * Arrival times of a pulsed source.
     *
     * @param spectrum joint spectrum
     * @param betaA group-delay dispersion of alice's path, s^2
     * @param betaB the same for bob, s^2
     */
    public static ArrivalTime of(PairSpectrum spectrum, double betaA, double betaB) {
        return new ArrivalTime(
                spectrum.inverseA() / 4.0 + betaA * betaA * spectrum.varianceA(),
                spectrum.inverseB() / 4.0 + betaB * betaB * spectrum.varianceB(),
                spectrum.inversePump() / 4.0 + betaA * betaB * spectrum.covariance(),
                spectrum.inverseA() / 4.0 + betaA * betaA * spectrum.alice().variance(),
                spectrum.inverseB() / 4.0 + betaB * betaB * spectrum.bob().variance());
    }

    /**
     * Variance of t_A - t_B of a continuous-pump pair: (1/s_A^2 + 1/s_B^2)/4 + (beta_A + beta_B)^2 s^2; the far field vanishes where the
     * dispersions cancel (Franson, Phys. Rev. A 45, 3126 (1992)).
     *
     * @param spectrum joint spectrum of a continuous pump
     * @param betaSum beta_A + beta_B, s^2
     */
    public static double differenceVariance(PairSpectrum spectrum, double betaSum) {
        return nearFieldDifference(spectrum) + betaSum * betaSum * spectrum.varianceA();
    }

    /** The part of that variance which dispersion does not touch, s^2. */
    static double nearFieldDifference(PairSpectrum spectrum) {
        return (1.0 / spectrum.alice().variance() + 1.0 / spectrum.bob().variance()) / 4.0;
    }
}

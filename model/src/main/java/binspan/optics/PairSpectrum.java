package binspan.optics;

/**
 * Joint spectrum of a pair that passes both arms' filters, and what follows from it for the click statistics.
 *
 * <p>Phase matching is taken as wide against the filters. Gaussian filters: detunings have the inverse covariance {@code [[1/s_A^2 + 1/s_P^2, 1/s_P^2],
 * [1/s_P^2, 1/s_B^2 + 1/s_P^2]]}. Flat-top filters: moments by quadrature.
 *
 * @param alice filters of alice's arm
 * @param bob filters of bob's arm
 * @param pumpRms rms bandwidth s_P of the pump pulse, rad/s; 0 for a continuous pump
 * @param varianceA variance of alice's detuning, (rad/s)^2
 * @param varianceB variance of bob's detuning, (rad/s)^2
 * @param covariance their covariance, (rad/s)^2
 * @param schmidtNumber Schmidt number K of the doubly filtered pair in one bin; infinite for a continuous pump
 * @param armSchmidtA number of modes K_A of alice's arm behind its own filters
 * @param armSchmidtB the same for bob
 * @param bobPassesGivenAlice probability h_BA that bob's photon passes its filters when alice's does
 * @param alicePassesGivenBob probability h_AB that alice's does when bob's does
 */
public record PairSpectrum(
        Passband alice,
        Passband bob,
        double pumpRms,
        double varianceA,
        double varianceB,
        double covariance,
        double schmidtNumber,
        double armSchmidtA,
        double armSchmidtB,
        double bobPassesGivenAlice,
        double alicePassesGivenBob) {

    /** Whether the pump is continuous, so that the detunings are exactly opposite. */
    public boolean continuous() {
        return pumpRms == 0.0;
    }

    /** Whether both arms have Gaussian filters only. */
    public boolean gaussian() {
        return alice.gaussian() && bob.gaussian();
    }

    /** Filters that one photon of a continuous-pump pair meets when its partner's are mirrored onto it. */
    public Passband mirrored() {
        return alice.and(bob);
    }

    /** Element AA of the inverse covariance, 1/s_A^2 + 1/s_P^2, s^2. */
    public double inverseA() {
        return 1.0 / alice.variance() + inversePump();
    }

    /** Element BB of the inverse covariance, s^2. */
    public double inverseB() {
        return 1.0 / bob.variance() + inversePump();
    }

    /** Element AB of the inverse covariance, 1/s_P^2, s^2. */
    public double inversePump() {
        return 1.0 / (pumpRms * pumpRms);
    }

    /** Unheralded g2(0) of an arm with the given number of modes, 1 + 1/K. */
    public static double unheraldedG2(double armSchmidt) {
        return 1.0 + 1.0 / armSchmidt;
    }
}

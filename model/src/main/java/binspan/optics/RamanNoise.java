package binspan.optics;

/**
 * Spontaneous Raman light that a classical channel leaves in the photon's band at a fibre end.
 *
 * <p>Integrals of the form used by Eraerds et al., New J. Phys. 12, 063027 (2010) (from memory); attenuations in 1/km, lengths in km, cross-section
 * in 1/(km nm), bandwidth in nm.
 */
public final class RamanNoise {
    private RamanNoise() {}

    /**
     * Light that leaves the fibre in the direction of the classical light, W:
     * P0 rho dl (e^(-a_c L) - e^(-a_q L))/(a_q - a_c), and P0 rho dl L e^(-a L) where both attenuations are equal.
     *
     * @param launched classical power at the fibre input, W
     * @param crossSectionTimesBandwidth rho dl, 1/km
     * @param classical attenuation a_c of the classical light, 1/km
     * @param quantum attenuation a_q in the photon's band, 1/km
     * @param lengthKm fibre length L, km
     */
    public static double forward(
            double launched, double crossSectionTimesBandwidth, double classical, double quantum, double lengthKm) {
        double x = Math.abs(quantum - classical) * lengthKm;
        double path = x == 0.0 ? lengthKm : -Math.expm1(-x) / x * lengthKm;
        return launched * crossSectionTimesBandwidth * Math.exp(-Math.min(classical, quantum) * lengthKm) * path;
    }

    /**
     * Light that comes out where the classical light enters, W: P0 rho dl (1 - e^(-(a_c+a_q)L))/(a_c+a_q).
     *
     * @param launched classical power at the fibre input, W
     * @param crossSectionTimesBandwidth rho dl, 1/km
     * @param classical attenuation a_c of the classical light, 1/km
     * @param quantum attenuation a_q in the photon's band, 1/km
     * @param lengthKm fibre length L, km
     */
    public static double backward(
            double launched, double crossSectionTimesBandwidth, double classical, double quantum, double lengthKm) {
        double sum = classical + quantum;
        double path = sum == 0.0 ? lengthKm : -Math.expm1(-sum * lengthKm) / sum;
        return launched * crossSectionTimesBandwidth * path;
    }
}

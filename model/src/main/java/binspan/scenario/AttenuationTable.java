package binspan.scenario;

/**
 * Attenuation of a fibre class, straight lines between three wavelengths and level outside them.
 *
 * @param at1310 attenuation at 1310 nm, dB/km
 * @param at1550 attenuation at 1550 nm, dB/km
 * @param at1625 attenuation at 1625 nm, dB/km
 */
public record AttenuationTable(double at1310, double at1550, double at1625) {
    private static final double SHORT_NM = 1310.0;
    private static final double MIDDLE_NM = 1550.0;
    private static final double LONG_NM = 1625.0;

    /**
     * Attenuation at a wavelength.
     *
     * @param wavelengthNm vacuum wavelength in nm
     * @return attenuation in dB/km
     */
    public double at(double wavelengthNm) {
        double nm = Math.max(SHORT_NM, Math.min(LONG_NM, wavelengthNm));
        return nm < MIDDLE_NM
                ? at1310 + (at1550 - at1310) * (nm - SHORT_NM) / (MIDDLE_NM - SHORT_NM)
                : at1550 + (at1625 - at1550) * (nm - MIDDLE_NM) / (LONG_NM - MIDDLE_NM);
    }
}

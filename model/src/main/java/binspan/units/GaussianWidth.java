package binspan.units;

/** Full width at half maximum and rms of a Gaussian: rms = FWHM / (2 sqrt(2 ln 2)). */
public final class GaussianWidth {
    /** FWHM of a Gaussian of unit rms, 2.354820. */
    public static final double FWHM_PER_RMS = 2.0 * Math.sqrt(2.0 * Math.log(2.0));

    private GaussianWidth() {}

    /**
     * Root mean square width of a Gaussian.
     *
     * @param fwhm full width at half maximum, any unit
     * @return rms in the same unit
     */
    public static double rms(double fwhm) {
        return fwhm / FWHM_PER_RMS;
    }

    /**
     * Full width at half maximum of a Gaussian.
     *
     * @param rms root mean square width, any unit
     * @return FWHM in the same unit
     */
    public static double fwhm(double rms) {
        return rms * FWHM_PER_RMS;
    }
}

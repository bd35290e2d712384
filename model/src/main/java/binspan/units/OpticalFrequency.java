package binspan.units;

/** Wavelength in vacuum, optical frequency and the customary channel numbers of the 100 GHz grid (ITU-T G.694.1). */
public final class OpticalFrequency {
    /** Anchor of the grids of ITU-T G.694.1. */
    private static final double ANCHOR_HZ = 193.1e12;

    private static final double CHANNEL_SPACING_HZ = 100e9;

    /** Customary number of the channel at the anchor. */
    private static final double ANCHOR_CHANNEL = 31.0;

    private OpticalFrequency() {}

    /**
     * Frequency of a vacuum wavelength.
     *
     * @param wavelengthNm wavelength in nm, above 0
     * @return frequency in Hz
     */
    public static double ofWavelengthNm(double wavelengthNm) {
        return PhysicalConstants.SPEED_OF_LIGHT / (wavelengthNm * Scale.NANO);
    }

    /**
     * Vacuum wavelength of a frequency.
     *
     * @param hertz frequency in Hz, above 0
     * @return wavelength in nm
     */
    public static double toWavelengthNm(double hertz) {
        return PhysicalConstants.SPEED_OF_LIGHT / hertz / Scale.NANO;
    }

    /**
     * Centre frequency of a grid position, 193.1 THz + n x spacing (ITU-T G.694.1, clause 6).
     *
     * @param n position counted from the anchor, below it negative; halves lie between two channels
     * @param spacingHz channel spacing in Hz, for example 100e9; 6.25e9 for the flexible grid
     * @return frequency in Hz
     */
    public static double gridHz(double n, double spacingHz) {
        return ANCHOR_HZ + n * spacingHz;
    }

    /**
     * Centre frequency of a customary channel number, 190 THz + number x 0.1 THz; a half channel (50 GHz grid) is a
     * number ending in .5.
     *
     * @param channel channel number, for example 30 or 30.5
     * @return frequency in Hz
     */
    public static double ofChannel(double channel) {
        return gridHz(channel - ANCHOR_CHANNEL, CHANNEL_SPACING_HZ);
    }

    /**
     * Width in wavelength of a narrow band.
     *
     * @param widthHz width in Hz
     * @param wavelengthNm centre wavelength in nm
     * @return width in nm
     */
    public static double widthNm(double widthHz, double wavelengthNm) {
        double metres = wavelengthNm * Scale.NANO;
        return metres * metres * widthHz / PhysicalConstants.SPEED_OF_LIGHT / Scale.NANO;
    }
}

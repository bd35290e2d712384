package binspan.scenario;

/**
 * One limit that a Recommendation sets to a fibre class.
 *
 * @param quantity what is limited
 * @param fromNm shortest wavelength at which the limit holds, nm; 0 where it is no matter of wavelength
 * @param toNm longest wavelength at which it holds, nm; infinity where it is no matter of wavelength
 * @param allowed values inside the limit
 */
public record FibreLimit(Quantity quantity, double fromNm, double toNm, Range allowed) {

    /** What Recommendations limit, bounding lines of the dispersion apart. */
    public enum Quantity implements Choice {
        /** Attenuation of the cabled fibre. */
        ATTENUATION("attenuation", "dB/km"),
        /** Chromatic dispersion; where both signs are allowed, the limit stands for the positive one. */
        DISPERSION("dispersion", "ps/(nm km)"),
        /** Largest minus smallest dispersion of one fibre inside the band. */
        DISPERSION_VARIATION("dispersion variation", "ps/(nm km)"),
        /** Change of the dispersion with wavelength. */
        DISPERSION_SLOPE("dispersion slope", "ps/(nm^2 km)"),
        /** Wavelength at which the dispersion is zero. */
        ZERO_WAVELENGTH("zero-dispersion wavelength", "nm"),
        /** Slope of the dispersion there. */
        ZERO_SLOPE("zero-dispersion slope", "ps/(nm^2 km)"),
        /** Polarization mode dispersion of a link of many cables, the link design value. */
        PMD("PMD", "ps/sqrt(km)");

        private final String text;
        private final String unit;

        Quantity(String text, String unit) {
            this.text = text;
            this.unit = unit;
        }

        @Override
        public String text() {
            return text;
        }

        /** Unit of the allowed values. */
        public String unit() {
            return unit;
        }
    }

    /** A limit over a band. */
    static FibreLimit inBand(Quantity quantity, double fromNm, double toNm, Range allowed) {
        return new FibreLimit(quantity, fromNm, toNm, allowed);
    }

    /** A limit at one wavelength. */
    static FibreLimit at(Quantity quantity, double wavelengthNm, Range allowed) {
        return new FibreLimit(quantity, wavelengthNm, wavelengthNm, allowed);
    }

    /** A limit that is no matter of wavelength. */
    static FibreLimit of(Quantity quantity, Range allowed) {
        return new FibreLimit(quantity, 0.0, Double.POSITIVE_INFINITY, allowed);
    }

    /** Whether the limit holds at a wavelength in nm. */
    public boolean holdsAt(double wavelengthNm) {
        return wavelengthNm >= fromNm && wavelengthNm <= toNm;
    }
}

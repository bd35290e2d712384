package binspan.scenario;

/** Chromatic dispersion of a fibre class against wavelength. */
public sealed interface DispersionLaw {
    /**
     * Dispersion at a wavelength.
     *
     * @param wavelengthNm vacuum wavelength in nm
     * @return dispersion in ps/(nm km)
     */
    double at(double wavelengthNm);

    /**
     * Three-term law of standard fibre, D = S0/4 (l - l0^4/l^3) (ITU-T G.650.1; formula from memory).
     *
     * @param zeroNm zero-dispersion wavelength, nm
     * @param slope slope there, ps/(nm^2 km)
     */
    record ThreeTerm(double zeroNm, double slope) implements DispersionLaw {
        @Override
        public double at(double wavelengthNm) {
            double ratio = zeroNm / wavelengthNm;
            return slope / 4.0 * (wavelengthNm - zeroNm * ratio * ratio * ratio);
        }
    }

    /**
     * Straight line through one point.
     *
     * @param referenceNm wavelength of the point, nm
     * @param dispersion dispersion there, ps/(nm km)
     * @param slope slope, ps/(nm^2 km)
     */
    record Line(double referenceNm, double dispersion, double slope) implements DispersionLaw {
        @Override
        public double at(double wavelengthNm) {
            return dispersion + slope * (wavelengthNm - referenceNm);
        }
    }

    /**
     * Two lines that meet at a break: a bounding line of ITU-T G.653 and G.655.
     *
     * @param breakNm where the second line takes over, nm
     * @param below line up to the break
     * @param above line from there
     */
    record BrokenLine(double breakNm, Line below, Line above) implements DispersionLaw {
        @Override
        public double at(double wavelengthNm) {
            return (wavelengthNm < breakNm ? below : above).at(wavelengthNm);
        }
    }

    /**
     * The middle between two limits, the planning value of a class that is only bounded.
     *
     * @param lowest lower limit
     * @param highest upper limit
     */
    record Middle(DispersionLaw lowest, DispersionLaw highest) implements DispersionLaw {
        @Override
        public double at(double wavelengthNm) {
            return (lowest.at(wavelengthNm) + highest.at(wavelengthNm)) / 2.0;
        }
    }
}

package binspan.optics;

import binspan.scenario.ClassicalChannel;
import binspan.scenario.FibreSpan;

/** Loss, dispersion and delay of one fibre span at the photon's wavelength. */
public final class FibreOptics {
    private FibreOptics() {}

    /** Attenuation in the photon's band, dB/km: stated, or that of the measured span, or that of the class. */
    public static double attenuationDbPerKm(FibreSpan span, double wavelengthNm) {
        if (span.measuredLossDb().isPresent() && span.lengthKm() > 0.0) {
            return span.measuredLossDb().getAsDouble() / span.lengthKm();
        }
        return span.attenuationDbPerKm().isPresent()
                ? span.attenuationDbPerKm().getAsDouble()
                : span.fibre().attenuation().at(wavelengthNm);
    }

    /** Attenuation of a classical channel in the same fibre, dB/km. */
    public static double attenuationDbPerKm(FibreSpan span, ClassicalChannel channel) {
        return channel.attenuationDbPerKm().isPresent()
                ? channel.attenuationDbPerKm().getAsDouble()
                : span.fibre().attenuation().at(channel.wavelengthNm());
    }

    /** Loss of the whole span, dB: as measured, or attenuation with connectors and splices. */
    public static double lossDb(FibreSpan span, double wavelengthNm) {
        if (span.measuredLossDb().isPresent()) {
            return span.measuredLossDb().getAsDouble();
        }
        return attenuationDbPerKm(span, wavelengthNm) * span.lengthKm()
                + span.connectors() * span.connectorLossDb()
                + span.splices() * span.spliceLossDb();
    }

    /** Chromatic dispersion of the span, ps/nm. */
    public static double dispersionPsPerNm(FibreSpan span, double wavelengthNm) {
        double perKm = span.dispersionPsPerNmKm().isPresent()
                ? span.dispersionPsPerNmKm().getAsDouble()
                : span.fibre().dispersion().at(wavelengthNm);
        return perKm * span.lengthKm();
    }

    /** Square of the rms delay spread by PMD, ps^2: the mean differential delay PMD sqrt(L), halved, times sqrt(3 pi/8). */
    public static double pmdVariancePs2(FibreSpan span) {
        double mean = span.pmdPsPerSqrtKm() * Math.sqrt(span.lengthKm());
        return mean * mean / 4.0 * (3.0 * Math.PI / 8.0);
    }
}

package binspan.scenario;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A span of fibre. Values left out are those of the fibre class.
 *
 * @param label unique name
 * @param fibre fibre class, by ITU-T Recommendation
 * @param lengthKm length, km
 * @param attenuationDbPerKm attenuation at the photon's wavelength, dB/km
 * @param dispersionPsPerNmKm chromatic dispersion at the photon's wavelength, ps/(nm km)
 * @param pmdPsPerSqrtKm polarization mode dispersion, ps/sqrt(km)
 * @param measuredLossDb loss of the whole span as measured, dB; replaces attenuation, connectors and splices
 * @param connectors number of connectors (scaled with the length when a study scales the fibre)
 * @param connectorLossDb loss of each, dB
 * @param splices number of splices (scaled likewise)
 * @param spliceLossDb loss of each, dB
 * @param delayPsPerKmK temperature coefficient of the delay, ps/(km K)
 * @param classicalChannels classical light in the same fibre
 */
public record FibreSpan(
        Optional<String> label,
        FibreClass fibre,
        double lengthKm,
        OptionalDouble attenuationDbPerKm,
        OptionalDouble dispersionPsPerNmKm,
        double pmdPsPerSqrtKm,
        OptionalDouble measuredLossDb,
        double connectors,
        double connectorLossDb,
        double splices,
        double spliceLossDb,
        double delayPsPerKmK,
        List<ClassicalChannel> classicalChannels)
        implements PathElement {

    public FibreSpan {
        classicalChannels = List.copyOf(classicalChannels);
    }

    /**
     * The same span at another length: connectors and splices keep their density, a measured loss scales.
     *
     * @param factor new length over old, 0 or more
     */
    public FibreSpan scaled(double factor) {
        OptionalDouble measured =
                measuredLossDb.isPresent() ? OptionalDouble.of(measuredLossDb.getAsDouble() * factor) : measuredLossDb;
        return new FibreSpan(
                label,
                fibre,
                lengthKm * factor,
                attenuationDbPerKm,
                dispersionPsPerNmKm,
                pmdPsPerSqrtKm,
                measured,
                connectors * factor,
                connectorLossDb,
                splices * factor,
                spliceLossDb,
                delayPsPerKmK,
                classicalChannels);
    }
}

package binspan.optics;

import binspan.scenario.ClassicalChannel;
import binspan.scenario.Direction;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.PathElement;
import binspan.units.Decibels;
import binspan.units.OpticalFrequency;
import binspan.units.PhysicalConstants;
import binspan.units.Scale;
import java.util.List;

/**
 * Photons that classical channels send into an analyzer: Raman light inside the filters that follow the fibre, and the channel's own light through
 * their isolation. A channel against the photons leaks nothing towards the analyzer.
 *
 * <p>What follows the fibre attenuates both: the later elements and the analyzer's excess loss. The repair margin is left out, since its splices may
 * never be made.
 */
final class StrayLight {
    private StrayLight() {}

    /** Photons per second behind the analyzer's excess loss. */
    static double photonsPerSecond(PathInputs in, double fibreDispersion) {
        List<PathElement> elements = in.elements();
        double photons = 0.0;
        for (int i = 0; i < elements.size(); i++) {
            if (elements.get(i) instanceof FibreSpan span
                    && !span.classicalChannels().isEmpty()) {
                photons += ofSpan(in, span, After.of(in, i + 1, fibreDispersion));
            }
        }
        return photons;
    }

    private static double ofSpan(PathInputs in, FibreSpan span, After after) {
        double photonEnergy = PhysicalConstants.PLANCK * OpticalFrequency.ofWavelengthNm(in.wavelengthNm());
        double sum = 0.0;
        for (ClassicalChannel channel : span.classicalChannels()) {
            sum += raman(in, span, channel, after.filters) / photonEnergy + leaked(span, channel, after.isolationDb);
        }
        return sum * Decibels.transmittance(after.lossDb);
    }

    private static double raman(PathInputs in, FibreSpan span, ClassicalChannel channel, Passband filters) {
        double bandwidthNm = OpticalFrequency.widthNm(filters.noiseBandwidthHz(), in.wavelengthNm());
        double strength = channel.ramanCoefficientPerKmNm() * bandwidthNm;
        double launched = Decibels.watts(channel.launchDbm());
        double classical = FibreOptics.attenuationDbPerKm(span, channel) * Decibels.NEPERS_PER_DB;
        double quantum = FibreOptics.attenuationDbPerKm(span, in.wavelengthNm()) * Decibels.NEPERS_PER_DB;
        return channel.direction() == Direction.FORWARD
                ? RamanNoise.forward(launched, strength, classical, quantum, span.lengthKm())
                : RamanNoise.backward(launched, strength, classical, quantum, span.lengthKm());
    }

    private static double leaked(FibreSpan span, ClassicalChannel channel, double isolationDb) {
        if (channel.direction() == Direction.BACKWARD) {
            return 0.0;
        }
        double arriving =
                Decibels.watts(channel.launchDbm() - FibreOptics.attenuationDbPerKm(span, channel) * span.lengthKm());
        double photonEnergy = PhysicalConstants.PLANCK * OpticalFrequency.ofWavelengthNm(channel.wavelengthNm());
        return arriving / photonEnergy * Decibels.transmittance(isolationDb);
    }

    /** What lies between a fibre and the analyzer's output. */
    private record After(Passband filters, double isolationDb, double lossDb) {
        static After of(PathInputs in, int from, double fibreDispersion) {
            Passband filters = Passband.OPEN;
            double isolationDb = 0.0;
            double lossDb = in.excessLossDb();
            for (PathElement element : in.elements().subList(from, in.elements().size())) {
                lossDb += element instanceof FibreSpan span
                        ? FibreOptics.lossDb(span, in.wavelengthNm())
                        : OpticalPaths.componentLossDb(element, fibreDispersion);
                if (element instanceof FilterElement filter) {
                    filters = filters.and(Passband.of(filter.bandwidthFwhmGHz() * Scale.GIGA, filter.passband()));
                    isolationDb += filter.isolationDb();
                }
            }
            return new After(filters, isolationDb, lossDb);
        }
    }
}

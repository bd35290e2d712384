package binspan.optics;

import binspan.scenario.Arm;
import binspan.scenario.Band;
import binspan.scenario.FilterElement;
import binspan.scenario.PathElement;
import binspan.scenario.Pump;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.Source;
import binspan.units.GaussianWidth;
import binspan.units.OpticalFrequency;
import binspan.units.Scale;

/**
 * All that the joint spectrum depends on; equal inputs give equal spectra.
 *
 * @param alice filters of alice's arm
 * @param bob filters of bob's arm
 * @param pumpRms rms bandwidth of the pump pulse, rad/s; 0 for a continuous pump
 * @param energyMismatchHz how far the band centres miss energy conservation with the pump, Hz; 0 without a pump wavelength
 * @param statedSchmidt stated Schmidt number, NaN if none
 * @param measuredG2 measured unheralded g2(0) of alice's arm, NaN if none
 * @param measuredPartnerPass measured partner-pass probability, NaN if none
 */
public record SpectrumInputs(
        Passband alice,
        Passband bob,
        double pumpRms,
        double energyMismatchHz,
        double statedSchmidt,
        double measuredG2,
        double measuredPartnerPass) {

    /** Whether the other inputs are equal. */
    public boolean same(SpectrumInputs other) {
        return alice.same(other.alice)
                && bob.same(other.bob)
                && pumpRms == other.pumpRms
                && energyMismatchHz == other.energyMismatchHz
                && Double.compare(statedSchmidt, other.statedSchmidt) == 0
                && Double.compare(measuredG2, other.measuredG2) == 0
                && Double.compare(measuredPartnerPass, other.measuredPartnerPass) == 0;
    }

    /** Gathers them from a scenario. */
    public static SpectrumInputs of(Scenario scenario) {
        Source source = scenario.source();
        return new SpectrumInputs(
                filters(scenario, scenario.alice()),
                filters(scenario, scenario.bob()),
                pumpRms(source.pump()),
                energyMismatchHz(source),
                source.schmidtNumber().orElse(Double.NaN),
                source.unheraldedG2().orElse(Double.NaN),
                source.partnerPassProbability().orElse(Double.NaN));
    }

    private static Passband filters(Scenario scenario, Arm arm) {
        Band band = scenario.bandOf(arm);
        Passband filters = Passband.of(band.bandwidthFwhmGHz() * Scale.GIGA, band.passband());
        for (PathElement element : arm.path()) {
            if (element instanceof FilterElement filter) {
                filters = filters.and(Passband.of(filter.bandwidthFwhmGHz() * Scale.GIGA, filter.passband()));
            }
        }
        return filters;
    }

    /** Transform-limited pulse: s_P = 1/(2 t_p), t_p the rms of the intensity in which pairs are born. */
    private static double pumpRms(Pump pump) {
        if (pump.mode() == PumpMode.CONTINUOUS) {
            return 0.0;
        }
        return 0.5 / GaussianWidth.rms(pump.pairEmissionFwhmPs().orElseThrow() * Scale.PICO);
    }

    private static double energyMismatchHz(Source source) {
        if (source.pump().wavelengthNm().isEmpty()) {
            return 0.0;
        }
        double pumpHz =
                OpticalFrequency.ofWavelengthNm(source.pump().wavelengthNm().getAsDouble());
        return source.signal().centreHz() + source.idler().centreHz() - pumpHz;
    }
}

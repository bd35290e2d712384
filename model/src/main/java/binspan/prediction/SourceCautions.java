package binspan.prediction;

import binspan.optics.Passband;
import binspan.optics.TwoPhotonCoherence;
import binspan.scenario.Preparation;
import binspan.scenario.Pump;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.OpticalFrequency;
import binspan.units.Scale;

/** Where source, filters and pump strain the model. */
final class SourceCautions {
    private static final double WEAK_HERALD = 0.3;
    private static final double SINC_TAILS = 25.0;

    private SourceCautions() {}

    static void add(LinkPrediction p, Cautions cautions) {
        filters(p, cautions);
        pump(p, cautions);
        energy(p, cautions);
        double mean = p.scenario().source().meanPairsPerCycle().orElse(0.0);
        double load = mean / (p.spectrum().alicePassesGivenBob() * p.spectrum().bobPassesGivenAlice());
        cautions.when(
                load > WEAK_HERALD,
                "herald-not-weak",
                "The mean pairs per cycle before the partner's filter are %s: the heralded g2 assumes far fewer than one.",
                Figures.short3(load));
    }

    private static void filters(LinkPrediction p, Cautions cautions) {
        double separation = p.imbalances().common();
        double narrowest = Math.min(
                p.spectrum().alice().noiseBandwidthHz(), p.spectrum().bob().noiseBandwidthHz());
        cautions.when(
                separation < 1.0 / narrowest,
                "single-photon-interference",
                "The slot separation (%.1f ps) is below the coherence time of a single photon (%.1f ps): each analyzer shows fringes of its own.",
                separation / Scale.PICO,
                1.0 / narrowest / Scale.PICO);
        double flat =
                Math.min(flatWidth(p.spectrum().alice()), flatWidth(p.spectrum().bob()));
        cautions.when(
                flat * separation < SINC_TAILS,
                "flat-top-side-lobes",
                "A flat-top filter of %.1f GHz gives the photons side lobes that reach neighbouring slots (bandwidth times separation %.1f, wanted 25).",
                flat / Scale.GIGA,
                flat * separation);
    }

    private static double flatWidth(Passband filters) {
        return filters.halfWidth() / Math.PI;
    }

    private static void pump(LinkPrediction p, Cautions cautions) {
        Pump pump = p.scenario().source().pump();
        boolean stated =
                pump.coherenceTimeNs().isPresent() || pump.linewidthMHz().isPresent();
        double coherence = TwoPhotonCoherence.coherenceTime(pump);
        cautions.when(
                !pump.madeByInterferometer() && coherence < p.imbalances().emissions(pump),
                "pump-coherence-short",
                "The pump's coherence time (%.2f ns) is below the slot separation: hardly any interference is left.",
                coherence / Scale.NANO);
        cautions.when(
                !pump.madeByInterferometer() && !stated,
                "pump-coherence-not-stated",
                "Neither coherence time nor line width of the pump is stated: it is taken as perfectly coherent.");
        withoutEffect(p.scenario(), pump, stated, cautions);
    }

    private static void withoutEffect(Scenario scenario, Pump pump, boolean coherenceStated, Cautions cautions) {
        String text = "The field %s has no effect with this pump.";
        String code = "field-without-effect";
        boolean pair = pump.mode() == PumpMode.PULSE_PAIR;
        cautions.when(
                pump.madeByInterferometer() && coherenceStated, code, text, "source.pump coherence time or line width");
        cautions.when(!pair && pump.mismatchPs() != 0.0, code, text, "source.pump.mismatchPs");
        cautions.when(
                !pump.madeByInterferometer() && pump.phaseNoiseRmsRad() != 0.0,
                code,
                text,
                "source.pump.phaseNoiseRmsRad");
        cautions.when(!pair && pump.earlyPairFraction() != 0.5, code, text, "source.pump.earlyPairFraction");
        cautions.when(!pair && pump.preparation() == Preparation.MODULATOR, code, text, "source.pump.preparation");
        cautions.when(!pair && pump.repetitionRateMHz().isPresent(), code, text, "source.pump.repetitionRateMHz");
        boolean modes = scenario.source().schmidtNumber().isPresent()
                || scenario.source().unheraldedG2().isPresent();
        cautions.when(!scenario.pulsed() && modes, code, text, "source.schmidtNumber or unheraldedG2");
        cautions.when(
                !scenario.pulsed() && pump.pairEmissionFwhmPs().isPresent(),
                code,
                text,
                "source.pump.pairEmissionFwhmPs");
    }

    private static void energy(LinkPrediction p, Cautions cautions) {
        Pump pump = p.scenario().source().pump();
        if (pump.wavelengthNm().isEmpty()) {
            return;
        }
        double missed = p.scenario().source().signal().centreHz()
                + p.scenario().source().idler().centreHz()
                - OpticalFrequency.ofWavelengthNm(pump.wavelengthNm().getAsDouble());
        double width = Math.min(
                p.scenario().source().signal().bandwidthFwhmGHz(),
                p.scenario().source().idler().bandwidthFwhmGHz());
        cautions.when(
                Math.abs(missed) > width * Scale.GIGA,
                "energy-not-conserved",
                "Signal and idler centres miss the pump's energy by %.0f GHz, more than a filter width: hardly any pair passes both filters.",
                missed / Scale.GIGA);
    }
}

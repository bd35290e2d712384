package binspan.prediction;

import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.scenario.FibreSpan;
import binspan.scenario.LinkLength;
import binspan.scenario.PathElement;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;

/** Values and results that a person of the trade would ask about (common practice). */
final class PlausibilityCautions {
    private static final String CODE = "unusual-value";

    private PlausibilityCautions() {}

    static void add(LinkPrediction p, FiniteKeyOutlook finite, Cautions cautions) {
        Scenario scenario = p.scenario();
        source(scenario, cautions);
        range(
                cautions,
                "timing.windowWidthPs over the separation",
                p.windowWidth() / p.imbalances().common(),
                0.0,
                0.5,
                "");
        arm("alice", scenario.alice(), cautions);
        arm("bob", scenario.bob(), cautions);
        double length = new LinkLength().value(scenario).orElse(0.0);
        cautions.when(
                p.fringe().raw() > 0.99 && length > 1.0,
                "visibility-too-good",
                "A raw visibility of %.4f over deployed fibre is better than links show: look for a loss or noise left out.",
                p.fringe().raw());
        cautions.when(
                finite.secondsToFirstKey() < 600.0 && length >= 290.0,
                "first-key-too-soon",
                "A first finite key after %.0f s over %.0f km is sooner than links show: look for a loss left out.",
                finite.secondsToFirstKey(),
                length);
    }

    private static void source(Scenario scenario, Cautions cautions) {
        scenario.source()
                .meanPairsPerCycle()
                .ifPresent(mean -> range(cautions, "source.meanPairsPerCycle", mean, 0.002, 0.12, ""));
        scenario.source()
                .pairRatePerSecond()
                .ifPresent(rate -> range(cautions, "source.pairRatePerSecond", rate, 1e5, 3e7, "1/s"));
        range(
                cautions,
                "source.signal.bandwidthFwhmGHz",
                scenario.source().signal().bandwidthFwhmGHz(),
                10.0,
                200.0,
                "GHz");
        range(
                cautions,
                "source.idler.bandwidthFwhmGHz",
                scenario.source().idler().bandwidthFwhmGHz(),
                10.0,
                200.0,
                "GHz");
        range(cautions, "imbalanceNs", scenario.imbalanceNs(), 0.1, 5.0, "ns");
        boolean pair = scenario.source().pump().mode() == PumpMode.PULSE_PAIR;
        cautions.when(
                pair
                        && scenario.source().pump().earlyPairFraction()
                                        * (1.0 - scenario.source().pump().earlyPairFraction())
                                < 0.09,
                CODE,
                "source.pump.earlyPairFraction is %.2f; usual is about 0.5.",
                scenario.source().pump().earlyPairFraction());
    }

    private static void arm(String name, Arm arm, Cautions cautions) {
        range(cautions, name + ".sourceCouplingLossDb", arm.sourceCouplingLossDb(), 0.5, 8.0, "dB");
        range(cautions, name + ".analyzer.excessLossDb", arm.analyzer().excessLossDb(), 0.3, 5.0, "dB");
        range(cautions, name + ".analyzer.phaseNoiseRmsRad", arm.analyzer().phaseNoiseRmsRad(), 0.0, 0.3, "rad");
        for (int i = 0; i < arm.path().size(); i++) {
            fibre(name + ".path[" + i + "]", arm.path().get(i), cautions);
        }
        for (int port = 0; port < arm.detectors().size(); port++) {
            detector(name + ".detectors[" + port + "]", arm.detectors().get(port), cautions);
        }
    }

    private static void fibre(String at, PathElement element, Cautions cautions) {
        if (element instanceof FibreSpan span && span.attenuationDbPerKm().isPresent()) {
            range(
                    cautions,
                    at + ".attenuationDbPerKm",
                    span.attenuationDbPerKm().getAsDouble(),
                    0.15,
                    0.6,
                    "dB/km");
        }
    }

    private static void detector(String at, Detector detector, Cautions cautions) {
        range(cautions, at + ".jitterFwhmPs", detector.jitterFwhmPs(), 10.0, 1000.0, "ps");
        if (detector.gate().isPresent()) {
            double perNanosecond = detector.gate().get().darkProbability()
                    / detector.gate().get().widthNs();
            range(cautions, at + ".gate.darkProbability per ns", perNanosecond, 1e-7, 1e-3, "");
        } else {
            range(
                    cautions,
                    at + ".darkCountsPerSecond",
                    detector.darkCountsPerSecond(),
                    1.0,
                    500.0 * Scale.KILO,
                    "1/s");
        }
    }

    private static void range(
            Cautions cautions, String what, double value, double lowest, double highest, String unit) {
        cautions.when(
                value < lowest || value > highest,
                CODE,
                "%s is %s; usual is %s to %s%s (common practice).",
                what,
                Figures.short3(value),
                Figures.short3(lowest),
                Figures.short3(highest),
                unit.isEmpty() ? "" : " " + unit);
    }
}

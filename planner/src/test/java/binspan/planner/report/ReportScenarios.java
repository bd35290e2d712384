package binspan.planner.report;

import binspan.prediction.LinkCheck;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioBuilder;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Links whose reports the tests read: one that meets everything, one that fails, one for each kind of pump. */
final class ReportScenarios {
    private ReportScenarios() {}

    /** A pulse pair that meets all requirements there are. */
    static Values good() {
        Values stated = link(
                "Kestrel Dam to Millbrook",
                pulsePair(),
                arm(30.0, 2, DetectorClass.SNSPD),
                arm(28.0, 2, DetectorClass.SNSPD));
        stated.put("provenance", Map.of("alice.path.cable.lengthKm", "measured 2026-10-02"));
        return stated.put("require", demands(0.85, 2.3));
    }

    /** The same over a distance that avalanche diodes do not bridge. */
    static Values failing() {
        Values alice = arm(60.0, 2, DetectorClass.INGAAS_FREE_RUNNING);
        Values bob = arm(75.0, 2, DetectorClass.INGAAS_GATED);
        Values stated = link("Long way round", pulsePair(), alice, bob);
        stated.section("timing").put("windowWidthPs", 1000.0);
        return stated.put("require", demands(0.9, 2.3));
    }

    static Values continuous() {
        Values pump = new Values().put("mode", PumpMode.CONTINUOUS).put("coherenceTimeNs", 300.0);
        Values source = source(pump).put("pairRatePerSecond", 4e6);
        return link("Never ending", source, arm(30.0, 2, DetectorClass.SNSPD), arm(30.0, 2, DetectorClass.SNSPD));
    }

    static Values pulseTrain() {
        Values pump = new Values()
                .put("mode", PumpMode.PULSE_TRAIN)
                .put("pairEmissionFwhmPs", 40.0)
                .put("coherenceTimeNs", 300.0);
        Values source = source(pump).put("meanPairsPerCycle", 0.01);
        return link("Quick march", source, arm(30.0, 2, DetectorClass.SNSPD), arm(30.0, 2, DetectorClass.SNSPD))
                .put("imbalanceNs", 0.8);
    }

    /** A continuous pump with one detected port on each side: no key. */
    static Values onePort() {
        Values stated = continuous();
        return stated.put("alice", arm(30.0, 1, DetectorClass.SNSPD)).put("bob", arm(30.0, 1, DetectorClass.SNSPD));
    }

    static LinkCheck check(Values stated) {
        return LinkCheck.of(scenario(stated));
    }

    static Scenario scenario(Values stated) {
        ScenarioBuilder.Outcome outcome = ScenarioBuilder.build(stated);
        return outcome.scenario()
                .orElseThrow(
                        () -> new IllegalArgumentException(outcome.problems().toString()));
    }

    /** One of every requirement. */
    private static Values demands(double visibility, double chsh) {
        return new Values()
                .put("rawVisibilityAtLeast", visibility)
                .put("chshAtLeast", chsh)
                .put("phaseBasisQberAtMost", 0.08)
                .put("timeBasisQberAtMost", 0.08)
                .put("keyRateAtLeastBps", 100.0)
                .put("carAtLeast", 5.0)
                .put("firstKeyWithinHours", 24.0)
                .put("fiveSigmaWithinHours", 12.0);
    }

    private static Values link(String name, Values source, Values alice, Values bob) {
        return new Values()
                .put("formatVersion", 1.0)
                .put("name", name)
                .put("imbalanceNs", 2.0)
                .put("source", source)
                .put("alice", alice)
                .put("bob", bob)
                .put("timing", new Values().put("windowWidthPs", 400.0));
    }

    private static Values pulsePair() {
        Values pump = new Values()
                .put("mode", PumpMode.PULSE_PAIR)
                .put("repetitionRateMHz", 80.0)
                .put("pairEmissionFwhmPs", 40.0);
        return source(pump).put("meanPairsPerCycle", 0.02);
    }

    private static Values source(Values pump) {
        return new Values()
                .put("pump", pump)
                .put("signal", new Values().put("wavelengthNm", 1546.12).put("bandwidthFwhmGHz", 75.0))
                .put("idler", new Values().put("channel", 30.0).put("bandwidthFwhmGHz", 75.0));
    }

    private static Values arm(double lengthKm, int ports, DetectorClass detectors) {
        Values fibre = new Values("fibre")
                .put("label", "cable")
                .put("fibre", FibreClass.G652D)
                .put("lengthKm", lengthKm)
                .put("connectors", 2.0);
        List<Values> detected = new ArrayList<>();
        for (int port = 0; port < ports; port++) {
            detected.add(new Values().put("class", detectors));
        }
        return new Values()
                .put("path", new ArrayList<>(List.of(fibre)))
                .put("analyzer", new Values().put("temperatureRmsMilliK", 5.0))
                .put("detectors", detected);
    }
}

package binspan;

import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;

/**
 * Links without loss, noise, jitter or phase error, of which a test spoils one thing at a time: both ports of both sides
 * detected with certainty, no fibre.
 */
public final class IdealLink {
    private IdealLink() {}

    /** Pulse pair made by an interferometer. */
    public static Values pulsePair() {
        return ideal(SampleScenarios.pulsePair());
    }

    /** Endless train of coherent pulses. */
    public static Values pulseTrain() {
        return ideal(coherent(SampleScenarios.pulseTrain()));
    }

    /** Continuous pump of a perfectly coherent laser. */
    public static Values continuous() {
        return ideal(coherent(SampleScenarios.continuous()));
    }

    /** The scenario of these statements. */
    public static Scenario build(Values stated) {
        return SampleScenarios.build(stated);
    }

    /** States a field of both arms, for example {@code both(values, "analyzer", "excessLossDb", 1.0)}; part "" is the arm itself. */
    public static Values both(Values stated, String part, String name, Object value) {
        for (String arm : List.of("alice", "bob")) {
            SampleScenarios.part(stated, part.isEmpty() ? arm : arm + "." + part)
                    .put(name, value);
        }
        return stated;
    }

    /** States a field of every detector of an arm. */
    public static Values detectors(Values stated, String arm, String name, Object value) {
        SampleScenarios.part(stated, arm).list("detectors").forEach(detector -> detector.put(name, value));
        return stated;
    }

    /** A detector that sees every photon and nothing else. */
    public static Values detector() {
        return new Values()
                .put("efficiency", 1.0)
                .put("darkCountsPerSecond", 0.0)
                .put("jitterFwhmPs", 0.0)
                .put("deadTimeNs", 0.0)
                .put("afterpulseProbability", 0.0);
    }

    private static Values ideal(Values stated) {
        for (String arm : List.of("alice", "bob")) {
            SampleScenarios.part(stated, arm)
                    .put("path", new ArrayList<>())
                    .put("sourceCouplingLossDb", 0.0)
                    .put("clockJitterRmsPs", 0.0)
                    .put("tagBinPs", 0.0)
                    .put("detectors", new ArrayList<>(List.of(detector(), detector())));
            SampleScenarios.part(stated, arm + ".analyzer")
                    .put("excessLossDb", 0.0)
                    .put("phaseNoiseRmsRad", 0.0);
        }
        return stated;
    }

    /** A pump whose coherence is not stated is perfectly coherent. */
    private static Values coherent(Values stated) {
        return SampleScenarios.without(stated, "source.pump.coherenceTimeNs");
    }
}

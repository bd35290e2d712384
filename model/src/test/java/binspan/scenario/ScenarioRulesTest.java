package binspan.scenario;

import static binspan.scenario.SampleScenarios.part;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** What fields ask of one another: each rule broken alone, with the only problem that it may report. */
final class ScenarioRulesTest {

    @ParameterizedTest(name = "{0}")
    @MethodSource({"pumpRules", "alternatives", "siteRules", "pathRules", "entryRules"})
    void brokenRuleIsReportedOnceAtItsPlace(String path, String message, Supplier<Values> broken) {
        ScenarioBuilder.Outcome outcome = ScenarioBuilder.build(broken.get());

        assertThat(outcome.problems()).containsExactly(new Problem(path, message));
        assertThat(outcome.scenario()).isEmpty();
    }

    @Test
    void compensatorMayStateBothItsLosses() {
        Values values = SampleScenarios.everything();
        part(values, "alice.path[4]").put("figureOfMeritPsPerNmDb", 300.0);

        assertThat(ScenarioBuilder.build(values).problems()).isEmpty();
    }

    @Test
    void gatedClassGoesWithAContinuousPumpOnceItsDarkCountsAreStated() {
        Values values = SampleScenarios.continuous();
        part(values, "bob.detectors[0]")
                .put("class", DetectorClass.INGAAS_GATED)
                .put("darkCountsPerSecond", 9000.0);

        assertThat(ScenarioBuilder.build(values).problems()).isEmpty();
    }

    @Test
    void labelMayRecurInTheOtherArm() {
        Values values = SampleScenarios.pulsePair();

        assertThat(part(values, "alice.path[0]").text("label"))
                .isEqualTo(part(values, "bob.path[0]").text("label"));
        assertThat(ScenarioBuilder.build(values).problems()).isEmpty();
    }

    static Stream<Arguments> pumpRules() {
        return Stream.of(
                broken(
                        "source.pump.repetitionRateMHz",
                        "missing; a pulse-pair pump needs it",
                        () -> without(SampleScenarios.pulsePair(), "source.pump", "repetitionRateMHz")),
                broken(
                        "source.pump.pairEmissionFwhmPs",
                        "missing; a pulse-pair pump needs it",
                        () -> without(SampleScenarios.pulsePair(), "source.pump", "pairEmissionFwhmPs")),
                broken(
                        "source.pump.pairEmissionFwhmPs",
                        "missing; a pulse-train pump needs it",
                        () -> without(SampleScenarios.pulseTrain(), "source.pump", "pairEmissionFwhmPs")),
                broken(
                        "source.meanPairsPerCycle",
                        "missing; a pulse-pair pump needs it",
                        () -> without(SampleScenarios.pulsePair(), "source", "meanPairsPerCycle")),
                broken(
                        "source.meanPairsPerCycle",
                        "missing; a pulse-train pump needs it",
                        () -> without(SampleScenarios.pulseTrain(), "source", "meanPairsPerCycle")),
                broken(
                        "source.pairRatePerSecond",
                        "missing; a continuous pump needs it",
                        () -> without(SampleScenarios.continuous(), "source", "pairRatePerSecond")),
                broken(
                        "source.pairRatePerSecond",
                        "does not go with a pulse-pair pump; give meanPairsPerCycle",
                        () -> stating(SampleScenarios.pulsePair(), "source", "pairRatePerSecond", 1e6)),
                broken(
                        "source.pairRatePerSecond",
                        "does not go with a pulse-train pump; give meanPairsPerCycle",
                        () -> stating(SampleScenarios.pulseTrain(), "source", "pairRatePerSecond", 1e6)),
                broken(
                        "source.meanPairsPerCycle",
                        "does not go with a continuous pump; give pairRatePerSecond",
                        () -> stating(SampleScenarios.continuous(), "source", "meanPairsPerCycle", 0.02)),
                broken(
                        "source.signal.uncorrelatedPhotonsPerSecond",
                        "does not go with a pulse-pair pump; give uncorrelatedPhotonsPerCycle",
                        () -> stating(
                                SampleScenarios.pulsePair(), "source.signal", "uncorrelatedPhotonsPerSecond", 1e3)),
                broken(
                        "source.idler.uncorrelatedPhotonsPerSecond",
                        "does not go with a pulse-train pump; give uncorrelatedPhotonsPerCycle",
                        () -> stating(
                                SampleScenarios.pulseTrain(), "source.idler", "uncorrelatedPhotonsPerSecond", 1e3)),
                broken(
                        "source.idler.uncorrelatedPhotonsPerCycle",
                        "does not go with a continuous pump; give uncorrelatedPhotonsPerSecond",
                        () -> stating(
                                SampleScenarios.continuous(), "source.idler", "uncorrelatedPhotonsPerCycle", 0.1)),
                broken(
                        "source.pump.mode",
                        "missing; needs continuous | pulse-pair | pulse-train: how the pump light is emitted",
                        () -> without(SampleScenarios.pulsePair(), "source.pump", "mode")));
    }

    static Stream<Arguments> alternatives() {
        return Stream.of(
                broken(
                        "source.pump.linewidthMHz",
                        "found beside coherenceTimeNs; allowed only one of coherenceTimeNs, linewidthMHz",
                        () -> stating(SampleScenarios.continuous(), "source.pump", "linewidthMHz", 1.0)),
                broken(
                        "source.unheraldedG2",
                        "found beside schmidtNumber; allowed only one of schmidtNumber, unheraldedG2",
                        () -> stating(SampleScenarios.everything(), "source", "unheraldedG2", 1.3)),
                broken(
                        "source.idler",
                        "missing one of wavelengthNm, frequencyTHz, channel",
                        () -> without(SampleScenarios.pulsePair(), "source.idler", "channel")),
                broken(
                        "source.idler.channel",
                        "found beside frequencyTHz; allowed only one of wavelengthNm, frequencyTHz, channel",
                        () -> stating(SampleScenarios.pulsePair(), "source.idler", "frequencyTHz", 193.0)),
                broken(
                        "alice.path[4]",
                        "missing one of dispersionPsPerNm, share",
                        () -> without(SampleScenarios.everything(), "alice.path[4]", "share")),
                broken(
                        "alice.path[4].share",
                        "found beside dispersionPsPerNm; allowed only one of dispersionPsPerNm, share",
                        () -> stating(SampleScenarios.everything(), "alice.path[4]", "dispersionPsPerNm", -300.0)),
                broken(
                        "bob.detectors[0].gate",
                        "found beside darkCountsPerSecond; allowed only one of darkCountsPerSecond, gate",
                        () -> stating(SampleScenarios.everything(), "bob.detectors[0]", "darkCountsPerSecond", 100.0)),
                broken(
                        "spread.both.detectors.efficiency.triangular",
                        "found beside normal; allowed only one of normal, uniform, triangular",
                        () -> stating(
                                SampleScenarios.pulsePair(),
                                "",
                                "spread",
                                Map.of(
                                        "both.detectors.efficiency",
                                        new Values().put("normal", 0.1).put("triangular", 0.2)))),
                broken(
                        "spread.both.detectors.efficiency",
                        "missing one of normal, uniform, triangular",
                        () -> stating(
                                SampleScenarios.pulsePair(),
                                "",
                                "spread",
                                Map.of("both.detectors.efficiency", new Values()))));
    }

    static Stream<Arguments> siteRules() {
        String noSlots =
                "found gating with a continuous pump, which has no slots to gate; needs a free-running detector";
        return Stream.of(
                broken(
                        "bob.photon",
                        "found signal, which alice has; allowed the other photon of the pair",
                        () -> stating(
                                stating(SampleScenarios.pulsePair(), "alice", "photon", Photon.SIGNAL),
                                "bob",
                                "photon",
                                Photon.SIGNAL)),
                broken(
                        "bob.photon",
                        "found idler, which alice has; allowed the other photon of the pair",
                        () -> stating(
                                stating(SampleScenarios.pulsePair(), "alice", "photon", Photon.IDLER),
                                "bob",
                                "photon",
                                Photon.IDLER)),
                broken(
                        "alice.detectors[1].gate",
                        noSlots,
                        () -> stating(
                                SampleScenarios.continuous(),
                                "alice.detectors[1]",
                                "gate",
                                new Values().put("darkProbability", 1e-5))),
                broken(
                        "bob.detectors[0].class",
                        noSlots,
                        () -> stating(
                                SampleScenarios.continuous(), "bob.detectors[0]", "class", DetectorClass.INGAAS_GATED)),
                broken(
                        "bob.detectors[0].gate.darkProbability",
                        "missing; needs 0 to 1: dark click probability per gate",
                        () -> without(SampleScenarios.everything(), "bob.detectors[0].gate", "darkProbability")));
    }

    static Stream<Arguments> pathRules() {
        return Stream.of(
                broken(
                        "alice.path[2].label",
                        "found \"valley duct\" a second time; allowed a label that no other element has",
                        () -> stating(SampleScenarios.everything(), "alice.path[2]", "label", "valley duct")),
                broken(
                        "alice.path[4]",
                        "missing one of lossDb, figureOfMeritPsPerNmDb",
                        () -> without(SampleScenarios.everything(), "alice.path[4]", "lossDb")),
                broken(
                        "alice.path[1].classicalChannels",
                        "found classical light and no filter after this fibre; needs a filter element between here and the analyzer",
                        ScenarioRulesTest::filterBeforeTheClassicalLight));
    }

    static Stream<Arguments> entryRules() {
        return Stream.of(
                broken(
                        "spread.source.pump.mode",
                        "found a path to something without a number; allowed a number's path",
                        () -> spread("source.pump.mode")),
                broken(
                        "spread.alice.detectors.eficiency",
                        "unknown path \"alice.detectors.eficiency\": detector has no \"eficiency\"; did you mean efficiency?",
                        () -> spread("alice.detectors.eficiency")),
                broken(
                        "spread.both.path.duct.lengthKm",
                        "unknown path \"both.path.duct.lengthKm\"; name one element of path by its label or as [0]; labels: cable",
                        () -> spread("both.path.duct.lengthKm")),
                broken(
                        "provenance.timing.window",
                        "unknown path \"timing.window\": timing has no \"window\"; timing has windowWidthPs, cableTemperatureStepK",
                        () -> stating(
                                SampleScenarios.pulsePair(), "", "provenance", Map.of("timing.window", "chosen"))));
    }

    @ParameterizedTest
    @MethodSource("goodEntries")
    void entryOfAKnownPathIsAccepted(String section, String path, Object value) {
        Values values = SampleScenarios.pulsePair().put(section, Map.of(path, value));

        assertThat(ScenarioBuilder.build(values).problems()).isEmpty();
    }

    static Stream<Arguments> goodEntries() {
        return Stream.of(
                arguments("spread", "link.lengthKm", new Values().put("uniform", 2.0)),
                arguments(
                        "spread",
                        "both.path.cable.lengthKm",
                        new Values().put("triangular", 0.1).put("relative", true)),
                arguments("spread", "source.idler.channel", new Values().put("normal", 0.01)),
                arguments("provenance", "source.pump.mode", "design"),
                arguments("provenance", "alice.detectors", "data sheet"),
                arguments("provenance", "both.detectors[1].efficiency", "measured"));
    }

    private static Arguments broken(String path, String message, Supplier<Values> values) {
        return arguments(path, message, values);
    }

    private static Values spread(String path) {
        return stating(SampleScenarios.pulsePair(), "", "spread", Map.of(path, new Values().put("normal", 0.1)));
    }

    private static Values stating(Values root, String path, String field, Object value) {
        (path.isEmpty() ? root : part(root, path)).put(field, value);
        return root;
    }

    private static Values without(Values root, String path, String field) {
        return SampleScenarios.without(root, path + "." + field);
    }

    /** The only filter of the arm moved in front of the fibre that carries classical light. */
    private static Values filterBeforeTheClassicalLight() {
        Values root = SampleScenarios.everything();
        List<Values> path = part(root, "alice").list("path");
        part(root, "alice").put("path", List.of(path.get(3), path.get(0), path.get(1), path.get(2), path.get(4)));
        return root;
    }
}

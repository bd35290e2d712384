package binspan.scenario;

import static binspan.scenario.SampleScenarios.part;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** From what a file states to the scenario: defaults, and what is missing. */
final class ScenarioBuilderTest {

    @Test
    void statedNumbersReachTheirRecords() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair());

        assertThat(scenario.imbalanceNs()).isEqualTo(2.0);
        assertThat(scenario.source().pump().repetitionRateMHz()).hasValue(80.0);
        assertThat(scenario.source().meanPairsPerCycle()).hasValue(0.03);
        assertThat(scenario.source().idler().channel()).hasValue(30.0);
        assertThat(scenario.alice().path()).singleElement().isInstanceOfSatisfying(FibreSpan.class, span -> {
            assertThat(span.label()).contains("cable");
            assertThat(span.fibre()).isEqualTo(FibreClass.G652D);
            assertThat(span.connectors()).isEqualTo(2.0);
        });
        assertThat(scenario.pulsed()).isTrue();
    }

    @Test
    void allThreeModesBuild() {
        assertThat(SampleScenarios.build(SampleScenarios.continuous()).pulsed()).isFalse();
        assertThat(SampleScenarios.build(SampleScenarios.pulseTrain()).pulsed()).isTrue();
        assertThat(SampleScenarios.build(SampleScenarios.everything()).provenance())
                .hasSize(1);
    }

    /** The defaults that the description of the file format states. */
    @Test
    void omittedFieldsTakeTheDefaultsOfTheFormat() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair());
        FibreSpan span = (FibreSpan) scenario.bob().path().get(0);

        assertThat(scenario.protocol()).isEqualTo(new Protocol(1.16, 1e-10, 1e-15));
        assertThat(scenario.acquisition()).isEqualTo(new Acquisition(3600.0, 1.0, 16, 30.0));
        assertThat(scenario.source().pump().earlyPairFraction()).isEqualTo(0.5);
        assertThat(scenario.source().pump().preparation()).isEqualTo(Preparation.INTERFEROMETER);
        assertThat(scenario.source().signal().passband()).isEqualTo(PassbandShape.GAUSSIAN);
        assertThat(scenario.bob().analyzer())
                .isEqualTo(new Analyzer(0.0, 1.5, 0.0, 0.5, 0.5, 0.05, 0.0, 8.2e-6, 0.0, 1.0, 0.0));
        assertThat(scenario.bob().sourceCouplingLossDb()).isEqualTo(2.5);
        assertThat(scenario.bob().repairMarginDb()).isEqualTo(0.0);
        assertThat(scenario.timing().cableTemperatureStepK()).isEqualTo(0.0);
        // Slavik et al., Sci. Rep. 5, 15447 (2015): 39 ps/(km K)
        assertThat(span.delayPsPerKmK()).isEqualTo(39.0);
        assertThat(span.attenuationDbPerKm()).isEmpty();
        assertThat(span.classicalChannels()).isEmpty();
        assertThat(scenario.spread()).isEmpty();
        assertThat(scenario.provenance()).isEmpty();
    }

    @Test
    void requirementThatIsNotStatedIsNotRequired() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.everything());

        assertThat(scenario.require().rawVisibilityAtLeast()).hasValue(0.85);
        assertThat(scenario.require().chshAtLeast()).isEqualTo(OptionalDouble.empty());
    }

    @ParameterizedTest
    @EnumSource(DetectorClass.class)
    void detectorTakesWhatIsNotStatedFromItsClass(DetectorClass known) {
        Values values = SampleScenarios.pulsePair();
        part(values, "alice.detectors[0]").put("class", known).put("deadTimeNs", 77.0);
        Detector detector = SampleScenarios.build(values).alice().detectors().get(0);

        assertThat(detector.detectorClass()).contains(known);
        assertThat(detector.efficiency()).isEqualTo(known.typical().efficiency());
        assertThat(detector.jitterFwhmPs()).isEqualTo(known.typical().jitterFwhmPs());
        assertThat(detector.afterpulseProbability()).isEqualTo(known.typical().afterpulseProbability());
        assertThat(detector.darkCountsPerSecond()).isEqualTo(known.typical().darkCountsPerSecond());
        assertThat(detector.gate()).isEqualTo(known.gate());
        assertThat(detector.deadTimeNs()).as("stated").isEqualTo(77.0);
    }

    @Test
    void gatedClassComesWithItsGateUnlessDarkCountsAreStated() {
        Values values = SampleScenarios.pulsePair();
        part(values, "alice.detectors[0]").put("class", DetectorClass.INGAAS_GATED);
        part(values, "alice.detectors[1]")
                .put("class", DetectorClass.INGAAS_GATED)
                .put("darkCountsPerSecond", 9000.0);
        List<Detector> detectors = SampleScenarios.build(values).alice().detectors();

        assertThat(detectors.get(0).gate()).isPresent();
        assertThat(detectors.get(0).darkCountsPerSecond()).isEqualTo(0.0);
        assertThat(detectors.get(1).gate()).isEqualTo(Optional.empty());
        assertThat(detectors.get(1).darkCountsPerSecond()).isEqualTo(9000.0);
    }

    @Test
    void statedGateReplacesThatOfTheClassAndLeavesNoDarkCounts() {
        Values values = SampleScenarios.pulsePair();
        part(values, "alice.detectors[0]")
                .put("gate", new Values().put("rateMHz", 80.0).put("darkProbability", 1e-6));
        Detector detector = SampleScenarios.build(values).alice().detectors().get(0);

        assertThat(detector.gate()).contains(new Gate(OptionalDouble.of(80.0), 1.0, 1e-6));
        assertThat(detector.darkCountsPerSecond()).isEqualTo(0.0);
    }

    @Test
    void detectorWithoutClassStatesAllNumbersItself() {
        Values values = SampleScenarios.pulsePair();
        part(values, "bob").put("detectors", List.of(new Values()));

        assertThat(ScenarioBuilder.build(values).problems())
                .containsExactly(
                        new Problem("bob.detectors[0].efficiency", "missing; needs 1e-6 to 1: detection efficiency"),
                        new Problem(
                                "bob.detectors[0].darkCountsPerSecond",
                                "missing; needs 0 to 1e10 1/s: recorded dark counts of a free-running detector"),
                        new Problem(
                                "bob.detectors[0].jitterFwhmPs",
                                "missing; needs 0 to 1000000 ps: timing jitter with its electronics, FWHM"),
                        new Problem(
                                "bob.detectors[0].deadTimeNs", "missing; needs 0 to 1e9 ns: dead time after a click"),
                        new Problem(
                                "bob.detectors[0].afterpulseProbability",
                                "missing; needs 0 to 1: afterpulses per click"));
    }

    @ParameterizedTest
    @CsvSource(
            nullValues = "-",
            value = {
                "-, -, SIGNAL, IDLER",
                "SIGNAL, -, SIGNAL, IDLER",
                "IDLER, -, IDLER, SIGNAL",
                "-, SIGNAL, IDLER, SIGNAL",
                "-, IDLER, SIGNAL, IDLER",
                "IDLER, SIGNAL, IDLER, SIGNAL",
            })
    void photonThatIsNotStatedIsTheOneTheOtherArmLeaves(Photon aliceSays, Photon bobSays, Photon alice, Photon bob) {
        Values values = SampleScenarios.pulsePair();
        Optional.ofNullable(aliceSays).ifPresent(photon -> part(values, "alice").put("photon", photon));
        Optional.ofNullable(bobSays).ifPresent(photon -> part(values, "bob").put("photon", photon));
        Scenario scenario = SampleScenarios.build(values);

        assertThat(scenario.alice().photon()).isEqualTo(alice);
        assertThat(scenario.bob().photon()).isEqualTo(bob);
        assertThat(scenario.bandOf(scenario.bob()))
                .isEqualTo(
                        bob == Photon.SIGNAL
                                ? scenario.source().signal()
                                : scenario.source().idler());
    }

    @Test
    void buildingLeavesTheStatementsAsTheyWere() {
        Values values = SampleScenarios.pulsePair();
        part(values, "alice").put("photon", Photon.IDLER);
        Scenario first = SampleScenarios.build(values);

        assertThat(part(values, "bob").has("photon")).isFalse();
        assertThat(SampleScenarios.build(values)).isEqualTo(first);
        part(values, "alice").put("photon", Photon.SIGNAL);
        assertThat(SampleScenarios.build(values).bob().photon()).isEqualTo(Photon.IDLER);
    }

    @Test
    void wholeSectionsThatAreMissingAreOneProblemEach() {
        List<Problem> problems = ScenarioBuilder.build(new Values()).problems();

        assertThat(problems)
                .containsExactly(
                        new Problem("formatVersion", "missing; needs a whole number, 1: version of the file format"),
                        new Problem("name", "missing; needs a text: name of the link"),
                        new Problem(
                                "imbalanceNs",
                                "missing; needs 1e-6 to 10000 ns: nominal imbalance of all interferometers and bin separation (train: pulse period)"),
                        new Problem("source", "missing; needs an object: photon-pair source"),
                        new Problem("alice", "missing; needs an object: arm and site of alice"),
                        new Problem("bob", "missing; needs an object: arm and site of bob"),
                        new Problem("timing", "missing; needs an object: windows and what moves them"));
    }

    @Test
    void allProblemsAreReportedTogether() {
        Values values = SampleScenarios.pulsePair();
        part(values, "source.pump").put("linewidthMHz", 1.0).put("coherenceTimeNs", 300.0);
        part(values, "alice").put("path", List.of(new Values("loss"), new Values("fibre").put("lengthKm", 3.0)));
        ScenarioBuilder.Outcome outcome = ScenarioBuilder.build(values);

        assertThat(outcome.scenario()).isEmpty();
        assertThat(outcome.problems())
                .extracting(Problem::path)
                .containsExactly("source.pump.linewidthMHz", "alice.path[0].lossDb", "alice.path[1].fibre");
    }

    @Test
    void spreadsKeepTheOrderOfTheFile() {
        Map<String, Object> spreads = new LinkedHashMap<>();
        List<String> paths = List.of(
                "timing.windowWidthPs",
                "imbalanceNs",
                "bob.tagBinPs",
                "alice.tagBinPs",
                "source.meanPairsPerCycle",
                "link.lengthKm");
        paths.forEach(path -> spreads.put(path, new Values().put("normal", 0.1)));
        Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair().put("spread", spreads));

        assertThat(scenario.spread().keySet()).containsExactlyElementsOf(paths);
    }

    @Test
    void scenarioDoesNotShareItsMapsWithTheStatements() {
        Values values = SampleScenarios.pulsePair();
        Map<String, Object> notes = new HashMap<>(Map.of("timing.windowWidthPs", "chosen"));
        values.put("provenance", notes);
        Scenario scenario = SampleScenarios.build(values);
        notes.clear();

        assertThat(scenario.provenance()).containsExactly(Map.entry("timing.windowWidthPs", "chosen"));
    }
}

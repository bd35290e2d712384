package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.DetectorClass;
import binspan.scenario.PassbandShape;
import binspan.scenario.Preparation;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Every caution appears on a link made to provoke it, and on no calm one. */
final class CautionsTest {
    private static final Set<String> ALWAYS = Set.of("post-selection", "estimate-not-proof");

    @Test
    void calmLinksHaveOnlyTheCautionsThatAlwaysHold() {
        assertThat(codes(calmPair())).containsExactlyInAnyOrderElementsOf(always("watch-outer-times"));
        assertThat(codes(calmContinuous())).containsExactlyInAnyOrderElementsOf(always("double-clicks"));
        assertThat(codes(calmTrain())).containsExactlyInAnyOrderElementsOf(always("double-clicks"));
    }

    @ParameterizedTest
    @MethodSource
    void provokedOnAPulsePair(String code, String path, double value) {
        Values stated = calmPair();
        put(stated, path, value);
        assertThat(codes(stated)).contains(code);
    }

    static Stream<Arguments> provokedOnAPulsePair() {
        return Stream.of(
                Arguments.of("window-wider-than-separation", "timing.windowWidthPs", 2050.0),
                Arguments.of("slots-overlap", "imbalanceNs", 0.15),
                Arguments.of("cycle-too-short", "source.pump.repetitionRateMHz", 150.0),
                Arguments.of("windows-missed", "alice.delayErrorPs", 510.0),
                Arguments.of("windows-missed", "bob.delayErrorPs", -510.0),
                Arguments.of("windows-missed", "timing.cableTemperatureStepK", 0.5),
                Arguments.of("herald-not-weak", "source.meanPairsPerCycle", 0.3),
                Arguments.of("single-photon-interference", "imbalanceNs", 0.02),
                Arguments.of("energy-not-conserved", "source.pump.wavelengthNm", 780.0),
                Arguments.of("dead-time", "bob.detectors[1].deadTimeNs", 5000.0),
                Arguments.of("dead-time-blinds-slots", "bob.detectors[1].deadTimeNs", 2.1),
                Arguments.of("singles-crowd-window", "alice.detectors[0].backgroundCountsPerSecond", 8e7),
                Arguments.of("ports-differ", "alice.detectors[1].efficiency", 0.71),
                Arguments.of("visibility-too-good", "source.meanPairsPerCycle", 0.002),
                Arguments.of("unusual-value", "source.meanPairsPerCycle", 0.13),
                Arguments.of("unusual-value", "timing.windowWidthPs", 1100.0),
                Arguments.of("unusual-value", "imbalanceNs", 5.1),
                Arguments.of("unusual-value", "source.signal.bandwidthFwhmGHz", 210.0),
                Arguments.of("unusual-value", "source.pump.earlyPairFraction", 0.05),
                Arguments.of("unusual-value", "alice.sourceCouplingLossDb", 0.0),
                Arguments.of("unusual-value", "bob.analyzer.excessLossDb", 0.0),
                Arguments.of("unusual-value", "bob.analyzer.phaseNoiseRmsRad", 0.35),
                Arguments.of("unusual-value", "alice.path[0].attenuationDbPerKm", 0.1),
                Arguments.of("unusual-value", "alice.detectors[0].jitterFwhmPs", 3.0),
                Arguments.of("unusual-value", "alice.detectors[0].darkCountsPerSecond", 0.1),
                Arguments.of("field-without-effect", "source.pump.coherenceTimeNs", 300.0));
    }

    @ParameterizedTest
    @MethodSource
    void provokedOnOtherPumps(String code, String path, double value) {
        Values stated = path.equals("source.pump.earlyPairFraction") ? calmTrain() : calmContinuous();
        put(stated, path, value);
        assertThat(codes(stated)).contains(code);
    }

    static Stream<Arguments> provokedOnOtherPumps() {
        return Stream.of(
                Arguments.of("windows-missed", "alice.delayErrorPs", 510.0),
                Arguments.of("pump-coherence-short", "source.pump.coherenceTimeNs", 1.9),
                Arguments.of("slots-overlap", "imbalanceNs", 0.15),
                Arguments.of("unusual-value", "source.pairRatePerSecond", 5e7),
                Arguments.of("field-without-effect", "source.pump.mismatchPs", 0.1),
                Arguments.of("field-without-effect", "source.pump.phaseNoiseRmsRad", 0.1),
                Arguments.of("field-without-effect", "source.pump.repetitionRateMHz", 80.0),
                Arguments.of("field-without-effect", "source.pump.pairEmissionFwhmPs", 40.0),
                Arguments.of("field-without-effect", "source.pump.earlyPairFraction", 0.4),
                Arguments.of("field-without-effect", "source.schmidtNumber", 3.0),
                Arguments.of("field-without-effect", "source.unheraldedG2", 1.2));
    }

    @Test
    void provokedByAWordThatHasNoEffect() {
        Values stated = calmTrain();
        SampleScenarios.part(stated, "source.pump").put("preparation", Preparation.MODULATOR);
        assertThat(codes(stated)).contains("field-without-effect");
    }

    @Test
    void provokedByAPumpOfWhichNothingIsKnown() {
        assertThat(codes(SampleScenarios.without(calmContinuous(), "source.pump.coherenceTimeNs")))
                .contains("pump-coherence-not-stated");
        assertThat(codes(SampleScenarios.without(calmTrain(), "source.pump.coherenceTimeNs")))
                .contains("pump-coherence-not-stated");
    }

    @Test
    void provokedByANarrowFlatTopFilter() {
        Values stated = calmPair();
        SampleScenarios.part(stated, "source.idler")
                .put("passband", PassbandShape.FLAT_TOP)
                .put("bandwidthFwhmGHz", 12.0);
        assertThat(codes(stated)).contains("flat-top-side-lobes");
    }

    @Test
    void provokedByGates() {
        assertThat(codes(gated(80.0, 1.0))).contains("gates-miss-slots").doesNotContain("gate-narrower-than-window");
        assertThat(codes(gated(240.0, 0.5)))
                .contains("gate-narrower-than-window")
                .doesNotContain("gates-miss-slots");
        assertThat(codes(gated(240.0, 1.0))).doesNotContain("gates-miss-slots", "gate-narrower-than-window");
    }

    @Test
    void provokedByADetectorForOtherWavelengths() {
        Values stated = calmPair();
        SampleScenarios.part(stated, "alice.detectors[0]").put("class", DetectorClass.SILICON_APD);
        assertThat(codes(stated)).contains("detector-wavelength");
    }

    /** The narrow window of dispersed light selects part of the spectrum, which matters only where an imbalance is off. */
    @Test
    void provokedByAMismatchBehindDispersion() {
        Values dispersed = SampleScenarios.pulsePair();
        put(dispersed, "timing.windowWidthPs", 150.0);
        assertThat(codes(dispersed)).doesNotContain("window-selects-spectrum");
        put(dispersed, "alice.analyzer.mismatchPs", 0.5);
        assertThat(codes(dispersed)).contains("window-selects-spectrum");
    }

    /** With a continuous pump both arms may drift together, and dispersions may cancel. */
    @Test
    void onlyTheDifferenceOfTheArmsMattersWithAContinuousPump() {
        Values drifted = calmContinuous();
        put(drifted, "timing.cableTemperatureStepK", 0.5);
        assertThat(codes(drifted)).doesNotContain("windows-missed");

        Values cancelled = SampleScenarios.continuous();
        put(cancelled, "timing.windowWidthPs", 150.0);
        put(cancelled, "alice.analyzer.mismatchPs", 0.5);
        assertThat(codes(cancelled)).contains("window-selects-spectrum");
        put(cancelled, "alice.path[0].dispersionPsPerNmKm", 17.0);
        put(cancelled, "bob.path[0].dispersionPsPerNmKm", -17.0);
        assertThat(codes(cancelled)).doesNotContain("window-selects-spectrum");
    }

    /** The window of the uncompensated link cuts the singles, which are spread wider, more than the pairs. */
    @Test
    void provokedByAWindowThatCutsAccidentalsMoreThanPairs() {
        Values dispersed = SampleScenarios.pulsePair();
        put(dispersed, "timing.windowWidthPs", 300.0);
        assertThat(codes(dispersed)).contains("visibility-rises-with-length", "visibility-rises-with-jitter");

        Scenario scenario = SampleScenarios.build(dispersed);
        double visibility = LinkPredictor.predict(scenario).fringe().raw();
        assertThat(LinkPredictor.predict(SampleScenarios.with(scenario, "link.lengthKm", 66.0))
                        .fringe()
                        .raw())
                .isGreaterThan(visibility);
        assertThat(LinkPredictor.predict(SampleScenarios.with(scenario, "both.detectors.jitterFwhmPs", 70.0))
                        .fringe()
                        .raw())
                .isGreaterThan(visibility);
    }

    @Test
    void provokedByAKeyTooSoonOnALongLink() {
        Values stated = calmPair();
        for (String arm : List.of("alice", "bob")) {
            put(stated, arm + ".path[0].lengthKm", 150.0);
            put(stated, arm + ".path[0].attenuationDbPerKm", 0.05);
        }
        assertThat(codes(stated)).contains("first-key-too-soon");
    }

    /** The number of coincidences then depends on the settings: S, normalised by it, exceeds what entangled pairs can reach. */
    @Test
    void portsThatDifferOnBothSidesOverstateTheViolation() {
        Values stated = calmPair();
        put(stated, "source.meanPairsPerCycle", 0.002);
        put(stated, "alice.detectors[1].efficiency", 0.3);
        put(stated, "bob.detectors[1].efficiency", 0.3);
        assertThat(codes(stated)).contains("ports-differ");
        assertThat(LinkPredictor.predict(SampleScenarios.build(stated)).bell().chsh())
                .isGreaterThan(2.0 * Math.sqrt(2.0));
    }

    private static List<String> always(String other) {
        List<String> codes = new ArrayList<>(ALWAYS);
        codes.add(other);
        return codes;
    }

    private static Values calmPair() {
        return calm(SampleScenarios.pulsePair(), 1000.0);
    }

    private static Values calmContinuous() {
        return calm(SampleScenarios.continuous(), 1000.0);
    }

    private static Values calmTrain() {
        Values stated = calm(SampleScenarios.pulseTrain(), 1000.0);
        return stated.put("imbalanceNs", 2.0);
    }

    /** Compensated fibre, a window that captures everything, and detectors that recover within a slot. */
    private static Values calm(Values stated, double windowWidthPs) {
        put(stated, "timing.windowWidthPs", windowWidthPs);
        for (String arm : List.of("alice", "bob")) {
            SampleScenarios.part(stated, arm)
                    .list("path")
                    .get(0)
                    .put("dispersionPsPerNmKm", 0.0)
                    .put("pmdPsPerSqrtKm", 0.0);
            put(stated, arm + ".detectors[0].deadTimeNs", 1.0);
            put(stated, arm + ".detectors[1].deadTimeNs", 1.0);
        }
        return stated;
    }

    private static Values gated(double rateMHz, double widthNs) {
        Values stated = calmPair();
        put(stated, "timing.windowWidthPs", 900.0);
        for (int port = 0; port < 2; port++) {
            SampleScenarios.part(stated, "alice.detectors[" + port + "]")
                    .put("class", DetectorClass.INGAAS_GATED)
                    .put(
                            "gate",
                            new Values()
                                    .put("rateMHz", rateMHz)
                                    .put("widthNs", widthNs)
                                    .put("darkProbability", 2e-5));
        }
        return stated;
    }

    private static void put(Values stated, String path, double value) {
        int dot = path.lastIndexOf('.');
        Values part = dot < 0 ? stated : SampleScenarios.part(stated, path.substring(0, dot));
        part.put(path.substring(dot + 1), value);
    }

    private static Set<String> codes(Values stated) {
        LinkCheck check = RandomChecks.check(SampleScenarios.build(stated));
        return Cautions.of(check.prediction(), check.finite()).stream()
                .map(Caution::code)
                .collect(Collectors.toCollection(TreeSet::new));
    }
}

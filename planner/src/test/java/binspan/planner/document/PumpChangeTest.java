package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import binspan.planner.document.Change.Put;
import binspan.prediction.Caution;
import binspan.prediction.LinkCheck;
import binspan.prediction.SlotFit;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.Source;
import java.util.List;
import java.util.Map;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Another pump gives as much light per second; the cycles per second here are counted by hand. */
final class PumpChangeTest {
    private static final Percentage ROUNDED = Percentage.withPercentage(1e-9);

    private static boolean gated(Scenario scenario) {
        return scenario.alice().detectors().stream()
                .anyMatch(detector -> detector.gate().isPresent());
    }

    private static ScenarioDocument to(ScenarioDocument document, PumpMode mode) throws RefusedEditException {
        return document.with(PumpChange.to(document.scenario(), mode));
    }

    /** Pairs per second: a pulse pair has its own rate, a train one cycle for each bin separation. */
    private static double pairsPerSecond(Scenario scenario) {
        Source source = scenario.source();
        return switch (source.pump().mode()) {
            case CONTINUOUS -> source.pairRatePerSecond().orElseThrow();
            case PULSE_PAIR ->
                source.meanPairsPerCycle().orElseThrow()
                        * source.pump().repetitionRateMHz().orElseThrow()
                        * 1e6;
            case PULSE_TRAIN -> source.meanPairsPerCycle().orElseThrow() * 1e9 / scenario.imbalanceNs();
        };
    }

    @ParameterizedTest
    @EnumSource(PumpMode.class)
    void everyScenarioTakesEveryPumpAndTheOldOneAgain(PumpMode mode) throws RefusedEditException {
        for (ScenarioDocument document : ShippedDocuments.all()) {
            if (mode == PumpMode.CONTINUOUS && gated(document.scenario())) {
                continue;
            }
            ScenarioDocument changed = to(document, mode);
            assertThat(changed.scenario().source().pump().mode()).isEqualTo(mode);
            assertThat(pairsPerSecond(changed.scenario())).isCloseTo(pairsPerSecond(document.scenario()), ROUNDED);
            assertThat(LinkCheck.of(changed.scenario()).cautions())
                    .extracting(Caution::code)
                    .doesNotContain("field-without-effect");
            PumpMode old = document.scenario().source().pump().mode();
            ScenarioDocument back = to(changed, old);
            assertThat(pairsPerSecond(back.scenario())).isCloseTo(pairsPerSecond(document.scenario()), ROUNDED);
            if (mode == PumpMode.PULSE_PAIR && old != mode) {
                assertThat(SlotFit.room(changed.scenario())).isNotNegative();
            }
        }
    }

    @Test
    void theSamePumpIsNoChange() {
        Scenario scenario = ShippedDocuments.named("pulse-train").scenario();
        assertThat(PumpChange.to(scenario, PumpMode.PULSE_TRAIN)).isEmpty();
    }

    @Test
    void gatedDetectorsRefuseAContinuousPump() {
        ScenarioDocument gated = ShippedDocuments.named("avalanche");
        assertThatExceptionOfType(RefusedEditException.class)
                .isThrownBy(() -> to(gated, PumpMode.CONTINUOUS))
                .withMessageContaining(
                        "alice.detectors[0].gate: found gating with a continuous pump, which has no slots"
                                + " to gate; needs a free-running detector");
    }

    @Test
    void uncorrelatedPhotonsSpreadsAndProvenanceAreConverted() throws RefusedEditException {
        ScenarioDocument document = ShippedDocuments.named("kestrel-dam-to-millbrook")
                .with(List.of(
                        new Put("source.signal.uncorrelatedPhotonsPerCycle", 0.001),
                        new Put("source.idler.uncorrelatedPhotonsPerCycle", 0.0),
                        new Put("spread.source.signal.uncorrelatedPhotonsPerCycle", Map.of("normal", 0.0005))));
        ScenarioDocument continuous = to(document, PumpMode.CONTINUOUS);
        Source source = continuous.scenario().source();
        assertThat(source.signal().uncorrelatedPhotonsPerSecond()).isCloseTo(80_000.0, ROUNDED);
        assertThat(continuous.scenario().spread())
                .containsKey("source.pairRatePerSecond")
                .doesNotContainKey("source.meanPairsPerCycle");
        assertThat(continuous
                        .scenario()
                        .spread()
                        .get("source.signal.uncorrelatedPhotonsPerSecond")
                        .width())
                .isCloseTo(40_000.0, ROUNDED);
        assertThat(continuous.scenario().provenance()).containsKey("source.pairRatePerSecond");
        assertThat(to(continuous, PumpMode.PULSE_TRAIN)
                        .scenario()
                        .source()
                        .signal()
                        .uncorrelatedPhotonsPerCycle())
                .isCloseTo(80_000.0 * 2e-9, ROUNDED);
    }

    @Test
    void aPumpWithoutRoomForTheUsualRateGetsASlowerOne() throws RefusedEditException {
        ScenarioDocument wide = ShippedDocuments.named("continuous").with(List.of(new Put("imbalanceNs", 7.0)));
        Scenario pair = to(wide, PumpMode.PULSE_PAIR).scenario();
        // Three slots of 7 ns and a window fit 46 million times into a second.
        assertThat(pair.source().pump().repetitionRateMHz()).hasValue(46.0);
        assertThat(SlotFit.room(pair)).isNotNegative();
    }
}

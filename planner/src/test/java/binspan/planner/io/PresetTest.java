package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Starter scenarios read, and their values are what a person of the trade expects (common practice). */
final class PresetTest {

    private static Scenario read(Preset preset) throws Exception {
        return ScenarioReader.parse(preset.scenario(), preset.text());
    }

    private static Stream<Arm> arms(Scenario scenario) {
        return Stream.of(scenario.alice(), scenario.bob());
    }

    private static Stream<Detector> detectors(Scenario scenario) {
        return arms(scenario).flatMap(arm -> arm.detectors().stream());
    }

    @ParameterizedTest
    @EnumSource
    void pairsAreAsManyAsSourcesMake(Preset preset) throws Exception {
        Scenario scenario = read(preset);
        scenario.source()
                .meanPairsPerCycle()
                .ifPresent(pairs -> assertThat(pairs).isBetween(0.005, 0.06));
        scenario.source().pairRatePerSecond().ifPresent(rate -> assertThat(rate).isBetween(1e5, 3e7));
        assertThat(scenario.source().meanPairsPerCycle().isPresent()).isEqualTo(scenario.pulsed());
    }

    @ParameterizedTest
    @EnumSource
    void photonsConserveEnergyWithinTheirFilters(Preset preset) throws Exception {
        Scenario scenario = read(preset);
        double pumpHz = 299_792_458.0 / (scenario.source().pump().wavelengthNm().orElseThrow() * 1e-9);
        double pairHz = scenario.source().signal().centreHz()
                + scenario.source().idler().centreHz();
        assertThat(Math.abs(pumpHz - pairHz))
                .isLessThan(0.2 * scenario.source().signal().bandwidthFwhmGHz() * 1e9);
    }

    @ParameterizedTest
    @EnumSource
    void binsWindowsAndCyclesFit(Preset preset) throws Exception {
        Scenario scenario = read(preset);
        double separationPs = scenario.imbalanceNs() * 1e3;
        double windowPs = scenario.timing().windowWidthPs();
        assertThat(scenario.imbalanceNs()).isBetween(0.1, 5.0);
        assertThat(windowPs).isLessThanOrEqualTo(separationPs / 2);
        if (scenario.source().pump().mode() == PumpMode.PULSE_PAIR) {
            double cyclePs = 1e6 / scenario.source().pump().repetitionRateMHz().orElseThrow();
            assertThat(3 * separationPs + windowPs).isLessThan(cyclePs);
        }
        assertThat(windowPs)
                .isBetween(preset == Preset.AVALANCHE ? 500.0 : 100.0, preset == Preset.AVALANCHE ? 1000.0 : 400.0);
    }

    @ParameterizedTest
    @EnumSource
    void detectorsAreOrdinaryOnes(Preset preset) throws Exception {
        assertThat(detectors(read(preset)).toList()).hasSize(4).allSatisfy(detector -> {
            if (preset == Preset.AVALANCHE) {
                assertThat(detector.jitterFwhmPs()).isBetween(80.0, 400.0);
                assertThat(detector.gate().orElseThrow().darkProbability()).isBetween(1e-6, 1e-4);
            } else {
                assertThat(detector.detectorClass()).hasValue(DetectorClass.SNSPD);
                assertThat(detector.jitterFwhmPs()).isBetween(20.0, 100.0);
                assertThat(detector.darkCountsPerSecond()).isBetween(1.0, 300.0);
            }
        });
    }

    @ParameterizedTest
    @EnumSource
    void lossesAndNoiseAreThoseOfTheField(Preset preset) throws Exception {
        assertThat(arms(read(preset)).toList()).allSatisfy(arm -> {
            assertThat(arm.sourceCouplingLossDb()).isBetween(1.0, 4.0);
            assertThat(arm.clockJitterRmsPs()).isBetween(5.0, 30.0);
            assertThat(arm.analyzer().excessLossDb()).isBetween(0.5, 1.5);
            assertThat(arm.analyzer().phaseNoiseRmsRad()).isBetween(0.02, 0.15);
            FibreSpan span = (FibreSpan) arm.path().get(0);
            assertThat(span.lengthKm()).isPositive();
            assertThat(span.connectorLossDb()).isBetween(0.2, 0.5);
        });
    }

    @ParameterizedTest
    @EnumSource
    void filtersFitTheirGrid(Preset preset) throws Exception {
        Scenario scenario = read(preset);
        assertThat(List.of(scenario.source().signal(), scenario.source().idler()))
                .allSatisfy(band -> assertThat(band.bandwidthFwhmGHz())
                        .satisfiesAnyOf(
                                width -> assertThat(width).isBetween(25.0, 45.0),
                                width -> assertThat(width).isBetween(60.0, 90.0)));
    }

    @ParameterizedTest
    @EnumSource
    void commentsExplainAndRequirementsAsk(Preset preset) throws Exception {
        long comments =
                preset.scenario().lines().filter(line -> line.contains("//")).count();
        assertThat(comments).isGreaterThan(15);
        assertThat(preset.scenario().lines())
                .allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(120));
        assertThat(read(preset).require().rawVisibilityAtLeast()).isPresent();
        assertThat(read(preset).provenance()).isNotEmpty();
    }

    @Test
    void eachIsAboutWhatItsNameSays() throws Exception {
        assertThat(read(Preset.PULSE_PAIR).source().pump().mode()).isEqualTo(PumpMode.PULSE_PAIR);
        assertThat(read(Preset.CONTINUOUS).source().pump().mode()).isEqualTo(PumpMode.CONTINUOUS);
        assertThat(read(Preset.PULSE_TRAIN).source().pump().mode()).isEqualTo(PumpMode.PULSE_TRAIN);
        assertThat(detectors(read(Preset.AVALANCHE)))
                .allMatch(detector -> detector.gate().isPresent());
        assertThat(arms(read(Preset.COEXISTENCE)))
                .allMatch(arm ->
                        !((FibreSpan) arm.path().get(0)).classicalChannels().isEmpty());
    }
}

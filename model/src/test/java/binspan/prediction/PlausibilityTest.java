package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.PassbandShape;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * What a person of the trade expects of well-built links (common practice, no source): raw visibility and asymptotic key.
 *
 * <p>Of every link: 2.5 dB from the source into each fibre, analyzers of 2 dB, no classical traffic; nanowires of 80 %, 100 dark counts per second and
 * 60 ps unless another detector is named. What the expectation leaves open is chosen inside common practice and stands with each link. Ranges of an
 * expectation given as one number are a factor of two about it, a visibility's are half a hundredth.
 */
final class PlausibilityTest {

    @ParameterizedTest
    @MethodSource("links")
    void figuresFallWhereTheTradeExpectsThem(Values stated, Expected expected) {
        LinkCheck check = RandomChecks.check(SampleScenarios.build(stated));
        assertThat(check.prediction().fringe().raw()).isBetween(expected.visibilityFrom(), expected.visibilityTo());
        assertThat(check.prediction().key().asymptoticPerSecond()).isBetween(expected.keyFrom(), expected.keyTo());
        assertThat(check.finite().bitsPerSecond())
                .isLessThan(check.prediction().key().asymptoticPerSecond());
    }

    @ParameterizedTest
    @MethodSource("links")
    void nothingOfItIsUnusual(Values stated, Expected expected) {
        LinkCheck check = RandomChecks.check(SampleScenarios.build(stated));
        assertThat(Cautions.of(check.prediction(), check.finite()))
                .extracting(Caution::code)
                .doesNotContain(
                        "unusual-value",
                        "visibility-too-good",
                        "slots-overlap",
                        "cycle-too-short",
                        "flat-top-side-lobes",
                        "singles-crowd-window");
    }

    /** Sifted bits come in so fast there that a block suffices for a finite key after minutes, which long links do not show. */
    @Test
    void firstKeyOfTheFastestLongLinkIsQuestioned() {
        LinkCheck check = RandomChecks.check(SampleScenarios.build(fastPair(0.17, 10.0)));
        assertThat(check.finite().secondsToFirstKey()).isBetween(60.0, 600.0);
        assertThat(Cautions.of(check.prediction(), check.finite()))
                .extracting(Caution::code)
                .contains("first-key-too-soon");
    }

    /**
     * Where the figures must fall.
     *
     * @param visibilityFrom lowest raw visibility
     * @param visibilityTo highest raw visibility
     * @param keyFrom lowest asymptotic key, bit/s
     * @param keyTo highest asymptotic key, bit/s
     */
    private record Expected(double visibilityFrom, double visibilityTo, double keyFrom, double keyTo) {}

    static Stream<Arguments> links() {
        return Stream.of(
                row("2 x 30 km, pulse pair", shortPair(30.0), new Expected(0.88, 0.95, 1000.0, 4000.0)),
                row("2 x 30 km, continuous", shortContinuous(30.0), new Expected(0.975, 0.985, 900.0, 1600.0)),
                row("2 x 50 km, pulse pair", shortPair(50.0), new Expected(0.88, 0.98, 100.0, 500.0)),
                row("2 x 50 km, continuous", shortContinuous(50.0), new Expected(0.97, 0.98, 75.0, 220.0)),
                row("2 x 150 km, 80 MHz", longPair(0.20), new Expected(0.85, 0.95, 0.05, 0.2)),
                row("2 x 150 km, 1 GHz", fastPair(0.20, 100.0), new Expected(0.85, 0.95, 0.5, 2.0)),
                row("2 x 150 km, 1 GHz, 0.17 dB/km", fastPair(0.17, 10.0), new Expected(0.85, 0.95, 8.0, 20.0)),
                row("2 x 150 km, continuous", longContinuous(), new Expected(0.97, 0.99, 0.015, 0.06)),
                row("2 x 30 km, avalanche diodes", avalanche(), new Expected(0.88, 0.98, 20.0, 60.0)));
    }

    private static Arguments row(String name, Values stated, Expected expected) {
        return Arguments.of(Named.of(name, stated), expected);
    }

    /** 0.04 pairs per cycle behind 75 GHz Gaussian filters, windows of 300 ps, no compensation. */
    private static Values shortPair(double lengthKm) {
        Values stated = with(SampleScenarios.pulsePair(), lengthKm, 0.22, 300.0);
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", 0.04);
        return filters(stated, 75.0, PassbandShape.GAUSSIAN);
    }

    /** Four million pairs per second behind 75 GHz Gaussian filters, a window of 200 ps, no compensation. */
    private static Values shortContinuous(double lengthKm) {
        return filters(with(SampleScenarios.continuous(), lengthKm, 0.22, 200.0), 75.0, PassbandShape.GAUSSIAN);
    }

    /** Dispersion-shifted fibre, 0.1 pairs per cycle behind matched 75 GHz flat tops, windows of 300 ps. */
    private static Values longPair(double attenuation) {
        Values stated = shifted(with(SampleScenarios.pulsePair(), 150.0, attenuation, 300.0));
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", 0.1);
        return filters(stated, 75.0, PassbandShape.FLAT_TOP);
    }

    /** The same at 1 GHz: bins 280 ps apart, pulses of 20 ps, 90 GHz flat tops, windows of half a bin. */
    private static Values fastPair(double attenuation, double darkCounts) {
        Values stated = shifted(with(SampleScenarios.pulsePair(), 150.0, attenuation, 140.0));
        stated.put("imbalanceNs", 0.28);
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", 0.1);
        SampleScenarios.part(stated, "source.pump")
                .put("repetitionRateMHz", 1000.0)
                .put("pairEmissionFwhmPs", 20.0);
        for (Values detector : detectors(stated)) {
            detector.put("darkCountsPerSecond", darkCounts);
        }
        return filters(stated, 90.0, PassbandShape.FLAT_TOP);
    }

    /** Dispersion-shifted fibre, seven million pairs per second behind 75 GHz flat tops, a window of 200 ps. */
    private static Values longContinuous() {
        Values stated = shifted(with(SampleScenarios.continuous(), 150.0, 0.22, 200.0));
        SampleScenarios.part(stated, "source").put("pairRatePerSecond", 7e6);
        return filters(stated, 75.0, PassbandShape.FLAT_TOP);
    }

    /** Free-running diodes of 15 %, 2 kHz and 20 us; 0.02 pairs per cycle behind 40 GHz filters, windows of 700 ps. */
    private static Values avalanche() {
        Values stated = with(SampleScenarios.pulsePair(), 30.0, 0.22, 700.0);
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", 0.02);
        for (Values detector : detectors(stated)) {
            detector.put("class", DetectorClass.INGAAS_FREE_RUNNING);
        }
        return filters(stated, 40.0, PassbandShape.GAUSSIAN);
    }

    private static Values with(Values stated, double lengthKm, double attenuation, double windowWidthPs) {
        SampleScenarios.part(stated, "timing").put("windowWidthPs", windowWidthPs);
        for (String arm : List.of("alice", "bob")) {
            SampleScenarios.part(stated, arm).put("sourceCouplingLossDb", 2.5);
            SampleScenarios.part(stated, arm + ".analyzer").put("excessLossDb", 2.0);
            SampleScenarios.part(stated, arm + ".path[0]")
                    .put("lengthKm", lengthKm)
                    .put("attenuationDbPerKm", attenuation)
                    .put("connectors", 0.0);
        }
        return stated;
    }

    private static Values shifted(Values stated) {
        SampleScenarios.part(stated, "alice.path[0]").put("fibre", FibreClass.G653A);
        SampleScenarios.part(stated, "bob.path[0]").put("fibre", FibreClass.G653A);
        return stated;
    }

    private static Values filters(Values stated, double widthGHz, PassbandShape shape) {
        for (String band : List.of("source.signal", "source.idler")) {
            SampleScenarios.part(stated, band).put("bandwidthFwhmGHz", widthGHz).put("passband", shape);
        }
        return stated;
    }

    private static List<Values> detectors(Values stated) {
        return Stream.of("alice.detectors[0]", "alice.detectors[1]", "bob.detectors[0]", "bob.detectors[1]")
                .map(path -> SampleScenarios.part(stated, path))
                .toList();
    }
}

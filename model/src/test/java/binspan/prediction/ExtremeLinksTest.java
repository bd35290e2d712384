package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.merit.VisibilityBudget;
import binspan.scenario.FibreClass;
import binspan.scenario.PassbandShape;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Links at which a formula overflows, divides nothing by nothing or is integrated too coarsely, unless care is taken. */
final class ExtremeLinksTest {

    @Test
    void centresThatMissThePumpByManyWidthsLeaveFiniteCounts() {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "source.pump").put("wavelengthNm", 900.0);
        LinkPrediction prediction = LinkPredictor.predict(SampleScenarios.build(stated));
        assertThat(prediction.spectrum().bobPassesGivenAlice()).isBetween(Double.MIN_NORMAL, 1e-9);
        assertThat(prediction.counts().loadsA().get(0).recordedPerSecond()).isFinite();
        assertThat(prediction.fringe().raw()).isBetween(0.0, 1e-6);
    }

    @Test
    void interferometersWithTheLongPathShorterAreNoMoreCoherent() {
        Values stated = SampleScenarios.continuous();
        stated.put("imbalanceNs", 0.5);
        SampleScenarios.part(stated, "source.pump").put("coherenceTimeNs", 1.0);
        for (String arm : List.of("alice", "bob")) {
            SampleScenarios.part(stated, arm + ".analyzer").put("mismatchPs", -1500.0);
        }
        double coherence =
                LinkPredictor.predict(SampleScenarios.build(stated)).coherence().pump();
        assertThat(coherence).isCloseTo(Math.exp(-1.0), within(1e-12));
    }

    @Test
    void windowsThatCatchNothingLeaveABudget() {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "alice").put("delayErrorPs", 1e6);
        LinkPrediction prediction = LinkPredictor.predict(SampleScenarios.build(stated));
        assertThat(prediction.fringe().raw()).isZero();
        assertThat(prediction.budget().factor(VisibilityBudget.Cause.SLOT_OVERLAP))
                .isZero();
        assertThat(prediction.budget().entries()).allMatch(entry -> Double.isFinite(entry.factor()));
    }

    /** Behind 2000 km of fibre that swallows the classical light within a few, the Raman light of the first few arrives attenuated as the photons are. */
    @Test
    void classicalLightThatTheFibreSwallowsLeavesItsRamanLight() {
        Values channel = new Values()
                .put("launchDbm", 0.0)
                .put("wavelengthNm", 1310.0)
                .put("attenuationDbPerKm", 2.0)
                .put("ramanCoefficientPerKmNm", 1e-10);
        Values fibre = new Values("fibre")
                .put("fibre", FibreClass.G652D)
                .put("lengthKm", 2000.0)
                .put("measuredLossDb", 20.0)
                .put("classicalChannels", List.of(channel));
        Values filter = new Values("filter")
                .put("bandwidthFwhmGHz", 75.0)
                .put("lossDb", 0.8)
                .put("isolationDb", 200.0);
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "alice").put("path", List.of(fibre, filter));

        // 1 mW x 1e-10 /(km nm) x 0.6366 nm x 10^-2 / (0.4605 - 0.0023) /km, per photon of 1.285e-19 J, through 0.8 +
        // 1.5 dB.
        assertThat(LinkPredictor.predict(SampleScenarios.build(stated)).pathA().strayPhotonsPerSecond())
                .isBetween(6300.0, 6500.0);
    }

    /**
     * Filters much wider than the pulse's spectrum leave the arrival to pulse and detectors, so that their shape must not matter; long pulses and
     * narrow windows ask most of the average over the time of birth.
     */
    @ParameterizedTest
    @CsvSource({"40, 40, 200", "100, 40, 100", "200, 40, 60", "200, 20, 60", "200, 20, 400"})
    void shapeOfWideFiltersDoesNotMatter(double pulsePs, double jitterPs, double windowPs) {
        LinkPrediction flat = wide(PassbandShape.FLAT_TOP, pulsePs, jitterPs, windowPs);
        LinkPrediction gaussian = wide(PassbandShape.GAUSSIAN, pulsePs, jitterPs, windowPs);
        assertThat(flat.fringe().maxPerSecond() / gaussian.fringe().maxPerSecond())
                .isCloseTo(1.0, within(1e-4));
        assertThat(flat.fringe().raw()).isCloseTo(gaussian.fringe().raw(), within(1e-5));
    }

    private static LinkPrediction wide(PassbandShape shape, double pulsePs, double jitterPs, double windowPs) {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "timing").put("windowWidthPs", windowPs);
        SampleScenarios.part(stated, "source").put("schmidtNumber", 4.0).put("partnerPassProbability", 0.7);
        SampleScenarios.part(stated, "source.pump").put("pairEmissionFwhmPs", pulsePs);
        for (String band : List.of("source.signal", "source.idler")) {
            SampleScenarios.part(stated, band).put("bandwidthFwhmGHz", 2000.0).put("passband", shape);
        }
        for (String arm : List.of("alice", "bob")) {
            SampleScenarios.part(stated, arm + ".path[0]").put("dispersionPsPerNmKm", 0.0);
            SampleScenarios.part(stated, arm + ".detectors[0]").put("jitterFwhmPs", jitterPs);
            SampleScenarios.part(stated, arm + ".detectors[1]").put("jitterFwhmPs", jitterPs);
        }
        return LinkPredictor.predict(SampleScenarios.build(stated));
    }
}

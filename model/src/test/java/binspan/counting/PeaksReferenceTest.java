package binspan.counting;

import binspan.IdealLink;
import binspan.ReferenceCase;
import binspan.merit.ErrorRates;
import binspan.merit.SecretKey;
import binspan.merit.SiftedRates;
import binspan.optics.DifferenceCapture;
import binspan.optics.OpticalPaths;
import binspan.optics.PairSpectra;
import binspan.optics.PairSpectrum;
import binspan.optics.PathInputs;
import binspan.optics.PortTiming;
import binspan.optics.SpectrumInputs;
import binspan.optics.Window;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Analyzer;
import binspan.scenario.Arm;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Coincidence peaks and rates with a continuous pump. */
final class PeaksReferenceTest {
    private static final double PICO = 1e-12;

    /** So few pairs that accidentals do not show. */
    private static final double RARE = 1e-9;

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.of("peaks.csv");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("cases")
    void agrees(ReferenceCase c) {
        switch (c.id()) {
            case "cw-pair-model" -> rates(c);
            case "fr-postselect" -> postSelection(c);
            case "fr-armloss-1.0dB", "fr-armloss-2.0dB", "fr-armloss-3.0dB" -> pathLoss(c);
            default -> throw new IllegalStateException("no test for " + c.id());
        }
        c.finish();
    }

    private static void pathLoss(ReferenceCase c) {
        Values link = rare();
        SampleScenarios.part(link, "bob.analyzer")
                .put("longPathExtraLossDb", c.in("total_power_imbalance_LL_vs_SS_dB"));
        c.check("V", LinkPredictor.predict(IdealLink.build(link)).fringe().raw());
    }

    /** Windows that look for the photons one imbalance early or late find the side peaks. */
    private static void postSelection(ReferenceCase c) {
        LinkPrediction centred = LinkPredictor.predict(IdealLink.build(rare()));
        double central = centred.counts().central().sum(0.0);
        c.check("central_fraction_of_coincidences", central / centred.counts().allSlotsPerSecond());

        double early = central(-2000.0);
        c.check("peak_ratio", 1.0, central / early, central(2000.0) / early);
    }

    private static double central(double delayPs) {
        Values link = rare();
        SampleScenarios.part(link, "alice").put("delayErrorPs", delayPs);
        return LinkPredictor.predict(IdealLink.build(link)).counts().central().sum(0.0);
    }

    private static Values rare() {
        Values link = IdealLink.continuous();
        SampleScenarios.part(link, "source").put("pairRatePerSecond", RARE);
        return link;
    }

    /** Pairs without analyzers: all light in the short path to one port. The intrinsic error is a contrast 1 - 2 e of the pairs. */
    private static void rates(ReferenceCase c) {
        Scenario scenario = IdealLink.build(detectors(c));
        PairSpectrum spectrum = PairSpectra.of(SpectrumInputs.of(scenario));
        List<PortTiming> portsA = PortTiming.of(scenario.alice(), 0.0);
        List<PortTiming> portsB = PortTiming.of(scenario.bob(), 0.0);
        double window = c.in("t_cc_ps") * PICO;
        LinkCounts counts = ContinuousCounting.of(new ContinuousInputs(
                light(scenario, scenario.alice(), c.in("pair_rate")),
                light(scenario, scenario.bob(), c.in("pair_rate")),
                spectrum,
                0.0,
                portsA,
                portsB,
                1.0,
                c.in("pair_rate"),
                window,
                2e-9,
                2e-9,
                0.0));
        PortPair pair = counts.central().of(0, 0);
        double capture = DifferenceCapture.of(spectrum, 0.0, portsA.get(0), portsB.get(0), Window.of(window, 0.0));
        double captured = pair.atCosine(0.0) - pair.accidentalPerSecond();

        c.check("singlesA", counts.loadsA().get(0).recordedPerSecond());
        c.check("singlesB", counts.loadsB().get(0).recordedPerSecond());
        c.check("accidentals", pair.accidentalPerSecond());
        c.check("window_capture", capture);
        c.check("true_cc", captured / capture);
        c.check("measured_cc", pair.atCosine(0.0));
        key(c, captured, pair.accidentalPerSecond());
    }

    /** The same coincidences shared out over four port pairs; half of them sift. */
    private static void key(ReferenceCase c, double captured, double accidental) {
        LinkCounts counts = FringeCounts.of(1.0 - 2.0 * c.in("e_intrinsic"), captured, accidental);
        SiftedRates sifted = SiftedRates.of(counts, 0.0);
        ErrorRates errors = ErrorRates.of(counts, sifted, 1.0, 0.0);
        c.check("QBER", errors.phase());
        c.check("key_rate", SecretKey.of(counts, sifted, errors, c.in("f")).asymptoticPerSecond());
    }

    private static ArmLight light(Scenario scenario, Arm arm, double photons) {
        Analyzer straight = new Analyzer(0.0, 0.0, 0.0, 1.0, 1.0, 0.0, 0.0, 0.0, 0.0, 1.0, 0.0);
        Arm without = new Arm(
                arm.photon(),
                arm.sourceCouplingLossDb(),
                arm.path(),
                arm.repairMarginDb(),
                straight,
                arm.detectors(),
                arm.clockJitterRmsPs(),
                arm.tagBinPs(),
                arm.delayErrorPs());
        return ArmLight.of(without, OpticalPaths.of(PathInputs.of(scenario, without)), photons);
    }

    private static Values detectors(ReferenceCase c) {
        Values link = IdealLink.continuous();
        double jitter = c.in("timing_FWHM_ps") / Math.sqrt(2.0);
        for (String arm : List.of("alice", "bob")) {
            String side = arm.equals("alice") ? "A" : "B";
            IdealLink.detectors(link, arm, "efficiency", c.in("eta" + side));
            IdealLink.detectors(link, arm, "darkCountsPerSecond", c.in("dark" + side));
            IdealLink.detectors(link, arm, "jitterFwhmPs", jitter);
        }
        SampleScenarios.part(link, "source.signal").put("bandwidthFwhmGHz", 20_000.0);
        SampleScenarios.part(link, "source.idler").put("bandwidthFwhmGHz", 20_000.0);
        return link;
    }
}

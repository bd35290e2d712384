package binspan.prediction;

import binspan.counting.ArmLight;
import binspan.counting.ContinuousCounting;
import binspan.counting.ContinuousInputs;
import binspan.counting.LinkCounts;
import binspan.counting.PulsedCounting;
import binspan.counting.PulsedInputs;
import binspan.merit.BellTest;
import binspan.merit.ErrorRates;
import binspan.merit.FringeVisibility;
import binspan.merit.SecretKey;
import binspan.merit.SiftedRates;
import binspan.merit.VisibilityBudget;
import binspan.optics.ArrivalTime;
import binspan.optics.CaptureInputs;
import binspan.optics.Imbalances;
import binspan.optics.OpticalPath;
import binspan.optics.PairSpectrum;
import binspan.optics.PortTiming;
import binspan.optics.SlotCaptures;
import binspan.optics.TwoPhotonCoherence;
import binspan.scenario.Band;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;
import java.util.List;

/**
 * Predicts links: spectrum, paths, arrival, coherence, counts, figures of merit.
 *
 * <p>A prediction depends on its scenario alone. A predictor keeps the last result of each optical stage and computes it anew only where its inputs
 * have changed, so that studies which vary a few parameters do not repeat the rest; use one predictor per thread.
 */
public final class LinkPredictor {
    private final OpticsMemory memory = new OpticsMemory();

    /** Predicts one link. */
    public static LinkPrediction predict(Scenario scenario) {
        return new LinkPredictor().of(scenario);
    }

    /** Predicts a link, keeping what the next one may share with it. */
    public LinkPrediction of(Scenario scenario) {
        PairSpectrum spectrum = memory.spectrum(scenario);
        OpticalPath pathA = memory.alice(scenario);
        OpticalPath pathB = memory.bob(scenario);
        List<PortTiming> portsA = PortTiming.of(scenario.alice(), pathA.pmdRms());
        List<PortTiming> portsB = PortTiming.of(scenario.bob(), pathB.pmdRms());
        Imbalances imbalances = Imbalances.of(scenario);
        TwoPhotonCoherence coherence = TwoPhotonCoherence.of(scenario, spectrum, imbalances);
        Stage stage = new Stage(scenario, spectrum, pathA, pathB, portsA, portsB, imbalances, coherence.gamma());
        SlotCaptures captures = scenario.pulsed() ? captures(stage) : null;
        ArrivalTime arrival = captures == null
                ? ArrivalTime.of(spectrum, pathA.groupDelayDispersion(), pathB.groupDelayDispersion())
                : captures.arrival();
        LinkCounts counts = captures == null ? continuous(stage) : pulsed(stage, captures);
        FringeVisibility fringe = FringeVisibility.of(counts.central().of(0, 0));
        SiftedRates sifted = SiftedRates.of(counts, coherence.phaseOffset());
        ErrorRates errors = ErrorRates.of(counts, sifted, fringe.raw(), coherence.phaseOffset());
        return new LinkPrediction(
                scenario,
                spectrum,
                pathA,
                pathB,
                portsA,
                portsB,
                arrival,
                imbalances,
                coherence,
                counts,
                fringe,
                VisibilityBudget.of(coherence, counts, fringe.raw()),
                BellTest.of(counts, fringe.raw(), coherence.phaseOffset()),
                SecretKey.of(counts, sifted, errors, scenario.protocol().errorCorrectionEfficiency()));
    }

    /** What the counting stages share. */
    private record Stage(
            Scenario scenario,
            PairSpectrum spectrum,
            OpticalPath pathA,
            OpticalPath pathB,
            List<PortTiming> portsA,
            List<PortTiming> portsB,
            Imbalances imbalances,
            double gamma) {

        double lateA() {
            return LinkPrediction.late(scenario.alice(), pathA);
        }

        double lateB() {
            return LinkPrediction.late(scenario.bob(), pathB);
        }

        double windowWidth() {
            return scenario.timing().windowWidthPs() * Scale.PICO;
        }

        boolean endless() {
            return scenario.source().pump().mode() == PumpMode.PULSE_TRAIN;
        }
    }

    private SlotCaptures captures(Stage stage) {
        return memory.captures(new CaptureInputs(
                stage.spectrum(),
                stage.pathA().groupDelayDispersion(),
                stage.pathB().groupDelayDispersion(),
                stage.portsA(),
                stage.portsB(),
                stage.windowWidth(),
                stage.imbalances().common(),
                stage.lateA(),
                stage.lateB(),
                stage.endless()));
    }

    private static LinkCounts pulsed(Stage stage, SlotCaptures captures) {
        Scenario scenario = stage.scenario();
        double meanPairs = scenario.source().meanPairsPerCycle().orElseThrow();
        Band bandA = scenario.bandOf(scenario.alice());
        Band bandB = scenario.bandOf(scenario.bob());
        double photonsA = meanPairs / stage.spectrum().bobPassesGivenAlice() + bandA.uncorrelatedPhotonsPerCycle();
        double photonsB = meanPairs / stage.spectrum().alicePassesGivenBob() + bandB.uncorrelatedPhotonsPerCycle();
        return PulsedCounting.of(new PulsedInputs(
                ArmLight.of(scenario.alice(), stage.pathA(), photonsA),
                ArmLight.of(scenario.bob(), stage.pathB(), photonsB),
                captures,
                stage.gamma(),
                meanPairs,
                scenario.source().pump().earlyPairFraction(),
                stage.spectrum().schmidtNumber(),
                LinkPrediction.cyclesPerSecond(scenario),
                stage.windowWidth(),
                stage.endless()));
    }

    private static LinkCounts continuous(Stage stage) {
        Scenario scenario = stage.scenario();
        double pairs = scenario.source().pairRatePerSecond().orElseThrow();
        Band bandA = scenario.bandOf(scenario.alice());
        Band bandB = scenario.bandOf(scenario.bob());
        double photonsA = pairs / stage.spectrum().bobPassesGivenAlice() + bandA.uncorrelatedPhotonsPerSecond();
        double photonsB = pairs / stage.spectrum().alicePassesGivenBob() + bandB.uncorrelatedPhotonsPerSecond();
        return ContinuousCounting.of(new ContinuousInputs(
                ArmLight.of(scenario.alice(), stage.pathA(), photonsA),
                ArmLight.of(scenario.bob(), stage.pathB(), photonsB),
                stage.spectrum(),
                stage.pathA().groupDelayDispersion() + stage.pathB().groupDelayDispersion(),
                stage.portsA(),
                stage.portsB(),
                stage.gamma(),
                pairs,
                stage.windowWidth(),
                stage.imbalances().alice(),
                stage.imbalances().bob(),
                stage.lateA() - stage.lateB()));
    }
}

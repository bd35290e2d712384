package binspan.prediction;

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
import binspan.optics.OpticalPath;
import binspan.optics.TwoPhotonCoherence;
import binspan.scenario.Band;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;

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
        LinkOptics optics = memory.of(scenario);
        TwoPhotonCoherence coherence = optics.coherence();
        LinkCounts counts = scenario.pulsed() ? pulsed(scenario, optics) : continuous(scenario, optics);
        FringeVisibility fringe = FringeVisibility.of(counts.central().of(0, 0));
        SiftedRates sifted = SiftedRates.of(counts, coherence.phaseOffset());
        ErrorRates errors = ErrorRates.of(counts, sifted, fringe.raw(), coherence.phaseOffset());
        return new LinkPrediction(
                scenario,
                optics,
                counts,
                fringe,
                BellTest.of(counts, fringe.raw(), coherence.phaseOffset()),
                SecretKey.of(counts, sifted, errors, scenario.protocol().errorCorrectionEfficiency()));
    }

    private static LinkCounts pulsed(Scenario scenario, LinkOptics optics) {
        double meanPairs = scenario.source().meanPairsPerCycle().orElseThrow();
        Band bandA = scenario.bandOf(scenario.alice());
        Band bandB = scenario.bandOf(scenario.bob());
        double photonsA = meanPairs / optics.spectrum().bobPassesGivenAlice() + bandA.uncorrelatedPhotonsPerCycle();
        double photonsB = meanPairs / optics.spectrum().alicePassesGivenBob() + bandB.uncorrelatedPhotonsPerCycle();
        return PulsedCounting.of(new PulsedInputs(
                optics.alice().light().carrying(photonsA),
                optics.bob().light().carrying(photonsB),
                optics.captures(),
                optics.coherence().gamma(),
                meanPairs,
                scenario.source().pump().earlyPairFraction(),
                optics.spectrum().schmidtNumber(),
                LinkPrediction.cyclesPerSecond(scenario),
                scenario.timing().windowWidthPs() * Scale.PICO,
                scenario.source().pump().mode() == PumpMode.PULSE_TRAIN));
    }

    private static LinkCounts continuous(Scenario scenario, LinkOptics optics) {
        double pairs = scenario.source().pairRatePerSecond().orElseThrow();
        Band bandA = scenario.bandOf(scenario.alice());
        Band bandB = scenario.bandOf(scenario.bob());
        double photonsA = pairs / optics.spectrum().bobPassesGivenAlice() + bandA.uncorrelatedPhotonsPerSecond();
        double photonsB = pairs / optics.spectrum().alicePassesGivenBob() + bandB.uncorrelatedPhotonsPerSecond();
        OpticalPath pathA = optics.alice().path();
        OpticalPath pathB = optics.bob().path();
        return ContinuousCounting.of(new ContinuousInputs(
                optics.alice().light().carrying(photonsA),
                optics.bob().light().carrying(photonsB),
                optics.spectrum(),
                pathA.groupDelayDispersion() + pathB.groupDelayDispersion(),
                optics.alice().ports(),
                optics.bob().ports(),
                optics.coherence().gamma(),
                pairs,
                scenario.timing().windowWidthPs() * Scale.PICO,
                optics.imbalances().alice(),
                optics.imbalances().bob(),
                LinkPrediction.late(scenario.alice(), pathA) - LinkPrediction.late(scenario.bob(), pathB)));
    }
}

package binspan.prediction;

import binspan.scenario.Detector;
import binspan.scenario.Edits;
import binspan.scenario.Scenario;

/** A scenario whose detectors jitter more. */
final class MoreJitter {
    private MoreJitter() {}

    static Scenario of(Scenario scenario, double factor) {
        return Edits.arms(scenario, arm -> Edits.detectors(arm, detector -> of(detector, factor)));
    }

    private static Detector of(Detector d, double factor) {
        return new Detector(
                d.detectorClass(),
                d.efficiency(),
                d.darkCountsPerSecond(),
                d.backgroundCountsPerSecond(),
                d.gate(),
                d.jitterFwhmPs() * factor,
                d.jitterTailFraction(),
                d.jitterTailPs(),
                d.deadTimeNs(),
                d.afterpulseProbability());
    }
}

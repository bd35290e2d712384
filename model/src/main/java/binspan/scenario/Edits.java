package binspan.scenario;

import java.util.function.UnaryOperator;

/** Copies of a scenario with a part exchanged. */
public final class Edits {
    private Edits() {}

    /** The same scenario with both arms changed. */
    public static Scenario arms(Scenario s, UnaryOperator<Arm> change) {
        return new Scenario(
                s.formatVersion(),
                s.name(),
                s.imbalanceNs(),
                s.source(),
                change.apply(s.alice()),
                change.apply(s.bob()),
                s.timing(),
                s.protocol(),
                s.acquisition(),
                s.require(),
                s.spread(),
                s.provenance());
    }

    /** The same arm with every path element changed. */
    public static Arm path(Arm arm, UnaryOperator<PathElement> change) {
        return new Arm(
                arm.photon(),
                arm.sourceCouplingLossDb(),
                arm.path().stream().map(change).toList(),
                arm.repairMarginDb(),
                arm.analyzer(),
                arm.detectors(),
                arm.clockJitterRmsPs(),
                arm.tagBinPs(),
                arm.delayErrorPs());
    }

    /** The same arm with every detector changed. */
    public static Arm detectors(Arm arm, UnaryOperator<Detector> change) {
        return new Arm(
                arm.photon(),
                arm.sourceCouplingLossDb(),
                arm.path(),
                arm.repairMarginDb(),
                arm.analyzer(),
                arm.detectors().stream().map(change).toList(),
                arm.clockJitterRmsPs(),
                arm.tagBinPs(),
                arm.delayErrorPs());
    }
}

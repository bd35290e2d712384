package binspan.scenario;

import java.util.List;
import java.util.function.UnaryOperator;

/** Copies of a scenario with a part exchanged. */
public final class Edits {
    private Edits() {}

    /** The same scenario with both arms changed. */
    public static Scenario arms(Scenario s, UnaryOperator<Arm> change) {
        return withArms(s, change.apply(s.alice()), change.apply(s.bob()));
    }

    /** The same arm with every path element changed. */
    public static Arm path(Arm arm, UnaryOperator<PathElement> change) {
        return withPath(arm, arm.path().stream().map(change).toList());
    }

    /** The same arm with other path elements. */
    public static Arm withPath(Arm arm, List<PathElement> path) {
        return new Arm(
                arm.photon(),
                arm.sourceCouplingLossDb(),
                path,
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

    /** The same scenario with other arms. */
    public static Scenario withArms(Scenario s, Arm alice, Arm bob) {
        return new Scenario(
                s.formatVersion(),
                s.name(),
                s.imbalanceNs(),
                s.source(),
                alice,
                bob,
                s.timing(),
                s.protocol(),
                s.acquisition(),
                s.require(),
                s.spread(),
                s.provenance());
    }
}

package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;

/** A changed part stands in the copy; everything around it is what it was. */
final class EditsTest {
    private static final Scenario SCENARIO = SampleScenarios.build(SampleScenarios.everything());

    @Test
    void editThatChangesNothingGivesTheSame() {
        Scenario same = Edits.arms(
                SCENARIO, arm -> Edits.detectors(Edits.path(arm, UnaryOperator.identity()), UnaryOperator.identity()));

        assertThat(same).isEqualTo(SCENARIO);
    }

    @Test
    void bothArmsAreChangedEachByItself() {
        Scenario bare = Edits.arms(SCENARIO, arm -> Edits.path(arm, element -> new LossElement(Optional.empty(), 1.0)));

        assertThat(bare.alice().path()).hasSize(5).containsOnly(new LossElement(Optional.empty(), 1.0));
        assertThat(bare.bob().path()).hasSize(1).containsOnly(new LossElement(Optional.empty(), 1.0));
        assertThat(bare.alice().detectors()).isEqualTo(SCENARIO.alice().detectors());
        assertThat(bare.bob().analyzer()).isEqualTo(SCENARIO.bob().analyzer());
        assertThat(bare.source()).isEqualTo(SCENARIO.source());
    }

    @Test
    void everyDetectorOfAnArmIsChanged() {
        Detector other = SCENARIO.bob().detectors().get(0);
        Arm changed = Edits.detectors(SCENARIO.alice(), detector -> other);

        assertThat(changed.detectors()).containsExactly(other, other);
        assertThat(Edits.detectors(
                                changed,
                                detector -> SCENARIO.alice().detectors().get(0))
                        .path())
                .isEqualTo(SCENARIO.alice().path());
    }
}

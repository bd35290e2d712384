package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import binspan.scenario.Field;
import binspan.scenario.FieldParameter;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import binspan.study.tuning.SourcePosition;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** A document takes over what studies do to its scenario, exactly. */
final class DifferencesTest {

    /** The model's own change of the scenario is the independent means. */
    @Test
    void everyParameterOfEveryScenarioIsTakenOver() throws RefusedEditException {
        Random random = new Random(7);
        int taken = 0;
        for (ScenarioDocument document : ShippedDocuments.all()) {
            List<Parameter> parameters = ScenarioLeaves.of(document.scenario());
            // All of the scenarios; of the presets, which differ little from them, some.
            int step = ShippedDocuments.isPreset(document) ? 5 : 1;
            for (int i = 0; i < parameters.size(); i += step) {
                taken += takenOver(document, parameters.get(i), value(parameters.get(i), random)) ? 1 : 0;
            }
        }
        assertThat(taken).isGreaterThan(800);
    }

    /** Whether the parameter can be varied in the scenario; if so, the document must follow. */
    private static boolean takenOver(ScenarioDocument document, Parameter parameter, double value)
            throws RefusedEditException {
        Scenario before = document.scenario();
        Scenario after;
        try {
            after = parameter.with(before, value);
        } catch (IllegalArgumentException e) {
            return false;
        }
        ScenarioDocument changed = document.with(Differences.between(before, after));
        assertThat(changed.scenario())
                .as(document.name() + " " + parameter.path())
                .isEqualTo(after);
        return true;
    }

    private static double value(Parameter parameter, Random random) {
        Range range = parameter.range();
        double low = Math.max(range.lowest(), -1000.0);
        double value = low + (Math.min(range.highest(), low + 100.0) - low) * random.nextDouble();
        boolean count =
                parameter instanceof FieldParameter single && single.field().kind() == Field.Kind.COUNT;
        return count ? Math.rint(value) : value;
    }

    @Test
    void sourceIsMovedAlongTheFibre() throws RefusedEditException {
        for (ScenarioDocument document : ShippedDocuments.all()) {
            for (double share : new double[] {0.0, 0.31, 1.0}) {
                Scenario moved = SourcePosition.moved(document.scenario(), share);
                assertThat(document.with(Differences.between(document.scenario(), moved))
                                .scenario())
                        .isEqualTo(moved);
            }
        }
    }

    @Test
    void equalScenariosHaveNoDifferences() {
        Scenario scenario = ShippedDocuments.named("pulse-pair").scenario();
        assertThat(Differences.between(scenario, scenario)).isEmpty();
    }

    @Test
    void aValueThatFollowsFromItsClassIsNotStated() throws RefusedEditException {
        ScenarioDocument document = ShippedDocuments.named("kestrel-dam-to-millbrook");
        String path = "alice.detectors[0].";
        ScenarioDocument ofClass = document.with(List.of(
                new Remove(path + "efficiency"), new Remove(path + "jitterFwhmPs"), new Remove(path + "deadTimeNs")));
        ScenarioDocument other = ofClass.with(List.of(new Put(path + "class", "up-conversion")));
        List<Change> changes = Differences.between(ofClass.scenario(), other.scenario());
        assertThat(changes).contains(new Put(path + "class", "up-conversion"), new Remove(path + "efficiency"));
        ScenarioDocument taken = ofClass.with(changes);
        assertThat(taken.scenario()).isEqualTo(other.scenario());
        assertThat(taken.text()).isEqualTo(other.text());
    }

    @Test
    void anAbsentValueIsRemovedAndAnEntryExchanged() {
        Scenario before = ShippedDocuments.named("kestrel-dam-to-millbrook").scenario();
        Scenario stated = ParameterPaths.find(before, "source.schmidtNumber").with(before, 3.0);
        assertThat(Differences.between(stated, before)).containsExactly(new Remove("source.schmidtNumber"));
    }

    @Test
    void listsOfOtherElementsAreRefused() {
        Scenario one = ShippedDocuments.named("kestrel-dam-to-millbrook").scenario();
        Scenario other = ShippedDocuments.named("stonebridge-to-lower-weir").scenario();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Differences.between(one, other))
                .withMessageContaining("allowed the same as before");
    }
}

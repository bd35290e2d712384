package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.Change;
import binspan.planner.document.EditProblem;
import binspan.planner.document.ElementEdits;
import binspan.planner.document.ScenarioDocument;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The link under design: changes, refusals, undo, selection. */
class DesignTest {
    private static final String WIDTH = "timing.windowWidthPs";

    private final ScenarioDocument kestrel = Designs.shipped("kestrel-dam-to-millbrook");
    private final Design design = new Design(kestrel);

    private boolean width(double picoseconds, Object drag) {
        return design.change(
                "window width",
                drag,
                scenario -> ParameterPaths.find(scenario, WIDTH).with(scenario, picoseconds));
    }

    private double width() {
        return design.scenario().timing().windowWidthPs();
    }

    @Test
    void beginsSavedWithThePlanSelectedAndNothingToUndo() {
        assertThat(design.scenario()).isEqualTo(kestrel.scenario());
        assertThat(design.savedProperty().get()).isEqualTo(kestrel.scenario());
        assertThat(design.modifiedProperty().get()).isFalse();
        assertThat(design.undoTextProperty().get()).isEmpty();
        assertThat(design.redoTextProperty().get()).isEmpty();
        assertThat(design.selectionProperty().get()).isEqualTo(new LinkPart.Plan());
        design.undo();
        design.redo();
        assertThat(design.documentProperty().get()).isSameAs(kestrel);
    }

    @Test
    void changeIsInScenarioTextAndUndo() {
        assertThat(width(300.0, null)).isTrue();
        assertThat(width()).isEqualTo(300.0);
        assertThat(design.documentProperty().get().text()).contains("\"windowWidthPs\": 300");
        assertThat(design.modifiedProperty().get()).isTrue();
        assertThat(design.undoTextProperty().get()).isEqualTo("window width");
        design.undo();
        assertThat(design.documentProperty().get().text()).isEqualTo(kestrel.text());
        assertThat(design.modifiedProperty().get()).isFalse();
        assertThat(design.redoTextProperty().get()).isEqualTo("window width");
        design.redo();
        assertThat(width()).isEqualTo(300.0);
    }

    @Test
    void dragIsUndoneAtOnceAndTheNextAfterSettlingByItself() {
        width(300.0, this);
        width(310.0, this);
        width(320.0, this);
        design.settle();
        width(330.0, this);
        design.undo();
        assertThat(width()).isEqualTo(320.0);
        design.undo();
        assertThat(width()).isEqualTo(kestrel.scenario().timing().windowWidthPs());
    }

    @Test
    void refusalIsToldAndChangesNothing() {
        List<Scenario> seen = new ArrayList<>();
        design.scenarioProperty().addListener((source, before, now) -> seen.add(now));
        assertThat(design.change("nonsense", null, scenario -> {
                    throw new IllegalArgumentException("not like this");
                }))
                .isFalse();
        assertThat(design.noticeProperty().get()).isEqualTo("not like this");
        assertThat(design.edit("nonsense", List.of(new Change.Put(WIDTH, -1.0))))
                .isFalse();
        assertThat(design.noticeProperty().get()).startsWith(WIDTH + ": ");
        List<EditProblem> problems = design.apply("nonsense", null, List.of(new Change.Put(WIDTH, -1.0)));
        assertThat(problems).extracting(EditProblem::path).containsExactly(WIDTH);
        assertThat(seen).isEmpty();
        assertThat(design.undoTextProperty().get()).isEmpty();
    }

    @Test
    void whatIsDoneClearsTheNoticeAndNoChangeIsNoStep() {
        design.notice("something");
        assertThat(width(width(), null)).as("the same number").isTrue();
        assertThat(design.undoTextProperty().get()).isEmpty();
        width(300.0, null);
        assertThat(design.noticeProperty().get()).isEmpty();
    }

    @Test
    void savingComparesWithWhatIsSavedFromThenOn() {
        width(300.0, null);
        design.markSaved();
        assertThat(design.modifiedProperty().get()).isFalse();
        assertThat(design.savedProperty().get().timing().windowWidthPs()).isEqualTo(300.0);
        design.undo();
        assertThat(design.modifiedProperty().get()).isTrue();
    }

    @Test
    void selectionOfWhatHasGoneFallsBackToItsNeighbour() {
        int last = design.scenario().alice().path().size() - 1;
        LinkPart gone = new LinkPart.Element(Site.ALICE, last);
        LinkPart stays = new LinkPart.Element(Site.ALICE, last - 1);
        design.selectionProperty().set(stays);
        design.edit("removed", List.of(new Change.Delete("alice.path", last)));
        assertThat(design.selectionProperty().get()).isEqualTo(stays);
        design.undo();
        design.selectionProperty().set(gone);
        design.redo();
        assertThat(design.selectionProperty().get()).isEqualTo(stays);
        design.selectionProperty().set(new LinkPart.Port(Site.BOB, 1));
        design.edit("removed", List.of(new Change.Delete("bob.detectors", 1)));
        assertThat(design.selectionProperty().get()).isEqualTo(new LinkPart.Port(Site.BOB, 0));
    }

    private String selected() {
        LinkPart.Element element = (LinkPart.Element) design.selectionProperty().get();
        return design.scenario().alice().path().get(element.index()).label().orElseThrow();
    }

    @Test
    void selectionStaysOnItsElementWhereverItMoves() {
        design.selectionProperty().set(new LinkPart.Element(Site.ALICE, 1));
        design.edit("added", ElementEdits.add(design.scenario(), "alice", "loss", 0));
        assertThat(selected()).isEqualTo("upper duct");
        assertThat(design.selectionProperty().get()).isEqualTo(new LinkPart.Element(Site.ALICE, 2));
        design.undo();
        assertThat(selected()).isEqualTo("upper duct");
        design.redo();
        assertThat(selected()).isEqualTo("upper duct");
        design.edit("moved", ElementEdits.move("alice", 2, 0));
        assertThat(selected()).isEqualTo("upper duct");
        design.edit("length", List.of(new Change.Put("alice.path[0].lengthKm", 20.0)));
        assertThat(selected()).isEqualTo("upper duct");
        design.undo();
        design.undo();
        assertThat(design.selectionProperty().get()).isEqualTo(new LinkPart.Element(Site.ALICE, 2));
        design.edit("renamed", List.of(new Change.Put("alice.path[2].label", "duct")));
        assertThat(selected()).isEqualTo("duct");
    }

    /** Whoever hears of another scenario must find what belongs to it. */
    @Test
    void listenersOfTheScenarioSeeTheRestAlreadyThere() {
        List<String> seen = new ArrayList<>();
        design.scenarioProperty()
                .addListener((source, before, now) ->
                        seen.add(design.documentProperty().get().scenario().equals(now)
                                + " " + design.modifiedProperty().get()
                                + " " + design.undoTextProperty().get()));
        width(300.0, null);
        design.undo();
        assertThat(seen).containsExactly("true true window width", "true false ");
    }

    @Test
    void beginningWithAnotherSaysSoBeforeTheScenarioChanges() {
        width(300.0, null);
        ScenarioDocument other = Designs.shipped("stonebridge-to-lower-weir");
        design.begin(other);
        assertThat(design.savedProperty().get()).isEqualTo(other.scenario());
        assertThat(design.scenario()).isEqualTo(other.scenario());
        assertThat(design.undoTextProperty().get()).isEmpty();
        assertThat(design.modifiedProperty().get()).isFalse();
    }

    @Test
    void resumedWorkCanBeUndoneToItsFileOrIsModifiedWithoutOne() {
        width(300.0, null);
        ScenarioDocument left = design.documentProperty().get();
        Design resumed = new Design(Designs.shipped("stonebridge-to-lower-weir"));
        resumed.resume(left, kestrel, "recovered work");
        assertThat(resumed.scenario()).isEqualTo(left.scenario());
        assertThat(resumed.savedProperty().get()).isEqualTo(kestrel.scenario());
        assertThat(resumed.undoTextProperty().get()).isEqualTo("recovered work");
        resumed.undo();
        assertThat(resumed.modifiedProperty().get()).isFalse();
        resumed.resume(left, null, "recovered work");
        assertThat(resumed.modifiedProperty().get()).isTrue();
        assertThat(resumed.undoTextProperty().get()).isEmpty();
    }
}

package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.Differences;
import binspan.planner.document.EditProblem;
import binspan.planner.document.History;
import binspan.planner.document.RefusedEditException;
import binspan.planner.document.ScenarioDocument;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.function.UnaryOperator;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;

/**
 * The link that is being designed: what all parts of the window share. It is always a valid scenario; a change that
 * would make it invalid is refused. All methods are for the window's thread.
 */
public final class Design {
    private final ReadOnlyObjectWrapper<ScenarioDocument> document = new ReadOnlyObjectWrapper<>(this, "document");
    private final ReadOnlyObjectWrapper<Scenario> scenario = new ReadOnlyObjectWrapper<>(this, "scenario");
    private final ReadOnlyObjectWrapper<Scenario> saved = new ReadOnlyObjectWrapper<>(this, "saved");
    private final ReadOnlyBooleanWrapper modified = new ReadOnlyBooleanWrapper(this, "modified");
    private final ReadOnlyStringWrapper undoText = new ReadOnlyStringWrapper(this, "undoText", "");
    private final ReadOnlyStringWrapper redoText = new ReadOnlyStringWrapper(this, "redoText", "");
    private final ReadOnlyStringWrapper notice = new ReadOnlyStringWrapper(this, "notice", "");
    private final ObjectProperty<LinkPart> selection =
            new SimpleObjectProperty<>(this, "selection", new LinkPart.Plan());
    private final ReadOnlyIntegerWrapper turns = new ReadOnlyIntegerWrapper(this, "turns");
    private History history;

    /** Begins with a document, taken as saved. */
    public Design(ScenarioDocument first) {
        begin(first);
    }

    /** Begins anew with a document, taken as saved. */
    public void begin(ScenarioDocument first) {
        history = new History(first);
        history.markSaved();
        selection.set(new LinkPart.Plan());
        saved.set(first.scenario());
        // Before others hear of it: they may have something to say about the new link.
        notice.set("");
        turn();
        show();
    }

    /**
     * Takes up work that was left unsaved.
     *
     * @param left the work
     * @param base what the file holds; null where there is none, or another than the work began with
     * @param what the work in words, for undo
     */
    public void resume(ScenarioDocument left, ScenarioDocument base, String what) {
        if (base != null) {
            begin(base);
            history.push(left, what, null);
        } else {
            begin(left);
            history = new History(left);
        }
        show();
    }

    /** The scenario file as it is now. */
    public ReadOnlyObjectProperty<ScenarioDocument> documentProperty() {
        return document.getReadOnlyProperty();
    }

    /** The link as it is now. */
    public ReadOnlyObjectProperty<Scenario> scenarioProperty() {
        return scenario.getReadOnlyProperty();
    }

    /** The link as it is now. */
    public Scenario scenario() {
        return scenario.get();
    }

    /** The link as last opened or saved, with which changes are compared. */
    public ReadOnlyObjectProperty<Scenario> savedProperty() {
        return saved.getReadOnlyProperty();
    }

    /** Whether it differs from what was last opened or saved. */
    public ReadOnlyBooleanProperty modifiedProperty() {
        return modified.getReadOnlyProperty();
    }

    /** What would be undone, in words; empty if there is nothing. */
    public ReadOnlyStringProperty undoTextProperty() {
        return undoText.getReadOnlyProperty();
    }

    /** What would be done again, in words; empty if there is nothing. */
    public ReadOnlyStringProperty redoTextProperty() {
        return redoText.getReadOnlyProperty();
    }

    /** Changes before something is undone, done again or begun anew: what is half typed is then given up. */
    public ReadOnlyIntegerProperty turnsProperty() {
        return turns.getReadOnlyProperty();
    }

    private void turn() {
        turns.set(turns.get() + 1);
    }

    /** The part of the link whose form is shown. */
    public ObjectProperty<LinkPart> selectionProperty() {
        return selection;
    }

    /** What was last refused or done, one line. */
    public ReadOnlyStringProperty noticeProperty() {
        return notice.getReadOnlyProperty();
    }

    /** Says something on the notice line. */
    public void notice(String text) {
        notice.set(text);
    }

    /**
     * Changes numbers of the link.
     *
     * @param what the change in words, for undo: "window width"
     * @param drag something that stands for one movement of the hand, so that all of it is undone at once; null for a single change
     * @param change gives the changed scenario, of the same structure; an {@link IllegalArgumentException} refuses
     * @return whether it was done; a refusal is told as a notice
     */
    public boolean change(String what, Object drag, UnaryOperator<Scenario> change) {
        try {
            Scenario before = scenario.get();
            return told(apply(what, drag, Differences.between(before, change.apply(before))));
        } catch (IllegalArgumentException e) {
            notice.set(e.getMessage());
            return false;
        }
    }

    /**
     * Changes the scenario file as one step; a refusal is told as a notice.
     *
     * @param what the change in words, for undo
     * @param changes what to change
     * @return whether it was done
     */
    public boolean edit(String what, List<Change> changes) {
        return told(apply(what, null, changes));
    }

    private boolean told(List<EditProblem> problems) {
        if (!problems.isEmpty()) {
            notice.set(problems.get(0).path() + ": " + problems.get(0).message());
        }
        return problems.isEmpty();
    }

    /**
     * Changes the scenario file.
     *
     * @param what the change in words, for undo
     * @param drag as in {@link #change}
     * @param changes what to change
     * @return why it was refused; none if it was done
     */
    public List<EditProblem> apply(String what, Object drag, List<Change> changes) {
        if (changes.isEmpty()) {
            return List.of();
        }
        try {
            history.push(history.current().with(changes), what, drag);
        } catch (RefusedEditException e) {
            return e.problems();
        }
        notice.set("");
        show();
        return List.of();
    }

    /** Ends a movement of the hand: what follows is a change of its own. */
    public void settle() {
        history.settle();
    }

    /** Takes the last change back. */
    public void undo() {
        if (history.canUndo()) {
            turn();
            history.undo();
            show();
        }
    }

    /** Does again what was taken back. */
    public void redo() {
        if (history.canRedo()) {
            turn();
            history.redo();
            show();
        }
    }

    /** Notes that the scenario file is saved as it is now. */
    public void markSaved() {
        history.markSaved();
        saved.set(scenario.get());
        show();
    }

    private void show() {
        ScenarioDocument current = history.current();
        if (scenario.get() != null) {
            selection.set(PartKept.part(selection.get(), scenario.get(), current.scenario()));
        }
        modified.set(history.modified());
        undoText.set(history.canUndo() ? history.undoText() : "");
        redoText.set(history.canRedo() ? history.redoText() : "");
        document.set(current);
        scenario.set(current.scenario());
    }
}

package binspan.planner.viewmodel;

import binspan.scenario.Scenario;
import java.util.function.UnaryOperator;
import javafx.beans.property.ObjectProperty;
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
    private final ReadOnlyObjectWrapper<Scenario> scenario = new ReadOnlyObjectWrapper<>(this, "scenario");
    private final ReadOnlyObjectWrapper<Scenario> saved = new ReadOnlyObjectWrapper<>(this, "saved");
    private final ReadOnlyStringWrapper notice = new ReadOnlyStringWrapper(this, "notice", "");
    private final ObjectProperty<LinkPart> selection =
            new SimpleObjectProperty<>(this, "selection", new LinkPart.Plan());

    /** Begins with a scenario, taken as saved. */
    public Design(Scenario first) {
        scenario.set(first);
        saved.set(first);
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
            scenario.set(change.apply(scenario.get()));
            notice.set("");
            return true;
        } catch (IllegalArgumentException e) {
            notice.set(e.getMessage());
            return false;
        }
    }

    /** Ends a movement of the hand: what follows is a change of its own. */
    public void settle() {
        // until documents keep their history
    }
}

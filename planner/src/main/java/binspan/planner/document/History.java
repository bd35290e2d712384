package binspan.planner.document;

import java.util.ArrayList;
import java.util.List;

/** The states of a document in a window, for undoing and redoing without limit. One thread uses it. */
public final class History {
    private record Step(ScenarioDocument document, String what) {}

    private final List<Step> steps = new ArrayList<>();
    private int at;
    private Object coalescing;
    private ScenarioDocument saved;

    /**
     * Begins with a document.
     *
     * @param document its first state, not saved yet
     */
    public History(ScenarioDocument document) {
        steps.add(new Step(document, ""));
    }

    /** The document as it is now. */
    public ScenarioDocument current() {
        return steps.get(at).document();
    }

    /**
     * Adds a step; what has been undone is forgotten. A document of the same text as now is no step.
     *
     * @param document state after the step
     * @param what the step in words, for the menu
     * @param coalescingKey steps that follow one another with equal keys are undone as one, until {@link #settle}; null
     *     for a step of its own
     */
    public void push(ScenarioDocument document, String what, Object coalescingKey) {
        boolean merged = coalescingKey != null && coalescingKey.equals(coalescing);
        if (!merged && document.text().equals(current().text())) {
            return;
        }
        steps.subList(at + 1, steps.size()).clear();
        if (merged) {
            steps.set(at, new Step(document, what));
        } else {
            steps.add(new Step(document, what));
            at++;
        }
        coalescing = coalescingKey;
    }

    /** Ends a step that was made of several, such as a drag; one that led back to where it began is no step. */
    public void settle() {
        if (coalescing != null
                && steps.get(at - 1).document().text().equals(current().text())) {
            steps.remove(at--);
        }
        coalescing = null;
    }

    /** Whether there is a step to undo. */
    public boolean canUndo() {
        return at > 0;
    }

    /** Whether there is a step to redo. */
    public boolean canRedo() {
        return at < steps.size() - 1;
    }

    /** The step that would be undone in words, empty if there is none. */
    public String undoText() {
        return steps.get(at).what();
    }

    /** The step that would be redone in words, empty if there is none. */
    public String redoText() {
        return canRedo() ? steps.get(at + 1).what() : "";
    }

    /**
     * Goes back one step.
     *
     * @return the document before it, the present one if there is none
     */
    public ScenarioDocument undo() {
        settle();
        at = Math.max(0, at - 1);
        return current();
    }

    /**
     * Makes the step again that was undone last.
     *
     * @return the document after it, the present one if there is none
     */
    public ScenarioDocument redo() {
        settle();
        at = Math.min(steps.size() - 1, at + 1);
        return current();
    }

    /** Notes that the document is saved as it is now. */
    public void markSaved() {
        settle();
        saved = current();
    }

    /** The document as saved last, null for one that was never saved. */
    public ScenarioDocument saved() {
        return saved;
    }

    /** Whether the text differs from the saved one; a document that was never saved is modified. */
    public boolean modified() {
        return saved == null || !saved.text().equals(current().text());
    }
}

package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import java.util.List;

/** A heading; of an object in a list one that can be removed. */
public final class GroupRow implements FormRow {
    private final FormEdits edits;
    private final String title;
    private final String object;
    private final boolean removable;

    GroupRow(FormEdits edits, FormLayout.Group group) {
        this.edits = edits;
        this.title = group.title();
        this.object = group.object();
        this.removable = group.inList();
    }

    /** Its words. */
    public String title() {
        return title;
    }

    /** Whether the object below can be removed. */
    public boolean removable() {
        return removable;
    }

    /** Removes the object from its list. */
    public void remove() {
        int bracket = object.lastIndexOf('[');
        int index = Integer.parseInt(object.substring(bracket + 1, object.length() - 1));
        edits.apply(Words.of("form.removed", title), List.of(new Change.Delete(object.substring(0, bracket), index)));
    }

    @Override
    public void refresh() {
        // a heading says the same until the rows are made anew
    }
}

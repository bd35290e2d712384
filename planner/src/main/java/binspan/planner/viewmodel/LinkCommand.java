package binspan.planner.viewmodel;

import java.util.function.Supplier;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** Something that can be done to the selected part, or a reason why not. */
public final class LinkCommand {
    private final ReadOnlyStringWrapper refusal = new ReadOnlyStringWrapper(this, "refusal", "");
    private final BooleanBinding enabled = refusal.isEmpty();
    private final Supplier<String> why;
    private final Runnable action;

    /**
     * A command.
     *
     * @param why says why it cannot be done now; empty when it can
     * @param action does it
     */
    LinkCommand(Supplier<String> why, Runnable action) {
        this.why = why;
        this.action = action;
    }

    /** Whether it can be done now. */
    public BooleanBinding enabledProperty() {
        return enabled;
    }

    /** Why it cannot be done now; empty when it can. */
    public ReadOnlyStringProperty refusalProperty() {
        return refusal.getReadOnlyProperty();
    }

    /** Does it, if it can be done. */
    public void run() {
        if (enabled.get()) {
            action.run();
        }
    }

    /** Asks again whether it can be done. */
    void refresh() {
        refusal.set(why.get());
    }
}

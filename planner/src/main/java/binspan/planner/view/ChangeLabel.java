package binspan.planner.view;

import binspan.planner.viewmodel.ChangeMark;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;

/** How a figure has changed since the link was saved: an arrow the way it went, the difference, and a sign where that is for the worse. */
final class ChangeLabel extends Label {
    private static final String WORSE = " !";

    private final Tooltip meaning = new Tooltip();

    ChangeLabel() {
        getStyleClass().add("change");
        setMinWidth(USE_PREF_SIZE);
    }

    void show(ChangeMark change) {
        setText(arrow(change.direction()) + change.text() + (change.effect() == ChangeMark.Effect.WORSE ? WORSE : ""));
        setAccessibleText(change.spoken());
        meaning.setText(change.spoken());
        setTooltip(change.spoken().isEmpty() ? null : meaning);
        Columns.restyle(this, "label", "change", style(change.effect()));
    }

    private static String arrow(int direction) {
        return direction > 0 ? "\u2191 " : direction < 0 ? "\u2193 " : "";
    }

    private static String style(ChangeMark.Effect effect) {
        return switch (effect) {
            case NONE, OTHER -> "soft";
            case BETTER -> "good";
            case WORSE -> "bad";
        };
    }
}

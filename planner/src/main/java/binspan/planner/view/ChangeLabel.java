package binspan.planner.view;

import binspan.planner.viewmodel.ChangeMark;
import javafx.scene.control.Label;

/** How a figure has changed since the link was saved: a mark for better or worse and the difference. */
final class ChangeLabel extends Label {
    ChangeLabel() {
        getStyleClass().add("change");
        setMinWidth(USE_PREF_SIZE);
    }

    void show(ChangeMark change) {
        setText(mark(change.effect()) + change.text());
        Columns.restyle(this, "label", "change", style(change.effect()));
    }

    private static String mark(ChangeMark.Effect effect) {
        return switch (effect) {
            case NONE, OTHER -> "";
            case BETTER -> "\u25b2 ";
            case WORSE -> "\u25bc ";
        };
    }

    private static String style(ChangeMark.Effect effect) {
        return switch (effect) {
            case NONE, OTHER -> "soft";
            case BETTER -> "good";
            case WORSE -> "bad";
        };
    }
}

package binspan.planner.view;

import binspan.planner.viewmodel.Words;
import javafx.scene.control.Button;
import javafx.scene.control.Tooltip;

/** Small buttons of the form. */
final class Buttons {
    private Buttons() {}

    /** One that removes something. */
    static Button remove(String id, Runnable action) {
        Button button = new Button(Words.of("form.remove"));
        button.setId(id);
        button.getStyleClass().add("form-button");
        button.setTooltip(new Tooltip(Words.of("form.remove.help")));
        button.setOnAction(event -> action.run());
        return button;
    }
}

package binspan.planner.view;

import javafx.beans.value.ObservableValue;
import javafx.scene.control.Label;

/** What is wrong with a field, under it: a sign and the words, no room where all is well. */
final class ErrorLine extends Label {
    private static final String SIGN = "\u2715 ";

    ErrorLine(ObservableValue<String> error) {
        getStyleClass().addAll("form-error", "bad");
        setWrapText(true);
        setMinHeight(USE_PREF_SIZE);
        textProperty().bind(error.map(words -> words.isEmpty() ? "" : SIGN + words));
        visibleProperty().bind(textProperty().isNotEmpty());
        managedProperty().bind(visibleProperty());
    }
}

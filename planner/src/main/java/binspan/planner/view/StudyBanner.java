package binspan.planner.view;

import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/** A line that says what is wrong, with a sign of its own; not there while nothing is. */
final class StudyBanner extends HBox {
    StudyBanner(String id, String style, ObservableValue<String> words) {
        setId(id);
        getStyleClass().addAll("study-banner", style);
        setAlignment(Pos.CENTER_LEFT);
        Label sign = new Label("!");
        sign.getStyleClass().add("study-sign");
        sign.setMinWidth(Region.USE_PREF_SIZE);
        Label text = new Label();
        text.setWrapText(true);
        text.setMinHeight(Region.USE_PREF_SIZE);
        text.textProperty().bind(words);
        HBox.setHgrow(text, Priority.ALWAYS);
        getChildren().addAll(sign, text);
        visibleProperty().bind(text.textProperty().isNotEmpty());
        managedProperty().bind(visibleProperty());
        accessibleTextProperty().bind(words);
    }
}

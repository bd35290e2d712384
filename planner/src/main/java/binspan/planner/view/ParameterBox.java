package binspan.planner.view;

import binspan.planner.report.ParameterWords;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.ParameterChoices;
import binspan.planner.viewmodel.Words;
import javafx.beans.property.StringProperty;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;

/** A parameter to choose, as words with its path, or to write as a path. */
final class ParameterBox extends ComboBox<String> {
    private static final double WIDTH = 15.5;

    ParameterBox(String id, Design design, StringProperty path, Look look) {
        setId(id);
        setEditable(true);
        setAccessibleText(Words.of("studies.parameter"));
        setTooltip(new Tooltip(Words.of("studies.parameter.hint")));
        setCellFactory(list -> new Choice());
        setVisibleRowCount(16);
        getEditor().textProperty().bindBidirectional(path);
        setOnShowing(event -> getItems().setAll(ParameterChoices.of(design.scenario())));
        look.follow(() -> setPrefWidth(look.em(WIDTH)));
    }

    /** A parameter in the list. */
    private static final class Choice extends ListCell<String> {
        @Override
        protected void updateItem(String path, boolean empty) {
            super.updateItem(path, empty);
            setText(null);
            setGraphic(empty || path == null ? null : line(path));
        }

        private static HBox line(String path) {
            Label written = new Label(path);
            written.getStyleClass().add("soft");
            HBox line = new HBox(new Label(ParameterWords.name(path)), written);
            line.getStyleClass().add("study-option");
            return line;
        }
    }
}

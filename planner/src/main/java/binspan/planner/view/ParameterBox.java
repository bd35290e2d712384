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
import javafx.util.StringConverter;

/** A parameter in words with its unit, to choose or to write as a path. */
final class ParameterBox extends ComboBox<String> {
    private static final double WIDTH = 15.0;

    private final Design design;
    private final StringProperty path;
    private boolean showing;

    ParameterBox(String id, Design design, StringProperty path, Look look) {
        this.design = design;
        this.path = path;
        setId(id);
        setEditable(true);
        setAccessibleText(Words.of("studies.parameter"));
        setTooltip(new Tooltip(Words.of("studies.parameter.hint")));
        setCellFactory(list -> new Choice());
        setVisibleRowCount(16);
        setConverter(new StringConverter<>() {
            @Override
            public String toString(String of) {
                return of == null ? "" : ParameterChoices.words(design.scenario(), of);
            }

            @Override
            public String fromString(String text) {
                return read(text);
            }
        });
        path.addListener((source, before, after) -> follow(after));
        follow(path.get());
        getEditor().textProperty().addListener((source, before, after) -> write(after));
        getEditor().focusedProperty().addListener((source, before, after) -> leave(after));
        setOnShowing(event -> getItems().setAll(ParameterChoices.of(design.scenario())));
        look.follow(() -> setPrefWidth(look.em(WIDTH)));
    }

    /** The path that a text means: the words of a parameter, or a path as it is written. */
    private String read(String text) {
        String written = text.strip();
        if (written.equals(ParameterChoices.words(design.scenario(), path.get()))) {
            return path.get();
        }
        return getItems().stream()
                .filter(each -> ParameterChoices.words(design.scenario(), each).equals(written))
                .findFirst()
                .orElse(written);
    }

    private void write(String text) {
        if (!showing) {
            showing = true;
            path.set(read(text));
            showing = false;
        }
    }

    private void follow(String after) {
        if (!showing) {
            showing = true;
            setValue(after);
            getEditor().setText(getConverter().toString(after));
            showing = false;
        }
    }

    /** A path that was written becomes words. */
    private void leave(boolean focused) {
        if (!focused) {
            follow(path.get());
        }
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

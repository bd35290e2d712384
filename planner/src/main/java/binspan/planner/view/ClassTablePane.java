package binspan.planner.view;

import binspan.planner.viewmodel.ClassRow;
import binspan.planner.viewmodel.ClassTable;
import binspan.planner.viewmodel.ClassTable.Line;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TitledPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;

/** The values of a catalogue class, which of them are in force, and where they come from. */
final class ClassTablePane extends TitledPane {
    private final ClassRow model;

    /**
     * Shows the table of a class.
     *
     * @param open whether it is unfolded, kept from one part to the next
     */
    ClassTablePane(ClassRow model, BooleanProperty open) {
        this.model = model;
        setId("form-class");
        getStyleClass().add("form-class");
        setAnimated(false);
        expandedProperty().bindBidirectional(open);
        model.tableProperty().addListener((source, before, now) -> show(now));
        show(model.tableProperty().get());
    }

    private void show(Optional<ClassTable> table) {
        setVisible(table.isPresent());
        setManaged(table.isPresent());
        table.ifPresent(this::fill);
    }

    private void fill(ClassTable table) {
        setText(table.meaning());
        VBox content = new VBox(grid(table.lines()));
        content.getStyleClass().add("form-class-content");
        List<String> points = model.operatingPoints();
        if (!points.isEmpty()) {
            content.getChildren().add(points(points));
        }
        table.limits().forEach(limit -> content.getChildren().add(note(limit)));
        table.sources().forEach(source -> content.getChildren().add(note(source)));
        setContent(content);
    }

    private static GridPane grid(List<Line> lines) {
        GridPane grid = new GridPane();
        grid.getStyleClass().add("form-class-grid");
        grid.addRow(0, head("form.class.quantity"), head("form.class.value"), head("form.class.file"));
        for (int i = 0; i < lines.size(); i++) {
            Line line = lines.get(i);
            Label ofClass = cell(line.ofClass(), line.replaced() ? "soft" : "form-in-force");
            Label stated = cell(line.replaced() ? line.stated() : "\u2013", line.replaced() ? "form-in-force" : "soft");
            grid.addRow(i + 1, cell(line.quantity(), "form-class-quantity"), ofClass, stated);
        }
        return grid;
    }

    private static Label head(String key) {
        return cell(Words.of(key), "soft");
    }

    private static Label cell(String text, String style) {
        Label cell = new Label(text);
        cell.getStyleClass().addAll("form-class-cell", style);
        cell.setWrapText(true);
        return cell;
    }

    private Node points(List<String> points) {
        ComboBox<String> choice = new ComboBox<>();
        choice.setId("form-operating-point");
        choice.getItems().setAll(points);
        choice.setPromptText(Words.of("form.class.operate"));
        choice.setAccessibleText(Words.of("form.class.operate"));
        choice.setMaxWidth(Double.MAX_VALUE);
        choice.setOnAction(event -> {
            int chosen = choice.getSelectionModel().getSelectedIndex();
            if (chosen >= 0) {
                model.operate(chosen);
            }
        });
        return choice;
    }

    private static Label note(String text) {
        Label note = new Label(text);
        note.getStyleClass().addAll("form-note", "soft");
        note.setWrapText(true);
        note.setMinHeight(USE_PREF_SIZE);
        return note;
    }
}

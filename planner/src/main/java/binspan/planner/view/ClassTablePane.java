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
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;

/** The values of a catalogue class, which of them are in force, and where they come from. */
final class ClassTablePane extends VBox {
    private static final double QUANTITY = 27.0;
    private static final double OF_CLASS = 40.0;
    private static final double OF_FILE = 33.0;

    private final TitledPane more = new TitledPane();
    private final ClassRow model;

    /**
     * Shows the table of a class.
     *
     * @param open whether limits and sources are unfolded, kept from one part to the next
     */
    ClassTablePane(ClassRow model, BooleanProperty open) {
        this.model = model;
        setId("form-class");
        getStyleClass().add("form-class");
        more.setId("form-class-sources");
        more.setText(Words.of("form.class.sources"));
        more.setAnimated(false);
        more.setExpanded(open.get());
        open.bind(more.expandedProperty());
        model.tableProperty().addListener((source, before, now) -> show(now));
        show(model.tableProperty().get());
    }

    /** Unfolds limits and sources. */
    void unfold() {
        more.setExpanded(true);
    }

    private void show(Optional<ClassTable> table) {
        setVisible(table.isPresent());
        setManaged(table.isPresent());
        table.ifPresent(this::fill);
    }

    private void fill(ClassTable table) {
        getChildren().setAll(note(table.meaning()), grid(table.lines()));
        List<String> points = model.operatingPoints();
        if (!points.isEmpty()) {
            getChildren().add(points(points));
        }
        VBox notes = new VBox(note(String.join("; ", table.limits()) + "."));
        table.sources().forEach(source -> notes.getChildren().add(note(source)));
        notes.getStyleClass().add("form-class-notes");
        more.setContent(notes);
        getChildren().add(more);
    }

    private static GridPane grid(List<Line> lines) {
        GridPane grid = new GridPane();
        grid.getStyleClass().add("form-class-grid");
        grid.getColumnConstraints().addAll(share(QUANTITY), share(OF_CLASS), share(OF_FILE));
        grid.addRow(0, head("form.class.quantity"), head("form.class.value"), head("form.class.file"));
        for (int i = 0; i < lines.size(); i++) {
            Line line = lines.get(i);
            Label ofClass = cell(line.ofClass(), line.replaced() ? "soft" : "form-in-force");
            Label stated = cell(line.replaced() ? line.stated() : "\u2013", line.replaced() ? "form-in-force" : "soft");
            grid.addRow(i + 1, cell(line.quantity(), "form-class-quantity"), ofClass, stated);
        }
        return grid;
    }

    private static ColumnConstraints share(double percent) {
        ColumnConstraints column = new ColumnConstraints();
        column.setPercentWidth(percent);
        return column;
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

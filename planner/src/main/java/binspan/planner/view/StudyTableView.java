package binspan.planner.view;

import binspan.planner.viewmodel.TableLines;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.regex.Pattern;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;

/** The rows of a study; only those on the screen are made. */
final class StudyTableView extends BorderPane {
    private static final double WIDEST = 17.0;
    private static final double NARROWEST = 5.0;
    private static final double CHARACTER = 0.58;
    private static final double EDGES = 1.6;
    private static final int SAMPLED = 50;

    private final Look look;
    private final TableView<List<Object>> table = new TableView<>();
    private final Label count = new Label();
    private List<TableLines.Column> columns = List.of();

    StudyTableView(Look look, String id) {
        this.look = look;
        table.setId(id);
        table.setAccessibleText(Words.of("studies.table"));
        table.setPlaceholder(new Label(Words.of("studies.drawing")));
        count.getStyleClass().addAll("soft", "study-count");
        setCenter(table);
        setBottom(count);
        look.follow(this::fit);
    }

    /** Shows other rows. */
    void show(TableLines lines) {
        columns = lines.columns();
        table.getColumns().clear();
        for (int i = 0; i < columns.size(); i++) {
            table.getColumns().add(column(i, columns.get(i)));
        }
        table.setItems(FXCollections.observableArrayList(lines.rows()));
        count.setText(
                lines.total() > lines.rows().size()
                        ? Words.of("studies.table.first", number(lines.rows().size()), number(lines.total()))
                        : Words.of("studies.table.rows", number(lines.total())));
        fit();
    }

    private static String number(int value) {
        return Integer.toString(value);
    }

    private static TableColumn<List<Object>, Object> column(int index, TableLines.Column described) {
        TableColumn<List<Object>, Object> column = new TableColumn<>();
        Label title = new Label(described.title());
        title.setWrapText(true);
        title.setTooltip(new Tooltip(described.name()));
        column.setGraphic(title);
        column.setText("");
        column.setCellValueFactory(
                row -> new ReadOnlyObjectWrapper<>(row.getValue().get(index)));
        column.setCellFactory(made -> new Cell(described));
        return column;
    }

    private void fit() {
        for (int i = 0; i < columns.size(); i++) {
            TableColumn<List<Object>, ?> column = table.getColumns().get(i);
            double words = Math.max(longest(i), headed(columns.get(i).title()));
            double ems = Math.max(NARROWEST, Math.min(WIDEST, words * CHARACTER + EDGES));
            column.setPrefWidth(look.em(ems));
        }
    }

    /** Characters that a title needs side by side: two lines, no word broken. */
    private static double headed(String title) {
        int word = Pattern.compile(" ")
                .splitAsStream(title)
                .mapToInt(String::length)
                .max()
                .orElse(0);
        return Math.max(word + 1.0, title.length() / 2.0 + 2.0);
    }

    private int longest(int index) {
        return table.getItems().stream()
                .limit(SAMPLED)
                .mapToInt(row -> columns.get(index).text(row.get(index)).length())
                .max()
                .orElse(0);
    }

    /** A cell; numbers stand at the right. */
    private static final class Cell extends TableCell<List<Object>, Object> {
        private final TableLines.Column column;

        Cell(TableLines.Column column) {
            this.column = column;
        }

        @Override
        protected void updateItem(Object item, boolean empty) {
            super.updateItem(item, empty);
            setText(empty || item == null ? "" : column.text(item));
            setAlignment(item instanceof Double ? Pos.CENTER_RIGHT : Pos.CENTER_LEFT);
        }
    }
}

package binspan.planner.view;

import binspan.planner.viewmodel.VerdictRoom;
import binspan.planner.viewmodel.Words;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.scene.control.Label;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableRow;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.input.MouseButton;

/** The headroom of all quantities, the tightest first. */
final class HeadroomTable extends TableView<VerdictRoom.Row> {
    private static final double CELL = 1.75;
    private static final double HEAD = 2.1;
    private static final double TEXT_NARROWEST = 4.0;
    private static final int FEWEST = 3;
    private static final int MOST = 8;

    private final Look look;
    private final Consumer<VerdictRoom.Row> choose;
    private boolean renewing;

    /**
     * An empty table.
     *
     * @param look scale
     * @param choose is told which row is chosen
     */
    HeadroomTable(Look look, Consumer<VerdictRoom.Row> choose) {
        this.look = look;
        this.choose = choose;
        setId("room-headroom");
        getStyleClass().add("headroom");
        setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
        column("quantity", 13.4, VerdictRoom.Row::name, false);
        column("planned", 6.2, VerdictRoom.Row::planned, true);
        column("limit", 10.2, VerdictRoom.Row::sidedLimit, true);
        column("room", 7.2, VerdictRoom.Row::room, true);
        column("fails", 11.0, VerdictRoom.Row::fails, false);
        setAccessibleText(Words.of("verdict.room.help"));
        setRowFactory(table -> row());
        getSelectionModel().selectedItemProperty().addListener((source, before, row) -> {
            if (row != null && !renewing) {
                choose.accept(row);
            }
        });
        look.follow(this::size);
    }

    private void column(String key, double width, Function<VerdictRoom.Row, String> text, boolean number) {
        TableColumn<VerdictRoom.Row, String> column = new TableColumn<>(Words.of("verdict.column." + key));
        column.setCellValueFactory(cell -> new ReadOnlyStringWrapper(text.apply(cell.getValue())));
        column.setSortable(false);
        column.setReorderable(false);
        look.follow(() -> {
            column.setMinWidth(look.em(number ? width : TEXT_NARROWEST));
            column.setPrefWidth(look.em(width));
        });
        if (number) {
            column.getStyleClass().add("number");
        }
        getColumns().add(column);
    }

    /** A click on the row that is selected already chooses it again. */
    private TableRow<VerdictRoom.Row> row() {
        TableRow<VerdictRoom.Row> row = new TableRow<>();
        row.itemProperty().addListener((source, before, item) -> row.setTooltip(item == null ? null : tooltip(item)));
        row.setOnMouseClicked(event -> {
            if (event.getButton() == MouseButton.PRIMARY && !row.isEmpty()) {
                choose.accept(row.getItem());
            }
        });
        return row;
    }

    private static Tooltip tooltip(VerdictRoom.Row row) {
        return new Tooltip(Words.of("verdict.room.row", row.name(), row.path(), row.sidedLimit(), row.fails()));
    }

    /** Shows other rows; the one that was selected stays so, and is not chosen again. */
    void show(VerdictRoom room) {
        VerdictRoom.Row selected = getSelectionModel().getSelectedItem();
        renewing = true;
        getItems().setAll(room.rows());
        setPlaceholder(Columns.wrapped(room.none(), "soft"));
        for (int i = 0; selected != null && i < room.rows().size(); i++) {
            if (room.rows().get(i).path().equals(selected.path())) {
                getSelectionModel().select(i);
            }
        }
        renewing = false;
        size();
    }

    /** Says that rows are still being searched. */
    void showComputing() {
        setPlaceholder(new Label(Words.of("verdict.computing")));
    }

    private void size() {
        setFixedCellSize(look.em(CELL));
        int rows = Math.max(FEWEST, Math.min(MOST, getItems().size()));
        double height = look.em(rows * CELL + HEAD) + 2.0;
        setMinHeight(height);
        setPrefHeight(height);
        setMaxHeight(height);
    }
}

package binspan.planner.view;

import binspan.planner.viewmodel.FigureGroup;
import binspan.planner.viewmodel.FigureRow;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Figures that belong together, one below the other, each with its change. */
final class FiguresView extends VBox {
    private final List<Row> rows = new ArrayList<>();

    FiguresView() {
        getStyleClass().add("figures");
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.TEXT);
        setOnMousePressed(event -> requestFocus());
    }

    void show(FigureGroup group) {
        if (rows.size() != group.rows().size()) {
            rows.clear();
            getChildren().clear();
            group.rows().forEach(row -> rows.add(new Row()));
            getChildren().addAll(rows);
        }
        for (int i = 0; i < rows.size(); i++) {
            rows.get(i).show(group.rows().get(i));
        }
        setAccessibleText(group.spoken());
    }

    /** One figure. */
    private static final class Row extends HBox {
        private final Label name = Columns.label("", "row");
        private final ChangeLabel change = new ChangeLabel();
        private final Label value = Columns.label("", "row", "figure");

        Row() {
            getStyleClass().add("line");
            Region gap = new Region();
            HBox.setHgrow(gap, Priority.ALWAYS);
            getChildren().addAll(name, gap, change, Columns.value(value));
        }

        void show(FigureRow row) {
            name.setText(row.name());
            value.setText(row.value());
            change.show(row.change());
        }
    }
}

package binspan.planner.view;

import java.util.List;
import javafx.geometry.HPos;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;

/** Grids whose columns are shares of their width, and the labels in them. */
final class Columns {
    private static final double USE_PREF = Region.USE_PREF_SIZE;

    private Columns() {}

    /** A grid; a negative share aligns its column to the right. */
    static GridPane grid(double... percents) {
        GridPane grid = new GridPane();
        for (double percent : percents) {
            ColumnConstraints column = new ColumnConstraints();
            column.setPercentWidth(Math.abs(percent));
            column.setHgrow(Priority.ALWAYS);
            column.setHalignment(percent < 0.0 ? HPos.RIGHT : HPos.LEFT);
            grid.getColumnConstraints().add(column);
        }
        return grid;
    }

    /** A label with style classes. */
    static Label label(String text, String... styles) {
        Label label = new Label(text);
        label.getStyleClass().addAll(styles);
        return label;
    }

    /** Gives a label its styles, without work where it has them already. */
    static void restyle(Label label, String... styles) {
        List<String> wanted = List.of(styles);
        if (!label.getStyleClass().equals(wanted)) {
            label.getStyleClass().setAll(wanted);
        }
    }

    /** A label that breaks its text into lines. */
    static Label wrapped(String text, String... styles) {
        Label label = label(text, styles);
        label.setWrapText(true);
        label.setMinHeight(USE_PREF);
        return label;
    }

    /** A value at the right end of a line, as wide as most values, so that what stands before it is aligned. */
    static StackPane value(Label label) {
        label.setMinWidth(USE_PREF);
        Region usual = new Region();
        usual.getStyleClass().add("usual-value");
        StackPane box = new StackPane(usual, label);
        box.setAlignment(Pos.BASELINE_RIGHT);
        box.setMinWidth(USE_PREF);
        return box;
    }
}

package binspan.planner.view;

import binspan.planner.report.TextStyle;
import binspan.planner.viewmodel.RequirementRow;
import binspan.planner.viewmodel.Words;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The stated requirements, each with a bar from failing to ample. */
final class RequirementsView extends VBox {
    private static final double[] COLUMNS = {24.0, 50.0, -26.0};
    private static final double[] ROOMS = {0.01, 0.1, 1.0};
    private static final double MIDDLE = 0.5;
    private static final String NO_MARGIN = "-";

    private final List<Row> rows = new ArrayList<>();

    RequirementsView() {
        getStyleClass().add("requirements");
        setId("verdict-requirements");
    }

    void show(List<RequirementRow> shown) {
        if (rows.size() != shown.size()) {
            rows.clear();
            shown.forEach(row -> rows.add(new Row()));
            getChildren().clear();
            if (!rows.isEmpty()) {
                getChildren().add(head());
                getChildren().addAll(rows);
            }
        }
        for (int i = 0; i < rows.size(); i++) {
            rows.get(i).show(shown.get(i));
        }
    }

    private static GridPane head() {
        ScaleLabels scale = new ScaleLabels();
        for (double room : ROOMS) {
            String percent = String.valueOf(Math.round(100.0 * room));
            scale.add(place(RequirementRow.barShare(Math.log1p(room))), room > ROOMS[0] ? percent : percent + " %");
        }
        scale.add(place(-1.0), Words.of("verdict.fails"));
        Tooltip.install(scale, new Tooltip(Words.of("verdict.scale")));
        GridPane head = Columns.grid(COLUMNS);
        head.add(Columns.label(Words.of("verdict.required"), "soft", "small"), 0, 0);
        head.add(scale, 1, 0);
        head.add(Columns.label(Words.of("verdict.margin"), "soft", "small"), 2, 0);
        return head;
    }

    /** The place of a bar's end: 0 in the middle. */
    private static double place(double barShare) {
        return MIDDLE + MIDDLE * barShare;
    }

    private static double[] marks() {
        double[] marks = new double[2 * ROOMS.length + 1];
        for (int i = 0; i < ROOMS.length; i++) {
            double share = RequirementRow.barShare(Math.log1p(ROOMS[i]));
            marks[i] = place(-share);
            marks[ROOMS.length + 1 + i] = place(share);
        }
        marks[ROOMS.length] = MIDDLE;
        return marks;
    }

    /** One requirement on two lines. */
    private static final class Row extends VBox {
        private final Label sign = Columns.label("", "sign");
        private final Label name = Columns.label("");
        private final Label predicted = Columns.label("", "figure");
        private final ChangeLabel change = new ChangeLabel();
        private final Label required = Columns.label("", "soft", "small");
        private final SpanBar bar = new SpanBar(MIDDLE, marks());
        private final Label margin = Columns.label("", "soft", "small");
        private final Tooltip tooltip = new Tooltip();

        Row() {
            getStyleClass().add("requirement");
            setFocusTraversable(true);
            setAccessibleRole(AccessibleRole.TEXT);
            Region gap = new Region();
            HBox.setHgrow(gap, Priority.ALWAYS);
            HBox first = new HBox(sign, name, gap, change, Columns.value(predicted));
            first.getStyleClass().add("line");
            GridPane second = Columns.grid(COLUMNS);
            second.add(required, 0, 0);
            second.add(bar, 1, 0);
            second.add(margin, 2, 0);
            getChildren().addAll(first, second);
            Tooltip.install(this, tooltip);
            setOnMousePressed(event -> {
                requestFocus();
                event.consume(); // or the scroll pane takes the focus
            });
        }

        void show(RequirementRow row) {
            setId("verdict-requirement-" + row.requirement().fieldName());
            sign.setText(row.met() ? TextStyle.PLAIN_UNICODE.met() : TextStyle.PLAIN_UNICODE.notMet());
            String style = row.met() ? "good" : "bad";
            Columns.restyle(sign, "label", "sign", style);
            Columns.restyle(predicted, "label", "figure", style);
            name.setText(row.name());
            predicted.setText(row.predicted());
            change.show(row.change());
            required.setText(row.required());
            margin.setText(row.margin().isEmpty() ? NO_MARGIN : row.margin());
            bar.show(MIDDLE, place(row.barShare()), !row.met());
            setAccessibleText(row.spoken());
            tooltip.setText(row.spoken());
        }
    }
}

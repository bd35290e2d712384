package binspan.planner.view;

import binspan.planner.report.ParameterWords;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.FreeParameters;
import binspan.planner.viewmodel.Words;
import binspan.planner.viewmodel.WrittenAxis;
import binspan.scenario.ParameterPaths;
import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.ListChangeListener;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;

/** What a search may set: each parameter with a tick and, where there is room, its range; and further ones to add. */
final class FreeRows extends VBox {
    private static final double NUMBER = 4.2;
    private static final double NAME = 15.0;

    private final String study;
    private final FreeParameters free;
    private final Design design;
    private final Look look;
    private final boolean ranges;

    /**
     * Rows of parameters.
     *
     * @param study name of the study, which the ids begin with
     * @param free what may be set
     * @param design the link
     * @param look gives the widths
     * @param ranges whether the ranges are shown, a row for each parameter
     */
    FreeRows(String study, FreeParameters free, Design design, Look look, boolean ranges) {
        this.study = study;
        this.free = free;
        this.design = design;
        this.look = look;
        this.ranges = ranges;
        getStyleClass().add("study-free");
        free.axes().addListener((ListChangeListener<WrittenAxis>) change -> arrange());
        arrange();
    }

    private void arrange() {
        OptionRow row = new OptionRow(study, look);
        GridPane table = new GridPane();
        table.getStyleClass().add("study-ranges");
        getChildren().clear();
        for (int i = 0; i < free.axes().size(); i++) {
            WrittenAxis axis = free.axes().get(i);
            if (ranges) {
                table.addRow(i, line(i, axis));
            } else {
                row.with(tick(i, axis));
            }
        }
        if (ranges) {
            getChildren().add(table);
        }
        getChildren().add(adding(row));
    }

    private CheckBox tick(int index, WrittenAxis axis) {
        String path = axis.pathProperty().get();
        CheckBox box = new CheckBox(ParameterWords.name(path));
        box.setId(study + "-free-" + index);
        box.setTooltip(new Tooltip(path));
        box.selectedProperty().bindBidirectional(axis.usedProperty());
        return box;
    }

    private Node[] line(int index, WrittenAxis axis) {
        CheckBox tick = tick(index, axis);
        tick.setWrapText(true);
        tick.setMinHeight(USE_PREF_SIZE);
        look.follow(() -> tick.setPrefWidth(look.em(NAME)));
        OptionRow maker = new OptionRow(study, look);
        CheckBox log = maker.tick("log", axis.logarithmicProperty());
        log.setId(study + "-log-" + index);
        Label unit = new Label(unit(axis.pathProperty().get()));
        unit.setMinWidth(USE_PREF_SIZE);
        List<Node> line = new ArrayList<>(List.of(tick));
        line.addAll(maker.ends(Integer.toString(index), axis.fromProperty(), axis.toProperty(), NUMBER));
        line.addAll(List.of(unit, log));
        return line.toArray(Node[]::new);
    }

    private String unit(String path) {
        try {
            return ParameterPaths.find(design.scenario(), path).unit();
        } catch (IllegalArgumentException e) {
            return "";
        }
    }

    private OptionRow adding(OptionRow row) {
        StringProperty path = new SimpleStringProperty("");
        ParameterBox box = new ParameterBox(study + "-more", design, path, look);
        Button add = new Button(Words.of("studies.add"));
        add.setId(study + "-add");
        add.disableProperty().bind(path.isEmpty());
        add.setOnAction(event -> free.add(path.get().strip()));
        HBox more = new HBox(box, add);
        more.getStyleClass().add("study-option");
        return row.with(more);
    }
}

package binspan.planner.view;

import binspan.planner.export.StudyDefaults;
import binspan.planner.report.FigureWords;
import binspan.planner.viewmodel.SweepModel;
import binspan.planner.viewmodel.SweepModel.Kind;
import binspan.planner.viewmodel.Words;
import binspan.planner.viewmodel.WrittenAxis;
import binspan.study.FigureColumn;
import binspan.study.window.OperatingWindow;
import java.util.List;
import java.util.Locale;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.StringProperty;
import javafx.beans.value.ObservableBooleanValue;
import javafx.collections.ListChangeListener;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.CustomMenuItem;
import javafx.scene.control.MenuButton;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.VBox;

/** What the sweep varies and shows. */
final class SweepOptions extends VBox {
    private static final double NUMBER = 4.6;
    private static final double COUNT = 4.0;

    private final SweepModel model;
    private final Look look;

    SweepOptions(SweepModel model, Look look) {
        this.model = model;
        this.look = look;
        OptionRow row = new OptionRow(model.name(), look);
        row.choice(
                "kind",
                model.kindProperty(),
                List.of(Kind.values()),
                kind -> Words.of("studies.sweep.kind." + kind.name().toLowerCase(Locale.ROOT)));
        axis(row, "1", model.first());
        onlyIf(row.check("second", model.second().usedProperty()), sweeps());
        BooleanBinding both = sweeps().and(model.second().usedProperty());
        axis(row, "2", model.second()).forEach(each -> onlyIf(each, both));
        MenuButton figures = figures();
        onlyIf(figures, sweeps());
        row.with(figures);
        getChildren().add(row);
    }

    private BooleanBinding sweeps() {
        return model.kindProperty().isEqualTo(Kind.SWEEP);
    }

    private String usualSteps() {
        boolean window = model.kindProperty().get() == Kind.WINDOW;
        int both = model.second().usedProperty().get() ? 1 : 0;
        return Integer.toString(window ? OperatingWindow.FEWEST_SAMPLES : StudyDefaults.SWEEP_STEPS.get(both));
    }

    private static void onlyIf(Node node, ObservableBooleanValue wanted) {
        node.visibleProperty().bind(wanted);
        node.managedProperty().bind(wanted);
    }

    private List<Node> axis(OptionRow row, String number, WrittenAxis axis) {
        ParameterBox box = new ParameterBox("sweep-path-" + number, model.design(), axis.pathProperty(), look);
        box.setOnAction(event -> axis.propose(model.design().scenario()));
        row.with(box);
        Node range = row.together(
                row.ends(number, axis.fromProperty(), axis.toProperty(), NUMBER).toArray(Node[]::new));
        CheckBox logarithmic = row.tick("log", axis.logarithmicProperty());
        logarithmic.setId("sweep-log-" + number);
        return List.of(box, range, row.together(steps(row, number, axis.stepsProperty()), logarithmic));
    }

    private Node steps(OptionRow row, String number, StringProperty value) {
        TextField field = row.field("steps", value, COUNT);
        field.promptTextProperty()
                .bind(Bindings.createStringBinding(
                        this::usualSteps, model.second().usedProperty(), model.kindProperty()));
        Node pair = row.labelled("steps", field);
        field.setId("sweep-steps-" + number);
        return pair;
    }

    private MenuButton figures() {
        MenuButton menu = new MenuButton();
        menu.setId("sweep-figures");
        menu.setTooltip(new Tooltip(Words.of("studies.sweep.figures.hint")));
        menu.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> model.shown().isEmpty()
                                ? Words.of("studies.sweep.figures.usual")
                                : Words.of(
                                        "studies.sweep.figures.some",
                                        Integer.toString(model.shown().size())),
                        model.shown()));
        model.known().addListener((ListChangeListener<FigureColumn>) change ->
                menu.getItems().setAll(model.known().stream().map(this::tick).toList()));
        model.findFigures();
        model.design().scenarioProperty().addListener((source, before, after) -> menu.hide());
        menu.setOnShowing(event -> model.findFigures());
        return menu;
    }

    private CustomMenuItem tick(FigureColumn figure) {
        CheckBox box = new CheckBox(FigureWords.title(figure));
        box.setSelected(model.shown().contains(figure));
        box.selectedProperty().addListener((source, before, after) -> {
            if (after) {
                model.shown().add(figure);
            } else {
                model.shown().remove(figure);
            }
        });
        return new CustomMenuItem(box, false);
    }
}

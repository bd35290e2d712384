package binspan.planner.view;

import binspan.planner.report.Figure;
import binspan.planner.report.ParameterWords;
import binspan.planner.viewmodel.StudyRun.State;
import binspan.planner.viewmodel.ToleranceModel;
import binspan.planner.viewmodel.Words;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.ListChangeListener;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TitledPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;

/** How many builds are drawn, and what spreads in them. */
final class ToleranceOptions extends VBox {
    private static final double SEED = 6.0;
    private static final double WIDTH = 5.0;
    private static final double TALLEST = 9.0;

    private final ToleranceModel model;
    private final Look look;
    private final VBox rows = new VBox();
    private final StringProperty path = new SimpleStringProperty("");
    private final StringProperty width = new SimpleStringProperty("");
    private final ObjectProperty<SpreadShape> shape = new SimpleObjectProperty<>(SpreadShape.NORMAL);

    ToleranceOptions(ToleranceModel model, Look look) {
        this.model = model;
        this.look = look;
        OptionRow row = new OptionRow(model.name(), look);
        row.choice("builds", model.buildsProperty(), ToleranceModel.BUILDS, Object::toString);
        row.text("seed", model.seedProperty(), SEED);
        getChildren().addAll(row, spreads());
        model.rows().addListener((ListChangeListener<ToleranceModel.Row>) change -> list());
        list();
    }

    private TitledPane spreads() {
        rows.getStyleClass().add("study-spreads");
        ScrollPane scroll = new ScrollPane(rows);
        scroll.setFitToWidth(true);
        look.follow(() -> scroll.setMaxHeight(look.em(TALLEST)));
        StudyBanner refusal = new StudyBanner("tolerance-refusal", "problem", model.refusalProperty());
        TitledPane pane = new TitledPane("", new VBox(scroll, adding(), refusal));
        pane.setId("tolerance-spreads");
        pane.setAnimated(false);
        pane.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> Words.of(
                                "studies.tolerance.spreads",
                                Integer.toString(model.rows().size())),
                        model.rows()));
        model.run().stateProperty().addListener((source, before, after) -> {
            if (after == State.DONE) {
                pane.setExpanded(false);
            }
        });
        return pane;
    }

    private OptionRow adding() {
        OptionRow row = new OptionRow(model.name(), look);
        row.with(new ParameterBox("tolerance-path", model.design(), path, look));
        row.choice("shape", shape, List.of(SpreadShape.values()), SpreadShape::text);
        row.text("width", width, WIDTH);
        Button add = new Button(Words.of("studies.add"));
        add.setId("tolerance-add");
        add.disableProperty().bind(path.isEmpty().or(width.isEmpty()));
        add.setOnAction(event -> add());
        return row.with(add);
    }

    private void add() {
        if (model.add(path.get().strip(), shape.get(), width.get())) {
            path.set("");
            width.set("");
        }
    }

    private void list() {
        rows.getChildren().setAll(model.rows().stream().map(this::line).toList());
        if (model.rows().isEmpty()) {
            Label nothing = new Label(Words.of("studies.tolerance.nothing"));
            nothing.setWrapText(true);
            nothing.setMinHeight(USE_PREF_SIZE);
            rows.getChildren().add(nothing);
        }
    }

    private HBox line(ToleranceModel.Row row) {
        String words = words(row);
        Label label = new Label(row.added() ? Words.of("studies.tolerance.added", words) : words);
        label.setTooltip(new Tooltip(row.spread().parameter().path()));
        HBox line = new HBox(label);
        line.getStyleClass().add("study-option");
        if (row.added()) {
            Button remove = new Button(Words.of("studies.remove"));
            remove.setOnAction(event -> model.remove(row));
            line.getChildren().add(remove);
        }
        return line;
    }

    private static String words(ToleranceModel.Row row) {
        Spread spread = row.spread().spread();
        String size = spread.relative()
                ? Figure.stated(100.0 * spread.width(), "%")
                : Figure.stated(spread.width(), row.spread().parameter().unit());
        return Words.of(
                "studies.tolerance.row",
                ParameterWords.name(row.spread().parameter().path()),
                spread.shape().text(),
                size);
    }
}

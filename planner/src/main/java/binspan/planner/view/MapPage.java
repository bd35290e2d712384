package binspan.planner.view;

import binspan.planner.export.BoxReport;
import binspan.planner.export.RegionReport;
import binspan.planner.export.StudyReport;
import binspan.planner.viewmodel.MapModel;
import binspan.planner.viewmodel.MapModel.BoxChoice;
import binspan.planner.viewmodel.MapRecommendation;
import binspan.planner.viewmodel.Words;
import java.util.ArrayList;
import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;

/** The page of the operating map: axes, map, read-out, commands. */
final class MapPage extends BorderPane {
    private static final double NARROW = 42.0;
    private static final double READOUT = 18.0;
    private static final double FIELD = 5.2;
    private static final double NARROW_FIELD = 4.2;

    private final MapModel model;
    private final Look look;
    private final BorderPane body = new BorderPane();
    private final MapReadout readout;
    private final ScrollPane side = new ScrollPane();
    private final GridPane axes = new GridPane();
    private final List<MenuButton> handouts = new ArrayList<>();
    private boolean narrow;

    /**
     * The page of a model.
     *
     * @param model the map
     * @param look theme and scale
     * @param desk the link and where files are made
     * @param files asks for file names
     */
    MapPage(MapModel model, Look look, StudyHandout.Desk desk, FileQuestions files) {
        this.model = model;
        this.look = look;
        this.readout = new MapReadout(model, look);
        handouts(model, desk, files);
        getStyleClass().add("map-page");
        setId("map-page");
        body.getStyleClass().add("map-body");
        body.setId("map-body");
        body.setCenter(new MapPlane(model, look));
        side.setId("map-side");
        side.setFitToWidth(true);
        side.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        side.setContent(readout);
        side.setFocusTraversable(false);
        setTop(new VBox(axes(), error()));
        setCenter(body);
        setBottom(commands());
        widthProperty().addListener((source, before, after) -> arrange());
        look.follow(() -> {
            side.setPrefWidth(look.em(READOUT));
            widen();
            arrange();
        });
    }

    /** Menus to copy and to export the map, and to export the box; they wait until the exact ones are computed. */
    private void handouts(MapModel map, StudyHandout.Desk desk, FileQuestions files) {
        ObservableValue<StudyReport> region =
                map.regionProperty().map(found -> RegionReport.of(map.design().scenario(), found));
        ObservableValue<StudyReport> box =
                map.boxProperty().map(found -> BoxReport.of(map.design().scenario(), found));
        List<MenuButton> ofMap = new StudyHandout("map", desk, region, () -> body.snapshot(null, null), files).menus();
        MenuButton ofBox = new StudyHandout("box", desk, box, () -> null, files).export();
        ofBox.setText(Words.of("map.exportBox"));
        ofMap.forEach(menu -> menu.disableProperty().bind(map.regionProperty().isNull()));
        ofBox.disableProperty().bind(map.boxProperty().isNull());
        handouts.addAll(ofMap);
        handouts.add(ofBox);
    }

    private Node axes() {
        axes.getStyleClass().add("map-axes");
        MapAxisRow across = new MapAxisRow(
                model, model.horizontal(), model::chooseHorizontal, Words.of("map.across"), "map-horizontal");
        MapAxisRow up =
                new MapAxisRow(model, model.vertical(), model::chooseVertical, Words.of("map.up"), "map-vertical");
        axes.addRow(0, across.nodes().toArray(Node[]::new));
        axes.addRow(1, up.nodes().toArray(Node[]::new));
        for (int column = 0; column < across.nodes().size(); column++) {
            axes.getColumnConstraints().add(new ColumnConstraints());
        }
        axes.getColumnConstraints().get(1).setHgrow(Priority.ALWAYS);
        return axes;
    }

    private void widen() {
        double least = Region.USE_PREF_SIZE;
        List.of(0, 3, 5, 6)
                .forEach(column -> axes.getColumnConstraints().get(column).setMinWidth(least));
        List.of(2, 4).forEach(column -> {
            double width = look.em(narrow ? NARROW_FIELD : FIELD);
            axes.getColumnConstraints().get(column).setPrefWidth(width);
            axes.getColumnConstraints().get(column).setMinWidth(width);
        });
        axes.getColumnConstraints().get(1).setMinWidth(look.em(8.0));
    }

    private Node error() {
        Label error = new Label();
        error.setId("map-error");
        error.getStyleClass().addAll("bad", "map-error");
        error.setWrapText(true);
        error.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> model.horizontal().errorProperty().get().isEmpty()
                                ? model.vertical().errorProperty().get()
                                : model.horizontal().errorProperty().get(),
                        model.horizontal().errorProperty(),
                        model.vertical().errorProperty()));
        error.visibleProperty().bind(error.textProperty().isNotEmpty());
        error.managedProperty().bind(error.visibleProperty());
        return error;
    }

    private Node commands() {
        Button move = button("move", () -> model.reader().moveToPicked());
        move.disableProperty().bind(model.reader().pickedProperty().isNull());
        Button recommended = button("recommended", model::goToRecommended);
        recommended.disableProperty().bind(model.recommendedProperty().isNull());
        recommended.accessibleTextProperty().bind(recommended.getTooltip().textProperty());
        recommended
                .getTooltip()
                .textProperty()
                .bind(model.recommendedProperty().map(MapPage::recommendation).orElse(Words.of("map.recommended.tip")));
        FlowPane commands = new FlowPane(move, recommended, button("reset", model::resetAxes), boxes());
        commands.getChildren().addAll(handouts);
        commands.getStyleClass().add("map-commands");
        return commands;
    }

    private static String recommendation(MapRecommendation point) {
        return Words.of("map.recommended.tip") + ": " + Words.of("map.star." + point.kind());
    }

    private static Button button(String name, Runnable command) {
        Button button = new Button(Words.of("map." + name));
        button.setId("map-" + name);
        button.setTooltip(new Tooltip(Words.of("map." + name + ".tip")));
        button.setOnAction(event -> command.run());
        return button;
    }

    private Node boxes() {
        ChoiceBox<BoxChoice> choice = new ChoiceBox<>();
        choice.setId("map-box");
        choice.setAccessibleText(Words.of("map.box"));
        choice.getItems().setAll(BoxChoice.values());
        choice.setConverter(new StringConverter<>() {
            @Override
            public String toString(BoxChoice shown) {
                return Words.of("map.box") + ": " + Words.of("map.box." + shown);
            }

            @Override
            public BoxChoice fromString(String text) {
                throw new UnsupportedOperationException("a choice is not typed");
            }
        });
        choice.setTooltip(new Tooltip(Words.of("map.box.tip")));
        choice.valueProperty().bindBidirectional(model.boxChoiceProperty());
        return choice;
    }

    /** The read-out stands at the side where there is room, else one line of it under the map. */
    private void arrange() {
        boolean small = getWidth() < look.em(NARROW);
        boolean first = body.getRight() == null && body.getBottom() == null;
        if (small != narrow || first) {
            narrow = small;
            widen();
            readout.arrange(small);
            body.setRight(null);
            body.setBottom(null);
            if (small) {
                side.setContent(null);
                body.setBottom(readout);
            } else {
                side.setContent(readout);
                body.setRight(side);
            }
        }
    }
}

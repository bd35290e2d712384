package binspan.planner.view;

import binspan.planner.viewmodel.SlotPlot;
import binspan.planner.viewmodel.SlotPlot.Kind;
import binspan.planner.viewmodel.SlotsModel;
import binspan.planner.viewmodel.Words;
import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.BooleanProperty;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The page of the slots: arrival times at alice, at bob and of the pairs, with windows and separation to take hold of. */
final class SlotsPage extends VBox {
    private final SlotsModel model;
    private final Look look;
    private final VBox plots = new VBox();
    private final FlowPane legend = new FlowPane();
    private final List<Shown> shown = new ArrayList<>();

    /** A plot with its heading. */
    private record Shown(Label title, Label note, HistogramPlot plot) {}

    SlotsPage(SlotsModel model, Look look) {
        this.model = model;
        this.look = look;
        setId("slots-page");
        getStyleClass().addAll("page", "slots-page");
        plots.getStyleClass().add("plots");
        legend.getStyleClass().add("legend");
        getChildren().addAll(choices(), plots, legend);
        VBox.setVgrow(plots, Priority.ALWAYS);
        model.plotsProperty().addListener((source, before, now) -> show(now));
        model.logarithmicProperty()
                .addListener((source, before, now) -> show(model.plotsProperty().get()));
        look.follow(this::legend);
        show(model.plotsProperty().get());
    }

    private HBox choices() {
        CheckBox logarithmic = choice("slots-log", "slots.log", model.logarithmicProperty());
        CheckBox allPorts = choice("slots-all-ports", "slots.allPorts", model.allPortsProperty());
        Label flat = new Label(Words.of("slots.flat"));
        flat.getStyleClass().add("soft");
        flat.visibleProperty().bind(model.plotsProperty().map(each -> each.size() == 1));
        flat.managedProperty().bind(flat.visibleProperty());
        HBox choices = new HBox(logarithmic, allPorts, flat);
        choices.getStyleClass().add("choices");
        return choices;
    }

    private static CheckBox choice(String id, String key, BooleanProperty property) {
        CheckBox box = new CheckBox(Words.of(key));
        box.setId(id);
        box.setMinWidth(Region.USE_PREF_SIZE);
        box.selectedProperty().bindBidirectional(property);
        return box;
    }

    private void show(List<SlotPlot> now) {
        if (shown.size() != now.size()) {
            build(now);
            legend();
        }
        for (int i = 0; i < now.size(); i++) {
            Shown each = shown.get(i);
            each.title().setText(now.get(i).title());
            each.note().setText(now.get(i).note());
            each.note().setTooltip(new Tooltip(now.get(i).note()));
            each.plot().show(now.get(i));
        }
    }

    private void build(List<SlotPlot> now) {
        shown.clear();
        plots.getChildren().clear();
        for (SlotPlot plot : now) {
            Shown each = new Shown(new Label(), new Label(), new HistogramPlot(model, look, plot.id(), this::held));
            each.title().getStyleClass().add("heading");
            each.title().setMinWidth(Region.USE_PREF_SIZE);
            each.note().getStyleClass().add("soft");
            HBox heading = new HBox(each.title(), each.note());
            heading.getStyleClass().add("plot-heading");
            VBox box = new VBox(heading, each.plot());
            VBox.setVgrow(each.plot(), Priority.ALWAYS);
            VBox.setVgrow(box, Priority.ALWAYS);
            box.setPrefHeight(1.0);
            plots.getChildren().add(box);
            shown.add(each);
        }
    }

    /** While a handle of one plot is held the time axes of all stand still. */
    private void held() {
        boolean held = shown.stream().anyMatch(each -> each.plot().held());
        shown.forEach(each -> each.plot().still(held));
    }

    /** One entry for each kind of layer that is drawn. */
    private void legend() {
        legend.getChildren().clear();
        for (Kind kind : Kind.values()) {
            List<String> names = model.plotsProperty().get().stream()
                    .flatMap(plot -> plot.layers().stream())
                    .filter(layer -> layer.kind() == kind)
                    .map(SlotPlot.Layer::name)
                    .distinct()
                    .toList();
            if (!names.isEmpty()) {
                Label entry = new Label(String.join(Words.of("slots.legend.or"), names), swatch(kind));
                legend.getChildren().add(entry);
            }
        }
    }

    private Canvas swatch(Kind kind) {
        Canvas canvas = new Canvas(look.em(1.8), look.em(0.9));
        new HistogramDrawing(canvas.getGraphicsContext2D(), look, null)
                .swatch(kind, 0.5, 0.5, canvas.getWidth() - 2.0, canvas.getHeight() - 2.0);
        return canvas;
    }
}

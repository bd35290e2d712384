package binspan.planner.view;

import binspan.planner.report.AxisWords;
import binspan.planner.report.ParameterWords;
import binspan.planner.report.RequirementText;
import binspan.planner.viewmodel.MapModel;
import binspan.planner.viewmodel.MapReading;
import binspan.planner.viewmodel.MapRecommendation;
import binspan.planner.viewmodel.Words;
import binspan.prediction.Requirement;
import binspan.study.Axis;
import binspan.study.box.BoxSide;
import binspan.study.box.OperatingBox;
import binspan.study.window.PointVerdict;
import binspan.study.window.RequirementMargin;
import binspan.units.Digits;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;

/** What the link does at the point that is read, with the legend of the lines; below it the recommended point and the box. */
final class MapReadout extends VBox {
    private final MapModel model;
    private final Look look;
    private final Label kind = label("map-kind", "heading");
    private final VBox place = new VBox();
    private final Label result = label("map-result");
    private final VBox rows = new VBox();
    private final FlowPane legend = new FlowPane();
    private final VBox extras = new VBox();
    private boolean compact;
    private List<Requirement> requirements = List.of();

    MapReadout(MapModel model, Look look) {
        this.model = model;
        this.look = look;
        setId("map-readout");
        getStyleClass().add("map-readout");
        rows.getStyleClass().add("map-rows");
        legend.getStyleClass().add("map-legend");
        extras.setId("map-extras");
        result.setWrapText(true);
        arrange(false);
        model.reader().readingProperty().addListener((source, before, after) -> show(after));
        model.recommendedProperty().addListener((source, before, after) -> showExtras());
        model.boxProperty().addListener((source, before, after) -> showExtras());
        look.follow(this::rebuild);
    }

    /** Whether there is room for one line and a legend only. */
    void arrange(boolean small) {
        compact = small;
        if (small) {
            getChildren().setAll(line(kind, place), result, legend);
        } else {
            getChildren().setAll(line(kind, result), place, rows, extras);
        }
        rebuild();
    }

    private static HBox line(Node... nodes) {
        HBox line = new HBox(nodes);
        line.getStyleClass().add("map-line");
        return line;
    }

    private void rebuild() {
        requirements = List.of();
        show(model.reader().readingProperty().get());
        showExtras();
    }

    private static Label label(String id, String... classes) {
        Label label = new Label();
        label.setId(id);
        label.getStyleClass().addAll(classes);
        return label;
    }

    private void show(MapReading reading) {
        setVisible(reading != null);
        if (reading == null) {
            return;
        }
        kind.setText(Words.of("map.kind." + reading.kind()));
        place.getChildren().setAll(places(reading.verdict()));
        result.setText(result(reading.verdict()));
        result.getStyleClass().setAll("label", reading.verdict().met() ? "good" : "bad");
        List<Requirement> shown = reading.verdict().requirements().stream()
                .map(RequirementMargin::requirement)
                .toList();
        if (!shown.equals(requirements)) {
            requirements = shown;
            rows.getChildren()
                    .setAll(shown.stream()
                            .map(each -> new MapReadoutRow(each, look))
                            .toList());
            legend.getChildren().setAll(shown.stream().map(this::entry).toList());
        }
        fill(reading.verdict());
    }

    private List<Label> places(PointVerdict verdict) {
        Axis across = model.horizontal().axis();
        Axis up = model.vertical().axis();
        return compact
                ? List.of(new Label(values(verdict)))
                : List.of(
                        named(across, verdict.values().get(0)),
                        named(up, verdict.values().get(1)));
    }

    private String values(PointVerdict verdict) {
        return AxisWords.plain(model.horizontal().axis(), verdict.values().get(0)) + ", "
                + AxisWords.plain(model.vertical().axis(), verdict.values().get(1));
    }

    private static Label named(Axis axis, double value) {
        Label label = new Label(ParameterWords.name(axis.parameter().path()) + " " + AxisWords.plain(axis, value));
        label.setWrapText(true);
        return label;
    }

    private String result(PointVerdict verdict) {
        String word = Words.of(verdict.met() ? "map.all.met" : "map.not.met");
        if (!compact) {
            return word;
        }
        RequirementMargin tightest = verdict.tightest();
        return word + "; " + Words.of("map.tightest") + " " + RequirementText.name(tightest.requirement()) + " "
                + MapReadoutRow.figure(tightest);
    }

    private void fill(PointVerdict verdict) {
        for (int i = 0; i < rows.getChildren().size(); i++) {
            RequirementMargin margin = verdict.requirements().get(i);
            ((MapReadoutRow) rows.getChildren().get(i)).fill(margin, margin.equals(verdict.tightest()));
        }
    }

    private Node entry(Requirement requirement) {
        Label name = new Label(Words.of("map.short." + requirement.name()), MapInk.swatch(requirement, look));
        name.getStyleClass().add("soft");
        return name;
    }

    private void showExtras() {
        List<Node> lines = new ArrayList<>();
        MapRecommendation recommended = model.recommendedProperty().get();
        if (recommended != null) {
            lines.add(heading("★ " + Words.of("map.star.heading")));
            lines.add(new Label(values(recommended.point())));
            lines.add(Columns.wrapped(Words.of("map.star." + recommended.kind()), "soft"));
        }
        OperatingBox box = model.boxProperty().get();
        if (box != null) {
            lines.add(heading("▭ " + Words.of("map.box.heading")));
            box.sides().forEach(side -> lines.add(side(side)));
            if (model.boxChoiceProperty().get() == MapModel.BoxChoice.TOLERANCE) {
                lines.add(new Label(Words.of("map.box.tolerance", Digits.significant(100.0 * box.tolerance(), 3))));
            }
        }
        extras.getChildren().setAll(lines);
    }

    private static Label heading(String words) {
        Label heading = new Label(words);
        heading.getStyleClass().addAll("heading", "map-extra");
        return heading;
    }

    private static Label side(BoxSide side) {
        return new Label(
                AxisWords.plainRange(side.axis(), side.from().value(), side.to().value()));
    }
}

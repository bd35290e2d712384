package binspan.planner.view;

import binspan.planner.report.Figure;
import binspan.planner.report.RequirementText;
import binspan.planner.report.RequirementWords;
import binspan.planner.viewmodel.Words;
import binspan.prediction.Requirement;
import binspan.study.window.RequirementMargin;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** One requirement in the read-out: whether it is met, its line on the map, its figure and its margin. */
final class MapReadoutRow extends VBox {
    private final Label sign = new Label();
    private final Label name = new Label();
    private final Label figure = new Label();
    private final Label margin = new Label();

    MapReadoutRow(Requirement requirement, Look look) {
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox first = new HBox(sign, name);
        HBox second = new HBox(MapInk.swatch(requirement, look), figure, gap, margin);
        first.getStyleClass().add("map-line");
        second.getStyleClass().add("map-line");
        figure.setMinWidth(Region.USE_PREF_SIZE);
        margin.setMinWidth(Region.USE_PREF_SIZE);
        sign.setMinWidth(Region.USE_PREF_SIZE);
        name.setTooltip(new Tooltip(RequirementText.name(requirement)));
        getChildren().setAll(first, second);
    }

    void fill(RequirementMargin found, boolean tightest) {
        String tone = found.met() ? "good" : "bad";
        sign.setText(found.met() ? "✓" : "✗");
        sign.getStyleClass().setAll("label", tone);
        margin.getStyleClass().setAll("label", tone);
        name.setText(
                found.requirement() == Requirement.SLOTS
                        ? RequirementText.name(found.requirement())
                        : RequirementText.of(found.requirement(), found.required()));
        figure.setText(figure(found));
        margin.setText((tightest ? Words.of("map.least") + " " : "") + room(found));
        margin.setTooltip(new Tooltip(Words.of("verdict.margin.spoken", Figure.spelt(room(found)))));
    }

    /** The predicted figure; nothing for the slots, which have none. */
    static String figure(RequirementMargin found) {
        if (found.requirement() == Requirement.SLOTS) {
            return "";
        }
        return Double.isFinite(found.predicted())
                ? RequirementWords.predicted(found.requirement(), found.predicted(), found.required())
                : RequirementWords.missing(found.requirement());
    }

    private static String room(RequirementMargin found) {
        if (!Double.isFinite(found.predicted()) || found.requirement() == Requirement.SLOTS) {
            return "";
        }
        double room = found.predicted() - found.required();
        return RequirementWords.room(found.requirement(), found.requirement().atLeast() ? room : -room);
    }
}

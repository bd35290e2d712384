package binspan.planner.view;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;

/** Texts over the marks of a bar, each centred on a share of the width but inside it. */
final class ScaleLabels extends Region {
    private final List<Label> labels = new ArrayList<>();
    private final List<Double> places = new ArrayList<>();

    /** Adds a text at a share of the width. */
    Label add(double place, String text) {
        Label label = new Label(text);
        label.getStyleClass().add("scale-label");
        label.setMinWidth(USE_PREF_SIZE);
        labels.add(label);
        places.add(place);
        getChildren().add(label);
        return label;
    }

    @Override
    protected double computePrefHeight(double width) {
        return labels.stream()
                .mapToDouble(label -> label.prefHeight(-1.0))
                .max()
                .orElse(0.0);
    }

    @Override
    protected double computeMinHeight(double width) {
        return computePrefHeight(width);
    }

    @Override
    protected void layoutChildren() {
        for (int i = 0; i < labels.size(); i++) {
            Label label = labels.get(i);
            double width = label.prefWidth(-1.0);
            double left = places.get(i) * getWidth() - width / 2.0;
            double inside = Math.max(0.0, Math.min(getWidth() - width, left));
            label.resizeRelocate(snapPositionX(inside), 0.0, width, getHeight());
        }
    }
}

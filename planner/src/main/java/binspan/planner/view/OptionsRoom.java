package binspan.planner.view;

import javafx.beans.value.ObservableBooleanValue;
import javafx.geometry.Orientation;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.Region;

/** Keeps options from taking more than their share of a page; they scroll where it is too small. */
final class OptionsRoom extends Region {
    private static final double ALONE = 0.58;
    private static final double BESIDE_RESULT = 0.3;

    private final Region options;
    private final Region page;
    private final ObservableBooleanValue beside;
    private final ScrollPane scroll;

    /**
     * Room for options.
     *
     * @param options what scrolls
     * @param page what it is a share of
     * @param beside whether there is a result that needs room too
     */
    OptionsRoom(Region options, Region page, ObservableBooleanValue beside) {
        this.options = options;
        this.page = page;
        this.beside = beside;
        beside.addListener((source, before, after) -> requestLayout());
        this.scroll = new ScrollPane(options);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.getStyleClass().add("study-options-room");
        getChildren().add(scroll);
        page.heightProperty().addListener((source, before, after) -> requestLayout());
        options.needsLayoutProperty().addListener((source, before, after) -> requestLayout());
    }

    @Override
    public Orientation getContentBias() {
        return Orientation.HORIZONTAL;
    }

    @Override
    protected double computePrefHeight(double width) {
        double wanted = options.prefHeight(width) + 2.0;
        return page.getHeight() > 0.0 ? Math.min(wanted, share() * page.getHeight()) : wanted;
    }

    private double share() {
        return beside.get() ? BESIDE_RESULT : ALONE;
    }

    @Override
    protected double computeMinHeight(double width) {
        return computePrefHeight(width);
    }

    @Override
    protected double computePrefWidth(double height) {
        return options.prefWidth(height);
    }

    @Override
    protected void layoutChildren() {
        scroll.resizeRelocate(0.0, 0.0, getWidth(), getHeight());
    }
}

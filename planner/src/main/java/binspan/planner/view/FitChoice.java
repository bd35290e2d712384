package binspan.planner.view;

import binspan.planner.viewmodel.Words;
import javafx.beans.property.BooleanProperty;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;

/** Whether a picture fits its place or shows all its panels; there where some of them had to be left out. */
final class FitChoice extends HBox {
    private final ToggleGroup group = new ToggleGroup();
    private final ToggleButton whole;

    /** The choice of a study, to fit first. */
    FitChoice(String study) {
        getStyleClass().add("study-views");
        setMinWidth(Region.USE_PREF_SIZE);
        toggle(study, "fit").setSelected(true);
        whole = toggle(study, "all-panels");
        group.selectedToggleProperty().addListener((source, before, after) -> {
            if (after == null) {
                group.selectToggle(before);
            }
        });
        managedProperty().bind(visibleProperty());
        setNeeded(false);
    }

    private ToggleButton toggle(String study, String name) {
        ToggleButton toggle = new ToggleButton(Words.of("studies." + name));
        toggle.setId(study + "-" + name);
        toggle.getStyleClass().addAll("study-view", "small");
        toggle.setTooltip(new Tooltip(Words.of("studies." + name + ".hint")));
        toggle.setToggleGroup(group);
        getChildren().add(toggle);
        return toggle;
    }

    /** Shows it where there is something to choose. */
    void setNeeded(boolean needed) {
        setVisible(needed);
    }

    /** Whether all panels are wanted. */
    BooleanProperty wholeProperty() {
        return whole.selectedProperty();
    }
}

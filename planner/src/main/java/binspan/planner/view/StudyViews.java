package binspan.planner.view;

import binspan.planner.viewmodel.Words;
import java.util.List;
import javafx.scene.Node;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/** The ways in which a result is shown, of which one is chosen. */
final class StudyViews {
    private final ToggleGroup group = new ToggleGroup();
    private final HBox toggles = new HBox();
    private final FlowPane bar = new FlowPane(toggles);
    private final StackPane shown = new StackPane();

    StudyViews(String name, Node picture, Node summary, Node table) {
        bar.getStyleClass().add("study-bar");
        toggles.getStyleClass().add("study-views");
        toggles.setAccessibleText(Words.of("studies.views"));
        shown.getStyleClass().add("study-shown");
        VBox.setVgrow(shown, Priority.ALWAYS);
        add(name, "picture", picture);
        add(name, "summary", summary);
        add(name, "table", table);
        group.selectToggle(group.getToggles().get(0));
        group.selectedToggleProperty().addListener((source, before, after) -> {
            if (after == null) {
                group.selectToggle(before);
            }
        });
    }

    private void add(String name, String view, Node node) {
        ToggleButton toggle = new ToggleButton(Words.of("studies." + view));
        toggle.setId(name + "-show-" + view);
        toggle.getStyleClass().add("study-view");
        toggle.setToggleGroup(group);
        node.visibleProperty().bind(toggle.selectedProperty());
        toggles.getChildren().add(toggle);
        shown.getChildren().add(node);
    }

    /** Adds controls beside the choice. */
    void add(List<? extends Node> controls) {
        bar.getChildren().addAll(controls);
    }

    /** The choice. */
    Node bar() {
        return bar;
    }

    /** What is chosen. */
    Node shown() {
        return shown;
    }
}

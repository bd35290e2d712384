package binspan.planner.view;

import binspan.planner.viewmodel.TuneModel;
import binspan.planner.viewmodel.Words;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;

/** What the best settings would change, and the button that does it. */
final class TunedSteps extends FlowPane {
    private final Button apply = new Button(Words.of("studies.apply"));

    TunedSteps(TuneModel model) {
        getStyleClass().add("study-apply");
        apply.setId("tune-apply");
        apply.disableProperty().bind(model.run().staleProperty());
        apply.setOnAction(event -> model.apply());
        model.run().resultProperty().addListener((source, before, after) -> show(after.found()));
    }

    private void show(TuneModel.Tuned tuned) {
        getChildren().setAll(tuned.steps().stream().map(Label::new).toList());
        getChildren().add(apply);
    }
}

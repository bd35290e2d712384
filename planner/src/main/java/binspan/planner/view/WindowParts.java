package binspan.planner.view;

import binspan.planner.view.MainWindow.Page;
import binspan.planner.view.MainWindow.Parts;
import binspan.planner.viewmodel.PlannerModel;
import java.util.List;
import javafx.scene.layout.StackPane;

/** Makes the parts of the window. */
final class WindowParts {
    private WindowParts() {}

    /** The parts, bound to the models. */
    static Parts of(PlannerModel model, Look look, FileQuestions files) {
        return new Parts(
                new StackPane(),
                new StackPane(),
                new StackPane(),
                List.of(new Page("slots", new SlotsPage(model.slots(), look))));
    }
}

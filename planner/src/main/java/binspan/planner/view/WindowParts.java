package binspan.planner.view;

import binspan.planner.view.MainWindow.Page;
import binspan.planner.view.MainWindow.Parts;
import binspan.planner.viewmodel.PlannerModel;
import java.util.List;

/** Makes the parts of the window. */
final class WindowParts {
    private WindowParts() {}

    /**
     * The parts, bound to the models.
     *
     * @param model what they show
     * @param look theme and scale
     * @param files asks for file names
     * @param showRoom shows the page of the room
     */
    static Parts of(PlannerModel model, Look look, FileQuestions files, Runnable showRoom) {
        StudyPages studies = new StudyPages(look, files);
        return new Parts(
                new LinkStrip(model.link(), look),
                new FormPane(model.form()),
                new VerdictPane(model.verdict(), showRoom),
                List.of(
                        new Page("slots", new SlotsPage(model.slots(), look)),
                        new Page(
                                "map",
                                new MapPage(
                                        model.map(),
                                        look,
                                        new StudyHandout.Desk(model.design(), model.background()),
                                        files)),
                        new Page("room", new RoomPage(model.verdict(), model.design(), look)),
                        new Page("reach", studies.reach(model.studies().reach())),
                        new Page("detectors", studies.detectors(model.studies().detectors())),
                        new Page("tolerance", studies.tolerance(model.studies().tolerance())),
                        new Page("sweep", studies.sweep(model.studies().sweep())),
                        new Page("tune", studies.tune(model.studies().tune()))));
    }
}

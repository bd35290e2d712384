package binspan.planner.view;

import binspan.planner.viewmodel.Aim;
import binspan.planner.viewmodel.DetectorsModel;
import binspan.planner.viewmodel.ReachModel;
import binspan.planner.viewmodel.SweepModel;
import binspan.planner.viewmodel.ToleranceModel;
import binspan.planner.viewmodel.TuneModel;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Locale;
import javafx.beans.property.Property;
import javafx.scene.control.ComboBox;
import javafx.scene.control.TextField;
import javafx.scene.layout.VBox;

/** The pages of the studies. */
public final class StudyPages {
    private static final double SHORT = 4.5;

    private final Look look;
    private final FileQuestions files;

    /** Pages of a look, which ask their questions about files there. */
    StudyPages(Look look, FileQuestions files) {
        this.look = look;
        this.files = files;
    }

    /** How far the link reaches. */
    StudyPage reach(ReachModel model) {
        OptionRow row = new OptionRow(model.name(), look);
        row.choice(
                "source",
                model.placeProperty(),
                List.of(ReachModel.Place.values()),
                place -> Words.of("studies.reach.place." + place.name().toLowerCase(Locale.ROOT)));
        TextField share = row.field("share", model.shareProperty(), SHORT);
        share.visibleProperty().bind(model.placeProperty().isEqualTo(ReachModel.Place.SHARE));
        share.managedProperty().bind(share.visibleProperty());
        row.with(share);
        row.check("retuned", model.retunedProperty());
        aim(row, model.aimProperty())
                .disableProperty()
                .bind(model.retunedProperty().not());
        FreeRows free = new FreeRows(model.name(), model.free(), model.design(), look, false);
        free.visibleProperty().bind(model.retunedProperty());
        free.managedProperty().bind(free.visibleProperty());
        return new StudyPage(model, new VBox(row, free), look, files);
    }

    /** Which detectors or fibres serve best. */
    StudyPage detectors(DetectorsModel model) {
        StudyPage page = new StudyPage(model, new DetectorOptions(model, look), look, files);
        page.below(new ChosenEntry(model));
        return page;
    }

    /** How surely the built link keeps what is promised. */
    StudyPage tolerance(ToleranceModel model) {
        return new StudyPage(model, new ToleranceOptions(model, look), look, files);
    }

    /** How the figures change along parameters. */
    StudyPage sweep(SweepModel model) {
        return new StudyPage(model, new SweepOptions(model, look), look, files);
    }

    /** The best settings. */
    StudyPage tune(TuneModel model) {
        FreeRows free = new FreeRows(model.name(), model.free(), model.design(), look, true);
        OptionRow row = new OptionRow(model.name(), look);
        aim(row, model.aimProperty());
        StudyPage page = new StudyPage(model, new VBox(free, row), look, files);
        page.below(new TunedSteps(model));
        return page;
    }

    static ComboBox<Aim> aim(OptionRow row, Property<Aim> aim) {
        return row.choice(
                "aim",
                aim,
                List.of(Aim.values()),
                each -> each.objective()
                        .map(objective -> objective.meaning())
                        .orElseGet(() -> Words.of("studies.aim.usual")));
    }
}

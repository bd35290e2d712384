package binspan.planner.viewmodel;

import binspan.planner.document.RecentFiles;
import binspan.planner.document.Recovery;
import binspan.planner.io.Preset;
import java.nio.file.Path;

/** Everything that the window shows, apart from how it is drawn. */
public final class PlannerModel {
    private final Background background;
    private final Design design;
    private final LinkFile file;
    private final LatestTask checks;
    private final LinkModel link;
    private final FormModel form;
    private final VerdictModel verdict;
    private final SlotsModel slots;
    private final MapModel map;
    private final Studies studies;

    /**
     * The studies.
     *
     * @param reach how far the link reaches
     * @param detectors which detectors serve best
     * @param tolerance how surely the built link passes
     * @param sweep figures along parameters
     * @param tune best settings
     */
    public record Studies(
            ReachModel reach, DetectorsModel detectors, ToleranceModel tolerance, SweepModel sweep, TuneModel tune) {}

    /**
     * The models of a window that begins with a starter.
     *
     * @param background where long work is done
     * @param settings directory of the list of recent files
     * @param recovery directory of copies of unsaved work
     */
    public PlannerModel(Background background, Path settings, Path recovery) {
        this.background = background;
        design = new Design(LinkFile.starter(Preset.PULSE_PAIR));
        file = new LinkFile(design, new RecentFiles(settings), new Recovery(recovery), background);
        checks = LatestTask.lengthy(background);
        link = new LinkModel(design, background, design::edit);
        form = new FormModel(design, path -> design.documentProperty().get().states(path), design::apply);
        verdict = new VerdictModel(design, background);
        slots = new SlotsModel(design, background);
        map = new MapModel(design, background);
        studies = new Studies(
                new ReachModel(design, background),
                new DetectorsModel(design, background),
                new ToleranceModel(design, background),
                new SweepModel(design, background),
                new TuneModel(design, background));
    }

    /** Where long work is done. */
    public Background background() {
        return background;
    }

    /** The link that is being designed. */
    public Design design() {
        return design;
    }

    /** Its file. */
    public LinkFile file() {
        return file;
    }

    /** Where whole checks are made for those who ask for one. */
    public LatestTask checks() {
        return checks;
    }

    /** The link, drawn. */
    public LinkModel link() {
        return link;
    }

    /** The form of the selected part. */
    public FormModel form() {
        return form;
    }

    /** The verdict. */
    public VerdictModel verdict() {
        return verdict;
    }

    /** Arrival times. */
    public SlotsModel slots() {
        return slots;
    }

    /** The operating map. */
    public MapModel map() {
        return map;
    }

    /** The studies. */
    public Studies studies() {
        return studies;
    }
}

package binspan.planner.viewmodel;

import binspan.planner.document.RecentFiles;
import binspan.planner.document.Recovery;
import binspan.planner.io.Preset;
import java.nio.file.Path;

/** Everything that the window shows, apart from how it is drawn. */
public final class PlannerModel {
    private final Design design;
    private final LinkFile file;
    private final LatestTask checks;
    private final SlotsModel slots;

    /**
     * The models of a window that begins with a starter.
     *
     * @param background where long work is done
     * @param settings directory of the list of recent files
     * @param recovery directory of copies of unsaved work
     */
    public PlannerModel(Background background, Path settings, Path recovery) {
        design = new Design(LinkFile.starter(Preset.PULSE_PAIR));
        file = new LinkFile(design, new RecentFiles(settings), new Recovery(recovery), background);
        checks = LatestTask.lengthy(background);
        slots = new SlotsModel(design, background);
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

    /** Arrival times. */
    public SlotsModel slots() {
        return slots;
    }
}

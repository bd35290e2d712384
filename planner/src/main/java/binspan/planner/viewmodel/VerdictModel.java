package binspan.planner.viewmodel;

import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Scenario;
import java.util.concurrent.CancellationException;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/**
 * The verdict on the link as it is designed, compared with the link as saved. The sheet follows every step of a drag;
 * the room, which asks for hundreds of predictions, comes after it, where it takes long when nothing moves. All methods are for the window's thread.
 */
public final class VerdictModel {
    private static final long SLOW_NANOS = 20_000_000L;
    private static final long STILL_MILLIS = 80;
    private static final long NAP_MILLIS = 10;

    private final Design design;
    private final LatestTask quick;
    private final LatestTask search;

    /**
     * Keeps the optics from one prediction to the next. Only work of {@link #quick} touches it, and that is done piece
     * by piece: the next begins after the window has heard of the end of the last, so that it also sees all that the
     * last has written.
     */
    private final LinkPredictor predictor = new LinkPredictor();

    private final ReadOnlyObjectWrapper<VerdictSheet> sheet = new ReadOnlyObjectWrapper<>(this, "sheet");
    private final ReadOnlyBooleanWrapper sheetStale = new ReadOnlyBooleanWrapper(this, "sheetStale", true);
    private final ReadOnlyObjectWrapper<VerdictRoom> full = new ReadOnlyObjectWrapper<>(this, "full");
    private final ReadOnlyBooleanWrapper fullStale = new ReadOnlyBooleanWrapper(this, "fullStale", true);
    private LinkCheck savedCheck;
    private volatile Scenario newest;
    /** Whether the last search took so long that the next leaves the processors to what follows the hand. */
    private volatile boolean slow;

    /** What the quick work finds. */
    private record Found(VerdictSheet sheet, LinkCheck saved) {}

    /** Follows a design. */
    public VerdictModel(Design design, Background background) {
        this.design = design;
        this.quick = LatestTask.quick(background);
        this.search = LatestTask.quick(background);
        design.scenarioProperty().addListener((source, before, after) -> changed());
        design.savedProperty().addListener((source, before, after) -> changed());
        changed();
    }

    /** The verdict without the room; null until the first is found. */
    public ReadOnlyObjectProperty<VerdictSheet> sheetProperty() {
        return sheet.getReadOnlyProperty();
    }

    /** Whether the sheet is of an older state of the link. */
    public ReadOnlyBooleanProperty sheetStaleProperty() {
        return sheetStale.getReadOnlyProperty();
    }

    /** Headroom and stability; null until the first are found. */
    public ReadOnlyObjectProperty<VerdictRoom> fullProperty() {
        return full.getReadOnlyProperty();
    }

    /** Whether the room is of an older state of the link. */
    public ReadOnlyBooleanProperty fullStaleProperty() {
        return fullStale.getReadOnlyProperty();
    }

    private void changed() {
        Scenario scenario = design.scenario();
        newest = scenario;
        Scenario saved = design.savedProperty().get();
        LinkCheck known =
                savedCheck != null && savedCheck.prediction().scenario().equals(saved) ? savedCheck : null;
        markStale();
        quick.run(progress -> find(scenario, saved, known), this::show);
    }

    private Found find(Scenario scenario, Scenario saved, LinkCheck known) {
        LinkCheck now = LinkCheck.brief(predictor.of(scenario));
        if (known != null) {
            return new Found(VerdictSheet.of(now, known), known);
        }
        LinkCheck before = scenario.equals(saved) ? now : LinkCheck.brief(LinkPredictor.predict(saved));
        return new Found(VerdictSheet.of(now, before), before);
    }

    private void show(Found found) {
        savedCheck = found.saved();
        sheet.set(found.sheet());
        markStale();
        if (fullStale.get() || search.runningProperty().get()) {
            Scenario scenario = found.sheet().scenario();
            search.run(progress -> room(scenario), this::show);
        }
    }

    private VerdictRoom room(Scenario scenario) {
        if (slow) {
            waitWhileStill(scenario);
        }
        long start = System.nanoTime();
        VerdictRoom found = VerdictRoom.of(LinkCheck.of(scenario));
        slow = System.nanoTime() - start > SLOW_NANOS;
        return found;
    }

    private void waitWhileStill(Scenario scenario) {
        try {
            for (long waited = 0; waited < STILL_MILLIS; waited += NAP_MILLIS) {
                if (!scenario.equals(newest)) {
                    throw new CancellationException("not still");
                }
                Thread.sleep(NAP_MILLIS);
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CancellationException("interrupted");
        }
    }

    private void show(VerdictRoom room) {
        full.set(room);
        markStale();
    }

    private void markStale() {
        VerdictSheet shown = sheet.get();
        sheetStale.set(shown == null || !shown.scenario().equals(design.scenario()));
        VerdictRoom room = full.get();
        fullStale.set(room == null || !room.scenario().equals(design.scenario()));
    }
}

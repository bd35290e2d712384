package binspan.planner.viewmodel;

import binspan.planner.report.MissWords;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.box.OperatingBox;
import binspan.study.box.ToleranceBox;
import binspan.study.region.MarginGrid;
import binspan.study.region.OperatingRegion;
import binspan.study.region.RegionMap;
import binspan.study.window.PointVerdict;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;

/**
 * The operating map: where two parameters of the design may lie so that all requirements hold. Lines interpolated on a
 * grid follow every change at once; when nothing has changed for a moment the exact lines, the recommended point and the
 * largest box take their place. Moving the design along the two parameters themselves computes nothing of the map anew.
 */
public final class MapModel {
    /** Points of the quick grid along each axis. */
    public static final int QUICK_STEPS = 128;

    private static final long STILL_MILLIS = 300;
    private static final long NAP_MILLIS = 10;

    private final Design design;
    private final long stillMillis;
    private final MapAxis horizontal;
    private final MapAxis vertical;
    private final MapHandle handle;
    private final LatestTask quick;
    private final LatestTask exact;
    private final LatestTask boxing;
    private final MapReader reader;
    private final ReadOnlyObjectWrapper<MapShape> shape = new ReadOnlyObjectWrapper<>(this, "shape");
    private final ReadOnlyObjectWrapper<RegionMap> region = new ReadOnlyObjectWrapper<>(this, "region");
    private final ReadOnlyObjectWrapper<OperatingBox> box = new ReadOnlyObjectWrapper<>(this, "box");
    private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper(this, "message", "");
    private final ObjectProperty<BoxChoice> boxChoice = new SimpleObjectProperty<>(this, "boxChoice", BoxChoice.SHARE);
    private final BooleanProperty watched = new SimpleBooleanProperty(this, "watched", true);
    private final BooleanBinding computing;
    private MapQuestion question;
    /** Whether the question was put while nobody looked. */
    private boolean unanswered;

    private boolean swapping;

    /** Which box is drawn in. */
    public enum BoxChoice {
        SHARE,
        TOLERANCE,
        NONE
    }

    /** The map of a design, at first of its brightness and its windows. */
    public MapModel(Design design, Background background) {
        this(design, background, STILL_MILLIS);
    }

    /** The same with another time for which nothing must change before the exact lines are computed. */
    MapModel(Design design, Background background, long stillMillis) {
        this.design = design;
        this.stillMillis = stillMillis;
        Scenario scenario = design.scenario();
        this.horizontal = new MapAxis(scenario, MapParameters.first(scenario, ""));
        this.vertical = new MapAxis(scenario, MapParameters.first(scenario, horizontal.path()));
        this.handle = new MapHandle(design, horizontal, vertical);
        this.quick = LatestTask.quick(background);
        this.exact = LatestTask.lengthy(background);
        this.boxing = LatestTask.lengthy(background);
        this.reader = new MapReader(() -> question, handle, background);
        this.computing = Bindings.createBooleanBinding(
                () -> quick.runningProperty().get()
                        || exact.runningProperty().get()
                        || boxing.runningProperty().get(),
                quick.runningProperty(),
                exact.runningProperty(),
                boxing.runningProperty());
        design.scenarioProperty().addListener((source, before, after) -> follow());
        horizontal.axisProperty().addListener((source, before, after) -> axisChanged());
        vertical.axisProperty().addListener((source, before, after) -> axisChanged());
        boxChoice.addListener((source, before, after) -> findBox());
        watched.addListener((source, before, after) -> ask());
        ask();
    }

    /** Whether anybody looks: otherwise a changed design computes nothing until somebody does. */
    public BooleanProperty watchedProperty() {
        return watched;
    }

    /** The parameter across the map and its range. */
    public MapAxis horizontal() {
        return horizontal;
    }

    /** The parameter up the map and its range. */
    public MapAxis vertical() {
        return vertical;
    }

    /** The present point. */
    public MapHandle handle() {
        return handle;
    }

    /** The design. */
    public Design design() {
        return design;
    }

    /** Paths of the parameters that the present link offers as axes, the usual ones first. */
    public List<String> offered() {
        return MapParameters.of(design.scenario());
    }

    /** What is drawn; null where there is no map yet. */
    public ReadOnlyObjectProperty<MapShape> shapeProperty() {
        return shape.getReadOnlyProperty();
    }

    /** The exact map of the design as it is; null while it is not computed. */
    public ReadOnlyObjectProperty<RegionMap> regionProperty() {
        return region.getReadOnlyProperty();
    }

    /** The largest box on the exact map; null while it is not computed, or where there is none. */
    public ReadOnlyObjectProperty<OperatingBox> boxProperty() {
        return box.getReadOnlyProperty();
    }

    /** Which box is drawn in. */
    public ObjectProperty<BoxChoice> boxChoiceProperty() {
        return boxChoice;
    }

    /** What is read off the map. */
    public MapReader reader() {
        return reader;
    }

    /** Why there is no map, or that no point meets all requirements; empty if there is nothing to say. */
    public ReadOnlyStringProperty messageProperty() {
        return message.getReadOnlyProperty();
    }

    /** Whether something of the map is being computed. */
    public BooleanBinding computingBinding() {
        return computing;
    }

    /** Another parameter across the map; the one of the other axis is exchanged. */
    public boolean chooseHorizontal(String path) {
        return choose(horizontal, vertical, path);
    }

    /** Another parameter up the map. */
    public boolean chooseVertical(String path) {
        return choose(vertical, horizontal, path);
    }

    private boolean choose(MapAxis axis, MapAxis other, String path) {
        String wanted = path.strip();
        if (wanted.equals(axis.path())) {
            return true;
        }
        if (!wanted.equals(other.path())) {
            return axis.choose(design.scenario(), wanted);
        }
        Axis moved = axis.axis();
        boolean itsOwnRange = axis.ownRange();
        together(() -> {
            axis.take(other.axis(), other.ownRange());
            other.take(moved, itsOwnRange);
        });
        return true;
    }

    /** The usual ranges again. */
    public void resetAxes() {
        together(() -> {
            horizontal.reset(design.scenario());
            vertical.reset(design.scenario());
        });
    }

    /** The point with the most room, once the exact map is known and has a region. */
    public Optional<PointVerdict> recommended() {
        return Optional.ofNullable(region.get()).map(RegionMap::best).filter(PointVerdict::met);
    }

    /** Moves the design to the recommended point, if there is one. */
    public void goToRecommended() {
        recommended()
                .ifPresent(best ->
                        handle.moveTo(best.values().get(0), best.values().get(1)));
    }

    private void together(Runnable changes) {
        swapping = true;
        changes.run();
        swapping = false;
        axisChanged();
    }

    private void axisChanged() {
        if (!swapping) {
            reader.forget();
            ask();
        }
    }

    private void follow() {
        swapping = true;
        follow(horizontal, vertical);
        follow(vertical, horizontal);
        swapping = false;
        ask();
    }

    private void follow(MapAxis axis, MapAxis other) {
        Scenario scenario = design.scenario();
        if (!axis.follow(scenario)) {
            axis.replace(scenario, MapParameters.first(scenario, other.path()));
        }
    }

    /** Asks for a new map if the old one does not answer any more. */
    private void ask() {
        MapQuestion next;
        try {
            next = MapQuestion.of(design.scenario(), horizontal.axis(), vertical.axis());
        } catch (IllegalArgumentException e) {
            refuse(e);
            return;
        }
        if (!current(next)) {
            boolean sameAxes = question != null && question.sameAxes(next);
            question = next;
            region.set(null);
            box.set(null);
            if (!sameAxes) {
                shape.set(null);
                message.set("");
            }
            cancel();
            unanswered = true;
        }
        if (watched.get()) {
            answer();
        }
    }

    private void answer() {
        if (unanswered) {
            unanswered = false;
            survey(question);
            solve(question);
        }
        reader.read();
    }

    private void refuse(RuntimeException reason) {
        if (!(reason instanceof IllegalArgumentException)) {
            throw reason;
        }
        question = null;
        unanswered = false;
        quick.cancel();
        cancel();
        region.set(null);
        box.set(null);
        shape.set(null);
        reader.read();
        message.set(reason.getMessage());
    }

    /** Stops what takes long; a quick grid still ends, so that a drag is followed. */
    private void cancel() {
        exact.cancel();
        boxing.cancel();
    }

    private boolean current(MapQuestion asked) {
        return question != null && question.sameAs(asked);
    }

    private void refuse(MapQuestion asked, RuntimeException reason) {
        if (current(asked)) {
            refuse(reason);
        }
    }

    private void survey(MapQuestion asked) {
        quick.run(
                progress -> MapShape.of(grid(asked, progress)),
                found -> showQuick(asked, found),
                reason -> refuse(asked, reason));
    }

    private static MarginGrid grid(MapQuestion asked, Progress progress) {
        return asked.region(QUICK_STEPS).survey(Execution.parallel(progress));
    }

    private void showQuick(MapQuestion asked, MapShape found) {
        if (question != null && question.sameAxes(asked) && region.get() == null) {
            shape.set(found);
            message.set(found.anywhere() ? "" : Words.of("map.nowhere"));
        }
    }

    private void solve(MapQuestion asked) {
        exact.run(
                progress -> {
                    waitWhileStill(progress);
                    RegionMap map = asked.region(OperatingRegion.USUAL_STEPS).run(considerate(progress));
                    return new Solved(map, MapShape.of(map));
                },
                found -> showExact(asked, found),
                reason -> refuse(asked, reason));
    }

    private record Solved(RegionMap map, MapShape shape) {}

    /** One processor is left for what follows the hand. */
    private static Execution considerate(Progress progress) {
        Execution all = Execution.parallel(progress);
        return new Execution(Math.max(1, all.threads() - 1), progress, all.from(), all.to());
    }

    private void waitWhileStill(Progress progress) {
        try {
            for (long waited = 0; waited < stillMillis && !progress.cancelled(); waited += NAP_MILLIS) {
                Thread.sleep(NAP_MILLIS);
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CancellationException("interrupted");
        }
        if (progress.cancelled()) {
            throw new CancellationException("not still");
        }
    }

    private void showExact(MapQuestion asked, Solved found) {
        if (current(asked)) {
            region.set(found.map());
            shape.set(found.shape());
            message.set(found.map()
                    .nearest()
                    .map(nearest -> Words.of(
                            "map.nearest",
                            Words.of("map.nowhere"),
                            MissWords.at(List.of(asked.horizontal(), asked.vertical()), nearest)))
                    .orElse(""));
            findBox();
        }
    }

    private void findBox() {
        box.set(null);
        boxing.cancel();
        MapQuestion asked = question;
        if (asked == null || boxChoice.get() == BoxChoice.NONE || recommended().isEmpty()) {
            return;
        }
        ToleranceBox.Sense sense =
                boxChoice.get() == BoxChoice.SHARE ? ToleranceBox.Sense.SHARE : ToleranceBox.Sense.TOLERANCE;
        boxing.run(
                progress -> asked.box(sense).run(considerate(progress)),
                found -> showBox(asked, found),
                reason -> showNoBox(asked, reason));
    }

    private void showBox(MapQuestion asked, OperatingBox found) {
        if (current(asked)) {
            box.set(found.found() ? found : null);
        }
    }

    /** A box of equal tolerances needs ranges that do not touch zero. */
    private void showNoBox(MapQuestion asked, RuntimeException reason) {
        if (!(reason instanceof IllegalArgumentException)) {
            throw reason;
        }
        if (current(asked)) {
            design.notice(reason.getMessage());
        }
    }
}

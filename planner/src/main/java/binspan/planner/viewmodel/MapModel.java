package binspan.planner.viewmodel;

import binspan.planner.report.MissWords;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.box.OperatingBox;
import binspan.study.region.MarginGrid;
import binspan.study.region.RegionMap;
import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;

/**
 * The operating map: where two parameters of the design may lie so that all requirements hold. Lines interpolated on a
 * grid follow every change at once; when nothing has changed for a moment the exact lines, the recommended point and the
 * largest box take their place. Moving the design along the two parameters themselves computes nothing of the map anew.
 */
public final class MapModel {
    /** Points of the quick grid along each axis. */
    public static final int QUICK_STEPS = 128;

    private static final long STILL_MILLIS = 300;

    private final Design design;
    private final MapAxis horizontal;
    private final MapAxis vertical;
    private final MapHandle handle;
    private final LatestTask quick;
    private final MapSolution solution;
    private final MapReader reader;
    private final ReadOnlyObjectWrapper<MapShape> shape = new ReadOnlyObjectWrapper<>(this, "shape");
    private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper(this, "message", "");
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
        Scenario scenario = design.scenario();
        this.horizontal = new MapAxis(scenario, MapParameters.first(scenario, ""));
        this.vertical = new MapAxis(scenario, MapParameters.first(scenario, horizontal.path()));
        this.handle = new MapHandle(design, horizontal, vertical);
        this.quick = LatestTask.quick(background);
        this.solution = new MapSolution(background, stillMillis, design::notice);
        this.reader = new MapReader(() -> question, handle, background);
        this.computing = Bindings.createBooleanBinding(
                () -> quick.runningProperty().get()
                        || solution.solving().get()
                        || solution.boxing().get(),
                quick.runningProperty(),
                solution.solving(),
                solution.boxing());
        design.scenarioProperty().addListener((source, before, after) -> follow());
        horizontal.axisProperty().addListener((source, before, after) -> axisChanged());
        vertical.axisProperty().addListener((source, before, after) -> axisChanged());
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
        return solution.region().getReadOnlyProperty();
    }

    /** The largest box on the exact map; null while it is not computed, or where there is none. */
    public ReadOnlyObjectProperty<OperatingBox> boxProperty() {
        return solution.box().getReadOnlyProperty();
    }

    /** Which box is drawn in. */
    public ObjectProperty<BoxChoice> boxChoiceProperty() {
        return solution.boxChoice();
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

    /** The middle of the largest box, or the best point where no box is drawn in; null until that is known, and where nothing holds. */
    public ReadOnlyObjectProperty<MapRecommendation> recommendedProperty() {
        return solution.recommended().getReadOnlyProperty();
    }

    /** Moves the design to the recommended point, if there is one. */
    public void goToRecommended() {
        MapRecommendation there = recommendedProperty().get();
        if (there != null) {
            handle.moveTo(there.x(), there.y());
        }
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
            solution.forget();
            if (!sameAxes) {
                shape.set(null);
                message.set("");
            }
            unanswered = true;
        }
        if (watched.get()) {
            answer();
        }
    }

    private void answer() {
        if (unanswered) {
            unanswered = false;
            MapQuestion asked = question;
            survey(asked);
            solution.solve(asked, (map, found) -> showExact(asked, map, found), this::refuse);
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
        solution.forget();
        shape.set(null);
        reader.read();
        message.set(reason.getMessage());
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
        if (question != null && question.sameAxes(asked) && solution.region().get() == null) {
            shape.set(found);
            message.set(found.anywhere() ? "" : Words.of("map.nowhere"));
        }
    }

    private void showExact(MapQuestion asked, RegionMap map, MapShape found) {
        shape.set(found);
        message.set(map.nearest()
                .map(nearest -> Words.of(
                        "map.nearest",
                        Words.of("map.nowhere"),
                        MissWords.at(List.of(asked.horizontal(), asked.vertical()), nearest)))
                .orElse(""));
    }
}

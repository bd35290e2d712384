package binspan.planner.viewmodel;

import binspan.planner.report.ParameterWords;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.region.MapPoint;
import binspan.units.Digits;
import java.util.Optional;

/** The present point of the design on the map, and ways to move it: each changes both parameters of the design. */
public final class MapHandle {
    /** One step of a key, as a share of the axis. */
    public static final double STEP = 0.01;

    /** One large step. */
    public static final double LARGE_STEP = 0.05;

    private static final double UNSEEN = 2e-4;
    private static final int FEWEST_DIGITS = 3;
    private static final int MOST_DIGITS = 12;
    private static final double SHORTEST_LINK = 1e-3;

    private final Design design;
    private final MapAxis horizontal;
    private final MapAxis vertical;
    private Object movement;

    MapHandle(Design design, MapAxis horizontal, MapAxis vertical) {
        this.design = design;
        this.horizontal = horizontal;
        this.vertical = vertical;
    }

    /** Where the design stands; absent where it leaves a parameter to be computed. */
    public Optional<MapPoint> place() {
        Scenario scenario = design.scenario();
        var x = horizontal.axis().parameter().value(scenario);
        var y = vertical.axis().parameter().value(scenario);
        return x.isPresent() && y.isPresent()
                ? Optional.of(new MapPoint(x.getAsDouble(), y.getAsDouble()))
                : Optional.empty();
    }

    /** Whether the design stands on the map. */
    public boolean onMap() {
        return place().filter(at -> horizontal.contains(at.x()) && vertical.contains(at.y()))
                .isPresent();
    }

    /** Where the handle is drawn: the design's place, pulled onto the map. */
    public Optional<MapPoint> shown() {
        return place().map(at -> new MapPoint(clamped(horizontal.axis(), at.x()), clamped(vertical.axis(), at.y())));
    }

    /**
     * Moves the design in a movement that goes on until {@link #settle()}.
     *
     * @param x value of the horizontal parameter, pulled onto its axis
     * @param y value of the vertical parameter
     */
    public void dragTo(double x, double y) {
        movement = movement == null ? new Object() : movement;
        move(x, y, movement);
    }

    /** Moves the design by steps of the keys, within one movement. */
    public void step(int right, int up, boolean large) {
        Optional<MapPoint> at = shown();
        double share = large ? LARGE_STEP : STEP;
        double x = at.isPresent()
                ? stepped(horizontal.axis(), at.get().x(), right * share)
                : horizontal.axis().at(0.5);
        double y = at.isPresent()
                ? stepped(vertical.axis(), at.get().y(), up * share)
                : vertical.axis().at(0.5);
        dragTo(x, y);
    }

    private static double stepped(Axis axis, double value, double by) {
        return by == 0.0 ? value : axis.at(axis.share(value) + by);
    }

    /** Ends a movement: what follows is undone by itself. */
    public void settle() {
        if (movement != null) {
            movement = null;
            design.settle();
        }
    }

    /** Moves the design at once. */
    public void moveTo(double x, double y) {
        settle();
        move(x, y, null);
    }

    private void move(double x, double y, Object key) {
        double right = settable(horizontal.axis(), x);
        double up = settable(vertical.axis(), y);
        String what =
                Words.of("map.change", ParameterWords.name(horizontal.path()), ParameterWords.name(vertical.path()));
        design.change(
                what,
                key,
                before -> vertical.axis()
                        .parameter()
                        .with(horizontal.axis().parameter().with(before, right), up));
    }

    /** A value on the axis with no more digits than one can see. */
    private static double settable(Axis axis, double wanted) {
        double value = clamped(axis, wanted);
        double rounded = value;
        for (int digits = FEWEST_DIGITS; digits <= MOST_DIGITS; digits++) {
            rounded = clamped(axis, Double.parseDouble(Digits.significant(value, digits)));
            if (Math.abs(axis.share(rounded) - axis.share(value)) < UNSEEN) {
                break;
            }
        }
        return axis.parameter() instanceof LinkLength ? Math.max(rounded, Math.min(axis.to(), SHORTEST_LINK)) : rounded;
    }

    private static double clamped(Axis axis, double value) {
        return Math.max(axis.from(), Math.min(axis.to(), value));
    }
}

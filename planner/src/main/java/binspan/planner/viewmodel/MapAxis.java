package binspan.planner.viewmodel;

import binspan.planner.io.WrittenNumber;
import binspan.planner.report.ParameterWords;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** An axis of the map: a parameter and the range that is looked at. It is always valid; what would make it invalid is refused in words. */
public final class MapAxis {
    /** In paths that lead to an element of an arm, which may have moved to another place. */
    private static final String ELEMENT = ".path";

    private static final double ROUNDING = 1e-9;

    private final ReadOnlyObjectWrapper<Axis> axis = new ReadOnlyObjectWrapper<>(this, "axis");
    private final ReadOnlyStringWrapper error = new ReadOnlyStringWrapper(this, "error", "");
    private boolean ownRange;

    MapAxis(Scenario scenario, Parameter first) {
        axis.set(MapRanges.of(scenario, first));
    }

    /** Parameter, ends and spacing. */
    public ReadOnlyObjectProperty<Axis> axisProperty() {
        return axis.getReadOnlyProperty();
    }

    /** Parameter, ends and spacing. */
    public Axis axis() {
        return axis.get();
    }

    /** Scenario path of the parameter. */
    public String path() {
        return axis.get().parameter().path();
    }

    /** Why the last entry was refused or the parameter exchanged; empty if neither. */
    public ReadOnlyStringProperty errorProperty() {
        return error.getReadOnlyProperty();
    }

    /** Another parameter over its usual range. */
    boolean choose(Scenario scenario, String path) {
        return accept(() -> {
            Axis chosen = MapRanges.of(scenario, MapParameters.find(scenario, path));
            ownRange = false;
            return chosen;
        });
    }

    /** Takes over parameter and range of another axis. */
    void take(Axis other, boolean itsOwnRange) {
        error.set("");
        ownRange = itsOwnRange;
        axis.set(other);
    }

    /** Shows another parameter because the scenario does not have this one any more, and says so. */
    void replace(Scenario scenario, Parameter other) {
        String gone = ParameterWords.name(path());
        take(MapRanges.of(scenario, other), false);
        error.set(Words.of("map.gone", gone, ParameterWords.name(path())));
    }

    boolean ownRange() {
        return ownRange;
    }

    /** Another lower end, as it was written. */
    public boolean from(String text) {
        return range(() -> new Axis(parameter(), number(text), axis().to(), axis().steps(), axis().logarithmic()));
    }

    /** Another upper end. */
    public boolean to(String text) {
        return range(() -> new Axis(parameter(), axis().from(), number(text), axis().steps(), axis().logarithmic()));
    }

    /** Whether equal distances are equal ratios. */
    public boolean logarithmic(boolean wanted) {
        return range(() -> new Axis(parameter(), axis().from(), axis().to(), axis().steps(), wanted));
    }

    /** The usual range again. */
    void reset(Scenario scenario) {
        choose(scenario, path());
    }

    /**
     * Follows a changed scenario: the range stays, unless nobody chose it and the planned value has left it.
     *
     * @return whether the scenario still has the parameter
     */
    boolean follow(Scenario scenario) {
        Parameter found;
        try {
            found = MapParameters.find(scenario, path());
        } catch (IllegalArgumentException e) {
            return false;
        }
        OptionalDouble planned = found.value(scenario);
        boolean left = planned.isPresent() && !contains(planned.getAsDouble());
        if (left && !ownRange) {
            axis.set(MapRanges.of(scenario, found));
        } else if (path().contains(ELEMENT)) {
            axis.set(new Axis(found, axis().from(), axis().to(), axis().steps(), axis().logarithmic()));
        }
        return true;
    }

    /** Whether a value lies on the axis, but for the last digits that scaling a link leaves. */
    public boolean contains(double value) {
        double slack = ROUNDING * Math.abs(value);
        return value >= axis().from() - slack && value <= axis().to() + slack;
    }

    private Parameter parameter() {
        return axis().parameter();
    }

    /** A number, with or without the unit. */
    private double number(String text) {
        String trimmed = text.strip();
        String unit = parameter().unit();
        boolean united = !unit.isEmpty() && trimmed.endsWith(unit);
        return WrittenNumber.of(
                united ? trimmed.substring(0, trimmed.length() - unit.length()).strip() : trimmed);
    }

    private boolean range(Supplier<Axis> changed) {
        return accept(() -> {
            Axis found = changed.get();
            ownRange = true;
            return found;
        });
    }

    private boolean accept(Supplier<Axis> changed) {
        try {
            Axis accepted = changed.get();
            error.set("");
            axis.set(accepted);
            return true;
        } catch (IllegalArgumentException e) {
            error.set(e.getMessage());
            return false;
        }
    }
}

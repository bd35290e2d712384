package binspan.planner.viewmodel;

import binspan.planner.io.WrittenNumber;
import binspan.planner.report.Figure;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import javafx.beans.Observable;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;

/** A parameter with a range as a person writes them. Its range follows the planned value until one writes another. */
public final class WrittenAxis {
    private final BooleanProperty used = new SimpleBooleanProperty(this, "used", true);
    private final StringProperty path = new SimpleStringProperty(this, "path", "");
    private final StringProperty from = new SimpleStringProperty(this, "from", "");
    private final StringProperty to = new SimpleStringProperty(this, "to", "");
    private final StringProperty steps = new SimpleStringProperty(this, "steps", "");
    private final BooleanProperty logarithmic = new SimpleBooleanProperty(this, "logarithmic", false);
    private Axis proposed;

    /**
     * A parameter with its usual range.
     *
     * @param scenario the link
     * @param path its scenario path, empty for none yet
     */
    public WrittenAxis(Scenario scenario, String path) {
        this.path.set(path);
        propose(scenario);
    }

    /** Writes the usual range of the parameter, or nothing where it has none. */
    public void propose(Scenario scenario) {
        proposed = usual(scenario, path.get());
        from.set(proposed == null ? "" : Figure.stated(proposed.from(), ""));
        to.set(proposed == null ? "" : Figure.stated(proposed.to(), ""));
        logarithmic.set(proposed != null && proposed.logarithmic());
    }

    /** Renews the usual range for a changed link, unless another one was written. */
    void renew(Scenario scenario) {
        if (untouched()) {
            propose(scenario);
        }
    }

    private boolean untouched() {
        return proposed == null
                ? from.get().isEmpty() && to.get().isEmpty()
                : from.get().equals(Figure.stated(proposed.from(), ""))
                        && to.get().equals(Figure.stated(proposed.to(), ""))
                        && logarithmic.get() == proposed.logarithmic();
    }

    private static Axis usual(Scenario scenario, String path) {
        try {
            return DefaultAxes.of(scenario, ParameterPaths.find(scenario, path));
        } catch (IllegalArgumentException e) {
            return null;
        }
    }

    /**
     * The axis as it is written.
     *
     * @param scenario the link
     * @param usualSteps number of values where none is written
     * @throws IllegalArgumentException if path, range or number of values are wrong
     */
    Axis axis(Scenario scenario, int usualSteps) {
        Parameter parameter = ParameterPaths.find(scenario, path.get());
        parameter.over(scenario);
        double first = end(from, proposed == null ? Double.NaN : proposed.from());
        double last = end(to, proposed == null ? Double.NaN : proposed.to());
        return new Axis(parameter, first, last, count(usualSteps), logarithmic.get());
    }

    /** An end as it is written; the usual one is meant exactly. */
    private double end(StringProperty text, double usual) {
        return text.get().equals(Figure.stated(usual, "")) ? usual : number(text);
    }

    private double number(StringProperty text) {
        try {
            return WrittenNumber.of(text.get().strip());
        } catch (IllegalArgumentException e) {
            throw new IllegalArgumentException(path.get() + ": " + e.getMessage(), e);
        }
    }

    private int count(int usual) {
        return steps.get().isBlank() ? usual : (int) number(steps);
    }

    /** Everything that changes what it means. */
    Observable[] parts() {
        return new Observable[] {used, path, from, to, steps, logarithmic};
    }

    /** Whether the study shall use it. */
    public BooleanProperty usedProperty() {
        return used;
    }

    /** Scenario path, which the user may write. */
    public StringProperty pathProperty() {
        return path;
    }

    /** Lower end, in the parameter's unit. */
    public StringProperty fromProperty() {
        return from;
    }

    /** Upper end, in the parameter's unit. */
    public StringProperty toProperty() {
        return to;
    }

    /** Number of values, empty for as many as usual. */
    public StringProperty stepsProperty() {
        return steps;
    }

    /** Whether equal steps are equal ratios. */
    public BooleanProperty logarithmicProperty() {
        return logarithmic;
    }
}

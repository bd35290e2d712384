package binspan.scenario;

import java.util.OptionalDouble;
import java.util.function.DoubleFunction;

/** A number of a scenario that can be read and varied: a sweep axis, a tuning variable, a spread, a form field. */
public sealed interface Parameter permits FieldParameter, LinkLength {
    /** Scenario path by which it is addressed. */
    String path();

    /** Unit, empty for a bare number. */
    String unit();

    /** Allowed values. */
    Range range();

    /** What it means. */
    String meaning();

    /** Its planned value, absent where the scenario leaves it to be computed. */
    OptionalDouble value(Scenario scenario);

    /**
     * The scenario with this parameter at another value.
     *
     * @throws IllegalArgumentException if the value is out of range, or if the scenario would not read it: dark counts
     *     of a gated detector, a number per cycle with a continuous pump
     */
    Scenario with(Scenario scenario, double value);

    /**
     * The scenario as a function of this parameter, the unchanged parts read once: quicker than {@link #with} where many
     * values follow.
     *
     * @throws IllegalArgumentException at once if the parameter cannot be varied here, or from the function if a value is
     *     out of range
     */
    default DoubleFunction<Scenario> over(Scenario scenario) {
        return value -> with(scenario, value);
    }
}

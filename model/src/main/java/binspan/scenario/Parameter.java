package binspan.scenario;

import java.util.OptionalDouble;

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
}

package binspan.planner.plot;

/**
 * What runs along an axis.
 *
 * @param name quantity, for example {@code Window width}
 * @param unit unit of its numbers, empty if they have none
 * @param logarithmic whether equal ratios are equally far apart; values that are not positive are then left out
 * @param lowest value at its lower end, NaN to take it from the data
 * @param highest value at its upper end, NaN to take it from the data
 */
public record Axis(String name, String unit, boolean logarithmic, double lowest, double highest) {
    /** Checks that stated ends are in order and can be shown. */
    public Axis {
        if (lowest >= highest || Double.isInfinite(lowest) || Double.isInfinite(highest)) {
            throw new IllegalArgumentException(name + ": ends " + lowest + " and " + highest);
        }
        if (logarithmic && (lowest <= 0.0 || highest <= 0.0)) {
            throw new IllegalArgumentException(name + ": a logarithmic axis has positive ends");
        }
    }

    /** An axis with even steps, its ends taken from the data. */
    public static Axis linear(String name, String unit) {
        return new Axis(name, unit, false, Double.NaN, Double.NaN);
    }

    /** An axis with even ratios, its ends taken from the data. */
    public static Axis logarithmic(String name, String unit) {
        return new Axis(name, unit, true, Double.NaN, Double.NaN);
    }

    /** The same axis with stated ends. */
    public Axis within(double newLowest, double newHighest) {
        return new Axis(name, unit, logarithmic, newLowest, newHighest);
    }

    /** Name and unit, for example {@code Window width (ps)}. */
    public String title() {
        return unit.isEmpty() ? name : name + " (" + unit + ")";
    }

    /** A value with the unit. */
    String text(double value) {
        return NumberText.withUnit(value, unit);
    }

    /** Where a value stands: itself or its decimal logarithm; NaN where it has no place. */
    double position(double value) {
        if (!logarithmic) {
            return Double.isFinite(value) ? value : Double.NaN;
        }
        return value > 0.0 && Double.isFinite(value) ? Math.log10(value) : Double.NaN;
    }

    /** The value at a position. */
    double value(double position) {
        return logarithmic ? Math.pow(10.0, position) : position;
    }
}

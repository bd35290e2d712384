package binspan.scenario;

/**
 * Interval of allowed numbers.
 *
 * @param lowest lower end
 * @param lowestOpen whether the lower end itself is excluded
 * @param highest upper end
 * @param highestOpen whether the upper end itself is excluded
 */
public record Range(double lowest, boolean lowestOpen, double highest, boolean highestOpen) {
    /** Both ends allowed. */
    public static Range of(double lowest, double highest) {
        return new Range(lowest, false, highest, false);
    }

    /** Lower end excluded. */
    public static Range above(double lowest, double highest) {
        return new Range(lowest, true, highest, false);
    }

    /** Both ends excluded. */
    public static Range between(double lowest, double highest) {
        return new Range(lowest, true, highest, true);
    }

    /** Whether a number lies inside; NaN never does. */
    public boolean contains(double value) {
        boolean overLowest = lowestOpen ? value > lowest : value >= lowest;
        boolean underHighest = highestOpen ? value < highest : value <= highest;
        return overLowest && underHighest;
    }

    /** The interval in words, for example {@code above 0 to 1000 km}. */
    public String text(String unit) {
        if (lowest == highest) {
            return unit.isEmpty() ? plain(lowest) : plain(lowest) + " " + unit;
        }
        String ends =
                (lowestOpen ? "above " : "") + plain(lowest) + " to " + (highestOpen ? "below " : "") + plain(highest);
        return unit.isEmpty() ? ends : ends + " " + unit;
    }

    /** A number as a person writes it: no trailing zeros, an exponent only where it shortens. */
    public static String plain(double value) {
        if (value == Math.rint(value) && Math.abs(value) < 1e7) {
            return Long.toString((long) value);
        }
        return Double.toString(value).replace(".0E", "e").replace('E', 'e');
    }
}

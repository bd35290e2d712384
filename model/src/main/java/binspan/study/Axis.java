package binspan.study;

import binspan.scenario.Parameter;
import binspan.scenario.Range;

/**
 * A parameter that a study varies between two ends, in linear or logarithmic steps.
 *
 * @param parameter what is varied
 * @param from first value, in the parameter's unit
 * @param to last value, above the first
 * @param steps number of values, 2 or more
 * @param logarithmic whether equal steps are equal ratios
 */
public record Axis(Parameter parameter, double from, double to, int steps, boolean logarithmic) {
    /** Most values of an axis. */
    public static final int MOST_STEPS = 1_000_001;

    /**
     * Checks the ends.
     *
     * @throws IllegalArgumentException if they are empty, reversed or outside the parameter's range, or if a logarithmic axis touches zero
     */
    public Axis {
        String path = parameter.path();
        if (!(from < to)) {
            throw new IllegalArgumentException(path + ": found " + words(from, to) + "; allowed a range that rises");
        }
        if (logarithmic && !(from > 0.0)) {
            throw new IllegalArgumentException(
                    path + ": found " + words(from, to) + " in logarithmic steps; allowed above 0");
        }
        if (!parameter.range().contains(from) || !parameter.range().contains(to)) {
            throw new IllegalArgumentException(path + ": found " + words(from, to) + "; allowed "
                    + parameter.range().text(parameter.unit()));
        }
        if (steps < 2 || steps > MOST_STEPS) {
            throw new IllegalArgumentException(path + ": found " + steps + " steps; allowed 2 to " + MOST_STEPS);
        }
    }

    private static String words(double from, double to) {
        return Range.plain(from) + " to " + Range.plain(to);
    }

    /** The value of a step, 0 for the first; the ends are met exactly. */
    public double at(int step) {
        return step == steps - 1 ? to : at((double) step / (steps - 1));
    }

    /** The value at a share of the way, 0 for the first and 1 for the last. */
    public double at(double share) {
        double value = logarithmic ? from * Math.pow(to / from, share) : from + share * (to - from);
        return Math.max(from, Math.min(to, value));
    }

    /** The share of the way at which a value lies; the inverse of {@link #at(double)}. */
    public double share(double value) {
        return logarithmic ? Math.log(value / from) / Math.log(to / from) : (value - from) / (to - from);
    }

    /** All values. */
    public double[] values() {
        double[] values = new double[steps];
        for (int i = 0; i < steps; i++) {
            values[i] = at(i);
        }
        return values;
    }
}

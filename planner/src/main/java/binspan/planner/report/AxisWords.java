package binspan.planner.report;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.units.Digits;
import java.util.List;
import java.util.OptionalDouble;

/** A varied parameter in words, its values with as many digits as it takes to tell neighbours apart. */
public final class AxisWords {
    private static final int FEWEST_DIGITS = 3;
    private static final int MOST_DIGITS = 9;

    private AxisWords() {}

    /** The axis: path, ends, number of values, spacing, planned value. */
    static String described(Axis axis, Scenario scenario) {
        String spacing = axis.logarithmic() ? "spaced by equal ratios" : "evenly spaced";
        return axis.parameter().path() + " from " + Figure.stated(axis.from(), "") + " to " + stated(axis, axis.to())
                + ", " + axis.steps() + " values " + spacing + planned(axis, scenario);
    }

    /** The planned value; a path that stands for several fields may have several. */
    private static String planned(Axis axis, Scenario scenario) {
        OptionalDouble planned = axis.parameter().value(scenario);
        if (planned.isEmpty()) {
            return "";
        }
        boolean alike = axis.parameter().with(scenario, planned.getAsDouble()).equals(scenario);
        return "; planned " + stated(axis, planned.getAsDouble()) + (alike ? "" : " and other values");
    }

    private static String stated(Axis axis, double value) {
        return glued(Figure.stated(value, ""), unit(axis));
    }

    /** A value with its unit, for a place where lines do not break. */
    public static String plain(Axis axis, double value) {
        return value(axis, value).replace(TextPage.GLUE, ' ');
    }

    /** A range of values likewise. */
    public static String plainRange(Axis axis, double from, double to) {
        return range(axis, from, to).replace(TextPage.GLUE, ' ');
    }

    /** A value with its unit. */
    static String value(Axis axis, double value) {
        return glued(number(axis, value), unit(axis));
    }

    /** A range of values with their unit. */
    static String range(Axis axis, double from, double to) {
        return number(axis, from) + " to " + value(axis, to);
    }

    /** The values of a point in the order of the axes, without their paths. */
    static String values(List<Axis> axes, double... point) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < point.length; i++) {
            text.append(i == 0 ? "" : ", ").append(value(axes.get(i), point[i]));
        }
        return text.toString();
    }

    /** The values of a point with their paths. */
    static String named(List<Axis> axes, double... point) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < point.length; i++) {
            text.append(i == 0 ? "" : ", ")
                    .append(axes.get(i).parameter().path())
                    .append(' ')
                    .append(value(axes.get(i), point[i]));
        }
        return text.toString();
    }

    private static String number(Axis axis, double value) {
        double step = axis.logarithmic()
                ? Math.log(axis.to() / axis.from()) / (axis.steps() - 1)
                : (axis.to() - axis.from()) / (axis.steps() - 1) / Math.max(Math.abs(axis.from()), Math.abs(axis.to()));
        int digits = (int) Math.ceil(-Math.log10(step)) + 1;
        return Digits.shortest(value, Math.max(FEWEST_DIGITS, Math.min(MOST_DIGITS, digits)));
    }

    private static String unit(Axis axis) {
        String unit = axis.parameter().unit();
        return unit.equals("1/s") ? "/s" : unit;
    }

    private static String glued(String number, String unit) {
        return unit.isEmpty() ? number : number + TextPage.GLUE + unit;
    }
}

package binspan.planner.report;

import binspan.study.FigureColumn;
import binspan.units.Digits;

/** Figures of merit as a person reads them: rates with prefixes, times in the unit one says aloud, error rates in per cent. */
public final class FigureText {
    private FigureText() {}

    /** A difference of a figure with its sign and unit, error rates in percentage points. */
    public static String difference(FigureColumn column, double difference) {
        if (column.field().name().startsWith("qber.")) {
            return Figure.points(difference);
        }
        return switch (column.unit()) {
            case "s" -> (difference < 0.0 ? "-" : "+") + Figure.duration(Math.abs(difference));
            case "bit/s" -> Figure.signedRate(difference, "bit/s");
            case "1/s" -> Figure.signedRate(difference, "/s");
            case "bit" -> (difference < 0.0 ? "" : "+") + Digits.prefixed(difference, "bit", 3);
            default -> Figure.signed(difference, column.unit());
        };
    }

    /** A value with its unit. */
    public static String of(double value, String unit) {
        return switch (unit) {
            case "s" -> Figure.duration(value);
            case "bit/s" -> Figure.bits(value);
            case "1/s" -> Figure.counts(value);
            default -> Double.isFinite(value) ? Figure.in(value, unit) : "none";
        };
    }

    /** The value of a figure of merit; "none" where it does not apply. */
    public static String of(FigureColumn column, double value) {
        if (Double.isNaN(value)) {
            return "none";
        }
        return column.field().name().startsWith("qber.") ? Figure.percent(value) : of(value, column.unit());
    }
}

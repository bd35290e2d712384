package binspan.planner.report;

import binspan.units.Digits;

/** Figures for a person: three significant digits, a unit each, durations and rates in the size that one says aloud. */
public final class Figure {
    private static final int DIGITS = 3;
    private static final double THOUSAND = 1000.0;
    private static final double PERCENT = 100.0;
    private static final double MINUTE = 60.0;
    private static final double HOUR = 3600.0;
    private static final double DAY = 24.0 * HOUR;
    private static final double YEAR = 365.25 * DAY;
    private static final int FINEST = 6;

    private Figure() {}

    /** Three significant digits without a unit, for bare ratios. */
    public static String bare(double value) {
        return Digits.significant(value, DIGITS);
    }

    /** Three significant digits and a unit that takes no prefix. */
    public static String in(double value, String unit) {
        return unit.isEmpty() ? bare(value) : bare(value) + " " + unit;
    }

    /** A number with a count of digits and a unit. */
    public static String digits(double value, int digits, String unit) {
        String number = Digits.significant(value, digits);
        return unit.isEmpty() ? number : number + " " + unit;
    }

    /** A number as it was stated, floating-point dust left out. */
    public static String stated(double value, String unit) {
        String number = Digits.shortest(value, FINEST);
        return unit.isEmpty() ? number : number + " " + unit;
    }

    /** A rate: prefixed from a thousand on, for example {@code 2.10 kbit/s} or {@code 0.0123 /s}. */
    public static String rate(double perSecond, String unit) {
        boolean large = perSecond != 0.0 && Double.isFinite(perSecond) && Digits.exponent(perSecond, DIGITS) >= DIGITS;
        return large ? Digits.prefixed(perSecond, unit, DIGITS) : in(perSecond, unit);
    }

    /** Counts per second. */
    public static String counts(double perSecond) {
        return rate(perSecond, "/s");
    }

    /** Stated counts per second, without zeros at their end. */
    public static String statedCounts(double perSecond) {
        return perSecond < THOUSAND ? stated(perSecond, "/s") : Digits.shortestPrefixed(perSecond, "/s", FINEST);
    }

    /** A stated rate of pairs. */
    public static String statedPairs(double perSecond) {
        return perSecond < THOUSAND
                ? stated(perSecond, "pairs/s")
                : Digits.shortestPrefixed(perSecond, " pairs/s", FINEST);
    }

    /** Bits per second. */
    public static String bits(double perSecond) {
        return rate(perSecond, "bit/s");
    }

    /** A ratio as a percentage. */
    public static String percent(double ratio) {
        return Digits.significant(ratio * PERCENT, Math.abs(ratio) < 1e-4 ? 1 : DIGITS) + " %";
    }

    /** A loss, to a tenth of a decibel. */
    public static String decibels(double lossDb) {
        return Digits.decimals(lossDb, 1) + " dB";
    }

    /** A time in the unit that a person would choose. */
    public static String duration(double seconds) {
        if (!(seconds < 2.0 * YEAR)) {
            return Double.isFinite(seconds) ? bare(seconds / YEAR) + " years" : "never";
        }
        if (seconds < MINUTE) {
            return seconds < 1.0 ? Digits.prefixed(seconds, "s", DIGITS) : bare(seconds) + " s";
        }
        if (seconds < HOUR) {
            return bare(seconds / MINUTE) + " min";
        }
        return seconds < 2.0 * DAY ? bare(seconds / HOUR) + " h" : bare(seconds / DAY) + " days";
    }

    /** A stated time: the same, without zeros at its end. */
    public static String statedDuration(double seconds) {
        if (seconds < MINUTE || seconds > 2.0 * YEAR) {
            return stated(seconds, "s");
        }
        if (seconds < HOUR) {
            return stated(seconds / MINUTE, "min");
        }
        return seconds < 2.0 * DAY ? stated(seconds / HOUR, "h") : stated(seconds / DAY, "days");
    }

    /** A value with its error: the error to one digit, two if the first is 1, the value to the same place. */
    public static String withError(double value, double error, TextStyle style) {
        if (!(error > 0.0) || !Double.isFinite(error)) {
            return bare(value);
        }
        if (error >= USELESS) {
            return bare(value) + " (too few counts to measure it)";
        }
        int places = Math.max(1, Math.min(FINEST, errorPlaces(error)));
        return Digits.decimals(value, places) + " " + style.plusMinus() + " " + Digits.decimals(error, places);
    }

    /** An error beyond any value that V or S can take. */
    public static final double USELESS = 3.0;

    private static int errorPlaces(double error) {
        int exponent = Digits.exponent(error, 1);
        boolean leadingOne = Digits.significant(error, 1).indexOf('1') >= 0;
        return leadingOne ? 1 - exponent : -exponent;
    }

    /** Unit of a difference of ratios in per cent. */
    static final String POINTS = "percentage points";

    private static final String POINTS_SHORT = "pt";

    /** A difference of two ratios with its sign in percentage points, short: {@code +1.2 pt}. */
    public static String points(double difference) {
        return signed(PERCENT * difference, POINTS_SHORT);
    }

    /** The same with the unit in full; any other figure as it is. */
    public static String spelt(String figure) {
        String end = " " + POINTS_SHORT;
        return figure.endsWith(end) ? figure.substring(0, figure.length() - POINTS_SHORT.length()) + POINTS : figure;
    }

    /** A difference with its sign, two digits and a unit. */
    public static String signed(double value, String unit) {
        String number = Digits.significant(value, 2);
        String sign = value > 0.0 ? "+" : "";
        return sign + (unit.isEmpty() ? number : number + " " + unit);
    }

    /** A signed rate, prefixed from a thousand on. */
    public static String signedRate(double perSecond, String unit) {
        String size = rate(perSecond, unit);
        return perSecond > 0.0 ? "+" + size : size;
    }
}

package binspan.units;

/**
 * Numbers as text with the digits they deserve: rounded half up, '.' decimal, an exponent only outside 0.001 to a
 * million.
 *
 * <p>Written for speed at the start of a program: no locale, no formatter, no regular expressions.
 */
public final class Digits {
    private static final int SMALLEST_PLAIN = -3;
    private static final int LARGEST_PLAIN = 5;
    private static final int EXACT_POWERS = 22;
    private static final int LARGEST_EXPONENT = 300;
    private static final int MOST_DIGITS = 15;
    private static final double LARGEST_LONG = 9e18;
    private static final int ENGINEERING = 3;
    private static final String[] PREFIXES = {"f", "p", "n", "u", "m", "", "k", "M", "G", "T", "P"};
    private static final int NO_PREFIX = 5;

    private Digits() {}

    /**
     * A number with a fixed count of significant digits, trailing zeros kept.
     *
     * @param value number, infinite ones are written in words
     * @param digits significant digits, 1 to 15
     */
    public static String significant(double value, int digits) {
        return write(value, digits, false);
    }

    /**
     * A number with at most so many significant digits, trailing zeros left out.
     *
     * @param value number
     * @param digits most significant digits, 1 to 15
     */
    public static String shortest(double value, int digits) {
        return write(value, digits, true);
    }

    /**
     * A number with a fixed count of decimal places.
     *
     * @param value number
     * @param places digits behind the point, 0 or more
     */
    public static String decimals(double value, int places) {
        double scaled = Math.abs(value) * powerOfTen(places);
        if (!(scaled < LARGEST_LONG)) {
            return significant(value, MOST_DIGITS);
        }
        long rounded = Math.round(scaled);
        String sign = value < 0.0 && rounded > 0 ? "-" : "";
        return sign + pointed(pad(Long.toString(rounded), places + 1), places);
    }

    /**
     * A number in SI units with the customary prefix, for example {@code 2.10 kbit/s} or {@code 400 ps}.
     *
     * @param value number in the unit without prefix
     * @param unit that unit
     * @param digits significant digits, trailing zeros kept
     */
    public static String prefixed(double value, String unit, int digits) {
        int step = prefix(value, digits);
        String number = significant(value / powerOfTen(ENGINEERING * (step - NO_PREFIX)), digits);
        return number + " " + PREFIXES[step] + unit;
    }

    /** The same, trailing zeros left out. */
    public static String shortestPrefixed(double value, String unit, int digits) {
        int step = prefix(value, digits);
        String number = shortest(value / powerOfTen(ENGINEERING * (step - NO_PREFIX)), digits);
        return number + " " + PREFIXES[step] + unit;
    }

    /** Decimal exponent of a number once it is rounded to so many significant digits. */
    public static int exponent(double value, int digits) {
        int exponent = (int) Math.floor(Math.log10(Math.abs(value)));
        long rounded = mantissa(value, exponent, digits);
        if (rounded >= powerOfTen(digits)) {
            return exponent + 1;
        }
        return rounded < powerOfTen(digits - 1) ? exponent - 1 : exponent;
    }

    private static int prefix(double value, int digits) {
        if (value == 0.0 || !Double.isFinite(value)) {
            return NO_PREFIX;
        }
        int step = NO_PREFIX + Math.floorDiv(exponent(value, digits), ENGINEERING);
        return Math.max(0, Math.min(PREFIXES.length - 1, step));
    }

    private static String write(double value, int digits, boolean trim) {
        if (value == 0.0 || !Double.isFinite(value)) {
            return value == 0.0 ? "0" : Double.isNaN(value) ? "undefined" : value > 0.0 ? "infinite" : "-infinite";
        }
        int exponent = exponent(value, digits);
        String figures = Long.toString(mantissa(value, exponent, digits));
        String kept = trim ? trimmed(figures) : figures;
        return (value < 0.0 ? "-" : "") + placed(kept, exponent);
    }

    private static long mantissa(double value, int exponent, int digits) {
        int shift = digits - 1 - exponent;
        double size = Math.abs(value);
        if (shift > LARGEST_EXPONENT) {
            return Math.round(size * powerOfTen(LARGEST_EXPONENT) * powerOfTen(shift - LARGEST_EXPONENT));
        }
        return Math.round(shift >= 0 ? size * powerOfTen(shift) : size / powerOfTen(-shift));
    }

    private static String placed(String figures, int exponent) {
        if (exponent < SMALLEST_PLAIN || exponent > LARGEST_PLAIN) {
            return pointed(figures, figures.length() - 1) + "e" + exponent;
        }
        if (exponent < 0) {
            return "0." + "0".repeat(-exponent - 1) + figures;
        }
        int places = figures.length() - 1 - exponent;
        return places > 0 ? pointed(figures, places) : figures + "0".repeat(-places);
    }

    private static String pointed(String figures, int places) {
        int whole = figures.length() - places;
        return places == 0 ? figures : figures.substring(0, whole) + "." + figures.substring(whole);
    }

    private static String pad(String figures, int length) {
        return figures.length() >= length ? figures : "0".repeat(length - figures.length()) + figures;
    }

    private static String trimmed(String figures) {
        int end = figures.length();
        while (end > 1 && figures.charAt(end - 1) == '0') {
            end--;
        }
        return figures.substring(0, end);
    }

    private static double powerOfTen(int n) {
        if (Math.abs(n) > EXACT_POWERS) {
            return StrictMath.pow(10.0, n);
        }
        double power = 1.0;
        for (int i = Math.abs(n); i > 0; i--) {
            power *= 10.0;
        }
        return n < 0 ? 1.0 / power : power;
    }
}

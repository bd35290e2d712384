package binspan.planner.plot;

import binspan.units.Digits;

/** Numbers in pictures: a true minus, thin spaces between thousands and before units, powers of ten with raised exponents. */
public final class NumberText {
    private static final char MINUS = '\u2212';
    private static final char TIMES = '\u00d7';
    private static final char THIN_SPACE = '\u2009';
    private static final String RAISED = "\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079";
    private static final String RAISED_MINUS = "\u207b";
    private static final int DIGITS = 4;
    private static final int GROUP = 3;
    private static final int LONGEST_UNGROUPED = 4;

    private NumberText() {}

    /** A number with at most four digits and its unit. */
    public static String withUnit(double value, String unit) {
        String number = shortest(value, DIGITS);
        return unit.isEmpty() ? number : number + THIN_SPACE + unit;
    }

    /** A number with at most so many digits. */
    public static String shortest(double value, int digits) {
        String text = Digits.shortest(value, digits);
        int exponent = text.indexOf('e');
        if (exponent < 0 || !Double.isFinite(value)) {
            return typeset(text);
        }
        String mantissa = text.substring(0, exponent);
        String power = powerOfTen(Integer.parseInt(text.substring(exponent + 1)));
        return mantissa.equals("1") ? power : typeset(mantissa) + TIMES + power;
    }

    /** A number with a fixed count of decimal places. */
    static String decimals(double value, int places) {
        return typeset(Digits.decimals(value, places));
    }

    /** A power of ten, for example 10 with a raised -3. */
    static String powerOfTen(int exponent) {
        StringBuilder text = new StringBuilder("10").append(exponent < 0 ? RAISED_MINUS : "");
        for (char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
            text.append(RAISED.charAt(digit - '0'));
        }
        return text.toString();
    }

    private static String typeset(String number) {
        boolean negative = number.startsWith("-");
        String size = negative ? number.substring(1) : number;
        int point = size.indexOf('.');
        String whole = point < 0 ? size : size.substring(0, point);
        String rest = point < 0 ? "" : size.substring(point);
        return (negative ? String.valueOf(MINUS) : "") + grouped(whole) + rest;
    }

    private static String grouped(String whole) {
        if (whole.length() <= LONGEST_UNGROUPED || !Character.isDigit(whole.charAt(0))) {
            return whole;
        }
        StringBuilder text = new StringBuilder(whole);
        for (int i = whole.length() - GROUP; i > 0; i -= GROUP) {
            text.insert(i, THIN_SPACE);
        }
        return text.toString();
    }
}

package binspan.worksheet;

import binspan.units.Digits;
import binspan.units.Scale;

/**
 * Numbers of the worksheet: six digits, so that a calculation by hand arrives at the same place, with the prefix that
 * the trade uses.
 */
final class WorksheetNumber {
    private static final int DIGITS = 6;
    private static final double PS_SQUARED = Scale.PICO * Scale.PICO;

    private WorksheetNumber() {}

    static String text(double value, String unit) {
        return switch (unit) {
            case "" -> Digits.shortest(value, DIGITS);
            case "s" ->
                Math.abs(value) >= 1.0
                        ? Digits.shortest(value, DIGITS) + " s"
                        : Digits.shortestPrefixed(value, unit, DIGITS);
            case "Hz", "W" -> Digits.shortestPrefixed(value, unit, DIGITS);
            case "s^2" -> Digits.shortest(value / PS_SQUARED, DIGITS) + " ps^2";
            default -> Digits.shortest(value, DIGITS) + " " + unit;
        };
    }
}

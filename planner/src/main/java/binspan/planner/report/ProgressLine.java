package binspan.planner.report;

import binspan.units.Digits;

/** How far a work has come, in one line: share, bar, time left in words. */
public final class ProgressLine {
    private static final int BAR = 40;
    private static final double PERCENT = 100.0;
    private static final double MINUTE = 60.0;
    private static final double HOUR = 3600.0;
    private static final double DAY = 24.0 * HOUR;
    private static final double SOON = 5.0;

    private ProgressLine() {}

    /**
     * The line, at most 79 columns.
     *
     * @param share what is done, 0 to 1
     * @param seconds how long it took
     * @param style characters of the bar
     */
    public static String of(double share, double seconds, TextStyle style) {
        int filled = (int) Math.floor(share * BAR);
        String bar = String.valueOf(style.bar()).repeat(filled)
                + String.valueOf(style.lost()).repeat(BAR - filled);
        String percent = TextPage.right(Integer.toString((int) Math.floor(share * PERCENT)), 4) + " %";
        return percent + "  " + bar + (share > 0.0 ? "  " + left(seconds * (1.0 - share) / share) : "");
    }

    /** The time left in words, no more exact than such a guess can be. */
    public static String left(double seconds) {
        if (seconds < SOON) {
            return "a few seconds left";
        }
        if (seconds < MINUTE) {
            return "about " + (long) (SOON * Math.round(seconds / SOON)) + " seconds left";
        }
        if (seconds < HOUR) {
            return "about " + count(seconds / MINUTE, "minute");
        }
        return seconds < 2.0 * DAY ? "about " + count(seconds / HOUR, "hour") : "more than two days left";
    }

    private static String count(double number, String unit) {
        String rounded = Digits.decimals(number, 0);
        return rounded + " " + unit + (rounded.equals("1") ? "" : "s") + " left";
    }
}

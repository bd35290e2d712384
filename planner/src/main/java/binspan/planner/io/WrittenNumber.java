package binspan.planner.io;

import java.util.regex.Pattern;

/** Numbers as a person types them: plain or with an exponent, {@code 0.02} or {@code 2e-2}. */
public final class WrittenNumber {
    private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d{1,3})?");

    private WrittenNumber() {}

    /**
     * The number of a text.
     *
     * @throws IllegalArgumentException if the text is no number
     */
    public static double of(String text) {
        double value = NUMBER.matcher(text).matches() ? Double.parseDouble(text) : Double.NaN;
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("found \"" + text + "\"; allowed a number such as 0.02 or 2e-2");
        }
        return value;
    }
}

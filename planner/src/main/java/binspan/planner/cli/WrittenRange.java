package binspan.planner.cli;

import binspan.planner.io.WrittenNumber;
import binspan.study.Axis;
import java.util.List;
import java.util.OptionalInt;
import java.util.regex.Pattern;

/**
 * A range as it is written on a command line: {@code FROM:TO}, with a number of values and {@code log} or {@code lin} in either order behind it.
 *
 * @param from first value
 * @param to last value
 * @param steps number of values, if it is stated
 * @param spacing {@code log}, {@code lin} or empty where it is not stated
 */
record WrittenRange(double from, double to, OptionalInt steps, String spacing) {
    static final String LOGARITHMIC = "log";
    static final String LINEAR = "lin";

    private static final Pattern COUNT = Pattern.compile("\\d{1,9}");
    private static final int PARTS = 4;

    /**
     * Reads a range.
     *
     * @throws IllegalArgumentException if it is none, with what is allowed
     */
    static WrittenRange of(String text) {
        List<String> parts = List.of(text.split(":", -1));
        if (parts.size() < 2 || parts.size() > PARTS) {
            throw new IllegalArgumentException((text.isEmpty() ? "found no range" : "found \"" + text + "\"")
                    + "; allowed PATH=FROM:TO, then :STEPS and :log if wanted");
        }
        WrittenRange range = new WrittenRange(
                WrittenNumber.of(parts.get(0)), WrittenNumber.of(parts.get(1)), OptionalInt.empty(), "");
        for (String part : parts.subList(2, parts.size())) {
            range = range.with(part);
        }
        return range;
    }

    private WrittenRange with(String part) {
        boolean word = part.equals(LOGARITHMIC) || part.equals(LINEAR);
        if (word ? !spacing.isEmpty() : steps.isPresent()) {
            throw new IllegalArgumentException("found \"" + part + "\" after "
                    + (word ? spacing : steps.getAsInt() + " steps") + "; allowed one of them");
        }
        if (!word && !COUNT.matcher(part).matches()) {
            throw new IllegalArgumentException(
                    "found \"" + part + "\"; allowed a number of steps, 2 to " + Axis.MOST_STEPS + ", log or lin");
        }
        return word
                ? new WrittenRange(from, to, steps, part)
                : new WrittenRange(from, to, OptionalInt.of(Integer.parseInt(part)), spacing);
    }

    /** Whether logarithmic steps are asked for. */
    boolean logarithmic() {
        return spacing.equals(LOGARITHMIC);
    }
}

package binspan.planner.io;

/** Text of a file or a command line made fit for a message: no control characters, no endless lines. */
public final class Printable {
    private static final int LONGEST_VALUE = 60;
    private static final int LONGEST_LINE = 1000;
    private static final String CUT = "...";

    private Printable() {}

    /** A value of the file, cut to a length that leaves the message readable. */
    static String shortened(String value) {
        return cut(value, LONGEST_VALUE);
    }

    /** A text of the file in quotes, shortened. */
    static String quoted(String text) {
        return '"' + shortened(text) + '"';
    }

    /** A whole line of output: characters that would move the cursor or hide text are written as escapes. */
    public static String line(String text) {
        String kept = cut(text, LONGEST_LINE);
        StringBuilder line = new StringBuilder(kept.length() + 16);
        for (int i = 0; i < kept.length(); i += Character.charCount(kept.codePointAt(i))) {
            append(line, kept.codePointAt(i));
        }
        return line.toString();
    }

    /** Whether a text stands on one line and holds nothing that is no character. */
    static boolean oneLine(String text) {
        for (int i = 0; i < text.length(); i += Character.charCount(text.codePointAt(i))) {
            if (breaking(text.codePointAt(i))) {
                return false;
            }
        }
        return true;
    }

    private static String cut(String text, int longest) {
        return text.length() <= longest ? text : text.substring(0, longest) + CUT;
    }

    private static void append(StringBuilder line, int c) {
        if (breaking(c) || hidden(c)) {
            line.append(String.format("\\u%04x", c));
        } else {
            line.appendCodePoint(c);
        }
    }

    private static boolean breaking(int c) {
        if (c < 0x7f) {
            return c < ' ';
        }
        return switch (Character.getType(c)) {
            case Character.CONTROL, Character.LINE_SEPARATOR, Character.PARAGRAPH_SEPARATOR, Character.SURROGATE ->
                true;
            default -> false;
        };
    }

    private static boolean hidden(int c) {
        if (c < 0x7f) {
            return false;
        }
        return switch (Character.getType(c)) {
            case Character.FORMAT, Character.PRIVATE_USE, Character.UNASSIGNED -> true;
            default -> false;
        };
    }
}

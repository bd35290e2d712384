package binspan.planner.report;

/** A page of text for a terminal, 80 columns wide. */
final class TextPage {
    /** Columns of a page. */
    static final int WIDTH = 80;

    /** A blank at which no line is broken. */
    static final char GLUE = '\u00a0';

    private static final int NAME = 31;
    private static final String CUT = "...";
    private static final int SHORT = 12;

    private final StringBuilder text = new StringBuilder(8192);
    private final TextStyle style;

    TextPage(TextStyle style) {
        this.style = style;
    }

    TextStyle style() {
        return style;
    }

    /** Writes an empty line. */
    TextPage gap() {
        text.append('\n');
        return this;
    }

    /** Writes an empty line and a heading. */
    TextPage heading(String title) {
        return gap().line(style.strong(title));
    }

    /** Writes a heading with a remark in plain type behind it. */
    TextPage heading(String title, String remark) {
        return gap().line(style.strong(title) + ", " + remark);
    }

    /** Writes a line as it is; blanks at its end are left out. */
    TextPage line(String line) {
        int end = line.length();
        while (end > 0 && line.charAt(end - 1) == ' ') {
            end--;
        }
        text.append(line.substring(0, end).replace(GLUE, ' ')).append('\n');
        return this;
    }

    /** Writes a text broken between words. */
    TextPage wrapped(String words) {
        return wrapped("", "", words);
    }

    /**
     * Writes a text broken between words.
     *
     * @param first start of the first line
     * @param rest start of every further line
     * @param text the text; percentages stay with their number
     */
    TextPage wrapped(String first, String rest, String text) {
        String words = text.replace(" %", GLUE + "%");
        StringBuilder line = new StringBuilder(first);
        boolean fresh = true;
        int from = 0;
        while (from < words.length()) {
            int to = words.indexOf(' ', from);
            String word = to < 0 ? words.substring(from) : words.substring(from, to);
            if (!fresh && line.length() + 1 + word.length() > WIDTH) {
                line(line.toString());
                line = new StringBuilder(rest);
                fresh = true;
            }
            line.append(fresh ? "" : " ").append(word);
            fresh = false;
            from += word.length() + 1;
        }
        return line(line.toString());
    }

    /** Writes a name and, in a column of its own, a value; a name too long for its column stands on a line of its own. */
    TextPage row(String name, String value) {
        boolean fits = name.length() < NAME;
        if (!fits) {
            wrapped("  ", "  ", name);
        }
        return wrapped("  " + left(fits ? name : "", NAME), " ".repeat(NAME + 2), value);
    }

    /** A text filled with blanks to a width, its end cut off where it is longer, in a wide column with a mark. */
    static String left(String text, int width) {
        if (text.length() <= width) {
            return text + " ".repeat(width - text.length());
        }
        return width < SHORT ? text.substring(0, width) : text.substring(0, width - CUT.length()) + CUT;
    }

    /** A text moved to the right of a column, at least one blank before it. */
    static String right(String text, int width) {
        return " ".repeat(Math.max(1, width - text.length())) + text;
    }

    @Override
    public String toString() {
        return text.toString();
    }
}

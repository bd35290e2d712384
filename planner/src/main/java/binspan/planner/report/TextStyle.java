package binspan.planner.report;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;

/**
 * How text for a person is dressed. Colour only ever repeats what a word and a sign say already.
 *
 * @param coloured whether terminal colours may be used
 * @param unicode whether every character can be shown; otherwise ASCII alone
 */
public record TextStyle(boolean coloured, boolean unicode) {
    /** Every character without colour: for a window. */
    public static final TextStyle PLAIN_UNICODE = new TextStyle(false, true);

    /** ASCII without colour: safe for every terminal, file and pipe. */
    public static final TextStyle PLAIN = new TextStyle(false, false);

    private static final String[] ENCODING_PROPERTIES = {"stdout.encoding", "sun.stdout.encoding", "native.encoding"};
    private static final String RESET = "\u001b[0m";

    /**
     * The style of standard output.
     *
     * @param coloured whether the user or the terminal wants colour
     */
    public static TextStyle ofStandardOutput(boolean coloured) {
        for (String property : ENCODING_PROPERTIES) {
            String encoding = System.getProperty(property);
            if (encoding != null) {
                return new TextStyle(coloured, StandardCharsets.UTF_8.name().equalsIgnoreCase(encoding));
            }
        }
        return of(Charset.defaultCharset(), coloured);
    }

    /** The style of an output with the given character set. */
    public static TextStyle of(Charset charset, boolean coloured) {
        return new TextStyle(coloured, charset.equals(StandardCharsets.UTF_8));
    }

    String strong(String text) {
        return dressed(text, "\u001b[1m");
    }

    String faint(String text) {
        return dressed(text, "\u001b[2m");
    }

    String good(String text) {
        return dressed(text, "\u001b[32m");
    }

    String bad(String text) {
        return dressed(text, "\u001b[1;31m");
    }

    private String dressed(String text, String code) {
        return coloured && !text.isEmpty() ? code + text + RESET : text;
    }

    /** Sign of a requirement that is met. */
    public String met() {
        return unicode ? "\u2713" : "+";
    }

    /** Sign of a requirement that is not met. */
    public String notMet() {
        return unicode ? "\u2717" : "!";
    }

    String plusMinus() {
        return unicode ? "\u00b1" : "+-";
    }

    String atLeast() {
        return unicode ? "\u2265" : ">=";
    }

    String atMost() {
        return unicode ? "\u2264" : "<=";
    }

    String arrow() {
        return unicode ? "\u2192" : "->";
    }

    char bar() {
        return unicode ? '\u2588' : '#';
    }

    char lost() {
        return unicode ? '\u2592' : '-';
    }

    /**
     * A text from a scenario file as a page may safely show it: control characters and, in ASCII, all others replaced; the page's own blanks at which no
     * line is broken stay.
     */
    String clean(String text) {
        StringBuilder clean = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean shown = c >= ' ' && c != '\u007f' && !(c >= '\u0080' && c <= '\u009f') && (unicode || c < '\u007f');
            clean.append(shown || c == TextPage.GLUE ? c : '?');
        }
        return clean.toString();
    }
}

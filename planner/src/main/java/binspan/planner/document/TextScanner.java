package binspan.planner.document;

import binspan.planner.document.TextPart.Slot;
import java.util.ArrayList;
import java.util.List;

/** Finds where the parts of a JSON text with comments stand. The text has been read before, so that nothing is checked here. */
final class TextScanner {
    private static final int HEXADECIMAL = 16;
    private static final int ESCAPE_DIGITS = 4;
    private static final String ENDS = ",:]}/";
    private static final String ESCAPED = "bfnrt";
    private static final String MEANT = "\b\f\n\r\t";

    private final String text;
    private final List<TextComment> comments = new ArrayList<>();
    private int at;

    private TextScanner(String text) {
        this.text = text;
    }

    /** Scans a whole text. */
    static ScannedText scan(String text) {
        TextScanner scanner = new TextScanner(text);
        scanner.blank();
        TextPart root = scanner.value();
        scanner.blank();
        return new ScannedText(text, root, scanner.comments);
    }

    /** The text of a string in quotes. */
    static String unquoted(String quoted) {
        String inside = quoted.substring(1, quoted.length() - 1);
        return inside.indexOf('\\') < 0 ? inside : unescaped(inside);
    }

    private static String unescaped(String inside) {
        StringBuilder plain = new StringBuilder(inside.length());
        for (int i = 0; i < inside.length(); i++) {
            char c = inside.charAt(i);
            if (c != '\\') {
                plain.append(c);
            } else if (inside.charAt(++i) == 'u') {
                plain.append((char) Integer.parseInt(inside.substring(i + 1, i + 1 + ESCAPE_DIGITS), HEXADECIMAL));
                i += ESCAPE_DIGITS;
            } else {
                int known = ESCAPED.indexOf(inside.charAt(i));
                plain.append(known < 0 ? inside.charAt(i) : MEANT.charAt(known));
            }
        }
        return plain.toString();
    }

    private TextPart value() {
        return switch (text.charAt(at)) {
            case '{' -> container('}');
            case '[' -> container(']');
            case '"' -> new TextPart(at, string(), List.of());
            default -> new TextPart(at, word(), List.of());
        };
    }

    private TextPart container(char close) {
        int start = at++;
        List<Slot> slots = new ArrayList<>();
        blank();
        while (text.charAt(at) != close) {
            slots.add(slot(close == '}'));
        }
        at++;
        return new TextPart(start, at, slots);
    }

    private Slot slot(boolean named) {
        int start = at;
        String name = named ? unquoted(text.substring(start, string())) : "";
        int nameEnd = at;
        if (named) {
            blank();
            at++;
            blank();
        }
        TextPart value = value();
        blank();
        int comma = text.charAt(at) == ',' ? at++ : -1;
        blank();
        return new Slot(name, start, nameEnd, value, comma);
    }

    private int string() {
        at++;
        while (text.charAt(at) != '"') {
            at += text.charAt(at) == '\\' ? 2 : 1;
        }
        return ++at;
    }

    private int word() {
        while (at < text.length() && text.charAt(at) > ' ' && ENDS.indexOf(text.charAt(at)) < 0) {
            at++;
        }
        return at;
    }

    private void blank() {
        while (at < text.length()) {
            char c = text.charAt(at);
            if (c == '/') {
                comment();
            } else if (c <= ' ' || c == ScenarioDocument.BYTE_ORDER_MARK) {
                at++;
            } else {
                return;
            }
        }
    }

    private void comment() {
        int start = at;
        boolean line = text.startsWith("//", at);
        if (line) {
            while (at < text.length() && !ScannedText.breaks(text.charAt(at))) {
                at++;
            }
        } else {
            at = text.indexOf("*/", at + 2) + 2;
        }
        comments.add(new TextComment(start, at, line));
    }
}

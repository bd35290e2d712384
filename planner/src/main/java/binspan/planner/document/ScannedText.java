package binspan.planner.document;

import java.util.List;
import java.util.TreeMap;

/** A JSON text whose parts, comments and lines are known. */
final class ScannedText {
    private final String text;
    private final TextPart root;
    private final TreeMap<Integer, TextComment> byStart = new TreeMap<>();
    private final TreeMap<Integer, TextComment> byEnd = new TreeMap<>();

    ScannedText(String text, TextPart root, List<TextComment> comments) {
        this.text = text;
        this.root = root;
        for (TextComment comment : comments) {
            byStart.put(comment.start(), comment);
            byEnd.put(comment.end(), comment);
        }
    }

    String text() {
        return text;
    }

    TextPart root() {
        return root;
    }

    /** The characters of a part. */
    String of(TextPart part) {
        return text.substring(part.start(), part.end());
    }

    static boolean breaks(char c) {
        return c == '\n' || c == '\r';
    }

    /** Whether a comment begins in a stretch of the text. */
    boolean commented(int from, int to) {
        return !byStart.subMap(from, true, to, false).isEmpty();
    }

    /** Whether the last comment that begins in a stretch of the text goes to the end of its line. */
    boolean endsInLineComment(int from, int to) {
        return commented(from, to)
                && byStart.subMap(from, true, to, false).lastEntry().getValue().line();
    }

    /** Offset where a line begins if nothing but blanks and comments stand in it before an offset, otherwise -1. */
    int lineBegin(int offset) {
        int at = offset;
        while (at > 0 && !breaks(text.charAt(at - 1))) {
            if (blank(text.charAt(at - 1))) {
                at--;
            } else if (byEnd.containsKey(at) && onOneLine(byEnd.get(at))) {
                at = byEnd.get(at).start();
            } else {
                return -1;
            }
        }
        return at;
    }

    private boolean onOneLine(TextComment comment) {
        return text.substring(comment.start(), comment.end()).chars().noneMatch(c -> breaks((char) c));
    }

    /** The first offset that holds neither a blank nor a comment; a line break is no blank. */
    int tail(int offset) {
        int at = offset;
        while (at < text.length()) {
            if (byStart.containsKey(at)) {
                at = byStart.get(at).end();
            } else if (blank(text.charAt(at))) {
                at++;
            } else {
                return at;
            }
        }
        return at;
    }

    /** Whether a line or the text ends at an offset. */
    boolean lineEnds(int offset) {
        return offset >= text.length() || breaks(text.charAt(offset));
    }

    /** The offset behind the line break at an offset. */
    int behindBreak(int offset) {
        int crLf = text.startsWith("\r\n", offset) ? 2 : 1;
        return Math.min(text.length(), offset + crLf);
    }

    /** The first offset that holds no blank. */
    int behindBlanks(int offset) {
        int at = offset;
        while (at < text.length() && blank(text.charAt(at))) {
            at++;
        }
        return at;
    }

    /** The offset where the blanks before an offset begin. */
    int beforeBlanks(int offset) {
        int at = offset;
        while (at > 0 && blank(text.charAt(at - 1))) {
            at--;
        }
        return at;
    }

    /** The blanks at the begin of the line of an offset. */
    String indentation(int offset) {
        int begin = offset;
        while (begin > 0 && !breaks(text.charAt(begin - 1))) {
            begin--;
        }
        return text.substring(begin, Math.min(behindBlanks(begin), offset));
    }

    /** How lines end around an offset: as the line before does, or as the first of the text. */
    String lineBreak(int offset) {
        int at = offset;
        while (at > 0 && !breaks(text.charAt(at - 1))) {
            at--;
        }
        if (at == 0) {
            int first = 0;
            while (first < text.length() && !breaks(text.charAt(first))) {
                first++;
            }
            return first == text.length() ? "\n" : text.substring(first, behindBreak(first));
        }
        return text.startsWith("\r\n", at - 2) ? "\r\n" : text.substring(at - 1, at);
    }

    private static boolean blank(char c) {
        return c == ' ' || c == '\t';
    }
}

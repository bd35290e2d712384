package binspan.planner.document;

import binspan.planner.document.TextPart.Slot;

/** Cuts members and items out of a JSON text and sews others in, in the layout of their neighbours. Each method gives the new text. */
final class TextSurgery {
    private static final String STEP = "  ";

    private final ScannedText scanned;
    private final String text;

    TextSurgery(ScannedText scanned) {
        this.scanned = scanned;
        this.text = scanned.text();
    }

    /**
     * What is sewn in.
     *
     * @param core member or item without comma
     * @param comment comment that follows it on its line, with the blanks before it; empty for none
     * @param lineComment whether that goes to the end of the line
     */
    record Piece(String core, String comment, boolean lineComment) {
        static Piece of(String core) {
            return new Piece(core, "", false);
        }
    }

    String replaced(TextPart value, String by) {
        return new TextSplices().replace(value.start(), value.end(), by).applied(text);
    }

    /** The text with a member or item more at a position. */
    String with(TextPart container, int position, Piece piece) {
        int size = container.slots().size();
        if (size == 0) {
            return first(container, piece);
        }
        return position == size ? appended(container, piece) : inserted(container, position, piece);
    }

    private String first(TextPart container, Piece piece) {
        int open = container.start() + 1;
        int close = container.end() - 1;
        String lineBreak = scanned.lineBreak(container.start());
        String indentation = scanned.indentation(container.start());
        String line = indentation + STEP + piece.core() + piece.comment();
        if (text.substring(open, close).isBlank()) {
            boolean list = text.charAt(container.start()) == '[';
            boolean broken = piece.lineComment() || (list && scanned.lineBegin(firstOfLine(container)) >= 0);
            String inside = broken ? lineBreak + line + lineBreak + indentation : " " + piece.core() + " ";
            return new TextSplices().replace(open, close, inside).applied(text);
        }
        int begin = scanned.lineBegin(close);
        return begin >= 0 && !scanned.commented(begin, close)
                ? new TextSplices().insert(begin, line + lineBreak).applied(text)
                : new TextSplices().insert(close, " " + inline(piece, close)).applied(text);
    }

    /** Offset of what the line of a container begins with. */
    private int firstOfLine(TextPart container) {
        int at = container.start();
        while (at > 0 && !ScannedText.breaks(text.charAt(at - 1))) {
            at--;
        }
        return at == 0 ? container.start() : scanned.behindBlanks(at);
    }

    private String appended(TextPart container, Piece piece) {
        Slot last = container.slots().get(container.slots().size() - 1);
        if (scanned.lineBegin(last.start()) < 0) {
            return new TextSplices()
                    .insert(last.end(), ", " + inline(piece, last.end()).stripTrailing() + closing(piece, last.end()))
                    .applied(text);
        }
        int tail = scanned.tail(last.end());
        String line = scanned.lineBreak(last.start()) + scanned.indentation(last.start()) + piece.core();
        String closing = scanned.lineEnds(tail) ? "" : closing(piece, last.end());
        return new TextSplices()
                .insert(last.end(), ",")
                .insert(Math.max(last.end(), scanned.beforeBlanks(tail)), line + piece.comment() + closing)
                .applied(text);
    }

    /** What must follow a piece in its line: the end of the line after a comment that goes so far. */
    private String closing(Piece piece, int offset) {
        return piece.lineComment() ? scanned.lineBreak(offset) + scanned.indentation(offset) : "";
    }

    private String inline(Piece piece, int offset) {
        return piece.core() + piece.comment() + (piece.lineComment() ? closing(piece, offset) : " ");
    }

    private String inserted(TextPart container, int position, Piece piece) {
        Slot next = container.slots().get(position);
        int before = position == 0
                ? container.start() + 1
                : container.slots().get(position - 1).comma() + 1;
        int tail = scanned.tail(before);
        if (scanned.lineBegin(next.start()) >= 0 && scanned.lineEnds(tail)) {
            String line = scanned.lineBreak(next.start()) + scanned.indentation(next.start()) + piece.core() + ",";
            return new TextSplices().insert(tail, line + piece.comment()).applied(text);
        }
        Piece separated = new Piece(piece.core() + ",", piece.comment(), piece.lineComment());
        return new TextSplices()
                .insert(next.start(), inline(separated, next.start()))
                .applied(text);
    }

    /** The text without a member or item, its comma, and the comments in its lines if nothing else stands in them. */
    String without(TextPart container, int position) {
        Slot slot = container.slots().get(position);
        TextSplices splices = new TextSplices();
        if (alone(slot)) {
            deleteLines(container, position, splices);
        } else {
            deleteInline(container, position, splices);
        }
        int open = container.start() + 1;
        int close = container.end() - 1;
        if (splices.applied(text, open, close).isBlank()) {
            return new TextSplices().delete(open, close).applied(text);
        }
        return splices.applied(text);
    }

    private boolean alone(Slot slot) {
        return scanned.lineBegin(slot.start()) >= 0 && scanned.lineEnds(lineTail(slot));
    }

    /** Offset behind the comma and the comments that follow a slot in its line. */
    private int lineTail(Slot slot) {
        int tail = scanned.tail(slot.end());
        return tail == slot.comma() ? scanned.tail(tail + 1) : tail;
    }

    private void deleteLines(TextPart container, int position, TextSplices splices) {
        Slot slot = container.slots().get(position);
        int tail = lineTail(slot);
        splices.delete(scanned.lineBegin(slot.start()), scanned.behindBreak(tail));
        if (slot.comma() >= tail) {
            splices.delete(slot.comma(), scanned.behindBlanks(slot.comma() + 1));
        } else if (slot.comma() < 0 && position > 0) {
            int comma = container.slots().get(position - 1).comma();
            splices.delete(comma, comma + 1);
        }
    }

    private void deleteInline(TextPart container, int position, TextSplices splices) {
        Slot slot = container.slots().get(position);
        if (slot.comma() >= 0) {
            int end = scanned.behindBlanks(slot.comma() + 1);
            boolean lastOfLine = scanned.lineEnds(end) && scanned.lineBegin(slot.start()) < 0;
            splices.delete(lastOfLine ? scanned.beforeBlanks(slot.start()) : slot.start(), end);
        } else if (position == 0) {
            splices.delete(scanned.beforeBlanks(slot.start()), slot.end());
        } else {
            deleteLast(container.slots().get(position - 1).comma(), slot, splices);
        }
    }

    private void deleteLast(int comma, Slot slot, TextSplices splices) {
        int tail = scanned.tail(slot.end());
        if (scanned.commented(comma, slot.start())) {
            splices.delete(comma, comma + 1);
            splices.delete(scanned.beforeBlanks(slot.start()), slot.end());
        } else if (scanned.lineBegin(comma) >= 0 && scanned.lineEnds(tail)) {
            splices.delete(scanned.lineBegin(comma), scanned.behindBreak(tail));
        } else {
            splices.delete(comma, slot.end());
        }
    }

    /** A member or item with the comments that go with it when it leaves its place. */
    Piece piece(Slot slot) {
        int end = slot.end();
        int comma = slot.comma();
        boolean alone = alone(slot);
        int tail = alone ? lineTail(slot) : end;
        String comment = comma >= end && (comma < tail || !alone)
                ? text.substring(end, comma).stripTrailing() + text.substring(comma + 1, Math.max(tail, comma + 1))
                : text.substring(end, tail);
        boolean line = scanned.endsInLineComment(end, Math.max(tail, comma));
        int begin = alone ? scanned.behindBlanks(scanned.lineBegin(slot.start())) : slot.start();
        return new Piece(text.substring(begin, end), comment.stripTrailing(), line);
    }
}

package binspan.planner.document;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Stretches of a text to be replaced, all given in the offsets of the text as it was. */
final class TextSplices {
    private record Splice(int start, int end, String by) {}

    private final List<Splice> splices = new ArrayList<>();

    /** Replaces a stretch; of several insertions at one place the earlier comes first. */
    TextSplices replace(int start, int end, String by) {
        splices.add(new Splice(start, end, by));
        return this;
    }

    TextSplices insert(int at, String added) {
        return replace(at, at, added);
    }

    TextSplices delete(int start, int end) {
        return replace(start, end, "");
    }

    /** What is left of a stretch of the text. */
    String applied(String text, int from, int to) {
        StringBuilder result = new StringBuilder(text.length());
        int at = from;
        splices.sort(Comparator.comparingInt(Splice::start));
        for (Splice splice : splices) {
            int start = Math.min(Math.max(splice.start(), at), to);
            result.append(text, at, start).append(splice.by());
            at = Math.min(Math.max(splice.end(), at), to);
        }
        return result.append(text, at, to).toString();
    }

    String applied(String text) {
        return applied(text, 0, text.length());
    }
}

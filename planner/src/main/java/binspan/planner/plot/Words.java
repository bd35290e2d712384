package binspan.planner.plot;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.util.ArrayList;
import java.util.List;

/** Words fitted into a length. */
final class Words {
    private static final FontRenderContext CONTEXT = new FontRenderContext(null, true, true);
    private static final char CUT = '\u2026';

    private Words() {}

    /** Length of a text in points. */
    static double length(String text, Font font) {
        return font.getStringBounds(text, CONTEXT).getWidth();
    }

    /** The text, or as much of its beginning as fits before three dots; at least one letter. */
    static String shortened(String text, Font font, double length) {
        String shown = text;
        for (int end = text.length() - 1; end > 0 && length(shown, font) > length; end--) {
            shown = text.substring(0, end).stripTrailing() + CUT;
        }
        return shown;
    }

    /** The text in lines broken at blanks; what does not fit into the last of them is cut. */
    static List<String> lines(String text, Font font, double length, int most) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word : text.split(" ", -1)) {
            boolean fits = line.isEmpty() || length(line + " " + word, font) <= length;
            if (!fits && lines.size() + 1 < most) {
                lines.add(line.toString());
                line.setLength(0);
            }
            line.append(line.isEmpty() ? "" : " ").append(word);
        }
        lines.add(line.toString());
        return lines.stream().map(each -> shortened(each, font, length)).toList();
    }
}

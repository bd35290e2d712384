package binspan.planner.cli;

/** Text wrapped for a terminal of 80 columns. */
final class Paragraph {
    private static final int WIDTH = 80;

    private Paragraph() {}

    /** The text in lines of at most 80 characters, each indented, each ended. A word that is longer stands alone. */
    static String of(String text, int indent) {
        StringBuilder lines = new StringBuilder();
        int column = 0;
        for (String word : text.split(" ", -1)) {
            boolean first = column == 0;
            if (!first && column + 1 + word.length() > WIDTH) {
                lines.append('\n');
                first = true;
            }
            lines.append(first ? " ".repeat(indent) : " ").append(word);
            column = (first ? indent : column + 1) + word.length();
        }
        return lines.append('\n').toString();
    }
}

package binspan.planner.report;

import binspan.prediction.LinkCheck;
import binspan.worksheet.Worksheet;
import binspan.worksheet.WorksheetLine;

/** A worksheet for a person: each line with its formula, the numbers put in, the value and the source. */
public final class WorksheetText {
    private static final int SYMBOL = 12;

    private final TextPage page;
    private final String indent = " ".repeat(SYMBOL);

    private WorksheetText(TextPage page) {
        this.page = page;
    }

    /** The worksheet as a text that ends with a line break. */
    public static String text(LinkCheck check, TextStyle style) {
        TextPage page = new TextPage(style);
        page.wrapped("Worksheet of " + style.clean(check.prediction().scenario().name()));
        page.gap();
        page.wrapped("Every number put in stands on a line of its own above. Formulas without a source are those of the"
                + " model. Inputs"
                + " name theirs: the scenario, stated or by default, its own note on the value, or a class.");
        WorksheetText text = new WorksheetText(page);
        String section = "";
        for (WorksheetLine line : Worksheet.of(check).lines()) {
            if (!line.section().equals(section)) {
                section = line.section();
                page.heading(section);
            }
            text.line(line);
        }
        return page.toString();
    }

    private void line(WorksheetLine line) {
        String symbol =
                line.symbol() + " ".repeat(Math.max(1, SYMBOL - line.symbol().length()));
        String meaning = page.style().clean(line.meaning());
        if (line.input()) {
            String source = " [" + page.style().clean(line.source()) + "]";
            page.wrapped(symbol, indent, meaning + " = " + glued(line.valueText()) + source);
            return;
        }
        page.wrapped(symbol, indent, meaning);
        page.wrapped(indent, indent + "  ", "= " + line.formula());
        if (!line.numbers().equals(line.formula())) {
            page.wrapped(indent, indent + "  ", "= " + gluedNumbers(line.numbers()));
        }
        if (!line.numbers().equals(line.valueText())) {
            String source = line.source().equals(WorksheetLine.MODEL) ? "" : " [" + line.source() + "]";
            page.wrapped(indent, indent, "= " + line.valueText() + source);
        }
    }

    private static String glued(String quantity) {
        return quantity.replace(' ', TextPage.GLUE);
    }

    /** Keeps numbers in parentheses and their units on one line. */
    private static String gluedNumbers(String numbers) {
        StringBuilder text = new StringBuilder(numbers);
        for (int open = numbers.indexOf('('); open >= 0; open = numbers.indexOf('(', open + 1)) {
            int end = open + 1;
            while (end < numbers.length() && "0123456789.e-".indexOf(numbers.charAt(end)) >= 0) {
                end++;
            }
            boolean unit = end > open + 1
                    && end + 1 < numbers.length()
                    && numbers.charAt(end) == ' '
                    && startsUnit(numbers, end + 1);
            if (unit) {
                text.setCharAt(end, TextPage.GLUE);
            }
        }
        return text.toString();
    }

    private static boolean startsUnit(String numbers, int at) {
        return Character.isLetter(numbers.charAt(at)) || numbers.charAt(at) == '(' || numbers.startsWith("1/", at);
    }
}

package binspan.worksheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * A formula with its numbers put in.
 *
 * @param symbols the formula in symbols
 * @param numbers the formula in numbers with units, each in parentheses where it would not stand by itself
 * @param terms the numbers put in, each once
 */
record WorksheetFormula(String symbols, String numbers, List<WorksheetTerm> terms) {
    /**
     * Puts numbers into a formula.
     *
     * @param template formula with the symbols of earlier lines in braces
     * @param known earlier lines by symbol
     * @throws IllegalStateException if a symbol is not known
     */
    static WorksheetFormula of(String template, Map<String, WorksheetLine> known) {
        StringBuilder symbols = new StringBuilder();
        StringBuilder numbers = new StringBuilder();
        List<WorksheetTerm> terms = new ArrayList<>();
        int from = 0;
        for (int open = template.indexOf('{'); open >= 0; open = template.indexOf('{', from)) {
            int close = template.indexOf('}', open);
            WorksheetTerm term = term(template.substring(open + 1, close), known);
            symbols.append(template, from, open).append(term.symbol());
            numbers.append(template, from, open).append(placed(term.text(), template, open, close));
            if (!terms.contains(term)) {
                terms.add(term);
            }
            from = close + 1;
        }
        String rest = template.substring(from);
        return new WorksheetFormula(symbols + rest, multiplied(numbers + rest), terms);
    }

    /** Puts a sign between two bare numbers that stand for a product; a unit such as 1/s is no number. */
    private static String multiplied(String numbers) {
        StringBuilder text = new StringBuilder(numbers);
        for (int i = text.length() - 2; i > 0; i--) {
            boolean between = text.charAt(i) == ' ' && digit(text.charAt(i - 1)) && digit(text.charAt(i + 1));
            if (between && !text.substring(i + 1).startsWith("1/")) {
                text.insert(i, " x");
            }
        }
        return text.toString();
    }

    private static boolean digit(char c) {
        return c >= '0' && c <= '9';
    }

    private static WorksheetTerm term(String symbol, Map<String, WorksheetLine> known) {
        WorksheetLine line = known.get(symbol);
        if (line == null) {
            throw new IllegalStateException("worksheet puts in " + symbol + " before stating it");
        }
        return new WorksheetTerm(symbol, line.value(), line.unit());
    }

    private static String placed(String number, String template, int open, int close) {
        boolean single = number.indexOf(' ') < 0 && number.indexOf('e') < 0 && number.charAt(0) != '-';
        boolean enclosed = open > 0
                && template.charAt(open - 1) == '('
                && close + 1 < template.length()
                && template.charAt(close + 1) == ')';
        boolean alone = open == 0 && close + 1 == template.length();
        return single || enclosed || alone ? number : "(" + number + ")";
    }
}

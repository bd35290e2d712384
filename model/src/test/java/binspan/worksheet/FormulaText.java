package binspan.worksheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.math3.special.Erf;

/**
 * Evaluates a worksheet formula as a reader would: numbers for symbols, products without a sign, the usual order of
 * operations. Units are left out.
 */
final class FormulaText {
    private static final String END = "";

    private final List<Object> tokens = new ArrayList<>();
    private int next;
    private int bars;

    private FormulaText(String formula, List<WorksheetTerm> terms) {
        List<WorksheetTerm> longestFirst = new ArrayList<>(terms);
        longestFirst.sort(
                Comparator.comparingInt((WorksheetTerm term) -> -term.symbol().length()));
        int at = 0;
        while (at < formula.length()) {
            at = formula.charAt(at) == ' ' ? at + 1 : token(formula, at, longestFirst);
        }
        tokens.add(END);
    }

    /**
     * The value of a formula.
     *
     * @throws IllegalArgumentException if it is told in words
     */
    static double value(String formula, List<WorksheetTerm> terms) {
        FormulaText text = new FormulaText(formula, terms);
        double value = text.sum();
        if (!text.tokens.get(text.next).equals(END)) {
            throw new IllegalArgumentException("left over: " + text.tokens.subList(text.next, text.tokens.size()));
        }
        return value;
    }

    private int token(String formula, int at, List<WorksheetTerm> terms) {
        for (WorksheetTerm term : terms) {
            int end = at + term.symbol().length();
            if (formula.startsWith(term.symbol(), at)
                    && (end == formula.length() || !partOfName(formula.charAt(end)))) {
                tokens.add(term.value());
                return end;
            }
        }
        int end = at + 1;
        char first = formula.charAt(at);
        if (Character.isLetterOrDigit(first)) {
            while (end < formula.length()
                    && (Character.isLetterOrDigit(formula.charAt(end)) || formula.charAt(end) == '.')) {
                end++;
            }
        }
        String word = formula.substring(at, end);
        tokens.add(Character.isDigit(first) ? (Object) Double.valueOf(word) : word);
        return end;
    }

    private static boolean partOfName(char c) {
        return Character.isLetterOrDigit(c) || c == '_' || c == '(';
    }

    private boolean take(String token) {
        boolean found = tokens.get(next).equals(token);
        next += found ? 1 : 0;
        return found;
    }

    private double sum() {
        double sum = product();
        while (true) {
            if (take("+")) {
                sum += product();
            } else if (take("-")) {
                sum -= product();
            } else {
                return sum;
            }
        }
    }

    private double product() {
        double product = signed();
        while (true) {
            if (take("/")) {
                product /= signed();
            } else if (take("x") || operandFollows()) {
                product *= signed();
            } else {
                return product;
            }
        }
    }

    private boolean operandFollows() {
        Object token = tokens.get(next);
        boolean word = token instanceof String text && !text.isEmpty() && Character.isLetter(text.charAt(0));
        return token instanceof Double
                || word
                || token.equals("(")
                || token.equals("[")
                || (token.equals("|") && bars == 0);
    }

    private double signed() {
        return take("-") ? -power() : power();
    }

    private double power() {
        double base = operand();
        return take("^") ? Math.pow(base, take("-") ? -operand() : operand()) : base;
    }

    private double operand() {
        Object token = tokens.get(next);
        if (token.equals(END)) {
            throw new IllegalArgumentException("ends too early");
        }
        next++;
        if (token instanceof Double number) {
            return number;
        }
        return switch ((String) token) {
            case "(" -> enclosed(")");
            case "[" -> enclosed("]");
            case "|" -> absolute();
            case "pi" -> Math.PI;
            case "c" -> 299_792_458.0;
            case "THz" -> 1e12;
            case "mW" -> 1e-3;
            default -> named((String) token);
        };
    }

    private double enclosed(String end) {
        double value = sum();
        expect(end);
        return value;
    }

    private void expect(String token) {
        if (!take(token)) {
            throw new IllegalArgumentException("found " + tokens.get(next) + " for " + token);
        }
    }

    private double absolute() {
        bars++;
        double value = Math.abs(sum());
        bars--;
        expect("|");
        return value;
    }

    private double named(String name) {
        if (name.equals("h") && !tokens.get(next).equals("(")) {
            return 6.62607015e-34;
        }
        if (name.equals("min") || name.equals("max")) {
            return extreme(name.equals("min"));
        }
        double x = operand();
        return switch (name) {
            case "sqrt" -> Math.sqrt(x);
            case "exp" -> Math.exp(x);
            case "cos" -> Math.cos(x);
            case "ln" -> Math.log(x);
            case "log2" -> Math.log(x) / Math.log(2.0);
            case "erf" -> Erf.erf(x);
            case "floor" -> Math.floor(x);
            case "h" -> WorksheetChecks.entropy(x);
            default -> throw new IllegalArgumentException("a word: " + name);
        };
    }

    private double extreme(boolean least) {
        expect("(");
        double extreme = sum();
        while (take(",")) {
            double other = sum();
            extreme = least ? Math.min(extreme, other) : Math.max(extreme, other);
        }
        expect(")");
        return extreme;
    }
}

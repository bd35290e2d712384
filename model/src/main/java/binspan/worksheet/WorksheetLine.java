package binspan.worksheet;

import java.util.List;

/**
 * One line of the calculation.
 *
 * @param section section of the worksheet
 * @param symbol symbol of the quantity, unique in the worksheet
 * @param meaning what it is
 * @param formula its formula in symbols; empty for an input
 * @param numbers the formula with the numbers put in; empty for an input
 * @param value its value; infinite where it has no bound
 * @param unit unit of the value, empty for a bare number
 * @param source where formula or input comes from
 * @param terms the numbers put in, each once
 */
public record WorksheetLine(
        String section,
        String symbol,
        String meaning,
        String formula,
        String numbers,
        double value,
        String unit,
        String source,
        List<WorksheetTerm> terms) {

    /** Source of a formula that is the model's own. */
    public static final String MODEL = "model";

    public WorksheetLine {
        terms = List.copyOf(terms);
    }

    /** Whether the line states an input of the scenario instead of a calculation. */
    public boolean input() {
        return formula.isEmpty();
    }

    /** The value with its unit. */
    public String valueText() {
        return WorksheetNumber.text(value, unit);
    }

    /**
     * The number put in under a symbol.
     *
     * @throws IllegalArgumentException if the line puts in none of that symbol
     */
    public double term(String name) {
        for (WorksheetTerm term : terms) {
            if (term.symbol().equals(name)) {
                return term.value();
            }
        }
        throw new IllegalArgumentException(symbol + " puts in no " + name);
    }
}

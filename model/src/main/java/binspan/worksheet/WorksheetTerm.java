package binspan.worksheet;

/**
 * A number that a worksheet line puts into its formula.
 *
 * @param symbol symbol of the line above that it comes from
 * @param value the number
 * @param unit its unit, empty for a bare number
 */
public record WorksheetTerm(String symbol, double value, String unit) {
    /** The number with its unit as the worksheet writes it. */
    public String text() {
        return WorksheetNumber.text(value, unit);
    }
}

package binspan.planner.table;

import java.io.IOException;

/** Takes the rows of a table, cell by cell in the order of the header. */
public interface RowWriter {
    /** Writes a number; NaN and infinities stand for one that does not apply. */
    void number(double value) throws IOException;

    /** Writes a text; an empty one stands for none. */
    void text(String value) throws IOException;

    /** Writes true or false. */
    void flag(boolean value) throws IOException;

    /**
     * Ends the row.
     *
     * @throws IllegalStateException if it has more or fewer cells than the header
     */
    void endRow() throws IOException;

    /** Writes a cell of any of these kinds; null stands for what does not apply. */
    default void cell(Object value) throws IOException {
        if (value instanceof Number number) {
            number(number.doubleValue());
        } else if (value instanceof Boolean flag) {
            flag(flag);
        } else {
            text(value == null ? "" : (String) value);
        }
    }
}

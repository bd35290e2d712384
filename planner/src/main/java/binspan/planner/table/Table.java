package binspan.planner.table;

import java.io.IOException;
import java.util.HashSet;
import java.util.List;

/**
 * A table to be written.
 *
 * @param header names of its columns, each once
 * @param rows its rows, asked for once by each output
 */
public record Table(List<String> header, Rows rows) {
    /** The rows of a table. */
    @FunctionalInterface
    public interface Rows {
        /** Hands over all rows, first to last. */
        void to(RowWriter writer) throws IOException;
    }

    /**
     * Checks the header.
     *
     * @throws IllegalArgumentException if a name stands in it twice
     */
    public Table {
        header = List.copyOf(header);
        if (new HashSet<>(header).size() < header.size()) {
            throw new IllegalArgumentException("found a column twice in " + header);
        }
    }
}

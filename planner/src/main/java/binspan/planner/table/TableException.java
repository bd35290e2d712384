package binspan.planner.table;

import binspan.planner.io.Printable;

/** A table that cannot be read, with the place and the reason. */
public final class TableException extends Exception {
    private static final long serialVersionUID = 1L;

    TableException(String message) {
        super(Printable.line(message));
    }
}

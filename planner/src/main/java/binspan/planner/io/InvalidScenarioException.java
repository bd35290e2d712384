package binspan.planner.io;

import java.util.List;

/** A scenario that cannot be read: all that is wrong with it, one line each. */
public final class InvalidScenarioException extends Exception {
    private static final long serialVersionUID = 1L;

    private final List<String> lines;

    InvalidScenarioException(List<String> lines) {
        super(String.join("\n", lines));
        this.lines = List.copyOf(lines);
    }

    /**
     * The errors in the order of the file, each with file name, line, column, path, what was found and what is allowed.
     */
    public List<String> lines() {
        return lines;
    }
}

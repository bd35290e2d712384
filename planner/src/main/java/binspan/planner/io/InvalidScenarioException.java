package binspan.planner.io;

import java.util.List;

/** A scenario that cannot be read: all that is wrong with it, one line each. */
public final class InvalidScenarioException extends Exception {
    private static final long serialVersionUID = 1L;

    private final List<String> lines;
    private final transient List<FileError> errors;

    InvalidScenarioException(List<String> lines) {
        this(lines, List.of());
    }

    InvalidScenarioException(List<String> lines, List<FileError> errors) {
        super(String.join("\n", lines));
        this.lines = List.copyOf(lines);
        this.errors = List.copyOf(errors);
    }

    /**
     * The errors in the order of the file, each with file name, line, column, path, what was found and what is allowed.
     */
    public List<String> lines() {
        return lines;
    }

    /** The same errors in parts; empty where there is no text to find them in, such as that of a missing file. */
    public List<FileError> errors() {
        return errors;
    }
}

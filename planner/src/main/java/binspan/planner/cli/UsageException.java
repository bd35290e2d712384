package binspan.planner.cli;

import binspan.planner.io.Printable;
import binspan.scenario.Nearest;
import java.util.List;
import java.util.function.Supplier;

/** A command line that asks for what there is not. */
final class UsageException extends Exception {
    private static final long serialVersionUID = 1L;

    private UsageException(String message) {
        super(Printable.line(message));
    }

    /** A command line that cannot be followed, with the reason. */
    static UsageException of(String message) {
        return new UsageException(message);
    }

    /**
     * Makes something that a command line asks for.
     *
     * @param option the option as it was written, which begins the message
     * @param made makes it
     * @throws UsageException if it cannot be made
     */
    static <T> T unless(String option, Supplier<T> made) throws UsageException {
        try {
            return made.get();
        } catch (IllegalArgumentException e) {
            throw new UsageException(option + ": " + e.getMessage());
        }
    }

    /** A word that names nothing known. */
    static UsageException unknown(String kind, String word, List<String> known) {
        List<String> near = Nearest.to(word, known);
        String hint = near.isEmpty() ? "" : "; did you mean " + String.join(" or ", near) + "?";
        return new UsageException("unknown " + kind + " " + (word.isEmpty() ? "\"\"" : word) + "; allowed "
                + String.join(" | ", known) + hint);
    }
}

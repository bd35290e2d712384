package binspan.planner.cli;

import binspan.scenario.Nearest;
import java.util.List;

/** A command line that asks for what there is not. */
final class UsageException extends Exception {
    private static final long serialVersionUID = 1L;

    private UsageException(String message) {
        super(message);
    }

    /** A word that names nothing known. */
    static UsageException unknown(String kind, String word, List<String> known) {
        List<String> near = Nearest.to(word, known);
        String hint = near.isEmpty() ? "" : "; did you mean " + String.join(" or ", near) + "?";
        return new UsageException("unknown " + kind + " " + word + "; allowed " + String.join(" | ", known) + hint);
    }
}

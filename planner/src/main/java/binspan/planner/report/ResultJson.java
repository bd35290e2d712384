package binspan.planner.report;

import binspan.planner.io.JsonText;
import binspan.prediction.LinkCheck;
import java.io.PrintStream;

/** The result of a check as JSON for programs: stable names, plain numbers, what does not apply is absent. */
public final class ResultJson {
    private ResultJson() {}

    /**
     * Writes one result as a JSON object, without a line end.
     *
     * @param check what was found
     * @param out where to write
     */
    public static void write(LinkCheck check, PrintStream out) {
        out.print(text(check));
    }

    /** The result as the text of a JSON object. */
    public static String text(LinkCheck check) {
        return JsonText.of(ResultTree.of(check));
    }
}

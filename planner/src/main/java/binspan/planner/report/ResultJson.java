package binspan.planner.report;

import binspan.planner.io.JsonText;
import binspan.prediction.LinkCheck;
import java.io.PrintStream;
import java.util.Map;

/** The outcome of a check as JSON. */
public final class ResultJson {
    private ResultJson() {}

    /**
     * Writes one JSON object, without a line end.
     *
     * @param check the outcome
     * @param out where to write
     */
    public static void write(LinkCheck check, PrintStream out) {
        out.print(JsonText.of(Map.of("scenario", check.prediction().scenario().name())));
    }
}

package binspan.planner.report;

import binspan.planner.io.JsonText;
import binspan.scenario.Scenario;
import java.io.PrintStream;
import java.util.Map;

/** The outcome of a check as JSON. */
public final class ResultJson {
    private ResultJson() {}

    /**
     * Writes one JSON object, without a line end.
     *
     * @param scenario what was checked
     * @param check its outcome
     * @param out where to write
     */
    public static void write(Scenario scenario, LinkCheck check, PrintStream out) {
        out.print(JsonText.of(Map.of("scenario", scenario.name())));
    }
}

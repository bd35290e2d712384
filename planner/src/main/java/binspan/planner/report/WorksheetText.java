package binspan.planner.report;

import binspan.scenario.Scenario;
import java.io.PrintStream;

/** The outcome of a check with its intermediate results. */
public final class WorksheetText {
    private WorksheetText() {}

    /**
     * Prints the worksheet.
     *
     * @param scenario what was checked
     * @param check its outcome
     * @param out where to print
     */
    public static void print(Scenario scenario, LinkCheck check, PrintStream out) {
        out.println(scenario.name());
    }
}

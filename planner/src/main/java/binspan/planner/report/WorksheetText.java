package binspan.planner.report;

import binspan.prediction.LinkCheck;
import java.io.PrintStream;

/** The outcome of a check with its intermediate results. */
public final class WorksheetText {
    private WorksheetText() {}

    /**
     * Prints the worksheet.
     *
     * @param check the outcome
     * @param out where to print
     */
    public static void print(LinkCheck check, PrintStream out) {
        out.println(check.prediction().scenario().name());
    }
}

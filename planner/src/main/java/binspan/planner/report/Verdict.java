package binspan.planner.report;

import binspan.prediction.LinkCheck;
import java.io.PrintStream;

/** The outcome of a check in words. */
public final class Verdict {
    private Verdict() {}

    /**
     * Prints the verdict.
     *
     * @param check the outcome
     * @param out where to print
     * @param colour whether to use colours
     */
    public static void print(LinkCheck check, PrintStream out, boolean colour) {
        out.println(check.prediction().scenario().name());
    }
}

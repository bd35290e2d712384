package binspan.planner.report;

import binspan.scenario.Scenario;
import java.io.PrintStream;

/** The outcome of a check in words. */
public final class Verdict {
    private Verdict() {}

    /**
     * Prints the verdict.
     *
     * @param scenario what was checked
     * @param check its outcome
     * @param out where to print
     * @param colour whether to use colours
     */
    public static void print(Scenario scenario, LinkCheck check, PrintStream out, boolean colour) {
        out.println(scenario.name());
    }
}

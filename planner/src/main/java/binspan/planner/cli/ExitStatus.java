package binspan.planner.cli;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.table.TableException;
import java.io.PrintStream;

/** Exit statuses, and the one place where an exception becomes one. */
final class ExitStatus {
    /** All requirements met. */
    static final int MET = 0;

    /** Some requirement not met. */
    static final int UNMET = 1;

    /** Bad input or usage. */
    static final int REFUSED = 2;

    /** The program's own failure. */
    static final int FAILED = 3;

    private ExitStatus() {}

    /**
     * Says what went wrong, without names of the program's insides.
     *
     * @param failure what was thrown
     * @param console where to say it
     * @return exit status
     */
    static int of(Throwable failure, Console console) {
        PrintStream err = console.err();
        console.out().flush();
        if (failure instanceof InvalidScenarioException invalid) {
            for (String line : invalid.lines()) {
                err.println(line);
            }
            return REFUSED;
        }
        if (failure instanceof OutputFileException
                || failure instanceof UsageException
                || failure instanceof TableException) {
            err.println("binspan: " + failure.getMessage());
            return REFUSED;
        }
        return failed(failure, console);
    }

    /** Says that standard output could not be written. */
    static int unwritten(Console console) {
        console.err().println("binspan: the program failed: standard output cannot be written");
        return FAILED;
    }

    private static int failed(Throwable failure, Console console) {
        String reason =
                failure instanceof OutOfMemoryError ? "not enough memory" : "an error of its own, not of the input";
        console.err().println("binspan: the program failed: " + reason + "; BINSPAN_DEBUG=1 shows where");
        if (console.debug()) {
            failure.printStackTrace(console.err());
        }
        return FAILED;
    }
}

package binspan.planner;

import binspan.planner.cli.Console;
import binspan.planner.cli.Program;

/** Entry point of the command line. */
public final class Main {
    private Main() {}

    /**
     * Runs one command and ends with its exit status: 0 all requirements met, 1 some not met, 2 bad input or usage, 3
     * the program's own failure.
     *
     * @param args words of the command line
     */
    public static void main(String[] args) {
        System.exit(Program.run(args, Console.ofSystem()));
    }
}

package binspan.planner.cli;

/** Runs one command line. */
public final class Program {
    private Program() {}

    /**
     * Runs a command.
     *
     * @param args words of the command line
     * @param console where it reads and writes
     * @return exit status: 0 all requirements met, 1 some not met, 2 bad input or usage, 3 the program's own failure
     */
    public static int run(String[] args, Console console) {
        int status;
        try {
            PlainCheck plain = PlainCheck.of(args);
            status = plain == null ? Commands.run(args, console) : Check.run(plain.files(), plain.form(), console);
        } catch (Throwable e) {
            status = ExitStatus.of(e, console);
        }
        return console.finish() ? status : ExitStatus.unwritten(console);
    }
}

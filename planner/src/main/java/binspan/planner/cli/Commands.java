package binspan.planner.cli;

import java.io.OutputStreamWriter;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Help;
import picocli.CommandLine.HelpCommand;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** All commands and what they share. */
final class Commands {
    private static final int WIDTH = 80;

    private Commands() {}

    /** Runs the command of a command line. */
    static int run(String[] args, Console console) {
        CommandLine line = tree(console);
        line.setOut(writer(console.out()));
        line.setErr(writer(console.err()));
        line.setParameterExceptionHandler((error, words) -> UsageErrors.report(error, words, console));
        line.setExecutionExceptionHandler((error, command, result) -> ExitStatus.of(error, console));
        return line.execute(args);
    }

    private static PrintWriter writer(PrintStream stream) {
        return new PrintWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8), true);
    }

    /** The program with its commands. */
    static CommandLine tree(Console console) {
        CommandLine line = new CommandLine(new Root())
                .addSubcommand(new CheckCommand(console))
                .addSubcommand(new ViewCommand(console))
                .addSubcommand(new SweepCommand(console))
                .addSubcommand(new WindowCommand(console))
                .addSubcommand(new TuneCommand(console))
                .addSubcommand(new ReachCommand(console))
                .addSubcommand(new CompareCommand(console))
                .addSubcommand(new ToleranceCommand(console))
                .addSubcommand(new RoutesCommand(console))
                .addSubcommand(new NewCommand(console))
                .addSubcommand(new ListCommand(console))
                .addSubcommand(new SchemaCommand(console))
                .addSubcommand(new CompletionCommand(console))
                .addSubcommand(new HelpCommand());
        line.setExpandAtFiles(false);
        line.setUsageHelpWidth(WIDTH);
        line.setColorScheme(Help.defaultColorScheme(console.colour() ? Help.Ansi.ON : Help.Ansi.OFF));
        line.getCommandSpec().usageMessage().synopsisSubcommandLabel("COMMAND");
        return line;
    }

    /** The program itself, which only leads to its commands. */
    @Command(
            name = "binspan",
            mixinStandardHelpOptions = true,
            header = "Plans time-bin entanglement links over optical fibre.",
            versionProvider = VersionLine.class,
            footer = {
                "",
                "Examples:",
                "  binspan new pulse-pair --output dam-to-town.json",
                "  binspan check dam-to-town.json",
                "  binspan sweep dam-to-town.json --vary timing.windowWidthPs=100:1500",
                "  binspan list parameters",
                "",
                "binspan COMMAND --help explains a command."
            })
    static final class Root implements Runnable {
        @Spec
        private CommandSpec spec;

        @Override
        public void run() {
            throw new ParameterException(spec.commandLine(), "missing command");
        }
    }
}

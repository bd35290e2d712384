package binspan.planner.cli;

import binspan.planner.export.CheckForm;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The command {@code binspan check}. */
@Command(
        name = "check",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Checks whether links meet their requirements.",
        description = "Reads scenario files, predicts what each link achieves"
                + " and compares it with what the scenario requires.",
        footer = {
            "",
            "Examples:",
            "  binspan check dam-to-town.json",
            "  binspan check --worksheet dam-to-town.json",
            "  binspan check --json *.json > results.json",
            "  binspan new pulse-pair | binspan check -",
            "",
            "Exit status: 0 all requirements met, 1 some not met, 2 bad input or usage,",
            "3 the program's own failure; of several files the worst counts."
        })
final class CheckCommand implements Callable<Integer> {
    static final String JSON = "--json";
    static final String WORKSHEET = "--worksheet";

    private final Console console;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "Scenario file, - for standard input.")
    private List<String> files;

    @ArgGroup
    private Output output;

    /** What to print instead of the verdict. */
    static final class Output {
        @Option(names = JSON, description = "Print the result as JSON, several results as one list.")
        private boolean json;

        @Option(names = WORKSHEET, description = "Print the worksheet: every intermediate result.")
        private boolean worksheet;
    }

    CheckCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        return Check.run(files, form(), console);
    }

    private CheckForm form() {
        if (output != null && output.json) {
            return CheckForm.JSON;
        }
        return output != null && output.worksheet ? CheckForm.WORKSHEET : CheckForm.VERDICT;
    }
}

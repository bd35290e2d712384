package binspan.planner.cli;

import binspan.planner.export.CompareReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.comparison.Comparison;
import binspan.study.comparison.LinkOption;
import binspan.study.tuning.Objective;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Function;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The command {@code binspan compare}. */
@Command(
        name = "compare",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Ranks links: with other detectors, fibres or elements.",
        customSynopsis = {
            "binspan compare FILE --detectors CLASS[/CLASS],...",
            "                       | --fibres CLASS,... | --without LABEL",
            "                       [--for OBJECTIVE] [--as-written]",
            "                       [--csv FILE] [--json FILE] [--plot FILE] [--force]",
            "       binspan compare FILE FILE... [--for OBJECTIVE] ..."
        },
        description = {
            "Puts links side by side, each tuned for itself (mean pairs, window,",
            "compensators), and ranks them: those that meet all requirements first.",
            "CLASS/CLASS gives alice and bob different detectors. Avalanche detectors are",
            "tried at every operating point of their class."
        },
        footer = {
            "",
            "Examples:",
            "  binspan compare dam-to-town.json --detectors snspd,ingaas-free-running",
            "  binspan compare dam-to-town.json --detectors snspd,snspd/ingaas-free-running",
            "  binspan compare dam-to-town.json --fibres G.652.D,G.654.E",
            "  binspan compare dam-to-town.json --without \"receive filter\"",
            "  binspan compare valley.json ridge.json --plot both.png",
            "",
            "Exit status: 0 some link meets all requirements, 1 none does, 2 bad input or",
            "usage, 3 the program's own failure."
        })
final class CompareCommand implements Callable<Integer> {
    private final Console console;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "Scenario file, - for standard input.")
    private List<String> files;

    @Mixin
    private CompareOptions options;

    @Mixin
    private ObjectiveOption objective;

    @Option(names = "--as-written", description = "Keep the settings as written; tune nothing.")
    private boolean asWritten;

    @Mixin
    private StudyOutput output;

    CompareCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws InvalidScenarioException, UsageException, OutputFileException {
        output.check(files.toArray(String[]::new));
        List<Scenario> scenarios = new ArrayList<>();
        for (String file : files) {
            scenarios.add(ScenarioInput.read(file, console));
        }
        List<LinkOption> links = options.links(files, scenarios);
        Objective wanted = wanted(scenarios);
        Function<Scenario, List<Axis>> free = asWritten ? scenario -> List.of() : DefaultAxes::tuned;
        Comparison comparison = new Comparison(links, free, wanted);
        List<Comparison.Entry> entries;
        try {
            entries = ProgressBar.during(console, comparison::run);
        } catch (IllegalArgumentException e) {
            throw UsageException.of(e.getMessage());
        }
        output.deliver(CompareReport.of(title(scenarios), wanted, entries), console);
        return entries.get(0).meets() ? ExitStatus.MET : ExitStatus.UNMET;
    }

    private Objective wanted(List<Scenario> scenarios) throws UsageException {
        Objective first = objective.of(scenarios.get(0));
        for (Scenario scenario : scenarios) {
            if (objective.of(scenario) != first) {
                throw UsageException.of("not all of these links make a key; say what to compare them for: --for chsh");
            }
        }
        return first;
    }

    private String title(List<Scenario> scenarios) {
        return scenarios.size() == 1 ? scenarios.get(0).name() : scenarios.size() + " links compared";
    }
}

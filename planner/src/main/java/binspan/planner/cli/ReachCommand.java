package binspan.planner.cli;

import binspan.planner.export.ReachReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.WrittenNumber;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Reach;
import binspan.study.tuning.SourcePosition;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code binspan reach}. */
@Command(
        name = "reach",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Tells how far a link reaches.",
        customSynopsis = {
            "binspan reach FILE [--source middle|alice|bob|SHARE]",
            "                     [--free PATH[=FROM:TO]] ... [--for OBJECTIVE]",
            "                     [--as-written]",
            "                     [--csv FILE] [--json FILE] [--plot FILE] [--force]"
        },
        description = {
            "Scales all fibre in proportion and finds the greatest length at which each",
            "requirement still holds, with the settings as written and re-tuned at every",
            "length. Without --free the mean pairs, the window and compensators of a stated",
            "dispersion are re-tuned."
        },
        footer = {
            "",
            "Examples:",
            "  binspan reach dam-to-town.json",
            "  binspan reach dam-to-town.json --source alice --plot reach.png",
            "  binspan reach dam-to-town.json --as-written --csv reach.csv",
            "",
            "Exit status: 0 done, 2 bad input or usage, 3 the program's own failure."
        })
final class ReachCommand implements Callable<Integer> {
    private final Console console;

    @Mixin
    private ScenarioInput input;

    @Option(
            names = "--source",
            paramLabel = "PLACE",
            description =
                    "Where the source stands: middle, alice, bob, or alice's share of the fibre from 0 to 1; as in"
                            + " the scenario if not given.")
    private String source;

    @Mixin
    private FreeOptions free;

    @Mixin
    private ObjectiveOption objective;

    @Option(names = "--as-written", description = "Keep the settings as written; tune nothing.")
    private boolean asWritten;

    @Mixin
    private StudyOutput output;

    ReachCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws InvalidScenarioException, UsageException, OutputFileException {
        output.check(input.file());
        Scenario scenario = placed(input.read(console));
        if (asWritten && free.given()) {
            throw UsageException.of("--as-written: tunes nothing, and --free names what to tune; give one of them");
        }
        Objective wanted = objective.of(scenario);
        List<Axis> axes = asWritten ? List.of() : free.axes(scenario);
        List<FigureColumn> columns = FigureColumns.all(scenario);
        boolean fibre = new LinkLength().value(scenario).orElse(0.0) > 0.0;
        String blamed = fibre && free.given() ? "--free" : input.file();
        Reach reach = UsageException.unless(blamed, () -> new Reach(scenario, axes, wanted, columns));
        Reach.Outcome outcome = ProgressBar.during(console, reach::run);
        output.deliver(ReachReport.of(reach, outcome), console);
        return ExitStatus.MET;
    }

    private Scenario placed(Scenario scenario) throws UsageException {
        if (source == null) {
            return scenario;
        }
        return UsageException.unless("--source " + source, () -> SourcePosition.moved(scenario, share(source)));
    }

    private static double share(String place) {
        return switch (place) {
            case "middle" -> 0.5;
            case "alice" -> 0.0;
            case "bob" -> 1.0;
            default -> WrittenNumber.of(place);
        };
    }
}

package binspan.planner.cli;

import binspan.planner.export.TuneReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Tuning;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** The command {@code binspan tune}. */
@Command(
        name = "tune",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Finds the best settings of a link under its requirements.",
        customSynopsis = {
            "binspan tune FILE [--free PATH[=FROM:TO]] ... [--for OBJECTIVE]",
            "                    [--csv FILE] [--json FILE] [--plot FILE] [--force]"
        },
        description = {
            "Sets the free parameters so that the objective is as large as it can be while",
            "all requirements of the scenario hold. Without --free these are the mean pairs,",
            "the window and compensators of a stated dispersion."
        },
        footer = {
            "",
            "Examples:",
            "  binspan tune dam-to-town.json",
            "  binspan tune dam-to-town.json --free source.meanPairsPerCycle \\",
            "      --free timing.windowWidthPs=100:1000 --free imbalanceNs --for visibility",
            "  binspan tune dam-to-town.json --for margin --plot best.png",
            "",
            "The table has two rows: the settings as written and the best ones.",
            "Exit status: 0 done, 2 bad input or no settings meet the requirements,",
            "3 the program's own failure."
        })
final class TuneCommand implements Callable<Integer> {
    private final Console console;

    @Mixin
    private ScenarioInput input;

    @Mixin
    private FreeOptions free;

    @Mixin
    private ObjectiveOption objective;

    @Mixin
    private StudyOutput output;

    TuneCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws InvalidScenarioException, UsageException, OutputFileException {
        output.check(input.file());
        Scenario scenario = input.read(console);
        Objective wanted = objective.of(scenario);
        List<Axis> axes = free.axes(scenario);
        Tuning tuning = UsageException.unless("--free", () -> Tuning.of(scenario, axes, wanted));
        Tuning.Outcome outcome = ProgressBar.during(console, tuning::run);
        if (!outcome.feasible()) {
            throw UsageException.of(TuneReport.infeasible(tuning, outcome));
        }
        output.deliver(TuneReport.of(tuning, outcome), console);
        return ExitStatus.MET;
    }
}

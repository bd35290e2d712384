package binspan.planner.cli;

import binspan.planner.export.StudyDefaults;
import binspan.planner.export.ToleranceReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.tolerance.ParameterSpread;
import binspan.study.tolerance.Tolerance;
import binspan.study.tolerance.ToleranceResult;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code binspan tolerance}. */
@Command(
        name = "tolerance",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Tells how surely the built link meets its requirements.",
        customSynopsis = {
            "binspan tolerance FILE [--spread PATH=SHAPE:WIDTH[%%]] ...",
            "                         [--samples N] [--seed N] [--show NAME,...]",
            "                         [--csv FILE] [--json FILE] [--plot FILE] [--force]"
        },
        description = {
            "Draws builds of the link from the spreads of its parameters: those of the",
            "scenario's spread section, and those given here, which replace them. SHAPE is",
            "normal (WIDTH its standard deviation), uniform or triangular (half widths), in",
            "the parameter's unit or in per cent of the planned value. Values that the",
            "parameter does not allow are cut off. The table holds every build."
        },
        footer = {
            "",
            "Examples:",
            "  binspan tolerance dam-to-town.json",
            "  binspan tolerance dam-to-town.json \\",
            "      --spread both.detectors.efficiency=normal:5%% \\",
            "      --spread timing.cableTemperatureStepK=uniform:0.5 --samples 65536",
            "  binspan tolerance dam-to-town.json --csv builds.csv --plot tolerance.png",
            "",
            "The same seed gives the same builds. Exit status: 0 done, 2 bad input or usage,",
            "3 the program's own failure."
        })
final class ToleranceCommand implements Callable<Integer> {
    private static final String SPREAD = "--spread";

    private final Console console;

    @Mixin
    private ScenarioInput input;

    @Mixin
    private SpreadOptions spreads;

    @Option(
            names = "--samples",
            paramLabel = "N",
            defaultValue = "" + StudyDefaults.SAMPLES,
            description = "Number of builds, best a power of two; ${DEFAULT-VALUE} if not given.")
    private int samples;

    @Option(
            names = "--seed",
            paramLabel = "N",
            defaultValue = "" + StudyDefaults.SEED,
            description = "Seed of the random shift of the sample points; ${DEFAULT-VALUE} if not given.")
    private long seed;

    @Option(
            names = "--show",
            split = ",",
            paramLabel = "NAME",
            description = "Figures of merit to tabulate, by name or group; all of them if not given.")
    private List<String> show = List.of();

    @Mixin
    private StudyOutput output;

    ToleranceCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws InvalidScenarioException, UsageException, OutputFileException {
        output.check(input.file());
        Scenario scenario = input.read(console);
        Map<String, Spread> more = spreads.spreads(scenario);
        List<FigureColumn> columns = show.isEmpty()
                ? FigureColumns.all(scenario)
                : UsageException.unless("--show", () -> FigureColumns.named(scenario, show));
        if (samples < Tolerance.FEWEST_SAMPLES || samples > Tolerance.MOST_SAMPLES) {
            throw UsageException.of(
                    "--samples " + samples + ": allowed " + Tolerance.FEWEST_SAMPLES + " to " + Tolerance.MOST_SAMPLES);
        }
        Tolerance tolerance = UsageException.unless(
                SPREAD, () -> new Tolerance(scenario, ParameterSpread.of(scenario, more), samples, seed, columns));
        ToleranceResult result = ProgressBar.during(console, tolerance::run);
        output.deliver(ToleranceReport.of(result), console);
        return ExitStatus.MET;
    }
}

package binspan.planner.cli;

import binspan.planner.export.StudyDefaults;
import binspan.planner.export.SweepReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.picture.SweepPicture;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code binspan sweep}. */
@Command(
        name = "sweep",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Tabulates what a link achieves while parameters vary.",
        customSynopsis = {
            "binspan sweep FILE --vary PATH=FROM:TO[:STEPS][:log] [--vary ...]",
            "                     [--show NAME,...] [--csv FILE] [--json FILE] [--plot FILE]",
            "                     [--force]"
        },
        description = {
            "Varies one to four parameters of a scenario, each by its path, and predicts the",
            "figures of merit at every point. A path that begins with both. moves alice and",
            "bob together; link.lengthKm scales all fibre."
        },
        footer = {
            "",
            "Without STEPS there are 201 values of one parameter, 101 of each of two, 21 of",
            "three, 11 of four.",
            "",
            "Examples:",
            "  binspan sweep dam-to-town.json --vary timing.windowWidthPs=100:1500",
            "  binspan sweep dam-to-town.json --vary source.meanPairsPerCycle=1e-3:0.1:log \\",
            "      --vary link.lengthKm=10:150:41 --show key,visibility.raw --csv map.csv",
            "  binspan sweep dam-to-town.json --vary imbalanceNs=0.5:5 --json - | less",
            "",
            "Exit status: 0 done, 2 bad input or usage, 3 the program's own failure."
        })
final class SweepCommand implements Callable<Integer> {
    private final Console console;

    @Mixin
    private ScenarioInput input;

    @Mixin
    private VaryOptions vary;

    @Option(
            names = "--show",
            split = ",",
            paramLabel = "NAME",
            description = "Figures of merit to tabulate, by name (visibility.raw) or group (key); all of them if"
                    + " not given.")
    private List<String> show = List.of();

    @Mixin
    private StudyOutput output;

    SweepCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws InvalidScenarioException, UsageException, OutputFileException {
        output.check(input.file());
        Scenario scenario = input.read(console);
        List<Axis> axes = vary.grid(scenario, StudyDefaults.SWEEP_STEPS);
        if (axes.size() > SweepPicture.MOST_AXES) {
            output.refusePicture("a picture shows one or two varied parameters");
        }
        List<FigureColumn> asked = asked(scenario);
        Sweep sweep = UsageException.unless("--vary", () -> new Sweep(scenario, axes, computed(scenario, asked)));
        StudyTable table = ProgressBar.during(console, sweep::run);
        output.deliver(SweepReport.of(sweep, table, asked), console);
        return ExitStatus.MET;
    }

    private List<FigureColumn> asked(Scenario scenario) throws UsageException {
        return show.isEmpty()
                ? List.of()
                : UsageException.unless("--show " + String.join(",", show), () -> FigureColumns.named(scenario, show));
    }

    /** The figures to show and, where one is printed, those that the summary speaks of. */
    private List<FigureColumn> computed(Scenario scenario, List<FigureColumn> asked) {
        return output.summarised() || asked.isEmpty() ? SweepReport.computed(scenario, asked) : asked;
    }
}

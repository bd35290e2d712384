package binspan.planner.cli;

import binspan.planner.export.BoxReport;
import binspan.planner.export.RegionReport;
import binspan.planner.export.StudyReport;
import binspan.planner.export.WindowReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.report.MissWords;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.box.OperatingBox;
import binspan.study.box.ToleranceBox;
import binspan.study.region.OperatingRegion;
import binspan.study.region.RegionMap;
import binspan.study.window.OperatingIntervals;
import binspan.study.window.OperatingWindow;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code binspan window}. */
@Command(
        name = "window",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Finds operating windows: where all requirements hold.",
        customSynopsis = {
            "binspan window FILE --vary PATH=FROM:TO[:STEPS][:log] [--vary ...]",
            "                      [--box [--equal-tolerance] [--centred]]",
            "                      [--csv FILE] [--json FILE] [--plot FILE] [--force]"
        },
        description = {
            "For one parameter: every interval in which all requirements hold, its ends",
            "solved, and which requirement ends it. For two: the region, with a contour for",
            "each requirement and its area. With --box, for up to six: the largest box inside",
            "which every point meets all requirements, for a specification."
        },
        footer = {
            "",
            "Examples:",
            "  binspan window dam-to-town.json --vary imbalanceNs=0.1:50:log",
            "  binspan window dam-to-town.json --vary source.meanPairsPerCycle=1e-3:0.2:log \\",
            "      --vary timing.windowWidthPs=50:1500 --plot map.png",
            "  binspan window dam-to-town.json --box --equal-tolerance \\",
            "      --vary source.meanPairsPerCycle=0.01:0.1 --vary both.clockJitterRmsPs=1:50",
            "",
            "Exit status: 0 found, 2 bad input or no point meets all requirements, 3 the",
            "program's own failure."
        })
final class WindowCommand implements Callable<Integer> {
    private static final int SCAN = OperatingWindow.FEWEST_SAMPLES;
    private static final int MAP = OperatingRegion.USUAL_STEPS;

    private final Console console;

    @Mixin
    private ScenarioInput input;

    @Mixin
    private VaryOptions vary;

    @Option(names = "--box", description = "Find the largest box, each side counted as a share of its range.")
    private boolean box;

    @Option(names = "--equal-tolerance", description = "With --box: the same relative tolerance for all parameters.")
    private boolean equalTolerance;

    @Option(names = "--centred", description = "With --box: hold it at the planned values.")
    private boolean centred;

    @Mixin
    private StudyOutput output;

    WindowCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws InvalidScenarioException, UsageException, OutputFileException {
        if (!box && (equalTolerance || centred)) {
            throw UsageException.of(
                    (equalTolerance ? "--equal-tolerance" : "--centred") + ": goes with --box, which is missing");
        }
        output.check(input.file());
        Scenario scenario = input.read(console);
        List<Axis> axes = box ? vary.steady(scenario, MAP, MAP, MAP, MAP, MAP, MAP) : vary.steady(scenario, SCAN, MAP);
        output.deliver(
                box ? box(scenario, axes) : axes.size() == 1 ? line(scenario, axes) : map(scenario, axes), console);
        return ExitStatus.MET;
    }

    private StudyReport line(Scenario scenario, List<Axis> axes) throws UsageException {
        OperatingWindow window = UsageException.unless("--vary", () -> new OperatingWindow(scenario, axes.get(0)));
        OperatingIntervals found = ProgressBar.during(console, window::run);
        if (found.windows().isEmpty()) {
            throw UsageException.of(MissWords.nowhere(axes, found.nearest().orElseThrow()));
        }
        return WindowReport.of(scenario, found);
    }

    private StudyReport map(Scenario scenario, List<Axis> axes) throws UsageException {
        OperatingRegion region =
                UsageException.unless("--vary", () -> new OperatingRegion(scenario, axes.get(0), axes.get(1)));
        RegionMap map = ProgressBar.during(console, region::run);
        if (map.nearest().isPresent()) {
            throw UsageException.of(MissWords.nowhere(axes, map.nearest().get()));
        }
        return RegionReport.of(scenario, map);
    }

    private StudyReport box(Scenario scenario, List<Axis> axes) throws UsageException {
        ToleranceBox.Sense sense = equalTolerance ? ToleranceBox.Sense.TOLERANCE : ToleranceBox.Sense.SHARE;
        ToleranceBox question = UsageException.unless(
                "--vary", () -> new ToleranceBox(scenario, axes, sense, centred, ToleranceBox.USUAL_SEED));
        OperatingBox found = ProgressBar.during(console, question::run);
        if (!found.found()) {
            throw UsageException.of(MissWords.nowhere(axes, found.nearest().orElseThrow()));
        }
        return BoxReport.of(scenario, found);
    }
}

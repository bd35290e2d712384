package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.export.BoxReport;
import binspan.planner.export.CheckForm;
import binspan.planner.export.CompareReport;
import binspan.planner.export.ReachReport;
import binspan.planner.export.RegionReport;
import binspan.planner.export.StudyDefaults;
import binspan.planner.export.StudyFiles;
import binspan.planner.export.StudyReport;
import binspan.planner.export.SweepReport;
import binspan.planner.export.ToleranceReport;
import binspan.planner.export.TuneReport;
import binspan.planner.export.WindowReport;
import binspan.planner.io.ScenarioReader;
import binspan.planner.report.TextStyle;
import binspan.prediction.LinkCheck;
import binspan.scenario.DetectorClass;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.Execution;
import binspan.study.FigureColumns;
import binspan.study.Sweep;
import binspan.study.box.ToleranceBox;
import binspan.study.comparison.Comparison;
import binspan.study.comparison.LinkOptions;
import binspan.study.region.OperatingRegion;
import binspan.study.tolerance.Tolerance;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Reach;
import binspan.study.tuning.Tuning;
import binspan.study.window.OperatingWindow;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is made without the command line against what the command prints for the same study. */
final class ExportedStudiesTest {
    private static final String FILE =
            Path.of("..", "scenarios", "kestrel-dam-to-millbrook.json").toString();

    @TempDir
    private Path directory;

    private final Scenario scenario = scenario();

    private static Scenario scenario() {
        try {
            return ScenarioReader.read(FILE);
        } catch (Exception e) {
            throw new IllegalStateException(e);
        }
    }

    private Axis axis(String path, double from, double to, int steps) {
        return new Axis(ParameterPaths.find(scenario, path), from, to, steps, false);
    }

    private static void same(StudyReport report, String... command) {
        assertThat(StudyFiles.csvText(report)).isNotEmpty().isEqualTo(printed("--csv", command));
        assertThat(StudyFiles.jsonText(report)).isNotEmpty().isEqualTo(printed("--json", command));
        String summary = Run.of(command).out();
        assertThat(summary)
                .startsWith(report.summary().apply(TextStyle.ofStandardOutput(false)))
                .contains("writes the table");
    }

    private static String printed(String form, String... command) {
        List<String> words = new ArrayList<>(Arrays.asList(command));
        words.addAll(List.of(form, "-"));
        return Run.of(words.toArray(String[]::new)).out();
    }

    @Test
    void window() {
        Axis axis = axis("timing.windowWidthPs", 100.0, 1500.0, OperatingWindow.FEWEST_SAMPLES);
        StudyReport report = WindowReport.of(scenario, new OperatingWindow(scenario, axis).run(Execution.SINGLE));
        same(report, "window", FILE, "--vary", "timing.windowWidthPs=100:1500");
    }

    @Test
    void region() {
        Axis pairs = axis("source.meanPairsPerCycle", 0.01, 0.1, 9);
        Axis window = axis("timing.windowWidthPs", 100.0, 1500.0, 9);
        StudyReport report =
                RegionReport.of(scenario, new OperatingRegion(scenario, pairs, window).run(Execution.SINGLE));
        String[] command = {
            "window", FILE, "--vary", "source.meanPairsPerCycle=0.01:0.1:9", "--vary", "timing.windowWidthPs=100:1500:9"
        };
        same(report, command);
    }

    @Test
    void box() {
        List<Axis> axes =
                List.of(axis("source.meanPairsPerCycle", 0.01, 0.1, 2), axis("both.clockJitterRmsPs", 1.0, 50.0, 2));
        ToleranceBox box = new ToleranceBox(scenario, axes, ToleranceBox.Sense.SHARE, false, ToleranceBox.USUAL_SEED);
        String[] command = {
            "window",
            FILE,
            "--box",
            "--vary",
            "source.meanPairsPerCycle=0.01:0.1",
            "--vary",
            "both.clockJitterRmsPs=1:50"
        };
        same(BoxReport.of(scenario, box.run(Execution.SINGLE)), command);
    }

    @Test
    void sweep() {
        List<Axis> axes = List.of(axis("timing.windowWidthPs", 100.0, 1500.0, 5));
        Sweep sweep = new Sweep(scenario, axes, SweepReport.computed(scenario, List.of()));
        StudyReport report = SweepReport.of(sweep, sweep.run(Execution.SINGLE), List.of());
        same(report, "sweep", FILE, "--vary", "timing.windowWidthPs=100:1500:5");
    }

    @Test
    void tuning() {
        Tuning tuning = Tuning.of(scenario, DefaultAxes.tuned(scenario), StudyDefaults.objective(scenario));
        same(TuneReport.of(tuning, tuning.run(Execution.SINGLE)), "tune", FILE);
    }

    @Test
    void reachAsWritten() {
        Reach reach = new Reach(scenario, List.of(), Objective.KEY, FigureColumns.all(scenario));
        same(ReachReport.of(reach, reach.run(Execution.SINGLE)), "reach", FILE, "--as-written");
    }

    @Test
    void comparison() {
        Comparison comparison = new Comparison(
                List.of(LinkOptions.detectors(scenario, DetectorClass.SNSPD, DetectorClass.SNSPD)),
                link -> List.of(),
                Objective.KEY);
        StudyReport report = CompareReport.of(scenario.name(), Objective.KEY, comparison.run(Execution.SINGLE));
        same(report, "compare", FILE, "--detectors", "snspd", "--as-written");
    }

    @Test
    void tolerance() {
        Tolerance usual = StudyDefaults.tolerance(scenario);
        Tolerance few = new Tolerance(scenario, usual.spreads(), 64, usual.seed(), usual.columns());
        same(ToleranceReport.of(few.run(Execution.SINGLE)), "tolerance", FILE, "--samples", "64");
    }

    @Test
    void checks() throws Exception {
        LinkCheck check = LinkCheck.of(scenario);
        assertThat(CheckForm.VERDICT.text(check, TextStyle.ofStandardOutput(false)))
                .isEqualTo(Run.of("check", FILE).out());
        assertThat(CheckForm.JSON.plain(check))
                .isEqualTo(Run.of("check", "--json", FILE).out());
        assertThat(CheckForm.WORKSHEET.text(check, TextStyle.ofStandardOutput(false)))
                .isEqualTo(Run.of("check", "--worksheet", FILE).out());
        Path file = directory.resolve("worksheet.txt");
        CheckForm.WORKSHEET.write(check, file.toString(), false);
        assertThat(Files.readString(file)).isEqualTo(CheckForm.WORKSHEET.plain(check));
    }
}

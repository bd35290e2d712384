package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.Change;
import binspan.planner.export.StudyFiles;
import binspan.planner.export.WindowReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.viewmodel.StudyRun.State;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.ParameterPaths;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.SpreadShape;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.Execution;
import binspan.study.window.OperatingWindow;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Options of the studies: what they refuse, how they follow the link, what they take over into it. */
final class StudyOptionsModelTest {
    private static final String WINDOW = "timing.windowWidthPs";

    private final Design design = Designs.of(shipped("kestrel-dam-to-millbrook"));

    private static Scenario shipped(String name) {
        try {
            return ScenarioReader.read("../scenarios/" + name + ".json");
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }

    private void window(double ps) {
        design.change("window", null, scenario -> with(scenario, ps));
    }

    private static Scenario with(Scenario scenario, double windowPs) {
        return ParameterPaths.find(scenario, WINDOW).with(scenario, windowPs);
    }

    @Test
    void wrongPlacesOfTheSourceAreRefusedInTheWordsOfTheCommandLine() {
        ReachModel reach = new ReachModel(design, Background.NONE);
        assertThat(reach.problemProperty().get()).isEmpty();
        reach.placeProperty().set(ReachModel.Place.SHARE);
        reach.shareProperty().set("1.5");
        assertThat(reach.problemProperty().get())
                .isEqualTo("source position: found 1.5; allowed 0 (at alice) to 1 (at bob)");
        reach.shareProperty().set("half");
        assertThat(reach.problemProperty().get()).isEqualTo("found \"half\"; allowed a number such as 0.02 or 2e-2");
        reach.start();
        assertThat(reach.run().stateProperty().get()).isEqualTo(State.IDLE);
    }

    @Test
    void rangesFollowThePlannedValueUntilOneIsWritten() {
        TuneModel tune = new TuneModel(design, Background.NONE);
        WrittenAxis window = tune.free().axes().get(1);
        assertThat(window.pathProperty().get()).isEqualTo(WINDOW);
        assertThat(window.fromProperty().get()).isEqualTo("20");
        window(500.0);
        assertThat(window.fromProperty().get()).isEqualTo("25");
        window.fromProperty().set("100");
        window(400.0);
        assertThat(window.fromProperty().get()).isEqualTo("100");
    }

    @Test
    void aRangeThatFallsIsRefused() {
        TuneModel tune = new TuneModel(design, Background.NONE);
        tune.free().axes().get(1).fromProperty().set("3000");
        assertThat(tune.problemProperty().get()).isEqualTo(WINDOW + ": found 3000 to 2000; allowed a range that rises");
    }

    @Test
    void nothingToTuneIsRefused() {
        TuneModel tune = new TuneModel(design, Background.NONE);
        tune.free().axes().forEach(axis -> axis.usedProperty().set(false));
        assertThat(tune.problemProperty().get()).isEqualTo("found 0 free parameters; allowed 1 to 12");
        tune.free().add(WINDOW);
        assertThat(tune.problemProperty().get()).isEmpty();
        assertThat(tune.free().axes()).hasSize(2);
    }

    @Test
    void tunedSettingsBecomeTheLinkInOneChange() {
        TuneModel tune = new TuneModel(design, Background.NONE);
        tune.free().axes().get(0).usedProperty().set(false);
        tune.start();
        assertThat(tune.run().failureProperty().get()).isEmpty();
        TuneModel.Tuned tuned = tune.run().resultProperty().get().found();
        assertThat(tuned.steps())
                .singleElement()
                .asString()
                .startsWith("window width 400 → ")
                .endsWith(" ps");
        assertThat(tune.apply()).isTrue();
        assertThat(ParameterPaths.find(design.scenario(), WINDOW)
                        .value(design.scenario())
                        .orElseThrow())
                .isEqualTo(tuned.outcome().values().get(0));
        assertThat(tune.run().staleProperty().get()).isTrue();
        assertThat(tune.apply()).isFalse();
    }

    @Test
    void spreadsOfTheLinkAndOfThisStudyStandInOneList() {
        ToleranceModel tolerance = new ToleranceModel(design, Background.NONE);
        int own = design.scenario().spread().size();
        assertThat(tolerance.rows()).hasSize(own).noneMatch(ToleranceModel.Row::added);
        assertThat(tolerance.add(WINDOW, SpreadShape.UNIFORM, "5 %")).isTrue();
        assertThat(tolerance.rows()).hasSize(own + 1);
        ToleranceModel.Row added = tolerance.rows().get(own);
        assertThat(added.added()).isTrue();
        assertThat(added.spread().spread().width()).isEqualTo(0.05);
        assertThat(added.spread().spread().relative()).isTrue();
        tolerance.remove(added);
        assertThat(tolerance.rows()).hasSize(own);
    }

    @Test
    void spreadsThatMeanNothingAreRefused() {
        ToleranceModel tolerance = new ToleranceModel(design, Background.NONE);
        assertThat(tolerance.add("timing.windowWidth", SpreadShape.NORMAL, "5")).isFalse();
        assertThat(tolerance.refusalProperty().get()).contains("did you mean windowWidthPs?");
        assertThat(tolerance.add(WINDOW, SpreadShape.NORMAL, "wide")).isFalse();
        assertThat(tolerance.refusalProperty().get()).contains("found \"wide\"");
        assertThat(tolerance.add(WINDOW, SpreadShape.NORMAL, "0")).isFalse();
        assertThat(tolerance.refusalProperty().get()).contains("allowed above 0");
    }

    @Test
    void aLinkWithoutSpreadsSaysWhatToDo() {
        ToleranceModel tolerance = new ToleranceModel(unspread(), Background.NONE);
        assertThat(tolerance.rows()).isEmpty();
        assertThat(tolerance.problemProperty().get())
                .contains("state them in the scenario's spread section or add one");
        tolerance.add(WINDOW, SpreadShape.UNIFORM, "10");
        assertThat(tolerance.problemProperty().get()).isEmpty();
    }

    @Test
    void aSeedIsAWholeNumber() {
        ToleranceModel tolerance = new ToleranceModel(design, Background.NONE);
        tolerance.seedProperty().set("one");
        assertThat(tolerance.problemProperty().get()).isEqualTo("seed: found \"one\"; allowed a whole number");
    }

    @Test
    void gatedDetectorsNeedSlots() {
        Scenario continuous = List.of(
                        "eagle-tarn-to-saltmarsh",
                        "fernhill-shared-trunk",
                        "harrow-ridge-overhead-line",
                        "orchard-lane-access",
                        "stonebridge-to-lower-weir")
                .stream()
                .map(StudyOptionsModelTest::shipped)
                .filter(each -> each.source().pump().mode() == PumpMode.CONTINUOUS)
                .findFirst()
                .orElseThrow();
        DetectorsModel detectors = new DetectorsModel(Designs.of(continuous), Background.NONE);
        assertThat(detectors.problemProperty().get()).isEmpty();
        detectors.detectorClasses().add(DetectorClass.INGAAS_GATED);
        assertThat(detectors.problemProperty().get()).contains("has no slots to gate");
    }

    @Test
    void classesMixAndAChosenLinkIsTakenOver() {
        DetectorsModel detectors = new DetectorsModel(design, Background.NONE);
        detectors.retunedProperty().set(false);
        detectors.mixedProperty().set(true);
        detectors.start();
        var entries = detectors.run().resultProperty().get().found();
        assertThat(entries.stream().map(entry -> entry.option().name()))
                .containsExactlyInAnyOrder(
                        "as written",
                        "snspd",
                        "ingaas-free-running",
                        "snspd/ingaas-free-running",
                        "ingaas-free-running/snspd");
        var mixed = entries.stream()
                .filter(entry -> entry.option().name().equals("snspd/ingaas-free-running"))
                .findFirst()
                .orElseThrow();
        assertThat(detectors.apply(mixed)).isTrue();
        assertThat(design.scenario().alice().detectors().get(0).detectorClass()).contains(DetectorClass.SNSPD);
        assertThat(design.scenario().bob().detectors().get(0).detectorClass())
                .contains(DetectorClass.INGAAS_FREE_RUNNING);
        assertThat(detectors.apply(mixed)).isFalse();
    }

    @Test
    void nothingToCompareIsRefused() {
        DetectorsModel detectors = new DetectorsModel(design, Background.NONE);
        detectors.kindProperty().set(DetectorsModel.Kind.FIBRES);
        detectors.presentProperty().set(false);
        detectors.fibreClasses().clear();
        assertThat(detectors.problemProperty().get()).isEqualTo("nothing to compare; choose one");
        detectors.fibreClasses().add(FibreClass.G652D);
        assertThat(detectors.problemProperty().get()).isEmpty();
    }

    @Test
    void twoParametersMakeAGridAndMayNotBeTheSame() {
        SweepModel sweep = new SweepModel(design, Background.NONE);
        sweep.second().usedProperty().set(true);
        sweep.first().stepsProperty().set("3");
        sweep.second().stepsProperty().set("4");
        sweep.start();
        assertThat(StudyFiles.csvText(sweep.run().resultProperty().get().report())
                        .lines())
                .hasSize(13);
        sweep.second().pathProperty().set(WINDOW);
        assertThat(sweep.problemProperty().get()).isEqualTo(WINDOW + ": found twice; allowed once");
    }

    /** Against the study itself, as the command line runs it. */
    @Test
    void windowsOfTheFirstParameterAreThoseOfTheCommandLine() {
        SweepModel sweep = new SweepModel(design, Background.NONE);
        sweep.second().usedProperty().set(true);
        sweep.kindProperty().set(SweepModel.Kind.WINDOW);
        sweep.start();
        assertThat(sweep.run().failureProperty().get()).isEmpty();
        Scenario link = design.scenario();
        Axis usual = DefaultAxes.of(link, ParameterPaths.find(link, WINDOW));
        Axis axis = new Axis(
                usual.parameter(), usual.from(), usual.to(), OperatingWindow.FEWEST_SAMPLES, usual.logarithmic());
        assertThat(StudyFiles.csvText(sweep.run().resultProperty().get().report()))
                .isEqualTo(StudyFiles.csvText(
                        WindowReport.of(link, new OperatingWindow(link, axis).run(Execution.SINGLE))));
    }

    @Test
    void aRangeWithoutAWindowSaysHowNearItComes() {
        SweepModel sweep = new SweepModel(design, Background.NONE);
        sweep.kindProperty().set(SweepModel.Kind.WINDOW);
        sweep.first().fromProperty().set("20");
        sweep.first().toProperty().set("40");
        sweep.start();
        assertThat(sweep.run().failureProperty().get())
                .startsWith("nowhere in these ranges do all requirements hold; nearest at " + WINDOW + " 40 ps: the ");
    }

    @Test
    void aLinkWithoutAnElementIsComparedAndTakenOver() {
        DetectorsModel detectors = new DetectorsModel(design, Background.NONE);
        detectors.kindProperty().set(DetectorsModel.Kind.WITHOUT);
        detectors.retunedProperty().set(false);
        detectors.presentProperty().set(false);
        assertThat(detectors.problemProperty().get()).isEqualTo("nothing to compare; choose one");
        String label = DetectorsModel.labels(design.scenario()).get(0);
        int elements = elements(design.scenario());
        detectors.leftOut().add(label);
        detectors.start();
        var entries = detectors.run().resultProperty().get().found();
        assertThat(entries)
                .singleElement()
                .satisfies(entry -> assertThat(entry.option().name()).isEqualTo("without " + label));
        assertThat(detectors.apply(entries.get(0))).isTrue();
        assertThat(elements(design.scenario())).isLessThan(elements);
        assertThat(DetectorsModel.labels(design.scenario())).doesNotContain(label);
    }

    private static int elements(Scenario scenario) {
        return scenario.alice().path().size() + scenario.bob().path().size();
    }

    private static Design unspread() {
        Design unspread = new Design(Designs.shipped("kestrel-dam-to-millbrook"));
        unspread.edit("no spreads", List.of(new Change.Remove("spread")));
        return unspread;
    }
}

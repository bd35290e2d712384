package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.export.StudyFiles;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.Designs;
import binspan.planner.viewmodel.DetectorsModel;
import binspan.planner.viewmodel.ParameterChoices;
import binspan.planner.viewmodel.ReachModel;
import binspan.planner.viewmodel.StudyModel;
import binspan.planner.viewmodel.SweepModel;
import binspan.planner.viewmodel.ToleranceModel;
import binspan.planner.viewmodel.TuneModel;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The studies of the window write the same bytes as those of the command line. */
final class WindowStudiesTest {
    private static final String FILE = "../scenarios/kestrel-dam-to-millbrook.json";

    private final Design design = Designs.of(scenario());

    private static Scenario scenario() {
        try {
            return ScenarioReader.read(FILE);
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }

    private static void same(StudyModel<?> model, String... commandLine) {
        model.start();
        assertThat(model.run().failureProperty().get() + model.problemProperty().get())
                .isEmpty();
        String written = StudyFiles.csvText(model.run().resultProperty().get().report());
        assertThat(written)
                .hasSizeGreaterThan(200)
                .isEqualTo(Run.of(commandLine).out());
    }

    @Test
    void reach() {
        ReachModel model = new ReachModel(design, Background.NONE);
        model.placeProperty().set(ReachModel.Place.ALICE);
        model.retunedProperty().set(false);
        same(model, "reach", FILE, "--source", "alice", "--as-written", "--csv", "-");
    }

    @Test
    void compare() {
        DetectorsModel model = new DetectorsModel(design, Background.NONE);
        model.presentProperty().set(false);
        model.retunedProperty().set(false);
        same(model, "compare", FILE, "--detectors", "snspd,ingaas-free-running", "--as-written", "--csv", "-");
    }

    @Test
    void tolerance() {
        ToleranceModel model = new ToleranceModel(design, Background.NONE);
        model.buildsProperty().set(256);
        model.seedProperty().set("7");
        same(model, "tolerance", FILE, "--samples", "256", "--seed", "7", "--csv", "-");
    }

    @Test
    void sweep() {
        SweepModel model = new SweepModel(design, Background.NONE);
        model.first().fromProperty().set("50");
        model.first().toProperty().set("800");
        model.first().stepsProperty().set("11");
        same(model, "sweep", FILE, "--vary", "timing.windowWidthPs=50:800:11:log", "--csv", "-");
    }

    @Test
    void tune() {
        TuneModel model = new TuneModel(design, Background.NONE);
        model.free().axes().get(0).usedProperty().set(false);
        same(model, "tune", FILE, "--free", "timing.windowWidthPs", "--csv", "-");
    }

    @Test
    void theChoiceOfParametersHasWhatTheCommandLineLists() {
        Scenario scenario = design.scenario();
        List<String> choices = ParameterChoices.of(scenario);
        assertThat(choices)
                .doesNotHaveDuplicates()
                .contains("link.lengthKm", "both.detectors.efficiency", "bob.path.lower duct.lengthKm")
                .noneMatch(path -> path.startsWith("require."))
                .allSatisfy(
                        path -> assertThat(ParameterPaths.find(scenario, path).value(scenario))
                                .isPresent());
        long listed = ParameterCatalogue.entries().stream()
                .filter(entry -> entry.field().kind().numeric() && !entry.path().contains("path."))
                .map(ParameterCatalogue.Entry::path)
                .filter(path -> !path.startsWith("require.") && !path.startsWith("spread.") && leads(scenario, path))
                .filter(path -> !path.equals("formatVersion"))
                .peek(path -> assertThat(choices).contains(path))
                .count();
        assertThat(listed).isGreaterThan(30);
    }

    private static boolean leads(Scenario scenario, String path) {
        try {
            ParameterPaths.find(scenario, path).over(scenario);
            return ParameterPaths.find(scenario, path).value(scenario).isPresent();
        } catch (IllegalArgumentException e) {
            return false;
        }
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;
import static org.testfx.util.WaitForAsyncUtils.waitFor;

import binspan.planner.export.StudyFiles;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.Designs;
import binspan.planner.viewmodel.StudyModel;
import binspan.planner.viewmodel.StudyRun.State;
import binspan.planner.viewmodel.SweepModel;
import binspan.planner.viewmodel.ToleranceModel;
import binspan.scenario.ParameterPaths;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TableView;
import javafx.scene.control.TextArea;
import javafx.scene.control.ToggleButton;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

/** Pages of studies as a person uses them. */
@ExtendWith(ApplicationExtension.class)
final class StudyPageTest {
    private final Look look = new Look();
    private final Background background = Background.of(Platform::runLater);
    private Design design;
    private SweepModel sweep;
    private ToleranceModel tolerance;
    private Stage stage;
    private Path answer;

    @Start
    void start(Stage shown) throws InvalidScenarioException {
        stage = shown;
        design = Designs.of(ScenarioReader.read("../scenarios/kestrel-dam-to-millbrook.json"));
        sweep = new SweepModel(design, background);
        sweep.first().stepsProperty().set("9");
        tolerance = new ToleranceModel(design, background);
        show(pages().sweep(sweep));
    }

    private StudyPages pages() {
        return new StudyPages(look, new FileQuestions(stage, null) {
            @Override
            Optional<Path> toSave(String title, String proposed, String kind, String... endings) {
                return Optional.ofNullable(answer).map(folder -> folder.resolve(proposed));
            }
        });
    }

    private void show(StudyPage page) {
        Scene scene = new Scene(page, 630.0, 520.0);
        look.dress(scene);
        stage.setScene(scene);
        stage.show();
        stage.sizeToScene();
    }

    private <T extends Node> T part(String id, Class<T> type) {
        return type.cast(stage.getScene().lookup("#" + id));
    }

    private static void until(Callable<Boolean> condition) throws TimeoutException {
        waitFor(
                60,
                TimeUnit.SECONDS,
                () -> Shown.onWindowThread(() -> {
                    try {
                        return condition.call();
                    } catch (Exception e) {
                        throw new IllegalStateException(e);
                    }
                }));
    }

    private static void untilDone(StudyModel<?> model) throws TimeoutException {
        until(() -> model.run().stateProperty().get() == State.DONE);
    }

    private void press(KeyCode key) {
        Shown.onWindowThread(() -> {
            Node page = stage.getScene().getRoot();
            page.fireEvent(new KeyEvent(KeyEvent.KEY_PRESSED, "", "", key, false, false, false, false));
            return page;
        });
    }

    private void fire(String menu, String item) {
        Shown.onWindowThread(() -> {
            part(menu, MenuButton.class).getItems().stream()
                    .filter(each -> item.equals(each.getId()))
                    .forEach(MenuItem::fire);
            return item;
        });
    }

    @Test
    void enterRunsAndTheResultIsDrawnTabulatedAndToldInWords() throws TimeoutException {
        press(KeyCode.ENTER);
        untilDone(sweep);
        StudyPicture picture = part("sweep-picture", StudyPicture.class);
        until(() -> picture.image() != null);
        assertThat(picture.image().getWidth()).isBetween(500.0, 630.0);
        TableView<?> table = part("sweep-table", TableView.class);
        until(() -> table.getItems().size() == 9);
        assertThat(part("sweep-summary", TextArea.class).getText())
                .startsWith(design.scenario().name())
                .contains("9 values spaced by equal");
        assertThat(part("sweep-status", Label.class).getText()).startsWith("done in ");
    }

    @Test
    void aChangedLinkMakesTheResultVisiblyStale() throws TimeoutException {
        press(KeyCode.ENTER);
        untilDone(sweep);
        Node banner = part("sweep-stale", Node.class);
        assertThat(banner.isVisible()).isFalse();
        Shown.onWindowThread(() -> design.change(
                "window",
                null,
                s -> ParameterPaths.find(s, "timing.windowWidthPs").with(s, 500.0)));
        assertThat(banner.isVisible()).isTrue();
        assertThat(banner.getAccessibleText()).startsWith("The link has changed");
        Shown.onWindowThread(() -> {
            stage.getScene().getRoot().applyCss();
            return null;
        });
        assertThat(part("sweep-picture", Node.class).getOpacity()).isLessThan(0.6);
    }

    @Test
    void escapeCancelsALongStudyWithinASecondAndTheWindowStaysAlive() throws TimeoutException {
        Shown.onWindowThread(() -> {
            tolerance.buildsProperty().set(65_536);
            show(pages().tolerance(tolerance));
            return null;
        });
        Button run = part("tolerance-run", Button.class);
        Shown.onWindowThread(() -> {
            run.fire();
            return null;
        });
        assertThat(run.getText()).isEqualTo("Cancel");
        long longest = 0;
        for (int i = 0; i < 40; i++) {
            long before = System.nanoTime();
            Shown.onWindowThread(() -> null);
            longest = Math.max(longest, System.nanoTime() - before);
            pause();
        }
        assertThat(longest).isLessThan(1_000_000_000L);
        long before = System.nanoTime();
        press(KeyCode.ESCAPE);
        until(() -> tolerance.run().stateProperty().get() == State.CANCELLED);
        assertThat(System.nanoTime() - before).isLessThan(1_000_000_000L);
        assertThat(run.getText()).isEqualTo("Run");
        assertThat(part("tolerance-status", Label.class).getText()).startsWith("cancelled after");
    }

    private static void pause() {
        try {
            Thread.sleep(10);
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    @Test
    void wrongOptionsAreToldAndCannotRun() {
        Shown.onWindowThread(() -> {
            sweep.first().fromProperty().set("wide");
            return null;
        });
        assertThat(part("sweep-problem", Node.class).isVisible()).isTrue();
        assertThat(part("sweep-run", Button.class).isDisabled()).isTrue();
        press(KeyCode.ENTER);
        assertThat(sweep.run().stateProperty().get()).isEqualTo(State.IDLE);
    }

    @Test
    void exportsWriteWhatTheReportHoldsAndSaySo(@TempDir Path folder) throws TimeoutException, IOException {
        press(KeyCode.ENTER);
        untilDone(sweep);
        answer = folder;
        fire("sweep-export", "sweep-export-csv");
        Path file = folder.resolve("kestrel-dam-to-millbrook-sweep.csv");
        until(() -> design.noticeProperty().get().startsWith("Written: "));
        assertThat(Files.readString(file))
                .isEqualTo(StudyFiles.csvText(sweep.run().resultProperty().get().report()));
        answer = folder.resolve("missing");
        fire("sweep-export", "sweep-export-svg");
        until(() -> design.noticeProperty().get().contains("no such directory"));
    }

    @Test
    void aChosenParameterBringsItsUsualRange() {
        ParameterBox box = part("sweep-path-1", ParameterBox.class);
        Shown.onWindowThread(() -> {
            box.show();
            return null;
        });
        assertThat(sweep.first().pathProperty().get()).isEqualTo("timing.windowWidthPs");
        assertThat(box.getItems()).contains("source.meanPairsPerCycle");
        Shown.onWindowThread(() -> {
            box.getSelectionModel().select("source.meanPairsPerCycle");
            box.hide();
            return null;
        });
        assertThat(sweep.first().pathProperty().get()).isEqualTo("source.meanPairsPerCycle");
        assertThat(sweep.first().toProperty().get()).isEqualTo("0.8");
        assertThat(sweep.problemProperty().get()).isEmpty();
    }

    @Test
    void parametersStandInWordsAndMayBeWrittenAsPaths() {
        ParameterBox box = part("sweep-path-1", ParameterBox.class);
        assertThat(box.getEditor().getText()).isEqualTo("window width (ps)");
        Shown.onWindowThread(() -> {
            box.getEditor().setText("source.pump.wavelen");
            return null;
        });
        assertThat(sweep.first().pathProperty().get()).isEqualTo("source.pump.wavelen");
        assertThat(sweep.problemProperty().get()).isNotEmpty();
        Shown.onWindowThread(() -> {
            box.getEditor().setText("source.meanPairsPerCycle");
            box.commitValue();
            return null;
        });
        assertThat(sweep.first().pathProperty().get()).isEqualTo("source.meanPairsPerCycle");
        assertThat(box.getEditor().getText()).isEqualTo("mean pairs per cycle");
        assertThat(sweep.first().toProperty().get()).isEqualTo("0.8");
    }

    @Test
    void aPictureFitsItsPlaceUntilAllPanelsAreWanted() throws TimeoutException {
        Shown.onWindowThread(() -> {
            stage.setWidth(390.0);
            stage.setHeight(430.0);
            return null;
        });
        press(KeyCode.ENTER);
        untilDone(sweep);
        StudyPicture picture = part("sweep-picture", StudyPicture.class);
        ToggleButton all = part("sweep-all-panels", ToggleButton.class);
        until(() -> picture.image() != null && all.getParent().isVisible());
        double place = picture.getHeight();
        assertThat(place).isGreaterThan(0.4 * 430.0);
        assertThat(picture.image().getHeight()).isLessThanOrEqualTo(place);
        Shown.onWindowThread(() -> {
            all.fire();
            return null;
        });
        until(() -> picture.image().getHeight() > 1.5 * place);
    }

    @Test
    void oneOfTheViewsIsAlwaysShown() throws TimeoutException {
        press(KeyCode.ENTER);
        untilDone(sweep);
        ToggleButton table = part("sweep-show-table", ToggleButton.class);
        Shown.onWindowThread(() -> {
            table.fire();
            table.fire();
            return null;
        });
        assertThat(table.isSelected()).isTrue();
        assertThat(part("sweep-picture", Node.class).isVisible()).isFalse();
    }
}

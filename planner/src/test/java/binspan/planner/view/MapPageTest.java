package binspan.planner.view;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import binspan.planner.export.BoxReport;
import binspan.planner.export.RegionReport;
import binspan.planner.export.StudyFiles;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.Designs;
import binspan.planner.viewmodel.MapModel;
import binspan.study.region.MapPoint;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.geometry.Point2D;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.VBox;
import javafx.scene.paint.Color;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The page of the map, moved by mouse and keys. */
@ExtendWith(ApplicationExtension.class)
final class MapPageTest {
    private static final double LEAST_CONTRAST = 4.5;

    private final Look look = new Look();

    @TempDir
    private Path directory;

    private MapModel model;
    private MapPage page;

    @Start
    void show(Stage stage) throws InvalidScenarioException {
        model = new MapModel(
                Designs.of(ScenarioReader.read("../scenarios/kestrel-dam-to-millbrook.json")),
                Background.of(Platform::runLater));
        page = new MapPage(
                model, look, new StudyHandout.Desk(model.design(), Background.NONE), new FileQuestions(stage, null) {
                    @Override
                    Optional<Path> toSave(String title, String proposed, String kind, String... endings) {
                        return Optional.of(directory.resolve(proposed));
                    }
                });
        Scene scene = new Scene(page, 630.0, 520.0);
        look.dress(scene);
        stage.setScene(scene);
        stage.show();
        stage.sizeToScene();
    }

    private MapFrame frame() {
        MapPlane plane = (MapPlane) page.lookup("#map-plane");
        return MapFrame.of(
                look,
                plane.getWidth(),
                plane.getHeight(),
                model.horizontal().axis(),
                model.vertical().axis());
    }

    private Point2D onScreen(double x, double y) {
        return page.lookup("#map-plane").localToScreen(x, y);
    }

    private MapPoint place() {
        return model.handle().place().orElseThrow();
    }

    @Test
    void draggingTheHandleMovesTheDesign(FxRobot robot) {
        MapFrame frame = frame();
        Point2D from = onScreen(frame.xOf(0.04) + 4.0, frame.yOf(400.0));
        robot.moveTo(from).press(MouseButton.PRIMARY);
        robot.moveTo(onScreen(frame.x(0.5), frame.y(0.5)));
        robot.moveTo(onScreen(frame.x(0.3), frame.y(0.8))).release(MouseButton.PRIMARY);
        WaitForAsyncUtils.waitForFxEvents();
        assertEquals(0.3, model.horizontal().axis().share(place().x()), 0.01);
        assertEquals(0.8, model.vertical().axis().share(place().y()), 0.01);
    }

    /** A pane of tabs takes the focus when it hears a press. */
    @Test
    void draggingWorksInAPaneOfTabs(FxRobot robot) {
        robot.interact(() -> {
            Scene scene = page.getScene();
            scene.setRoot(new VBox());
            TabPane tabs = new TabPane(new Tab("map", page), new Tab("other", new VBox()));
            scene.setRoot(tabs);
            tabs.applyCss();
            tabs.layout();
            page.lookup("#map-plane").requestFocus();
        });
        WaitForAsyncUtils.waitForFxEvents();
        draggingTheHandleMovesTheDesign(robot);
        assertTrue(page.lookup("#map-plane").isFocused());
    }

    @Test
    void saysWhichPointIsRecommended(FxRobot robot) throws TimeoutException {
        Button go = robot.lookup("#map-recommended").queryAs(Button.class);
        WaitForAsyncUtils.waitFor(60, TimeUnit.SECONDS, () -> !go.isDisabled());
        assertTrue(extras(robot).contains("middle of the largest box"), extras(robot)::toString);
        assertTrue(go.getTooltip().getText().endsWith(": middle of the largest box"));
        robot.interact(() -> model.boxChoiceProperty().set(MapModel.BoxChoice.NONE));
        assertTrue(extras(robot).contains("largest least margin"));
        assertTrue(go.getTooltip().getText().endsWith(": largest least margin"));
    }

    private List<String> extras(FxRobot robot) {
        return robot.from(page.lookup("#map-extras")).lookup(".label").queryAllAs(Label.class).stream()
                .map(Label::getText)
                .toList();
    }

    @Test
    void aClickReadsAndMovesNothingUntilAsked(FxRobot robot) throws TimeoutException {
        MapFrame frame = frame();
        assertTrue(((Button) page.lookup("#map-move")).isDisabled());
        robot.clickOn(onScreen(frame.x(0.25), frame.y(0.25)));
        WaitForAsyncUtils.waitForFxEvents();
        assertEquals(new MapPoint(0.04, 400.0), place());
        assertNotNull(model.reader().pickedProperty().get());
        WaitForAsyncUtils.waitFor(
                30,
                TimeUnit.SECONDS,
                () -> page.lookup("#map-plane").getAccessibleText().contains("NOT MET"));
        robot.clickOn("#map-move");
        assertEquals(0.25, model.horizontal().axis().share(place().x()), 0.01);
        assertEquals(0.25, model.vertical().axis().share(place().y()), 0.01);
    }

    @Test
    void aDoubleClickMovesTheDesign(FxRobot robot) {
        MapFrame frame = frame();
        robot.doubleClickOn(onScreen(frame.x(0.7), frame.y(0.6)));
        WaitForAsyncUtils.waitForFxEvents();
        assertEquals(0.7, model.horizontal().axis().share(place().x()), 0.01);
        assertEquals(0.6, model.vertical().axis().share(place().y()), 0.01);
    }

    @Test
    void keysMoveReadAndReset(FxRobot robot) {
        robot.interact(() -> page.lookup("#map-plane").requestFocus());
        double before = model.horizontal().axis().share(place().x());
        robot.type(KeyCode.RIGHT);
        assertEquals(before + 0.01, model.horizontal().axis().share(place().x()), 1e-3);
        robot.press(KeyCode.SHIFT).type(KeyCode.LEFT).release(KeyCode.SHIFT);
        assertEquals(before - 0.04, model.horizontal().axis().share(place().x()), 2e-3);
        assertEquals(400.0, place().y());
        robot.type(KeyCode.ENTER);
        assertEquals(place(), model.reader().pickedProperty().get());
        robot.interact(() -> model.vertical().from("100"));
        robot.type(KeyCode.HOME);
        assertEquals(20.0, model.vertical().axis().from());
    }

    @Test
    void entriesAreTakenAndRefusedInWords(FxRobot robot) {
        TextField from = (TextField) page.lookup("#map-vertical-from");
        Label error = (Label) page.lookup("#map-error");
        robot.clickOn(from).interact(from::selectAll).write("wide").type(KeyCode.ENTER);
        assertTrue(error.isVisible());
        assertTrue(error.getText().contains("found \"wide\""));
        robot.interact(from::selectAll).write("50").type(KeyCode.ENTER);
        assertFalse(error.isVisible());
        assertEquals(50.0, model.vertical().axis().from());
    }

    @Test
    void aPathIsTypedByHand(FxRobot robot) {
        ComboBox<?> parameter = (ComboBox<?>) page.lookup("#map-vertical");
        robot.clickOn(parameter.getEditor())
                .interact(() -> parameter.getEditor().selectAll())
                .write("link.lengthKm")
                .type(KeyCode.ENTER);
        assertEquals("link.lengthKm", model.vertical().path());
        assertEquals("Fibre length of the link (km)", parameter.getEditor().getText());
    }

    /** The files that the command line writes for the same map. */
    @Test
    void exportsTheExactMapAndItsBox(FxRobot robot) throws Exception {
        MenuButton export = robot.lookup("#map-export").queryAs(MenuButton.class);
        MenuButton box = robot.lookup("#box-export").queryAs(MenuButton.class);
        WaitForAsyncUtils.waitFor(60, TimeUnit.SECONDS, () -> !export.isDisabled() && !box.isDisabled());
        robot.interact(() -> export.getItems().get(1).fire());
        robot.interact(() -> box.getItems().get(1).fire());
        String map = StudyFiles.jsonText(RegionReport.of(
                model.design().scenario(), model.regionProperty().get()));
        String found = StudyFiles.jsonText(
                BoxReport.of(model.design().scenario(), model.boxProperty().get()));
        assertEquals(map, Files.readString(directory.resolve("kestrel-dam-to-millbrook-map.json")));
        assertEquals(found, Files.readString(directory.resolve("kestrel-dam-to-millbrook-box.json")));
    }

    /** The contrast of relative luminances of the Web Content Accessibility Guidelines 2.1, from memory. */
    @ParameterizedTest
    @EnumSource
    void namesOfLinesAreReadable(MapInk ink) {
        Look other = new Look();
        for (Theme theme : Theme.values()) {
            other.themeProperty().set(theme);
            double one = luminance(ink.colour(other));
            double ground = luminance(theme.palette().panel());
            double contrast = (Math.max(one, ground) + 0.05) / (Math.min(one, ground) + 0.05);
            assertTrue(contrast >= LEAST_CONTRAST, theme + " " + contrast);
        }
    }

    private static double luminance(Color colour) {
        return 0.2126 * linear(colour.getRed())
                + 0.7152 * linear(colour.getGreen())
                + 0.0722 * linear(colour.getBlue());
    }

    private static double linear(double value) {
        return value <= 0.03928 ? value / 12.92 : Math.pow((value + 0.055) / 1.055, 2.4);
    }
}

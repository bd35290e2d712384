package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.viewmodel.LinkPart;
import binspan.planner.viewmodel.MapShape;
import binspan.planner.viewmodel.Site;
import binspan.scenario.FibreSpan;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.MouseButton;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;

/** A link is opened, shaped by hand and saved, as a person does it. */
@ExtendWith(ApplicationExtension.class)
final class WindowTest {
    private static final String LENGTH = "form-alice-path-1-length-km";

    @TempDir
    private Path directory;

    private WholeWindow window;
    private Path file;

    @BeforeEach
    void open(FxRobot robot) throws IOException {
        file = WholeWindow.copy("kestrel-dam-to-millbrook", directory);
        window = new WholeWindow(robot, directory).showing(file);
    }

    @AfterEach
    void end() {
        window.end();
    }

    private String title() {
        return window.get(() -> window.stage().getTitle());
    }

    private String headline() {
        return window.get(window.part("verdict-headline", Label.class)::getText);
    }

    private double lengthKm() {
        return window.value(link -> ((FibreSpan) link.alice().path().get(1)).lengthKm());
    }

    private List<String> figures() {
        List<String> figures = new ArrayList<>();
        window.get(() -> window.stage().getScene().getRoot().lookupAll("#verdict .figure"))
                .forEach(each -> figures.add(((Label) each).getText()));
        return figures;
    }

    private void undone(int steps) {
        for (int i = 0; i < steps; i++) {
            window.keys(KeyCode.Z, KeyCombination.SHORTCUT_DOWN);
        }
    }

    private String undo() {
        return window.get(window.menu("menu-undo")::getText);
    }

    private boolean changed() {
        return window.get(window.model().design().modifiedProperty()::get);
    }

    /** Types a length at the drawn fibre, as a person does. */
    private void lengthen(FxRobot robot, String typed) {
        robot.clickOn(window.drawn("upper duct"));
        TextField length = window.part(LENGTH, TextField.class);
        robot.clickOn(length).interact(length::selectAll).write(typed).type(KeyCode.ENTER);
        window.judged();
    }

    private void drag(FxRobot robot, String handle, double pixels) {
        Bounds at = window.get(() -> {
            Node node = window.stage().getScene().lookup("#" + handle);
            return node.localToScreen(node.getBoundsInLocal());
        });
        Point2D from = new Point2D(at.getCenterX(), at.getCenterY());
        robot.moveTo(from).press(MouseButton.PRIMARY);
        robot.moveTo(from.add(pixels / 2.0, 0.0)).moveTo(from.add(pixels, 0.0));
        robot.release(MouseButton.PRIMARY);
        window.judged();
    }

    @Test
    void opensAShippedScenario() {
        assertThat(title()).isEqualTo("kestrel-dam-to-millbrook.json — Binspan");
        assertThat(headline())
                .endsWith(window.get(
                        () -> window.model().verdict().sheetProperty().get().headline()))
                .startsWith("✓");
        assertThat(window.get(() -> window.stage().getScene().getRoot().lookupAll(".requirement")))
                .hasSize(6);
        assertThat(window.drawn("upper duct").isVisible()).isTrue();
        assertThat(window.get(() -> window.stage().getScene().getRoot().lookupAll(".link-item")))
                .hasSize(window.get(() -> window.model().link().items().size()));
    }

    @Test
    void showsAllItsPages() {
        TabPane pages = window.part("pages", TabPane.class);
        assertThat(window.session().window().keys()).hasSize(8);
        for (String key : window.session().window().keys()) {
            window.page(key);
            Node content =
                    window.get(() -> pages.getSelectionModel().getSelectedItem().getContent());
            assertThat(content.getBoundsInParent().getHeight()).as(key).isGreaterThan(300.0);
            assertThat(window.get(window.session().window()::shown).key()).isEqualTo(key);
        }
        window.until("map", () -> window.model().map().shapeProperty().get() != null);
    }

    @Test
    void aTypedLengthChangesTheVerdict(FxRobot robot) {
        List<String> before = figures();
        lengthen(robot, "42.5");
        assertThat(window.get(window.model().design().selectionProperty()::get))
                .isEqualTo(new LinkPart.Element(Site.ALICE, 1));
        assertThat(lengthKm()).isEqualTo(42.5);
        window.until("other figures", () -> !figures().equals(before));
        assertThat(title()).isEqualTo("kestrel-dam-to-millbrook.json (changed) — Binspan");
        assertThat(undo()).startsWith("Undo: ").contains("length");
        undone(1);
        assertThat(lengthKm()).isEqualTo(30.2);
        assertThat(changed()).isFalse();
        assertThat(window.get(window.menu("menu-undo")::isDisable)).isTrue();
        window.keys(KeyCode.Z, KeyCombination.SHORTCUT_DOWN, KeyCombination.SHIFT_DOWN);
        assertThat(lengthKm()).isEqualTo(42.5);
    }

    @Test
    void theWindowIsDraggedByItsEdge(FxRobot robot) {
        window.until(
                "slots", () -> !window.model().slots().plotsProperty().get().isEmpty());
        drag(robot, "slots-alice-window-right", 12.0);
        double wide = window.value(link -> link.timing().windowWidthPs());
        assertThat(wide).isGreaterThan(420.0).isLessThan(4000.0);
        assertThat(undo()).isEqualTo("Undo: window width");
        drag(robot, "slots-alice-window-right", -12.0);
        // One pixel less to either side is all that rounding may leave.
        assertThat(window.value(link -> link.timing().windowWidthPs())).isCloseTo(400.0, within(wide / 12.0));
        undone(2);
        assertThat(window.value(link -> link.timing().windowWidthPs())).isEqualTo(400.0);
        assertThat(changed()).isFalse();
    }

    @Test
    void theBinsAreDraggedApart(FxRobot robot) {
        window.until(
                "slots", () -> !window.model().slots().plotsProperty().get().isEmpty());
        drag(robot, "slots-bob-separation", 20.0);
        assertThat(window.value(link -> link.imbalanceNs())).isBetween(2.05, 4.0);
        assertThat(undo()).isEqualTo("Undo: common imbalance");
        undone(1);
        assertThat(window.value(link -> link.imbalanceNs())).isEqualTo(2.0);
        assertThat(changed()).isFalse();
    }

    @Test
    void theDesignIsDraggedOverAMapThatStays(FxRobot robot) {
        window.page("map");
        window.until("exact map", () -> window.model().map().regionProperty().get() != null);
        MapShape shape = window.get(window.model().map().shapeProperty()::get);
        MapPlane plane = window.part("map-plane", MapPlane.class);
        MapFrame frame = window.get(() -> MapFrame.of(
                window.session().look(),
                plane.getWidth(),
                plane.getHeight(),
                window.model().map().horizontal().axis(),
                window.model().map().vertical().axis()));
        Point2D from = plane.localToScreen(frame.xOf(0.04), frame.yOf(400.0));
        Point2D to = plane.localToScreen(frame.x(0.4), frame.y(0.7));
        robot.moveTo(from).press(MouseButton.PRIMARY);
        robot.moveTo(from.midpoint(to)).moveTo(to).release(MouseButton.PRIMARY);
        window.judged();
        double pairs = window.value(link -> link.source().meanPairsPerCycle().orElseThrow());
        double width = window.value(link -> link.timing().windowWidthPs());
        assertThat(window.get(() -> window.model().map().horizontal().axis().share(pairs)))
                .isCloseTo(0.4, within(0.01));
        assertThat(window.get(() -> window.model().map().vertical().axis().share(width)))
                .isCloseTo(0.7, within(0.01));
        assertThat(window.get(window.model().map().shapeProperty()::get)).isSameAs(shape);
        assertThat(window.get(window.model().map().regionProperty()::get)).isNotNull();
        assertThat(undo()).contains("mean pairs").contains("window");
        undone(1);
        assertThat(changed()).isFalse();
        assertThat(window.get(window.menu("menu-undo")::isDisable)).isTrue();
    }

    @Test
    void savesTheTouchedValuesAlone(FxRobot robot) throws IOException {
        String original = Files.readString(file);
        lengthen(robot, "42.5");
        drag(robot, "slots-alice-window-right", 12.0);
        double width = window.value(link -> link.timing().windowWidthPs());
        assertThat(written(width)).hasSizeLessThan(6);
        window.keys(KeyCode.S, KeyCombination.SHORTCUT_DOWN);
        assertThat(title()).isEqualTo("kestrel-dam-to-millbrook.json — Binspan");
        assertThat(Files.readString(file))
                .isEqualTo(original.replace("\"lengthKm\": 30.2", "\"lengthKm\": 42.5")
                        .replace("\"windowWidthPs\": 400,", "\"windowWidthPs\": " + written(width) + ","))
                .isNotEqualTo(original);
        undone(2);
        assertThat(title()).contains("(changed)");
        window.keys(KeyCode.S, KeyCombination.SHORTCUT_DOWN);
        assertThat(Files.readString(file)).isEqualTo(original);
        window.keys(KeyCode.Z, KeyCombination.SHORTCUT_DOWN, KeyCombination.SHIFT_DOWN);
        window.keys(KeyCode.S, KeyCombination.SHORTCUT_DOWN);
        window.willAnswer(file);
        window.keys(KeyCode.O, KeyCombination.SHORTCUT_DOWN);
        window.judged();
        assertThat(lengthKm()).isEqualTo(42.5);
        assertThat(window.value(link -> link.timing().windowWidthPs())).isEqualTo(400.0);
        assertThat(changed()).isFalse();
    }

    private static String written(double number) {
        return number == Math.rint(number) ? Long.toString((long) number) : Double.toString(number);
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.ChangeMark;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.Designs;
import binspan.planner.viewmodel.HeldBackground;
import binspan.planner.viewmodel.RequirementRow;
import binspan.planner.viewmodel.VerdictLinks;
import binspan.planner.viewmodel.VerdictModel;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

@ExtendWith(ApplicationExtension.class)
final class VerdictPaneTest {
    private static final double WIDTH = 330.0;
    private static final double HEIGHT = 745.0;

    private final List<String> asked = new ArrayList<>();
    private Stage stage;

    @Start
    void start(Stage shown) {
        stage = shown;
    }

    private VerdictPane show(FxRobot robot, VerdictModel model, int scalePercent) {
        VerdictPane[] pane = new VerdictPane[1];
        robot.interact(() -> {
            Look look = new Look();
            look.scalePercentProperty().set(scalePercent);
            pane[0] = new VerdictPane(model, () -> asked.add("room"));
            double share = scalePercent / 100.0;
            Scene scene = new Scene(pane[0], WIDTH * share, HEIGHT * share);
            look.dress(scene);
            stage.setScene(scene);
            stage.show();
            stage.sizeToScene();
        });
        return pane[0];
    }

    private VerdictPane show(FxRobot robot, Scenario scenario) {
        return show(robot, new VerdictModel(Designs.of(scenario), Background.NONE), 100);
    }

    private static void set(Design design, String path, double value) {
        design.change("number", null, scenario -> VerdictLinks.with(scenario, path, value));
    }

    @Test
    void rowForEachRequirement(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.withAll());
        VerdictModel model = new VerdictModel(design, Background.NONE);
        show(robot, model, 100);
        assertThat(robot.lookup(".requirement").queryAll()).hasSize(8);
        for (RequirementRow row : model.sheetProperty().get().requirements()) {
            Node node = robot.lookup("#verdict-requirement-" + row.requirement().fieldName())
                    .query();
            assertThat(node.getAccessibleText()).isEqualTo(row.spoken());
            assertThat(texts(robot, node)).contains(row.name(), row.required(), row.predicted(), row.margin());
        }
        assertThat(headline(robot)).isEqualTo("\u2717 DOES NOT MEET 1 of 8 requirements");
    }

    private static List<String> texts(FxRobot robot, Node within) {
        List<String> texts = new ArrayList<>();
        robot.from(within).lookup(".label").queryAllAs(Label.class).forEach(label -> texts.add(label.getText()));
        return texts;
    }

    private static String headline(FxRobot robot) {
        return robot.lookup("#verdict-headline").queryAs(Label.class).getText();
    }

    /** Bars of failing requirements end left of the middle, those of met ones right of it. */
    @Test
    void barsSayWhichSideARequirementIsOn(FxRobot robot) {
        show(robot, VerdictLinks.withAll());
        SpanBar failing = bar(robot, "timeBasisQberAtMost");
        assertThat(failing.span()[0]).isLessThan(0.5);
        assertThat(failing.span()[1]).isEqualTo(0.5);
        SpanBar met = bar(robot, "rawVisibilityAtLeast");
        assertThat(met.span()[0]).isEqualTo(0.5);
        assertThat(met.span()[1]).isGreaterThan(0.5);
    }

    private static SpanBar bar(FxRobot robot, String field) {
        Node row = robot.lookup("#verdict-requirement-" + field).query();
        return robot.from(row).lookup(".span-bar").queryAs(SpanBar.class);
    }

    @Test
    void eightRequirementsAndAllChangesFitWithoutScrolling(FxRobot robot) {
        for (int scale : new int[] {100, 200}) {
            Design design = Designs.of(VerdictLinks.withAll());
            VerdictModel model = new VerdictModel(design, Background.NONE);
            set(design, "timing.windowWidthPs", 300.0);
            VerdictPane pane = show(robot, model, scale);
            ScrollPane scroll = robot.from(pane).lookup("#verdict-scroll").queryAs(ScrollPane.class);
            assertThat(scroll.getContent().getLayoutBounds().getHeight())
                    .isLessThanOrEqualTo(scroll.getViewportBounds().getHeight());
            assertThat(cut(robot, pane)).isEmpty();
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "eagle-tarn-to-saltmarsh",
                "fernhill-shared-trunk",
                "harrow-ridge-overhead-line",
                "kestrel-dam-to-millbrook",
                "orchard-lane-access",
                "stonebridge-to-lower-weir"
            })
    void shippedLinksFitBeforeAndAfterAChange(String name, FxRobot robot) {
        Design design = Designs.of(VerdictLinks.shipped(name));
        VerdictPane pane = show(robot, new VerdictModel(design, Background.NONE), 100);
        assertThat(cut(robot, pane)).isEmpty();
        robot.interact(() -> set(design, "link.lengthKm", 200.0));
        robot.interact(pane::layout);
        assertThat(cut(robot, pane)).isEmpty();
    }

    /** Labels whose text does not fit into them or that stand outside of the pane. */
    private static List<String> cut(FxRobot robot, Node pane) {
        List<String> cut = new ArrayList<>();
        Bounds all = pane.localToScene(pane.getLayoutBounds());
        for (Label label : robot.from(pane).lookup(".label").queryAllAs(Label.class)) {
            Bounds place = label.localToScene(label.getLayoutBounds());
            boolean narrow = !label.isWrapText() && label.getWidth() + 1.0 < label.prefWidth(-1.0);
            if (label.isVisible() && (narrow || !all.contains(place))) {
                cut.add(label.getText());
            }
        }
        return cut;
    }

    @Test
    void lowWindowScrolls(FxRobot robot) {
        VerdictPane pane = show(robot, VerdictLinks.withAll());
        robot.interact(() -> stage.setHeight(500.0));
        robot.interact(pane::layout);
        ScrollPane scroll = robot.lookup("#verdict-scroll").queryAs(ScrollPane.class);
        assertThat(scroll.getContent().getLayoutBounds().getHeight())
                .isGreaterThan(scroll.getViewportBounds().getHeight());
        assertThat(robot.lookup("#verdict-cautions")
                        .query()
                        .localToScene(0.0, 0.0)
                        .getY())
                .isLessThan(500.0);
    }

    @Test
    void followsTheDesign(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.failing());
        show(robot, new VerdictModel(design, Background.NONE), 100);
        assertThat(headline(robot)).isEqualTo("\u2717 DOES NOT MEET 6 of 6 requirements");
        robot.interact(() -> set(design, "timing.cableTemperatureStepK", 0.05));
        assertThat(headline(robot)).isEqualTo("\u2713 MEETS all 6 requirements");
        Node row = robot.lookup("#verdict-requirement-rawVisibilityAtLeast").query();
        assertThat(row.getAccessibleText()).startsWith("met: ").contains("better than saved: +");
        assertThat(texts(robot, row)).anyMatch(text -> text.startsWith("\u2191 +"));
    }

    /** A time that has risen is worse: the arrow follows the number, the sign says what it means. */
    @Test
    void marksSayDirectionAndMeaning(FxRobot robot) {
        Label[] label = new Label[1];
        robot.interact(() -> {
            ChangeLabel change = new ChangeLabel();
            change.show(new ChangeMark("+71.1 ms", ChangeMark.Effect.WORSE));
            label[0] = change;
        });
        assertThat(label[0].getText()).isEqualTo("\u2191 +71.1 ms !");
        assertThat(label[0].getStyleClass()).contains("bad");
        assertThat(label[0].getAccessibleText()).isEqualTo("worse than saved: +71.1 ms");
        robot.interact(() -> ((ChangeLabel) label[0]).show(new ChangeMark("-1.2 pt", ChangeMark.Effect.BETTER)));
        assertThat(label[0].getText()).isEqualTo("\u2193 -1.2 pt");
        assertThat(label[0].getTooltip().getText()).isEqualTo("better than saved: -1.2 percentage points");
    }

    @Test
    void marginThatThereIsNotIsADash(FxRobot robot) {
        show(robot, VerdictLinks.with(VerdictLinks.withAll(), "timing.cableTemperatureStepK", 1.0));
        Node row = robot.lookup("#verdict-requirement-firstKeyWithinHours").query();
        assertThat(texts(robot, row)).contains("never", "-");
    }

    @Test
    void nothingIsRequired(FxRobot robot) {
        VerdictPane pane = show(robot, VerdictLinks.unjudged());
        assertThat(headline(robot)).startsWith("No requirement is stated");
        assertThat(robot.lookup(".requirement").queryAll()).isEmpty();
        assertThat(robot.lookup("#verdict-tightest").queryAs(Hyperlink.class).getText())
                .isEqualTo("no headroom");
        assertThat(texts(robot, pane)).contains("phase-basis error rate");
    }

    @Test
    void linksAskForTheRoomPage(FxRobot robot) {
        show(robot, VerdictLinks.meeting());
        robot.clickOn("#verdict-tightest");
        robot.clickOn("#verdict-cautions");
        assertThat(asked).hasSize(2);
        robot.interact(() -> robot.lookup("#verdict-cautions").query().requestFocus());
        robot.push(KeyCode.SPACE);
        assertThat(asked).hasSize(3);
    }

    @Test
    void everyPartIsReachedByTheKeyboardAndSpeaks(FxRobot robot) {
        VerdictPane pane = show(robot, VerdictLinks.withAll());
        robot.interact(() -> robot.lookup("#verdict-headline").query().requestFocus());
        List<String> visited = new ArrayList<>();
        for (int i = 0; i < 20; i++) {
            Node owner = pane.getScene().getFocusOwner();
            visited.add(owner.getId());
            if (!(owner instanceof Hyperlink)) {
                assertThat(owner.getAccessibleText()).as(owner.getId()).isNotBlank();
            }
            robot.push(KeyCode.TAB);
        }
        assertThat(visited)
                .contains(
                        "verdict-headline",
                        "verdict-requirement-fiveSigmaWithinHours",
                        "verdict-budget",
                        "verdict-figures-4",
                        "verdict-tightest",
                        "verdict-cautions")
                .doesNotContain("verdict-scroll");
    }

    @Test
    void longComputingIsVisible(FxRobot robot) throws TimeoutException {
        HeldBackground held = new HeldBackground();
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = new VerdictModel(design, held.background());
        held.finish();
        show(robot, model, 100);
        Node word = robot.lookup("#verdict-computing").query();
        Node content = robot.lookup(".verdict-content").query();
        assertThat(word.isVisible()).isFalse();
        robot.interact(() -> set(design, "timing.windowWidthPs", 350.0));
        assertThat(content.getOpacity()).isEqualTo(1.0);
        WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, () -> word.isVisible() && content.getOpacity() < 1.0);
        robot.interact(held::finish);
        assertThat(word.isVisible()).isFalse();
        WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, () -> content.getOpacity() == 1.0);
    }
}

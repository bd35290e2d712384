package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.viewmodel.LinkBench;
import binspan.planner.viewmodel.LinkPart;
import binspan.planner.viewmodel.LinkPart.Element;
import binspan.planner.viewmodel.Site;
import binspan.scenario.Scenario;
import binspan.study.tuning.SourcePosition;
import java.util.HashSet;
import java.util.Set;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The drawn link under mouse and keyboard. Item 6 is alice's fibre, 10 the source, 13 bob's first patch panel. */
@ExtendWith(ApplicationExtension.class)
final class LinkStripTest {
    private static final int DUCT = 6;
    private static final int SOURCE = 10;
    private static final double WIDTH = 930.0;

    private LinkBench bench;
    private Scene scene;

    @Start
    void start(Stage stage) {
        bench = new LinkBench("kestrel-dam-to-millbrook");
        Look look = new Look();
        scene = new Scene(new LinkStrip(bench.model(), look), WIDTH, 190.0);
        look.dress(scene);
        stage.setScene(scene);
        stage.show();
        stage.sizeToScene();
    }

    private Node item(FxRobot robot, int index) {
        return robot.lookup("#link-item-" + index).query();
    }

    private LinkPart selection() {
        WaitForAsyncUtils.waitForFxEvents();
        return bench.design().selectionProperty().get();
    }

    private double share() {
        WaitForAsyncUtils.waitForFxEvents();
        return SourcePosition.of(bench.design().scenario());
    }

    @Test
    void clickSelectsAndFocuses(FxRobot robot) {
        robot.clickOn("#link-item-6");
        assertThat(selection()).isEqualTo(new Element(Site.ALICE, 1));
        assertThat(item(robot, DUCT).isFocused()).isTrue();
        assertThat(item(robot, DUCT).isFocusTraversable()).isTrue();
        assertThat(item(robot, SOURCE).isFocusTraversable()).isFalse();
    }

    @Test
    void screenReaderHearsWhatIsDrawn(FxRobot robot) {
        assertThat(item(robot, DUCT).getAccessibleText()).startsWith("alice, upper duct: fibre span, G.652.D 30.2 km");
        assertThat(((Label) robot.lookup("#link-site-bob").query()).getText()).isEqualTo("bob  12.9 dB");
    }

    @Test
    void arrowsWalkAlongTheRow(FxRobot robot) {
        robot.clickOn("#link-item-6").type(KeyCode.RIGHT);
        assertThat(selection()).isEqualTo(new Element(Site.ALICE, 0));
        robot.type(KeyCode.RIGHT).type(KeyCode.RIGHT).type(KeyCode.RIGHT);
        assertThat(selection()).isEqualTo(new LinkPart.Source());
        assertThat(item(robot, SOURCE).isFocused()).isTrue();
    }

    @Test
    void keysMoveAndRemoveAnElement(FxRobot robot) {
        robot.clickOn("#link-item-6");
        robot.press(KeyCode.ALT, KeyCode.RIGHT).release(KeyCode.RIGHT, KeyCode.ALT);
        assertThat(selection()).isEqualTo(new Element(Site.ALICE, 0));
        assertThat(bench.labels(Site.ALICE)).startsWith("upper duct");
        robot.type(KeyCode.DELETE);
        assertThat(selection()).isEqualTo(new Element(Site.ALICE, 0));
        assertThat(bench.labels(Site.ALICE)).containsExactly("Fernhill patch panel", "dam patch panel");
        assertThat(item(robot, 7).isFocused()).isFalse();
        assertThat(scene.getFocusOwner().getId()).isEqualTo("link-item-6");
    }

    @Test
    void keysMoveTheSource(FxRobot robot) {
        double before = share();
        robot.clickOn("#link-item-10");
        robot.press(KeyCode.ALT, KeyCode.LEFT).release(KeyCode.LEFT, KeyCode.ALT);
        assertThat(share()).isCloseTo(before - 0.01, within(1e-9));
    }

    @Test
    void splitAsksForThePlaceAndBeginsInTheMiddle(FxRobot robot) {
        robot.clickOn("#link-item-6").type(KeyCode.S);
        TextField where = robot.lookup("#link-split-km").query();
        assertThat(where.getText()).isEqualTo("15.1");
        robot.write("99").type(KeyCode.ENTER);
        assertThat(bench.done()).isEmpty();
        robot.doubleClickOn("#link-split-km").write("8").type(KeyCode.ENTER);
        assertThat(selection()).isEqualTo(new Element(Site.ALICE, 1));
        assertThat(bench.done()).containsExactly("split upper duct");
        assertThat(item(robot, DUCT + 1).isFocused()).isTrue();
    }

    @Test
    void escapeLeavesTheFibreWhole(FxRobot robot) {
        robot.clickOn("#link-item-6").type(KeyCode.S).type(KeyCode.ESCAPE);
        assertThat(bench.done()).isEmpty();
        assertThat(robot.lookup("#link-split-km").tryQuery()).isEmpty();
        assertThat(item(robot, DUCT).isFocused()).isTrue();
    }

    @Test
    void menuAddsBehindTheSelectedElement(FxRobot robot) {
        robot.clickOn("#link-item-6").type(KeyCode.INSERT).clickOn("#link-add-filter");
        assertThat(selection()).isEqualTo(new Element(Site.ALICE, 2));
        assertThat(bench.labels(Site.ALICE)).contains("filter");
    }

    @Test
    void toolsThatCannotBeUsedAreOff(FxRobot robot) {
        robot.clickOn("#link-item-13");
        assertThat(robot.lookup("#link-split").query().isDisabled()).isTrue();
        assertThat(robot.lookup("#link-remove").query().isDisabled()).isFalse();
        assertThat(robot.lookup("#link-left").query().isDisabled()).isTrue();
        assertThat(robot.lookup("#link-right").query().isDisabled()).isFalse();
        robot.clickOn("#link-right");
        assertThat(bench.labels(Site.BOB)).startsWith("lower duct", "Fernhill patch panel");
    }

    /** The source stays under the hand: as many pixels as the hand went. */
    @Test
    void draggedSourceStaysUnderTheHand(FxRobot robot) {
        double from = centre(robot, SOURCE);
        robot.moveTo("#link-item-10").press(MouseButton.PRIMARY).moveBy(20, 0).moveBy(20, 0);
        Label place = robot.lookup("#link-place").query();
        assertThat(place.isVisible()).isTrue();
        assertThat(place.getText()).matches("alice [0-9.]+ km \\| bob [0-9.]+ km");
        robot.release(MouseButton.PRIMARY);
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(place.isVisible()).isFalse();
        assertThat(centre(robot, SOURCE) - from).isCloseTo(40.0, within(1.0));
    }

    private double centre(FxRobot robot, int index) {
        Bounds bounds = item(robot, index).localToScene(item(robot, index).getBoundsInLocal());
        return bounds.getCenterX();
    }

    @Test
    void escapeTakesTheDragBack(FxRobot robot) {
        Scenario before = bench.design().scenario();
        robot.moveTo("#link-item-10").press(MouseButton.PRIMARY).moveBy(-15, 0).moveBy(-30, 0);
        assertThat(share()).isLessThan(SourcePosition.of(before));
        robot.type(KeyCode.ESCAPE);
        assertThat(bench.design().scenario()).isEqualTo(before);
        robot.moveBy(-30, 0).release(MouseButton.PRIMARY);
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(bench.design().scenario()).isEqualTo(before);
    }

    @Test
    void draggedElementFallsBetweenOthers(FxRobot robot) {
        robot.moveTo("#link-item-7").press(MouseButton.PRIMARY).moveBy(-20, 0).moveTo("#link-item-5");
        robot.moveBy(-20, 0).release(MouseButton.PRIMARY);
        assertThat(selection()).isEqualTo(new Element(Site.ALICE, 2));
        assertThat(bench.labels(Site.ALICE)).containsExactly("upper duct", "dam patch panel", "Fernhill patch panel");
        assertThat(bench.done()).containsExactly("moved Fernhill patch panel");
    }

    @Test
    void everyItemIsReachedByTheKeyboardAlone(FxRobot robot) {
        robot.clickOn("#link-item-0");
        Set<String> reached = new HashSet<>();
        for (int i = 0; i < bench.model().items().size(); i++) {
            reached.add(scene.getFocusOwner().getId());
            robot.type(KeyCode.RIGHT);
        }
        assertThat(reached).hasSize(bench.model().items().size());
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.ElementEdits;
import binspan.planner.viewmodel.EditedForm;
import binspan.planner.viewmodel.LinkPart;
import binspan.planner.viewmodel.Site;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.scene.control.TitledPane;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.Region;
import javafx.scene.text.Text;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

@ExtendWith(ApplicationExtension.class)
class FormPaneTest {
    private static final String EFFICIENCY = "#form-alice-detectors-0-efficiency";

    private EditedForm edited;
    private FormPane pane;

    @Start
    void show(Stage stage) {
        edited = new EditedForm("kestrel-dam-to-millbrook");
        edited.select(new LinkPart.Port(Site.ALICE, 0));
        pane = new FormPane(edited.form());
        Scene scene = new Scene(pane, 310, 530);
        new Look().dress(scene);
        stage.setScene(scene);
        stage.show();
        stage.sizeToScene();
    }

    private double efficiency() {
        return edited.design().scenario().alice().detectors().get(0).efficiency();
    }

    private String error() {
        return pane.lookupAll(".form-error").stream()
                .filter(Node::isVisible)
                .map(node -> ((Label) node).getText())
                .reduce("", String::concat);
    }

    private void type(FxRobot robot, String query, String text) {
        robot.interact(() -> robot.lookup(query).queryAs(TextField.class).requestFocus());
        robot.push(KeyCode.CONTROL, KeyCode.A).write(text);
    }

    @Test
    void aBadValueGetsItsMessageAndAGoodOneChangesTheDesign(FxRobot robot) {
        type(robot, EFFICIENCY, "1.5");
        assertThat(error()).isEqualTo("\u2715 found 1.5; allowed 1e-6 to 1");
        assertThat(robot.lookup(EFFICIENCY).query().getAccessibleText())
                .isEqualTo("efficiency, found 1.5; allowed 1e-6 to 1");
        type(robot, EFFICIENCY, "0.5");
        assertThat(error()).isEmpty();
        assertThat(efficiency()).isEqualTo(0.5);
        robot.push(KeyCode.ENTER);
        type(robot, EFFICIENCY, "0.6");
        robot.push(KeyCode.ESCAPE);
        assertThat(efficiency()).isEqualTo(0.5);
        robot.interact(() -> edited.design().undo());
        assertThat(efficiency()).isEqualTo(0.82);
        assertThat(robot.lookup(EFFICIENCY).queryAs(TextField.class).getText()).isEqualTo("0.82");
    }

    @Test
    void theKeyboardAloneChoosesAPartAndMovesASlider(FxRobot robot) {
        robot.interact(() -> robot.lookup("#form-part").queryAs(ComboBox.class).requestFocus());
        robot.push(KeyCode.DOWN).push(KeyCode.DOWN);
        assertThat(edited.design().selectionProperty().get()).isEqualTo(new LinkPart.Clock(Site.ALICE));
        robot.push(KeyCode.TAB);
        Node focused = robot.lookup("#form-slide-alice-clock-jitter-rms-ps").query();
        assertThat(focused.isFocused()).isTrue();
        robot.push(KeyCode.RIGHT).push(KeyCode.PAGE_UP);
        double moved = edited.design().scenario().alice().clockJitterRmsPs();
        assertThat(moved).isGreaterThan(15.0);
        robot.push(KeyCode.TAB);
        assertThat(robot.lookup("#form-alice-clock-jitter-rms-ps").query().isFocused())
                .isTrue();
        robot.interact(() -> edited.design().undo());
        assertThat(edited.design().scenario().alice().clockJitterRmsPs()).isEqualTo(12.0);
    }

    @Test
    void aSliderFollowsTheTypedValue(FxRobot robot) {
        Slider slider = robot.lookup("#form-slide-alice-detectors-0-efficiency").queryAs(Slider.class);
        type(robot, EFFICIENCY, "0.25");
        assertThat(slider.getValue()).isBetween(0.249, 0.251);
    }

    @Test
    void theFocusedFieldIsExplained(FxRobot robot) {
        robot.interact(() -> robot.lookup(EFFICIENCY).queryAs(TextField.class).requestFocus());
        assertThat(robot.lookup(".form-meaning").queryAs(Label.class).getText()).isEqualTo("Detection efficiency.");
        assertThat(robot.lookup(".form-allowed").queryAs(Label.class).getText())
                .isEqualTo("Allowed: 1e-6 to 1. If left empty: of the detector class: 0.8.");
        assertThat(robot.lookup("#form-source").queryAs(TextField.class).getText())
                .isEqualTo("acceptance test, channel by channel");
    }

    @Test
    void theSourceOfAValueIsWrittenIntoTheFile(FxRobot robot) {
        robot.interact(() -> robot.lookup("#form-alice-detectors-0-dead-time-ns")
                .queryAs(TextField.class)
                .requestFocus());
        type(robot, "#form-source", "data sheet");
        robot.push(KeyCode.ENTER);
        assertThat(edited.design().scenario().provenance())
                .containsEntry("alice.detectors[0].deadTimeNs", "data sheet");
    }

    private Object chosen(FxRobot robot) {
        return robot.lookup("#form-part").queryAs(ComboBox.class).getValue();
    }

    @Test
    void theChosenPartStaysWhileElementsComeAndGo(FxRobot robot) {
        robot.interact(() -> edited.select(new LinkPart.Element(Site.ALICE, 1)));
        robot.interact(() ->
                edited.design().edit("added", ElementEdits.add(edited.design().scenario(), "alice", "loss", 0)));
        assertThat(chosen(robot)).isEqualTo(new LinkPart.Element(Site.ALICE, 2));
        robot.interact(() -> edited.design().undo());
        assertThat(chosen(robot)).isEqualTo(new LinkPart.Element(Site.ALICE, 1));
        robot.interact(() -> edited.design().edit("removed", ElementEdits.remove("alice", 0)));
        assertThat(chosen(robot)).isEqualTo(new LinkPart.Element(Site.ALICE, 0));
        assertThat(edited.design().selectionProperty().get()).isEqualTo(chosen(robot));
    }

    @Test
    void aLongNumberIsSeenAsAWhole(FxRobot robot) {
        type(robot, "#form-alice-detectors-0-dead-time-ns", "54774.86");
        TextField field = robot.lookup("#form-alice-detectors-0-dead-time-ns").queryAs(TextField.class);
        Text shown = (Text) field.lookup(".text");
        assertThat(shown.getText()).isEqualTo("54774.86");
        assertThat(shown.getLayoutBounds().getWidth())
                .isPositive()
                .isLessThan(field.getWidth()
                        - field.getInsets().getLeft()
                        - field.getInsets().getRight());
    }

    @Test
    void theSourcesOfAClassUnfoldWithItsField(FxRobot robot) {
        TitledPane sources = robot.lookup("#form-class-sources").queryAs(TitledPane.class);
        robot.interact(() -> robot.lookup(EFFICIENCY).queryAs(TextField.class).requestFocus());
        assertThat(sources.isExpanded()).isFalse();
        robot.interact(() -> robot.lookup("#form-alice-detectors-0-class")
                .queryAs(ComboBox.class)
                .requestFocus());
        assertThat(sources.isExpanded()).isTrue();
    }

    /** Five lines of 12 px with the usual leading are 85 px; the source is a field of its own. */
    @Test
    void theExplanationTakesWhatItNeeds(FxRobot robot) {
        robot.interact(() -> robot.lookup(EFFICIENCY).queryAs(TextField.class).requestFocus());
        double needed = robot.lookup(".form-explanation").queryAs(Region.class).getHeight();
        assertThat(needed).isBetween(40.0, 105.0);
        robot.moveTo("#form-part");
        robot.interact(() -> edited.select(new LinkPart.Promise()));
        robot.interact(() -> robot.lookup("#form-part").query().requestFocus());
        assertThat(robot.lookup(".form-explanation").queryAs(Region.class).getHeight())
                .isLessThan(needed);
    }

    @Test
    void anotherClassChangesTheTableBelow(FxRobot robot) {
        robot.interact(() -> {
            @SuppressWarnings("unchecked")
            ComboBox<String> classes =
                    robot.lookup("#form-alice-detectors-0-class").queryAs(ComboBox.class);
            classes.setValue("ingaas-gated");
        });
        assertThat(edited.text()).contains("\"class\": \"ingaas-gated\", \"efficiency\": 0.82");
        assertThat(robot.lookup("#form-class .form-note").queryAs(Label.class).getText())
                .isEqualTo("InGaAs/InP avalanche diode, gated");
    }
}

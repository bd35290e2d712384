package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.Designs;
import binspan.planner.viewmodel.HeldBackground;
import binspan.planner.viewmodel.LinkPart;
import binspan.planner.viewmodel.PartOfPath;
import binspan.planner.viewmodel.VerdictLinks;
import binspan.planner.viewmodel.VerdictModel;
import binspan.planner.viewmodel.VerdictRoom;
import binspan.planner.viewmodel.VerdictText;
import binspan.planner.viewmodel.Words;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

@ExtendWith(ApplicationExtension.class)
final class RoomPageTest {
    private Stage stage;

    @Start
    void start(Stage shown) {
        stage = shown;
    }

    private void show(FxRobot robot, VerdictModel model, Design design) {
        robot.interact(() -> {
            Look look = new Look();
            Scene scene = new Scene(new RoomPage(model, design, look), 630.0, 520.0);
            look.dress(scene);
            stage.setScene(scene);
            stage.show();
            stage.sizeToScene();
        });
    }

    private VerdictModel show(FxRobot robot, Design design) {
        VerdictModel model = new VerdictModel(design, Background.NONE);
        show(robot, model, design);
        return model;
    }

    private static HeadroomTable table(FxRobot robot) {
        return robot.lookup("#room-headroom").queryAs(HeadroomTable.class);
    }

    private static List<String> texts(FxRobot robot, String block) {
        List<String> texts = new ArrayList<>();
        Node within = robot.lookup(block).query();
        robot.from(within).lookup(".label").queryAllAs(Label.class).forEach(label -> texts.add(label.getText()));
        return texts;
    }

    private static void set(Design design, String path, double value) {
        design.change("number", null, scenario -> VerdictLinks.with(scenario, path, value));
    }

    @Test
    void showsAllThatTheModelFound(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = show(robot, design);
        assertThat(table(robot).getItems())
                .isEqualTo(model.fullProperty().get().rows())
                .isNotEmpty();
        assertThat(texts(robot, "#room-stability"))
                .containsAll(model.fullProperty().get().limits().stream()
                        .map(VerdictRoom.Limit::value)
                        .toList());
        assertThat(texts(robot, "#room-cautions"))
                .containsAll(model.sheetProperty().get().cautions().stream()
                        .map(VerdictText::line)
                        .toList());
        assertThat(texts(robot, "#room-safety"))
                .containsAll(model.sheetProperty().get().safety());
    }

    @Test
    void limitsHaveTheirSideInTheTable(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = show(robot, design);
        for (int i = 0; i < table(robot).getItems().size(); i++) {
            assertThat(table(robot).getColumns().get(2).getCellData(i))
                    .isEqualTo(model.fullProperty().get().rows().get(i).sidedLimit());
        }
        assertThat(Words.of("page.room")).isEqualTo(model.fullProperty().get().title());
    }

    @Test
    void rowSelectsItsPartOfTheLink(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.meeting());
        show(robot, design);
        List<VerdictRoom.Row> rows = table(robot).getItems();
        for (VerdictRoom.Row row : rows) {
            robot.interact(() -> table(robot).getSelectionModel().select(row));
            assertThat(design.selectionProperty().get())
                    .as(row.path())
                    .isEqualTo(PartOfPath.find(design.scenario(), row.path()));
        }
    }

    @Test
    void rowsAreChosenByMouseAndKeyboard(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.meeting());
        show(robot, design);
        Node top = robot.lookup(".table-row-cell").nth(0).query();
        robot.clickOn(top);
        LinkPart first = PartOfPath.find(
                design.scenario(), table(robot).getItems().get(0).path());
        assertThat(design.selectionProperty().get()).isEqualTo(first);
        int other = 0;
        while (PartOfPath.find(
                        design.scenario(), table(robot).getItems().get(other).path())
                .equals(first)) {
            other++;
        }
        for (int i = 0; i < other; i++) {
            robot.push(KeyCode.DOWN);
        }
        assertThat(design.selectionProperty().get())
                .isNotEqualTo(first)
                .isEqualTo(PartOfPath.find(
                        design.scenario(), table(robot).getItems().get(other).path()));
    }

    /** New figures of a row that is selected must not take the selection back from another part. */
    @Test
    void renewedRowsDoNotSelect(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.meeting());
        show(robot, design);
        robot.interact(() -> table(robot).getSelectionModel().select(0));
        String path = table(robot).getSelectionModel().getSelectedItem().path();
        robot.interact(() -> design.selectionProperty().set(new LinkPart.Promise()));
        robot.interact(() -> set(design, "bob.repairMarginDb", 1.5));
        assertThat(design.selectionProperty().get()).isEqualTo(new LinkPart.Promise());
        assertThat(table(robot).getSelectionModel().getSelectedItem().path()).isEqualTo(path);
    }

    @Test
    void copiesItselfAsText(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = show(robot, design);
        robot.interact(() -> table(robot).requestFocus());
        robot.push(KeyCode.SHORTCUT, KeyCode.C);
        String[] copied = new String[1];
        robot.interact(() -> copied[0] = Clipboard.getSystemClipboard().getString());
        assertThat(copied[0])
                .isEqualTo(VerdictText.of(
                        model.sheetProperty().get(), model.fullProperty().get()));
    }

    @Test
    void emptyStatesAreWords(FxRobot robot) {
        Scenario failing = VerdictLinks.failing();
        show(robot, Designs.of(failing));
        assertThat(((Label) table(robot).getPlaceholder()).getText()).isEqualTo("None: no stated requirement is met.");
        assertThat(texts(robot, "#room-stability")).contains("No limit was found.");
        assertThat(texts(robot, "#room-changes")).contains("Nothing has changed since the link was saved.");
    }

    @Test
    void changesAreListed(FxRobot robot) {
        Design design = Designs.of(VerdictLinks.meeting());
        show(robot, design);
        robot.interact(() -> set(design, "timing.windowWidthPs", 350.0));
        assertThat(texts(robot, "#room-changes"))
                .containsExactly("Changed since saved", "window width: 400 ps → 350 ps");
        assertThat(robot.lookup("#room-changes").query().getAccessibleText())
                .isEqualTo("Changed since saved: window width: 400 ps → 350 ps");
    }

    @Test
    void everyBlockIsReachedByTheKeyboard(FxRobot robot) {
        show(robot, Designs.of(VerdictLinks.meeting()));
        robot.interact(() -> table(robot).requestFocus());
        List<String> visited = new ArrayList<>();
        for (int i = 0; i < 6; i++) {
            Node owner = stage.getScene().getFocusOwner();
            visited.add(owner.getId());
            assertThat(owner.getAccessibleText()).as(owner.getId()).isNotBlank();
            robot.push(KeyCode.TAB);
        }
        assertThat(visited)
                .contains("room-headroom", "room-cautions", "room-stability", "room-changes", "room-safety")
                .doesNotContain("room-scroll");
    }

    @Test
    void roomOfAnOlderLinkIsDimmed(FxRobot robot) throws TimeoutException {
        HeldBackground held = new HeldBackground();
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = new VerdictModel(design, held.background());
        show(robot, model, design);
        assertThat(((Label) table(robot).getPlaceholder()).getText()).startsWith("computing");
        robot.interact(held::finish);
        robot.interact(() -> set(design, "timing.windowWidthPs", 350.0));
        WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, () -> table(robot).getOpacity() < 1.0);
        robot.interact(held::finish);
        WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, () -> table(robot).getOpacity() == 1.0);
        assertThat(model.fullStaleProperty().get()).isFalse();
    }
}

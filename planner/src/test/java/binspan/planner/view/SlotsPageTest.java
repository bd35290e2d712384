package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.optics.Window;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.Designs;
import binspan.planner.viewmodel.SlotPlot;
import binspan.planner.viewmodel.SlotsModel;
import binspan.planner.viewmodel.Words;
import java.awt.image.BufferedImage;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.paint.Color;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The page of the slots: its handles moved by mouse and keys, and what stands in which pixels. */
@ExtendWith(ApplicationExtension.class)
class SlotsPageTest {
    private static final double PICO = 1e-12;

    private final Look look = new Look();
    private Design design;
    private SlotsModel model;
    private SlotsPage page;

    @Start
    void show(Stage stage) {
        design = new Design(Designs.shipped("kestrel-dam-to-millbrook"));
        model = new SlotsModel(design, Background.NONE);
        page = new SlotsPage(model, look);
        Scene scene = new Scene(page, 640.0, 540.0);
        look.dress(scene);
        stage.setScene(scene);
        stage.show();
        stage.sizeToScene();
    }

    private SlotPlot plot(String id) {
        return model.plotsProperty().get().stream()
                .filter(plot -> plot.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    private HistogramPlot shown(String id) {
        return (HistogramPlot) page.lookup("#slots-" + id);
    }

    private TimeFrame frame(String id) {
        HistogramPlot shown = shown(id);
        return TimeFrame.of(
                look,
                shown.getWidth(),
                shown.getHeight(),
                new TimeFrame.SlotPlotFrame(
                        plot(id).bins(),
                        plot(id).highest(),
                        model.logarithmicProperty().get(),
                        !id.equals("alice")));
    }

    private double middle(String handle) {
        Bounds bounds = page.lookup("#" + handle).getBoundsInParent();
        return (bounds.getMinX() + bounds.getMaxX()) / 2.0;
    }

    private void drag(FxRobot robot, String handle, double dx) {
        Node node = page.lookup("#" + handle);
        Bounds bounds = node.localToScreen(node.getBoundsInLocal());
        double x = (bounds.getMinX() + bounds.getMaxX()) / 2.0;
        double y = (bounds.getMinY() + bounds.getMaxY()) / 2.0;
        robot.moveTo(x, y).press(MouseButton.PRIMARY);
        robot.moveTo(x + dx / 2.0, y).moveTo(x + dx, y).release(MouseButton.PRIMARY);
        WaitForAsyncUtils.waitForFxEvents();
    }

    @Test
    void handlesStandOnTheEdgesOfTheWindowAndOnTheLastPeak() {
        for (String id : new String[] {"alice", "bob", "pair"}) {
            Window window = plot(id).windows().get(plot(id).central());
            TimeFrame frame = frame(id);
            assertThat(middle("slots-" + id + "-window-left")).isCloseTo(frame.x(window.from()), within(1.0));
            assertThat(middle("slots-" + id + "-window-right")).isCloseTo(frame.x(window.to()), within(1.0));
            double last = plot(id).peaks().get(plot(id).peaks().size() - 1).time();
            assertThat(middle("slots-" + id + "-separation")).isCloseTo(frame.x(last), within(1.0));
        }
    }

    @Test
    void draggingAnEdgeWidensTheWindowByTwiceTheWay(FxRobot robot) {
        TimeFrame frame = frame("alice");
        double before = model.window();
        double time = (frame.to() - frame.from()) / frame.width();
        drag(robot, "slots-alice-window-right", 12.0);
        assertThat(model.window()).isCloseTo(before + 24.0 * time, within(3.0 * time));
        drag(robot, "slots-bob-window-left", 12.0);
        assertThat(model.window()).isCloseTo(before, within(6.0 * time));
        robot.interact(design::undo);
        assertThat(model.window()).as("each drag is one step").isCloseTo(before + 24.0 * time, within(3.0 * time));
        robot.interact(design::undo);
        assertThat(model.window()).isEqualTo(before);
    }

    @Test
    void draggingThePeakChangesTheImbalanceAndTheAxisStandsStillMeanwhile(FxRobot robot) {
        TimeFrame frame = frame("bob");
        double before = model.separation();
        double time = (frame.to() - frame.from()) / frame.width();
        Node handle = page.lookup("#slots-bob-separation");
        Bounds bounds = handle.localToScreen(handle.getBoundsInLocal());
        double x = (bounds.getMinX() + bounds.getMaxX()) / 2.0;
        double y = (bounds.getMinY() + bounds.getMaxY()) / 2.0;
        robot.moveTo(x, y).press(MouseButton.PRIMARY).moveTo(x - 15.0, y).moveTo(x - 30.0, y);
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(model.separation()).isCloseTo(before - 30.0 * time, within(2.5 * time));
        assertThat(middle("slots-bob-separation"))
                .as("it stays under the pointer")
                .isCloseTo(frame.x(plot("bob").peaks().get(2).time()), within(1.0));
        robot.release(MouseButton.PRIMARY);
        WaitForAsyncUtils.waitForFxEvents();
        robot.interact(design::undo);
        assertThat(model.separation()).isEqualTo(before);
    }

    @Test
    void arrowKeysChangeByOneAndWithShiftByTenPerCent(FxRobot robot) {
        double window = model.window();
        double separation = model.separation();
        robot.interact(() -> page.lookup("#slots-pair-window-right").requestFocus());
        robot.type(KeyCode.RIGHT);
        assertThat(model.window()).isCloseTo(1.01 * window, within(1e-3 * PICO));
        robot.press(KeyCode.SHIFT).type(KeyCode.DOWN).release(KeyCode.SHIFT);
        assertThat(model.window()).isCloseTo(0.9 * 1.01 * window, within(1e-3 * PICO));
        robot.interact(() -> page.lookup("#slots-pair-separation").requestFocus());
        robot.type(KeyCode.LEFT);
        assertThat(model.separation()).isCloseTo(0.99 * separation, within(1e-3 * PICO));
        assertThat(page.lookup("#slots-pair-window-right").getAccessibleText()).contains("364 ps");
        robot.interact(design::undo);
        robot.interact(design::undo);
        assertThat(model.window()).as("keys on one handle are one step").isEqualTo(window);
    }

    @Test
    void otherKeysAndOtherButtonsMoveNothing(FxRobot robot) {
        double window = model.window();
        robot.interact(() -> page.lookup("#slots-alice-window-right").requestFocus());
        robot.type(KeyCode.A).type(KeyCode.PAGE_UP);
        robot.clickOn("#slots-alice-window-right");
        assertThat(model.window()).isEqualTo(window);
        assertThat(design.undoTextProperty().get()).isEmpty();
    }

    private BufferedImage picture(FxRobot robot, String id) {
        BufferedImage[] image = new BufferedImage[1];
        robot.interact(() -> {
            Canvas canvas = (Canvas) shown(id).getChildrenUnmodifiable().get(0);
            image[0] = FxImages.of(canvas.snapshot(null, null));
        });
        return image[0];
    }

    private static Color colour(BufferedImage image, double x, double y) {
        int argb = image.getRGB((int) x, (int) y);
        return Color.rgb(argb >> 16 & 255, argb >> 8 & 255, argb & 255);
    }

    private static boolean plain(Color colour, Color ground) {
        return Math.abs(colour.getRed() - ground.getRed())
                        + Math.abs(colour.getGreen() - ground.getGreen())
                        + Math.abs(colour.getBlue() - ground.getBlue())
                < 0.03;
    }

    /** How high the drawing reaches above the lower edge at a time: pixels that are no bare ground, counted from below. */
    private double height(BufferedImage image, TimeFrame frame, double time, Color ground) {
        int x = (int) Math.round(frame.x(time));
        int bottom = (int) (frame.top() + frame.height()) - 2;
        int y = bottom;
        while (y > frame.top() && !plain(colour(image, x, y), ground)) {
            y--;
        }
        return bottom - y;
    }

    @Test
    void peaksAreDrawnWhereTheyAreAndNothingFarFromThem(FxRobot robot) {
        BufferedImage image = picture(robot, "pair");
        TimeFrame frame = frame("pair");
        Color ground = look.palette().panel();
        double side = plot("pair").peaks().get(2).time();
        assertThat(height(image, frame, side, ground)).isGreaterThan(10.0);
        // Half way between the peaks no more than accidentals are left, less than a line is thick.
        assertThat(height(image, frame, side * 0.62, ground)).isLessThan(6.0);
    }

    @Test
    void logarithmicScaleRaisesWhatIsSmall(FxRobot robot) {
        double time = faint(plot("pair"));
        double linear = height(
                picture(robot, "pair"), frame("pair"), time, look.palette().panel());
        robot.clickOn("#slots-log");
        assertThat(model.logarithmicProperty().get()).isTrue();
        double logarithmic = height(
                picture(robot, "pair"), frame("pair"), time, look.palette().panel());
        assertThat(logarithmic).isGreaterThan(linear + 10.0);
    }

    /** Where a histogram is between a hundredth and a thousandth of its highest bar. */
    private static double faint(SlotPlot plot) {
        for (int bin = 0; bin < plot.bins().count(); bin++) {
            int at = bin;
            double share = plot.layers().stream()
                            .mapToDouble(layer -> layer.perSecond()[at])
                            .sum()
                    / plot.highest();
            if (share > 1e-3 && share < 1e-2) {
                return plot.bins().middle(bin);
            }
        }
        throw new IllegalStateException("no faint bin");
    }

    @Test
    void allPortsChangeTheTitle(FxRobot robot) {
        robot.clickOn("#slots-all-ports");
        assertThat(page.lookupAll(".heading"))
                .anyMatch(node ->
                        node instanceof Label label && label.getText().equals(Words.of("slots.title.pair.all")));
    }

    @Test
    void drawingFollowsThemeAndScale(FxRobot robot) {
        TimeFrame before = frame("pair");
        robot.interact(() -> look.themeProperty().set(Theme.DARK));
        BufferedImage dark = picture(robot, "pair");
        double empty = plot("pair").peaks().get(2).time() * 0.62;
        assertThat(plain(
                        colour(dark, before.x(empty), before.top() + before.height() / 2.0 + 3.0),
                        Theme.DARK.palette().panel()))
                .isTrue();
        robot.interact(() -> look.scalePercentProperty().set(150));
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(frame("pair").left()).isCloseTo(1.5 * before.left(), within(1e-9));
        assertThat(middle("slots-pair-separation"))
                .isCloseTo(frame("pair").x(plot("pair").peaks().get(2).time()), within(1.0));
    }

    @Test
    void continuousPumpShowsOnePlotAndSaysWhy(FxRobot robot) {
        robot.interact(() -> design.begin(Designs.shipped("stonebridge-to-lower-weir")));
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(page.lookup("#slots-alice")).isNull();
        assertThat(page.lookupAll(".soft"))
                .anyMatch(node -> node instanceof Label label
                        && label.isVisible()
                        && label.getText().equals(Words.of("slots.flat")));
        assertThat(shown("pair").getAccessibleText()).contains(plot("pair").note());
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.BackgroundFill;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import javafx.scene.paint.LinearGradient;
import javafx.scene.paint.Paint;
import javafx.scene.paint.Stop;
import javafx.scene.text.Text;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;

/** Everything has its place in small windows and large, and can be read in light and dark. */
@ExtendWith(ApplicationExtension.class)
final class WindowSpaceTest {
    private static final double LEAST_CONTRAST = 4.5;
    private static final double ROUNDING = 1.0;

    @TempDir
    private Path directory;

    private WholeWindow window;

    private void open(FxRobot robot, String theme, int scale, double width, double height) throws IOException {
        window = new WholeWindow(robot, directory)
                .show(WholeWindow.copy("kestrel-dam-to-millbrook", directory), theme, scale);
        window.act(() -> {
            window.stage().setX(0.0);
            window.stage().setY(0.0);
            window.stage().setWidth(width);
            window.stage().setHeight(height);
        });
        window.judged();
        assertThat(window.stage().getScene().getWidth()).isEqualTo(width);
    }

    @AfterEach
    void end() {
        window.end();
    }

    private List<Node> all() {
        return WholeWindow.below(window.stage().getScene().getRoot(), Node::isVisible).stream()
                .filter(Node::isVisible)
                .toList();
    }

    private static boolean within(Node node, Class<?> type) {
        return node != null && (type.isInstance(node) || within(node.getParent(), type));
    }

    private static boolean scrolls(ScrollPane pane) {
        Bounds room = pane.getViewportBounds();
        Bounds content = pane.getContent().getLayoutBounds();
        boolean across = content.getWidth() > room.getWidth() + ROUNDING;
        return across || content.getHeight() > room.getHeight() + ROUNDING;
    }

    @ParameterizedTest
    @CsvSource({"100, 1280, 800", "200, 2560, 1600"})
    void nothingImportantIsScrolled(int scale, double width, double height, FxRobot robot) throws IOException {
        open(robot, "light", scale, width, height);
        window.page("map");
        window.until("map", () -> window.model().map().regionProperty().get() != null);
        window.until("quiet", () -> window.working() == 0);
        window.page("map");
        List<Node> scrolled = window.get(() -> all().stream()
                .filter(each -> each instanceof ScrollPane pane && scrolls(pane) && !within(pane, FormPane.class))
                .toList());
        assertThat(scrolled).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({"100, 1280, 800", "100, 1024, 700", "200, 2560, 1600", "200, 2048, 1400"})
    void everythingIsInsideTheWindow(int scale, double width, double height, FxRobot robot) throws IOException {
        open(robot, "dark", scale, width, height);
        for (String page : window.session().window().keys()) {
            window.page(page);
            assertThat(window.get(() -> misplaced(width, height))).as(page).isEmpty();
        }
        assertThat(width).isGreaterThanOrEqualTo(window.stage().getMinWidth());
        assertThat(height).isGreaterThanOrEqualTo(window.stage().getMinHeight());
    }

    private List<String> misplaced(double width, double height) {
        List<String> misplaced = new ArrayList<>();
        for (Node node : all()) {
            Bounds bounds = node.localToScene(node.getLayoutBounds());
            boolean outside = bounds.getMinX() < -ROUNDING
                    || bounds.getMinY() < -ROUNDING
                    || bounds.getMaxX() > width + ROUNDING
                    || bounds.getMaxY() > height + ROUNDING;
            boolean empty = bounds.getWidth() <= 0.0 || bounds.getHeight() <= 0.0;
            boolean told = node instanceof Labeled labeled
                    && !String.valueOf(labeled.getText()).isEmpty();
            boolean part = told || node.isFocusTraversable();
            if (part && !scrollable(node) && (outside || empty)) {
                misplaced.add(node + " " + bounds);
            }
        }
        return misplaced;
    }

    /** Whether it lies within what one can scroll: there it need not be seen at once. */
    private static boolean scrollable(Node node) {
        return node != null
                && (node.getStyleClass().contains("viewport")
                        || node.getStyleClass().contains("clipped-container")
                        || scrollable(node.getParent()));
    }

    @ParameterizedTest
    @CsvSource({"light", "dark"})
    void allTextIsReadable(String theme, FxRobot robot) throws IOException {
        open(robot, theme, 100, 1280.0, 800.0);
        for (String page : window.session().window().keys()) {
            window.page(page);
            window.until("quiet", () -> window.working() == 0);
            assertThat(window.get(() -> texts().size())).isGreaterThan(100);
            List<String> faint = window.get(
                    () -> texts().stream().flatMap(WindowSpaceTest::faint).toList());
            assertThat(faint).as(page).isEmpty();
        }
    }

    /** What is written on the window; the guidelines ask no contrast of what cannot be used at present. */
    private List<Text> texts() {
        return all().stream()
                .filter(each -> each instanceof Text && !each.isDisabled())
                .map(Text.class::cast)
                .filter(text -> !text.getText().isBlank())
                .toList();
    }

    private static Stream<String> faint(Text text) {
        double least = colours(text.getFill()).stream()
                .flatMap(ink -> grounds(text.getParent()).stream().map(ground -> contrast(over(ink, ground), ground)))
                .min(Double::compare)
                .orElseThrow();
        return least >= LEAST_CONTRAST
                ? Stream.empty()
                : Stream.of(text.getText() + " in " + text.getParent() + ": " + least);
    }

    /** The colours behind a text: those of the nearest ground that covers, with all that lies over it. */
    private static List<Color> grounds(Node node) {
        if (node == null) {
            return List.of(Color.WHITE);
        }
        List<Color> own = List.of();
        if (node instanceof Region region && region.getBackground() != null) {
            List<BackgroundFill> fills = region.getBackground().getFills();
            own = fills.isEmpty() ? own : colours(fills.get(fills.size() - 1).getFill());
        }
        if (!own.isEmpty() && own.stream().allMatch(Color::isOpaque)) {
            return own;
        }
        List<Color> below = grounds(node.getParent());
        return own.isEmpty()
                ? below
                : own.stream()
                        .flatMap(each -> below.stream().map(ground -> over(each, ground)))
                        .toList();
    }

    private static List<Color> colours(Paint paint) {
        return paint instanceof LinearGradient gradient
                ? gradient.getStops().stream().map(Stop::getColor).toList()
                : List.of((Color) paint);
    }

    private static Color over(Color upper, Color lower) {
        double share = upper.getOpacity();
        return lower.interpolate(new Color(upper.getRed(), upper.getGreen(), upper.getBlue(), 1.0), share);
    }

    /** The contrast ratio of the Web Content Accessibility Guidelines 2.1, from memory. */
    private static double contrast(Color one, Color other) {
        double first = luminance(one);
        double second = luminance(other);
        return (Math.max(first, second) + 0.05) / (Math.min(first, second) + 0.05);
    }

    private static double luminance(Color colour) {
        return 0.2126 * linear(colour.getRed())
                + 0.7152 * linear(colour.getGreen())
                + 0.0722 * linear(colour.getBlue());
    }

    private static double linear(double value) {
        return value <= 0.03928 ? value / 12.92 : Math.pow((value + 0.055) / 1.055, 2.4);
    }

    /** The extremes of the guidelines: black on white is 21:1, a colour on itself 1:1. */
    @Test
    void contrastIsThatOfTheGuidelines(FxRobot robot) throws IOException {
        open(robot, "light", 100, 1280.0, 800.0);
        assertThat(contrast(Color.BLACK, Color.WHITE)).isEqualTo(21.0);
        assertThat(contrast(Color.GRAY, Color.GRAY)).isEqualTo(1.0);
        assertThat(all()).anyMatch(Label.class::isInstance);
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.viewmodel.LinkPart;
import java.io.IOException;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;

/** All of the window is reached, and told in words, without a mouse. */
@ExtendWith(ApplicationExtension.class)
final class WindowKeysTest {
    private static final int MOST_STOPS = 200;

    @TempDir
    private Path directory;

    private WholeWindow window;

    @BeforeEach
    void open(FxRobot robot) throws IOException {
        window = new WholeWindow(robot, directory).showing(WholeWindow.copy("kestrel-dam-to-millbrook", directory));
    }

    @AfterEach
    void end() {
        window.end();
    }

    private Node focused() {
        Node owner = window.get(() -> window.stage().getScene().getFocusOwner());
        assertThat(owner).isNotNull();
        assertThat(window.get(() -> seen(owner))).as("%s is seen", owner).isTrue();
        return owner;
    }

    /** Shown, not of zero size, and within all that clips it. */
    private boolean seen(Node node) {
        Bounds bounds = node.localToScene(node.getLayoutBounds());
        boolean seen = bounds.getWidth() > 0.0 && bounds.getHeight() > 0.0;
        for (Node each = node; each != null; each = each.getParent()) {
            seen = seen && each.isVisible();
            if (each.getStyleClass().contains("viewport")) {
                seen = seen && each.localToScene(each.getLayoutBounds()).intersects(bounds);
            }
        }
        return seen && window.stage().getScene().getRoot().getLayoutBounds().intersects(bounds);
    }

    private String partOf(Node node) {
        for (Node each = node; each != null; each = each.getParent()) {
            if (each instanceof LinkStrip || each instanceof FormPane || each instanceof VerdictPane) {
                return each.getClass().getSimpleName();
            }
            if ("pages".equals(each.getId())) {
                return "pages";
            }
        }
        return "menus";
    }

    @Test
    void f6GoesThroughAllParts() {
        Set<String> visited = new LinkedHashSet<>();
        assertThat(partOf(focused())).isEqualTo("FormPane");
        for (int i = 0; i < 4; i++) {
            window.key(KeyCode.F6);
            visited.add(partOf(focused()));
        }
        assertThat(visited).containsExactly("pages", "VerdictPane", "LinkStrip", "FormPane");
    }

    @Test
    void numbersShowPages() {
        List<String> pages = window.session().window().keys();
        for (int i = 0; i < pages.size(); i++) {
            window.keys(KeyCode.valueOf("DIGIT" + (i + 1)), KeyCombination.SHORTCUT_DOWN);
            assertThat(window.get(window.session().window()::shown).key()).isEqualTo(pages.get(i));
            focused();
        }
    }

    /** What the keyboard should reach: controls, not the pieces that they are made of. */
    private Set<Node> reachable() {
        Set<Node> reachable = new LinkedHashSet<>();
        for (Node node : WholeWindow.below(
                window.stage().getScene().getRoot(),
                each -> each.isVisible() && !each.isDisabled() && !composed(each))) {
            if (node.isFocusTraversable() && node.isVisible() && !node.isDisabled()) {
                reachable.add(node);
            }
        }
        return reachable;
    }

    private static boolean composed(Node node) {
        return node.isFocusTraversable() && node instanceof Control && !"pages".equals(node.getId());
    }

    @Test
    void tabReachesEveryControlOfEveryPage() {
        for (String page : window.session().window().keys()) {
            window.page(page);
            window.until("quiet", () -> window.working() == 0);
            window.act(() -> window.session().window().begin());
            Set<Node> visited = new HashSet<>();
            Node start = focused();
            Node at = start;
            do {
                visited.add(at);
                window.key(KeyCode.TAB);
                at = focused();
            } while (at != start && visited.size() < MOST_STOPS);
            assertThat(at).as(page).isSameAs(start);
            assertThat(window.get(this::reachable)).as(page).isSubsetOf(visited);
        }
    }

    @Test
    void everythingThatIsReachedSaysWhatItIs() {
        for (String page : window.session().window().keys()) {
            window.page(page);
            window.until("quiet", () -> window.working() == 0);
            for (Node node : window.get(this::reachable)) {
                assertThat(window.get(() -> named(node)))
                        .as("%s: %s", page, node)
                        .isTrue();
            }
        }
    }

    private boolean named(Node node) {
        boolean own =
                node.getAccessibleText() != null && !node.getAccessibleText().isBlank();
        boolean text = node instanceof Labeled labeled
                && labeled.getText() != null
                && !labeled.getText().isBlank();
        return own
                || text
                || "pages".equals(node.getId())
                || labelled(window.stage().getScene().getRoot(), node);
    }

    private static boolean labelled(Parent root, Node node) {
        return WholeWindow.below(root, each -> true).stream()
                .anyMatch(each -> each instanceof Label label && label.getLabelFor() == node);
    }

    @Test
    void theLinkIsWalkedAndChangedByKeys() {
        window.key(KeyCode.F6);
        window.key(KeyCode.F6);
        window.key(KeyCode.F6);
        assertThat(partOf(focused())).isEqualTo("LinkStrip");
        while (!(focused() instanceof LinkNode)) {
            window.key(KeyCode.TAB);
        }
        int items = window.get(() -> window.model().link().items().size());
        for (int i = 0; i < items; i++) {
            window.key(KeyCode.LEFT);
            assertThat(focused()).isInstanceOf(LinkNode.class);
        }
        for (int i = 0; i < items && !(selected() instanceof LinkPart.Element); i++) {
            window.key(KeyCode.RIGHT);
        }
        LinkPart.Element element = (LinkPart.Element) selected();
        String before = window.get(
                () -> window.model().design().documentProperty().get().text());
        window.key(KeyCode.DELETE);
        assertThat(window.value(link -> element.site().arm(link).path().size())).isEqualTo(2.0);
        focused();
        window.keys(KeyCode.Z, KeyCombination.SHORTCUT_DOWN);
        assertThat(window.get(() ->
                                window.model().design().documentProperty().get().text())
                        .equals(before))
                .isTrue();
        focused();
    }

    private LinkPart selected() {
        return window.get(window.model().design().selectionProperty()::get);
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.LinkItem;
import binspan.planner.viewmodel.PlannerModel;
import binspan.scenario.Scenario;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.Predicate;
import java.util.function.Supplier;
import java.util.function.ToDoubleFunction;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Button;
import javafx.scene.control.DialogPane;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.robot.Robot;
import javafx.stage.Stage;
import javafx.stage.Window;
import org.testfx.api.FxRobot;
import org.testfx.util.WaitForAsyncUtils;

/** The whole window without a display, in directories of its own; fails in the end if anything was thrown or warned of. */
final class WholeWindow {
    private static final long PATIENCE_SECONDS = 60;

    private final FxRobot robot;
    private final Path directory;
    private final Deque<Path> answers = new ArrayDeque<>();
    private final Complaints complaints = new Complaints();
    private final AtomicInteger working = new AtomicInteger();
    private Session session;
    private Stage stage;

    /** A window that keeps its settings and copies in a directory; not yet shown. */
    WholeWindow(FxRobot robot, Path directory) {
        this.robot = robot;
        this.directory = directory;
    }

    /** Copies a shipped scenario into a directory. */
    static Path copy(String name, Path directory) throws IOException {
        return Files.copy(Path.of("../scenarios/" + name + ".json"), directory.resolve(name + ".json"));
    }

    /** Shows it with a file, null for a starter, and waits until it is there. */
    WholeWindow show(Path file, String theme, Integer scale) {
        Background usual = Background.of(Platform::runLater);
        Platform.runLater(() -> {
            stage = new Stage();
            session = new Session(
                    stage,
                    new Session.Places(settings(), recovery()),
                    new Background(counting(usual.workers()), usual.window()),
                    new Prepared(stage));
            session.show(file == null ? null : file.toString(), theme, scale);
        });
        until("the window is there", () -> stage != null && stage.isShowing());
        return this;
    }

    /** Shows a file and waits for its verdict. */
    WholeWindow showing(Path file) {
        show(file, "light", 100);
        judged();
        return this;
    }

    private Executor counting(Executor workers) {
        return work -> {
            working.incrementAndGet();
            workers.execute(() -> {
                try {
                    work.run();
                } finally {
                    working.decrementAndGet();
                }
            });
        };
    }

    /** Answers questions for files with what a test has prepared, and with nothing when nothing is left. */
    private final class Prepared extends FileQuestions {
        Prepared(Window owner) {
            super(owner, null);
        }

        @Override
        Optional<Path> toOpen(String title, String kind, String ending) {
            return Optional.ofNullable(answers.poll());
        }

        @Override
        Optional<Path> toSave(String title, String proposed, String kind, String... endings) {
            return Optional.ofNullable(answers.poll());
        }
    }

    /** The next answer to a question for a file. */
    void willAnswer(Path file) {
        answers.add(file);
    }

    Path settings() {
        return directory.resolve("settings");
    }

    Path recovery() {
        return directory.resolve("recovery");
    }

    Session session() {
        return session;
    }

    PlannerModel model() {
        return session.model();
    }

    Stage stage() {
        return stage;
    }

    /** What a piece of code gives on the window's thread. */
    <T> T get(Supplier<T> code) {
        return Platform.isFxApplicationThread() ? code.get() : Shown.onWindowThread(code);
    }

    /** A text that is asked on the window's thread. */
    String told(Supplier<String> text) {
        return get(text);
    }

    /** Does something on the window's thread and waits until all that follows from it there is done. */
    void act(Runnable code) {
        get(() -> {
            code.run();
            return 0;
        });
        WaitForAsyncUtils.waitForFxEvents();
    }

    /** Waits for something that is asked on the window's thread. */
    void until(String what, BooleanSupplier condition) {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        while (!Shown.onWindowThread(condition::getAsBoolean)) {
            assertThat(System.nanoTime())
                    .as("waited in vain: %s; %s", what, complaints.all())
                    .isLessThan(end);
            WaitForAsyncUtils.sleep(10, TimeUnit.MILLISECONDS);
        }
        WaitForAsyncUtils.waitForFxEvents();
    }

    /** Waits until the verdict is that of the present link. */
    void judged() {
        until(
                "verdict",
                () -> model().verdict().sheetProperty().get() != null
                        && !model().verdict().sheetStaleProperty().get());
    }

    /** Jobs that run in the background. */
    int working() {
        return working.get();
    }

    /** A part of the window by its id. */
    <T extends Node> T part(String id, Class<T> type) {
        Node found = get(() -> stage.getScene().lookup("#" + id));
        assertThat(found).as(id).isNotNull();
        return type.cast(found);
    }

    /** Presses keys together. */
    void keys(KeyCode key, KeyCombination.Modifier... modifiers) {
        robot.push(new KeyCodeCombination(key, modifiers));
    }

    /** Presses a key by itself, many times quicker. */
    void key(KeyCode key) {
        get(() -> {
            Robot hand = new Robot();
            hand.keyPress(key);
            hand.keyRelease(key);
            return key;
        });
        get(() -> key);
        get(() -> key);
    }

    /** Shows a page and lays it out. */
    void page(String key) {
        act(() -> session.window().show(key));
        act(() -> {
            stage.getScene().getRoot().applyCss();
            stage.getScene().getRoot().layout();
        });
    }

    /** An item of the menus. */
    MenuItem menu(String id) {
        return get(() -> items(part("menus", MenuBar.class).getMenus(), id).orElseThrow());
    }

    private static Optional<MenuItem> items(List<? extends MenuItem> items, String id) {
        for (MenuItem item : items) {
            Optional<MenuItem> found = id.equals(item.getId())
                    ? Optional.of(item)
                    : item instanceof Menu menu ? items(menu.getItems(), id) : Optional.empty();
            if (found.isPresent()) {
                return found;
            }
        }
        return Optional.empty();
    }

    /** Chooses an item of the menus, without waiting for what it asks. */
    void choose(String id) {
        MenuItem item = menu(id);
        assertThat(get(item::isDisable)).as(id).isFalse();
        Platform.runLater(item::fire);
    }

    /** The dialog that is open, awaited. */
    DialogPane dialog() {
        until("a dialog", () -> open().isPresent());
        return get(() -> open().orElseThrow());
    }

    private static Optional<DialogPane> open() {
        return Window.getWindows().stream()
                .filter(Window::isShowing)
                .map(window -> window.getScene().getRoot())
                .filter(DialogPane.class::isInstance)
                .map(DialogPane.class::cast)
                .findFirst();
    }

    /** Whether no dialog is open. */
    boolean undisturbed() {
        WaitForAsyncUtils.waitForFxEvents();
        return get(() -> open().isEmpty());
    }

    /** Answers the open dialog by clicking a button of these words. */
    void answer(String words) {
        DialogPane pane = dialog();
        Button button = (Button) get(() -> pane.getButtonTypes().stream()
                .filter(type -> type.getText().equals(words))
                .map(pane::lookupButton)
                .findFirst()
                .orElseThrow());
        robot.clickOn(button);
        until("the dialog is answered", () -> open().filter(pane::equals).isEmpty());
    }

    /** Nodes below a node, itself first. */
    static List<Node> below(Node node, Predicate<Node> into) {
        List<Node> nodes = new ArrayList<>();
        nodes.add(node);
        if (node instanceof Parent parent && into.test(node)) {
            parent.getChildrenUnmodifiable().forEach(child -> nodes.addAll(below(child, into)));
        }
        return nodes;
    }

    /** The drawn thing of the link that has a name. */
    Node drawn(String name) {
        return drawn(item -> item.name().equals(name));
    }

    private Node drawn(Predicate<LinkItem> wanted) {
        List<LinkItem> items = get(() -> model().link().items());
        int index = items.indexOf(items.stream().filter(wanted).findFirst().orElseThrow());
        return part("link-item-" + index, Node.class);
    }

    /** A number of the link. */
    double value(ToDoubleFunction<Scenario> of) {
        return get(() -> of.applyAsDouble(model().design().scenario()));
    }

    /** Leaves the window as if its process had ended, and says what was thrown or warned of. */
    void end() {
        try {
            for (Optional<DialogPane> left = get(WholeWindow::open); left.isPresent(); left = get(WholeWindow::open)) {
                Window window = left.get().getScene().getWindow();
                act(window::hide);
            }
            act(() -> stage.hide());
        } finally {
            complaints.close();
        }
        assertThat(complaints.all()).isEmpty();
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.Recovery;
import binspan.planner.viewmodel.Words;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;

/** Work that was not saved when the program ended is offered by the next window. */
@ExtendWith(ApplicationExtension.class)
final class WindowRecoveryTest {
    @TempDir
    private Path directory;

    private WholeWindow window;
    private Path file;
    private String original;

    /** Changes a link and leaves it as if the process had ended. */
    @BeforeEach
    void crash(FxRobot robot) throws IOException {
        file = WholeWindow.copy("kestrel-dam-to-millbrook", directory);
        original = Files.readString(file);
        WholeWindow first = new WholeWindow(robot, directory).showing(file);
        first.act(() -> first.model().slots().window(500e-12, null));
        first.until("copy", () -> copies().size() == 1);
        first.end();
        orphan();
        window = new WholeWindow(robot, directory);
    }

    @AfterEach
    void end() {
        window.end();
    }

    private List<Path> copies() {
        Path recovery = directory.resolve("recovery");
        if (!Files.isDirectory(recovery)) {
            return List.of();
        }
        try (Stream<Path> files = Files.list(recovery)) {
            return files.filter(each -> each.toString().endsWith(".json")).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Makes the copy that of an earlier process that had the same number. */
    private void orphan() throws IOException {
        Path copy = copies().get(0);
        String text = Files.readString(copy);
        Files.writeString(copy, text.replaceFirst("process since: .*", "process since: 2001-01-01T00:00:00Z"));
        assertThat(Recovery.left(directory.resolve("recovery"))).hasSize(1);
    }

    private double width() {
        return window.value(link -> link.timing().windowWidthPs());
    }

    private String title() {
        return window.get(() -> window.stage().getTitle());
    }

    private void undo() {
        window.keys(KeyCode.Z, KeyCombination.SHORTCUT_DOWN);
    }

    @Test
    void takenUpItIsUnsavedWorkOnTheFile() throws IOException {
        window.show(null, "light", 100);
        assertThat(window.dialog().getContent().toString())
                .contains(file.getFileName().toString());
        window.answer(Words.of("dialog.recover.take"));
        window.judged();
        assertThat(width()).isEqualTo(500.0);
        assertThat(title()).isEqualTo("kestrel-dam-to-millbrook.json (changed) — Binspan");
        undo();
        assertThat(width()).isEqualTo(400.0);
        assertThat(title()).doesNotContain("(changed)");
        window.keys(KeyCode.S, KeyCombination.SHORTCUT_DOWN);
        assertThat(Files.readString(file)).isEqualTo(original);
    }

    @Test
    void takenUpItSurvivesAnotherCrash(FxRobot robot) throws IOException {
        for (boolean changed : new boolean[] {false, true}) {
            if (changed) {
                Files.writeString(file, original.replace("\"durationS\": 3600", "\"durationS\": 7200"));
            }
            window.show(null, "light", 100);
            window.answer(Words.of("dialog.recover.take"));
            window.judged();
            assertThat(width()).isEqualTo(500.0);
            window.until(
                    "a copy of its own",
                    () -> copies().size() == 1
                            && Recovery.left(window.recovery()).isEmpty());
            window.end();
            orphan();
            window = new WholeWindow(robot, directory);
        }
        window.show(null, "light", 100);
        window.answer(Words.of("dialog.recover.take"));
        assertThat(width()).isEqualTo(500.0);
    }

    @Test
    void thrownAwayItIsGone(FxRobot robot) {
        window.show(file, "light", 100);
        window.answer(Words.of("dialog.recover.discard"));
        window.judged();
        assertThat(width()).isEqualTo(400.0);
        assertThat(copies()).isEmpty();
        window.end();
        window = new WholeWindow(robot, directory).showing(null);
        assertThat(window.undisturbed()).isTrue();
    }

    @Test
    void leftForLaterItIsOfferedAgain(FxRobot robot) {
        window.show(file, "light", 100);
        window.answer(Words.of("dialog.recover.later"));
        window.judged();
        window.end();
        window = new WholeWindow(robot, directory).show(null, "light", 100);
        window.answer(Words.of("dialog.recover.take"));
        assertThat(width()).isEqualTo(500.0);
    }

    @Test
    void aFileThatChangedMeanwhileIsNotReplacedUnasked() throws IOException {
        String other = original.replace("\"durationS\": 3600", "\"durationS\": 7200");
        Files.writeString(file, other);
        window.show(null, "light", 100);
        window.answer(Words.of("dialog.recover.take"));
        window.judged();
        assertThat(width()).isEqualTo(500.0);
        assertThat(window.value(link -> link.acquisition().durationS())).isEqualTo(3600.0);
        assertThat(title()).contains("(changed)");
        window.keys(KeyCode.S, KeyCombination.SHORTCUT_DOWN);
        window.answer("Cancel");
        assertThat(Files.readString(file)).isEqualTo(other);
        window.keys(KeyCode.S, KeyCombination.SHORTCUT_DOWN);
        window.answer(Words.of("file.save.replace"));
        assertThat(Files.readString(file))
                .isEqualTo(original.replace("\"windowWidthPs\": 400", "\"windowWidthPs\": 500"));
    }
}

package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.cli.Run;
import binspan.planner.document.RecentFiles;
import binspan.planner.io.Preset;
import binspan.planner.viewmodel.Words;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import javafx.application.Platform;
import javafx.scene.control.Label;
import javafx.scene.control.Menu;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.stage.WindowEvent;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;

/** Files come and go without anything lost, and say what the command line says. */
@ExtendWith(ApplicationExtension.class)
final class WindowFilesTest {
    private static final String ENCODING = "stdout.encoding";

    @TempDir
    private Path directory;

    private WholeWindow window;
    private Path file;
    private String original;

    @BeforeEach
    void open(FxRobot robot) throws IOException {
        file = WholeWindow.copy("kestrel-dam-to-millbrook", directory);
        original = Files.readString(file);
        window = new WholeWindow(robot, directory).showing(file);
    }

    @AfterEach
    void end() {
        window.end();
    }

    private void change() {
        window.act(() -> window.model().slots().window(500e-12, null));
    }

    private String changed() {
        return original.replace("\"windowWidthPs\": 400", "\"windowWidthPs\": 500");
    }

    private void save() {
        window.keys(KeyCode.S, KeyCombination.SHORTCUT_DOWN);
    }

    private void close() {
        Platform.runLater(
                () -> window.stage().fireEvent(new WindowEvent(window.stage(), WindowEvent.WINDOW_CLOSE_REQUEST)));
    }

    private boolean showing() {
        return window.get(window.stage()::isShowing);
    }

    private void closed() {
        window.until("closed", () -> !window.stage().isShowing());
    }

    @Test
    void anUnchangedLinkIsLeftWithoutAQuestion() {
        close();
        closed();
        assertThat(window.undisturbed()).isTrue();
    }

    @Test
    void savedWhenItIsClosed() throws IOException {
        change();
        close();
        window.answer(Words.of("dialog.unsaved.save"));
        closed();
        assertThat(Files.readString(file)).isEqualTo(changed());
    }

    @Test
    void notSavedWhenItIsClosed() throws IOException {
        change();
        close();
        window.answer(Words.of("dialog.unsaved.discard"));
        closed();
        assertThat(Files.readString(file)).isEqualTo(original);
        window.act(window.session()::closed);
        try (var copies = Files.list(window.recovery())) {
            assertThat(copies).isEmpty();
        }
        assertThat(Files.readString(window.settings().resolve("settings.properties")))
                .contains("theme=light");
    }

    @Test
    void notClosedAtAll() throws IOException {
        change();
        close();
        window.answer("Cancel");
        assertThat(showing()).isTrue();
        assertThat(Files.readString(file)).isEqualTo(original);
        assertThat(window.value(link -> link.timing().windowWidthPs())).isEqualTo(500.0);
        assertThat(window.stage().getTitle()).contains("(changed)");
    }

    @Test
    void aFileThatChangedElsewhereIsReplacedOnRequestAlone() throws IOException {
        change();
        Files.writeString(file, "other");
        save();
        window.answer("Cancel");
        assertThat(Files.readString(file)).isEqualTo("other");
        assertThat(window.stage().getTitle()).contains("(changed)");
        save();
        window.answer(Words.of("file.save.replace"));
        assertThat(Files.readString(file)).isEqualTo(changed());
        assertThat(window.stage().getTitle()).doesNotContain("(changed)");
    }

    @Test
    void aBrokenFileIsRefusedWithAllItsErrors() throws IOException {
        Path broken = directory.resolve("broken.json");
        Files.writeString(
                broken,
                original.replace("\"imbalanceNs\": 2.0", "\"imbalanceNs\": -2.0")
                        .replace("\"efficiency\": 0.82", "\"efficiency\": 1.2")
                        .replace("\"lengthKm\": 29.4", "\"lengthKm\": \"abc\""));
        window.willAnswer(broken);
        window.keys(KeyCode.O, KeyCombination.SHORTCUT_DOWN);
        TextArea lines = (TextArea) window.dialog().getExpandableContent();
        Run check = Run.of("check", broken.toString());
        assertThat(lines.getText().lines()).isEqualTo(check.errLines()).hasSize(3);
        window.answer("OK");
        assertThat(window.stage().getTitle()).startsWith(file.getFileName().toString());
        assertThat(window.value(link -> link.imbalanceNs())).isEqualTo(2.0);
        assertThat(new RecentFiles(window.settings()).entries()).hasSize(1);
    }

    @ParameterizedTest
    @CsvSource({
        "form-alice-detectors-0-efficiency, alice.detectors[0].efficiency, 0.82, 1.2, 1.2",
        "form-alice-path-1-length-km, alice.path[1].lengthKm, 30.2, abc, \"abc\""
    })
    void aWrongEntrySaysWhatTheCommandLineSays(String id, String path, String good, String typed, String written)
            throws IOException {
        FxRobot robot = new FxRobot();
        window.act(() -> window.model()
                .form()
                .select(window.model().form().parts().stream()
                        .filter(part -> selects(part, path))
                        .findFirst()
                        .orElseThrow()));
        TextField field = window.part(id, TextField.class);
        robot.clickOn(field).interact(field::selectAll).write(typed).type(KeyCode.ENTER);
        Path wrong = directory.resolve("wrong.json");
        String name = path.substring(path.lastIndexOf('.') + 1);
        Files.writeString(wrong, original.replace("\"" + name + "\": " + good, "\"" + name + "\": " + written));
        String said = Run.of("check", wrong.toString()).errLines().get(0);
        assertThat(said).contains(path + ": ");
        // The quotes are those of the file; the field has none.
        String words = said.substring(said.indexOf(path + ": ") + path.length() + 2)
                .replace("\"abc\"", "abc")
                .replace(", without quotes", "");
        assertThat(window.get(() -> window.stage().getScene().getRoot().lookupAll(".label").stream()
                        .filter(label -> label.isVisible())
                        .map(label -> ((Label) label).getText())
                        .toList()))
                .contains("✕ " + words);
        assertThat(window.get(window.model().design().modifiedProperty()::get)).isFalse();
        if (typed.equals("abc")) {
            window.keys(KeyCode.Z, KeyCombination.SHORTCUT_DOWN);
        } else {
            robot.type(KeyCode.ESCAPE);
        }
        assertThat(window.told(field::getText)).isEqualTo(good);
        assertThat(window.told(field::getAccessibleText)).doesNotContain(words);
    }

    private static boolean selects(binspan.planner.viewmodel.LinkPart part, String path) {
        String wanted = path.contains("detectors") ? "Port[site=ALICE, port=0]" : "Element[site=ALICE, index=1]";
        return part.toString().equals(wanted);
    }

    @Test
    void eachStarterBeginsANewLink() {
        for (Preset preset : Preset.values()) {
            window.choose("menu-new-" + preset.text());
            window.until("starter", () -> window.model().file().pathProperty().get() == null);
            window.judged();
            assertThat(window.stage().getTitle())
                    .isEqualTo(
                            window.get(() -> window.model().design().scenario().name()) + " (new link) — Binspan");
        }
        change();
        window.choose("menu-new-" + Preset.PULSE_PAIR.text());
        window.answer("Cancel");
        assertThat(window.value(link -> link.timing().windowWidthPs())).isEqualTo(500.0);
    }

    @Test
    void recentFilesAreOpenedAgain() throws IOException {
        Path second = WholeWindow.copy("orchard-lane-access", directory);
        window.willAnswer(second);
        window.keys(KeyCode.O, KeyCombination.SHORTCUT_DOWN);
        Menu recent = (Menu) window.menu("menu-recent");
        assertThat(window.get(() ->
                        recent.getItems().stream().map(each -> each.getText()).toList()))
                .containsExactly(second.toString(), file.toString());
        Platform.runLater(recent.getItems().get(1)::fire);
        window.until("first file", () -> window.stage().getTitle().startsWith("kestrel"));
        String newest = window.get(recent.getItems().get(0)::getText);
        assertThat(newest).isEqualTo(file.toString());
    }

    @ParameterizedTest
    @CsvSource({"verdict, txt, ''", "json, json, --json", "worksheet, txt, --worksheet"})
    void exportsWhatTheCommandLineWrites(String what, String ending, String option) throws IOException {
        Path mine = directory.resolve("mine." + ending);
        window.willAnswer(mine);
        window.choose("menu-export-" + what);
        window.until(
                "export",
                () -> Files.exists(mine)
                        && window.model().design().noticeProperty().get().equals(Words.of("file.written", mine)));
        String[] words = option.isEmpty() ? new String[0] : new String[] {option};
        assertThat(Files.readString(mine)).isEqualTo(printed(words)).isNotEmpty();
    }

    /** What the command line prints of the file where the terminal knows all characters. */
    private String printed(String... options) {
        String before = System.getProperty(ENCODING);
        System.setProperty(ENCODING, "UTF-8");
        try {
            return Run.of(Stream.concat(Stream.of("check", file.toString()), Stream.of(options))
                            .toArray(String[]::new))
                    .out();
        } finally {
            if (before == null) {
                System.clearProperty(ENCODING);
            } else {
                System.setProperty(ENCODING, before);
            }
        }
    }

    @Test
    void copiesTheVerdict() {
        window.act(() -> Clipboard.getSystemClipboard().clear());
        window.keys(KeyCode.C, KeyCombination.SHORTCUT_DOWN, KeyCombination.SHIFT_DOWN);
        window.until("copy", () -> Clipboard.getSystemClipboard().hasString());
        assertThat(window.get(() -> Clipboard.getSystemClipboard().getString())).isEqualTo(printed());
    }
}

package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.RecentFiles.Entry;
import binspan.planner.io.OutputFileException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What a window remembers, and where. */
final class UserFilesTest {
    @TempDir
    private Path directory;

    @Test
    void tenFilesAreRememberedTheNewestFirst() throws IOException, OutputFileException {
        RecentFiles recent = new RecentFiles(directory.resolve("new"));
        assertThat(recent.entries()).isEmpty();
        for (int i = 0; i < 12; i++) {
            recent.add(directory.resolve("f" + i + ".json"));
        }
        Files.writeString(directory.resolve("f5.json"), "{}");
        recent.add(directory.resolve("x").resolve("..").resolve("f5.json"));
        assertThat(recent.entries()).hasSize(10);
        assertThat(recent.entries().get(0)).isEqualTo(new Entry(directory.resolve("f5.json"), false));
        assertThat(recent.entries().get(1)).isEqualTo(new Entry(directory.resolve("f11.json"), true));
        recent.remove(directory.resolve("f11.json"));
        assertThat(recent.entries().get(1).file()).isEqualTo(directory.resolve("f10.json"));
        assertThat(recent.entries()).hasSize(9);
    }

    @ParameterizedTest
    @ValueSource(strings = {"relative.json\n", "/a\n\0\n", "{}"})
    void aDamagedListIsEmpty(String text) throws IOException {
        Files.writeString(directory.resolve("recent-files.txt"), text);
        assertThat(new RecentFiles(directory).entries()).isEmpty();
        Files.write(directory.resolve("recent-files.txt"), new byte[] {(byte) 0xff});
        assertThat(new RecentFiles(directory).entries()).isEmpty();
    }

    @Test
    void settingsAreAsUsualAtFirst() {
        Settings settings = Settings.read(directory);
        assertThat(settings.theme()).isEqualTo("system");
        assertThat(settings.scalePercent()).isEqualTo(100);
        assertThat(settings.windowWidth()).isEqualTo(1280);
        assertThat(settings.windowHeight()).isEqualTo(800);
        assertThat(settings.lastDirectory()).isEmpty();
    }

    @Test
    void settingsAreReadAsWrittenAndUnknownOnesKept() throws IOException, OutputFileException {
        Path file = directory.resolve("settings.properties");
        Files.writeString(file, "later = a b\\u00e9\nscalePercent = 130 \ntheme=purple\nwindowWidth=-3\n");
        Settings read = Settings.read(directory);
        assertThat(read.scalePercent()).isEqualTo(130);
        assertThat(read.theme()).isEqualTo("system");
        assertThat(read.windowWidth()).isEqualTo(1280);
        Path folder = directory.resolve("d\u00e9 p\u00f4t");
        read.withTheme("dark")
                .withWindow(1000, 700)
                .withLastDirectory(folder)
                .withScalePercent(150)
                .write(directory);
        Settings again = Settings.read(directory);
        assertThat(again.theme()).isEqualTo("dark");
        assertThat(again.scalePercent()).isEqualTo(150);
        assertThat(again.windowWidth()).isEqualTo(1000);
        assertThat(again.windowHeight()).isEqualTo(700);
        assertThat(again.lastDirectory()).hasValue(folder);
        assertThat(file)
                .content()
                .contains("later=a b")
                .startsWith("lastDirectory=")
                .endsWith("\n");
    }

    @Test
    void damagedSettingsAreAsUsual() throws IOException {
        Files.writeString(directory.resolve("settings.properties"), "theme=\\u12zz");
        assertThat(Settings.read(directory).theme()).isEqualTo("system");
    }

    /** Places of the XDG Base Directory Specification; those of the other systems are common practice. */
    @ParameterizedTest
    @CsvSource({
        "Linux, XDG_STATE_HOME, /s, /c/.config/binspan, /s/binspan",
        "Linux, XDG_CONFIG_HOME, /s, /s/binspan, /c/.local/state/binspan",
        "Linux, XDG_CONFIG_HOME, relative, /c/.config/binspan, /c/.local/state/binspan",
        "Mac OS X, XDG_STATE_HOME, /s, /c/Library/Application Support/binspan, /c/Library/Application Support/binspan",
        "Windows 11, LOCALAPPDATA, /l, /l/binspan, /l/binspan",
        "Windows 11, OTHER, /l, /c/AppData/Local/binspan, /c/AppData/Local/binspan"
    })
    void filesStandWhereTheSystemWantsThem(String system, String variable, String value, Path settings, Path state) {
        UserDirectories directories = new UserDirectories(system, Map.of(variable, value), Path.of("/c"));
        assertThat(directories.settings()).isEqualTo(settings);
        assertThat(directories.state()).isEqualTo(state);
    }
}

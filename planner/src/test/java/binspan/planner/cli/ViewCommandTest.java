package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import binspan.planner.io.Preset;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What is refused before a window opens. */
final class ViewCommandTest {
    private static final String PLATFORM = "glass.platform";

    @TempDir
    private Path directory;

    private String platform;

    /** The tests of the window choose a platform without a display, which would be taken here. */
    @BeforeEach
    void chooseNoPlatform() {
        platform = System.getProperty(PLATFORM);
        System.clearProperty(PLATFORM);
    }

    @AfterEach
    void chooseAgain() {
        if (platform != null) {
            System.setProperty(PLATFORM, platform);
        }
    }

    private static void refused(Run run, String words) {
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.out()).isEmpty();
        assertThat(run.errLines()).hasSize(1);
        assertThat(run.err()).contains(words);
    }

    @Test
    void anUnknownThemeIsRefused() {
        refused(Run.of("view", "--theme", "blue"), "blue");
        refused(Run.of("view", "--theme", "blue"), "light");
    }

    @ParameterizedTest
    @CsvSource({"99, 100 to 200", "201, 100 to 200", "-5, 100 to 200"})
    void aScaleBeyondItsRangeIsRefused(String scale, String words) {
        refused(Run.of("view", "--scale=" + scale), words);
    }

    @Test
    void aScaleThatIsNoNumberIsRefusedAsUsage() {
        Run run = Run.of("view", "--scale=big");
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines().get(0)).contains("--scale").contains("big");
    }

    @Test
    void aMissingFileIsRefused() {
        refused(Run.of("view", directory.resolve("none.json").toString()), "none.json");
    }

    @Test
    void aBrokenFileGetsTheErrorsOfTheCheck() throws IOException {
        String text = Preset.PULSE_PAIR
                .scenario()
                .replace("\"imbalanceNs\": 2.0", "\"imbalanceNs\": -2.0")
                .replace("\"formatVersion\": 1", "\"formatVersion\": 7");
        String file = Files.writeString(directory.resolve("broken.json"), text).toString();
        Run run = Run.of("view", file);
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.err()).isEqualTo(Run.of("check", file).err()).isNotEmpty();
    }

    @Test
    void twoFilesAreRefused() {
        assertThat(Run.of("view", "a.json", "b.json").status()).isEqualTo(ExitStatus.REFUSED);
    }

    @ParameterizedTest
    @ValueSource(strings = {"Linux", "linux"})
    void withoutADisplayItSaysWhatToDo(String system) {
        for (Map<String, String> environment : List.of(Map.<String, String>of(), Map.of("DISPLAY", " "))) {
            assertThatThrownBy(() -> NoDisplay.refuse(system, environment))
                    .isInstanceOf(UsageException.class)
                    .hasMessageContaining("DISPLAY is not set")
                    .hasMessageContaining("desktop session")
                    .hasMessageContaining("other commands");
        }
    }

    @Test
    void onLinuxTheCommandEndsThere() {
        assumeTrue(System.getProperty("os.name").contains("Linux"));
        refused(Run.of("view"), "no display");
    }

    @ParameterizedTest
    @ValueSource(strings = {"Windows 11", "Mac OS X"})
    void otherSystemsNeedNoDisplayVariable(String system) throws UsageException {
        NoDisplay.refuse(system, Map.of());
        NoDisplay.refuse("Linux", Map.of("DISPLAY", ":0"));
    }

    @Test
    void failuresOfTheStartAreTold() {
        assertThat(NoDisplay.because(new RuntimeException(new UnsupportedOperationException("Unable to open DISPLAY"))))
                .hasMessageContaining("leads to none");
        assertThat(NoDisplay.because(new RuntimeException(new UnsatisfiedLinkError("libgtk-3.so.0"))))
                .hasMessageContaining("libgtk-3-0");
        IllegalStateException own = new IllegalStateException("a fault of the program");
        assertThatThrownBy(() -> NoDisplay.because(own)).isSameAs(own);
        AssertionError error = new AssertionError("another");
        assertThatThrownBy(() -> NoDisplay.because(error)).isSameAs(error);
    }
}

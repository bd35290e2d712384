package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.Main;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.Preset;
import binspan.planner.io.WholeFile;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Ctrl-C, in a process of its own: it stops within a second and leaves no partial file. */
final class InterruptTest {
    /** 128 and the number of the signal (POSIX: 2 for an interrupt), as shells report it. */
    private static final int INTERRUPTED = 130;

    private static final double WITHIN_SECONDS = 1.0;

    @TempDir
    private Path directory;

    private Process process;
    private Path scenario;

    @BeforeEach
    void writeScenario() throws IOException {
        scenario = Files.writeString(directory.resolve("link.json"), Preset.PULSE_PAIR.scenario());
    }

    @AfterEach
    void end() {
        process.destroyForcibly();
    }

    /** A shell that runs in the background has its children ignore interrupts: env undoes that. */
    private void start(Class<?> main, String... args) throws IOException {
        List<String> command = new ArrayList<>(List.of(
                "env",
                "--default-signal=INT",
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                System.getProperty("java.class.path"),
                main.getName()));
        command.addAll(List.of(args));
        process = new ProcessBuilder(command).start();
    }

    private double secondsToEnd() throws Exception {
        long start = System.nanoTime();
        new ProcessBuilder("kill", "-INT", Long.toString(process.pid())).start().waitFor();
        assertThat(process.waitFor(30, TimeUnit.SECONDS)).isTrue();
        return (System.nanoTime() - start) / 1e9;
    }

    private static String text(InputStream stream) throws IOException {
        return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    }

    private void assertOnlyScenario() throws IOException {
        try (var files = Files.list(directory)) {
            assertThat(files).containsExactly(scenario);
        }
    }

    @Test
    void longSweepStops() throws Exception {
        start(
                Main.class,
                "sweep",
                scenario.toString(),
                "--vary",
                "link.lengthKm=10:300:600",
                "--vary",
                "timing.windowWidthPs=50:1500:600",
                "--csv",
                directory.resolve("table.csv").toString());
        assertThat(process.waitFor(2, TimeUnit.SECONDS)).isFalse();
        assertThat(secondsToEnd()).isLessThan(WITHIN_SECONDS);
        assertThat(process.exitValue()).isEqualTo(INTERRUPTED);
        assertThat(text(process.getErrorStream())).isEmpty();
        assertThat(text(process.getInputStream())).isEmpty();
        assertOnlyScenario();
    }

    @Test
    void fileThatIsBeingWrittenIsRemoved() throws Exception {
        Path table = directory.resolve("table.csv");
        start(HalfWritten.class, table.toString());
        assertThat(process.getInputStream().read()).isEqualTo('!');
        try (var files = Files.list(directory)) {
            assertThat(files).hasSize(2).anyMatch(each -> each.toString().endsWith(".part"));
        }
        assertThat(secondsToEnd()).isLessThan(WITHIN_SECONDS);
        assertThat(process.exitValue()).isEqualTo(INTERRUPTED);
        assertOnlyScenario();
    }

    /** A program that never comes to the end of its file. */
    static final class HalfWritten {
        private HalfWritten() {}

        /** Writes half of a file, says so and waits. */
        public static void main(String[] args) throws OutputFileException {
            WholeFile.write(
                    args[0],
                    out -> {
                        out.write(new byte[1_000_000]);
                        System.out.write('!');
                        System.out.flush();
                        forever();
                    },
                    false);
        }

        private static void forever() {
            try {
                Thread.sleep(Long.MAX_VALUE);
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
            }
        }
    }
}

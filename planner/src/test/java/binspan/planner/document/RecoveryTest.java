package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.Recovery.Found;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.ScenarioReader;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Copies survive their process, not their window. */
final class RecoveryTest {
    private static final Instant TIME = Instant.parse("2026-03-01T12:00:00Z");
    private static final ScenarioDocument DOCUMENT = ShippedDocuments.named("pulse-pair");

    @TempDir
    private Path directory;

    private Path copies;

    @BeforeEach
    void nameDirectory() {
        copies = directory.resolve("state").resolve("recovery");
    }

    private Recovery of(long process, int seconds) {
        return new Recovery(copies, Clock.fixed(TIME.plusSeconds(seconds), ZoneOffset.UTC), process);
    }

    /** Number of a process that has ended for certain: this test started it and waited for it. */
    private static long deadProcess() throws IOException, InterruptedException {
        String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
        Process process = new ProcessBuilder(java, "--version")
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        return process.pid();
    }

    @Test
    void copyOfADeadProcessIsFound() throws Exception {
        Path original = directory.resolve("a \"quoted\" \u00e9 name.json");
        long dead = deadProcess();
        String text = DOCUMENT.text().replace("\n", "\r\n");
        Path copy = of(dead, 0).write(text, original, "saved");
        of(dead, 5).write("second\n", null, "");
        List<Found> found = Recovery.left(copies);
        assertThat(found).extracting(Found::text).containsExactly("second\n", text);
        assertThat(found.get(0).original()).isEmpty();
        assertThat(found.get(1).original()).hasValue(original);
        assertThat(found.get(1).written()).isEqualTo(TIME);
        assertThat(found.get(1).basedOn("saved")).isTrue();
        assertThat(found.get(1).basedOn("changed since")).isFalse();
        assertThat(copy.getFileName().toString()).startsWith(dead + "-");
        found.get(1).discard();
        assertThat(Recovery.left(copies)).hasSize(1);
    }

    @Test
    void copyIsAScenarioThatCanBeReadByHand() throws OutputFileException, InvalidScenarioException {
        Path copy = new Recovery(copies).write(DOCUMENT.text(), directory.resolve("x.json"), "");
        assertThat(ScenarioReader.read(copy.toString())).isEqualTo(DOCUMENT.scenario());
    }

    @Test
    void copyOfARunningProcessIsNotOffered() throws OutputFileException {
        Recovery recovery = new Recovery(copies);
        Path copy = recovery.write(DOCUMENT.text(), null, "");
        assertThat(Recovery.left(copies)).isEmpty();
        recovery.write("newer", null, "");
        assertThat(copy).content().endsWith("\nnewer");
        recovery.clear();
        recovery.clear();
        assertThat(copy).doesNotExist();
    }

    @Test
    void copyOfAProcessWhoseNumberAnotherHasNowIsFound() throws IOException, OutputFileException {
        Path copy = new Recovery(copies).write("text", null, "");
        String lines = Files.readString(copy).replaceFirst("process since: .*", "process since: 2001-01-01T00:00:00Z");
        Files.writeString(copy, lines);
        assertThat(Recovery.left(copies)).extracting(Found::text).containsExactly("text");
    }

    @Test
    void damagedCopiesAreLeftOut() throws Exception {
        long dead = deadProcess();
        Path good = of(dead, 0).write("good", null, "");
        String whole = Files.readString(good);
        for (int length = 0; length < whole.length(); length += 3) {
            Files.writeString(copies.resolve(dead + "-" + (1000 + length) + ".json"), whole.substring(0, length));
        }
        Files.writeString(copies.resolve(dead + "-900.json"), whole.replace("written: 2", "written: x"));
        Files.write(copies.resolve(dead + "-901.json"), new byte[] {(byte) 0xff, 0, 1});
        Files.writeString(copies.resolve("notes.json"), whole);
        Files.createDirectory(copies.resolve(dead + "-902.json"));
        assertThat(Recovery.left(copies)).extracting(Found::copy).containsExactly(good);
    }

    @Test
    void aDirectoryThatIsMissingHoldsNothing() {
        assertThat(Recovery.left(directory.resolve("none"))).isEmpty();
        assertThat(Recovery.defaultDirectory().toString()).contains("binspan");
    }
}

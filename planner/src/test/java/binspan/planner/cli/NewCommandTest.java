package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.io.Preset;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

final class NewCommandTest {
    @TempDir
    private Path directory;

    @ParameterizedTest
    @EnumSource
    void presetGoesToStandardOutputAndCanBeChecked(Preset preset) {
        Run made = Run.of("new", preset.text());
        assertThat(made.status()).isEqualTo(ExitStatus.MET);
        assertThat(made.err()).isEmpty();
        assertThat(made.out()).isEqualTo(preset.scenario());
        Run checked = Run.reading(made.out().getBytes(StandardCharsets.UTF_8), "check", "-");
        assertThat(checked.status()).isEqualTo(ExitStatus.MET);
        assertThat(checked.err()).isEmpty();
    }

    @Test
    void outputGoesToAFile() {
        Path file = directory.resolve("link.json");
        Run run = Run.of("new", "avalanche", "--output", file.toString());
        assertThat(run).isEqualTo(new Run(ExitStatus.MET, "", ""));
        assertThat(file).hasContent(Preset.AVALANCHE.scenario());
    }

    @Test
    void existingFileIsKeptUnlessForced() throws IOException {
        Path file = Files.writeString(directory.resolve("link.json"), "mine");
        Run kept = Run.of("new", "avalanche", "-o", file.toString());
        assertThat(kept.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(kept.err()).isEqualTo("binspan: " + file + ": exists already; --force replaces it\n");
        assertThat(file).hasContent("mine");
        Run replaced = Run.of("new", "avalanche", "-o", file.toString(), "--force");
        assertThat(replaced.status()).isEqualTo(ExitStatus.MET);
        assertThat(file).hasContent(Preset.AVALANCHE.scenario());
    }

    @Test
    void unknownPresetGetsTheNearest() {
        Run run = Run.of("new", "pulsepair");
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.err())
                .isEqualTo(
                        "binspan: unknown preset pulsepair; allowed pulse-pair | continuous | pulse-train | avalanche"
                                + " | coexistence; did you mean pulse-pair?\n");
    }

    @Test
    void schemaGoesToAFileToo() {
        Path file = directory.resolve("schema.json");
        assertThat(Run.of("schema", "--output", file.toString()).status()).isEqualTo(ExitStatus.MET);
        assertThat(file).hasContent(Run.of("schema").out());
        assertThat(Run.of("schema", "--output", file.toString()).status()).isEqualTo(ExitStatus.REFUSED);
    }
}

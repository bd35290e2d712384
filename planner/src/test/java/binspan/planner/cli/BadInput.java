package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;

/** What must be left behind when a study refuses its input. */
final class BadInput {
    private BadInput() {}

    /** Nothing but the scenario stands in the directory. */
    static void holdsOneFile(Path directory) {
        try (Stream<Path> files = Files.list(directory)) {
            assertThat(files).hasSize(1);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}

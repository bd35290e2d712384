package binspan;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.units.ReferenceTable;
import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every fact of the index stands in a reference table, and every table is one that a test reads. */
final class ReferenceCoverageTest {
    private static final Path REFERENCE = directory();

    @Test
    void everyFactOfTheIndexHasItsRow() throws IOException {
        List<String> rows = tables().flatMap(ReferenceTable::rows)
                .map(row -> row.text("id"))
                .toList();
        List<String> missing = Files.readAllLines(REFERENCE.resolve("index.txt")).stream()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .filter(fact -> rows.stream().noneMatch(row -> row.equals(fact) || row.startsWith(fact + "-")))
                .toList();
        assertThat(missing).isEmpty();
    }

    /** A table whose name stands in no test is read by none. */
    @Test
    void everyTableIsReadByATest() throws IOException {
        String sources = sources();
        assertThat(tables()).allMatch(table -> sources.contains('"' + table + '"'));
    }

    private static Stream<String> tables() throws IOException {
        try (Stream<Path> files = Files.list(REFERENCE)) {
            return files
                    .map(file -> file.getFileName().toString())
                    .filter(name -> name.endsWith(".csv"))
                    .sorted()
                    .toList()
                    .stream();
        }
    }

    private static String sources() throws IOException {
        StringBuilder text = new StringBuilder();
        try (Stream<Path> files = Files.walk(Path.of("src", "test", "java"))) {
            for (Path file :
                    files.filter(path -> path.toString().endsWith("Test.java")).toList()) {
                text.append(Files.readString(file));
            }
        }
        return text.toString();
    }

    private static Path directory() {
        try {
            return Path.of(Objects.requireNonNull(ReferenceCoverageTest.class.getResource("/reference"))
                    .toURI());
        } catch (URISyntaxException e) {
            throw new IllegalStateException(e);
        }
    }
}

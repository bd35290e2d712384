package binspan.units;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;

/**
 * Tables of facts from outside the project, under {@code reference/} of the test resources.
 *
 * <p>Lines that start with {@code #} tell where a table comes from; the first other line names the columns. Cells stand
 * between bars. Every table has the columns {@code id}, {@code tolerance} (such as {@code rel 1e-6}, {@code abs 0.01},
 * both, or {@code exact}), {@code source} and {@code provenance} ({@code source}: read there; {@code memory}:
 * remembered, not looked up; {@code computed}: from the cited formula).
 */
public final class ReferenceTable {
    private static final String BAR = "\\|";
    private static final List<String> PROVENANCES = List.of("source", "memory", "computed", "common practice");

    private ReferenceTable() {}

    /** The rows of a table, for example {@code fibre-dispersion.csv}. */
    public static Stream<Row> rows(String file) {
        List<String> lines = text(file)
                .lines()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .toList();
        List<String> columns = cells(lines.get(0));
        List<Row> rows = new ArrayList<>();
        for (String line : lines.subList(1, lines.size())) {
            rows.add(row(columns, cells(line), file));
        }
        return rows.stream();
    }

    /** One fact; its text is its id, so that a test case is named by it. */
    public record Row(Map<String, String> cells) {
        /** The content of a cell, empty if it says nothing. */
        public String text(String column) {
            return Objects.requireNonNull(cells.get(column), column);
        }

        /** Whether a cell says something. */
        public boolean has(String column) {
            return !text(column).isEmpty();
        }

        /** The number in a cell. */
        public double number(String column) {
            return Double.parseDouble(text(column));
        }

        /** How far a result may be from the expected one. */
        public double tolerance(double expected) {
            String[] words = text("tolerance").split(" ", -1);
            double allowed = 0.0;
            for (int i = 0; i + 1 < words.length; i += 2) {
                double size = Double.parseDouble(words[i + 1]);
                allowed = Math.max(allowed, words[i].equals("rel") ? size * Math.abs(expected) : size);
            }
            return allowed;
        }

        @Override
        public String toString() {
            return text("id");
        }
    }

    private static Row row(List<String> columns, List<String> cells, String file) {
        if (cells.size() != columns.size()) {
            throw new IllegalStateException(file + ": " + cells + " does not fit " + columns);
        }
        Map<String, String> byColumn = new LinkedHashMap<>();
        for (int i = 0; i < columns.size(); i++) {
            byColumn.put(columns.get(i), cells.get(i));
        }
        Row row = new Row(byColumn);
        if (!PROVENANCES.contains(row.text("provenance")) || row.text("source").isEmpty()) {
            throw new IllegalStateException(file + ": " + row + " does not say where it comes from");
        }
        return row;
    }

    private static List<String> cells(String line) {
        return Arrays.stream(line.split(BAR, -1)).map(String::strip).toList();
    }

    private static String text(String file) {
        try (InputStream stream = ReferenceTable.class.getResourceAsStream("/reference/" + file)) {
            return new String(Objects.requireNonNull(stream, file).readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}

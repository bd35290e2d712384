package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.report.JsonTree;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Runs a study command on a scenario file and reads its tables back; a check of a scenario edited by hand stands beside it.
 *
 * @param command name of the command
 * @param file scenario file
 */
record StudyRun(String command, String file) {
    private static final Path FOLDER = Path.of("..", "scenarios");
    private static final String PREDICTED = "predicted.";

    /** The text of a shipped scenario. */
    static String shipped(String name) {
        try {
            return Files.readString(FOLDER.resolve(name + ".json"));
        } catch (IOException e) {
            throw new IllegalArgumentException(name, e);
        }
    }

    /** Names of the shipped scenarios. */
    static List<String> shippedNames() {
        try (Stream<Path> files = Files.list(FOLDER)) {
            return files.map(each -> each.getFileName().toString())
                    .filter(name -> name.endsWith(".json") && !name.endsWith(".schema.json"))
                    .map(name -> name.substring(0, name.length() - ".json".length()))
                    .sorted()
                    .toList();
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    /** A study of a shipped scenario. */
    static StudyRun ofShipped(String command, String name) {
        return new StudyRun(command, FOLDER.resolve(name + ".json").toString());
    }

    /** A study of a scenario that is written to a directory. */
    static StudyRun of(String command, Path directory, String scenario) throws IOException {
        return new StudyRun(
                command,
                Files.writeString(directory.resolve("link.json"), scenario).toString());
    }

    /** An edit by hand that must find its place. */
    static String edited(String scenario, String found, String written) {
        assertThat(scenario).contains(found);
        return scenario.replace(found, written);
    }

    /** A scenario with other requirements. */
    static String requiring(String scenario, String requirements) {
        String section = "(?s)\"require\": \\{.*?}";
        assertThat(scenario).containsPattern(section);
        return scenario.replaceFirst(section, "\"require\": { " + requirements + " }");
    }

    /** Runs the command with further words. */
    Run run(String... words) {
        List<String> args = new ArrayList<>(List.of(command, file));
        args.addAll(List.of(words));
        return Run.of(args.toArray(String[]::new));
    }

    /** The rows that the command writes as CSV to standard output. */
    List<CSVRecord> rows(String... words) throws IOException {
        Run run = run(Stream.concat(Stream.of(words), Stream.of("--csv", "-")).toArray(String[]::new));
        assertThat(run.err()).isEmpty();
        return records(run.out());
    }

    /** What the command writes as JSON to standard output. */
    JsonTree.Node json(String... words) {
        Run run = run(Stream.concat(Stream.of(words), Stream.of("--json", "-")).toArray(String[]::new));
        assertThat(run.err()).isEmpty();
        return JsonTree.of(run.out());
    }

    /** A CSV read back by a library. */
    static List<CSVRecord> records(String csv) throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (CSVParser parser = CSVParser.parse(csv, format)) {
            return parser.getRecords();
        }
    }

    /** A cell as a number. */
    static double number(CSVRecord row, String column) {
        return Double.parseDouble(row.get(column));
    }

    /** Names of the columns in their order. */
    static List<String> header(List<CSVRecord> rows) {
        return rows.get(0).getParser().getHeaderNames();
    }

    /** Names of all figures of merit of the scenario, as a sweep writes them. */
    List<String> figures() throws IOException {
        String vary = "timing.windowWidthPs";
        List<String> names = header(new StudyRun("sweep", file).rows("--vary", vary + "=100:200:2"));
        return names.stream()
                .filter(name -> !List.of(vary, "meets").contains(name))
                .toList();
    }

    /** A check of a scenario, read back. */
    static Checked check(String scenario) {
        Run run = Run.reading(scenario.getBytes(StandardCharsets.UTF_8), "check", "--json", "-");
        assertThat(run.err()).isEmpty();
        return new Checked(run.status(), JsonTree.of(run.out()));
    }

    /**
     * What a check says of a scenario.
     *
     * @param status its exit status
     * @param tree its JSON
     */
    record Checked(int status, JsonTree.Node tree) {
        /** Names of the requirements that fail. */
        List<String> failing() {
            return tree.at("requirements").items().stream()
                    .filter(each -> each.at("met").value().equals(false))
                    .map(each -> (String) each.at("name").value())
                    .toList();
        }

        /** The predicted figure of a requirement over the required one. */
        double ratio(String requirement) {
            JsonTree.Node found = tree.at("requirements").items().stream()
                    .filter(each -> each.at("name").value().equals(requirement))
                    .findFirst()
                    .orElseThrow();
            return (Double) found.at("predicted").value()
                    / (Double) found.at("required").value();
        }

        /** A figure under the name of a column. */
        Double figure(String column) {
            String plain = column.replaceAll("\\[\\d]", "");
            if (!tree.names().contains(plain)) {
                return null;
            }
            JsonTree.Node node = tree.at(plain.split("\\."));
            int port = column.charAt(column.length() - 2) - '0';
            return (Double)
                    (plain.equals(column)
                            ? node.value()
                            : node.items().get(port).value());
        }

        /** Asserts that a row of a study holds the same figures and the same verdict. */
        void assertSame(CSVRecord row, List<String> figures, double precision) {
            Map<String, String> cells = row.toMap();
            assertThat(figures).hasSizeGreaterThan(40);
            for (String name : figures) {
                Double expected = figure(name);
                String cell = cells.getOrDefault(PREDICTED + name, cells.get(name));
                if (expected == null) {
                    assertThat(cell).as(name).isEmpty();
                } else {
                    assertThat(Double.parseDouble(cell))
                            .as(name)
                            .isCloseTo(expected, within(precision * Math.abs(expected)));
                }
            }
            assertThat(row.get("meets")).isEqualTo(status == ExitStatus.MET ? "true" : "false");
        }
    }
}

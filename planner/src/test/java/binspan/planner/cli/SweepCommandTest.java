package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.io.Preset;
import binspan.planner.report.JsonTree;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class SweepCommandTest {
    private static final String SCENARIO = Preset.PULSE_PAIR.scenario();
    private static final String WINDOW = "timing.windowWidthPs=100:700:4";

    @TempDir
    private Path directory;

    private String file;

    @BeforeEach
    void writeScenario() throws IOException {
        file = Files.writeString(directory.resolve("link.json"), SCENARIO).toString();
    }

    private Run sweep(String... words) {
        String[] args = new String[words.length + 2];
        args[0] = "sweep";
        args[1] = file;
        System.arraycopy(words, 0, args, 2, words.length);
        return Run.of(args);
    }

    private Run csv(String... words) {
        String[] args = new String[words.length + 2];
        System.arraycopy(words, 0, args, 0, words.length);
        args[words.length] = "--csv";
        args[words.length + 1] = "-";
        return sweep(args);
    }

    private static List<CSVRecord> records(String csv) throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (CSVParser parser = CSVParser.parse(csv, format)) {
            return parser.getRecords();
        }
    }

    private static String name(String column) {
        return column.startsWith("predicted.") ? column.substring("predicted.".length()) : column;
    }

    /** The figure of a column in the JSON of a check. */
    private static Object figure(JsonTree.Node check, String column) {
        String plain = column.replaceAll("\\[\\d]", "");
        JsonTree.Node node = check.at(plain.split("\\."));
        return plain.equals(column)
                ? node.value()
                : node.items().get(column.charAt(column.length() - 2) - '0').value();
    }

    private Run check(String scenario) {
        return Run.reading(scenario.getBytes(StandardCharsets.UTF_8), "check", "--json", "-");
    }

    /** Every figure of every row is that of a check of a scenario in which the value was written by hand. */
    @ParameterizedTest
    @CsvSource({
        "timing.windowWidthPs, 20, 2020, \"windowWidthPs\": 300, \"windowWidthPs\": VALUE",
        "imbalanceNs, 0.5, 4.5, \"imbalanceNs\": 2.0, \"imbalanceNs\": VALUE",
        "source.meanPairsPerCycle, 0.0005, 0.4, \"meanPairsPerCycle\": 0.02, \"meanPairsPerCycle\": VALUE",
        "both.clockJitterRmsPs, 0, 400, \"clockJitterRmsPs\": 10, \"clockJitterRmsPs\": VALUE",
        "alice.path.penstock duct.lengthKm, 1, 161, 'duct\", \"fibre\": \"G.652.D\", \"lengthKm\": 30',"
                + " 'duct\", \"fibre\": \"G.652.D\", \"lengthKm\": VALUE'",
        "source.schmidtNumber, 1, 9, \"meanPairsPerCycle\": 0.02, '\"meanPairsPerCycle\": 0.02, \"schmidtNumber\": VALUE'"
    })
    void rowIsWhatACheckSays(String path, String from, String to, String found, String written) throws IOException {
        List<CSVRecord> rows =
                records(csv("--vary", path + "=" + from + ":" + to + ":5").out());
        assertThat(rows).hasSize(5);
        for (CSVRecord row : rows) {
            String scenario = path.startsWith("alice")
                    ? SCENARIO.replace("penstock " + found, "penstock " + written)
                    : SCENARIO.replace(found, written);
            Run check = check(scenario.replace("VALUE", row.get(path)));
            assertThat(check.err()).isEmpty();
            assertThat(row.get("meets")).isEqualTo(check.status() == ExitStatus.MET ? "true" : "false");
            assertFigures(row, JsonTree.of(check.out()), path);
        }
    }

    private static void assertFigures(CSVRecord row, JsonTree.Node check, String path) {
        Map<String, String> cells = row.toMap();
        cells.remove(path);
        cells.remove("meets");
        assertThat(cells).hasSizeGreaterThan(50);
        cells.forEach((column, cell) -> {
            if (cell.isEmpty()) {
                assertThat(check.names()).doesNotContain(name(column));
            } else {
                double expected = (Double) figure(check, name(column));
                assertThat(Double.parseDouble(cell)).as(column).isCloseTo(expected, within(1e-12 * Math.abs(expected)));
            }
        });
    }

    @Test
    void columnsAreParametersInTheOrderGivenThenFiguresThenMeets() throws IOException {
        Run run = csv(
                "--vary", "timing.windowWidthPs=20:220:3", "--vary", "imbalanceNs=1:2:2", "--show", "qber,bell.chsh");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.err()).isEmpty();
        assertThat(run.out())
                .startsWith("timing.windowWidthPs,imbalanceNs,qber.phase,qber.time,bell.chsh,meets\r\n20,1,")
                .endsWith("\r\n");
        List<CSVRecord> rows = records(run.out());
        assertThat(rows).extracting(row -> row.get(0)).containsExactly("20", "20", "120", "120", "220", "220");
        assertThat(rows).extracting(row -> row.get(1)).containsExactly("1", "2", "1", "2", "1", "2");
        assertThat(rows).extracting(row -> row.get("meets")).containsOnly("true", "false");
    }

    @Test
    void figureThatSharesItsNameWithAParameterIsToldApart() throws IOException {
        List<CSVRecord> rows =
                records(csv("--vary", "alice.delayErrorPs=-50:50:2").out());
        assertThat(rows.get(0).get("alice.delayErrorPs")).isEqualTo("-50");
        assertThat(rows.get(0).get("predicted.alice.delayErrorPs")).isEqualTo("-50");
    }

    @Test
    void pathWithACommaIsQuoted() throws IOException {
        file = Files.writeString(
                        directory.resolve("comma.json"), SCENARIO.replace("penstock duct", "duct, \\\"old\\\""))
                .toString();
        String path = "alice.path.duct, \"old\".lengthKm";
        Run run = csv("--vary", path + "=1:2:2", "--show", "key");
        assertThat(run.out()).startsWith("\"alice.path.duct, \"\"old\"\".lengthKm\",key.siftedPhaseBps,");
        assertThat(records(run.out()).get(1).get(path)).isEqualTo("2");
    }

    @Test
    void jsonDescribesTheSweepAndHoldsItsRows() throws IOException {
        Run run = sweep("--vary", WINDOW, "--show", "visibility.raw", "--json", "-");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        JsonTree.Node tree = JsonTree.of(run.out());
        assertThat(tree.names())
                .containsExactly(
                        "formatVersion",
                        "version",
                        "scenario",
                        "study",
                        "vary",
                        "requirements",
                        "points",
                        "pointsMet",
                        "rows");
        assertThat(tree.at("study").value()).isEqualTo("sweep");
        JsonTree.Node axis = tree.at("vary").items().get(0);
        assertThat(axis.at("unit").value()).isEqualTo("ps");
        assertThat(axis.at("steps").value()).isEqualTo(4.0);
        List<CSVRecord> rows =
                records(csv("--vary", WINDOW, "--show", "visibility.raw").out());
        for (int i = 0; i < rows.size(); i++) {
            JsonTree.Node row = tree.at("rows").items().get(i);
            assertThat(row.at("visibility.raw").value())
                    .isEqualTo(Double.parseDouble(rows.get(i).get("visibility.raw")));
            assertThat(row.at("meets").value())
                    .isEqualTo(Boolean.parseBoolean(rows.get(i).get("meets")));
        }
    }

    @Test
    void standardInputIsReadAndFilesAreWrittenBesideTheSummary() throws IOException {
        Path table = directory.resolve("table.csv");
        Path tree = directory.resolve("table.json");
        Run run = Run.reading(
                SCENARIO.getBytes(StandardCharsets.UTF_8),
                "sweep",
                "-",
                "--vary",
                WINDOW,
                "--csv",
                table.toString(),
                "--json",
                tree.toString());
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.err()).isEmpty();
        assertThat(run.out()).contains("Tarnbeck Dam", "Written:").doesNotContain("windowWidthPs,");
        assertThat(Files.readString(table)).isEqualTo(csv("--vary", WINDOW).out());
        assertThat(JsonTree.of(Files.readString(tree)).at("rows").items()).hasSize(4);
        assertThat(directory).isDirectoryNotContaining("glob:**.part");
    }

    @Test
    void existingFileIsKeptUnlessTold() throws IOException {
        Path table = Files.writeString(directory.resolve("table.csv"), "old");
        Run run = sweep("--vary", WINDOW, "--csv", table.toString());
        assertThat(run).isEqualTo(new Run(2, "", "binspan: " + table + ": exists already; --force replaces it\n"));
        assertThat(table).hasContent("old");
        assertThat(sweep("--vary", WINDOW, "--csv", table.toString(), "--force").status())
                .isZero();
        assertThat(Files.readString(table)).startsWith("timing.windowWidthPs,");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "timing.windwWidthPs=1:2 | unknown path \"timing.windwWidthPs\": timing has no \"windwWidthPs\";"
                        + " did you mean windowWidthPs?",
                "timing.windowWidthPs | found no range; allowed PATH=FROM:TO, then :STEPS and :log if wanted",
                "timing.windowWidthPs=400:100 | found 400 to 100; allowed a range that rises",
                "timing.windowWidthPs=4:4 | found 4 to 4; allowed a range that rises",
                "alice.delayErrorPs=-1:10:log | found -1 to 10 in logarithmic steps; allowed above 0",
                "alice.delayErrorPs=0:10:log | found 0 to 10 in logarithmic steps; allowed above 0",
                "timing.windowWidthPs=1:1e99 | found 1 to 1e99; allowed 0.001 to 1e7 ps",
                "timing.windowWidthPs=one:2 | found \"one\"; allowed a number such as 0.02 or 2e-2",
                "timing.windowWidthPs=1:1e999 | found \"1e999\"; allowed a number such as 0.02 or 2e-2",
                "timing.windowWidthPs=1:NaN | found \"NaN\"; allowed a number such as 0.02 or 2e-2",
                "timing.windowWidthPs=1:2: | found \"\"; allowed a number of steps, 2 to 1000001, log or lin",
                "timing.windowWidthPs=1:2:1 | found 1 steps; allowed 2 to 1000001",
                "timing.windowWidthPs=1:2:5:6 | found \"6\" after 5 steps; allowed one of them",
                "timing.windowWidthPs=1:2:log:lin | found \"lin\" after log; allowed one of them",
                "acquisition.fringePoints=3:20:6 | found 6 steps, which are not whole; allowed for example 2",
                "acquisition.fringePoints=3:9:log | found 3:9:log; allowed whole numbers in even steps, without log",
                "source.pairRatePerSecond=1:2 | does not go with a pulse-pair pump; vary source.meanPairsPerCycle",
                "name=1:2 | path \"name\" leads to a text; needs a number's path"
            })
    void wrongRangeIsOneLine(String text, String reason) throws IOException {
        Run run = sweep("--vary", text, "--csv", directory.resolve("t.csv").toString());
        assertThat(run).isEqualTo(new Run(2, "", "binspan: --vary \"" + text + "\": " + reason + "\n"));
        assertOnlyScenario();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--csv - --json - | --csv - --json -: found standard output twice; allowed for one of them",
                "--csv no/t.csv | no/t.csv: no such directory",
                "--csv . | .: found a directory; allowed a file name",
                "--csv=t.csv --json=./t.csv |"
                        + " ./t.csv: found twice on the command line; allowed a file for each output",
                "--csv F --force | F: found twice on the command line; allowed a file for each output",
                "--json= | found an empty name; allowed a file name",
                "--show bell.chhs | --show bell.chhs: unknown figure of merit bell.chhs; did you mean bell.chsh?",
                "--show car | --show car: unknown figure of merit car; did you mean coincidence.car?",
                "--show coincidence.correlationRmsPs | --show coincidence.correlationRmsPs:"
                        + " figure of merit coincidence.correlationRmsPs does not apply to this link",
                "--vary timing.windowWidthPs=1:2 |" + " --vary: timing.windowWidthPs: found twice; allowed once",
                "--vary a=1:2 --vary b=1:2 --vary c=1:2 --vary d=1:2 |"
                        + " --vary \"d=1:2\": found 5 varied parameters; allowed 1 to 4",
                "--vary imbalanceNs=1:2:9999 --vary link.lengthKm=1:2:9999 |"
                        + " --vary: found 2.28e+10 numbers in the table; allowed 50000000:"
                        + " take fewer steps or fewer figures"
            })
    void wrongOptionIsOneLine(String words, String message) throws IOException {
        String[] args = ("--vary " + WINDOW + " " + words)
                .replace(" F ", " " + file + " ")
                .split(" ");
        Run run = sweep(args);
        assertThat(run).isEqualTo(new Run(2, "", "binspan: " + message.replaceFirst("^F:", file + ":") + "\n"));
        assertOnlyScenario();
    }

    private void assertOnlyScenario() throws IOException {
        try (var files = Files.list(directory)) {
            assertThat(files).containsExactly(directory.resolve("link.json"));
        }
        assertThat(Files.readString(Path.of(file))).isEqualTo(SCENARIO);
    }

    @ParameterizedTest
    @CsvSource({
        "'', 'missing --vary PATH=FROM:TO[:STEPS][:log]'",
        "--vary, 'missing --vary PATH=FROM:TO[:STEPS][:log]'",
        "--vary a=1:2 --csv, missing --csv FILE",
        "--varry a=1:2, unknown option --varry; did you mean --vary?"
    })
    void incompleteCommandLineGetsTwoLines(String words, String message) {
        Run run = words.isEmpty() ? sweep() : sweep(words.split(" "));
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines())
                .containsExactly("binspan sweep: " + message, "binspan sweep --help explains the command");
    }

    @Test
    void badScenarioIsToldAsByCheck() {
        assertThat(Run.of("sweep", "no.json", "--vary", WINDOW)).isEqualTo(new Run(2, "", "no.json: no such file\n"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"t.gif", "t", "-", "t.png.txt"})
    void pictureNeedsAKnownFormat(String name) {
        Run run = sweep("--vary", WINDOW, "--plot", name);
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines())
                .singleElement()
                .asString()
                .startsWith("binspan: " + name + ": not the ending of a picture");
    }

    /** Best values and the interval of the summary against the rows of the table. */
    @Test
    void summarySaysWhatTheTableHolds() throws IOException {
        String range = "timing.windowWidthPs=20:1500:75";
        List<CSVRecord> rows = records(csv("--vary", range).out());
        List<Double> met = rows.stream()
                .filter(row -> row.get("meets").equals("true"))
                .map(row -> Double.parseDouble(row.get(0)))
                .toList();
        Run run = sweep("--vary", range);
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .contains(met.size() + " of 75 points MEET all 5 requirements")
                .contains("timing.windowWidthPs from 20 to 1500 ps, 75 values evenly spaced;\n         planned 300 ps")
                .contains("from " + (int) (double) met.get(0) + " to " + (int) (double) met.get(met.size() - 1) + " ps")
                .contains("Read off the points; binspan window")
                .contains("--csv FILE or --json FILE writes the table");
        CSVRecord best = rows.stream()
                .max(java.util.Comparator.comparingDouble(row -> Double.parseDouble(row.get("key.asymptoticBps"))))
                .orElseThrow();
        assertThat(run.out())
                .containsPattern("secret key rate +(>=|\u2265) 100 bit/s +[\\d.]+ k?bit/s  " + best.get(0) + " ps\n");
        assertThat(run.out().lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
    }

    @Test
    void summaryOfAMapNamesItsBestPoint() {
        Run run = sweep("--vary", "timing.windowWidthPs=100:900:5", "--vary", "link.lengthKm=20:400:5");
        assertThat(run.out())
                .containsPattern("\\d+ of 25 points MEET all 5 requirements, [\\d.]+ %")
                .containsPattern("best +timing.windowWidthPs \\d+ ps, link.lengthKm \\d+ km\\s+leaves\\s+most\\s+room")
                .doesNotContain("binspan window");
    }

    @Test
    void sweepWithoutAGoodPointSaysWhatIsNearest() {
        Run run = sweep("--vary", "source.meanPairsPerCycle=0.2:0.4:3");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .contains(
                        "NONE of 3 points MEETS all 5 requirements",
                        "nearest  source.meanPairsPerCycle 0.2 comes nearest")
                .doesNotContain("leaves most room");
    }

    @Test
    void withoutRequirementsThereIsNoVerdict() throws IOException {
        String none = SCENARIO.replaceFirst("(?s)\"require\": \\{.*?},", "");
        file = Files.writeString(directory.resolve("none.json"), none).toString();
        Run run = sweep("--vary", WINDOW);
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .contains("No requirement is stated", "largest", "raw visibility", "secret key rate")
                .doesNotContain("MEET", "required");
    }

    /** The finite key takes several times as long as all other figures together: it is computed where it is asked for. */
    @Test
    void timeToTheFirstKeyIsToldWhereItIsShown() throws IOException {
        String hurry = SCENARIO.replace("\"require\": {", "\"require\": { \"firstKeyWithinHours\": 1,");
        file = Files.writeString(directory.resolve("hurry.json"), hurry).toString();
        assertThat(sweep("--vary", WINDOW, "--show", "bell").out())
                .containsPattern("time to the first key +\\S+ 1 h +not shown  --show\\s+key.secondsToFirstKey does");
        assertThat(sweep("--vary", WINDOW, "--show", "key").out())
                .containsPattern("time to the first key +\\S+ 1 h +[\\d.]+ m?s  \\d00 ps");
        assertThat(sweep("--vary", WINDOW).out()).doesNotContain("not shown");
        String meets = csv("--vary", WINDOW, "--show", "bell").out().replaceAll("(?m)^.*,", "");
        assertThat(csv("--vary", WINDOW).out().replaceAll("(?m)^.*,", "")).isEqualTo(meets);
    }

    @Test
    void singleRequirementThatIsNotShownStillCounts() throws IOException {
        String only =
                SCENARIO.replaceFirst("(?s)\"require\": \\{.*?}", "\"require\": { \"firstKeyWithinHours\": 0.001 }");
        file = Files.writeString(directory.resolve("only.json"), only).toString();
        Run run = sweep("--vary", "link.lengthKm=10:400:5", "--show", "bell");
        assertThat(run.out())
                .containsPattern("[1-4] of 5 points MEET the requirement")
                .contains("not shown")
                .doesNotContain("leaves most room");
    }

    @Test
    void everyPresetCanBeSwept() throws IOException {
        for (Preset preset : Preset.values()) {
            file = Files.writeString(directory.resolve(preset.text()), preset.scenario())
                    .toString();
            Run run = sweep("--vary", "link.lengthKm=10:300:5");
            assertThat(run.err()).as(preset.text()).isEmpty();
            assertThat(run.status()).as(preset.text()).isZero();
            assertThat(run.out().lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
        }
    }

    @Test
    void readerThatHasGoneEndsTheTableQuietly() {
        Run run = Run.writing(
                new java.io.OutputStream() {
                    @Override
                    public void write(int b) throws IOException {
                        throw new IOException("Broken pipe");
                    }
                },
                "sweep",
                file,
                "--vary",
                WINDOW,
                "--csv",
                "-");
        assertThat(run).isEqualTo(new Run(ExitStatus.MET, "", ""));
    }

    @Test
    void completionKnowsTheCommand() {
        assertThat(Run.of("completion").out()).contains("sweep", "--vary", "--csv", "--plot", "--force", "--show");
    }
}

package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every study refuses alike: one clear line, exit status 2, nothing written, what exists is kept. */
final class StudyRefusalTest {
    private static final String DAM = "kestrel-dam-to-millbrook";

    @TempDir
    private static Path tables;

    /** Words of each study with which it would run. */
    private static final Map<String, List<String>> WORDS = new TreeMap<>(Map.of(
            "sweep", List.of("--vary", "timing.windowWidthPs=100:200:2"),
            "window", List.of("--vary", "timing.windowWidthPs=100:900"),
            "tune", List.of("--free", "timing.windowWidthPs"),
            "reach", List.of("--as-written"),
            "compare", List.of("--fibres", "G.652.D", "--as-written"),
            "tolerance", List.of("--samples", "16"),
            "routes", List.of("--table", "ROUTES")));

    @TempDir
    private Path directory;

    private String file;

    @BeforeEach
    void writeScenario() throws IOException {
        file = StudyRun.of("", directory, StudyRun.shipped(DAM)).file();
        Files.writeString(tables.resolve("routes.csv"), "name,alice.lengthKm,bob.lengthKm\na,10,10\n");
    }

    static Stream<String> commands() {
        return WORDS.keySet().stream();
    }

    private Run run(String command, String... more) {
        List<String> words = new ArrayList<>(WORDS.get(command));
        words.replaceAll(
                word -> word.replace("ROUTES", tables.resolve("routes.csv").toString()));
        words.addAll(List.of(more));
        return new StudyRun(command, file).run(words.toArray(String[]::new));
    }

    private void assertRefused(Run run, String message) throws IOException {
        assertThat(run).isEqualTo(new Run(2, "", message + "\n"));
        try (Stream<Path> files = Files.list(directory)) {
            assertThat(files).containsExactly(Path.of(file));
        }
    }

    @ParameterizedTest
    @MethodSource("commands")
    void allOutputsAreWrittenAndNothingElse(String command) throws IOException {
        List<String> names = List.of("t.csv", "t.json", "t.svg");
        List<String> places =
                names.stream().map(name -> directory.resolve(name).toString()).toList();
        Run run = run(command, "--csv", places.get(0), "--json", places.get(1), "--plot", places.get(2));
        assertThat(run.err()).isEmpty();
        assertThat(run.status()).isZero();
        assertThat(run.out().replaceAll("\\s+", " ")).endsWith("Written: " + String.join(", ", places) + " ");
        try (Stream<Path> files = Files.list(directory)) {
            assertThat(files.map(each -> each.getFileName().toString()))
                    .containsExactlyInAnyOrder("link.json", "t.csv", "t.json", "t.svg");
        }
        List<String> header = StudyRun.header(StudyRun.records(Files.readString(directory.resolve("t.csv"))));
        assertThat(header).endsWith("meets").doesNotHaveDuplicates();
        assertThat(Files.readString(directory.resolve("t.json")))
                .contains("\"study\": \"" + command + "\"")
                .doesNotContain("null", "NaN", "Infinity");
        String[] again = {"--csv", places.get(0)};
        assertThat(run(command, again).err())
                .isEqualTo("binspan: " + places.get(0) + ": exists already; --force replaces it\n");
        assertThat(run(command, "--force", "--csv", places.get(0)).status()).isZero();
    }

    @ParameterizedTest
    @MethodSource("commands")
    void existingFileIsKept(String command) throws IOException {
        for (String option : List.of("--csv", "--json", "--plot")) {
            Path old = Files.writeString(tables.resolve("old.png"), "old");
            assertRefused(
                    run(command, option, old.toString()), "binspan: " + old + ": exists already; --force replaces it");
            assertThat(old).hasContent("old");
        }
    }

    @ParameterizedTest
    @MethodSource("commands")
    void outputThatCannotBeWrittenIsRefused(String command) throws IOException {
        String nowhere = directory.resolve("no/t").toString();
        assertRefused(run(command, "--csv", nowhere + ".csv"), "binspan: " + nowhere + ".csv: no such directory");
        assertRefused(run(command, "--plot", nowhere + ".svg"), "binspan: " + nowhere + ".svg: no such directory");
        assertRefused(
                run(command, "--json", directory.toString()),
                "binspan: " + directory + ": found a directory; allowed a file name");
        assertRefused(
                run(command, "--csv", "-", "--json", "-"),
                "binspan: --csv - --json -: found standard output twice; allowed for one of them");
        assertRefused(
                run(command, "--csv", file, "--force"),
                "binspan: " + file + ": found twice on the command line; allowed a file for each output");
        assertRefused(
                run(command, "--plot", "t.gif"), "binspan: t.gif: not the ending of a picture; allowed .png or .svg");
        assertThat(Files.readString(Path.of(file))).isEqualTo(StudyRun.shipped(DAM));
    }

    @ParameterizedTest
    @MethodSource("commands")
    void badScenarioIsToldAsByCheck(String command) throws IOException {
        Path broken = Files.writeString(
                tables.resolve("broken.json"),
                StudyRun.shipped(DAM).replace("\"imbalanceNs\": 2.0", "\"imbalanceNs\": -2.0, \"imbalance\": 3"));
        String check = Run.of("check", broken.toString()).err();
        assertThat(check.lines()).hasSize(2);
        file = broken.toString();
        String csv = directory.resolve("t.csv").toString();
        assertThat(run(command, "--csv", csv)).isEqualTo(new Run(2, "", check));
        file = "no.json";
        assertThat(run(command, "--csv", csv)).isEqualTo(new Run(2, "", "no.json: no such file\n"));
        BadInput.holdsOneFile(directory);
    }

    @ParameterizedTest
    @MethodSource("commands")
    void misspeltOptionIsCorrected(String command) {
        Run run = run(command, "--cvs", "t.csv");
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines())
                .containsExactly(
                        "binspan " + command + ": unknown option --cvs; did you mean --csv?",
                        "binspan " + command + " --help explains the command");
    }

    @ParameterizedTest
    @MethodSource("commands")
    void helpFitsATerminalAndNamesTheExitStatuses(String command) {
        PrintStream err = System.err;
        ByteArrayOutputStream warnings = new ByteArrayOutputStream();
        System.setErr(new PrintStream(warnings, true, StandardCharsets.UTF_8));
        Run run;
        try {
            run = Run.of(command, "--help");
        } finally {
            System.setErr(err);
        }
        assertThat(warnings.toString(StandardCharsets.UTF_8)).isEmpty();
        assertThat(run.status()).isZero();
        assertThat(run.out())
                .contains("Examples:", "--csv", "--json", "--plot", "2 bad input")
                .doesNotContain("%%");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
        assertThat(run.out().lines())
                .as("a line too long for the page leaves its last word alone")
                .filteredOn(line -> line.matches("\\S+"))
                .containsExactly("Examples:");
    }

    @Test
    void noPictureIsDrawnOfThreeVariedParameters() throws IOException {
        String png = directory.resolve("t.png").toString();
        Run run = run("sweep", "--vary", "imbalanceNs=1:2:2", "--vary", "link.lengthKm=10:20:2", "--plot", png);
        assertRefused(run, "binspan: --plot " + png + ": a picture shows one or two varied parameters");
        assertRefused(
                run("window", "--vary", "imbalanceNs=1:2", "--vary", "link.lengthKm=10:20", "--plot", png),
                "binspan: --vary \"link.lengthKm=10:20\": found 3 varied parameters; allowed 1 to 2");
    }

    @Test
    void wordsThatGoWithABoxAloneAreRefused() throws IOException {
        assertRefused(run("window", "--centred"), "binspan: --centred: goes with --box, which is missing");
        assertRefused(
                run("window", "--equal-tolerance"), "binspan: --equal-tolerance: goes with --box, which is missing");
        assertRefused(
                new StudyRun("window", file).run("--box", "--centred", "--vary", "imbalanceNs=3:4"),
                "binspan: --vary: imbalanceNs: found 2 in the scenario; to hold the box there its range must contain it,"
                        + " found 3 to 4");
        assertRefused(
                new StudyRun("window", file).run("--box", "--equal-tolerance", "--vary", "alice.delayErrorPs=-9:9"),
                "binspan: --vary: alice.delayErrorPs: found -9 to 9; a relative tolerance needs a range on one side of 0");
    }

    @Test
    void wrongRangeOfAWindowIsOneLine() throws IOException {
        Map<String, String> wrong = Map.of(
                "timing.windwWidthPs=1:2",
                "unknown path \"timing.windwWidthPs\": timing has no \"windwWidthPs\"; did you mean windowWidthPs?",
                "timing.windowWidthPs=9:1",
                "found 9 to 1; allowed a range that rises",
                "alice.delayErrorPs=-1:9:log",
                "found -1 to 9 in logarithmic steps; allowed above 0",
                "timing.windowWidthPs=",
                "found no range; allowed PATH=FROM:TO, then :STEPS and :log if wanted",
                "acquisition.fringePoints=3:9",
                "found a whole number; allowed a parameter that changes steadily");
        for (Map.Entry<String, String> each : wrong.entrySet()) {
            assertRefused(
                    new StudyRun("window", file).run("--vary", each.getKey()),
                    "binspan: --vary \"" + each.getKey() + "\": " + each.getValue());
        }
    }

    @Test
    void nothingRequiredHasNoWindow() throws IOException {
        file = StudyRun.of("", directory, StudyRun.requiring(StudyRun.shipped(DAM), ""))
                .file();
        assertRefused(
                run("window"),
                "binspan: --vary: the scenario states no requirement; state at least one in its section \"require\"");
    }
}

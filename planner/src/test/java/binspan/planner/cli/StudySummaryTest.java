package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every study of every shipped scenario ends well, and its summary can be read on any terminal. */
final class StudySummaryTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final int COLUMNS = 80;

    /** Their predictions take a hundred times as long as others: 10 000 points of a box would take seconds. */
    private static final List<String> SLOW = List.of("eagle-tarn-to-saltmarsh", "orchard-lane-access");

    private static final List<String> MARKS_OF_FAILURE =
            List.of("NaN", "Infinity", "null", "Exception", "\tat ", "Optional", "\u221e", "java.", "E-0");

    @TempDir
    private Path directory;

    private Properties properties;

    @BeforeEach
    void keepProperties() {
        properties = (Properties) System.getProperties().clone();
    }

    @AfterEach
    void restoreProperties() {
        System.setProperties(properties);
    }

    static Stream<String> names() {
        return StudyRun.shippedNames().stream();
    }

    private String routes() throws IOException {
        return Files.writeString(
                        directory.resolve("routes.csv"),
                        "name,alice.lengthKm,bob.lengthKm,alice.fibre\nnear,4,5,\nfar,300,300,\nother glass,9,8,G.654.E\n")
                .toString();
    }

    /** A run of each study with few points; the exit statuses that are not 0 are those of links that fail. */
    private List<Run> runs(String name) throws IOException {
        boolean continuous = name.startsWith("stonebridge");
        String pairs = continuous ? "source.pairRatePerSecond=1e6:2e7:5" : "source.meanPairsPerCycle=0.005:0.08:5";
        List<Run> runs = new ArrayList<>();
        String window = "timing.windowWidthPs=50:1000";
        runs.add(run("sweep", name, "--vary", window + ":9"));
        runs.add(run("window", name, "--vary", window));
        runs.add(run("window", name, "--vary", window + ":5", "--vary", pairs));
        if (!SLOW.contains(name)) {
            runs.add(run("window", name, "--box", "--vary", window));
        }
        runs.add(run("tune", name, "--free", "timing.windowWidthPs=50:1000"));
        runs.add(run("reach", name, "--as-written"));
        runs.add(run("compare", name, "--detectors", "snspd,snspd/snspd-cold-filter", "--as-written"));
        runs.add(run("tolerance", name, "--samples", "32", "--spread", "timing.windowWidthPs=triangular:5%"));
        runs.add(run("routes", name, "--table", routes()));
        return runs;
    }

    private static Run run(String command, String name, String... words) {
        return StudyRun.ofShipped(command, name).run(words);
    }

    @ParameterizedTest
    @MethodSource("names")
    void everyStudyEndsWellAndItsSummaryCanBeRead(String name) throws IOException {
        for (Run run : runs(name)) {
            assertThat(run.err()).isEmpty();
            assertThat(run.status()).isIn(ExitStatus.MET, ExitStatus.UNMET);
            assertThat(run.out()).endsWith(".\n").contains("--plot FILE.png");
            assertReadable(run.out());
            run.out().lines().forEach(StudySummaryTest::assertUnits);
        }
    }

    private static void assertReadable(String text) {
        assertThat(text).doesNotContain(MARKS_OF_FAILURE);
        assertThat(text.lines()).allSatisfy(line -> {
            assertThat(line.length()).as(line).isLessThanOrEqualTo(COLUMNS);
            assertThat(line).doesNotEndWith(" ");
        });
    }

    /** Numbers of these lines have a unit of their own. */
    private static void assertUnits(String line) {
        assertUnit(line, "windowWidthPs +(from )?\\d", "\\d ps");
        assertUnit(line, "^ *window width +\\d", "\\d ps");
        assertUnit(line, "secret key rate +\\S+ \\d", "\\S+ [\\d.e-]+ k?bit/s");
        assertUnit(line, "basis error rate +\\S+ \\d", "\\S+ [\\d.]+ %");
        assertUnit(line, "time to the first key +\\S+ \\d", "\\S+ [\\d.]+ h");
        assertUnit(line, "time to S > 2 by 5 sigma +\\S+ \\d", "\\S+ [\\d.]+ h");
        assertUnit(line, "^\\d[\\d.]* km ", "(bit/s|none)");
    }

    private static void assertUnit(String line, String found, String needed) {
        if (line.matches(".*" + found + ".*")) {
            assertThat(line).containsPattern(needed);
        }
    }

    @Test
    void asciiStandsInWhereTheTerminalKnowsNothingElse() throws IOException {
        System.setProperty("stdout.encoding", "US-ASCII");
        for (Run run : runs(DAM)) {
            assertThat(run.out()).matches("(?s)[\\x00-\\x7e]*");
            assertThat(run.out()).doesNotContain("?", "\u00a0");
            assertReadable(run.out());
        }
        assertThat(run("tune", DAM, "--free", "timing.windowWidthPs").out())
                .contains("+ secret key rate ", ">= 1.00 kbit/s", "<= 5 %");
        assertThat(run("tolerance", DAM, "--samples", "16").out()).contains(" +- 0.400 dB");
        System.setProperty("stdout.encoding", "UTF-8");
        assertThat(run("tune", DAM, "--free", "timing.windowWidthPs").out())
                .contains("\u2713 secret key rate ", "\u2265 1.00 kbit/s", "\u2264 5 %");
        assertThat(run("tolerance", DAM, "--samples", "16").out()).contains(" \u00b1 0.400 dB");
    }

    @Test
    void longLabelsDoNotBreakThePage() throws IOException {
        String label = "upper duct along the old railway to the dam";
        String scenario = StudyRun.shipped(DAM).replace("upper duct", label);
        String file = StudyRun.of("", directory, scenario).file();
        String path = "alice.path." + label + ".measuredLossDb";
        String[][] commands = {
            {"sweep", "--vary", path + "=5:9:5"},
            {"window", "--vary", path + "=5:9"},
            {"window", "--vary", path + "=5:9:5", "--vary", "timing.windowWidthPs=100:900:5"},
            {"window", "--box", "--vary", path + "=5:9"},
            {"tune", "--free", path + "=5:9"},
            {"tolerance", "--samples", "16"},
            {"compare", "--without", label, "--as-written"}
        };
        for (String[] command : commands) {
            String[] words = Stream.of(command).skip(1).toArray(String[]::new);
            Run run = new StudyRun(command[0], file).run(words);
            assertThat(run.status()).as(String.join(" ", command)).isZero();
            assertReadable(run.out());
            assertThat(run.out().replaceAll("\\s+", " ")).contains(label);
        }
    }

    @Test
    void labelsInOtherLettersDoNotReachAnAsciiTerminal() throws IOException {
        System.setProperty("stdout.encoding", "US-ASCII");
        String scenario =
                StudyRun.shipped(DAM).replace("upper duct", "d\u00fcker").replace("Kestrel", "K\u00e9strel");
        String file = StudyRun.of("", directory, scenario).file();
        String path = "alice.path.d\u00fcker.measuredLossDb";
        String[][] commands = {
            {"sweep", "--vary", path + "=5:9:5"},
            {"window", "--vary", path + "=5:9:5", "--vary", "timing.windowWidthPs=100:900:5"},
            {"window", "--box", "--vary", path + "=5:9"},
            {"tune", "--free", path + "=5:9"},
            {"tolerance", "--samples", "16"},
            {"compare", "--without", "d\u00fcker", "--as-written"}
        };
        for (String[] command : commands) {
            Run run = new StudyRun(command[0], file)
                    .run(Stream.of(command).skip(1).toArray(String[]::new));
            assertThat(run.status()).as(String.join(" ", command)).isZero();
            assertThat(run.out()).contains("d?ker").matches("(?s)[\\x00-\\x7e]*");
        }
    }
}

package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.report.JsonTree;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The command {@code tolerance}: its shares and quantiles against the rows of its own table, its rows against checks of builds written by hand. */
final class ToleranceCommandTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final String RIDGE = "harrow-ridge-overhead-line";
    private static final StudyRun STUDY = StudyRun.ofShipped("tolerance", DAM);
    private static final String[] WIDE = {"--spread", "source.meanPairsPerCycle=normal:15%", "--samples", "512"};

    @TempDir
    private Path directory;

    private static String[] with(String... more) {
        List<String> words = new ArrayList<>(List.of(WIDE));
        words.addAll(List.of(more));
        return words.toArray(String[]::new);
    }

    private static double[] sorted(List<CSVRecord> rows, String column) {
        return rows.stream()
                .mapToDouble(row -> StudyRun.number(row, column))
                .sorted()
                .toArray();
    }

    @Test
    void sharesAreTheCountedRows() throws IOException {
        List<CSVRecord> rows = STUDY.rows(WIDE);
        JsonTree.Node tree = STUDY.json(WIDE);
        assertThat(rows).hasSize(512);
        assertShare(
                tree.at("all"),
                rows.stream().filter(row -> row.get("meets").equals("true")).count());
        List<JsonTree.Node> each = tree.at("requirements").items();
        assertThat(each).hasSize(6);
        assertShare(each.get(0), count(rows, "visibility.raw", 0.88, true));
        assertShare(each.get(1), count(rows, "bell.chsh", 2.5, true));
        assertShare(each.get(2), count(rows, "qber.phase", 0.05, false));
        assertShare(each.get(3), count(rows, "qber.time", 0.05, false));
        assertShare(each.get(4), count(rows, "key.asymptoticBps", 1000.0, true));
        assertShare(each.get(5), count(rows, "key.secondsToFirstKey", 3600.0, false));
        assertThat((Double) tree.at("all", "share").value()).isBetween(0.5, 0.99);
    }

    private static long count(List<CSVRecord> rows, String column, double limit, boolean atLeast) {
        return rows.stream()
                .mapToDouble(row -> StudyRun.number(row, column))
                .filter(value -> atLeast ? value >= limit : value <= limit)
                .count();
    }

    private static void assertShare(JsonTree.Node share, long met) {
        assertThat(share.at("met").value()).isEqualTo((double) met);
        assertThat((Double) share.at("share").value()).isCloseTo(met / 512.0, within(1e-12));
        assertThat((Double) share.at("lowest").value()).isLessThanOrEqualTo(met / 512.0);
        assertThat((Double) share.at("highest").value()).isGreaterThanOrEqualTo(met / 512.0);
    }

    @Test
    void quantilesLieBetweenTheRowsOfTheirRank() throws IOException {
        List<CSVRecord> rows = STUDY.rows(WIDE);
        for (JsonTree.Node figure : STUDY.json(WIDE).at("figures").items()) {
            String name = (String) figure.at("name").value();
            if (!List.of("visibility.raw", "key.asymptoticBps", "alice.lossDb").contains(name)) {
                continue;
            }
            double[] sorted = sorted(rows, name);
            for (int percent : new int[] {5, 50, 95}) {
                double rank = (sorted.length - 1) * percent / 100.0;
                assertThat((Double) figure.at("quantile" + percent).value())
                        .as(name + " " + percent)
                        .isBetween(sorted[(int) rank - 1], sorted[(int) rank + 2]);
            }
        }
    }

    @Test
    void rowsAreWhatAChecksOfBuildsWrittenByHandSay() throws IOException {
        StudyRun ridge = StudyRun.ofShipped("tolerance", RIDGE);
        String[] words = {
            "--spread",
            "timing.cableTemperatureStepK=uniform:80%",
            "--spread",
            "timing.windowWidthPs=triangular:100",
            "--samples",
            "32"
        };
        List<CSVRecord> rows = ridge.rows(words);
        List<String> expected = new ArrayList<>(List.of("timing.cableTemperatureStepK", "timing.windowWidthPs"));
        expected.addAll(ridge.figures());
        expected.add("meets");
        assertThat(StudyRun.header(rows)).isEqualTo(expected);
        for (CSVRecord row : rows) {
            String scenario = StudyRun.edited(
                    StudyRun.shipped(RIDGE),
                    "\"cableTemperatureStepK\": 0.25",
                    "\"cableTemperatureStepK\": " + row.get("timing.cableTemperatureStepK"));
            StudyRun.check(StudyRun.edited(
                            scenario,
                            "\"windowWidthPs\": 400",
                            "\"windowWidthPs\": " + row.get("timing.windowWidthPs")))
                    .assertSame(row, ridge.figures(), 1e-12);
        }
        assertThat(sorted(rows, "timing.cableTemperatureStepK")[0]).isBetween(0.05, 0.08);
        double[] widths = sorted(rows, "timing.windowWidthPs");
        assertThat(widths[0]).isBetween(300.0, 350.0);
        assertThat(widths[31]).isBetween(450.0, 500.0);
        assertThat(rows).extracting(row -> row.get("meets")).contains("true", "false");
    }

    /** Failing is decided by one uniform parameter: the share of builds that meet is the share of its range (closed form). */
    @Test
    void shareOfOneParameterIsThatOfItsRange() throws IOException {
        StudyRun ridge = StudyRun.ofShipped("tolerance", RIDGE);
        CSVRecord end = StudyRun.ofShipped("window", RIDGE)
                .rows("--vary", "timing.cableTemperatureStepK=0:0.5")
                .get(2);
        double expected = (StudyRun.number(end, "timing.cableTemperatureStepK") - 0.05) / 0.4;
        double share = (Double) ridge.json(
                        "--spread", "timing.cableTemperatureStepK=uniform:0.2", "--samples", "4096", "--show", "bell")
                .at("all", "share")
                .value();
        assertThat(share).isCloseTo(expected, within(1.5 / 4096));
    }

    @Test
    void sameSeedGivesTheSameBytesAndAnotherSeedOthers() {
        String first = STUDY.run(with("--csv", "-")).out();
        assertThat(STUDY.run(with("--csv", "-", "--seed", "1")).out()).isEqualTo(first);
        assertThat(STUDY.run(with("--csv", "-", "--seed", "2")).out())
                .isNotEqualTo(first)
                .hasLineCount(513);
        assertThat(STUDY.run(with("--json", "-")).out())
                .isEqualTo(STUDY.run(with("--json", "-")).out());
    }

    @Test
    void spreadOfTheScenarioIsTakenAndOneOfTheCommandLineReplacesIt() {
        List<JsonTree.Node> own = STUDY.json("--samples", "16").at("spreads").items();
        assertThat(own).hasSize(6);
        List<JsonTree.Node> spreads = STUDY.json(WIDE).at("spreads").items();
        assertThat(spreads).hasSize(6);
        JsonTree.Node pairs = spreads.stream()
                .filter(each -> each.at("path").value().equals("source.meanPairsPerCycle"))
                .findFirst()
                .orElseThrow();
        assertThat(pairs.at("shape").value()).isEqualTo("normal");
        assertThat((Double) pairs.at("width").value()).isCloseTo(0.15 * 0.04, within(1e-15));
        assertThat(pairs.at("planned").value()).isEqualTo(0.04);
    }

    @Test
    void driversAreRankedAndTheWidestSpreadLeads() {
        List<JsonTree.Node> drivers = STUDY.json(WIDE).at("drivers").items();
        assertThat(drivers.get(0).at("path").value()).isEqualTo("source.meanPairsPerCycle");
        assertThat((Double) drivers.get(0).at("failureIndex").value())
                .isGreaterThan((Double) drivers.get(1).at("failureIndex").value());
    }

    @Test
    void summaryTellsOddsSpreadsFiguresAndDrivers() {
        Run run = STUDY.run(WIDE);
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .containsPattern("\n\\S [\\d.]+ % of the builds meet all requirements \\(95 % confidence: [\\d.]+ % to")
                .contains("Spread of 512 builds", "What drives failures")
                .containsPattern("source.meanPairsPerCycle +normal, 0.04000 \\S+ 0.00600\n")
                .containsPattern("alice.path.upper duct.measuredLossDb +uniform, 7.100 \\S+ 0.400 dB\n")
                .containsPattern("secret key rate +\\S+ 1.00 kbit/s +[\\d.]+ %  [\\d.]+ % to [\\d.]+ %\n")
                .containsPattern("secret key rate +[\\d.]+ k?bit/s +[\\d.]+ kbit/s +[\\d.]+ kbit/s\n");
    }

    /** Nearly all, all and none are told apart; 3 of 4096 would be lost in one decimal. */
    @Test
    void rareFailuresKeepTheirDigits() throws IOException {
        StudyRun rare = StudyRun.of(
                "tolerance", directory, StudyRun.requiring(StudyRun.shipped(DAM), "\"keyRateAtLeastBps\": 990"));
        Run run = rare.run("--samples", "4096", "--show", "key.asymptoticBps");
        double share = (Double) rare.json("--samples", "4096", "--show", "key.asymptoticBps")
                .at("all", "share")
                .value();
        assertThat(share).isBetween(0.99, 0.9999);
        String told = run.out().lines().skip(1).findFirst().orElseThrow().replaceAll("^\\S ([\\d.]+) % of .*", "$1");
        assertThat(Double.parseDouble(told)).isCloseTo(100.0 * share, within(5.0 * (1.0 - share)));
        assertThat(told).matches("99\\.\\d{2,3}");
    }

    @Test
    void withoutRequirementsOnlyTheScatterIsTold() throws IOException {
        StudyRun none = StudyRun.of("tolerance", directory, StudyRun.requiring(StudyRun.shipped(DAM), ""));
        Run run = none.run("--samples", "16");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out()).contains("No requirement is stated").doesNotContain("drives", "Requirement");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--samples 8 | --samples 8: allowed 16 to 10000000",
                "--samples 10000001 | --samples 10000001: allowed 16 to 10000000",
                "--samples 10000000 | --spread: found 7.30e+08 numbers of all builds; allowed 50000000:"
                        + " take fewer samples or fewer figures",
                "--show qber.phas | --show: unknown figure of merit qber.phas; did you mean qber.phase?",
                "--spread imbalanceNs=normal | --spread \"imbalanceNs=normal\": allowed PATH=normal:SD,"
                        + " PATH=uniform:HALF or PATH=triangular:HALF",
                "--spread imbalanceNs=gauss:1 | --spread \"imbalanceNs=gauss:1\": unknown shape gauss;"
                        + " allowed normal ' ' uniform ' ' triangular",
                "--spread imbalanceN=normal:1 | --spread \"imbalanceN=normal:1\": unknown path \"imbalanceN\":"
                        + " scenario has no \"imbalanceN\"; did you mean imbalanceNs?",
                "--spread alice.detectors.efficiency=normal:1% | --spread: alice.detectors[0].efficiency: found twice;"
                        + " allowed once"
            })
    void wrongOptionIsOneLine(String words, String message) throws IOException {
        StudyRun study = StudyRun.of("tolerance", directory, StudyRun.shipped(DAM));
        assertThat(study.run((words + " --csv " + directory.resolve("t.csv")).split(" ")))
                .isEqualTo(new Run(2, "", "binspan: " + message.replace("' '", "|") + "\n"));
        BadInput.holdsOneFile(directory);
    }

    @ParameterizedTest
    @CsvSource({"--samples, many", "--samples, 1e5", "--seed, one"})
    void wordInPlaceOfACountIsRefused(String option, String word) {
        Run run = STUDY.run(option, word);
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines())
                .containsExactly(
                        "binspan tolerance: " + option + ": found \"" + word + "\"; allowed a whole number",
                        "binspan tolerance --help explains the command");
    }

    @Test
    void nothingToSpreadIsRefused() {
        assertThat(StudyRun.ofShipped("tolerance", RIDGE).run())
                .isEqualTo(new Run(
                        2,
                        "",
                        "binspan: --spread: found 0 spread parameters; allowed 1 to 1000: state them in the scenario's"
                                + " spread section or add one\n"));
    }
}

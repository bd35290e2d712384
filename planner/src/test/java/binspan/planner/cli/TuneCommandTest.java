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

/** The command {@code tune}, against checks of scenarios edited by hand and the best point of a sweep. */
final class TuneCommandTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final String WINDOW = "timing.windowWidthPs";
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final StudyRun STUDY = StudyRun.ofShipped("tune", DAM);

    @TempDir
    private Path directory;

    private static StudyRun.Checked at(CSVRecord row) {
        String scenario = StudyRun.edited(
                StudyRun.shipped(DAM), "\"meanPairsPerCycle\": 0.04", "\"meanPairsPerCycle\": " + row.get(PAIRS));
        return StudyRun.check(
                StudyRun.edited(scenario, "\"windowWidthPs\": 400", "\"windowWidthPs\": " + row.get(WINDOW)));
    }

    @Test
    void bothRowsAreWhatACheckSays() throws IOException {
        List<CSVRecord> rows = STUDY.rows();
        List<String> expected = new ArrayList<>(List.of(PAIRS, WINDOW));
        expected.addAll(STUDY.figures());
        expected.addAll(List.of("settings", "meets"));
        assertThat(StudyRun.header(rows)).isEqualTo(expected);
        assertThat(rows).extracting(row -> row.get("settings")).containsExactly("as written", "tuned");
        assertThat(rows.get(0).get(PAIRS)).isEqualTo("0.04");
        assertThat(rows.get(0).get(WINDOW)).isEqualTo("400");
        for (CSVRecord row : rows) {
            at(row).assertSame(row, STUDY.figures(), 1e-12);
        }
        assertThat(at(rows.get(1)).failing()).isEmpty();
    }

    /** At least the best of the 10 201 points of a sweep, and hardly more: the surface is smooth between them. */
    @ParameterizedTest
    @CsvSource({"key, key.asymptoticBps, 0.02", "visibility, visibility.raw, 0.003", "chsh, bell.chsh, 0.003"})
    void bestIsThatOfADenseSweep(String objective, String figure, double above) throws IOException {
        String[] ranges = {PAIRS + "=0.01:0.1:log", WINDOW + "=100:1000:log"};
        double best = StudyRun.number(
                STUDY.rows("--free", ranges[0], "--free", ranges[1], "--for", objective)
                        .get(1),
                figure);
        List<CSVRecord> sweep = new StudyRun("sweep", STUDY.file())
                .rows("--vary", PAIRS + "=0.01:0.1:101:log", "--vary", WINDOW + "=100:1000:101:log", "--show", figure);
        double grid = sweep.stream()
                .filter(row -> row.get("meets").equals("true"))
                .mapToDouble(row -> StudyRun.number(row, figure))
                .max()
                .orElseThrow();
        assertThat(best).isBetween(grid * (1.0 - 1e-9), grid * (1.0 + above));
    }

    /** The least margin is a ratio: the tightest requirement of the check at the best point has just that room. */
    @Test
    void marginIsTheRoomOfTheTightestRequirement() throws IOException {
        JsonTree.Node tree = STUDY.json("--for", "margin");
        StudyRun.Checked check = at(STUDY.rows("--for", "margin").get(1));
        double least = Double.POSITIVE_INFINITY;
        for (String name : List.of("rawVisibilityAtLeast", "chshAtLeast", "keyRateAtLeastBps")) {
            least = Math.min(least, Math.log(check.ratio(name)));
        }
        for (String name : List.of("phaseBasisQberAtMost", "timeBasisQberAtMost")) {
            least = Math.min(least, -Math.log(check.ratio(name)));
        }
        assertThat((Double) tree.at("best").value()).isCloseTo(least, within(1e-9));
        assertThat(least).isGreaterThan((Double) tree.at("asWritten").value());
    }

    @Test
    void jsonTellsRangesValuesAndObjective() throws IOException {
        JsonTree.Node tree = STUDY.json("--free", WINDOW + "=100:1000", "--for", "visibility");
        assertThat(tree.names())
                .startsWith("formatVersion", "version", "scenario", "study", "free", "objective", "asWritten", "best")
                .contains("settings." + WINDOW, "seed", "evaluations")
                .endsWith("rows");
        JsonTree.Node free = tree.at("free").items().get(0);
        assertThat(free.at("path").value()).isEqualTo(WINDOW);
        assertThat(free.at("unit").value()).isEqualTo("ps");
        assertThat(free.at("from").value()).isEqualTo(100.0);
        assertThat(free.at("to").value()).isEqualTo(1000.0);
        JsonTree.Node best = tree.at("rows").items().get(1);
        assertThat(tree.at("best").value()).isEqualTo(best.at("visibility.raw").value());
        assertThat(tree.at("settings", WINDOW).value())
                .isEqualTo(best.at(WINDOW).value());
        assertThat(tree.at("asWritten").value())
                .isEqualTo(StudyRun.check(StudyRun.shipped(DAM)).figure("visibility.raw"));
    }

    @Test
    void answerIsTheSameEachTime() {
        assertThat(STUDY.run("--csv", "-")).isEqualTo(STUDY.run("--csv", "-"));
    }

    @Test
    void summaryTellsSettingsGainAndWhatFailsAsWritten() {
        Run met = STUDY.run();
        assertThat(met.status()).isEqualTo(ExitStatus.MET);
        assertThat(met.out())
                .containsPattern("secret key rate 1.\\d\\d kbit/s, as written 1.36 kbit/s, \\+[\\d.]+ %\n")
                .containsPattern("timing.windowWidthPs +[\\d.]+ ps +400.0 ps\n")
                .containsPattern("phase-basis error rate +\\S+ 5 % +5.00 % +3.98 %\n")
                .doesNotContain("fails", "As written");
        Run failing = StudyRun.ofShipped("tune", "harrow-ridge-overhead-line").run();
        assertThat(failing.status()).isEqualTo(ExitStatus.MET);
        assertThat(failing.out())
                .contains("As written the link does not meet its requirements; tuned it does.")
                .containsPattern("CHSH S +\\S+ 2.5 +2.55 +2.05  \\S fails\n")
                .containsPattern("time to the first key +\\S+ 1 h +\\d+ ms +never  \\S fails\n");
    }

    @Test
    void bestAtTheEndOfItsRangeIsSaid() {
        assertThat(STUDY.run("--free", PAIRS + "=0.03:0.045").out())
                .containsPattern("source.meanPairsPerCycle +0.04500 +0.04000  end of its range\n");
    }

    @Test
    void withoutRequirementsTheRangesAloneLimit() throws IOException {
        StudyRun free = StudyRun.of("tune", directory, StudyRun.requiring(StudyRun.shipped(DAM), ""));
        Run run = free.run("--free", PAIRS);
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out()).contains("No requirement is stated").doesNotContain("Requirement ");
    }

    @Test
    void withoutAFeasiblePointOneLineTellsWhatIsViolatedLeastAndByHowMuch() throws IOException {
        StudyRun study = StudyRun.of("tune", directory, StudyRun.shipped(DAM));
        Run run = study.run(
                "--free", WINDOW + "=10:60", "--csv", directory.resolve("t.csv").toString());
        double key = StudyRun.check(
                        StudyRun.edited(StudyRun.shipped(DAM), "\"windowWidthPs\": 400", "\"windowWidthPs\": 60"))
                .figure("key.asymptoticBps");
        assertThat(run)
                .isEqualTo(new Run(
                        2,
                        "",
                        "binspan: no settings of the free parameters meet all requirements; at the nearest point"
                                + " the secret key rate is " + String.format(java.util.Locale.ROOT, "%.3g", key)
                                + " bit/s, required at least 1.00 kbit/s\n"));
        BadInput.holdsOneFile(directory);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--for keys | unknown objective keys; allowed key ' ' visibility ' ' chsh ' ' margin; did you mean key?",
                "--free timing.windwWidthPs | --free \"timing.windwWidthPs\": unknown path \"timing.windwWidthPs\":"
                        + " timing has no \"windwWidthPs\"; did you mean windowWidthPs?",
                "--free timing.windowWidthPs=9:1 | --free \"timing.windowWidthPs=9:1\": found 9 to 1; allowed a range"
                        + " that rises",
                "--free alice.delayErrorPs=0:9:log | --free \"alice.delayErrorPs=0:9:log\": found 0 to 9 in"
                        + " logarithmic steps; allowed above 0",
                "--free imbalanceNs --free imbalanceNs | --free: imbalanceNs: found twice; allowed once",
                "--free acquisition.fringePoints=3:9 | --free \"acquisition.fringePoints=3:9\": found a whole number;"
                        + " allowed a parameter that changes steadily",
                "--free source.pairRatePerSecond | --free \"source.pairRatePerSecond\": does not go with a pulse-pair"
                        + " pump; vary source.meanPairsPerCycle"
            })
    void wrongOptionIsOneLine(String words, String message) throws IOException {
        StudyRun study = StudyRun.of("tune", directory, StudyRun.shipped(DAM));
        assertThat(study.run((words + " --csv " + directory.resolve("t.csv")).split(" ")))
                .isEqualTo(new Run(2, "", "binspan: " + message.replace("' '", "|") + "\n"));
        BadInput.holdsOneFile(directory);
    }

    @Test
    void objectiveThatTheLinkDoesNotHaveIsRefused() throws IOException {
        StudyRun none = StudyRun.of("tune", directory, StudyRun.requiring(StudyRun.shipped(DAM), ""));
        assertThat(none.run("--for", "margin").err())
                .isEqualTo("binspan: --for margin: the scenario states no requirement to keep a margin to\n");
        String onePort =
                StudyRun.shipped("stonebridge-to-lower-weir").replaceFirst("\\},\\s+\\{ \"class\": [^}]+\\}", "}");
        StudyRun single = StudyRun.of("tune", directory, StudyRun.requiring(onePort, "\"chshAtLeast\": 2.5"));
        assertThat(single.run("--for", "key").err())
                .isEqualTo("binspan: --for key: this link makes no key: both sides need both ports detected\n");
        assertThat(single.run("--free", WINDOW).out())
                .contains("CHSH S 2.", ", as written 2.")
                .doesNotContain("key");
    }
}

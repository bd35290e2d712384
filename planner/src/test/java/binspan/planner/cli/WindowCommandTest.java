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

/** The command {@code window} along one parameter and on a map of two, against checks of scenarios edited by hand and dense sweeps. */
final class WindowCommandTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final String WINDOW = "timing.windowWidthPs";
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final double RELATIVE = 1e-5;

    @TempDir
    private Path directory;

    /** The rows of a window are what a check says, its ends hold, and a hair beyond them exactly the named requirement fails. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "kestrel-dam-to-millbrook | timing.windowWidthPs | 50:1000 | \"windowWidthPs\": 400"
                        + " | keyRateAtLeastBps | range",
                "kestrel-dam-to-millbrook | source.meanPairsPerCycle | 1e-4:0.3:log | \"meanPairsPerCycle\": 0.04"
                        + " | keyRateAtLeastBps | phaseBasisQberAtMost",
                "kestrel-dam-to-millbrook | imbalanceNs | 0.1:3 | \"imbalanceNs\": 2.0 | timeBasisQberAtMost | range",
                "stonebridge-to-lower-weir | timing.windowWidthPs | 20:1000 | \"windowWidthPs\": 220"
                        + " | keyRateAtLeastBps | carAtLeast",
                "harrow-ridge-overhead-line | timing.cableTemperatureStepK | 0:0.5"
                        + " | \"cableTemperatureStepK\": 0.25 | range | keyRateAtLeastBps"
            })
    void endsAreWhereAChecksVerdictTurns(
            String name, String path, String range, String field, String lower, String upper) throws IOException {
        StudyRun study = StudyRun.ofShipped("window", name);
        List<CSVRecord> rows = study.rows("--vary", path + "=" + range);
        assertThat(rows).extracting(row -> row.get("point")).containsExactly("from", "best", "to");
        assertThat(rows).extracting(row -> row.get("endedBy")).containsExactly(lower, "", upper);
        for (CSVRecord row : rows) {
            StudyRun.Checked check = at(name, field, StudyRun.number(row, path));
            check.assertSame(row, study.figures(), 1e-12);
            assertThat(check.failing()).isEmpty();
        }
        assertEnd(name, field, StudyRun.number(rows.get(0), path), -RELATIVE, lower);
        assertEnd(name, field, StudyRun.number(rows.get(2), path), RELATIVE, upper);
    }

    private static void assertEnd(String name, String field, double end, double beyond, String requirement) {
        if (!requirement.equals("range")) {
            assertThat(at(name, field, end * (1.0 + beyond)).failing()).containsExactly(requirement);
        }
    }

    private static StudyRun.Checked at(String name, String field, double value) {
        String written = field.substring(0, field.indexOf(':') + 2) + value;
        return StudyRun.check(StudyRun.edited(StudyRun.shipped(name), field, written));
    }

    @Test
    void columnsAreParameterFiguresOwnColumnsAndMeets() throws IOException {
        StudyRun study = StudyRun.ofShipped("window", DAM);
        List<String> expected = new ArrayList<>(List.of(WINDOW));
        expected.addAll(study.figures());
        expected.addAll(List.of("window", "point", "endedBy", "meets"));
        assertThat(StudyRun.header(study.rows("--vary", WINDOW + "=50:1000"))).containsExactlyElementsOf(expected);
    }

    /**
     * The visibility of the dam link is least without dispersion and highest at some (see its scenario): asked for more than the least, there are two windows
     * of a compensator. A sweep of 2001 points brackets all four ends.
     */
    @Test
    void bothOfTwoWindowsAreFoundAndEveryRowOfADenseSweepAgrees() throws IOException {
        String compensated = StudyRun.edited(
                StudyRun.shipped(DAM),
                "{ \"type\": \"loss\", \"label\": \"dam patch panel\"",
                "{ \"type\": \"compensator\", \"label\": \"module\", \"dispersionPsPerNm\": -100, \"lossDb\": 0 },"
                        + " { \"type\": \"loss\", \"label\": \"dam patch panel\"");
        StudyRun study = StudyRun.of(
                "window",
                directory,
                StudyRun.requiring(compensated, "\"rawVisibilityAtLeast\": 0.921, \"keyRateAtLeastBps\": 900"));
        String path = "alice.path.module.dispersionPsPerNm";
        List<CSVRecord> rows = study.rows("--vary", path + "=-5000:4000");
        assertThat(rows).extracting(row -> row.get("window")).containsExactly("1", "1", "1", "2", "2", "2");
        assertThat(rows)
                .extracting(row -> row.get("endedBy"))
                .containsExactly(
                        "keyRateAtLeastBps",
                        "",
                        "rawVisibilityAtLeast",
                        "rawVisibilityAtLeast",
                        "",
                        "keyRateAtLeastBps");
        double[] ends = {
            StudyRun.number(rows.get(0), path),
            StudyRun.number(rows.get(2), path),
            StudyRun.number(rows.get(3), path),
            StudyRun.number(rows.get(5), path)
        };
        assertThat(ends).isSorted();
        List<CSVRecord> sweep = new StudyRun("sweep", study.file())
                .rows("--vary", path + "=-5000:4000:2001", "--show", "visibility.raw,key.asymptoticBps");
        for (CSVRecord row : sweep) {
            double value = StudyRun.number(row, path);
            boolean inside = (value >= ends[0] && value <= ends[1]) || (value >= ends[2] && value <= ends[3]);
            assertThat(row.get("meets")).as(path + " " + value).isEqualTo(Boolean.toString(inside));
        }
        Run summary = study.run("--vary", path + "=-5000:4000");
        assertThat(summary.out())
                .contains("2 windows of " + path, "the raw visibility fails", "most room at", "planned -100.0 ps/nm")
                .doesNotContain("the range ends");
    }

    @Test
    void jsonHoldsTheSameEndsAndThoseOfEachRequirement() throws IOException {
        StudyRun study = StudyRun.ofShipped("window", DAM);
        JsonTree.Node tree = study.json("--vary", PAIRS + "=1e-4:0.3:log");
        List<CSVRecord> rows = study.rows("--vary", PAIRS + "=1e-4:0.3:log");
        assertThat(tree.names()).contains("formatVersion", "version", "scenario", "study", "vary", "windows", "each");
        assertThat(tree.at("study").value()).isEqualTo("window");
        JsonTree.Node window = tree.at("windows").items().get(0);
        assertThat(window.at("from").value()).isEqualTo(StudyRun.number(rows.get(0), PAIRS));
        assertThat(window.at("to").value()).isEqualTo(StudyRun.number(rows.get(2), PAIRS));
        assertThat(window.at("toEndedBy").value()).isEqualTo("phaseBasisQberAtMost");
        double last = Double.POSITIVE_INFINITY;
        for (JsonTree.Node each : tree.at("each").items()) {
            JsonTree.Node only = each.at("intervals").items().get(0);
            last = Math.min(last, (Double) only.at("to").value());
        }
        assertThat(last).isCloseTo((Double) window.at("to").value(), within(1e-6 * last));
        assertThat(tree.at("each").items()).hasSize(7);
        assertThat(tree.at("rows").items()).hasSize(3);
    }

    @Test
    void mapHoldsTheRowsOfASweepWithTheLeastMargin() throws IOException {
        String[] vary = {"--vary", WINDOW + "=100:900:9", "--vary", PAIRS + "=0.01:0.1:7:log"};
        StudyRun study = StudyRun.ofShipped("window", DAM);
        List<CSVRecord> rows = study.rows(vary);
        List<CSVRecord> sweep = new StudyRun("sweep", study.file()).rows(vary);
        assertThat(rows).hasSize(63);
        List<String> expected = new ArrayList<>(StudyRun.header(sweep));
        expected.add(expected.size() - 1, "leastMargin");
        assertThat(StudyRun.header(rows)).isEqualTo(expected);
        for (int i = 0; i < rows.size(); i++) {
            for (String name : StudyRun.header(sweep)) {
                assertThat(rows.get(i).get(name))
                        .as(name)
                        .isEqualTo(sweep.get(i).get(name));
            }
            boolean positive = StudyRun.number(rows.get(i), "leastMargin") >= 0.0;
            assertThat(rows.get(i).get("meets")).isEqualTo(Boolean.toString(positive));
        }
        assertThat(rows).extracting(row -> row.get("meets")).contains("true", "false");
    }

    /** Area against the met share of a sweep of 40 401 points; a contour is where a check's figure is the required one. */
    @Test
    void mapTellsTheAreaAndAContourForEachRequirement() throws IOException {
        StudyRun study = StudyRun.ofShipped("window", DAM);
        JsonTree.Node tree = study.json("--vary", WINDOW + "=50:850:41", "--vary", PAIRS + "=0.01:0.1:41");
        List<CSVRecord> sweep = new StudyRun("sweep", study.file())
                .rows(
                        "--vary",
                        WINDOW + "=50:850:201",
                        "--vary",
                        PAIRS + "=0.01:0.1:201",
                        "--show",
                        "key.asymptoticBps,visibility.raw");
        double met =
                sweep.stream().filter(row -> row.get("meets").equals("true")).count() / (double) sweep.size();
        assertThat((Double) tree.at("share").value()).isCloseTo(met, within(0.005));
        assertThat((Double) tree.at("area").value()).isCloseTo(met * 800.0 * 0.09, within(0.4));
        assertThat(tree.at("contours").items()).hasSize(7);
        for (JsonTree.Node contour : tree.at("contours").items()) {
            for (JsonTree.Node line : contour.at("lines").items()) {
                List<JsonTree.Node> point =
                        line.items().get(line.items().size() / 2).items();
                double ratio = mapped((Double) point.get(0).value(), (Double)
                                point.get(1).value())
                        .ratio((String) contour.at("name").value());
                assertThat(ratio).as((String) contour.at("name").value()).isCloseTo(1.0, within(0.02));
            }
        }
        JsonTree.Node best = tree.at("best");
        assertThat(mapped((Double) best.at(WINDOW).value(), (Double)
                                best.at(PAIRS).value())
                        .failing())
                .isEmpty();
    }

    private static StudyRun.Checked mapped(double width, double pairs) {
        String scenario =
                StudyRun.edited(StudyRun.shipped(DAM), "\"windowWidthPs\": 400", "\"windowWidthPs\": " + width);
        return StudyRun.check(
                StudyRun.edited(scenario, "\"meanPairsPerCycle\": 0.04", "\"meanPairsPerCycle\": " + pairs));
    }

    @Test
    void summaryOfAMapTellsShareAreaBestPointAndContours() {
        Run run = StudyRun.ofShipped("window", DAM)
                .run("--vary", WINDOW + "=200:1000:9", "--vary", "link.lengthKm=40:80:9");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .containsPattern("All requirements hold on [\\d.]+ % of the map as\\s+drawn, in one piece")
                .containsPattern("searched +timing.windowWidthPs from 200 to 1000 ps; planned 400.0 ps\n")
                .containsPattern("\n +link.lengthKm from 40 to 80 km; planned 59.60 km\n")
                .containsPattern("\narea +[\\d.]+ ps km\n")
                .containsPattern("\nbest +timing.windowWidthPs [\\d.]+ ps, link.lengthKm [\\d.]+ km; where the")
                .containsPattern("secret key rate +1 line")
                .containsPattern("time to the first key +none: it holds on the whole map");
    }

    @Test
    void withoutAFeasiblePointOneLineTellsWhatIsViolatedLeastAndByHowMuch() throws IOException {
        StudyRun study = StudyRun.of("window", directory, StudyRun.shipped(DAM));
        String[] outputs = {
            "--csv", directory.resolve("t.csv").toString(),
            "--json", directory.resolve("t.json").toString(),
            "--plot", directory.resolve("t.png").toString()
        };
        for (String more : List.of("", "--vary source.meanPairsPerCycle=0.01:0.1:9", "--box")) {
            List<String> words = new ArrayList<>(List.of("--vary", WINDOW + "=10:60:9"));
            words.addAll(more.isEmpty() ? List.of() : List.of(more.split(" ")));
            words.addAll(List.of(outputs));
            Run run = study.run(words.toArray(String[]::new));
            assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
            assertThat(run.out()).isEmpty();
            assertThat(run.errLines())
                    .singleElement()
                    .asString()
                    .startsWith("binspan: nowhere in these ranges do all requirements hold; nearest at " + WINDOW
                            + " 60 ps")
                    .containsPattern(": the secret key rate is 1[58].\\d bit/s, required at least 1.00 kbit/s$");
            assertThat(directory).isDirectoryContaining("glob:**link.json").satisfies(BadInput::holdsOneFile);
        }
        double key = StudyRun.check(
                        StudyRun.edited(StudyRun.shipped(DAM), "\"windowWidthPs\": 400", "\"windowWidthPs\": 60"))
                .figure("key.asymptoticBps");
        assertThat(study.run("--vary", WINDOW + "=10:60").err())
                .contains("is " + String.format(java.util.Locale.ROOT, "%.3g", key) + " bit/s");
    }

    @Test
    void whatCannotBeHadAtAllIsSaid() throws IOException {
        StudyRun study = StudyRun.of(
                "window", directory, StudyRun.requiring(StudyRun.shipped(DAM), "\"firstKeyWithinHours\": 1"));
        assertThat(study.run("--vary", "link.lengthKm=210:400").err())
                .isEqualTo("binspan: nowhere in these ranges do all requirements hold; nearest at link.lengthKm 210 km:"
                        + " the time to the first key cannot be had at all, required at most 1 h\n");
    }

    @Test
    void ratioIsCalledByItsName() throws IOException {
        StudyRun study =
                StudyRun.of("window", directory, StudyRun.requiring(StudyRun.shipped(DAM), "\"carAtLeast\": 20"));
        assertThat(study.run("--vary", WINDOW + "=300:500").err())
                .contains("the ratio of coincidences to accidentals is 1", ", required at least 20");
        assertThat(study.run("--vary", PAIRS + "=0.01:0.1").out())
                .contains("above: the ratio of coincidences to accidentals fails");
    }
}

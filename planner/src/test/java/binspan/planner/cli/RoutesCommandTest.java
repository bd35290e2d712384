package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.report.JsonTree;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The command {@code routes}, against checks of the dam link with the route written into it by hand. */
final class RoutesCommandTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final String HEADER = "name,alice.lengthKm,bob.lengthKm\n";

    @TempDir
    private Path directory;

    private StudyRun study;

    @BeforeEach
    void writeScenario() throws IOException {
        study = StudyRun.of("routes", directory, StudyRun.shipped(DAM));
    }

    private String table(String text) throws IOException {
        return Files.writeString(directory.resolve("routes.csv"), text).toString();
    }

    private Run run(String table, String... more) throws IOException {
        List<String> words = new ArrayList<>(List.of("--table", table(table)));
        words.addAll(List.of(more));
        return study.run(words.toArray(String[]::new));
    }

    /** The ranking as rows, with the exit status that goes with it. */
    private List<CSVRecord> ranked(int status, String table, String... more) throws IOException {
        List<String> words = new ArrayList<>(List.of(more));
        words.addAll(List.of("--csv", "-"));
        Run run = run(table, words.toArray(String[]::new));
        assertThat(run.status()).isEqualTo(status);
        return StudyRun.records(run.out());
    }

    private static String spans(String alice, String bob) {
        String scenario = StudyRun.edited(
                StudyRun.shipped(DAM), "\"fibre\": \"G.652.D\", \"lengthKm\": 30.2, \"measuredLossDb\": 7.1", alice);
        return StudyRun.edited(scenario, "\"fibre\": \"G.652.D\", \"lengthKm\": 29.4, \"measuredLossDb\": 6.8", bob);
    }

    private static String scaled(String fibre, double km, double lossDb) {
        return "\"fibre\": \"" + fibre + "\", \"lengthKm\": " + km + ", \"measuredLossDb\": " + lossDb;
    }

    @Test
    void rowsAreWhatAChecksOfTheRouteWrittenByHandSay() throws IOException {
        String table = """
                name,alice.lengthKm,alice.measuredLossDb,bob.lengthKm,bob.fibre
                short,20,,15,
                "ridge, upper",35,8.1,30,
                lossy,,9.5,29.4,
                low-loss,30.2,,40,G.654.E
                """;
        List<CSVRecord> rows = ranked(ExitStatus.UNMET, table);
        List<String> figures = study.figures();
        List<String> expected = new ArrayList<>(figures);
        expected.addAll(List.of("rank", "name", "line", "leastMargin", "tightest", "reason", "meets"));
        assertThat(StudyRun.header(rows)).isEqualTo(expected);
        String bobAsPlanned = scaled("G.652.D", 29.4, 6.8);
        assertRow(
                rows,
                "short",
                2,
                spans(scaled("G.652.D", 20.0, 7.1 * 20.0 / 30.2), scaled("G.652.D", 15.0, 6.8 * 15.0 / 29.4)));
        assertRow(
                rows,
                "ridge, upper",
                3,
                spans(scaled("G.652.D", 35.0, 8.1), scaled("G.652.D", 30.0, 6.8 * 30.0 / 29.4)));
        assertRow(rows, "lossy", 4, spans(scaled("G.652.D", 30.2, 9.5), bobAsPlanned));
        String bare = spans(scaled("G.652.D", 30.2, 7.1), "\"fibre\": \"G.654.E\", \"lengthKm\": 40");
        assertRow(rows, "low-loss", 5, bare.replaceAll("\"bob.path.lower duct.measuredLossDb\": (\\{.*}|\".*\"),", ""));
    }

    private void assertRow(List<CSVRecord> rows, String name, int line, String scenario) throws IOException {
        CSVRecord row = rows.stream()
                .filter(each -> each.get("name").equals(name))
                .findFirst()
                .orElseThrow();
        assertThat(row.get("line")).isEqualTo(Integer.toString(line));
        StudyRun.Checked check = StudyRun.check(scenario);
        check.assertSame(row, study.figures(), 1e-9);
        boolean meets = check.status() == ExitStatus.MET;
        assertThat(row.get("reason").isEmpty()).isEqualTo(meets);
        if (!meets) {
            assertThat(check.failing()).contains(row.get("tightest"));
        }
    }

    @Test
    void exitStatusSaysWhetherAllSomeOrBadOnes() throws IOException {
        assertThat(run(HEADER + "a,10,10\nb,20,20\n").status()).isEqualTo(ExitStatus.MET);
        assertThat(run(HEADER + "a,10,10\nb,90,90\n").status()).isEqualTo(ExitStatus.UNMET);
        Run bad = run(
                HEADER + "a,10,10\nb,ten,20\nc,20,20\n",
                "--csv",
                directory.resolve("r.csv").toString());
        assertThat(bad.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(bad.err())
                .isEqualTo(
                        directory.resolve("routes.csv") + ":3: alice.lengthKm: found \"ten\"; allowed 0 to 10000 km\n");
        assertThat(bad.out()).contains("2 of 2 routes meet all requirements", "1 row is bad and left out");
        assertThat(StudyRun.records(Files.readString(directory.resolve("r.csv"))))
                .extracting(row -> row.get("name"))
                .containsExactlyInAnyOrder("a", "c");
    }

    @Test
    void tableOfBadRowsOnlyIsToldWithoutAnEmptyRanking() throws IOException {
        Run run = run(HEADER + "a,x,1\n", "--plot", directory.resolve("r.svg").toString());
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.out()).contains("1 row is bad and left out").doesNotContain("least margin", "0 of 0");
    }

    /** Tuned for the least margin, by which the ranking goes: what {@code tune --for margin} finds for the route written by hand. */
    @Test
    void tunedRouteHasTheMarginThatTuningFinds() throws IOException {
        String table = HEADER + "near,20,15\nplanned,30.2,29.4\n";
        List<CSVRecord> written = ranked(ExitStatus.MET, table);
        List<CSVRecord> tuned = ranked(ExitStatus.MET, table, "--tune");
        CSVRecord planned = tuned.stream()
                .filter(row -> row.get("name").equals("planned"))
                .findFirst()
                .orElseThrow();
        double best = (Double) new StudyRun("tune", study.file())
                .json("--for", "margin")
                .at("best")
                .value();
        assertThat(StudyRun.number(planned, "leastMargin")).isCloseTo(best, within(1e-3 * best));
        assertThat(StudyRun.header(tuned)).startsWith("source.meanPairsPerCycle", "timing.windowWidthPs");
        String settings = StudyRun.edited(
                StudyRun.shipped(DAM),
                "\"meanPairsPerCycle\": 0.04",
                "\"meanPairsPerCycle\": " + planned.get("source.meanPairsPerCycle"));
        StudyRun.check(StudyRun.edited(
                        settings,
                        "\"windowWidthPs\": 400",
                        "\"windowWidthPs\": " + planned.get("timing.windowWidthPs")))
                .assertSame(planned, study.figures(), 1e-9);
        assertThat(tuned.get(0).get("name")).isEqualTo("near");
        for (int i = 0; i < 2; i++) {
            assertThat(StudyRun.number(tuned.get(i), "leastMargin"))
                    .isGreaterThan(StudyRun.number(written.get(i), "leastMargin"));
        }
    }

    @Test
    void tenThousandRoutesStreamThroughAndComeOutRanked() throws IOException {
        StringBuilder table = new StringBuilder(HEADER);
        SplittableRandom random = new SplittableRandom(3L);
        int bad = 0;
        for (int i = 0; i < 10_000; i++) {
            boolean broken = i % 400 == 7;
            bad += broken ? 1 : 0;
            double alice = random.nextDouble(1.0, 60.0);
            table.append("route ").append(i).append(',').append(broken ? "?" : Double.toString(alice));
            table.append(',').append(random.nextDouble(1.0, 60.0)).append('\n');
        }
        Path json = directory.resolve("ranking.json");
        long before = unfinished();
        Run run = run(table.toString(), "--csv", "-", "--json", json.toString());
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines()).hasSize(21).last().isEqualTo("... and 5 more bad rows");
        List<CSVRecord> rows = StudyRun.records(run.out());
        assertThat(rows).hasSize(10_000 - bad);
        assertRanked(rows);
        JsonTree.Node tree = JsonTree.of(Files.readString(json));
        assertThat(tree.at("routes").value()).isEqualTo(10_000.0 - bad);
        assertThat(tree.at("badRows").value()).isEqualTo((double) bad);
        assertThat(tree.at("routesMet").value()).isEqualTo((double)
                rows.stream().filter(row -> row.get("meets").equals("true")).count());
        assertThat(unfinished()).as("temporary files").isEqualTo(before);
    }

    private static void assertRanked(List<CSVRecord> rows) {
        double last = Double.POSITIVE_INFINITY;
        for (int i = 0; i < rows.size(); i++) {
            CSVRecord row = rows.get(i);
            double margin = StudyRun.number(row, "leastMargin");
            assertThat(margin)
                    .as("margins that differ by less are taken as equal")
                    .isLessThanOrEqualTo(last + 1.1e-3);
            assertThat(row.get("rank")).isEqualTo(Integer.toString(i + 1));
            assertThat(row.get("meets")).isEqualTo(Boolean.toString(margin >= 0.0));
            assertThat(row.get("reason").isEmpty()).isEqualTo(margin >= 0.0);
            assertThat(row.get("name")).isEqualTo("route " + (Integer.parseInt(row.get("line")) - 2));
            last = margin;
        }
    }

    private static long unfinished() throws IOException {
        try (Stream<Path> files = Files.list(Path.of(System.getProperty("java.io.tmpdir")))) {
            return files.filter(file -> file.getFileName().toString().startsWith("binspan-routes"))
                    .count();
        }
    }

    @Test
    void summaryRanksAndGivesReasons() throws IOException {
        String long_ = "the very long way round by the old mill and the new weir";
        Run run = run(HEADER + "near,20,20\n" + long_ + ",70,70\nplanned,30.2,29.4\n");
        assertThat(run.out())
                .contains("2 of 3 routes meet all requirements", "Why the best of those that fail do so")
                .containsPattern("1.  \\S planned +0.920 +1.36 kbit/s +\\+4.1 %\n")
                .containsPattern("3.  \\S " + long_ + "\n +0.\\d+ +[\\d.]+ bit/s +-99 %\n")
                .containsPattern(long_ + ": The secret\\s+key\\s+rate\\s+is\\s+[\\d.]+\\s+bit/s,\\s+required\\s+at");
        assertThat(run(HEADER + "a,20,20\nb,70,70\n").out()).contains("1 of 2 routes meets all requirements");
    }

    @Test
    void withoutRequirementsTheTablesOrderStands() throws IOException {
        study = StudyRun.of("routes", directory, StudyRun.requiring(StudyRun.shipped(DAM), ""));
        Run run = run(HEADER + "far,70,70\nnear,20,20\n");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .contains("No requirement is stated")
                .containsPattern("1.    far +0.\\d+ +[\\d.]+ bit/s +-\n2.    near +")
                .doesNotContain("meet", "%");
        List<CSVRecord> rows = ranked(ExitStatus.MET, HEADER + "far,70,70\nnear,20,20\n");
        assertThat(rows).extracting(row -> row.get("leastMargin")).containsOnly("");
    }

    @Test
    void existingRankingAndInputsAreKept() throws IOException {
        Path ranking = Files.writeString(directory.resolve("ranking.csv"), "old");
        assertThat(run(HEADER + "a,1,1\n", "--csv", ranking.toString()).err())
                .isEqualTo("binspan: " + ranking + ": exists already; --force replaces it\n");
        assertThat(ranking).hasContent("old");
        String routes = directory.resolve("routes.csv").toString();
        assertThat(run(HEADER + "a,1,1\n", "--csv", routes, "--force").err())
                .isEqualTo(
                        "binspan: " + routes + ": found twice on the command line; allowed a file for each output\n");
        assertThat(Path.of(routes)).hasContent(HEADER + "a,1,1");
    }
}

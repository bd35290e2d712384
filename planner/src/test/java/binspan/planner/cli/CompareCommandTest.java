package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.report.JsonTree;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The command {@code compare}, against checks of scenarios in which the option was written by hand. */
final class CompareCommandTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final String LANE = "orchard-lane-access";
    private static final StudyRun STUDY = StudyRun.ofShipped("compare", DAM);
    private static final String[] OWN = {"rank", "option", "setting", "reachKm", "tightest", "meets"};

    @TempDir
    private Path directory;

    private static CSVRecord row(List<CSVRecord> rows, String option) {
        return rows.stream()
                .filter(each -> each.get("option").equals(option))
                .findFirst()
                .orElseThrow();
    }

    /** The dam link with every detector replaced by a bare class, alice's two first. */
    private static String detectors(String alice, String bob) {
        String scenario = StudyRun.shipped(DAM);
        for (String side : List.of(alice, alice, bob, bob)) {
            scenario = scenario.replaceFirst("\\{ \"class\": \"snspd\",[^}]*}", "{ \"class\" : \"" + side + "\" }");
        }
        return scenario;
    }

    @Test
    void detectorsAreThoseOfTheClassOnBothSidesOrOnEach() throws IOException {
        List<CSVRecord> rows =
                STUDY.rows("--detectors", "snspd,snspd-cold-filter,snspd/snspd-cold-filter", "--as-written");
        List<String> expected = new ArrayList<>(STUDY.figures());
        expected.addAll(List.of(OWN));
        assertThat(StudyRun.header(rows)).isEqualTo(expected);
        assertThat(rows).hasSize(3);
        for (CSVRecord row : rows) {
            String[] sides = row.get("option").split("/", -1);
            StudyRun.check(detectors(sides[0], sides[sides.length - 1])).assertSame(row, STUDY.figures(), 1e-12);
        }
    }

    @Test
    void fibresLoseTheirMeasuredLoss() throws IOException {
        List<CSVRecord> rows = STUDY.rows("--fibres", "G.654.E,G.655.D", "--as-written");
        for (CSVRecord row : rows) {
            String scenario = StudyRun.shipped(DAM)
                    .replace("\"G.652.D\"", "\"" + row.get("option") + "\"")
                    .replaceAll(", \"measuredLossDb\": [\\d.]+ }", " }");
            StudyRun.check(scenario.replaceAll("\"(alice|bob).path.\\w+ duct.measuredLossDb\": (\\{.*}|\".*\"),", ""))
                    .assertSame(row, STUDY.figures(), 1e-12);
        }
    }

    @Test
    void elementIsLeftOutByItsLabel() throws IOException {
        List<CSVRecord> rows = STUDY.rows("--without", "dam patch panel", "--as-written");
        assertThat(rows)
                .extracting(row -> row.get("option"))
                .containsExactlyInAnyOrder("as written", "without dam patch panel");
        StudyRun.check(StudyRun.shipped(DAM)).assertSame(row(rows, "as written"), STUDY.figures(), 1e-12);
        String without = StudyRun.edited(
                StudyRun.shipped(DAM),
                "\"measuredLossDb\": 7.1 },\n      { \"type\": \"loss\", \"label\": \"dam patch panel\", \"lossDb\": 0.5 }",
                "\"measuredLossDb\": 7.1 }");
        StudyRun.check(without).assertSame(row(rows, "without dam patch panel"), STUDY.figures(), 1e-12);
    }

    /** The row of a tuned link is what a check says of the link with the tuned values written by hand. */
    @Test
    void tunedRowIsWhatACheckSays() throws IOException {
        List<CSVRecord> rows = STUDY.rows("--detectors", "snspd,snspd-cold-filter");
        assertThat(StudyRun.header(rows)).startsWith("source.meanPairsPerCycle", "timing.windowWidthPs");
        for (CSVRecord row : rows) {
            String scenario = StudyRun.edited(
                    detectors(row.get("option"), row.get("option")),
                    "\"meanPairsPerCycle\": 0.04",
                    "\"meanPairsPerCycle\": " + row.get("source.meanPairsPerCycle"));
            String tuned = StudyRun.edited(
                    scenario, "\"windowWidthPs\": 400", "\"windowWidthPs\": " + row.get("timing.windowWidthPs"));
            StudyRun.check(tuned).assertSame(row, STUDY.figures(), 1e-12);
        }
        assertThat(StudyRun.number(rows.get(0), "key.asymptoticBps"))
                .isGreaterThan(StudyRun.number(rows.get(1), "key.asymptoticBps"));
        assertThat(rows).extracting(row -> row.get("rank")).containsExactly("1", "2");
    }

    @Test
    void linksThatMeetTheirRequirementsStandFirst() throws IOException {
        String[] classes = {
            "--detectors", "ingaas-free-running,snspd,ingaas-gated,snspd/ingaas-free-running", "--as-written"
        };
        List<CSVRecord> rows = STUDY.rows(classes);
        assertThat(rows).extracting(row -> row.get("meets")).containsExactly("true", "false", "false", "false");
        assertThat(rows.get(0).get("option")).isEqualTo("snspd");
        assertThat(rows.get(0).get("setting")).isEmpty();
        assertThat(row(rows, "snspd/ingaas-free-running").get("setting")).startsWith("bob ");
        JsonTree.Node tree = STUDY.json(classes);
        assertThat(tree.at("ranking").items())
                .extracting(each -> each.at("option").value())
                .containsExactlyElementsOf(
                        rows.stream().map(each -> (Object) each.get("option")).toList());
    }

    /** Alone among the operating points of its class an avalanche diode gets the best one: no bare class in the file does better. */
    @Test
    void avalancheDetectorIsTriedAtItsOperatingPoints() throws IOException {
        StudyRun lane = StudyRun.ofShipped("compare", LANE);
        CSVRecord best =
                lane.rows("--detectors", "ingaas-free-running", "--as-written").get(0);
        assertThat(best.get("setting")).matches("\\d+ %, \\d+ us");
        String plain = StudyRun.shipped(LANE)
                .replaceAll("\\{ \"class\": \"ingaas-free-running\",[^}]*}", "{ \"class\": \"ingaas-free-running\" }");
        assertThat(StudyRun.number(best, "key.asymptoticBps"))
                .isGreaterThan(StudyRun.check(plain).figure("key.asymptoticBps"));
    }

    @Test
    void severalFilesAreComparedByTheirNames() throws IOException {
        String harrow =
                StudyRun.ofShipped("compare", "harrow-ridge-overhead-line").file();
        Run run = STUDY.run(harrow, "--as-written", "--csv", "-");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        List<CSVRecord> rows = StudyRun.records(run.out());
        assertThat(rows)
                .extracting(row -> row.get("option"))
                .containsExactly("Kestrel Dam to Millbrook", "Harrow Ridge overhead line");
        assertThat(rows).extracting(row -> row.get("tightest")).doesNotContain("");
        StudyRun.check(StudyRun.shipped("harrow-ridge-overhead-line")).assertSame(rows.get(1), STUDY.figures(), 1e-12);
    }

    /** Whichever file comes first. */
    @Test
    void linkWithoutKeyIsNotComparedForIt() throws IOException {
        String onePort =
                StudyRun.shipped("stonebridge-to-lower-weir").replaceFirst("\\},\\s+\\{ \"class\": [^}]+\\}", "}");
        StudyRun single = StudyRun.of("compare", directory, StudyRun.requiring(onePort, "\"chshAtLeast\": 2.5"));
        for (Run run : List.of(STUDY.run(single.file(), "--for", "key"), single.run(STUDY.file(), "--for", "key"))) {
            assertThat(run)
                    .isEqualTo(new Run(
                            ExitStatus.REFUSED,
                            "",
                            "binspan: --for key: this link makes no key: both sides need both ports detected\n"));
        }
        assertThat(STUDY.run(single.file()).err())
                .isEqualTo("binspan: not all of these links make a key; say what to compare them for: --for chsh\n");
        assertThat(STUDY.run(single.file(), "--for", "chsh", "--as-written").status())
                .isEqualTo(ExitStatus.MET);
    }

    @Test
    void filesOfTheSameNameAreToldApartByTheirFiles() throws IOException {
        Path copy = Files.writeString(
                Files.createDirectory(directory.resolve("a-folder-with-a-long-name"))
                        .resolve("the-dam-link-as-planned.json"),
                StudyRun.shipped(DAM));
        Run run = STUDY.run(copy.toString(), "--as-written");
        assertThat(run.out().replaceAll("\\s", ""))
                .contains(STUDY.file(), copy.toString().replaceAll("\\s", ""));
    }

    @Test
    void reachIsThatOfTheReachStudy() throws IOException {
        CSVRecord row = STUDY.rows("--without", "dam patch panel", "--as-written").stream()
                .filter(each -> each.get("option").equals("as written"))
                .findFirst()
                .orElseThrow();
        double reach = (Double) StudyRun.ofShipped("reach", DAM)
                .json("--as-written")
                .at("all", "asWrittenKm")
                .value();
        assertThat(StudyRun.number(row, "reachKm")).isCloseTo(reach, within(1e-6 * reach));
    }

    @Test
    void exitStatusSaysWhetherSomeLinkMeetsAllRequirements() {
        assertThat(STUDY.run("--fibres", "G.652.D", "--as-written").status()).isEqualTo(ExitStatus.MET);
        StudyRun harrow = StudyRun.ofShipped("compare", "harrow-ridge-overhead-line");
        Run none = harrow.run("--fibres", "G.652.D,G.654.E", "--as-written");
        assertThat(none.status()).isEqualTo(ExitStatus.UNMET);
        assertThat(none.err()).isEmpty();
        assertThat(none.out()).contains(", which it fails.").doesNotContain("operating point");
    }

    @Test
    void summaryRanksAndSaysWhatLimitsEach() {
        Run run = STUDY.run("--detectors", "snspd,ingaas-free-running");
        assertThat(run.out())
                .containsPattern("1. \\S snspd +1.4\\d kbit/s +0.900 +6\\d km\n")
                .containsPattern("2. \\S ingaas-free-running +[\\d.]+ bit/s +0.\\d+ +(nowhere|[\\d.]+ km)\n")
                .containsPattern("operating point +\\d+ %, \\d+ us\n")
                .containsPattern("window width +[\\d.]+ ps\n")
                .containsPattern("singles, alice; bob +120 k/s, 120 k/s; 125 k/s, 125 k/s\n")
                .containsPattern("live fraction, alice; bob +99.5 %, 99.5 %; 99.5 %, 99.5 %\n")
                .containsPattern("phase-basis error rate +5.00 %, required \\S+ 5 %  \\S\n")
                .contains("limited by")
                .doesNotContain("4.999", "5.000");
    }

    @Test
    void withoutRequirementsNoVerdictIsGiven() throws IOException {
        StudyRun free = StudyRun.of("compare", directory, StudyRun.requiring(StudyRun.shipped(DAM), ""));
        Run run = free.run("--fibres", "G.652.D,G.654.E", "--as-written");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .containsPattern("\n1.   G.654.E +[\\d.]+ kbit/s +0.\\d+ +-\n2.   G.652.D ")
                .doesNotContain("required");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--as-written | nothing to compare with; give --detectors, --fibres, --without or a second scenario file",
                "--detectors snspdd | unknown detector class snspdd; allowed snspd ' ' snspd-cold-filter ' ' ingaas-gated"
                        + " ' ' ingaas-free-running ' ' silicon-apd ' ' photomultiplier ' ' up-conversion;"
                        + " did you mean snspd?",
                "--detectors a/b/c | --detectors a/b/c: found 3 classes; allowed one, or alice's and bob's",
                "--detectors snspd --fibres G.652.D | found --detectors and --fibres; allowed one of them",
                "--without dam~patch~panle | --without: no path element is labelled \"dam patch panle\"; did you mean"
                        + " \"dam patch panel\"?",
                "F --fibres G.652.D | found several scenario files with --fibres; allowed either several files, or one"
                        + " file and one of these options",
                "--fibres G.652.D --for fame | unknown objective fame; allowed key ' ' visibility ' ' chsh ' ' margin"
            })
    void wrongOptionIsOneLine(String words, String message) throws IOException {
        StudyRun study = StudyRun.of("compare", directory, StudyRun.shipped(DAM));
        String[] args = (words.replace("F ", STUDY.file() + " ") + " --csv " + directory.resolve("t.csv")).split(" ");
        for (int i = 0; i < args.length; i++) {
            args[i] = args[i].replace('~', ' ');
        }
        assertThat(study.run(args)).isEqualTo(new Run(2, "", "binspan: " + message.replace("' '", "|") + "\n"));
        BadInput.holdsOneFile(directory);
    }

    @Test
    void whatDoesNotGoTogetherIsSaid() {
        StudyRun continuous = StudyRun.ofShipped("compare", "stonebridge-to-lower-weir");
        assertThat(continuous.run("--detectors", "ingaas-gated").err())
                .isEqualTo("binspan: --detectors: ingaas-gated: gated, but a continuous pump has no slots to gate;"
                        + " choose a free-running class\n");
        StudyRun trunk = StudyRun.ofShipped("compare", "fernhill-shared-trunk");
        assertThat(trunk.run("--without", "no such filter").err())
                .startsWith("binspan: --without: no path element is labelled \"no such filter\"; labels: ")
                .hasLineCount(1);
    }
}

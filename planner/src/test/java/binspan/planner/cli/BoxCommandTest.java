package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.report.JsonTree;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The option {@code --box} of the command {@code window}, against checks of scenarios edited by hand at corners and random points. */
final class BoxCommandTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final String WINDOW = "timing.windowWidthPs";
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final String[] VARY = {
        "--box", "--vary", PAIRS + "=0.01:0.1", "--vary", WINDOW + "=50:1500",
    };
    private static final StudyRun STUDY = StudyRun.ofShipped("window", DAM);

    private static String[] with(String... more) {
        List<String> words = new ArrayList<>(List.of(VARY));
        words.addAll(List.of(more));
        return words.toArray(String[]::new);
    }

    private static StudyRun.Checked at(double pairs, double width) {
        String scenario = StudyRun.edited(
                StudyRun.shipped(DAM), "\"meanPairsPerCycle\": 0.04", "\"meanPairsPerCycle\": " + pairs);
        return StudyRun.check(StudyRun.edited(scenario, "\"windowWidthPs\": 400", "\"windowWidthPs\": " + width));
    }

    private static double number(CSVRecord row, String column) {
        return StudyRun.number(row, column);
    }

    @Test
    void tableHoldsCornersMiddleAndBindingPoint() throws IOException {
        List<CSVRecord> rows = STUDY.rows(VARY);
        List<String> expected = new ArrayList<>(List.of(PAIRS, WINDOW));
        expected.addAll(STUDY.figures());
        expected.addAll(List.of("point", "meets"));
        assertThat(StudyRun.header(rows)).isEqualTo(expected);
        assertThat(rows).extracting(row -> row.get("point")).containsExactly("from", "middle", "to", "binding");
        for (CSVRecord row : rows) {
            at(number(row, PAIRS), number(row, WINDOW)).assertSame(row, STUDY.figures(), 1e-12);
        }
    }

    /** All corners and 40 random points hold by check; at the binding point the named requirement has nothing to spare. */
    @ParameterizedTest
    @ValueSource(strings = {"", "--equal-tolerance", "--centred"})
    void everyPointInsideMeetsAllRequirements(String sense) throws IOException {
        String[] words = sense.isEmpty() ? VARY : with(sense);
        List<CSVRecord> rows = STUDY.rows(words);
        double[] pairs = {number(rows.get(0), PAIRS), number(rows.get(2), PAIRS)};
        double[] width = {number(rows.get(0), WINDOW), number(rows.get(2), WINDOW)};
        assertThat(pairs[1]).isGreaterThan(1.2 * pairs[0]);
        assertThat(width[1]).isGreaterThan(1.2 * width[0]);
        for (int corner = 0; corner < 4; corner++) {
            assertThat(at(pairs[corner % 2], width[corner / 2]).failing()).isEmpty();
        }
        SplittableRandom random = new SplittableRandom(7L);
        for (int i = 0; i < 40; i++) {
            double x = random.nextDouble(pairs[0], pairs[1]);
            double y = random.nextDouble(width[0], width[1]);
            assertThat(at(x, y).failing()).as(x + ", " + y).isEmpty();
        }
        String requirement =
                (String) STUDY.json(words).at("box", "bindingRequirement").value();
        double ratio =
                at(number(rows.get(3), PAIRS), number(rows.get(3), WINDOW)).ratio(requirement);
        assertThat(ratio).isCloseTo(1.0, within(1e-3));
    }

    @Test
    void equalToleranceIsTheSameForEachSide() throws IOException {
        List<CSVRecord> rows = STUDY.rows(with("--equal-tolerance"));
        double tolerance = (Double)
                STUDY.json(with("--equal-tolerance")).at("box", "tolerance").value();
        for (String path : List.of(PAIRS, WINDOW)) {
            double from = number(rows.get(0), path);
            double to = number(rows.get(2), path);
            assertThat((to - from) / (to + from)).as(path).isCloseTo(tolerance, within(1e-9));
        }
    }

    @Test
    void centredBoxHoldsThePlannedValues() throws IOException {
        List<CSVRecord> shares = STUDY.rows(with("--centred"));
        assertThat(0.04).isBetween(number(shares.get(0), PAIRS), number(shares.get(2), PAIRS));
        assertThat(400.0).isBetween(number(shares.get(0), WINDOW), number(shares.get(2), WINDOW));
        List<CSVRecord> tolerance = STUDY.rows(with("--centred", "--equal-tolerance"));
        assertThat(number(tolerance.get(0), PAIRS) + number(tolerance.get(2), PAIRS))
                .isCloseTo(0.08, within(1e-9));
        assertThat(number(tolerance.get(0), WINDOW) + number(tolerance.get(2), WINDOW))
                .isCloseTo(800.0, within(1e-5));
    }

    /** No other box of a lattice of 12 x 12 x 12 x 12 rectangles whose corners and edges hold is larger. */
    @Test
    void noBoxOfALatticeIsLarger() throws IOException {
        int steps = 12;
        List<CSVRecord> map = new StudyRun("sweep", STUDY.file())
                .rows(
                        "--vary",
                        PAIRS + "=0.01:0.1:" + steps,
                        "--vary",
                        WINDOW + "=50:1500:" + steps,
                        "--show",
                        "key.asymptoticBps");
        boolean[][] met = new boolean[steps][steps];
        for (int i = 0; i < map.size(); i++) {
            met[i / steps][i % steps] = map.get(i).get("meets").equals("true");
        }
        double share = (Double) STUDY.json(VARY).at("box", "volumeShare").value();
        assertThat(share).isGreaterThanOrEqualTo(largest(met) / (double) ((steps - 1) * (steps - 1)));
        assertThat(largest(met)).isPositive();
    }

    /** Cells of the largest rectangle all of whose points are met. */
    private static int largest(boolean[][] met) {
        int largest = 0;
        for (int left = 0; left < met.length; left++) {
            for (int bottom = 0; bottom < met.length; bottom++) {
                int top = met.length - 1;
                for (int right = left; right < met.length && top > bottom; right++) {
                    top = Math.min(top, highest(met[right], bottom, top));
                    largest = Math.max(largest, (right - left) * (top - bottom));
                }
            }
        }
        return largest;
    }

    private static int highest(boolean[] column, int bottom, int top) {
        int highest = bottom - 1;
        while (highest < top && column[highest + 1]) {
            highest++;
        }
        return highest;
    }

    @Test
    void summaryIsWhatASpecificationNeeds() {
        Run run = STUDY.run(with("--equal-tolerance"));
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out())
                .containsPattern("All requirements hold everywhere in this box: \\S+ [\\d.]+ % of every value")
                .containsPattern("Parameter +from +to +middle +planned\n")
                .containsPattern("timing.windowWidthPs +[\\d.]+ ps +[\\d.]+ ps +[\\d.]+ ps +[\\d.]+ ps\n")
                .contains("below: the secret key rate fails at some point beyond")
                .containsPattern("The binding corner: source.meanPairsPerCycle [\\d.]+, timing.windowWidthPs\\s")
                .contains("is met there", "10000 points");
    }

    @Test
    void sixParametersAreEnough() {
        String[] six = {
            "--box",
            "--vary",
            PAIRS + "=0.02:0.06",
            "--vary",
            WINDOW + "=300:600",
            "--vary",
            "both.clockJitterRmsPs=1:30",
            "--vary",
            "alice.delayErrorPs=-20:20",
            "--vary",
            "bob.delayErrorPs=-20:20",
            "--vary",
            "both.analyzer.phaseNoiseRmsRad=0.02:0.1"
        };
        JsonTree.Node box = STUDY.json(six).at("box");
        assertThat(box.at("sides").items()).hasSize(6);
        JsonTree.Node delay = box.at("sides").items().get(3);
        assertThat(delay.at("from").value()).isEqualTo(-20.0);
        assertThat(delay.names())
                .as("a range about 0 has no relative tolerance")
                .doesNotContain("tolerance");
        assertThat((Double) box.at("pointsChecked").value()).isGreaterThanOrEqualTo(10_000.0 + 64.0);
        String[] seven = new String[six.length + 2];
        System.arraycopy(six, 0, seven, 0, six.length);
        seven[six.length] = "--vary";
        seven[six.length + 1] = "imbalanceNs=1:2";
        assertThat(STUDY.run(seven))
                .isEqualTo(new Run(
                        2, "", "binspan: --vary \"imbalanceNs=1:2\": found 7 varied parameters; allowed 1 to 6\n"));
    }
}

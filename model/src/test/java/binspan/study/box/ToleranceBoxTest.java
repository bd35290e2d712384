package binspan.study.box;

import static binspan.study.box.BoxLinks.EFFICIENCY;
import static binspan.study.box.BoxLinks.IMBALANCE;
import static binspan.study.box.BoxLinks.JITTER;
import static binspan.study.box.BoxLinks.LENGTH;
import static binspan.study.box.BoxLinks.PAIR;
import static binspan.study.box.BoxLinks.PAIRS;
import static binspan.study.box.BoxLinks.PHASE;
import static binspan.study.box.BoxLinks.WIDTH;
import static binspan.study.box.BoxLinks.run;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.study.Axis;
import binspan.study.PointEvaluator;
import binspan.study.box.ToleranceBox.Sense;
import binspan.study.window.MarginFunction;
import binspan.study.window.WindowLinks;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The largest box against random points, brute force over all rectangles of a grid, greedy growth and boxes known beforehand. */
final class ToleranceBoxTest {
    private static final int RANDOM_POINTS = 10_000;

    private static final Map<ToleranceBox, OperatingBox> FOUND = new ConcurrentHashMap<>();

    /** The answer to a question, searched once for all tests. */
    private static OperatingBox boxOf(ToleranceBox question) {
        return FOUND.computeIfAbsent(question, BoxLinks::run);
    }

    static List<ToleranceBox> questions() {
        List<ToleranceBox> questions = new ArrayList<>();
        List<Axis> six = List.of(PAIRS, WIDTH, LENGTH, IMBALANCE, EFFICIENCY, JITTER);
        for (Sense sense : Sense.values()) {
            for (boolean centred : new boolean[] {false, true}) {
                questions.add(new ToleranceBox(PAIR, List.of(PAIRS, WIDTH), sense, centred, 1));
                questions.add(new ToleranceBox(PAIR, List.of(WIDTH, EFFICIENCY, LENGTH), sense, centred, 1));
                questions.add(new ToleranceBox(PAIR, six, sense, centred, 1));
            }
        }
        questions.add(new ToleranceBox(PAIR, List.of(PHASE, PAIRS, WIDTH, IMBALANCE), Sense.SHARE, false, 1));
        return questions;
    }

    static List<ToleranceBox> shares() {
        return questions().stream().filter(each -> each.sense() == Sense.SHARE).toList();
    }

    static List<ToleranceBox> tolerances() {
        return questions().stream()
                .filter(each -> each.sense() == Sense.TOLERANCE)
                .toList();
    }

    @ParameterizedTest
    @MethodSource("questions")
    void everyRandomPointInsideMeetsAllRequirements(ToleranceBox question) {
        OperatingBox box = boxOf(question);
        assertThat(box.found()).isTrue();
        assertThat(box.pointsChecked()).isGreaterThan(ToleranceBox.CHECKED_POINTS);
        Axis[] axes = question.axes().toArray(Axis[]::new);
        SplittableRandom random = new SplittableRandom(4711);
        double[][] points = new double[RANDOM_POINTS][];
        for (int i = 0; i < RANDOM_POINTS; i++) {
            points[i] = random.doubles(axes.length).toArray();
        }
        long bad = Arrays.stream(points)
                .parallel()
                .filter(point -> WindowLinks.least(question.scenario(), axes, BoxLinks.inside(box, point)) < 0.0)
                .count();
        assertThat(bad).isZero();
    }

    @ParameterizedTest
    @MethodSource("questions")
    void cornersMeetAllRequirementsAndOneBinds(ToleranceBox question) {
        OperatingBox box = boxOf(question);
        Axis[] axes = question.axes().toArray(Axis[]::new);
        double least = Double.POSITIVE_INFINITY;
        for (int corner = 0; corner < 1 << axes.length; corner++) {
            double[] relative = new double[axes.length];
            for (int j = 0; j < relative.length; j++) {
                relative[j] = corner >> j & 1;
            }
            least = Math.min(least, WindowLinks.least(question.scenario(), axes, BoxLinks.inside(box, relative)));
        }
        assertThat(least).isGreaterThanOrEqualTo(0.0);
        BindingPoint binding = box.binding().orElseThrow();
        assertThat(binding.verdict().leastMargin()).isCloseTo(least, within(1e-9));
        assertThat(binding.corner()).isTrue();
        for (int j = 0; j < axes.length; j++) {
            boolean high = binding.positions().get(j) == BindingPoint.Position.HIGH;
            BoxSide side = box.sides().get(j);
            assertThat(binding.verdict().values().get(j))
                    .isEqualTo(high ? side.to().value() : side.from().value());
        }
    }

    /** Beyond a face that a requirement ends, some corner of that face violates it; a face without one lies at the end of the range or is tied to others. */
    @ParameterizedTest
    @MethodSource("shares")
    void facesOfAShareAreAtTheBorder(ToleranceBox question) {
        for (BoxSide side : boxOf(question).sides()) {
            boolean low = side.from().value() == side.axis().from();
            boolean high = side.to().value() == side.axis().to();
            assertThat(side.from().requirement().isPresent()).isEqualTo(!low);
            assertThat(side.to().requirement().isPresent()).isEqualTo(!high);
        }
    }

    @ParameterizedTest
    @MethodSource("questions")
    void seedsAgreeWithinOnePerCent(ToleranceBox question) {
        double[] sizes = IntStream.range(2, 4)
                .mapToDouble(seed -> size(run(new ToleranceBox(
                        question.scenario(), question.axes(), question.sense(), question.centred(), seed))))
                .toArray();
        double expected = size(boxOf(question));
        for (double size : sizes) {
            assertThat(size).isCloseTo(expected, within(0.01 * expected));
        }
    }

    private static double size(OperatingBox box) {
        return box.question().sense() == Sense.SHARE ? box.volumeShare() : box.tolerance();
    }

    /** The largest rectangle of grid points that all hold, over all pairs of rows; with one more cell on each side it bounds the true one. */
    @Test
    void rectangleIsTheLargestOfAFineGrid() {
        compareWithAllRectangles(PAIRS, WIDTH);
        compareWithAllRectangles(LENGTH, IMBALANCE);
        compareWithAllRectangles(PHASE, PAIRS);
    }

    private static void compareWithAllRectangles(Axis first, Axis second) {
        int side = 500;
        boolean[][] holds = new boolean[side + 1][];
        IntStream.rangeClosed(0, side).parallel().forEach(i -> {
            PointEvaluator evaluator =
                    new PointEvaluator(PAIR, List.of(first.parameter(), second.parameter()), WindowLinks.margins(PAIR));
            holds[i] = new boolean[side + 1];
            for (int j = 0; j <= side; j++) {
                holds[i][j] = evaluator.leastMargin(first.at((double) i / side), second.at((double) j / side)) >= 0.0;
            }
        });
        double[] largest = largestRectangle(holds, side);
        double found = run(new ToleranceBox(PAIR, List.of(first, second), Sense.SHARE, false, 1))
                .volumeShare();
        assertThat(found).isGreaterThanOrEqualTo(0.999 * largest[0]);
        assertThat(found).isLessThanOrEqualTo(largest[1]);
        assertThat(found).isCloseTo(largest[0], within(0.02 * found));
    }

    /** The largest area of a rectangle of grid points, and the largest one with a cell more on every side, as shares. */
    private static double[] largestRectangle(boolean[][] holds, int side) {
        double best = 0.0;
        double wider = 0.0;
        for (int left = 0; left <= side; left++) {
            boolean[] all = new boolean[side + 1];
            Arrays.fill(all, true);
            for (int right = left; right <= side; right++) {
                int run = -1;
                for (int j = 0; j <= side; j++) {
                    all[j] &= holds[right][j];
                    run = all[j] ? run + 1 : -1;
                    if (run >= 0) {
                        best = Math.max(best, (double) (right - left) * run / side / side);
                        wider = Math.max(wider, (double) (right - left + 2) * (run + 2) / side / side);
                    }
                }
            }
        }
        return new double[] {best, wider};
    }

    /** From the roomiest points of a random scan, each face in turn a hundredth outwards while all corners hold. */
    @Test
    void greedyGrowthIsNeverLarger() {
        List<Axis> axes = List.of(PAIRS, WIDTH, LENGTH, IMBALANCE);
        MarginFunction function = new MarginFunction(PAIR, axes);
        double found = run(new ToleranceBox(PAIR, axes, Sense.SHARE, false, 1)).volumeShare();
        SplittableRandom random = new SplittableRandom(99);
        int grown = 0;
        for (int i = 0; i < 3000; i++) {
            double[] place = random.doubles(axes.size()).toArray();
            if (function.least(place) >= 0.0) {
                assertThat(greedy(function, place)).isLessThanOrEqualTo(found * (1.0 + 1e-6));
                grown++;
            }
        }
        assertThat(grown).isGreaterThan(50);
    }

    private static double greedy(MarginFunction function, double[] place) {
        int axes = place.length;
        double[] faces = new double[2 * axes];
        for (int j = 0; j < axes; j++) {
            faces[j] = place[j];
            faces[axes + j] = place[j];
        }
        boolean moved = true;
        while (moved) {
            moved = false;
            for (int face = 0; face < 2 * axes; face++) {
                double before = faces[face];
                faces[face] = face < axes ? Math.max(0.0, before - 0.01) : Math.min(1.0, before + 0.01);
                if (faces[face] != before && cornersHold(function, faces)) {
                    moved = true;
                } else {
                    faces[face] = before;
                }
            }
        }
        double volume = 1.0;
        for (int j = 0; j < axes; j++) {
            volume *= faces[axes + j] - faces[j];
        }
        return volume;
    }

    private static boolean cornersHold(MarginFunction function, double[] faces) {
        int axes = faces.length / 2;
        for (int corner = 0; corner < 1 << axes; corner++) {
            double[] place = new double[axes];
            for (int j = 0; j < axes; j++) {
                place[j] = faces[(corner >> j & 1) * axes + j];
            }
            if (function.least(place) < 0.0) {
                return false;
            }
        }
        return true;
    }

    @ParameterizedTest
    @MethodSource("tolerances")
    void tolerancesAreEqualAboutOneCentre(ToleranceBox question) {
        OperatingBox box = boxOf(question);
        for (BoxSide side : box.sides()) {
            assertThat(side.tolerance()).isCloseTo(box.tolerance(), within(1e-9));
            double centre = (side.from().value() + side.to().value()) / 2.0;
            if (question.centred()) {
                double planned = side.axis().parameter().value(PAIR).orElseThrow();
                assertThat(centre).isCloseTo(planned, within(1e-9 * planned));
            }
        }
    }
}

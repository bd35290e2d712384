package binspan.study.box;

import static binspan.study.box.BoxLinks.EFFICIENCY;
import static binspan.study.box.BoxLinks.LENGTH;
import static binspan.study.box.BoxLinks.PAIR;
import static binspan.study.box.BoxLinks.PAIRS;
import static binspan.study.box.BoxLinks.WIDTH;
import static binspan.study.box.BoxLinks.run;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.PointEvaluator;
import binspan.study.Progress;
import binspan.study.box.ToleranceBox.Sense;
import binspan.study.window.MarginFunction;
import binspan.study.window.OperatingInterval;
import binspan.study.window.OperatingWindow;
import binspan.study.window.PointVerdict;
import binspan.study.window.RequirementMargin;
import binspan.study.window.WindowEnd;
import binspan.study.window.WindowLinks;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Boxes known beforehand: of one parameter, held at the plan, beside a hole, in a narrow region, where nothing holds. */
final class ToleranceBoxCasesTest {
    private static final int RANDOM_POINTS = 10_000;

    @Test
    void boxOfOneParameterIsItsWidestWindow() {
        Scenario scenario = WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.9395);
        Axis axis = WindowLinks.axis(scenario, "alice.delayErrorPs", -300.0, 150.0, false);
        List<OperatingInterval> windows =
                new OperatingWindow(scenario, axis).run(Execution.SINGLE).windows();
        OperatingInterval widest = windows.stream()
                .max((a, b) -> Double.compare(a.width(), b.width()))
                .orElseThrow();
        BoxSide side = run(new ToleranceBox(scenario, List.of(axis), Sense.SHARE, false, 1))
                .sides()
                .get(0);
        assertThat(windows.size()).isGreaterThan(1);
        assertThat(side.from().value()).isCloseTo(widest.from().value(), within(1e-6));
        assertThat(side.to().value()).isCloseTo(widest.to().value(), within(1e-6));
        assertThat(side.from().requirement()).isEqualTo(widest.from().requirement());
    }

    @Test
    void toleranceOfOneParameterIsHalfItsWindowOverTheMiddle() {
        OperatingInterval window =
                new OperatingWindow(PAIR, PAIRS).run(Execution.SINGLE).windows().get(0);
        double from = window.from().value();
        double to = window.to().value();
        OperatingBox box = run(new ToleranceBox(PAIR, List.of(PAIRS), Sense.TOLERANCE, false, 1));
        assertThat(box.tolerance()).isCloseTo((to - from) / (to + from), within(1e-6));
        double planned = 0.03;
        OperatingBox held = run(new ToleranceBox(PAIR, List.of(PAIRS), Sense.TOLERANCE, true, 1));
        assertThat(held.tolerance()).isCloseTo(Math.min(planned - from, to - planned) / planned, within(1e-9));
    }

    /** Over all centres of a grid, the largest tolerance whose four corners hold, by bisection. */
    @Test
    void toleranceOfTwoParametersIsTheLargestOfAGridOfCentres() {
        int side = 120;
        double largest = IntStream.range(0, side * side)
                .parallel()
                .mapToDouble(k -> cornerTolerance(
                        PAIRS.at((k % side + 0.5) / side), WIDTH.at((Math.floorDiv(k, side) + 0.5) / side)))
                .max()
                .orElseThrow();
        double found = run(new ToleranceBox(PAIR, List.of(PAIRS, WIDTH), Sense.TOLERANCE, false, 1))
                .tolerance();
        assertThat(found).isGreaterThanOrEqualTo(largest - 1e-6);
        assertThat(found).isCloseTo(largest, within(0.02 * largest));
    }

    private static double cornerTolerance(double pairs, double width) {
        double good = 0.0;
        double bad = 1.0;
        PointEvaluator evaluator =
                new PointEvaluator(PAIR, List.of(PAIRS.parameter(), WIDTH.parameter()), WindowLinks.margins(PAIR));
        for (int i = 0; i < 12; i++) {
            double t = (good + bad) / 2.0;
            boolean inside = pairs * (1.0 - t) >= PAIRS.from()
                    && pairs * (1.0 + t) <= PAIRS.to()
                    && width * (1.0 - t) >= WIDTH.from()
                    && width * (1.0 + t) <= WIDTH.to();
            boolean holds = inside;
            for (int corner = 0; corner < 4 && holds; corner++) {
                double x = pairs * (1.0 + (corner % 2 == 0 ? -t : t));
                double y = width * (1.0 + (corner / 2 == 0 ? -t : t));
                holds = evaluator.leastMargin(x, y) >= 0.0;
            }
            good = holds ? t : good;
            bad = holds ? bad : t;
        }
        return good;
    }

    @Test
    void heldShareContainsThePlannedValues() {
        List<Axis> axes = List.of(PAIRS, WIDTH, LENGTH);
        OperatingBox box = run(new ToleranceBox(PAIR, axes, Sense.SHARE, true, 1));
        for (BoxSide side : box.sides()) {
            double planned = side.axis().parameter().value(PAIR).orElseThrow();
            assertThat(planned).isBetween(side.from().value(), side.to().value());
        }
        OperatingBox free = run(new ToleranceBox(PAIR, axes, Sense.SHARE, false, 1));
        assertThat(box.volumeShare()).isLessThanOrEqualTo(free.volumeShare() * (1.0 + 1e-4));
    }

    /** An axis that no requirement cares about comes out as its whole range, to the last digit. */
    @ParameterizedTest
    @EnumSource(Sense.class)
    void indifferentAxisComesOutWhole(Sense sense) {
        Axis indifferent = WindowLinks.axis(PAIR, "acquisition.secondsPerPoint", 0.1 + 0.2, 77.7, true);
        OperatingBox box = run(new ToleranceBox(PAIR, List.of(WIDTH, indifferent), sense, false, 1));
        BoxSide side = box.sides().get(1);
        if (sense == Sense.SHARE) {
            assertThat(side.from()).isEqualTo(new WindowEnd(0.1 + 0.2, Optional.empty()));
            assertThat(side.to()).isEqualTo(new WindowEnd(77.7, Optional.empty()));
        }
        double expected = new OperatingWindow(PAIR, WIDTH)
                .run(Execution.SINGLE)
                .windows()
                .get(0)
                .width();
        BoxSide width = box.sides().get(0);
        double found = width.to().value() - width.from().value();
        assertThat(found).isCloseTo(expected, within(1e-4 * expected));
    }

    /** A hole, smaller than the spacing of the checked points: the box lies beside it. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-5, 1e-7, 1e-9})
    void boxAvoidsAHole(double above) {
        Scenario open = WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.5);
        Axis alice = WindowLinks.axis(open, "alice.delayErrorPs", -47.0, 60.0, false);
        Axis bob = WindowLinks.axis(open, "bob.delayErrorPs", -60.0, 41.0, false);
        double dip = WindowLinks.prediction(open, new Axis[] {alice, bob}, 0.0, 0.0)
                .fringe()
                .raw();
        Scenario scenario =
                WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", dip * (1.0 + above));
        OperatingBox box = run(new ToleranceBox(scenario, List.of(alice, bob), Sense.SHARE, false, 1));
        boolean contained = box.sides().stream()
                .allMatch(side -> side.from().value() < 0.0 && 0.0 < side.to().value());
        assertThat(contained).isFalse();
        assertThat(box.volumeShare()).isBetween(0.5, 60.0 / 101.0);
        assertThat(box.sides().stream().filter(side -> side.share() == 1.0)).hasSize(1);
    }

    @Test
    void withoutAFeasiblePointTheNearestSaysWhatIsMissed() {
        Scenario scenario = WindowLinks.requiring(
                SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.99, "keyRateAtLeastBps", 4000.0);
        List<Axis> axes = List.of(PAIRS, WIDTH, EFFICIENCY);
        OperatingBox box = run(new ToleranceBox(scenario, axes, Sense.SHARE, false, 1));
        assertThat(box.found()).isFalse();
        assertThat(box.volumeShare()).isZero();
        assertThat(box.binding()).isEmpty();
        PointVerdict nearest = box.nearest().orElseThrow();
        assertThat(nearest.violated()).isNotEmpty();
        SplittableRandom random = new SplittableRandom(3);
        MarginFunction function = new MarginFunction(scenario, axes);
        double highest = IntStream.range(0, RANDOM_POINTS)
                .mapToDouble(i -> function.least(random.doubles(3).toArray()))
                .max()
                .orElseThrow();
        assertThat(nearest.leastMargin()).isGreaterThanOrEqualTo(highest);
    }

    @Test
    void infeasiblePlanHasNoBoxAroundIt() {
        Scenario scenario = WindowLinks.requiring(SampleScenarios.pulsePair(), "keyRateAtLeastBps", 1e5);
        OperatingBox box = run(new ToleranceBox(scenario, List.of(PAIRS, WIDTH), Sense.TOLERANCE, true, 1));
        assertThat(box.found()).isFalse();
        PointVerdict nearest = box.nearest().orElseThrow();
        assertThat(nearest.values().get(0)).isCloseTo(0.03, within(1e-12));
        assertThat(nearest.violated())
                .extracting(RequirementMargin::requirement)
                .containsExactly(Requirement.KEY_RATE);
    }

    /** A window of a millionth of the range, in a second dimension that does not matter. */
    @Test
    void narrowFeasibleRegionIsFound() {
        double from = 0.0123;
        double to = from * (1.0 + 1e-6);
        Scenario open = WindowLinks.requiring(SampleScenarios.pulsePair(), "keyRateAtLeastBps", 1.0);
        Axis indifferent = WindowLinks.axis(open, "acquisition.secondsPerPoint", 1.0, 100.0, false);
        Axis[] axes = {WindowLinks.axis(open, "source.meanPairsPerCycle", 1e-3, 1.0, false)};
        Scenario scenario = WindowLinks.requiring(
                SampleScenarios.pulsePair(),
                "rawVisibilityAtLeast",
                WindowLinks.prediction(open, axes, to).fringe().raw(),
                "keyRateAtLeastBps",
                WindowLinks.prediction(open, axes, from).key().asymptoticPerSecond());
        for (List<Axis> each : List.of(List.of(axes[0]), List.of(axes[0], indifferent))) {
            BoxSide side = run(new ToleranceBox(scenario, each, Sense.SHARE, false, 1))
                    .sides()
                    .get(0);
            assertThat(side.from().value()).isCloseTo(from, within(1e-10));
            assertThat(side.to().value()).isCloseTo(to, within(1e-10));
        }
    }

    @Test
    void threadsDoNotMatter() {
        for (Sense sense : Sense.values()) {
            ToleranceBox question = new ToleranceBox(PAIR, List.of(PAIRS, WIDTH, LENGTH), sense, false, 7);
            OperatingBox one = question.run(Execution.SINGLE);
            OperatingBox three = question.run(new Execution(3, Progress.NONE, 0.0, 1.0));
            assertThat(three).isEqualTo(one);
        }
    }

    @Test
    void randomLinksHaveBoxesThatHold() {
        int found = 0;
        for (long number = 0; number < 13; number++) {
            Scenario scenario = WindowLinks.random(number);
            if (RequirementMargins.of(scenario.require()).requirements().isEmpty()) {
                continue;
            }
            Axis width = WindowLinks.axis(scenario, "timing.windowWidthPs", 5.0, 5000.0, true);
            Axis imbalance = WindowLinks.axis(scenario, "imbalanceNs", 0.1, 6.0, false);
            Axis phase = WindowLinks.axis(scenario, "alice.analyzer.phaseSettingErrorRad", -1.0, 1.0, false);
            Axis[] axes = {width, imbalance, phase};
            OperatingBox box = run(new ToleranceBox(scenario, List.of(axes), Sense.SHARE, false, number));
            found += box.found() ? 1 : 0;
            SplittableRandom random = new SplittableRandom(number);
            for (int i = 0; box.found() && i < 2000; i++) {
                double[] values = BoxLinks.inside(box, random.doubles(3).toArray());
                assertThat(WindowLinks.least(scenario, axes, values)).isNotNegative();
            }
        }
        assertThat(found).isGreaterThan(8);
    }
}

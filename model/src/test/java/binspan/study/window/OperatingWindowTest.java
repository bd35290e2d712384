package binspan.study.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Operating windows of one parameter against dense scans, bisection and windows whose ends are known beforehand. */
final class OperatingWindowTest {
    private static final int DENSE = 200_000;
    private static final double END = 1e-9;

    /** A link and the parameter along which it is looked at. */
    record Case(String name, Scenario scenario, String path, double from, double to, boolean logarithmic) {
        Axis axis() {
            return WindowLinks.axis(scenario, path, from, to, logarithmic);
        }

        @Override
        public String toString() {
            return name + " " + path;
        }
    }

    static List<Case> cases() {
        Scenario pair = WindowLinks.pulsePair();
        Scenario twoWindows =
                WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.9395, "carAtLeast", 2.0);
        Scenario train = WindowLinks.requiring(
                SampleScenarios.pulseTrain(), "rawVisibilityAtLeast", 0.93, "keyRateAtLeastBps", 100.0);
        Scenario slots = WindowLinks.requiring(SampleScenarios.pulsePair(), "carAtLeast", 17.07);
        return List.of(
                new Case("pulse pair", pair, "imbalanceNs", 0.1, 20.0, false),
                new Case("pulse pair", pair, "source.meanPairsPerCycle", 1e-4, 1.0, true),
                new Case("pulse pair", pair, "timing.windowWidthPs", 10.0, 5000.0, true),
                new Case("three windows", pair, "alice.analyzer.phaseSettingErrorRad", -6.28, 6.28, false),
                new Case("dip in the middle", twoWindows, "alice.delayErrorPs", -1000.0, 1000.0, false),
                new Case("six slots", slots, "alice.delayErrorPs", -3000.0, 3000.0, false),
                new Case("continuous", WindowLinks.continuous(), "imbalanceNs", 0.1, 1000.0, true),
                new Case("train in every period", train, "timing.cableTemperatureStepK", -50.0, 50.0, false));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void windowsAreThoseOfADenseScan(Case each) {
        compareWithDenseScan(each.scenario(), each.axis(), DENSE);
    }

    @Test
    void windowsOfRandomLinksAreThoseOfADenseScan() {
        int windows = 0;
        for (long number = 0; number < 16; number++) {
            Scenario scenario = WindowLinks.random(number);
            if (!RequirementMargins.of(scenario.require()).requirements().isEmpty()) {
                Axis window = WindowLinks.axis(scenario, "timing.windowWidthPs", 5.0, 20_000.0, true);
                Axis imbalance = WindowLinks.axis(scenario, "imbalanceNs", 0.1, 6.0, false);
                windows += compareWithDenseScan(scenario, number % 2 == 0 ? window : imbalance, DENSE / 10);
            }
        }
        assertThat(windows).isGreaterThan(10);
    }

    /** Compares number and ends of the windows; each end by plain bisection between two samples. */
    private static int compareWithDenseScan(Scenario scenario, Axis axis, int steps) {
        double[] least = WindowLinks.scan(scenario, axis, steps);
        List<double[]> expected = new ArrayList<>();
        for (int i = 0; i <= steps; i++) {
            boolean begins = least[i] >= 0.0 && (i == 0 || least[i - 1] < 0.0);
            boolean ends = least[i] >= 0.0 && (i == steps || least[i + 1] < 0.0);
            if (begins) {
                double from = i == 0 ? axis.from() : bisected(scenario, axis, steps, i - 1, i);
                expected.add(new double[] {from, Double.NaN});
            }
            if (ends) {
                expected.get(expected.size() - 1)[1] =
                        i == steps ? axis.to() : bisected(scenario, axis, steps, i + 1, i);
            }
        }
        List<OperatingInterval> found = run(scenario, axis).windows();
        assertThat(found).hasSize(expected.size());
        for (int i = 0; i < found.size(); i++) {
            assertThat(found.get(i).from().value()).isCloseTo(expected.get(i)[0], near(expected.get(i)[0], axis));
            assertThat(found.get(i).to().value()).isCloseTo(expected.get(i)[1], near(expected.get(i)[1], axis));
        }
        return found.size();
    }

    private static Offset<Double> near(double value, Axis axis) {
        return within(END * Math.max(Math.abs(value), 1e-6 * (axis.to() - axis.from())));
    }

    private static double bisected(Scenario scenario, Axis axis, int steps, int outside, int inside) {
        double bad = WindowLinks.place(axis, outside, steps);
        double good = WindowLinks.place(axis, inside, steps);
        for (int i = 0; i < 60; i++) {
            double middle = (bad + good) / 2.0;
            if (WindowLinks.least(scenario, new Axis[] {axis}, middle) >= 0.0) {
                good = middle;
            } else {
                bad = middle;
            }
        }
        return good;
    }

    private static OperatingIntervals run(Scenario scenario, Axis axis) {
        return new OperatingWindow(scenario, axis).run(Execution.SINGLE);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void endsMeetEverythingAndTheNamedRequirementFailsBeyond(Case each) {
        Axis[] axes = {each.axis()};
        for (OperatingInterval window : run(each.scenario(), each.axis()).windows()) {
            double step = 1e-7 * (each.to() - each.from());
            for (WindowEnd end : List.of(window.from(), window.to())) {
                double beyond = end.value() + (end.equals(window.from()) ? -step : step);
                assertThat(WindowLinks.least(each.scenario(), axes, end.value()))
                        .isNotNegative();
                if (end.requirement().isPresent()) {
                    assertThat(WindowLinks.margin(
                                    each.scenario(), end.requirement().orElseThrow(), axes, beyond))
                            .isNegative();
                } else {
                    assertThat(end.value()).isIn(each.from(), each.to());
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void bestPointIsNoWorseThanAnyOfADenseScan(Case each) {
        double[] least = WindowLinks.scan(each.scenario(), each.axis(), 20_000);
        OperatingIntervals found = run(each.scenario(), each.axis());
        double highest = Arrays.stream(least).max().orElseThrow();
        PointVerdict best = found.roomiest().orElseThrow().best();
        assertThat(best.leastMargin()).isGreaterThanOrEqualTo(highest - 1e-9);
        assertThat(WindowLinks.least(
                        each.scenario(), new Axis[] {each.axis()}, best.values().get(0)))
                .isEqualTo(best.leastMargin());
    }

    @Test
    void requirementsHaveIntervalsOfTheirOwn() {
        Scenario scenario = WindowLinks.pulsePair();
        Axis axis = WindowLinks.axis(scenario, "source.meanPairsPerCycle", 1e-4, 1.0, true);
        OperatingIntervals found = run(scenario, axis);
        assertThat(found.requirements()).hasSize(6);
        for (RequirementIntervals each : found.requirements()) {
            for (RequirementIntervals.HeldInterval interval : each.intervals()) {
                for (double end : new double[] {interval.from(), interval.to()}) {
                    double margin = WindowLinks.margin(scenario, each.requirement(), new Axis[] {axis}, end);
                    boolean ofRange = end == axis.from() || end == axis.to();
                    assertThat(margin).isBetween(0.0, ofRange ? 20.0 : 1e-9);
                }
            }
        }
    }

    /** Visibility falls and key rises with the mean pairs: required figures read off the curves at two places make the window between them. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-4, 1e-6, 1e-9, 1e-12})
    void narrowWindowsBetweenTwoRequirementsAreFound(double width) {
        double from = 0.0123;
        double to = from + width;
        Scenario open = WindowLinks.requiring(
                SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.5, "keyRateAtLeastBps", 1.0);
        Axis[] axes = {WindowLinks.axis(open, "source.meanPairsPerCycle", 1e-3, 1.0, false)};
        double rate = WindowLinks.prediction(open, axes, from).key().asymptoticPerSecond();
        double visibility = WindowLinks.prediction(open, axes, to).fringe().raw();
        Scenario scenario = WindowLinks.requiring(
                SampleScenarios.pulsePair(), "rawVisibilityAtLeast", visibility, "keyRateAtLeastBps", rate);
        List<OperatingInterval> windows = run(scenario, axes[0]).windows();
        assertThat(windows).hasSize(1);
        assertThat(windows.get(0).from().value()).isCloseTo(from, within(1e-12 * from));
        assertThat(windows.get(0).to().value()).isCloseTo(to, within(1e-12 * to));
        assertThat(windows.get(0).from().requirement()).contains(Requirement.KEY_RATE);
        assertThat(windows.get(0).to().requirement()).contains(Requirement.RAW_VISIBILITY);
    }

    /** A requirement a hair below the largest key rate leaves a window far narrower than the samples, about the place of the maximum. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 1e-8, 1e-10})
    void narrowWindowOfOneRequirementIsFoundAtItsPeak(double below) {
        Scenario open = WindowLinks.requiring(SampleScenarios.pulsePair(), "keyRateAtLeastBps", 1.0);
        Axis[] axes = {WindowLinks.axis(open, "source.meanPairsPerCycle", 1e-6, 10.0, true)};
        double peak = peak(open, axes);
        double largest = WindowLinks.prediction(open, axes, peak).key().asymptoticPerSecond();
        Scenario scenario =
                WindowLinks.requiring(SampleScenarios.pulsePair(), "keyRateAtLeastBps", largest * (1.0 - below));
        List<OperatingInterval> windows = run(scenario, axes[0]).windows();
        assertThat(windows).hasSize(1);
        assertThat(peak)
                .isBetween(windows.get(0).from().value(), windows.get(0).to().value());
        assertThat(windows.get(0).width() / peak).isLessThan(10.0 * Math.sqrt(below));
    }

    /** Golden section search, written out. */
    private static double peak(Scenario scenario, Axis[] axes) {
        double low = 0.01;
        double high = 0.2;
        double golden = (Math.sqrt(5.0) - 1.0) / 2.0;
        for (int i = 0; i < 60; i++) {
            double first = high - golden * (high - low);
            double second = low + golden * (high - low);
            double rateFirst =
                    WindowLinks.prediction(scenario, axes, first).key().asymptoticPerSecond();
            double rateSecond =
                    WindowLinks.prediction(scenario, axes, second).key().asymptoticPerSecond();
            if (rateFirst < rateSecond) {
                low = first;
            } else {
                high = second;
            }
        }
        return (low + high) / 2.0;
    }

    /** The raw visibility of a pulse pair has its dip where the window sits centrally: required a hair above that, the dip splits the window. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 1e-8, 1e-10})
    void narrowGapsAreFound(double above) {
        Scenario open = WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.5);
        Axis[] axes = {WindowLinks.axis(open, "alice.delayErrorPs", -90.0, 110.0, false)};
        double dip = WindowLinks.prediction(open, axes, 0.0).fringe().raw();
        Scenario scenario =
                WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", dip * (1.0 + above));
        List<OperatingInterval> windows = run(scenario, axes[0]).windows();
        assertThat(windows).hasSize(2);
        assertThat(windows.get(0).to().value()).isNegative();
        assertThat(windows.get(1).from().value()).isPositive();
        assertThat(windows.get(1).from().value() - windows.get(0).to().value()).isLessThan(5000.0 * Math.sqrt(above));
    }

    /** Too short: the slots overlap. Too long: temperature moves the phase of an interferometer in proportion to its imbalance. */
    @Test
    void imbalanceIsLimitedFromBothSides() {
        Scenario drifting = WindowLinks.requiring(warm(30.0), "timeBasisQberAtMost", 0.03, "rawVisibilityAtLeast", 0.8);
        Axis axis = WindowLinks.axis(drifting, "imbalanceNs", 0.1, 12.0, false);
        OperatingInterval window = run(drifting, axis).windows().get(0);
        assertThat(window.from().requirement()).contains(Requirement.TIME_QBER);
        assertThat(window.to().requirement()).contains(Requirement.RAW_VISIBILITY);
        Scenario steady = WindowLinks.requiring(warm(0.0), "timeBasisQberAtMost", 0.03, "rawVisibilityAtLeast", 0.8);
        OperatingInterval without = run(steady, axis).windows().get(0);
        assertThat(without.from().value()).isCloseTo(window.from().value(), within(0.02));
        assertThat(without.to()).isEqualTo(new WindowEnd(12.0, Optional.empty()));
    }

    private static Values warm(double temperatureRmsMilliK) {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "source.pump").put("repetitionRateMHz", 20.0);
        SampleScenarios.part(stated, "timing").put("windowWidthPs", 100.0);
        for (String side : List.of("alice", "bob")) {
            SampleScenarios.part(stated, side + ".analyzer").put("temperatureRmsMilliK", temperatureRmsMilliK);
        }
        return stated;
    }

    @Test
    void wholeRangeComesOutExactly() {
        Scenario scenario = WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.1);
        for (boolean logarithmic : new boolean[] {false, true}) {
            Axis axis = WindowLinks.axis(scenario, "timing.windowWidthPs", 0.1 + 0.2, 700.7, logarithmic);
            List<OperatingInterval> windows = run(scenario, axis).windows();
            assertThat(windows).hasSize(1);
            assertThat(windows.get(0).from()).isEqualTo(new WindowEnd(0.1 + 0.2, Optional.empty()));
            assertThat(windows.get(0).to()).isEqualTo(new WindowEnd(700.7, Optional.empty()));
        }
    }

    @Test
    void withoutAWindowTheNearestPointSaysWhatIsMissed() {
        Scenario scenario = WindowLinks.requiring(
                SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.99, "keyRateAtLeastBps", 4000.0);
        Axis axis = WindowLinks.axis(scenario, "source.meanPairsPerCycle", 1e-4, 1.0, true);
        OperatingIntervals found = run(scenario, axis);
        assertThat(found.windows()).isEmpty();
        PointVerdict nearest = found.nearest().orElseThrow();
        double highest = Arrays.stream(WindowLinks.scan(scenario, axis, DENSE / 10))
                .max()
                .orElseThrow();
        assertThat(nearest.leastMargin()).isBetween(highest, highest + 1e-4);
        assertThat(nearest.violated()).hasSize(2);
        RequirementMargin least = nearest.violated().get(0);
        RequirementMargin most = nearest.violated().get(1);
        assertThat(least.margin()).isGreaterThanOrEqualTo(most.margin());
        assertThat(most).isEqualTo(nearest.tightest());
        RequirementMargin visibility = nearest.requirements().get(0);
        assertThat(visibility.predicted())
                .isEqualTo(WindowLinks.prediction(
                                scenario, new Axis[] {axis}, nearest.values().get(0))
                        .fringe()
                        .raw());
        assertThat(visibility.margin())
                .isCloseTo(Math.log(visibility.predicted() / visibility.required()), within(1e-12));
    }

    @Test
    void curvesCoverTheRange() {
        Scenario scenario = WindowLinks.continuous();
        Axis axis = WindowLinks.axis(scenario, "imbalanceNs", 0.1, 1000.0, true);
        MarginCurves curves = run(scenario, axis).curves();
        assertThat(curves.size()).isEqualTo(OperatingWindow.FEWEST_SAMPLES);
        assertThat(curves.value(0)).isEqualTo(0.1);
        assertThat(curves.value(curves.size() - 1)).isEqualTo(1000.0);
        for (int i = 0; i < curves.size(); i += 512) {
            assertThat(curves.least(i)).isEqualTo(WindowLinks.least(scenario, new Axis[] {axis}, curves.value(i)));
            assertThat(curves.least(i))
                    .isEqualTo(Math.min(curves.margin(0, i), Math.min(curves.margin(1, i), curves.margin(2, i))));
        }
    }

    @Test
    void threadsDoNotMatter() {
        Case each = cases().get(7);
        OperatingIntervals one = run(each.scenario(), each.axis());
        OperatingIntervals three =
                new OperatingWindow(each.scenario(), each.axis()).run(new Execution(3, Progress.NONE, 0.0, 1.0));
        assertThat(one.windows().size()).isGreaterThan(50);
        assertThat(three.windows().equals(one.windows())).isTrue();
        assertThat(three.requirements().equals(one.requirements())).isTrue();
    }
}

package binspan.study.region;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.Requirement;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.region.RegionMap.RequirementContour;
import binspan.study.window.OperatingWindow;
import binspan.study.window.PointVerdict;
import binspan.study.window.RequirementMargin;
import binspan.study.window.WindowLinks;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Regions whose shape is known: bands thinner than a cell, parts, islands and holes, none and all of the map. */
final class RegionShapesTest {
    /**
     * With a continuous pump only the difference of the two delays counts: a band along the diagonal that crosses the cells askew, half as wide as one, or a
     * twentieth, so that most lines meet it between two samples that show nothing of it.
     */
    @ParameterizedTest
    @ValueSource(doubles = {1.0, 10.0})
    void bandThinnerThanACellIsWhole(double wider) {
        Scenario scenario = WindowLinks.continuous();
        double length = wider * 190_000.0;
        RegionCase each = new RegionCase(
                "band",
                scenario,
                WindowLinks.axis(scenario, "alice.delayErrorPs", wider * -99_000.0, wider * 91_000.0, false),
                WindowLinks.axis(scenario, "bob.delayErrorPs", wider * -100_000.0, wider * 100_000.0, false));
        double width = new OperatingWindow(
                        scenario, WindowLinks.axis(scenario, "alice.delayErrorPs", -5000.0, 5000.0, false))
                .run(Execution.SINGLE)
                .windows()
                .get(0)
                .width();
        RegionMap map = each.run();
        assertThat(width).isLessThan(0.6 / wider * length / 128.0);
        assertThat(map.parts()).isEqualTo(1);
        assertThat(map.area()).isCloseTo(width * length, within(1e-6 * width * length));
        assertThat(map.border()).hasSize(1);
    }

    /** Only the sum of the two phase errors counts, modulo a turn: three whole bands and two cut by the corners. */
    @Test
    void partsAreCountedAndMeasured() {
        Scenario scenario = WindowLinks.requiring(SampleScenarios.pulsePair(), "chshAtLeast", 2.4);
        double reach = 6.2;
        RegionCase each = new RegionCase(
                "phases",
                scenario,
                WindowLinks.axis(scenario, "alice.analyzer.phaseSettingErrorRad", -reach, reach, false),
                WindowLinks.axis(scenario, "bob.analyzer.phaseSettingErrorRad", -reach, reach, false));
        double half = new OperatingWindow(
                                scenario,
                                WindowLinks.axis(scenario, "alice.analyzer.phaseSettingErrorRad", -3.0, 3.0, false))
                        .run(Execution.SINGLE)
                        .windows()
                        .get(0)
                        .width()
                / 2.0;
        double expected = 0.0;
        for (int turn = -2; turn <= 2; turn++) {
            double middle = turn * 2.0 * Math.PI;
            expected += below(middle + half, reach) - below(middle - half, reach);
        }
        RegionMap map = each.run();
        assertThat(map.area()).isCloseTo(expected, within(1e-6 * expected));
        assertThat(map.parts()).isEqualTo(5);
    }

    /** Area of the square from -reach to reach in which the coordinates' sum is below a limit. */
    private static double below(double limit, double reach) {
        double cut = Math.max(-2.0 * reach, Math.min(2.0 * reach, limit));
        double lower = (2.0 * reach + cut) * (2.0 * reach + cut) / 2.0;
        return cut <= 0.0 ? lower : 4.0 * reach * reach - (2.0 * reach - cut) * (2.0 * reach - cut) / 2.0;
    }

    /** The key rate has one highest point over mean pairs and window: required a hair less, an island smaller than a cell remains. */
    @Test
    void islandSmallerThanACellIsFoundAndMeasured() {
        Scenario open = WindowLinks.requiring(SampleScenarios.pulsePair(), "keyRateAtLeastBps", 1e6);
        RegionCase whole = island(open);
        double largest = 1e6 * Math.exp(whole.run().best().leastMargin());
        Scenario scenario =
                WindowLinks.requiring(SampleScenarios.pulsePair(), "keyRateAtLeastBps", largest * (1.0 - 1e-6));
        RegionCase each = island(scenario);
        RegionMap map = each.run();
        assertThat(map.parts()).isEqualTo(1);
        assertThat(map.border()).hasSize(1);
        MapLine border = map.border().get(0);
        double left = border.points().stream().mapToDouble(MapPoint::x).min().orElseThrow();
        double right = border.points().stream().mapToDouble(MapPoint::x).max().orElseThrow();
        double bottom = border.points().stream().mapToDouble(MapPoint::y).min().orElseThrow();
        double top = border.points().stream().mapToDouble(MapPoint::y).max().orElseThrow();
        assertThat(each.horizontal().share(right) - each.horizontal().share(left))
                .isLessThan(1.0 / 128.0);
        RegionCase near = new RegionCase(
                "about the island",
                scenario,
                WindowLinks.axis(scenario, "source.meanPairsPerCycle", 2.0 * left - right, 2.0 * right - left, false),
                WindowLinks.axis(scenario, "timing.windowWidthPs", 2.0 * bottom - top, 2.0 * top - bottom, false));
        double counted = near.counted(1 << 16)[1];
        assertThat(map.area()).isCloseTo(counted, within(0.03 * counted));
    }

    private static RegionCase island(Scenario scenario) {
        return new RegionCase(
                "island",
                scenario,
                WindowLinks.axis(scenario, "source.meanPairsPerCycle", 1e-3, 1.0, true),
                WindowLinks.axis(scenario, "timing.windowWidthPs", 50.0, 5000.0, true));
    }

    /** The raw visibility has a dip where both windows sit centrally: required a hair above that, a hole smaller than a cell appears. */
    @Test
    void holeSmallerThanACellIsFound() {
        Scenario open = WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.5);
        Axis alice = WindowLinks.axis(open, "alice.delayErrorPs", -83.0, 71.0, false);
        Axis bob = WindowLinks.axis(open, "bob.delayErrorPs", -62.0, 77.0, false);
        double dip = WindowLinks.prediction(open, new Axis[] {alice, bob}, 0.0, 0.0)
                .fringe()
                .raw();
        Scenario scenario =
                WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", dip * (1.0 + 1e-9));
        RegionMap map = new RegionCase("hole", scenario, alice, bob).run();
        assertThat(map.parts()).isEqualTo(1);
        assertThat(map.border()).hasSize(2);
        assertThat(map.share()).isBetween(1.0 - 1.0 / 128.0 / 128.0, 1.0 - 1e-9);
        RequirementContour contour = map.contours().get(0);
        assertThat(contour.lines()).hasSize(1);
        assertThat(contour.lines().get(0).closed()).isTrue();
    }

    @Test
    void whereNothingHoldsTheNearestPointIsNamed() {
        Scenario scenario = WindowLinks.requiring(
                SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.99, "keyRateAtLeastBps", 4000.0);
        RegionCase each = island(scenario);
        RegionMap map = each.run();
        assertThat(map.parts()).isZero();
        assertThat(map.border()).isEmpty();
        assertThat(map.area()).isZero();
        PointVerdict nearest = map.nearest().orElseThrow();
        assertThat(nearest.violated())
                .extracting(RequirementMargin::requirement)
                .containsExactlyInAnyOrder(Requirement.RAW_VISIBILITY, Requirement.KEY_RATE);
        double highest = IntStream.range(0, 129 * 129)
                .mapToDouble(k -> map.least(k % 129, k / 129))
                .max()
                .orElseThrow();
        assertThat(nearest.leastMargin()).isBetween(highest, highest + 0.01);
    }

    @Test
    void whereEverythingHoldsTheBorderIsTheFrame() {
        Scenario scenario = WindowLinks.requiring(SampleScenarios.pulsePair(), "rawVisibilityAtLeast", 0.1);
        RegionCase each = new RegionCase(
                "all",
                scenario,
                WindowLinks.axis(scenario, "source.meanPairsPerCycle", 0.01, 0.1, true),
                WindowLinks.axis(scenario, "timing.windowWidthPs", 100.0, 900.0, false));
        RegionMap map = each.run();
        assertThat(map.share()).isCloseTo(1.0, within(1e-12));
        assertThat(map.area()).isCloseTo(0.09 * 800.0, within(1e-9));
        assertThat(map.contours().get(0).lines()).isEmpty();
        assertThat(map.border()).hasSize(1);
        assertThat(map.border().get(0).points()).allMatch(point -> each.onTheFrame(point));
    }
}

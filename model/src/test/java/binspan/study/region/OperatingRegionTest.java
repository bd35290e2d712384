package binspan.study.region;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.Scenario;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.region.RegionMap.RequirementContour;
import binspan.study.window.WindowLinks;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Regions of two parameters against dense counts and against areas known in closed form. */
final class OperatingRegionTest {
    static List<RegionCase> cases() {
        Scenario pair = WindowLinks.pulsePair();
        Scenario continuous = WindowLinks.continuous();
        return List.of(
                new RegionCase(
                        "mean pairs by window",
                        pair,
                        WindowLinks.axis(pair, "source.meanPairsPerCycle", 1e-4, 1.0, true),
                        WindowLinks.axis(pair, "timing.windowWidthPs", 10.0, 5000.0, true)),
                new RegionCase(
                        "length by imbalance",
                        pair,
                        WindowLinks.axis(pair, "link.lengthKm", 1.0, 200.0, false),
                        WindowLinks.axis(pair, "imbalanceNs", 0.1, 4.0, false)),
                new RegionCase(
                        "imbalance by pair rate",
                        continuous,
                        WindowLinks.axis(continuous, "imbalanceNs", 0.1, 1000.0, true),
                        WindowLinks.axis(continuous, "source.pairRatePerSecond", 1e4, 1e9, true)));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void areaIsThatOfADenseCount(RegionCase each) {
        double[] counted = each.counted(1 << 18);
        RegionMap map = each.run();
        assertThat(map.share()).isCloseTo(counted[0], within(1e-3 * counted[0]));
        assertThat(map.area()).isCloseTo(counted[1], within(2e-3 * counted[1]));
        assertThat(map.parts()).isEqualTo(1);
        assertThat(map.nearest()).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("cases")
    void contoursLieWhereTheirRequirementJustHolds(RegionCase each) {
        RegionMap map = each.run();
        int points = 0;
        for (RequirementContour contour : map.contours()) {
            for (MapLine line : contour.lines()) {
                for (MapPoint point : line.points()) {
                    double margin = WindowLinks.margin(
                            each.scenario(), contour.requirement(), each.axes(), point.x(), point.y());
                    assertThat(margin).isCloseTo(0.0, within(1e-8));
                    points++;
                }
                assertThat(line.closed() || endsOnTheFrame(each, line)).isTrue();
            }
        }
        assertThat(points).isGreaterThan(200);
    }

    private static boolean endsOnTheFrame(RegionCase each, MapLine line) {
        MapPoint last = line.points().get(line.points().size() - 1);
        return each.onTheFrame(line.points().get(0)) && each.onTheFrame(last);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void everyNeighbourOnTheGridOfTheOtherSideHasAContourBetween(RegionCase each) {
        RegionMap map = each.run();
        for (int k = 0; k < map.contours().size(); k++) {
            int changes = 0;
            for (int j = 0; j < 129; j++) {
                for (int i = 1; i < 129; i++) {
                    changes += map.margin(k, i, j) >= 0.0 == map.margin(k, i - 1, j) >= 0.0 ? 0 : 1;
                    changes += map.margin(k, j, i) >= 0.0 == map.margin(k, j, i - 1) >= 0.0 ? 0 : 1;
                }
            }
            int corners = 0;
            for (MapLine line : map.contours().get(k).lines()) {
                corners += line.points().size() - (line.closed() ? 1 : 0);
            }
            assertThat(corners).isGreaterThanOrEqualTo(changes);
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void borderClosesAroundTheArea(RegionCase each) {
        RegionMap map = each.run();
        double share = 0.0;
        for (MapLine line : map.border()) {
            assertThat(line.closed()).isTrue();
            for (int k = 1; k < line.points().size(); k++) {
                MapPoint from = line.points().get(k - 1);
                MapPoint to = line.points().get(k);
                double u = each.horizontal().share(from.x()) + each.horizontal().share(to.x());
                share += u
                        / 2.0
                        * (each.vertical().share(to.y()) - each.vertical().share(from.y()));
            }
        }
        assertThat(share).isCloseTo(map.share(), within(1e-9));
        long kinks = map.border().stream()
                .flatMap(line -> line.points().stream())
                .filter(point -> !each.onTheFrame(point))
                .filter(point -> Math.abs(WindowLinks.least(each.scenario(), each.axes(), point.x(), point.y())) > 1e-8)
                .count();
        assertThat(kinks).as("corners where two contours meet within a cell").isLessThan(8);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void bestPointIsNoWorseThanAnyOfTheGrid(RegionCase each) {
        RegionMap map = each.run();
        double highest = Double.NEGATIVE_INFINITY;
        for (int j = 0; j < 129; j++) {
            for (int i = 0; i < 129; i++) {
                highest = Math.max(highest, map.least(i, j));
                assertThat(map.meets(i, j)).isEqualTo(map.least(i, j) >= 0.0);
            }
        }
        assertThat(map.best().leastMargin()).isBetween(highest, highest + 0.01);
        assertThat(map.least(17, 93))
                .isEqualTo(WindowLinks.least(
                        each.scenario(),
                        each.axes(),
                        each.horizontal().at(17),
                        each.vertical().at(93)));
    }

    @Test
    void threadsDoNotMatter() {
        RegionCase each = cases().get(0);
        OperatingRegion region = new OperatingRegion(each.scenario(), each.horizontal(), each.vertical());
        RegionMap one = region.run(Execution.SINGLE);
        RegionMap three = region.run(new Execution(3, Progress.NONE, 0.0, 1.0));
        assertThat(three.border().equals(one.border())).isTrue();
        assertThat(three.contours().equals(one.contours())).isTrue();
        assertThat(three.area()).isEqualTo(one.area());
        assertThat(three.best()).isEqualTo(one.best());
    }
}

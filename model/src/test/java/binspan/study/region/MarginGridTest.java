package binspan.study.region;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.window.WindowLinks;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The quick survey of a region against the whole search, and against predictions made one by one from nothing. */
final class MarginGridTest {
    private static final int REFUSED_AFTER = 3;

    @ParameterizedTest
    @MethodSource("binspan.study.region.OperatingRegionTest#cases")
    void surveyHasTheMarginsOfTheWholeSearch(RegionCase each) {
        RegionMap map = each.run();
        MarginGrid grid = survey(each, new Execution(2, Progress.NONE, 0.0, 1.0));
        assertThat(grid.requirements().size()).isEqualTo(map.contours().size());
        for (int row = 0; row < each.vertical().steps(); row++) {
            for (int column = 0; column < each.horizontal().steps(); column++) {
                for (int k = 0; k < grid.requirements().size(); k++) {
                    assertThat(grid.margin(k, column, row)).isEqualTo(map.margin(k, column, row));
                }
                assertThat(grid.least(column, row)).isEqualTo(map.least(column, row));
                assertThat(grid.meets(column, row)).isEqualTo(map.meets(column, row));
                assertThat(grid.margin(grid.tightest(column, row), column, row)).isEqualTo(grid.least(column, row));
            }
        }
    }

    @ParameterizedTest
    @MethodSource("binspan.study.region.OperatingRegionTest#cases")
    void marginsAreThoseOfFreshPredictions(RegionCase each) {
        MarginGrid grid = survey(each, Execution.SINGLE);
        for (int row = 0; row < each.vertical().steps(); row += 16) {
            for (int column = 0; column < each.horizontal().steps(); column += 16) {
                double x = each.horizontal().at(column);
                double y = each.vertical().at(row);
                assertThat(grid.least(column, row)).isEqualTo(WindowLinks.least(each.scenario(), each.axes(), x, y));
            }
        }
    }

    @Test
    void stopsWhenAsked() {
        RegionCase each = OperatingRegionTest.cases().get(0);
        int[] heard = new int[1];
        Progress impatient = new Progress() {
            @Override
            public void reached(double share) {
                heard[0]++;
            }

            @Override
            public boolean cancelled() {
                return heard[0] >= REFUSED_AFTER;
            }
        };
        assertThatThrownBy(() -> survey(each, new Execution(1, impatient, 0.0, 1.0)))
                .isInstanceOf(CancellationException.class);
        assertThat(heard[0]).isEqualTo(REFUSED_AFTER);
    }

    @Test
    void refusesALinkOfWhichNothingIsRequired() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair());
        Axis pairs = WindowLinks.axis(scenario, "source.meanPairsPerCycle", 1e-4, 1.0, true);
        Axis window = WindowLinks.axis(scenario, "timing.windowWidthPs", 10.0, 5000.0, true);
        assertThatThrownBy(() -> new OperatingRegion(scenario, pairs, window).survey(Execution.SINGLE))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("states no requirement");
    }

    private static MarginGrid survey(RegionCase each, Execution execution) {
        return new OperatingRegion(each.scenario(), each.horizontal(), each.vertical()).survey(execution);
    }
}

package binspan.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Axes meet their ends exactly, and values and shares are inverse to each other. */
final class AxisTest {
    private static final Scenario SCENARIO = StudyScenarios.modest();

    @ParameterizedTest
    @ValueSource(booleans = {true, false})
    void endsAreExactAndSharesInvert(boolean logarithmic) {
        Axis axis = new Axis(ParameterPaths.find(SCENARIO, "timing.windowWidthPs"), 33.3, 777.7, 101, logarithmic);
        assertThat(axis.at(0)).isEqualTo(33.3);
        assertThat(axis.at(100)).isEqualTo(777.7);
        double[] values = axis.values();
        for (int i = 1; i < values.length; i++) {
            assertThat(values[i]).isGreaterThan(values[i - 1]);
            assertThat(axis.share(values[i])).isCloseTo(i / 100.0, within(1e-12));
        }
    }

    /** Equal ratios: the middle is the geometric mean. */
    @Test
    void logarithmicMiddleIsTheGeometricMean() {
        Axis axis = new Axis(ParameterPaths.find(SCENARIO, "timing.windowWidthPs"), 10.0, 1000.0, 3, true);
        assertThat(axis.at(1)).isCloseTo(100.0, within(1e-12));
    }

    @Test
    void usualRangesStayAllowed() {
        Axis efficiency = DefaultAxes.of(SCENARIO, ParameterPaths.find(SCENARIO, "alice.detectors.efficiency"));
        assertThat(efficiency.to()).isEqualTo(1.0);
        Axis window = DefaultAxes.of(SCENARIO, ParameterPaths.find(SCENARIO, "timing.windowWidthPs"));
        assertThat(window.to()).isLessThanOrEqualTo(1000.0 * SCENARIO.imbalanceNs());
    }
}

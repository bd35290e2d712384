package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Rectangle probabilities against the integral of the conditional probability over the first variable. */
final class BivariateNormalTest {
    private static final double[][] RECTANGLES = {
        {-1.0, 1.0, -1.0, 1.0},
        {-0.3, 0.2, -2.0, 5.0},
        {0.5, 2.5, -3.0, -0.2},
        {-0.01, 0.02, 0.01, 0.03},
        {-9.0, 9.0, -0.5, 40.0},
        {-5.0, -3.0, 2.0, 4.0},
        {1.0, 3.0, 1.5, 1.6}
    };

    @ParameterizedTest(name = "correlation {0}")
    @ValueSource(
            doubles = {
                -0.9999999,
                -0.9999,
                -0.99,
                -0.9,
                -0.5,
                -0.1,
                -1e-9,
                0.0,
                1e-6,
                0.2,
                0.6,
                0.9,
                0.99,
                0.9999,
                0.9999999,
                0.999999999
            })
    void agreesWithIntegral(double correlation) {
        for (double[] r : RECTANGLES) {
            double found = BivariateNormal.rectangle(r[0], r[1], r[2], r[3], correlation);
            assertThat(found).as(Arrays.toString(r)).isCloseTo(integral(r, correlation), within(1e-13));
        }
    }

    /** Both windows far out on the same side: small and still exact where the variables agree. */
    @ParameterizedTest(name = "correlation {0}")
    @ValueSource(doubles = {0.0, 0.3, 0.7, 0.95, 0.9999})
    void farTailsKeepTheirRelativeAccuracy(double correlation) {
        for (double start : new double[] {2.0, 4.0, 6.0, 8.0}) {
            double[] r = {start, start + 3.0, start + 0.5, start + 4.0};
            double expected = integral(r, correlation);
            double found = BivariateNormal.rectangle(r[0], r[1], r[2], r[3], correlation);
            assertThat(found).as("from %f", start).isCloseTo(expected, within(1e-10 * expected));
        }
    }

    /**
     * Windows on opposite sides of what the correlation favours: far smaller than without correlation. What is left is accurate to
     * rounding of the uncorrelated probability, never negative.
     */
    @ParameterizedTest(name = "correlation {0}")
    @ValueSource(doubles = {-0.3, -0.7, -0.95, -0.9999999})
    void cancellationLeavesNoMoreThanRounding(double correlation) {
        for (double start : new double[] {1.0, 2.0, 4.0}) {
            double[] r = {start, start + 3.0, start, start + 3.0};
            double independent = Integral.normal(start, start + 3.0) * Integral.normal(start, start + 3.0);
            double found = BivariateNormal.rectangle(r[0], r[1], r[2], r[3], correlation);
            assertThat(found).isNotNegative().isCloseTo(integral(r, correlation), within(1e-10 * independent));
        }
    }

    /** Perfect correlation: the overlap of both windows. */
    @Test
    void perfectCorrelationLeavesTheOverlap() {
        assertThat(BivariateNormal.rectangle(-1.0, 0.5, -0.2, 2.0, 1.0))
                .isCloseTo(Integral.normal(-0.2, 0.5), within(2e-7));
        assertThat(BivariateNormal.rectangle(-1.0, 0.5, -0.2, 2.0, -1.0))
                .isCloseTo(Integral.normal(-1.0, 0.2), within(2e-7));
        assertThat(BivariateNormal.rectangle(0.5, 1.5, -3.0, 0.4, 1.0)).isCloseTo(0.0, within(2e-7));
    }

    /** A quadrant: 1/4 + asin(r)/(2 pi) (Sheppard, Phil. Trans. R. Soc. A 192, 101 (1899), from memory). */
    @ParameterizedTest(name = "correlation {0}")
    @ValueSource(doubles = {-0.999999, -0.4, 0.1, 0.8, 0.999999})
    void quadrantIsExact(double correlation) {
        double found = BivariateNormal.rectangle(0.0, 37.0, 0.0, 37.0, correlation);
        assertThat(found).isCloseTo(0.25 + Math.asin(correlation) / (2.0 * Math.PI), within(1e-13));
    }

    private static double integral(double[] r, double correlation) {
        double own = Math.sqrt((1.0 - correlation) * (1.0 + correlation));
        double[] breaks = DoubleStream.concat(
                        DoubleStream.of(Math.max(r[0], -12.0), Math.min(r[1], 12.0)), steps(r, correlation, own))
                .filter(x -> x >= Math.max(r[0], -12.0) && x <= Math.min(r[1], 12.0))
                .sorted()
                .toArray();
        return Integral.over(
                x -> Integral.density(x)
                        * Integral.normal((r[2] - correlation * x) / own, (r[3] - correlation * x) / own),
                breaks);
    }

    /** Where the conditional probability changes quickly, with neighbours some of its widths away. */
    private static DoubleStream steps(double[] r, double correlation, double own) {
        if (correlation == 0.0) {
            return DoubleStream.empty();
        }
        double width = own / Math.abs(correlation);
        return DoubleStream.of(-8.0, -3.0, -1.0, 0.0, 1.0, 3.0, 8.0)
                .flatMap(k -> DoubleStream.of(r[2] / correlation + k * width, r[3] / correlation + k * width));
    }
}

package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.Requirement;
import binspan.study.FigureColumn;
import java.util.Arrays;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.apache.commons.math3.stat.descriptive.DescriptiveStatistics;
import org.apache.commons.math3.stat.descriptive.rank.Percentile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Mean, deviation and quantiles against Commons Math. */
final class FigureStatisticsTest {
    private static final FigureColumn COLUMN = new FigureColumn(Requirement.CAR.figure(), 0);
    private static final double INFINITE = Double.POSITIVE_INFINITY;

    @ParameterizedTest
    @ValueSource(ints = {16, 17, 100, 101, 4321})
    void statisticsOfFiniteValues(int count) {
        double[] values = new SplittableRandom(count)
                .doubles(count)
                .map(u -> -Math.log(u))
                .toArray();
        DescriptiveStatistics expected = new DescriptiveStatistics(values);
        Percentile percentile = new Percentile().withEstimationType(Percentile.EstimationType.R_7);
        double[] original = values.clone();
        FigureStatistics found = FigureStatistics.of(COLUMN, values);

        assertThat(found.mean()).isCloseTo(expected.getMean(), within(1e-12));
        assertThat(found.standardDeviation()).isCloseTo(expected.getStandardDeviation(), within(1e-12));
        for (int i = 0; i < FigureStatistics.SHARES.size(); i++) {
            double share = 100.0 * FigureStatistics.SHARES.get(i);
            assertThat(found.quantiles().get(i)).isCloseTo(percentile.evaluate(original, share), within(1e-12));
        }
        assertThat(found.infinite() + found.undefined()).isZero();
    }

    /** Of 101 values the quantiles are the values themselves: here 1 to 90 and eleven infinite ones, the last ten undefined. */
    @Test
    void infiniteValuesAreSortedInAndUndefinedOnesLeftOut() {
        double[] values = IntStream.rangeClosed(0, 110)
                .mapToDouble(i -> i > 100 ? Double.NaN : i > 89 ? INFINITE : i)
                .toArray();
        FigureStatistics found = FigureStatistics.of(COLUMN, values);

        assertThat(found.quantiles()).containsExactly(1.0, 5.0, 25.0, 50.0, 75.0, INFINITE, INFINITE);
        assertThat(found.mean()).isCloseTo(44.5, within(1e-12));
        assertThat(found.infinite()).isEqualTo(11);
        assertThat(found.undefined()).isEqualTo(10);
    }

    @Test
    void valuesBelowAllNumbersCountAsInfinite() {
        FigureStatistics found = FigureStatistics.of(COLUMN, new double[] {-INFINITE, 2.0, -INFINITE, 4.0});

        assertThat(found.quantiles().get(0)).isEqualTo(-INFINITE);
        assertThat(found.quantiles().get(6)).isCloseTo(3.94, within(1e-12));
        assertThat(found.mean()).isEqualTo(3.0);
        assertThat(found.infinite()).isEqualTo(2);
    }

    @Test
    void equalValuesHaveNoDeviation() {
        double[] equal = new double[1000];
        Arrays.fill(equal, 0.1);
        FigureStatistics found = FigureStatistics.of(COLUMN, equal);

        assertThat(found.standardDeviation()).isZero();
        assertThat(found.mean()).isEqualTo(0.1);
        assertThat(found.quantiles()).containsOnly(0.1);
    }

    @Test
    void withoutAnyFigureNothingIsStated() {
        double[] none = new double[16];
        Arrays.fill(none, Double.NaN);
        FigureStatistics found = FigureStatistics.of(COLUMN, none);

        assertThat(found.quantiles()).hasSize(7).containsOnly(Double.NaN);
        assertThat(found.mean()).isNaN();
        assertThat(found.standardDeviation()).isNaN();
        assertThat(found.undefined()).isEqualTo(16);
    }
}

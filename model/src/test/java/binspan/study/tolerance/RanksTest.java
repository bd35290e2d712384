package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.apache.commons.math3.stat.correlation.SpearmansCorrelation;
import org.apache.commons.math3.stat.ranking.NaNStrategy;
import org.apache.commons.math3.stat.ranking.NaturalRanking;
import org.apache.commons.math3.stat.ranking.TiesStrategy;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Ranks and rank correlations against Commons Math. */
final class RanksTest {
    private static final int SAMPLES = 3000;

    /** From a few values that are often equal to values that never are. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 7, 500, Integer.MAX_VALUE})
    void ranksAreTheNaturalOnesWithSharedMeans(int differentValues) {
        double[] values = values(differentValues, 1);
        double[] expected = new NaturalRanking(NaNStrategy.FAILED, TiesStrategy.AVERAGE).rank(values);
        int[] found = Ranks.doubled(values);

        for (int i = 0; i < SAMPLES; i++) {
            assertThat(found[i] / 2.0).isEqualTo(expected[i]);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 7, 500, Integer.MAX_VALUE})
    void correlationIsThatOfSpearman(int differentValues) {
        double[] a = values(differentValues, 1);
        double[] b = values(differentValues, 2);
        for (int i = 0; i < SAMPLES; i++) {
            b[i] -= 0.5 * a[i] * a[i] * a[i];
        }

        assertThat(Ranks.correlation(Ranks.doubled(a), Ranks.doubled(b)))
                .isCloseTo(new SpearmansCorrelation().correlation(a, b), within(1e-12))
                .isLessThan(-0.1);
    }

    @Test
    void risingAndFallingSidesCorrelateFully() {
        double[] a = values(Integer.MAX_VALUE, 3);
        double[] up = new double[SAMPLES];
        double[] down = new double[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            up[i] = Math.exp(a[i]);
            down[i] = -a[i];
        }

        assertThat(Ranks.correlation(Ranks.doubled(a), Ranks.doubled(up))).isCloseTo(1.0, within(1e-14));
        assertThat(Ranks.correlation(Ranks.doubled(a), Ranks.doubled(down))).isCloseTo(-1.0, within(1e-14));
        assertThat(Ranks.correlation(Ranks.doubled(a), Ranks.doubled(new double[SAMPLES])))
                .isNaN();
    }

    private static double[] values(int different, long seed) {
        return new SplittableRandom(seed)
                .ints(SAMPLES, 0, different)
                .mapToDouble(each -> each / (double) different)
                .toArray();
    }
}

package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.apache.commons.math3.stat.interval.ClopperPearsonInterval;
import org.apache.commons.math3.stat.interval.ConfidenceInterval;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The confidence interval of a share against Commons Math, closed forms at the ends and simulated studies. */
final class BuildShareTest {
    private static final int STUDIES = 4000;

    @ParameterizedTest
    @CsvSource({"1, 16", "8, 16", "15, 16", "37, 1000", "999, 1000", "4321, 100000", "9999990, 10000000"})
    void limitsAreThoseOfClopperAndPearson(int met, int builds) {
        ConfidenceInterval expected = new ClopperPearsonInterval().createInterval(builds, met, BuildShare.CONFIDENCE);
        BuildShare share = BuildShare.of(met, builds);

        assertThat(share.lowest()).isCloseTo(expected.getLowerBound(), within(1e-8));
        assertThat(share.highest()).isCloseTo(expected.getUpperBound(), within(1e-8));
        assertThat(share.share()).isStrictlyBetween(share.lowest(), share.highest());
    }

    /** Without a failure the lower limit is (alpha / 2)^(1/n): p^n is the chance of none. */
    @ParameterizedTest
    @ValueSource(ints = {16, 1000, 100_000, 10_000_000})
    void limitsWithoutAFailureOrASuccessHaveAClosedForm(int builds) {
        double limit = Math.pow((1.0 - BuildShare.CONFIDENCE) / 2.0, 1.0 / builds);

        assertThat(BuildShare.of(builds, builds).lowest()).isCloseTo(limit, within(1e-9));
        assertThat(BuildShare.of(builds, builds).highest()).isEqualTo(1.0);
        assertThat(BuildShare.of(0, builds).highest()).isCloseTo(1.0 - limit, within(1e-9));
        assertThat(BuildShare.of(0, builds).lowest()).isEqualTo(0.0);
    }

    /** Of {@value #STUDIES} simulated studies at least 95 % must cover, three standard errors of the simulation (1 %) granted. */
    @ParameterizedTest
    @CsvSource({"16, 0.5", "16, 0.9", "100, 0.02", "100, 0.7", "1000, 0.9998", "1000, 0.999", "1000, 0.95", "5000, 0.3"
    })
    void theIntervalCoversTheTrueShare(int builds, double truth) {
        SplittableRandom random = new SplittableRandom(20261203);
        int covered = 0;
        for (int study = 0; study < STUDIES; study++) {
            int met = 0;
            for (int build = 0; build < builds; build++) {
                met += random.nextDouble() < truth ? 1 : 0;
            }
            BuildShare share = BuildShare.of(met, builds);
            covered += share.lowest() <= truth && truth <= share.highest() ? 1 : 0;
        }
        assertThat((double) covered / STUDIES).isGreaterThanOrEqualTo(0.94);
    }
}

package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.scenario.SpreadShape;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** Sobol points against plain Monte Carlo: five spreads in all shapes, drawn here with other formulas, and two requirements. */
final class ToleranceMonteCarloTest {
    private static final int PLAIN = 100_000;
    private static final int MANY = 1 << 16;
    private static final int FEW = 1 << 10;
    private static final int STUDIES = 24;

    private static final Scenario SCENARIO = ToleranceScenarios.demanding();
    private static final List<ParameterSpread> SPREADS = ToleranceScenarios.several(SCENARIO);
    private static final List<FigureColumn> COLUMNS = ToleranceScenarios.figures(SCENARIO, "visibility.raw");

    private static ToleranceResult many;
    private static Plain plain;

    /** Counts and sums of independent builds. */
    private record Plain(double met, double visible, double keyed, double visibility, double visibilitySquare) {
        static Plain of(int builds, long seed) {
            SplittableRandom random = new SplittableRandom(seed);
            LinkPredictor predictor = new LinkPredictor();
            double[] sums = new double[5];
            for (int build = 0; build < builds; build++) {
                LinkPrediction prediction = predictor.of(built(random));
                double raw = prediction.fringe().raw();
                boolean visible = raw >= 0.90;
                boolean keyed = prediction.key().asymptoticPerSecond() >= 2500.0;
                sums[0] += visible && keyed ? 1.0 : 0.0;
                sums[1] += visible ? 1.0 : 0.0;
                sums[2] += keyed ? 1.0 : 0.0;
                sums[3] += raw;
                sums[4] += raw * raw;
            }
            return new Plain(sums[0] / builds, sums[1] / builds, sums[2] / builds, sums[3] / builds, sums[4] / builds);
        }

        double visibilityVariance() {
            return visibilitySquare - visibility * visibility;
        }
    }

    @BeforeAll
    static void run() {
        many = study(MANY, 1);
        plain = Plain.of(PLAIN, 99);
    }

    @Test
    void sharesAgree() {
        assertAgree(many.all().share(), plain.met());
        assertAgree(many.requirements().get(0).share().share(), plain.visible());
        assertAgree(many.requirements().get(1).share().share(), plain.keyed());
    }

    @Test
    void meanAndDeviationOfTheVisibilityAgree() {
        FigureStatistics visibility = many.figures().get(0);
        double deviation = Math.sqrt(plain.visibilityVariance());

        assertThat(visibility.mean()).isCloseTo(plain.visibility(), within(4.0 * deviation / Math.sqrt(PLAIN)));
        assertThat(visibility.standardDeviation() / deviation).isCloseTo(1.0, within(0.02));
    }

    /** Root mean square errors over {@value #STUDIES} seeds at equal numbers of builds, against the study of many builds. */
    @Test
    void sobolPointsErrLessThanIndependentOnes() {
        double[] shares = new double[2];
        double[] means = new double[2];
        for (int study = 0; study < STUDIES; study++) {
            ToleranceResult sobol = study(FEW, 100 + study);
            Plain independent = Plain.of(FEW, 100 + study);
            shares[0] += square(sobol.all().share() - many.all().share());
            shares[1] += square(independent.met() - many.all().share());
            means[0] +=
                    square(sobol.figures().get(0).mean() - many.figures().get(0).mean());
            means[1] += square(independent.visibility() - many.figures().get(0).mean());
        }
        assertThat(Math.sqrt(shares[0] / shares[1])).isLessThan(0.5);
        assertThat(Math.sqrt(means[0] / means[1])).isLessThan(0.1);
    }

    /** The interval is meant for independent builds; with Sobol points it must not cover less often. */
    @Test
    void theIntervalCoversTheShareOfManyBuilds() {
        int covered = 0;
        int studies = 200;
        for (int study = 0; study < studies; study++) {
            BuildShare share = study(200, 5000 + study).all();
            covered += share.lowest() <= many.all().share() && many.all().share() <= share.highest() ? 1 : 0;
        }
        assertThat(covered).isGreaterThanOrEqualTo(studies * 95 / 100);
    }

    private static void assertAgree(double found, double expected) {
        double error = Math.sqrt(expected * (1.0 - expected) / PLAIN);

        assertThat(expected).isBetween(0.1, 0.95);
        assertThat(found).isCloseTo(expected, within(4.0 * error));
    }

    private static ToleranceResult study(int samples, long seed) {
        return new Tolerance(SCENARIO, SPREADS, samples, seed, COLUMNS).run(Execution.SINGLE);
    }

    /** One build with spreads as in {@link ToleranceScenarios#several}: a sum of two uniform numbers is triangular, values out of range are drawn again. */
    private static Scenario built(SplittableRandom random) {
        Scenario built = SCENARIO;
        for (ParameterSpread spread : SPREADS) {
            Parameter parameter = spread.parameter();
            double planned = parameter.value(SCENARIO).orElseThrow();
            double width = spread.spread().width() * (spread.spread().relative() ? planned : 1.0);
            double value = planned + width * standard(spread.spread().shape(), random);
            while (!parameter.range().contains(value)) {
                value = planned + width * standard(spread.spread().shape(), random);
            }
            built = parameter.with(built, value);
        }
        return built;
    }

    private static double standard(SpreadShape shape, SplittableRandom random) {
        return switch (shape) {
            case NORMAL -> random.nextGaussian();
            case UNIFORM -> random.nextDouble(-1.0, 1.0);
            case TRIANGULAR -> random.nextDouble() + random.nextDouble() - 1.0;
        };
    }

    private static double square(double value) {
        return value * value;
    }
}

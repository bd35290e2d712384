package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.SpreadShape;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.distribution.RealDistribution;
import org.apache.commons.math3.distribution.TriangularDistribution;
import org.apache.commons.math3.distribution.UniformRealDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Tolerance studies whose answer has a closed form: one parameter through a monotone figure, whose limit is bisected here on single predictions, and figures
 * that are sums of spread parameters.
 */
final class ToleranceClosedFormTest {
    private static final int SAMPLES = 1 << 14;
    private static final double CLOSE = 3e-4;
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final String OVERLAP = "alice.analyzer.polarizationOverlap";

    /** The visibility falls with the mean pairs; planned are 0.03, and the limit lies where it is {@code required}. */
    @ParameterizedTest
    @EnumSource(SpreadShape.class)
    void shareOfOneSpreadThroughAFallingFigure(SpreadShape shape) {
        Scenario scenario = ToleranceScenarios.requiring("rawVisibilityAtLeast", 0.9373);
        double limit =
                limit(scenario, PAIRS, 0.001, 0.2, p -> 0.9373 - p.fringe().raw());
        double width = 0.004;

        assertShare(
                scenario,
                ToleranceScenarios.absolute(scenario, PAIRS, shape, width),
                distribution(shape, 0.03, width).cumulativeProbability(limit));
    }

    /** The key rate falls with the length, of which 60 km are planned. */
    @ParameterizedTest
    @EnumSource(SpreadShape.class)
    void shareOfASpreadLength(SpreadShape shape) {
        Scenario scenario = ToleranceScenarios.requiring("keyRateAtLeastBps", 2600.0);
        double limit = limit(
                scenario, "link.lengthKm", 1.0, 150.0, p -> 2600.0 - p.key().asymptoticPerSecond());

        assertShare(
                scenario,
                ToleranceScenarios.relative(scenario, "link.lengthKm", shape, 0.05),
                distribution(shape, 60.0, 3.0).cumulativeProbability(limit));
    }

    /** The overlap cannot exceed 1, so that its spread about 0.99 is cut there and the rest scaled up. */
    @ParameterizedTest
    @ValueSource(doubles = {0.90, 0.92, 0.93})
    void shareOfATruncatedSpread(double required) {
        Scenario scenario =
                SampleScenarios.with(ToleranceScenarios.requiring("rawVisibilityAtLeast", required), OVERLAP, 0.99);
        double limit = limit(scenario, OVERLAP, 0.5, 1.0, p -> p.fringe().raw() - required);
        RealDistribution whole = new NormalDistribution(0.99, 0.02);
        double inside = whole.cumulativeProbability(1.0);

        assertShare(
                scenario,
                ToleranceScenarios.absolute(scenario, OVERLAP, SpreadShape.NORMAL, 0.02),
                (inside - whole.cumulativeProbability(limit)) / inside);
    }

    /** The loss of an arm is the spread margin and a constant. */
    @Test
    void quantilesOfAFigureThatFollowsItsParameter() {
        Scenario scenario =
                SampleScenarios.with(SampleScenarios.build(SampleScenarios.pulsePair()), "alice.repairMarginDb", 3.0);
        FigureStatistics loss = losses(
                scenario, ToleranceScenarios.absolute(scenario, "alice.repairMarginDb", SpreadShape.NORMAL, 0.4));
        double planned = LinkPredictor.predict(scenario).pathA().lossDb();
        RealDistribution expected = new NormalDistribution(planned, 0.4);

        assertThat(loss.mean()).isCloseTo(planned, within(1e-4));
        assertThat(loss.standardDeviation()).isCloseTo(0.4, within(1e-3));
        assertQuantiles(loss, expected, 2e-3);
    }

    /** Two independent uniform numbers of the same width add to a triangular one. */
    @Test
    void quantilesOfTheSumOfTwoParameters() {
        Scenario scenario =
                SampleScenarios.with(SampleScenarios.build(SampleScenarios.pulsePair()), "alice.repairMarginDb", 3.0);
        scenario = SampleScenarios.with(scenario, "alice.sourceCouplingLossDb", 2.0);
        FigureStatistics loss = losses(
                scenario,
                ToleranceScenarios.absolute(scenario, "alice.repairMarginDb", SpreadShape.UNIFORM, 0.5),
                ToleranceScenarios.absolute(scenario, "alice.sourceCouplingLossDb", SpreadShape.UNIFORM, 0.5));
        double planned = LinkPredictor.predict(scenario).pathA().lossDb();

        assertThat(loss.standardDeviation()).isCloseTo(Math.sqrt(1.0 / 6.0), within(1e-3));
        assertQuantiles(loss, new TriangularDistribution(planned - 1.0, planned, planned + 1.0), 3e-3);
    }

    /** Decibels of both arms take the same away from the logarithm of the key rate, so that their indices go as their variances: 4 to 1. */
    @Test
    void indicesOfAMarginThatIsNearlyASum() {
        Scenario scenario = ToleranceScenarios.requiring("keyRateAtLeastBps", 500.0);
        scenario = SampleScenarios.with(scenario, "both.repairMarginDb", 3.0);
        ToleranceResult result = run(
                scenario,
                List.of(),
                ToleranceScenarios.absolute(scenario, "alice.repairMarginDb", SpreadShape.NORMAL, 0.2),
                ToleranceScenarios.absolute(scenario, "bob.repairMarginDb", SpreadShape.NORMAL, 0.4));
        FailureDriver bob = result.drivers().stream()
                .filter(each -> each.path().startsWith("bob"))
                .findFirst()
                .orElseThrow();

        assertThat(bob.margin().share()).isCloseTo(0.8, within(0.005));
        assertThat(bob.correlation()).isCloseTo(6.0 / Math.PI * -Math.asin(Math.sqrt(0.8) / 2.0), within(0.005));
    }

    private static void assertShare(Scenario scenario, ParameterSpread spread, double expected) {
        BuildShare share = run(scenario, List.of(), spread).all();

        assertThat(expected).isBetween(0.05, 0.95);
        assertThat(share.share()).isCloseTo(expected, within(CLOSE));
        assertThat(expected).isBetween(share.lowest(), share.highest());
    }

    private static FigureStatistics losses(Scenario scenario, ParameterSpread... spreads) {
        return run(scenario, ToleranceScenarios.figures(scenario, "alice.lossDb"), spreads)
                .figures()
                .get(0);
    }

    private static void assertQuantiles(FigureStatistics found, RealDistribution expected, double precision) {
        for (int i = 0; i < FigureStatistics.SHARES.size(); i++) {
            double share = FigureStatistics.SHARES.get(i);
            assertThat(found.quantiles().get(i))
                    .isCloseTo(expected.inverseCumulativeProbability(share), within(precision));
        }
    }

    private static ToleranceResult run(Scenario scenario, List<FigureColumn> columns, ParameterSpread... spreads) {
        return new Tolerance(scenario, List.of(spreads), SAMPLES, 1, columns).run(Execution.SINGLE);
    }

    private static RealDistribution distribution(SpreadShape shape, double planned, double width) {
        return switch (shape) {
            case NORMAL -> new NormalDistribution(planned, width);
            case UNIFORM -> new UniformRealDistribution(planned - width, planned + width);
            case TRIANGULAR -> new TriangularDistribution(planned - width, planned, planned + width);
        };
    }

    /** Where a rising function of the prediction passes 0, by halving. */
    private static double limit(
            Scenario scenario, String path, double from, double to, ToDoubleFunction<LinkPrediction> rising) {
        double low = from;
        double high = to;
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2.0;
            LinkPrediction prediction = LinkPredictor.predict(SampleScenarios.with(scenario, path, middle));
            if (rising.applyAsDouble(prediction) < 0.0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }
}

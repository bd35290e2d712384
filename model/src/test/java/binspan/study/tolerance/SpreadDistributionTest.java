package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import java.util.Comparator;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Distributions of spread parameters against closed forms, the normal one against Commons Math. */
final class SpreadDistributionTest {
    private static final Scenario SCENARIO = SampleScenarios.build(SampleScenarios.pulsePair());
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final String OVERLAP = "alice.analyzer.polarizationOverlap";

    @ParameterizedTest
    @ValueSource(doubles = {1e-9, 0.001, 0.2, 0.5, 0.77, 0.9999})
    void normalValuesAreThoseOfTheNormalDistribution(double share) {
        SpreadDistribution spread = distribution(PAIRS, SpreadShape.NORMAL, 0.002, false);

        assertThat(only(spread).at(share))
                .isCloseTo(new NormalDistribution(0.03, 0.002).inverseCumulativeProbability(share), within(1e-10));
        assertThat(spread.cutShare()).isLessThan(1e-12);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-9, 0.001, 0.2, 0.5, 0.77, 0.9999})
    void uniformAndTriangularValuesFollowTheirClosedForms(double share) {
        double uniform = 0.03 + 0.01 * (2.0 * share - 1.0);
        double sided = share < 0.5 ? Math.sqrt(2.0 * share) - 1.0 : 1.0 - Math.sqrt(2.0 - 2.0 * share);

        assertThat(only(distribution(PAIRS, SpreadShape.UNIFORM, 0.01, false)).at(share))
                .isCloseTo(uniform, within(1e-14));
        assertThat(only(distribution(PAIRS, SpreadShape.TRIANGULAR, 0.01, false))
                        .at(share))
                .isCloseTo(0.03 + 0.01 * sided, within(1e-14));
    }

    /** Of a normal distribution about 0.99 with a deviation of 0.02 the part above 1 is cut off and the rest scaled up. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-9, 0.001, 0.2, 0.5, 0.77, 0.9999})
    void whatLiesOutsideOfTheRangeIsCutOff(double share) {
        Scenario scenario = SampleScenarios.with(SCENARIO, OVERLAP, 0.99);
        SpreadDistribution spread = SpreadDistribution.of(
                scenario, ToleranceScenarios.absolute(scenario, OVERLAP, SpreadShape.NORMAL, 0.02));
        NormalDistribution whole = new NormalDistribution(0.99, 0.02);
        double inside = whole.cumulativeProbability(1.0);

        assertThat(spread.cutShare()).isCloseTo(1.0 - inside, within(1e-12));
        assertThat(only(spread).at(share)).isCloseTo(whole.inverseCumulativeProbability(share * inside), within(1e-9));
        assertThat(only(spread).at(share)).isLessThanOrEqualTo(1.0);
    }

    @ParameterizedTest
    @CsvSource({"NORMAL, 0.5", "UNIFORM, 0.5", "TRIANGULAR, 0.5"})
    void halfOfAShapeIsCutWhereThePlannedValueIsTheEnd(SpreadShape shape, double cut) {
        SpreadDistribution spread = distribution(OVERLAP, shape, 0.1, false);

        assertThat(spread.cutShare()).isCloseTo(cut, within(1e-12));
        assertThat(only(spread).at(1.0 - 1e-16)).isLessThanOrEqualTo(1.0);
    }

    /** A window of 400 ps that comes out by up to 500 ps wider or narrower is cut at its least width of 0.001 ps. */
    @Test
    void theLowerEndIsKeptAsWell() {
        SpreadDistribution spread = distribution("timing.windowWidthPs", SpreadShape.UNIFORM, 500.0, false);

        assertThat(spread.cutShare()).isCloseTo(0.100001, within(1e-9));
        assertThat(only(spread).at(1e-300)).isEqualTo(1e-3);
        assertThat(only(spread).at(0.5)).isCloseTo((1e-3 + 900.0) / 2.0, within(1e-9));
    }

    @Test
    void relativeWidthsAreSharesOfThePlannedValue() {
        SpreadDistribution relative = distribution(PAIRS, SpreadShape.NORMAL, 0.1, true);

        assertThat(relative.planned()).isEqualTo(0.03);
        assertThat(relative.width()).isCloseTo(0.003, within(1e-17));
        assertThat(only(relative).at(0.9))
                .isEqualTo(only(distribution(PAIRS, SpreadShape.NORMAL, 0.1 * 0.03, false))
                        .at(0.9));
    }

    @Test
    void aNegativePlannedValueHasAWidthAboveZero() {
        Scenario scenario = SampleScenarios.with(SCENARIO, "alice.analyzer.mismatchPs", -2.0);
        SpreadDistribution spread = SpreadDistribution.of(
                scenario,
                ToleranceScenarios.relative(scenario, "alice.analyzer.mismatchPs", SpreadShape.UNIFORM, 0.25));

        assertThat(spread.width()).isEqualTo(0.5);
        assertThat(only(spread).at(0.25)).isCloseTo(-2.25, within(1e-14));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "alice.analyzer.mismatchPs | planned at 0, of which a relative spread is nothing; state an absolute one",
                "source.schmidtNumber | left to be computed here; state the value that it spreads about",
                "acquisition.fringePoints | a whole number cannot spread",
                "require.keyRateAtLeastBps | a requirement is the same for every build; only the link can spread",
                "source.pairRatePerSecond | does not go with a pulse-pair pump; vary source.meanPairsPerCycle",
            })
    void whatCannotSpreadIsRefusedWithItsPath(String path, String reason) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> distribution(path, SpreadShape.NORMAL, 0.1, true))
                .withMessage(path + ": " + reason);
    }

    /** Efficiencies of 0.8 and one of 0.5: all deviate by the same share of their own, absolute spreads by the same number. */
    @Test
    void valuesThatDifferDeviateFromTheirOwnPlans() {
        Scenario scenario = SampleScenarios.with(SCENARIO, "bob.detectors.efficiency", 0.6);
        scenario = SampleScenarios.with(scenario, "bob.detectors[1].efficiency", 0.5);
        double alice = ParameterPaths.find(scenario, "alice.detectors.efficiency")
                .value(scenario)
                .orElseThrow();
        SpreadDistribution relative = SpreadDistribution.of(
                scenario, ToleranceScenarios.relative(scenario, "both.detectors.efficiency", SpreadShape.UNIFORM, 0.1));
        SpreadDistribution absolute = SpreadDistribution.of(
                scenario, ToleranceScenarios.absolute(scenario, "bob.detectors.efficiency", SpreadShape.UNIFORM, 0.1));

        assertThat(relative.places())
                .extracting(each -> each.parameter().path())
                .containsExactly(
                        "alice.detectors[0].efficiency",
                        "alice.detectors[1].efficiency",
                        "bob.detectors[0].efficiency",
                        "bob.detectors[1].efficiency");
        assertThat(relative.places().stream().mapToDouble(each -> each.at(0.75)))
                .usingElementComparator(nearly())
                .containsExactly(1.05 * alice, 1.05 * alice, 1.05 * 0.6, 1.05 * 0.5);
        assertThat(absolute.places().stream().mapToDouble(each -> each.at(0.75)))
                .usingElementComparator(nearly())
                .containsExactly(0.65, 0.55);
        assertThat(relative.planned()).isEqualTo(alice);
        assertThat(relative.width()).isCloseTo(0.1 * alice, within(1e-15));
    }

    private static Comparator<Double> nearly() {
        return (a, b) -> Math.abs(a - b) <= 1e-14 ? 0 : Double.compare(a, b);
    }

    /** Of bob's overlap of 1 half is cut off, of alice's 0.9 nearly nothing: the larger share is told. */
    @Test
    void theLargestCutShareOfValuesThatDifferIsReported() {
        Scenario scenario = SampleScenarios.with(SCENARIO, OVERLAP, 0.9);
        SpreadDistribution spread = SpreadDistribution.of(
                scenario,
                ToleranceScenarios.absolute(scenario, "both.analyzer.polarizationOverlap", SpreadShape.NORMAL, 0.02));

        assertThat(spread.cutShare()).isCloseTo(0.5, within(1e-12));
    }

    @Test
    void aPlannedValueOf0AmongOthersIsRefusedByItsOwnPath() {
        Scenario scenario = SampleScenarios.with(SCENARIO, "alice.analyzer.mismatchPs", 0.5);

        assertThatIllegalArgumentException()
                .isThrownBy(() -> SpreadDistribution.of(
                        scenario,
                        ToleranceScenarios.relative(scenario, "both.analyzer.mismatchPs", SpreadShape.NORMAL, 0.1)))
                .withMessage("bob.analyzer.mismatchPs: planned at 0, of which a relative spread is nothing; state an"
                        + " absolute one");
    }

    @Test
    void malformedSpreadsAreRefused() {
        Spread two = new Spread(OptionalDouble.of(1.0), OptionalDouble.of(1.0), OptionalDouble.empty(), false);
        Spread none = new Spread(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), false);

        assertThatIllegalArgumentException()
                .isThrownBy(() -> ToleranceScenarios.spread(SCENARIO, PAIRS, two))
                .withMessage(PAIRS + ": found 2 shapes; allowed one of normal, uniform, triangular");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ToleranceScenarios.spread(SCENARIO, PAIRS, none))
                .withMessage(PAIRS + ": found 0 shapes; allowed one of normal, uniform, triangular");
        for (double width : new double[] {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatIllegalArgumentException()
                    .isThrownBy(() -> ToleranceScenarios.absolute(SCENARIO, PAIRS, SpreadShape.NORMAL, width))
                    .withMessage(PAIRS + ": found a spread of " + width + "; allowed above 0");
        }
    }

    @Test
    void addedSpreadsTakeThePlaceOfStatedOnesOrFollowThem() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.everything());
        Spread wide = Spread.of(SpreadShape.UNIFORM, 0.2, true);

        assertThat(ParameterSpread.of(scenario, Map.of()))
                .extracting(
                        each -> each.parameter().path(), each -> each.spread().width())
                .containsExactly(org.assertj.core.groups.Tuple.tuple("both.detectors.efficiency", 0.05));
        assertThat(ParameterSpread.of(scenario, Map.of("both.detectors.efficiency", wide)))
                .extracting(ParameterSpread::spread)
                .containsExactly(wide);
        assertThat(ParameterSpread.of(scenario, Map.of(PAIRS, wide)))
                .extracting(each -> each.parameter().path())
                .containsExactly("both.detectors.efficiency", PAIRS);
    }

    @Test
    void anUnknownPathIsRefusedWithTheNearest() {
        Spread spread = Spread.of(SpreadShape.UNIFORM, 0.2, true);

        assertThatIllegalArgumentException()
                .isThrownBy(() -> ParameterSpread.of(SCENARIO, Map.of("source.meanPairsPerCicle", spread)))
                .withMessageContaining("did you mean meanPairsPerCycle");
    }

    private static SpreadDistribution distribution(String path, SpreadShape shape, double width, boolean relative) {
        return SpreadDistribution.of(
                SCENARIO, ToleranceScenarios.spread(SCENARIO, path, Spread.of(shape, width, relative)));
    }

    private static PlacedSpread only(SpreadDistribution spread) {
        assertThat(spread.places()).hasSize(1);
        return spread.places().get(0);
    }
}

package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.prediction.RequirementOutcome;
import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.SpreadShape;
import binspan.scenario.Values;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.Progress;
import binspan.study.StudyTable;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What a tolerance study returns, that it depends on its description alone, and what it refuses. */
final class ToleranceTest {
    private static final Scenario SCENARIO = ToleranceScenarios.demanding();
    private static final List<ParameterSpread> SPREADS = ToleranceScenarios.several(SCENARIO);
    private static final List<FigureColumn> COLUMNS = ToleranceScenarios.figures(SCENARIO, "visibility", "alice");
    private static final String PAIRS = "source.meanPairsPerCycle";

    @Test
    void theSameSeedGivesTheSameBitsOnAnyNumberOfThreads() {
        Tolerance study = new Tolerance(SCENARIO, SPREADS, 3000, 7, COLUMNS);
        ToleranceResult one = study.run(Execution.SINGLE);
        ToleranceResult three = study.run(new Execution(3, Progress.NONE, 0.0, 1.0));

        assertThat(three.table().numbers()).containsExactly(one.table().numbers());
        assertThat(three.leastMargins()).containsExactly(one.leastMargins());
        for (int i = 0; i < one.requirements().size(); i++) {
            assertThat(three.margins(i)).containsExactly(one.margins(i));
            assertThat(three.predicted(i)).containsExactly(one.predicted(i));
        }
        assertThat(three.all()).isEqualTo(one.all());
        assertThat(three.requirements()).isEqualTo(one.requirements());
        assertThat(three.drivers()).isEqualTo(one.drivers());
        assertThat(three.figures()).extracting(FigureStatistics::quantiles).isEqualTo(quantiles(one));
    }

    @Test
    void otherSeedsGiveOtherBuildsAndNearlyTheSameAnswer() {
        ToleranceResult one = new Tolerance(SCENARIO, SPREADS, 2048, 1, COLUMNS).run(Execution.SINGLE);
        ToleranceResult two = new Tolerance(SCENARIO, SPREADS, 2048, 2, COLUMNS).run(Execution.SINGLE);

        assertThat(two.table().variedOf(0)).isNotEqualTo(one.table().variedOf(0));
        assertThat(two.all().share()).isCloseTo(one.all().share(), within(0.02));
    }

    /** Each row of the table against a prediction of its own and the outcomes of a check. */
    @Test
    void everyBuildIsWhatACheckOfItsValuesFinds() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair()
                .put(
                        "require",
                        new Values()
                                .put("rawVisibilityAtLeast", 0.92)
                                .put("keyRateAtLeastBps", 2500.0)
                                .put("firstKeyWithinHours", 1.0)
                                .put("fiveSigmaWithinHours", 1.0)));
        List<FigureColumn> columns = FigureColumns.all(scenario);
        ToleranceResult result =
                new Tolerance(scenario, ToleranceScenarios.several(scenario), 16, 3, columns).run(Execution.SINGLE);
        int met = 0;
        for (int row = 0; row < result.table().rows(); row++) {
            LinkCheck check = LinkCheck.of(built(scenario, result.table(), row));
            assertRow(result, row, check);
            met += check.met() ? 1 : 0;
        }
        assertThat(result.all()).isEqualTo(BuildShare.of(met, 16));
        assertThat(result.table().met()).isEqualTo(met).isBetween(1, 15);
    }

    private static void assertRow(ToleranceResult result, int row, LinkCheck check) {
        LinkPrediction prediction = check.prediction();
        FiniteKeyOutlook finite = FiniteKeyOutlook.of(prediction);
        StudyTable table = result.table();
        for (int i = 0; i < table.columns().size(); i++) {
            assertThat(table.figure(i, row)).isEqualTo(table.columns().get(i).of(prediction, finite));
        }
        for (int i = 0; i < result.requirements().size(); i++) {
            RequirementOutcome outcome = check.outcomes().get(i);
            assertThat(result.requirements().get(i).requirement()).isEqualTo(outcome.requirement());
            assertThat(result.requirements().get(i).required()).isEqualTo(outcome.required());
            assertThat(result.predicted(i)[row]).isEqualTo(outcome.predicted().orElse(result.predicted(i)[row]));
            assertThat(result.margins(i)[row] >= 0.0).isEqualTo(outcome.met());
        }
        assertThat(table.meets(row)).isEqualTo(check.met());
        assertThat(result.leastMargins()[row])
                .isEqualTo(
                        RequirementMargins.of(prediction.scenario().require()).least(prediction));
    }

    private static Scenario built(Scenario scenario, StudyTable table, int row) {
        Scenario built = scenario;
        for (int i = 0; i < table.paths().size(); i++) {
            built = SampleScenarios.with(built, table.paths().get(i), table.varied(i, row));
        }
        return built;
    }

    @Test
    void whereEveryBuildFailsNoSpreadIsToBlame() {
        Scenario scenario = ToleranceScenarios.requiring("keyRateAtLeastBps", 1e12);
        ToleranceResult result =
                new Tolerance(scenario, ToleranceScenarios.several(scenario), 64, 1, List.of()).run(Execution.SINGLE);

        assertThat(result.all()).isEqualTo(BuildShare.of(0, 64));
        assertThat(result.someFail()).isFalse();
        assertThat(result.drivers())
                .allMatch(each -> Double.isNaN(each.failure().share()));
    }

    /** Many more pairs leave builds without any key: their first key takes for ever. */
    @Test
    void buildsWithoutAKeyAreCountedAsInfinite() {
        Scenario scenario = ToleranceScenarios.requiring("firstKeyWithinHours", 1.0);
        ToleranceResult result = new Tolerance(
                        scenario,
                        List.of(ToleranceScenarios.absolute(scenario, PAIRS, SpreadShape.UNIFORM, 0.5)),
                        64,
                        1,
                        ToleranceScenarios.figures(scenario, "key.secondsToFirstKey"))
                .run(Execution.SINGLE);
        int without = (int) Arrays.stream(result.predicted(0))
                .filter(hours -> hours == Double.POSITIVE_INFINITY)
                .count();

        assertThat(without).isBetween(1, 63);
        assertThat(result.figures().get(0).infinite()).isEqualTo(without);
        assertThat(result.figures().get(0).mean()).isFinite();
        assertThat(result.predicted(0)[0] * 3600.0).isEqualTo(result.table().figure(0, 0));
    }

    @Test
    void driversAreRankedByWhatMakesBuildsFail() {
        ToleranceResult result = new Tolerance(SCENARIO, SPREADS, 4096, 1, List.of()).run(Execution.SINGLE);
        List<Double> indices =
                result.drivers().stream().map(each -> each.failure().share()).toList();

        assertThat(result.someFail()).isTrue();
        assertThat(indices).isSortedAccordingTo((a, b) -> Double.compare(b, a));
        assertThat(result.drivers())
                .extracting(FailureDriver::path)
                .hasSameElementsAs(result.table().paths());
        assertThat(result.drivers()).allMatch(each -> each.correlations().size() == 2);
        assertThat(driver(result, PAIRS).correlations().get(0)).isLessThan(-0.5);
        assertThat(driver(result, "bob.repairMarginDb").correlations().get(1)).isLessThan(-0.2);
        assertThat(driver(result, "alice.detectors.efficiency").correlations().get(1))
                .isGreaterThan(0.05);
    }

    /** The overlap scatters the visibility by 0.011, the mean pairs by 0.008, the rest by far less. */
    @Test
    void driversAreRankedByTheMarginWhereNoBuildFails() {
        Scenario scenario = ToleranceScenarios.requiring("rawVisibilityAtLeast", 0.5);
        ToleranceResult result =
                new Tolerance(scenario, ToleranceScenarios.several(scenario), 4096, 1, List.of()).run(Execution.SINGLE);
        List<Double> indices =
                result.drivers().stream().map(each -> each.margin().share()).toList();

        assertThat(result.all().share()).isEqualTo(1.0);
        assertThat(indices).isSortedAccordingTo((a, b) -> Double.compare(b, a));
        assertThat(result.drivers().get(0).path()).isEqualTo("alice.analyzer.polarizationOverlap");
    }

    @Test
    void withoutRequirementsEveryBuildMeetsThemAndNothingDrivesFailures() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair());
        ToleranceResult result =
                new Tolerance(scenario, ToleranceScenarios.several(scenario), 64, 1, COLUMNS).run(Execution.SINGLE);

        assertThat(result.all().share()).isEqualTo(1.0);
        assertThat(result.requirements()).isEmpty();
        assertThat(result.drivers())
                .extracting(FailureDriver::path)
                .isEqualTo(result.table().paths());
        assertThat(result.drivers()).allMatch(each -> Double.isNaN(each.correlation()));
        assertThat(result.figures()).hasSameSizeAs(COLUMNS);
    }

    @Test
    void theCutShareOfEachSpreadIsReported() {
        ToleranceResult result = new Tolerance(SCENARIO, SPREADS, 16, 1, List.of()).run(Execution.SINGLE);

        assertThat(result.distributions())
                .extracting(each -> each.parameter().path())
                .isEqualTo(result.table().paths());
        assertThat(result.distributions().get(4).cutShare()).isEqualTo(0.5);
        assertThat(result.distributions().get(0).cutShare()).isLessThan(1e-9);
    }

    @Test
    void progressRisesToOneAndTheStudyStopsWhenAsked() {
        List<Double> shares = new ArrayList<>();
        AtomicInteger calls = new AtomicInteger();
        Progress listening = listener(shares, calls, Integer.MAX_VALUE);
        Tolerance study = new Tolerance(SCENARIO, SPREADS, 5000, 1, COLUMNS);
        study.run(new Execution(1, listening, 0.0, 1.0));

        assertThat(shares).isSorted().last().isEqualTo(1.0);
        assertThatThrownBy(() -> study.run(new Execution(2, listener(shares, new AtomicInteger(), 3), 0.0, 1.0)))
                .isInstanceOf(CancellationException.class);
    }

    private static Progress listener(List<Double> shares, AtomicInteger calls, int most) {
        return new Progress() {
            @Override
            public void reached(double share) {
                synchronized (shares) {
                    shares.add(share);
                }
            }

            @Override
            public boolean cancelled() {
                return calls.incrementAndGet() > most;
            }
        };
    }

    @Test
    void nothingSpreadIsRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Tolerance(SCENARIO, List.of(), 1000, 1, COLUMNS))
                .withMessage("found 0 spread parameters; allowed 1 to 1000: state them in the scenario's spread section"
                        + " or add one");
    }

    @ParameterizedTest
    @ValueSource(ints = {-1, 0, 15, 10_000_001})
    void aNumberOfSamplesOutOfRangeIsRefused(int samples) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Tolerance(SCENARIO, SPREADS, samples, 1, COLUMNS))
                .withMessage("found " + samples + " samples; allowed 16 to 10000000");
    }

    /** Five values, five columns, two margins, two required figures and the least margin make 5 + 4 + 1 numbers without a column. */
    @Test
    void moreNumbersThanMemoryIsMeantForAreRefused() {
        assertThat(new Tolerance(SCENARIO, SPREADS, 5_000_000, 1, List.of()).samples())
                .isEqualTo(5_000_000);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Tolerance(SCENARIO, SPREADS, 5_000_001, 1, List.of()))
                .withMessage(
                        "found 5.00e+07 numbers of all builds; allowed 50000000: take fewer samples or fewer figures");
    }

    @ParameterizedTest
    @CsvSource({
        "both.detectors.efficiency, bob.detectors.efficiency",
        "both.detectors.efficiency, bob.detectors[1].efficiency",
        "alice.detectors.efficiency, alice.detectors[1].efficiency",
        "alice.detectors[1].efficiency, both.detectors.efficiency",
        "link.lengthKm, alice.path.cable.lengthKm",
        "alice.path[0].lengthKm, alice.path.cable.lengthKm"
    })
    void spreadsThatMoveEachOtherAreRefused(String first, String second) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> study(first, second))
                .withMessage(first + ": moved by " + second + " as well; vary one of them");
    }

    /** What the first moves is moved by the third; the second has nothing to do with it. */
    @Test
    void onlyTheSpreadThatMovesAnotherIsNamed() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Tolerance(
                        SCENARIO,
                        List.of(
                                ToleranceScenarios.relative(SCENARIO, "link.lengthKm", SpreadShape.UNIFORM, 0.1),
                                SPREADS.get(0),
                                ToleranceScenarios.absolute(
                                        SCENARIO, "bob.path[0].lengthKm", SpreadShape.UNIFORM, 1.0)),
                        16,
                        1,
                        COLUMNS))
                .withMessage("link.lengthKm: moved by bob.path[0].lengthKm as well; vary one of them");
    }

    /** Bob's detectors are planned half as efficient; together with alice's they scatter by the same share. */
    @Test
    void valuesThatAreMovedTogetherKeepTheirPlans() {
        Scenario scenario = SampleScenarios.with(SCENARIO, "bob.detectors.efficiency", 0.4);
        ToleranceResult result = new Tolerance(
                        scenario,
                        List.of(
                                ToleranceScenarios.absolute(scenario, "bob.repairMarginDb", SpreadShape.UNIFORM, 1.0),
                                ToleranceScenarios.relative(
                                        scenario, "both.detectors.efficiency", SpreadShape.UNIFORM, 0.05)),
                        16,
                        1,
                        ToleranceScenarios.figures(scenario, "bob.singlesPerSecond[0]"))
                .run(Execution.SINGLE);
        double planned = ParameterPaths.find(scenario, "alice.detectors.efficiency")
                .value(scenario)
                .orElseThrow();
        for (int row = 0; row < 16; row++) {
            double alice = result.table().varied(1, row);
            Scenario built = SampleScenarios.with(
                    scenario, "bob.repairMarginDb", result.table().varied(0, row));
            built = SampleScenarios.with(built, "alice.detectors.efficiency", alice);
            built = SampleScenarios.with(built, "bob.detectors.efficiency", 0.4 * alice / planned);

            assertThat(result.table().figure(0, row))
                    .isCloseTo(
                            LinkPredictor.predict(built)
                                    .counts()
                                    .loadsB()
                                    .get(0)
                                    .recordedPerSecond(),
                            withinPercentage(1e-9));
        }
    }

    @Test
    void aPathNamedTwiceIsRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> study(PAIRS, PAIRS))
                .withMessage(PAIRS + ": found twice; allowed once");
    }

    @Test
    void whatCannotSpreadIsRefusedAtOnce() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> study("source.pairRatePerSecond", PAIRS))
                .withMessageContaining("does not go with a pulse-pair pump; vary source.meanPairsPerCycle");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> study("acquisition.fringePoints", PAIRS))
                .withMessage("acquisition.fringePoints: a whole number cannot spread");
    }

    private static Tolerance study(String first, String second) {
        return new Tolerance(
                SCENARIO,
                List.of(
                        ToleranceScenarios.relative(SCENARIO, first, SpreadShape.UNIFORM, 0.1),
                        ToleranceScenarios.relative(SCENARIO, second, SpreadShape.UNIFORM, 0.1)),
                100,
                1,
                COLUMNS);
    }

    @Test
    void figuresOfRequirementsBearTheirNamesAndUnits() {
        LinkPrediction prediction = LinkPredictor.predict(SCENARIO);

        for (Requirement requirement : Requirement.stateable()) {
            assertThat(requirement.figure().name()).isEqualTo(requirement.fieldName());
            assertThat(requirement.figure().unit()).isEqualTo(requirement.unit());
        }
        assertThat(Requirement.CAR.figure().reading().at(prediction, null, 0))
                .isEqualTo(prediction.fringe().car());
    }

    private static FailureDriver driver(ToleranceResult result, String path) {
        return result.drivers().stream()
                .filter(each -> each.path().equals(path))
                .findFirst()
                .orElseThrow();
    }

    private static List<List<Double>> quantiles(ToleranceResult result) {
        return result.figures().stream().map(FigureStatistics::quantiles).toList();
    }
}

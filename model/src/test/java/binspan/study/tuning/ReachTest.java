package binspan.study.tuning;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.LinkPredictor;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.PointEvaluator;
import binspan.study.Progress;
import binspan.study.StudyScenarios;
import binspan.study.StudyTable;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Reach against dense scans over length and settings. */
final class ReachTest {
    private static final LinkLength LENGTH = new LinkLength();
    private static final String[] SETTINGS = {"source.meanPairsPerCycle", "timing.windowWidthPs"};

    private static Reach.Outcome reach(Scenario scenario, List<Axis> free) {
        List<FigureColumn> columns = FigureColumns.named(
                scenario, List.of("visibility.raw", "key.asymptoticBps", "key.repeaterlessBoundBps"));
        return new Reach(scenario, free, Objective.KEY, columns).run(Execution.parallel(Progress.NONE));
    }

    /** Steps of ten metres from far beyond down to the first length that holds. */
    private static double scanned(Scenario scenario, RequirementMargins margins, double from) {
        LinkPredictor predictor = new LinkPredictor();
        for (int i = (int) (from * 100.0); i >= 0; i--) {
            if (margins.met(predictor.of(LENGTH.with(scenario, i / 100.0)))) {
                return i / 100.0;
            }
        }
        return Double.NaN;
    }

    @Test
    void limitsAsWrittenAreThoseOfADenseScan() {
        Scenario scenario = StudyScenarios.modest();
        Reach.Outcome outcome = reach(scenario, List.of());
        assertThat(outcome.retuned()).isNull();
        for (Reach.Limit limit : outcome.limits()) {
            RequirementMargins margins = RequirementMargins.of(
                    List.of(limit.goal().requirement()), limit.goal().required());
            double scanned = scanned(scenario, margins, 600.0);
            assertThat(limit.asWrittenKm().orElse(Double.NaN))
                    .as(limit.goal().requirement().fieldName())
                    .isBetween(scanned, scanned + 0.01);
        }
        double all = scanned(scenario, RequirementMargins.of(scenario.require()), 600.0);
        assertThat(outcome.all().asWrittenKm().orElseThrow()).isBetween(all, all + 0.01);
    }

    /** Just inside the re-tuned limit some settings of a dense grid hold (or nearly so), just outside none. */
    @Test
    void retunedLimitIsThatOfADenseGridOfSettings() {
        Scenario scenario = StudyScenarios.modest();
        List<Axis> free = StudyScenarios.usual(scenario, SETTINGS);
        double limit = reach(scenario, free).all().retunedKm().orElseThrow();
        assertThat(bestOfGrid(LENGTH.with(scenario, limit * 0.999), free)).isGreaterThanOrEqualTo(0.0);
        assertThat(bestOfGrid(LENGTH.with(scenario, limit * 1.0001), free)).isNegative();
    }

    private static double bestOfGrid(Scenario scenario, List<Axis> free) {
        PointEvaluator evaluator =
                new PointEvaluator(scenario, free.stream().map(Axis::parameter).toList());
        double best = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < 400 * 400; i++) {
            best = Math.max(best, evaluator.leastMargin(StudyScenarios.gridPoint(free, i, 400)));
        }
        return best;
    }

    @Test
    void firstKeyAndFiveSigmaStandFirstWithTheUsualHoursWhereNoneAreStated() {
        Reach.Outcome outcome = reach(StudyScenarios.modest(), List.of());
        assertThat(outcome.limits().get(0).goal())
                .isEqualTo(new Reach.Goal(Requirement.FIRST_KEY, Reach.USUAL_HOURS, false));
        assertThat(outcome.limits().get(1).goal())
                .isEqualTo(new Reach.Goal(Requirement.FIVE_SIGMA, Reach.USUAL_HOURS, false));
        Reach.Outcome stated = reach(StudyScenarios.demanding(), List.of());
        assertThat(stated.limits().get(1).goal()).isEqualTo(new Reach.Goal(Requirement.FIVE_SIGMA, 1.0, true));
    }

    /** Re-tuning never shortens the reach, and all together reach as far as the shortest at the settings as written. */
    @Test
    void retuningNeverShortens() {
        Scenario scenario = StudyScenarios.modest();
        Reach.Outcome outcome = reach(scenario, StudyScenarios.usual(scenario, SETTINGS));
        double shortest = Double.POSITIVE_INFINITY;
        for (Reach.Limit limit : outcome.limits()) {
            assertThat(limit.retunedKm().orElseThrow())
                    .isGreaterThanOrEqualTo(limit.asWrittenKm().orElseThrow());
            if (limit.goal().stated()) {
                shortest = Math.min(shortest, limit.asWrittenKm().orElseThrow());
            }
        }
        assertThat(outcome.all().asWrittenKm().orElseThrow()).isCloseTo(shortest, within(1e-4));
    }

    @Test
    void curvesGoBeyondTheLastLimitAndStayBelowTheBenchmark() {
        Scenario scenario = StudyScenarios.modest();
        Reach.Outcome outcome = reach(scenario, StudyScenarios.usual(scenario, SETTINGS));
        StudyTable curve = outcome.retuned();
        double last = curve.varied(0, curve.rows() - 1);
        assertThat(outcome.limits())
                .allSatisfy(limit -> assertThat(limit.retunedKm().orElseThrow()).isLessThan(last));
        int key = curve.indexOf("key.asymptoticBps");
        int bound = curve.indexOf("key.repeaterlessBoundBps");
        for (int row = 1; row < curve.rows(); row++) {
            assertThat(curve.figure(key, row)).isLessThan(curve.figure(bound, row));
            assertThat(curve.figure(key, row))
                    .isGreaterThanOrEqualTo(
                            curve.meets(row) && outcome.asWritten().meets(row)
                                    ? outcome.asWritten().figure(key, row) * (1.0 - 1e-6)
                                    : 0.0);
        }
    }

    @Test
    void neverHoldingIsAbsent() {
        Reach.Outcome outcome = reach(StudyScenarios.requiring("rawVisibilityAtLeast", 0.9999), List.of());
        assertThat(outcome.all().asWrittenKm()).isEqualTo(OptionalDouble.empty());
    }

    @Test
    void sourceMovesWithoutChangingTheLength() {
        Scenario scenario = StudyScenarios.modest();
        for (double share : new double[] {0.0, 0.25, 0.5, 1.0}) {
            Scenario moved = SourcePosition.moved(scenario, share);
            assertThat(SourcePosition.of(moved)).isCloseTo(share, within(1e-12));
            assertThat(LENGTH.value(moved).orElseThrow())
                    .isCloseTo(LENGTH.value(scenario).orElseThrow(), within(1e-9));
        }
        assertThatThrownBy(() -> SourcePosition.moved(scenario, 1.5)).hasMessageContaining("allowed 0 (at alice) to 1");
        assertThatThrownBy(() -> SourcePosition.moved(SourcePosition.moved(scenario, 0.0), 0.5))
                .hasMessage("alice: has no fibre to stretch");
    }

    @Test
    void lengthsCannotBeTuned() {
        Scenario scenario = StudyScenarios.modest();
        assertThatThrownBy(() -> reach(scenario, StudyScenarios.usual(scenario, "link.lengthKm")))
                .hasMessageContaining("a length cannot be tuned for reach");
    }
}

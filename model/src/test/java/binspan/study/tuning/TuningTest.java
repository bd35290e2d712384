package binspan.study.tuning;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementMargins;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.PointEvaluator;
import binspan.study.Progress;
import binspan.study.StudyScenarios;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Tuning against dense grids, from many starts, within bounds and requirements. */
final class TuningTest {
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final String WINDOW = "timing.windowWidthPs";
    private static final String IMBALANCE = "imbalanceNs";

    /** No point of a dense grid that meets the requirements beats the tuned one, and the best of them comes near it. */
    @ParameterizedTest
    @EnumSource(Objective.class)
    void noGridPointIsBetter(Objective objective) {
        Scenario scenario = StudyScenarios.demanding();
        List<Axis> free = StudyScenarios.usual(scenario, PAIRS, WINDOW);
        RequirementMargins margins = RequirementMargins.of(scenario.require());
        Tuning.Outcome tuned = Tuning.of(scenario, free, objective).run(Execution.SINGLE);
        double found = objective.value(tuned.prediction(), margins);
        PointEvaluator evaluator =
                new PointEvaluator(scenario, free.stream().map(Axis::parameter).toList());
        double best = Double.NEGATIVE_INFINITY;
        int side = 400;
        for (int i = 0; i < side * side; i++) {
            LinkPrediction there = evaluator.at(StudyScenarios.gridPoint(free, i, side));
            if (margins.met(there)) {
                best = Math.max(best, objective.value(there, margins));
            }
        }
        assertThat(tuned.feasible()).isTrue();
        assertThat(margins.met(tuned.prediction())).isTrue();
        assertThat(found).isGreaterThanOrEqualTo(best).isCloseTo(best, within(0.02 * Math.abs(best)));
    }

    @ParameterizedTest
    @EnumSource(Objective.class)
    void twentyStartsFindTheSame(Objective objective) {
        Scenario scenario = StudyScenarios.demanding();
        RequirementMargins margins = RequirementMargins.of(scenario.require());
        List<Axis> free = StudyScenarios.usual(scenario, PAIRS, WINDOW, IMBALANCE, "source.pump.earlyPairFraction");
        double[] found = IntStream.range(0, 20)
                .mapToDouble(start -> {
                    Tuning tuning = new Tuning(scenario, free, objective, margins, 1000L * start + 7);
                    return objective.value(tuning.run(Execution.SINGLE).prediction(), margins);
                })
                .toArray();
        double least = IntStream.range(0, 20).mapToDouble(i -> found[i]).min().orElseThrow();
        double largest = IntStream.range(0, 20).mapToDouble(i -> found[i]).max().orElseThrow();
        assertThat(largest - least).isLessThanOrEqualTo(1e-3 * Math.abs(largest));
    }

    /** With no requirement at all the key gains over the scenario as written, and the balanced source is found. */
    @Test
    void keyWithoutRequirementsPrefersABalancedSource() {
        Scenario scenario = StudyScenarios.requiring("carAtLeast", 0.0);
        List<Axis> free = StudyScenarios.usual(scenario, PAIRS, "source.pump.earlyPairFraction");
        Tuning.Outcome tuned = Tuning.of(scenario, free, Objective.KEY).run(Execution.SINGLE);
        assertThat(tuned.values().get(1)).isCloseTo(0.5, within(1e-3));
        assertThat(tuned.prediction().key().asymptoticPerSecond())
                .isGreaterThan(tuned.asWritten().key().asymptoticPerSecond());
    }

    @Test
    void whatMakesNoDifferenceStaysAsWritten() {
        Scenario scenario = StudyScenarios.demanding();
        List<Axis> free = StudyScenarios.usual(scenario, PAIRS, IMBALANCE);
        Tuning.Outcome tuned = Tuning.of(scenario, free, Objective.KEY).run(Execution.SINGLE);
        assertThat(tuned.values().get(1)).isEqualTo(scenario.imbalanceNs());
    }

    @Test
    void boundsHold() {
        Scenario scenario = StudyScenarios.modest();
        Axis pairs = StudyScenarios.axis(scenario, PAIRS, 0.001, 0.004, true);
        Tuning.Outcome tuned =
                Tuning.of(scenario, List.of(pairs), Objective.KEY).run(Execution.SINGLE);
        assertThat(tuned.values().get(0)).isBetween(0.001, 0.004).isCloseTo(0.004, within(1e-6));
    }

    /** A window wider than the slots' distance is no setting, however good the counts look. */
    @Test
    void slotsNeverOverlap() {
        Scenario scenario = StudyScenarios.modest();
        Axis window = StudyScenarios.axis(scenario, WINDOW, 10.0, 10_000.0, true);
        Axis imbalance = StudyScenarios.axis(scenario, IMBALANCE, 0.05, 20.0, true);
        Tuning.Outcome tuned =
                Tuning.of(scenario, List.of(window, imbalance), Objective.KEY).run(Execution.SINGLE);
        double windowNs = tuned.values().get(0) / 1000.0;
        assertThat(windowNs).isLessThanOrEqualTo(tuned.values().get(1));
        assertThat(3.0 * tuned.values().get(1) + windowNs).isLessThanOrEqualTo(1000.0 / 80.0 * (1.0 + 1e-9));
    }

    /** Where nothing meets everything, no grid point fails by less. */
    @Test
    void failsByTheLeast() {
        Scenario scenario = StudyScenarios.requiring("keyRateAtLeastBps", 1e6);
        List<Axis> free = StudyScenarios.usual(scenario, PAIRS, WINDOW);
        Tuning.Outcome tuned = Tuning.of(scenario, free, Objective.VISIBILITY).run(Execution.SINGLE);
        RequirementMargins margins = RequirementMargins.of(scenario.require());
        PointEvaluator evaluator =
                new PointEvaluator(scenario, free.stream().map(Axis::parameter).toList());
        double best = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < 300 * 300; i++) {
            best = Math.max(best, evaluator.leastMargin(StudyScenarios.gridPoint(free, i, 300)));
        }
        assertThat(tuned.feasible()).isFalse();
        assertThat(margins.least(tuned.prediction()))
                .isGreaterThanOrEqualTo(best)
                .isNegative();
    }

    @Test
    void sameOnAnyNumberOfThreads() {
        Scenario scenario = StudyScenarios.demanding();
        Tuning tuning = Tuning.of(scenario, StudyScenarios.usual(scenario, PAIRS, WINDOW), Objective.KEY);
        assertThat(tuning.run(new Execution(3, Progress.NONE, 0.0, 1.0)).values())
                .isEqualTo(tuning.run(Execution.SINGLE).values());
    }

    @Test
    void stopsWhenAsked() {
        Scenario scenario = StudyScenarios.demanding();
        Progress impatient = new Progress() {
            @Override
            public void reached(double share) {
                assertThat(share).isBetween(0.0, 1.0);
            }

            @Override
            public boolean cancelled() {
                return true;
            }
        };
        Tuning tuning = Tuning.of(scenario, StudyScenarios.usual(scenario, PAIRS), Objective.KEY);
        assertThatThrownBy(() -> tuning.run(Execution.parallel(impatient))).isInstanceOf(CancellationException.class);
    }

    @Test
    void refusals() {
        Scenario scenario = StudyScenarios.modest();
        List<Axis> twice = StudyScenarios.usual(scenario, PAIRS, PAIRS);
        assertThatThrownBy(() -> Tuning.of(scenario, twice, Objective.KEY)).hasMessageContaining("found twice");
        assertThatThrownBy(() -> Tuning.of(scenario, List.of(), Objective.KEY)).hasMessageContaining("allowed 1 to 12");
        assertThatThrownBy(() -> StudyScenarios.usual(scenario, "timing.cableTemperatureStepK"))
                .hasMessageContaining("no planned value to search around");
        List<Axis> moved = List.of(
                StudyScenarios.axis(scenario, "alice.clockJitterRmsPs", 1.0, 5.0, false),
                StudyScenarios.axis(scenario, "both.clockJitterRmsPs", 7.0, 9.0, false));
        assertThatThrownBy(() -> Tuning.of(scenario, moved, Objective.KEY))
                .hasMessage("alice.clockJitterRmsPs: moved by both.clockJitterRmsPs as well; vary one of them");
        assertThat(LinkPredictor.predict(scenario).key().asymptoticPerSecond()).isPositive();
    }
}

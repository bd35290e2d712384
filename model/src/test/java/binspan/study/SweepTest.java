package binspan.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementMargins;
import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** Sweeps: every row is the prediction of its point, whatever the order of the walk and the number of threads. */
final class SweepTest {
    private static Axis axis(Scenario scenario, String path, double from, double to, int steps) {
        return new Axis(ParameterPaths.find(scenario, path), from, to, steps, false);
    }

    private static StudyTable run(Scenario scenario, int threads, Axis... axes) {
        return new Sweep(scenario, List.of(axes), FigureColumns.all(scenario))
                .run(new Execution(threads, Progress.NONE, 0.0, 1.0));
    }

    /** Axes in an order that the walk changes: the quickest to compute stands first, the joint spectrum last. */
    @Test
    void everyRowIsThePredictionOfItsPoint() {
        Scenario scenario = StudyScenarios.modest();
        Axis[] axes = {
            axis(scenario, "source.meanPairsPerCycle", 0.001, 0.05, 3),
            axis(scenario, "timing.windowWidthPs", 100.0, 900.0, 4),
            axis(scenario, "imbalanceNs", 1.0, 3.0, 2),
            axis(scenario, "source.pump.pairEmissionFwhmPs", 20.0, 80.0, 3)
        };
        StudyTable table = run(scenario, 2, axes);
        assertThat(table.rows()).isEqualTo(72);
        RequirementMargins margins = RequirementMargins.of(scenario.require());
        for (int row = 0; row < table.rows(); row++) {
            Scenario point = scenario;
            int[] step = {row / 24, row / 6 % 4, row / 3 % 2, row % 3};
            for (int i = 0; i < axes.length; i++) {
                assertThat(table.varied(i, row)).isEqualTo(axes[i].at(step[i]));
                point = axes[i].parameter().with(point, axes[i].at(step[i]));
            }
            LinkPrediction expected = LinkPredictor.predict(point);
            FiniteKeyOutlook finite = FiniteKeyOutlook.of(expected);
            for (int column = 0; column < table.columns().size(); column++) {
                FigureColumn figure = table.columns().get(column);
                assertThat(table.figure(column, row)).as(figure.name()).isEqualTo(figure.of(expected, finite));
            }
            assertThat(table.meets(row)).isEqualTo(margins.met(expected));
        }
    }

    @Test
    void sameBitsOnAnyNumberOfThreads() {
        Scenario scenario = StudyScenarios.modest();
        Axis length = axis(scenario, "link.lengthKm", 10.0, 200.0, 17);
        Axis window = axis(scenario, "timing.windowWidthPs", 50.0, 1500.0, 19);
        StudyTable one = run(scenario, 1, length, window);
        StudyTable three = run(scenario, 3, length, window);
        assertThat(three.numbers()).isEqualTo(one.numbers());
    }

    @Test
    void continuousPumpAndTrainSweepToo() {
        for (Scenario scenario : List.of(
                SampleScenarios.build(SampleScenarios.continuous()),
                SampleScenarios.build(SampleScenarios.pulseTrain()))) {
            StudyTable table = run(scenario, 2, axis(scenario, "timing.windowWidthPs", 100.0, 400.0, 5));
            int visibility = table.indexOf("visibility.raw");
            double expected = LinkPredictor.predict(ParameterPaths.find(scenario, "timing.windowWidthPs")
                            .with(scenario, 400.0))
                    .fringe()
                    .raw();
            assertThat(table.figure(visibility, 4)).isEqualTo(expected);
        }
    }

    @Test
    void progressRisesToTheEnd() {
        Scenario scenario = StudyScenarios.modest();
        List<Double> reached = new ArrayList<>();
        Progress progress = new Progress() {
            @Override
            public void reached(double share) {
                reached.add(share);
            }

            @Override
            public boolean cancelled() {
                return false;
            }
        };
        new Sweep(scenario, List.of(axis(scenario, "imbalanceNs", 1.0, 2.0, 300)), List.of())
                .run(new Execution(1, progress, 0.0, 1.0));
        assertThat(reached).isNotEmpty().isSorted();
        assertThat(reached.get(reached.size() - 1)).isEqualTo(1.0);
    }

    @Test
    void stopsWhenAsked() {
        Scenario scenario = StudyScenarios.modest();
        AtomicInteger asked = new AtomicInteger();
        Progress progress = new Progress() {
            @Override
            public void reached(double share) {
                assertThat(share).isLessThan(0.5);
            }

            @Override
            public boolean cancelled() {
                return asked.incrementAndGet() > 3;
            }
        };
        Axis pairs = axis(scenario, "source.meanPairsPerCycle", 0.001, 0.05, 200);
        Axis window = axis(scenario, "timing.windowWidthPs", 100.0, 900.0, 200);
        Sweep sweep = new Sweep(scenario, List.of(pairs, window), List.of());
        assertThatThrownBy(() -> sweep.run(new Execution(2, progress, 0.0, 1.0)))
                .isInstanceOf(CancellationException.class);
    }

    @Test
    void failuresInsideAThreadComeOut() {
        assertThatThrownBy(() -> Workers.run(100, 1, new Execution(2, Progress.NONE, 0.0, 1.0), () -> (first, end) -> {
                    if (first == 50) {
                        throw new IllegalStateException("item 50");
                    }
                }))
                .hasMessage("item 50");
    }

    @Test
    void refusals() {
        Scenario scenario = StudyScenarios.modest();
        List<FigureColumn> all = FigureColumns.all(scenario);
        Axis[] five = new Axis[5];
        Arrays.setAll(five, i -> axis(scenario, "imbalanceNs", 1.0, 2.0, 2));
        assertThatThrownBy(() -> new Sweep(scenario, List.of(five), all)).hasMessageContaining("allowed 1 to 4");
        Axis large = axis(scenario, "imbalanceNs", 1.0, 2.0, 1_000_000);
        assertThatThrownBy(() -> new Sweep(scenario, List.of(large), all)).hasMessageContaining("take fewer steps");
        assertThatThrownBy(() -> axis(scenario, "imbalanceNs", 2.0, 2.0, 5)).hasMessageContaining("a range that rises");
        assertThatThrownBy(() -> axis(scenario, "imbalanceNs", 1.0, 2.0, 1)).hasMessageContaining("allowed 2 to");
        assertThatThrownBy(() -> axis(scenario, "alice.detectors.efficiency", 0.5, 1.5, 3))
                .hasMessage("alice.detectors.efficiency: found 0.5 to 1.5; allowed 1e-6 to 1");
        assertThatThrownBy(() -> new Axis(ParameterPaths.find(scenario, "alice.delayErrorPs"), -5.0, 5.0, 3, true))
                .hasMessageContaining("in logarithmic steps; allowed above 0");
    }

    @Test
    void figuresByNameGroupAndPort() {
        Scenario scenario = StudyScenarios.modest();
        assertThat(FigureColumns.named(scenario, List.of("qber", "alice.singlesPerSecond")))
                .extracting(FigureColumn::name)
                .containsExactly("qber.phase", "qber.time", "alice.singlesPerSecond[0]", "alice.singlesPerSecond[1]");
        assertThatThrownBy(() -> FigureColumns.named(scenario, List.of("visibility.row")))
                .hasMessageContaining("did you mean visibility.raw");
        assertThatThrownBy(() -> FigureColumns.named(scenario, List.of("coincidence.correlationRmsPs")))
                .hasMessageContaining("does not apply");
    }
}

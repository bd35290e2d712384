package binspan.study;

import binspan.prediction.ResultField;
import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Time of a map of 256 by 256 points with all figures of merit, warm; run on demand, the figures stand in DEVELOPERS.md. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class SweepBenchmark {
    private static final int SIDE = 256;

    private final Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair());
    private final List<FigureColumn> all = FigureColumns.all(scenario);
    private final List<FigureColumn> withoutFiniteKey = all.stream()
            .filter(column -> column.field().stage() != ResultField.Stage.FINITE_KEY)
            .toList();

    /** Threads: one tells the speed-up. */
    @Param({"1", "2"})
    public int threads;

    /** Mean pairs by window width, all figures but those of the finite key. */
    @Benchmark
    public StudyTable pairsByWindow() {
        return run(withoutFiniteKey, pairs(), window());
    }

    /** Fibre length by imbalance, the same figures. */
    @Benchmark
    public StudyTable lengthByImbalance() {
        return run(withoutFiniteKey, length(), imbalance());
    }

    /** Mean pairs by window width with the finite key at every point. */
    @Benchmark
    public StudyTable pairsByWindowWithFiniteKey() {
        return run(all, pairs(), window());
    }

    private StudyTable run(List<FigureColumn> columns, Axis... axes) {
        return new Sweep(scenario, List.of(axes), columns).run(new Execution(threads, Progress.NONE, 0.0, 1.0));
    }

    private Axis pairs() {
        return axis("source.meanPairsPerCycle", 0.001, 0.2, true);
    }

    private Axis window() {
        return axis("timing.windowWidthPs", 50.0, 1500.0, false);
    }

    private Axis length() {
        return axis("link.lengthKm", 1.0, 200.0, false);
    }

    private Axis imbalance() {
        return axis("imbalanceNs", 0.5, 4.0, false);
    }

    private Axis axis(String path, double from, double to, boolean logarithmic) {
        return new Axis(ParameterPaths.find(scenario, path), from, to, SIDE, logarithmic);
    }
}

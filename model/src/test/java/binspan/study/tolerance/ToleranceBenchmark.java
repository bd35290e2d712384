package binspan.study.tolerance;

import binspan.prediction.ResultField;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.SpreadShape;
import binspan.scenario.Values;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.Progress;
import java.util.ArrayList;
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

/** Time of a tolerance study of 100,000 builds with eight spreads, warm; run on demand, the figures stand in DEVELOPERS.md. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class ToleranceBenchmark {
    private static final int SAMPLES = 100_000;

    private final Scenario counted = scenario(new Values());
    private final Scenario keyed = scenario(new Values().put("firstKeyWithinHours", 1.0));

    /** Threads: one tells the speed-up. */
    @Param({"1", "2"})
    public int threads;

    /** All figures but those of the finite key, which no requirement needs either. */
    @Benchmark
    public ToleranceResult withoutFiniteKey() {
        return run(
                counted,
                FigureColumns.all(counted).stream()
                        .filter(column -> column.field().stage() != ResultField.Stage.FINITE_KEY)
                        .toList());
    }

    /** All figures and a deadline for the first key. */
    @Benchmark
    public ToleranceResult withFiniteKey() {
        return run(keyed, FigureColumns.all(keyed));
    }

    private ToleranceResult run(Scenario scenario, List<FigureColumn> columns) {
        return new Tolerance(scenario, spreads(scenario), SAMPLES, 1, columns)
                .run(new Execution(threads, Progress.NONE, 0.0, 1.0));
    }

    private static Scenario scenario(Values require) {
        require.put("rawVisibilityAtLeast", 0.90)
                .put("keyRateAtLeastBps", 2500.0)
                .put("chshAtLeast", 2.5);
        return SampleScenarios.build(SampleScenarios.pulsePair().put("require", require));
    }

    private static List<ParameterSpread> spreads(Scenario scenario) {
        List<ParameterSpread> spreads = new ArrayList<>(ToleranceScenarios.several(scenario));
        spreads.add(ToleranceScenarios.relative(scenario, "bob.detectors.efficiency", SpreadShape.NORMAL, 0.05));
        spreads.add(ToleranceScenarios.absolute(scenario, "bob.path.cable.lengthKm", SpreadShape.UNIFORM, 3.0));
        spreads.add(ToleranceScenarios.relative(scenario, "imbalanceNs", SpreadShape.TRIANGULAR, 0.01));
        return spreads;
    }
}

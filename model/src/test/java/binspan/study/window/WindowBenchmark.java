package binspan.study.window;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.box.BoxLinks;
import binspan.study.box.OperatingBox;
import binspan.study.box.ToleranceBox;
import binspan.study.box.ToleranceBox.Sense;
import binspan.study.region.OperatingRegion;
import binspan.study.region.RegionMap;
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

/** Time of windows, regions and boxes of a pulse pair with five requirements, warm; run on demand, the figures stand in DEVELOPERS.md. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class WindowBenchmark {
    private final Scenario scenario = BoxLinks.PAIR;

    /** Threads: one tells the speed-up. */
    @Param({"1", "2"})
    public int threads;

    /** Windows of the mean pairs. */
    @Benchmark
    public OperatingIntervals window() {
        return new OperatingWindow(scenario, BoxLinks.PAIRS).run(execution());
    }

    /** Region of mean pairs and window width, 129 by 129. */
    @Benchmark
    public RegionMap pairsByWindow() {
        return new OperatingRegion(scenario, BoxLinks.PAIRS, BoxLinks.WIDTH).run(execution());
    }

    /** Region of length and imbalance, where hardly anything can be reused. */
    @Benchmark
    public RegionMap lengthByImbalance() {
        return new OperatingRegion(scenario, BoxLinks.LENGTH, BoxLinks.IMBALANCE).run(execution());
    }

    /** Largest box of two parameters. */
    @Benchmark
    public OperatingBox boxOfTwo() {
        return box(Sense.SHARE, BoxLinks.PAIRS, BoxLinks.WIDTH);
    }

    /** Largest box of six parameters. */
    @Benchmark
    public OperatingBox boxOfSix() {
        return box(Sense.SHARE, six());
    }

    /** Largest equal tolerance of six parameters. */
    @Benchmark
    public OperatingBox toleranceOfSix() {
        return box(Sense.TOLERANCE, six());
    }

    private OperatingBox box(Sense sense, Axis... axes) {
        return new ToleranceBox(scenario, List.of(axes), sense, false, ToleranceBox.USUAL_SEED).run(execution());
    }

    private static Axis[] six() {
        return new Axis[] {
            BoxLinks.PAIRS, BoxLinks.WIDTH, BoxLinks.LENGTH, BoxLinks.IMBALANCE, BoxLinks.EFFICIENCY, BoxLinks.JITTER
        };
    }

    private Execution execution() {
        return new Execution(threads, Progress.NONE, 0.0, 1.0);
    }
}

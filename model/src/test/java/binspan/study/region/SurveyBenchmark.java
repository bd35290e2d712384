package binspan.study.region;

import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPredictor;
import binspan.prediction.LossRoom;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.window.WindowLinks;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** What follows a hand that drags a parameter: the verdict on the edited link and the margins around it; figures stand in DEVELOPERS.md. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class SurveyBenchmark {
    private static final int SIDE = 128;

    private final Scenario scenario = WindowLinks.pulsePair();
    private final Parameter length = ParameterPaths.find(scenario, "link.lengthKm");
    private final LinkPredictor predictor = new LinkPredictor();
    private final LinkCheck checked = LinkCheck.of(scenario);
    private double step;

    /** The verdict after an edit of the length, without headroom. */
    @Benchmark
    public LinkCheck verdictOfAnEdit() {
        step = (step + 1e-3) % 10.0;
        return LinkCheck.brief(predictor.of(length.with(scenario, 50.0 + step)));
    }

    /** Room for more loss. */
    @Benchmark
    public LossRoom lossRoom() {
        return LossRoom.of(scenario, checked.outcomes());
    }

    /** Margins of 128 by 128 points on two threads: mean pairs by window width. */
    @Benchmark
    public MarginGrid pairsByWindow() {
        return survey(
                axis("source.meanPairsPerCycle", 0.001, 0.2, true), axis("timing.windowWidthPs", 50.0, 1500.0, false));
    }

    /** The same of fibre length by imbalance. */
    @Benchmark
    public MarginGrid lengthByImbalance() {
        return survey(axis("link.lengthKm", 1.0, 200.0, false), axis("imbalanceNs", 0.5, 4.0, false));
    }

    private MarginGrid survey(Axis horizontal, Axis vertical) {
        return new OperatingRegion(scenario, horizontal, vertical).survey(new Execution(2, Progress.NONE, 0.0, 1.0));
    }

    private Axis axis(String path, double from, double to, boolean logarithmic) {
        return new Axis(ParameterPaths.find(scenario, path), from, to, SIDE, logarithmic);
    }
}

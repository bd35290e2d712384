package binspan.prediction;

import binspan.scenario.LinkLength;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
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

/** Time of one prediction on one warm core; run on demand, the figures stand in DEVELOPERS.md. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class LinkPredictorBenchmark {
    private final Scenario pulsePair = SampleScenarios.build(SampleScenarios.pulsePair());
    private final Scenario continuous = SampleScenarios.build(SampleScenarios.continuous());
    private final Scenario pulseTrain = SampleScenarios.build(SampleScenarios.pulseTrain());
    private final Parameter pairs = ParameterPaths.find(pulsePair, "source.meanPairsPerCycle");
    private final Parameter length = new LinkLength();
    private final LinkPredictor predictor = new LinkPredictor();
    private double step;

    /** A full pulse-pair prediction, nothing known beforehand. */
    @Benchmark
    public LinkPrediction pulsePair() {
        return LinkPredictor.predict(pulsePair);
    }

    /** A full continuous-pump prediction. */
    @Benchmark
    public LinkPrediction continuous() {
        return LinkPredictor.predict(continuous);
    }

    /** A full pulse-train prediction. */
    @Benchmark
    public LinkPrediction pulseTrain() {
        return LinkPredictor.predict(pulseTrain);
    }

    /** A pulse pair whose mean pairs vary: the optics are those of the last prediction. */
    @Benchmark
    public LinkPrediction variedPairs() {
        step = (step + 1e-6) % 0.01;
        return predictor.of(pairs.with(pulsePair, 0.01 + step));
    }

    /** A pulse pair whose length varies: the joint spectrum is that of the last prediction. */
    @Benchmark
    public LinkPrediction variedLength() {
        step = (step + 1e-3) % 10.0;
        return predictor.of(length.with(pulsePair, 50.0 + step));
    }

    /** The whole verdict of a pulse pair, headroom and finite key included. */
    @Benchmark
    public LinkCheck verdict() {
        return LinkCheck.of(pulsePair);
    }
}

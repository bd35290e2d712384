package binspan.prediction.histogram;

import binspan.prediction.LinkPrediction;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Time of the usual histograms on one warm core, all ports of equal detectors; run on demand, the figures stand in DEVELOPERS.md. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class HistogramBenchmark {
    /** Kind of link. */
    @Param({"pair", "train", "continuous", "pair tailed", "pair flat", "pair flat tailed", "continuous flat tailed"})
    public String link;

    private LinkPrediction prediction;

    /** Predicts the link. */
    @Setup
    public void predict() {
        Values stated = link.startsWith("pair")
                ? SampleScenarios.pulsePair()
                : link.startsWith("train") ? SampleScenarios.pulseTrain() : SampleScenarios.continuous();
        stated = link.contains("flat") ? HistogramLinks.flat(stated) : stated;
        prediction = HistogramLinks.predicted(link.contains("tailed") ? HistogramLinks.tailed(stated) : stated);
    }

    /** Clicks of alice's side. */
    @Benchmark
    public SideHistogram side() {
        return ArrivalHistograms.side(prediction, true);
    }

    /** Coincidences. */
    @Benchmark
    public PairHistogram pair() {
        return ArrivalHistograms.pair(prediction);
    }
}

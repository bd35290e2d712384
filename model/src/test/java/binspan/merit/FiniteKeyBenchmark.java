package binspan.merit;

import java.util.SplittableRandom;
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

/** Time of the finite-key figures on one warm core, over links of all kinds; run on demand, the figures stand in DEVELOPERS.md. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class FiniteKeyBenchmark {
    private static final int LINKS = 4096;
    private static final double UPTIME = 3600.0;

    private final FiniteKey[] keys = links(new SplittableRandom(5L));
    private int next;

    private static FiniteKey[] links(SplittableRandom random) {
        FiniteKey[] keys = new FiniteKey[LINKS];
        for (int i = 0; i < LINKS; i++) {
            double perSecond = Math.pow(10.0, 4.0 * random.nextDouble());
            double tested = perSecond * Math.pow(10.0, -1.0 + 1.3 * random.nextDouble());
            double error = 0.005 + 0.075 * random.nextDouble();
            keys[i] = new FiniteKey(new FiniteKeyBlock(perSecond, tested, error, error, 1.16, 1e-10, 1e-15));
        }
        return keys;
    }

    private FiniteKey key() {
        next = (next + 1) % LINKS;
        return keys[next];
    }

    /** Key length after an hour. */
    @Benchmark
    public double bits() {
        return key().bits(UPTIME);
    }

    /** Whether and how clearly there is a key after an hour. */
    @Benchmark
    public double marginPerKeyBit() {
        return key().marginPerKeyBit(UPTIME);
    }

    /** Time to the first bit. */
    @Benchmark
    public double secondsToFirstBit() {
        return key().secondsToFirstBit();
    }

    /** Both, as a whole outlook needs them. */
    @Benchmark
    public double outlook() {
        FiniteKey key = key();
        return key.bits(UPTIME) + key.secondsToFirstBit();
    }
}

package binspan.merit;

import binspan.counting.LinkCounts;
import binspan.scenario.Protocol;
import org.apache.commons.numbers.rootfinder.BrentSolver;

/**
 * Finite secret key of a link that runs for a while. Pulse pair: all time-basis bits make the key, all phase-basis bits are disclosed. Continuous pump
 * and pulse train: half of the sifted bits each.
 *
 * @param perSecond what one second of uptime collects
 */
public record FiniteKey(FiniteKeyBlock perSecond) {
    private static final double FEWEST_BITS = 50.0;
    private static final double FOUR = 4.0;
    private static final int MOST_DOUBLINGS = 60;
    private static final BrentSolver ROOT = new BrentSolver(1e-6, 1e-6, 1e-12);

    /** The block that a link collects in a second of uptime. */
    public static FiniteKey of(LinkCounts counts, SecretKey key, Protocol protocol) {
        ErrorRates errors = key.errors();
        boolean timeBasis = counts.hasTimeBasis();
        double half = key.siftedPhasePerSecond() / 2.0;
        return new FiniteKey(new FiniteKeyBlock(
                timeBasis ? key.siftedTimePerSecond() : half,
                timeBasis ? key.siftedPhasePerSecond() : half,
                timeBasis ? errors.time() : errors.phase(),
                timeBasis ? errors.phaseErrorOfTimeKey() : errors.phase(),
                protocol.errorCorrectionEfficiency(),
                protocol.secrecyEpsilon(),
                protocol.correctnessEpsilon()));
    }

    /** What some uptime collects. */
    public FiniteKeyBlock block(double uptime) {
        return perSecond.times(uptime);
    }

    /**
     * Key length after some uptime, not rounded; 0 or less means no key.
     *
     * @param uptime seconds of uptime
     */
    public double bits(double uptime) {
        FiniteKeyBlock block = block(uptime);
        return tooFew(block) ? -FEWEST_BITS : FiniteKeyBound.longest(block);
    }

    /** Whether a block is too small for any key. */
    public static boolean tooFew(FiniteKeyBlock block) {
        return block.keyBits() < FEWEST_BITS || block.testBits() < 1.0;
    }

    /** Uptime after which the key has its first bit, s; infinite if it never has. */
    public double secondsToFirstBit() {
        double fraction =
                SecretKey.secretFraction(perSecond.bitError(), perSecond.phaseError(), perSecond.efficiency());
        double slowest = Math.min(perSecond.keyBits(), perSecond.testBits());
        if (!(fraction > 0.0 && slowest > 0.0)) {
            return Double.POSITIVE_INFINITY;
        }
        double shortest = FEWEST_BITS / slowest;
        double longest = shortest;
        for (int i = 0; i < MOST_DOUBLINGS && bits(longest) < 1.0; i++) {
            longest *= FOUR;
        }
        if (bits(longest) < 1.0) {
            return Double.POSITIVE_INFINITY;
        }
        double logTime = ROOT.findRoot(
                log -> (bits(Math.exp(log)) - 1.0) / (perSecond.keyBits() * Math.exp(log)),
                Math.log(longest / FOUR),
                Math.log(longest));
        return Math.exp(logTime);
    }
}

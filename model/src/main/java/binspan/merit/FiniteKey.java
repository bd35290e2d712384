package binspan.merit;

import binspan.counting.LinkCounts;
import binspan.scenario.Protocol;

/**
 * Finite secret key of a link that runs for a while. Pulse pair: all time-basis bits make the key, all phase-basis bits are disclosed. Continuous pump
 * and pulse train: half of the sifted bits each.
 *
 * @param perSecond what one second of uptime collects
 */
public record FiniteKey(FiniteKeyBlock perSecond) {
    private static final double TOO_FEW = -50.0;

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
        BlockTerms block = BlockTerms.of(block(uptime));
        return block.enough() ? FiniteKeyBound.longest(block) : TOO_FEW;
    }

    /**
     * Key length beyond the first bit, per bit kept for the key: at least 0 where there is a key. It is continuous in rates, error rates and uptime, as
     * searches like it; of blocks that are too small for any key the quicker bound tells how far they are from one.
     *
     * @param uptime seconds of uptime
     */
    public double marginPerKeyBit(double uptime) {
        BlockTerms block = BlockTerms.of(block(uptime));
        double bits = block.enough()
                ? FiniteKeyBound.longest(block)
                : Math.min(0.0, FiniteKeyBound.TOMAMICHEL_2012.key(block).bits());
        return (bits - 1.0) / Math.max(1.0, uptime * perSecond.keyBits());
    }

    /** Uptime after which the key has its first bit, s; infinite if it never has. */
    public double secondsToFirstBit() {
        return new FirstBit(BlockTerms.of(perSecond)).uptime();
    }
}

package binspan.scenario;

import java.util.OptionalDouble;

/**
 * What the link must reach; what is absent is not required.
 *
 * @param rawVisibilityAtLeast raw two-photon visibility
 * @param chshAtLeast CHSH S
 * @param phaseBasisQberAtMost error rate of the phase basis
 * @param timeBasisQberAtMost error rate of the time basis
 * @param keyRateAtLeastBps asymptotic secret key rate, bit/s
 * @param carAtLeast coincidence-to-accidental ratio
 * @param firstKeyWithinHours time to the first finite key, h
 * @param fiveSigmaWithinHours time to a CHSH violation by five standard deviations, h
 */
public record Requirements(
        OptionalDouble rawVisibilityAtLeast,
        OptionalDouble chshAtLeast,
        OptionalDouble phaseBasisQberAtMost,
        OptionalDouble timeBasisQberAtMost,
        OptionalDouble keyRateAtLeastBps,
        OptionalDouble carAtLeast,
        OptionalDouble firstKeyWithinHours,
        OptionalDouble fiveSigmaWithinHours) {}

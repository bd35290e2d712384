package binspan.merit;

import binspan.counting.LinkCounts;

/**
 * Coincidences of all port pairs that sifting keeps, at the static phase error of the link, 1/s.
 *
 * <p>Where a side detects one port only, right and wrong outcomes need settings half a turn apart: the central rate is then
 * the mean over both.
 *
 * @param central interfering windows
 * @param earlyEarly both photons early and short; 0 without a time basis, as the next three
 * @param lateLate both photons late and long
 * @param earlyLate alice in slot 0, bob in slot 2
 * @param lateEarly alice in slot 2, bob in slot 0
 */
public record SiftedRates(double central, double earlyEarly, double lateLate, double earlyLate, double lateEarly) {
    /**
     * The rates of a link.
     *
     * @param counts counts
     * @param phaseOffset static phase error delta, rad
     */
    public static SiftedRates of(LinkCounts counts, double phaseOffset) {
        double cosine = Math.cos(phaseOffset);
        double central = counts.bothPorts()
                ? counts.central().sum(cosine)
                : (counts.central().sum(cosine) + counts.central().sum(-cosine)) / 2.0;
        return counts.hasTimeBasis()
                ? new SiftedRates(
                        central,
                        counts.timeBasis().get(LinkCounts.EARLY_EARLY).sum(cosine),
                        counts.timeBasis().get(LinkCounts.LATE_LATE).sum(cosine),
                        counts.timeBasis().get(LinkCounts.EARLY_LATE).sum(cosine),
                        counts.timeBasis().get(LinkCounts.LATE_EARLY).sum(cosine))
                : new SiftedRates(central, 0.0, 0.0, 0.0, 0.0);
    }

    /** Coincidences of the time basis, right and wrong. */
    public double time() {
        return earlyEarly + lateLate + earlyLate + lateEarly;
    }
}

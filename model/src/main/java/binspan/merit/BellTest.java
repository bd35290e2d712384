package binspan.merit;

import binspan.counting.LinkCounts;
import binspan.counting.PortPairs;
import binspan.counting.PortRates;

/**
 * CHSH test with the settings that a two-photon fringe favours.
 *
 * @param chsh S
 * @param coincidencesPerSecond coincidences of all port pairs, which the four correlation values share, 1/s
 */
public record BellTest(double chsh, double coincidencesPerSecond) {
    /** Largest S of quantum mechanics, 2 sqrt 2. */
    public static final double TSIRELSON = 2.0 * Math.sqrt(2.0);

    private static final double LOCAL = 2.0;

    /** cos(pi/4) = sin(pi/4): the settings lie an eighth of a turn from the phase error. */
    private static final double HALF_ROOT = Math.sqrt(0.5);

    /**
     * S of a link. Both ports on both sides: E(delta - pi/4) + 2 E(delta + pi/4) - E(delta + 3 pi/4) with E from the four port pairs; otherwise
     * 2 sqrt2 V cos(delta) from settings half a turn apart, in which all detected port pairs count.
     *
     * @param counts counts
     * @param visibility raw visibility of ports (1,1)
     * @param phaseOffset static phase error delta, rad
     */
    public static BellTest of(LinkCounts counts, double visibility, double phaseOffset) {
        double rate = counts.central().mean();
        double cos = Math.cos(phaseOffset);
        if (!counts.bothPorts()) {
            return new BellTest(TSIRELSON * visibility * cos, rate);
        }
        double sin = Math.sin(phaseOffset);
        double s = correlation(counts.central(), (cos + sin) * HALF_ROOT)
                + 2.0 * correlation(counts.central(), (cos - sin) * HALF_ROOT)
                - correlation(counts.central(), -(cos + sin) * HALF_ROOT);
        return new BellTest(s, rate);
    }

    /** E = (equal ports - unequal ports)/all at a cosine of the phase. */
    private static double correlation(PortPairs pairs, double cosine) {
        PortRates rates = pairs.at(cosine);
        double all = rates.sum();
        return all > 0.0 ? rates.difference() / all : 0.0;
    }

    /**
     * Counting error of S: 2 sqrt((1 - S^2/16)/N), N coincidences for each of the four correlation values.
     *
     * @param seconds measuring time of the whole test
     */
    public double sigma(double seconds) {
        return sigma(chsh, coincidencesPerSecond * seconds / 4.0);
    }

    /** Counting error of S from N coincidences for each correlation value. */
    public static double sigma(double chsh, double perCorrelation) {
        return 2.0 * Math.sqrt((1.0 - chsh * chsh / 16.0) / perCorrelation);
    }

    /**
     * Measuring time after which S exceeds 2 by k standard errors.
     *
     * @param k number of standard errors
     * @return seconds; infinite if S does not exceed 2
     */
    public double secondsTo(double k) {
        double excess = chsh - LOCAL;
        return excess > 0.0
                ? 16.0 * k * k * (1.0 - chsh * chsh / 16.0) / (excess * excess * coincidencesPerSecond)
                : Double.POSITIVE_INFINITY;
    }
}

package binspan.merit;

import binspan.counting.PortPair;

/**
 * Two-photon fringe of ports (1,1).
 *
 * @param maxPerSecond coincidences at the best phase, 1/s
 * @param minPerSecond coincidences at the worst phase, 1/s
 * @param accidentalPerSecond accidental coincidences, 1/s
 * @param raw visibility (max - min)/(max + min)
 * @param net the same with accidentals subtracted
 * @param car mean of the fringe over the accidentals
 */
public record FringeVisibility(
        double maxPerSecond, double minPerSecond, double accidentalPerSecond, double raw, double net, double car) {

    /** The fringe of a port pair. */
    public static FringeVisibility of(PortPair pair) {
        double max = pair.atCosine(1.0);
        double min = pair.atCosine(-1.0);
        double accidental = pair.accidentalPerSecond();
        double pairs = max + min - 2.0 * accidental;
        return new FringeVisibility(
                max,
                min,
                accidental,
                visibility(max, min),
                pairs > 0.0 ? Math.min(1.0, (max - min) / pairs) : 0.0,
                (max + min) / (2.0 * accidental));
    }

    /** Mean rate of the fringe, 1/s. */
    public double meanPerSecond() {
        return (maxPerSecond + minPerSecond) / 2.0;
    }

    /**
     * Counting error of a visibility fitted by least squares to a fringe scan of M equidistant phases with N mean counts each:
     * sqrt((2 - V^2)/(M N)). From var(a) = 2 N/M, var(mean) = N/M, cov = N V/M for V = a/mean under Poisson counts.
     *
     * @param visibility visibility V
     * @param points number of phases M, 3 or more
     * @param meanCounts mean counts N of a point
     */
    public static double sigma(double visibility, int points, double meanCounts) {
        return Math.sqrt((2.0 - visibility * visibility) / (points * meanCounts));
    }

    /** (max - min)/(max + min), 0 where nothing is counted. */
    static double visibility(double max, double min) {
        double sum = max + min;
        return sum > 0.0 ? (max - min) / sum : 0.0;
    }
}

package binspan.merit;

/**
 * Measured coincidences of one pair of analyzer settings by outcome.
 *
 * @param plusPlus port 1 on both sides
 * @param plusMinus port 1 of alice, port 2 of bob
 * @param minusPlus port 2 of alice, port 1 of bob
 * @param minusMinus port 2 on both sides
 */
public record CorrelationCounts(double plusPlus, double plusMinus, double minusPlus, double minusMinus) {
    /** Coincidences with equal outcomes. */
    public double equal() {
        return plusPlus + minusMinus;
    }

    /** Coincidences with unequal outcomes. */
    public double unequal() {
        return plusMinus + minusPlus;
    }

    /** All coincidences. */
    public double total() {
        return equal() + unequal();
    }

    /** E = (equal - unequal)/total. */
    public double correlation() {
        return (equal() - unequal()) / total();
    }

    /** Counting error of E, sqrt((1 - E^2)/total): the outcomes of a fixed number of coincidences are binomial. */
    public double sigma() {
        return Math.sqrt((1.0 - correlation() * correlation()) / total());
    }
}

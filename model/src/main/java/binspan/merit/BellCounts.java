package binspan.merit;

import binspan.units.Require;
import java.util.List;
import org.apache.commons.statistics.distribution.BinomialDistribution;

/**
 * A measured CHSH test: sixteen counts, four outcomes for each of four pairs of settings.
 *
 * <p>S = |E1 + E2 + E3 + E4 - 2 E_minus|. Which correlation is subtracted belongs to the choice of the settings: picked
 * after the counts are known, it makes S too large.
 *
 * @param settings counts of the four pairs of settings
 * @param minus index of the pair whose correlation is subtracted, 0 to 3
 */
public record BellCounts(List<CorrelationCounts> settings, int minus) {
    private static final int PAIRS = 4;

    /** Largest winning probability of the CHSH game without entanglement. */
    private static final double LOCAL_WIN = 0.75;

    /**
     * Keeps the counts.
     *
     * @throws IllegalArgumentException if there are not four pairs of settings or {@code minus} is none of them
     */
    public BellCounts {
        Require.within("settings", settings.size(), PAIRS, PAIRS);
        Require.within("minus", minus, 0, PAIRS - 1);
        settings = List.copyOf(settings);
    }

    /** S. */
    public double chsh() {
        return Math.abs(signed());
    }

    /** Counting error of S, the root of the sum of the squared errors of the four correlations. */
    public double sigma() {
        double variance = 0.0;
        for (CorrelationCounts each : settings) {
            variance += each.sigma() * each.sigma();
        }
        return Math.sqrt(variance);
    }

    /** All coincidences. */
    public double total() {
        double sum = 0.0;
        for (CorrelationCounts each : settings) {
            sum += each.total();
        }
        return sum;
    }

    /** Coincidences that win the CHSH game: the outcome that raises S. */
    public double wins() {
        boolean positive = signed() > 0.0;
        double wins = 0.0;
        for (int i = 0; i < PAIRS; i++) {
            wins += positive == (i != minus)
                    ? settings.get(i).equal()
                    : settings.get(i).unequal();
        }
        return wins;
    }

    /** Probability that a local model wins as often or more often. */
    public double pValue() {
        return pValue((int) Math.round(total()), (int) Math.round(wins()));
    }

    /**
     * Probability that a local model wins the CHSH game so often or more often: the upper tail of a binomial distribution
     * with probability 3/4, which memory of earlier trials does not help (Hensen et al., Nature 526, 682 (2015)). Settings
     * must be random and every trial count; with post-selected coincidences it certifies source and alignment only.
     *
     * @param trials number of trials
     * @param wins number of them that were won
     */
    public static double pValue(int trials, int wins) {
        return BinomialDistribution.of(trials, LOCAL_WIN).survivalProbability(wins - 1);
    }

    private double signed() {
        double sum = -2.0 * settings.get(minus).correlation();
        for (CorrelationCounts each : settings) {
            sum += each.correlation();
        }
        return sum;
    }
}

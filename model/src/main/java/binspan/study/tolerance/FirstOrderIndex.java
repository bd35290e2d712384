package binspan.study.tolerance;

/**
 * First-order sensitivity index: the share of a result's variance that goes when one parameter is held, Var(E[y | x]) / Var(y) (Sobol 1993).
 *
 * <p>Estimated from samples that were drawn anyway. The mean of y given x is a straight line in each of n^(1/3) bins of equally many samples along x (a
 * local polynomial: Da Veiga, Wahl and Gamboa, Technometrics 51, 452, 2009; bins of given data: Plischke, Borgonovo and Smith, Eur. J. Oper. Res. 226,
 * 536, 2013; both from memory). What p coefficients explain by chance in n independent samples is taken off as in the adjusted coefficient of
 * determination (Ezekiel 1930, from memory), so that the index of a parameter without influence scatters about 0. Sobol points leave less to chance: they
 * bring the index out too low, by p / n at most.
 *
 * @param share the index; NaN where all results are equal
 * @param standardError standard error for independent samples, from the influence function of the index (Da Veiga and Gamboa 2013, from memory): it
 *     falls as 1 / sqrt(n), but is not below the chance of the coefficients, sqrt(2 p) / n. The coefficients' chance also widens the influences
 *     themselves, twice as much, which is taken off. Sobol points err less.
 */
public record FirstOrderIndex(double share, double standardError) {
    /**
     * Estimates the index.
     *
     * @param x values of the parameter, 8 or more
     * @param ranks their doubled ranks
     * @param y results
     */
    static FirstOrderIndex of(double[] x, int[] ranks, double[] y) {
        double mean = mean(y);
        BinnedLines lines = new BinnedLines(x, ranks, y);
        double total = 0.0;
        double within = 0.0;
        for (int i = 0; i < y.length; i++) {
            total += square(y[i] - mean);
            within += square(y[i] - lines.at(i));
        }
        if (!(total > 0.0)) {
            return new FirstOrderIndex(Double.NaN, Double.NaN);
        }
        double freedom = (y.length - 1.0) / (y.length - lines.coefficients());
        double share = 1.0 - freedom * within / total;
        double squares = 0.0;
        for (int i = 0; i < y.length; i++) {
            squares += square((1.0 - share) * square(y[i] - mean) - freedom * square(y[i] - lines.at(i)));
        }
        double chance = 2.0 * (lines.coefficients() - 1.0) * square((1.0 - share) / y.length);
        return new FirstOrderIndex(share, Math.sqrt(Math.max(squares / square(total) - chance, chance)));
    }

    /** The mean, exact where all values are equal. */
    private static double mean(double[] values) {
        double sum = 0.0;
        for (double each : values) {
            sum += each - values[0];
        }
        return values[0] + sum / values.length;
    }

    private static double square(double value) {
        return value * value;
    }
}

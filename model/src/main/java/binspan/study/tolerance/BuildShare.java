package binspan.study.tolerance;

import org.apache.commons.statistics.distribution.BetaDistribution;

/**
 * A share of builds with its confidence interval: that of Clopper and Pearson (Biometrika 26, 404, 1934), whose limits are quantiles of beta
 * distributions.
 *
 * <p>It covers the true share in at least 95 % of studies whatever that share is, while the shorter interval of Wilson falls well below that for shares
 * close to 0 or 1 (Brown, Cai and DasGupta, Statistical Science 16, 101, 2001), which is where a good link's share lies. It holds for independent
 * samples; the error of Sobol points is usually smaller, so that it errs towards caution.
 *
 * @param met builds that meet what is asked
 * @param builds all builds, 1 or more
 * @param lowest lower end of the interval, 0 to 1
 * @param highest upper end
 */
public record BuildShare(int met, int builds, double lowest, double highest) {
    /** Probability with which the interval covers the true share. */
    public static final double CONFIDENCE = 0.95;

    private static final double TAIL = (1.0 - CONFIDENCE) / 2.0;

    /** The share of some builds that were counted. */
    static BuildShare of(int met, int builds) {
        double missed = (double) builds - met;
        double lowest = met == 0 ? 0.0 : BetaDistribution.of(met, missed + 1.0).inverseCumulativeProbability(TAIL);
        double highest =
                missed == 0.0 ? 1.0 : BetaDistribution.of(met + 1.0, missed).inverseSurvivalProbability(TAIL);
        return new BuildShare(met, builds, lowest, highest);
    }

    /** The share itself, 0 to 1. */
    public double share() {
        return (double) met / builds;
    }
}

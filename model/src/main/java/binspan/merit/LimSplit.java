package binspan.merit;

/**
 * How the bound of Lim, Xu, Pan and Ekert (2021) spends its failure probability eps = 2 eps_pe + eps_pa with eps_pe^2 = e^A + e^B.
 *
 * @param sampledOdds e^A : e^B, what the tail may miss by the test bits against what by the others
 * @param spentOdds 2 eps_pe : eps_pa, what sampling may fail against what privacy amplification may; infinite if all is spent on sampling
 */
record LimSplit(double sampledOdds, double spentOdds) {
    /** All for sampling, which makes the deviation least and leaves no key; both tails alike to begin with. */
    static final LimSplit LEAST_DEVIATION = new LimSplit(1.0, Double.POSITIVE_INFINITY);

    /** Whether both odds are those of another split within a relative tolerance. */
    boolean near(LimSplit other, double tolerance) {
        return near(sampledOdds, other.sampledOdds, tolerance) && near(spentOdds, other.spentOdds, tolerance);
    }

    private static boolean near(double a, double b, double tolerance) {
        return a == b || Math.abs(a - b) <= tolerance * Math.min(a, b);
    }

    /** Whether nothing is left for privacy amplification. */
    boolean spendsAll() {
        return spentOdds == Double.POSITIVE_INFINITY;
    }

    /** ln(2 eps_pe/eps). */
    double lnSpent() {
        return spendsAll() ? 0.0 : Math.log(spentOdds / (1.0 + spentOdds));
    }

    /** ln(eps_pa/eps). */
    double lnLeft() {
        return -Math.log(1.0 + spentOdds);
    }

    /** ln(e^B/eps_pe^2). */
    double lnSpread() {
        return -Math.log(1.0 + sampledOdds);
    }
}

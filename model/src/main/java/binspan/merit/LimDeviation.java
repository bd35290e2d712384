package binspan.merit;

/**
 * The deviation nu that the bound of Lim, Xu, Pan and Ekert (2021) must allow for when its failure probability is split in a given way.
 *
 * <p>The sampling tail eps_pe^2 = e^A + e^B, A = -2 m k xi^2/(n + 1), B = -2 G ((n (nu - xi))^2 - 1), G = 1/(m(d + xi) + 1) + 1/(m - m(d + xi) + 1), is
 * solved for xi and for the excess nu - xi, both in closed form. The key length n(1 - h(e)) - leak + log2(eps_cor) + 2 log2(2(eps - 2 eps_pe)), e =
 * d + nu, is stationary where
 *
 * <pre>
 * e^A : e^B = (dB/dxi) : (-dA/dxi)                                 the least tail at a deviation
 * 2 eps_pe : eps_pa = n ln((1 - e)/e) : (-2 d ln(eps_pe)/d nu)     the best deviation
 * </pre>
 *
 * <p>By the envelope theorem d ln(eps_pe)/d nu = -2 G n^2 (nu - xi) e^B/(e^A + e^B).
 */
final class LimDeviation {
    private static final double LN_2 = Math.log(2.0);

    private final BlockTerms terms;
    private final LimSplit split;
    private final double n;
    private final double m;

    /** xi, deviation of the test bits from the whole block. */
    private final double sampled;

    /** Errors of the whole block, m(d + xi), where less than half of it. */
    private final double errors;

    private final double gamma;

    /** nu - xi, deviation of the key bits from the whole block. */
    private final double excess;

    LimDeviation(BlockTerms terms, LimSplit split) {
        this.terms = terms;
        this.split = split;
        this.n = terms.keyBits();
        this.m = n + terms.testBits();
        double spread = -2.0 * (terms.lnSecrecy() - LN_2 + split.lnSpent()) - split.lnSpread();
        this.sampled = Math.sqrt((spread - Math.log(split.sampledOdds())) / samplingRate());
        this.errors = m * Math.min(0.5, terms.phaseError() + sampled);
        this.gamma = 1.0 / (errors + 1.0) + 1.0 / (m - errors + 1.0);
        this.excess = Math.sqrt(1.0 + spread / (2.0 * gamma)) / n;
    }

    /** nu. */
    double deviation() {
        return sampled + excess;
    }

    /** Whether the phase error with its deviation is below 1/2. */
    boolean leavesKey() {
        return deviation() < terms.widestDeviation();
    }

    LimSplit split() {
        return split;
    }

    /**
     * The split that the conditions above ask for at these deviations; the best split asks for itself. Where no key is left, or the tail is further
     * from its condition than the tolerance, only the tail is split anew.
     *
     * @param tailTolerance relative to the odds
     */
    LimSplit better(double tailTolerance) {
        double odds = betterSampledOdds();
        LimSplit tail = new LimSplit(odds, split.spentOdds());
        if (!(leavesKey() && tail.near(split, tailTolerance))) {
            return tail;
        }
        return new LimSplit(odds, n * steepness() * (1.0 + odds) / pull());
    }

    /** The split of a wanted deviation: a step of Newton's method in nu^2, which is nearly linear in ln(eps_pe). */
    LimSplit towards(double wanted) {
        double odds = betterSampledOdds();
        double nu = deviation();
        double slope = pull() / (2.0 * (1.0 + odds));
        double lnSpent = split.lnSpent() + slope * (nu * nu - wanted * wanted) / (2.0 * nu);
        return new LimSplit(odds, lnSpent < 0.0 ? 1.0 / Math.expm1(-lnSpent) : Double.POSITIVE_INFINITY);
    }

    /** Key length, bits. */
    double bits() {
        return kept() + failureCost(terms, split.lnLeft());
    }

    /** Key length with the phase error at 1/2, bits. */
    static double bitsAtHalf(BlockTerms terms, double lnLeft) {
        return failureCost(terms, lnLeft) - terms.keyBits() * terms.leakedPerBit();
    }

    /** log2(eps_cor) + 2 log2(2 eps_pa), bits. */
    private static double failureCost(BlockTerms terms, double lnLeft) {
        return (terms.lnCorrectness() + 2.0 * (LN_2 + terms.lnSecrecy() + lnLeft)) / LN_2;
    }

    /** Derivative of the key length with respect to the logarithm of the uptime, bits; at the best split the split's own change does not count. */
    double growth() {
        double sampledGrowth = -sampled * (1.0 - 0.5 * n / (n + 1.0));
        double errorsGrowth = errors + m * sampledGrowth;
        double left = errors + 1.0;
        double right = m - errors + 1.0;
        double gammaGrowth = -errorsGrowth / (left * left) - (m - errorsGrowth) / (right * right);
        double excessGrowth = -excess - 2.0 * squaredExcess() / pull() * gammaGrowth;
        return kept() - n * steepness() / LN_2 * (sampledGrowth + excessGrowth);
    }

    /** Key bits less what the phase error and error correction cost. */
    private double kept() {
        double error = Math.min(0.5, terms.phaseError() + deviation());
        return n * (1.0 - SecretKey.binaryEntropy(error) - terms.leakedPerBit());
    }

    /** ln((1 - e)/e). */
    private double steepness() {
        double error = terms.phaseError() + deviation();
        return Math.log((1.0 - error) / error);
    }

    private double betterSampledOdds() {
        double left = errors + 1.0;
        double right = m - errors + 1.0;
        double gammaSlope = m * (1.0 / (right * right) - 1.0 / (left * left));
        return (pull() - 2.0 * gammaSlope * squaredExcess()) / (2.0 * samplingRate() * sampled);
    }

    /** -A/xi^2. */
    private double samplingRate() {
        return 2.0 * m * terms.testBits() / (n + 1.0);
    }

    /** dB/dxi at a fixed G. */
    private double pull() {
        return 4.0 * gamma * n * n * excess;
    }

    /** (n (nu - xi))^2 - 1. */
    private double squaredExcess() {
        double wrong = n * excess;
        return wrong * wrong - 1.0;
    }
}

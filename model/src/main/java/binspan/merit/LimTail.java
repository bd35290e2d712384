package binspan.merit;

import org.apache.commons.numbers.rootfinder.BrentSolver;

/**
 * The sampling tail in the bound of Lim, Xu, Pan and Ekert (2021): eps_pe, the probability that the key bits err by more than nu beyond the test
 * bits, with the split xi that makes it least.
 *
 * <p>eps_pe^2 = e^A + e^B with A = -2 m k xi^2/(n + 1), B = -2 G ((n (nu - xi))^2 - 1). The best xi solves (e^A A' + e^B B') = 0; by the envelope
 * theorem d ln(eps_pe)/d nu = -2 G n^2 (nu - xi) e^B/(e^A + e^B).
 */
final class LimTail {
    private static final BrentSolver ROOT = new BrentSolver(1e-10, 1e-300, 0.0);
    private static final double SMALLEST_SHARE = 1e-6;

    private final FiniteKeyBlock block;
    private final double nu;
    private final double n;
    private final double m;

    LimTail(FiniteKeyBlock block, double nu) {
        this.block = block;
        this.nu = nu;
        this.n = block.keyBits();
        this.m = n + block.testBits();
    }

    /** The split xi that makes the tail least; the lower end of the search where the tail is too heavy to have one. */
    double bestSplit() {
        double from = SMALLEST_SHARE * nu;
        double to = nu - Math.sqrt(2.0) / n;
        if (!(to > from) || slope(from) >= 0.0 || slope(to) <= 0.0) {
            return from;
        }
        return ROOT.findRoot(this::slope, from, to);
    }

    /** Natural logarithm of eps_pe at a split. */
    double log(double xi) {
        double a = sampled(xi);
        double b = spread(xi);
        double larger = Math.max(a, b);
        return (larger + Math.log1p(Math.exp(Math.min(a, b) - larger))) / 2.0;
    }

    /** Derivative of ln(eps_pe) with respect to nu at the best split. */
    double logSlope(double xi) {
        return -2.0 * gamma(xi) * n * n * (nu - xi) * weightOfSpread(xi);
    }

    private double slope(double xi) {
        double weight = weightOfSpread(xi);
        double excess = n * (nu - xi);
        double sampledSlope = -4.0 * m * block.testBits() * xi / (n + 1.0);
        double spreadSlope = -2.0 * gammaSlope(xi) * (excess * excess - 1.0) + 4.0 * gamma(xi) * n * excess;
        return (1.0 - weight) * sampledSlope + weight * spreadSlope;
    }

    /** e^B/(e^A + e^B). */
    private double weightOfSpread(double xi) {
        return 1.0 / (1.0 + Math.exp(sampled(xi) - spread(xi)));
    }

    private double sampled(double xi) {
        return -2.0 * m * block.testBits() * xi * xi / (n + 1.0);
    }

    private double spread(double xi) {
        double excess = n * (nu - xi);
        return -2.0 * gamma(xi) * (excess * excess - 1.0);
    }

    private double gamma(double xi) {
        double errors = m * (block.phaseError() + xi);
        return 1.0 / (errors + 1.0) + 1.0 / (m - errors + 1.0);
    }

    private double gammaSlope(double xi) {
        double errors = m * (block.phaseError() + xi);
        double right = m - errors + 1.0;
        return m * (1.0 / (right * right) - 1.0 / ((errors + 1.0) * (errors + 1.0)));
    }
}

package binspan.merit;

/** The sampling tail in the bound of Lim, Xu, Pan and Ekert (2021): probability that the key bits err by more than nu beyond the test bits. */
final class LimTail {
    private LimTail() {}

    /** Natural logarithm of eps_pe at a deviation nu, the best split xi searched. */
    static double log(FiniteKeyBlock block, double nu) {
        return -FiniteKeyBound.best(xi -> -logSquared(block, nu, xi), 0.0, nu) / 2.0;
    }

    /** Key length at a deviation nu; -1e300 where the tail alone uses up the failure probability. */
    static double bits(FiniteKeyBlock block, double nu) {
        double left = block.secrecy() - 2.0 * Math.exp(log(block, nu));
        if (!(left > 0.0)) {
            return -1e300;
        }
        return block.keyBits() * (1.0 - FiniteKeyBound.entropyUpToHalf(block.phaseError() + nu))
                - block.leaked()
                + FiniteKeyBound.log2(block.correctness())
                + 2.0 * FiniteKeyBound.log2(2.0 * left);
    }

    private static double logSquared(FiniteKeyBlock block, double nu, double xi) {
        double n = block.keyBits();
        double m = n + block.testBits();
        double errors = m * (block.phaseError() + xi);
        double gamma = 1.0 / (errors + 1.0) + 1.0 / (m - errors + 1.0);
        double excess = n * (nu - xi);
        double first = -2.0 * m * block.testBits() * xi * xi / (n + 1.0);
        double second = -2.0 * gamma * (excess * excess - 1.0);
        double larger = Math.max(first, second);
        return larger + Math.log1p(Math.exp(Math.min(first, second) - larger));
    }
}

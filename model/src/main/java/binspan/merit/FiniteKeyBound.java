package binspan.merit;

import org.apache.commons.numbers.rootfinder.BrentSolver;

/** Published lower bounds of the secret key length of a finite block; both hold at the stated failure probabilities, so the longer counts. */
public enum FiniteKeyBound {
    /**
     * Tomamichel, Lim, Gisin, Renner, Nat. Commun. 3, 634 (2012), arXiv:1103.4130 (formula from memory): n(1 - h(Q + mu)) - leak -
     * log2(2/(eps_sec^2 eps_cor)), mu = sqrt((n + k)/(n k) (k + 1)/k ln(4/eps_sec)).
     */
    TOMAMICHEL_2012 {
        @Override
        public double bits(FiniteKeyBlock block) {
            double n = block.keyBits();
            double k = block.testBits();
            double deviation = Math.sqrt((n + k) / (n * k) * (k + 1.0) / k * Math.log(4.0 / block.secrecy()));
            double security = log2(2.0) - 2.0 * log2(block.secrecy()) - log2(block.correctness());
            return n * (1.0 - entropyUpToHalf(block.phaseError() + deviation)) - block.leaked() - security;
        }
    },

    /**
     * Lim, Xu, Pan, Ekert, Phys. Rev. Lett. 126, 100501 (2021), arXiv:2009.04882 (bound from memory; it gives the published 6 bits for a block of
     * 3100 at 4.51 % and 1e-6): eps = 2 eps_pe + eps_pa, eps_pe^2 = min over xi of exp(-2 m k xi^2/(n + 1)) + exp(-2 G ((n(nu - xi))^2 - 1)), G =
     * 1/(m(d + xi) + 1) + 1/(m - m(d + xi) + 1), eps_pa = sqrt(2^-(n(1 - h(d + nu)) - leak - log2(1/eps_cor) - l))/2; the best nu is searched.
     */
    LIM_2021 {
        @Override
        public double bits(FiniteKeyBlock block) {
            double widest = 0.5 - block.phaseError();
            double target = Math.log(block.secrecy() / 2.0);
            if (!(widest > 0.0) || logTail(block, widest) >= target) {
                return Double.NEGATIVE_INFINITY;
            }
            double least = ROOT.findRoot(nu -> logTail(block, nu) - target, NARROWEST * widest, widest);
            double from = least * (1.0 + CLEAR_OF_LEAST);
            return limBits(block, best(block, from, Math.max(from, CLEAR_OF_WIDEST * widest)));
        }
    };

    private static final BrentSolver ROOT = new BrentSolver(1e-8, 1e-15, 0.0);
    private static final double NARROWEST = 1e-9;
    private static final double CLEAR_OF_LEAST = 1e-6;

    /** At the widest deviation itself the entropy is flat and the slope no longer tells. */
    private static final double CLEAR_OF_WIDEST = 0.999;

    /** Length of the secret key in bits, not rounded; 0 or less means no key. */
    public abstract double bits(FiniteKeyBlock block);

    /** The longer of all bounds, bits. */
    public static double longest(FiniteKeyBlock block) {
        return Math.max(TOMAMICHEL_2012.bits(block), LIM_2021.bits(block));
    }

    static double log2(double x) {
        return Math.log(x) / Math.log(2.0);
    }

    static double entropyUpToHalf(double x) {
        return x < 0.5 ? SecretKey.binaryEntropy(x) : 1.0;
    }

    /** The deviation nu at which the key is longest: where its slope changes sign. */
    private static double best(FiniteKeyBlock block, double from, double to) {
        if (limSlope(block, from) <= 0.0) {
            return from;
        }
        return limSlope(block, to) >= 0.0 ? to : ROOT.findRoot(nu -> limSlope(block, nu), from, to);
    }

    private static double logTail(FiniteKeyBlock block, double nu) {
        LimTail tail = new LimTail(block, nu);
        return tail.log(tail.bestSplit());
    }

    private static double limBits(FiniteKeyBlock block, double nu) {
        double left = block.secrecy() - 2.0 * Math.exp(logTail(block, nu));
        return block.keyBits() * (1.0 - entropyUpToHalf(block.phaseError() + nu))
                - block.leaked()
                + log2(block.correctness())
                + 2.0 * log2(2.0 * left);
    }

    /** Derivative of the key length with respect to nu, bits. */
    private static double limSlope(FiniteKeyBlock block, double nu) {
        LimTail tail = new LimTail(block, nu);
        double xi = tail.bestSplit();
        double failure = Math.exp(tail.log(xi));
        double error = block.phaseError() + nu;
        double entropySlope = block.keyBits() * log2((1.0 - error) / error);
        return -entropySlope - 4.0 / Math.log(2.0) * failure * tail.logSlope(xi) / (block.secrecy() - 2.0 * failure);
    }
}

package binspan.merit;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;
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
            if (!(widest > 0.0) || LimTail.log(block, widest) >= target) {
                return Double.NEGATIVE_INFINITY;
            }
            double start = ROOT.findRoot(nu -> LimTail.log(block, nu) - target, SHARE_OF_WIDEST * widest, widest);
            return best(nu -> LimTail.bits(block, nu), start, Math.min(widest, 2.0 * start));
        }
    };

    private static final BrentSolver ROOT = new BrentSolver(1e-7, 1e-12, 1e-9);
    private static final double SHARE_OF_WIDEST = 1e-9;

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

    /** Largest value of a function with one maximum inside an interval. */
    static double best(org.apache.commons.math3.analysis.UnivariateFunction function, double from, double to) {
        UnivariatePointValuePair best = new BrentOptimizer(1e-7, 1e-14)
                .optimize(
                        new UnivariateObjectiveFunction(function),
                        GoalType.MAXIMIZE,
                        new SearchInterval(from, to),
                        MaxEval.unlimited());
        return best.getValue();
    }
}

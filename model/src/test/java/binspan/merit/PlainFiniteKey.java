package binspan.merit;

import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

/**
 * The finite-key bounds as they are printed, what is free in them searched on grids and then by golden section: slow, plain, and for comparison only.
 * Formulas as in {@link FiniteKeyBound}, from memory.
 */
final class PlainFiniteKey {
    private static final double GOLDEN = (Math.sqrt(5.0) - 1.0) / 2.0;
    private static final double LN_2 = Math.log(2.0);

    /** Logits of xi/nu. */
    private static final double[] SHARES = series(-40.0, 40.0, 81).toArray();

    private static final int SHARE_STEPS = 35;
    private static final int DEVIATION_STEPS = 75;

    private PlainFiniteKey() {}

    static double longest(FiniteKeyBlock block) {
        return Math.max(tomamichel(block), lim(block));
    }

    static double tomamichel(FiniteKeyBlock block) {
        double n = block.keyBits();
        double k = block.testBits();
        double mu = Math.sqrt((n + k) / (n * k) * ((k + 1.0) / k) * Math.log(4.0 / block.secrecy()));
        return n * (1.0 - entropy(block.phaseError() + mu))
                - block.efficiency() * entropy(block.bitError()) * n
                - 1.0
                + Math.log(block.secrecy() * block.secrecy() * block.correctness()) / LN_2;
    }

    /** The longest key of all deviations up to a phase error of 1/2; negative infinity if none is safe. */
    static double lim(FiniteKeyBlock block) {
        double widest = 0.5 - block.phaseError();
        if (widest <= 0.0) {
            return Double.NEGATIVE_INFINITY;
        }
        double[] deviations = DoubleStream.concat(
                        series(Math.log(1e-8), Math.log(0.5), 60).map(Math::exp), series(0.51, 1.0, 50))
                .map(share -> share * widest)
                .toArray();
        return highest(nu -> bits(block, nu, lnTail(block, nu)), deviations, DEVIATION_STEPS);
    }

    private static double bits(FiniteKeyBlock block, double nu, double lnTail) {
        double left = block.secrecy() - 2.0 * Math.exp(lnTail);
        if (left <= 0.0) {
            return Double.NEGATIVE_INFINITY;
        }
        double n = block.keyBits();
        return n * (1.0 - entropy(block.phaseError() + nu))
                - block.efficiency() * entropy(block.bitError()) * n
                + Math.log(block.correctness()) / LN_2
                + 2.0 * Math.log(2.0 * left) / LN_2;
    }

    /** ln(eps_pe), the least of all splits of the deviation. */
    private static double lnTail(FiniteKeyBlock block, double nu) {
        return -highest(
                logit -> -lnTail(block, nu / (1.0 + Math.exp(-logit)), nu / (1.0 + Math.exp(logit))),
                SHARES,
                SHARE_STEPS);
    }

    private static double lnTail(FiniteKeyBlock block, double xi, double excess) {
        double n = block.keyBits();
        double k = block.testBits();
        double m = n + k;
        double errors = m * (block.phaseError() + xi);
        double gamma = 1.0 / (errors + 1.0) + 1.0 / (m - errors + 1.0);
        double a = -2.0 * m * k * xi * xi / (n + 1.0);
        double b = -2.0 * gamma * (n * excess * n * excess - 1.0);
        return (Math.max(a, b) + Math.log1p(Math.exp(-Math.abs(a - b)))) / 2.0;
    }

    /** The highest value of a function on a grid and about every peak of its points. */
    private static double highest(DoubleUnaryOperator function, double[] grid, int steps) {
        double[] values = DoubleStream.of(grid).map(function).toArray();
        double highest = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < grid.length; i++) {
            int before = Math.max(0, i - 1);
            int after = Math.min(grid.length - 1, i + 1);
            highest = Math.max(highest, values[i]);
            if (values[i] > values[before] && values[i] >= values[after]) {
                highest = Math.max(highest, golden(function, grid[before], grid[after], steps));
            }
        }
        return highest;
    }

    /** The peak of a function between two points by golden section. */
    private static double golden(DoubleUnaryOperator function, double from, double to, int steps) {
        double width = to - from;
        double end = to;
        double left = end - GOLDEN * width;
        double right = from + GOLDEN * width;
        double atLeft = function.applyAsDouble(left);
        double atRight = function.applyAsDouble(right);
        double start = from;
        for (int i = 0; i < steps; i++) {
            if (atLeft > atRight) {
                end = right;
                right = left;
                atRight = atLeft;
                left = end - GOLDEN * (end - start);
                atLeft = function.applyAsDouble(left);
            } else {
                start = left;
                left = right;
                atLeft = atRight;
                right = start + GOLDEN * (end - start);
                atRight = function.applyAsDouble(right);
            }
        }
        return Math.max(atLeft, atRight);
    }

    private static double entropy(double x) {
        if (x <= 0.0) {
            return 0.0;
        }
        return x >= 0.5 ? 1.0 : -(x * Math.log(x) + (1.0 - x) * Math.log1p(-x)) / LN_2;
    }

    private static DoubleStream series(double from, double to, int count) {
        return IntStream.range(0, count).mapToDouble(i -> from + (to - from) * i / (count - 1));
    }
}

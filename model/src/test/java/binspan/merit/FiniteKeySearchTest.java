package binspan.merit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** The best deviation and the best split of the bound of 2021 against a search on grids of both. */
final class FiniteKeySearchTest {
    private static final int BLOCKS = 40;
    private static final int COARSE = 400;
    private static final int FINE = 200;
    private static final int SPLITS = 2000;

    @Test
    void noGridPointIsBetterThanTheBound() {
        SplittableRandom random = new SplittableRandom(31L);
        for (int i = 0; i < BLOCKS; i++) {
            double n = Math.pow(10.0, 3.3 + 4.0 * random.nextDouble());
            double k = n * Math.pow(10.0, -1.0 + 1.5 * random.nextDouble());
            double error = 0.005 + 0.08 * random.nextDouble();
            double secrecy = Math.pow(10.0, -12.0 + 7.0 * random.nextDouble());
            FiniteKeyBlock block = new FiniteKeyBlock(n, k, error, error, 1.1, secrecy, 1e-12);
            double searched = searched(block);
            double found = FiniteKeyBound.LIM_2021.bits(block);
            if (searched > -0.5 * n) {
                assertThat(found).as("%s", block).isBetween(searched - 1e-6 * n, searched + 2e-5 * n + 0.1);
            }
        }
    }

    /** Length of the key with the best of all deviations and splits of the grid, then of a finer one about the best deviation. */
    private static double searched(FiniteKeyBlock block) {
        double widest = 0.5 - block.phaseError();
        double step = Math.pow(1e-4, -1.0 / COARSE);
        double coarse = searched(block, widest * 1e-4, step, COARSE)[0];
        return searched(block, coarse / step, Math.pow(step, 2.0 / FINE), FINE)[1];
    }

    /** Best deviation of a geometric series, and its key length. */
    private static double[] searched(FiniteKeyBlock block, double from, double step, int count) {
        double[] best = {from, Double.NEGATIVE_INFINITY};
        for (int i = 0; i < count; i++) {
            double nu = from * Math.pow(step, i);
            double tail = Double.POSITIVE_INFINITY;
            for (int j = 1; j < SPLITS; j++) {
                tail = Math.min(tail, tail(block, nu, nu * j / SPLITS));
            }
            double left = block.secrecy() - 2.0 * Math.sqrt(tail);
            double bits = left > 0.0 ? bits(block, nu, left) : Double.NEGATIVE_INFINITY;
            if (bits > best[1]) {
                best[0] = nu;
                best[1] = bits;
            }
        }
        return best;
    }

    private static double tail(FiniteKeyBlock block, double nu, double xi) {
        double n = block.keyBits();
        double m = n + block.testBits();
        double errors = m * (block.phaseError() + xi);
        double gamma = 1.0 / (errors + 1.0) + 1.0 / (m - errors + 1.0);
        double excess = n * (nu - xi);
        return Math.exp(-2.0 * m * block.testBits() * xi * xi / (n + 1.0))
                + Math.exp(-2.0 * gamma * (excess * excess - 1.0));
    }

    private static double bits(FiniteKeyBlock block, double nu, double left) {
        return block.keyBits() * (1.0 - SecretKey.binaryEntropy(block.phaseError() + nu))
                - block.efficiency() * SecretKey.binaryEntropy(block.bitError()) * block.keyBits()
                - Math.log(1.0 / block.correctness()) / Math.log(2.0)
                + 2.0 * Math.log(2.0 * left) / Math.log(2.0);
    }
}

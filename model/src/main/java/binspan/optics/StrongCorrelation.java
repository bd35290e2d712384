package binspan.optics;

import org.apache.commons.numbers.gamma.ErfDifference;
import org.apache.commons.numbers.gamma.Erfc;

/**
 * Rectangle probability of two normal variables that are almost the same.
 *
 * <p>With full correlation it is that of the overlap of both windows. What is missing to it is, for each corner (h, k), the integral over x from 0 to
 * sqrt(1 - r^2) of exp(-(h - k)^2/(2 x^2)) exp(-h k/(1 + s))/s with s = sqrt(1 - x^2), over 2 pi. Of the smooth second factor the first terms of its series
 * in x, exp(-h k/2)(1 + c x^2 + c d x^4) with c = (4 - h k)/8 and d = (12 - h k)/16, are integrated in closed form and the small rest by a Gauss-Legendre
 * rule: Genz, Stat. Comput. 14, 251 (2004), from memory.
 */
final class StrongCorrelation {
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final double SQRT_HALF_PI = Math.sqrt(Math.PI / 2.0);
    private static final double STRONGEST = 1.0 - 1e-14;
    private static final double FAR = 38.0;
    private static final double NEGLIGIBLE = -100.0;

    private StrongCorrelation() {}

    /**
     * The probability.
     *
     * @param fromX start of the first window in units of its rms
     * @param toX its end
     * @param fromY start of the second window
     * @param toY its end
     * @param correlation correlation coefficient, close to 1 and not above
     */
    static double rectangle(double fromX, double toX, double fromY, double toY, double correlation) {
        if (fromX + toX + fromY + toY < 0.0) {
            return rectangle(-toX, -fromX, -toY, -fromY, correlation);
        }
        double r = Math.min(STRONGEST, correlation);
        double square = (1.0 - r) * (1.0 + r);
        double start = Math.max(fromX, fromY);
        double end = Math.min(toX, toY);
        double overlap = end > start ? 0.5 * ErfDifference.value(start / SQRT_TWO, end / SQRT_TWO) : 0.0;
        boolean centred = fromX == -toX && fromY == -toY;
        double missing = missing(toX, toY, square) - missing(toX, fromY, square);
        missing += centred ? missing : missing(fromX, fromY, square) - missing(fromX, toY, square);
        return Math.max(0.0, overlap - missing / (2.0 * Math.PI));
    }

    /** The integral of one corner, from 0 to the square root of {@code square}. */
    private static double missing(double h, double k, double square) {
        if (Math.abs(h) > FAR || Math.abs(k) > FAR) {
            return 0.0;
        }
        double hk = h * k;
        double distance = Math.abs(h - k);
        double apart = distance * distance;
        double end = Math.sqrt(square);
        double c = (4.0 - hk) / 8.0;
        double d = (12.0 - hk) / 16.0;
        return series(hk, apart, distance, square, c, d) + rest(hk, apart, end, c, d);
    }

    private static double series(double hk, double apart, double distance, double square, double c, double d) {
        double end = Math.sqrt(square);
        double exponent = -(apart / square + hk) / 2.0;
        double sum = 0.0;
        if (exponent > NEGLIGIBLE) {
            sum = end
                    * Math.exp(exponent)
                    * (1.0 - c * (apart - square) * (1.0 - d * apart / 5.0) / 3.0 + c * d * square * square / 5.0);
        }
        if (-hk < -NEGLIGIBLE && distance > 0.0) {
            sum -= Math.exp(-hk / 2.0)
                    * SQRT_HALF_PI
                    * Erfc.value(distance / end / SQRT_TWO)
                    * distance
                    * (1.0 - c * apart * (1.0 - d * apart / 5.0) / 3.0);
        }
        return sum;
    }

    /** What the series leaves out. */
    private static double rest(double hk, double apart, double end, double c, double d) {
        GaussLegendre rule = GaussLegendre.twenty();
        double half = end / 2.0;
        double sum = 0.0;
        for (int i = 0; i < rule.nodes.length; i++) {
            double x = half + half * rule.nodes[i];
            double square = x * x;
            double exponent = -(apart / square + hk) / 2.0;
            if (exponent > NEGLIGIBLE) {
                double s = Math.sqrt(1.0 - square);
                double smooth = Math.exp(-hk * square / (2.0 * (1.0 + s) * (1.0 + s))) / s;
                sum += rule.weights[i] * Math.exp(exponent) * (smooth - (1.0 + c * square * (1.0 + d * square)));
            }
        }
        return sum * half;
    }
}

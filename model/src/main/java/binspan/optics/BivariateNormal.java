package binspan.optics;

import org.apache.commons.numbers.gamma.ErfDifference;

/**
 * Probability that two correlated normal variables both fall into their windows.
 *
 * <p>The derivative with respect to the correlation is the density at the corners (Plackett, Biometrika 41, 351 (1954)). With r = sin(theta) the integral
 * from no correlation to r is smooth up to about {@value #STRONG} and taken by Gauss-Legendre rules; for stronger correlation see {@link
 * StrongCorrelation}. Division of labour as by Drezner and Wesolowsky, J. Stat. Comput. Simul. 35, 101 (1990), and Genz, Stat. Comput. 14, 251 (2004),
 * from memory.
 */
public final class BivariateNormal {
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final double FAR = 38.0;
    private static final double WEAK = 0.2;
    private static final double MODERATE = 0.6;
    private static final double STRONG = 0.9;

    private BivariateNormal() {}

    /**
     * Rectangle probability of two standard normal variables.
     *
     * @param fromX start of the first window in units of its rms
     * @param toX its end
     * @param fromY start of the second window in units of its rms
     * @param toY its end
     * @param correlation correlation coefficient, -1 to 1
     */
    public static double rectangle(double fromX, double toX, double fromY, double toY, double correlation) {
        if (correlation > STRONG) {
            return StrongCorrelation.rectangle(fromX, toX, fromY, toY, correlation);
        }
        if (correlation < -STRONG) {
            return StrongCorrelation.rectangle(fromX, toX, -toY, -fromY, -correlation);
        }
        double independent = 0.25
                * ErfDifference.value(fromX / SQRT_TWO, toX / SQRT_TWO)
                * ErfDifference.value(fromY / SQRT_TWO, toY / SQRT_TWO);
        if (correlation == 0.0) {
            return independent;
        }
        double end = Math.asin(correlation);
        return Math.max(0.0, independent + fromIndependence(end, fromX, toX, fromY, toY) / (2.0 * Math.PI));
    }

    private static double fromIndependence(double end, double fromX, double toX, double fromY, double toY) {
        double size = Math.abs(end);
        GaussLegendre rule =
                size < WEAK ? GaussLegendre.six() : size < MODERATE ? GaussLegendre.twelve() : GaussLegendre.twenty();
        boolean centred = fromX == -toX && fromY == -toY;
        double half = end / 2.0;
        double sum = 0.0;
        for (int i = 0; i < rule.nodes.length; i++) {
            double theta = half + half * rule.nodes[i];
            double sin = Math.sin(theta);
            double scale = -0.5 / ((1.0 - sin) * (1.0 + sin));
            double tilt = -1.0 / (1.0 + sin);
            double corners = corner(toX, toY, scale, tilt) - corner(fromX, toY, scale, tilt);
            double opposite = centred ? corners : corner(fromX, fromY, scale, tilt) - corner(toX, fromY, scale, tilt);
            sum += rule.weights[i] * (corners + opposite);
        }
        return sum * half;
    }

    /** exp(-(h^2 + k^2 - 2 h k sin)/(2 cos^2)), written as (h - k)^2/(2 cos^2) + h k/(1 + sin) so that h = k does not cancel. */
    private static double corner(double h, double k, double scale, double tilt) {
        if (Math.abs(h) > FAR || Math.abs(k) > FAR) {
            return 0.0;
        }
        double difference = h - k;
        return Math.exp(scale * difference * difference + tilt * h * k);
    }
}

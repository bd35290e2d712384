package binspan.optics;

import org.apache.commons.numbers.gamma.ErfDifference;

/**
 * Probability that two correlated normal variables both fall into their windows.
 *
 * <p>The derivative with respect to the correlation is the density at the corners (Plackett, Biometrika 41, 351 (1954)). With r = sin(theta) the
 * integral from no correlation to r is smooth; panels halve their distance to theta = 90 degrees, so that correlations near -1 and 1 are resolved.
 */
public final class BivariateNormal {
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final double FAR = 38.0;
    private static final double STRONGEST = 1.0 - 1e-14;

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
        double independent = 0.25
                * ErfDifference.value(fromX / SQRT_TWO, toX / SQRT_TWO)
                * ErfDifference.value(fromY / SQRT_TWO, toY / SQRT_TWO);
        if (correlation == 0.0) {
            return independent;
        }
        double sign = Math.signum(correlation);
        double end = Math.asin(Math.min(STRONGEST, Math.abs(correlation)));
        double sum = 0.0;
        double start = 0.0;
        while (start < end) {
            double stop = Math.min(end, start + (Math.PI / 2.0 - start) / 2.0);
            sum += panel(start, stop, fromX, toX, sign * fromY, sign * toY);
            start = stop;
        }
        return Math.max(0.0, independent + sign * sum / (2.0 * Math.PI));
    }

    private static double panel(double start, double stop, double fromX, double toX, double fromY, double toY) {
        GaussLegendre rule = GaussLegendre.twelve();
        boolean centred = fromX == -toX && fromY == -toY;
        double half = (stop - start) / 2.0;
        double middle = (stop + start) / 2.0;
        double sum = 0.0;
        for (int i = 0; i < rule.nodes.length; i++) {
            double theta = middle + half * rule.nodes[i];
            double sin = Math.sin(theta);
            double cos = Math.cos(theta);
            double scale = -0.5 / (cos * cos);
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

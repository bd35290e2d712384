package binspan.optics;

import org.apache.commons.numbers.gamma.Erf;
import org.apache.commons.numbers.gamma.ErfDifference;
import org.apache.commons.numbers.gamma.Erfc;
import org.apache.commons.numbers.gamma.Erfcx;

/** Probability that a click falls between two times, for the arrival-time shapes of the model; times in s about the mean of the Gaussian part. */
public final class WindowCapture {
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final double SQRT_TWO_PI = Math.sqrt(2.0 * Math.PI);
    private static final double FAR = 38.0;
    private static final double NARROW_BOX = 1e-3;

    private WindowCapture() {}

    /**
     * Gaussian of zero mean.
     *
     * @param from start of the window
     * @param to end of the window
     * @param sigma rms, 0 for a sharp arrival
     */
    public static double gaussian(double from, double to, double sigma) {
        if (sigma == 0.0) {
            return from <= 0.0 && to >= 0.0 ? 1.0 : 0.0;
        }
        if (from > FAR * sigma || to < -FAR * sigma) {
            return 0.0;
        }
        double scale = 1.0 / (SQRT_TWO * sigma);
        return 0.5 * ErfDifference.value(from * scale, to * scale);
    }

    /**
     * Gaussian followed by an exponential delay, the tail of an avalanche detector.
     *
     * @param from start of the window
     * @param to end of the window
     * @param sigma rms of the Gaussian, 0 or more
     * @param tau time constant of the exponential; 0 for none
     */
    public static double tailed(double from, double to, double sigma, double tau) {
        if (tau == 0.0) {
            return gaussian(from, to, sigma);
        }
        double captured = gaussian(from, to, sigma) - late(to, sigma, tau) + late(from, sigma, tau);
        return Math.max(0.0, Math.min(1.0, captured));
    }

    /** Probability that the Gaussian has passed x and the exponential has not: exp(s^2/(2 tau^2) - x/tau) Phi(x/s - s/tau), free of overflow. */
    private static double late(double x, double sigma, double tau) {
        if (sigma == 0.0) {
            return x < 0.0 ? 0.0 : Math.exp(-x / tau);
        }
        double y = (sigma / tau - x / sigma) / SQRT_TWO;
        if (y > 0.0) {
            double z = x / sigma;
            return 0.5 * Math.exp(-z * z / 2.0) * Erfcx.value(y);
        }
        double ratio = sigma / tau;
        return 0.5 * Math.exp(ratio * ratio / 2.0 - x / tau) * Erfc.value(y);
    }

    /**
     * Gaussian convolved with a rectangle: light with a flat-top spectrum after strong dispersion.
     *
     * @param from start of the window
     * @param to end of the window
     * @param width full width of the rectangle
     * @param sigma rms of the Gaussian
     */
    public static double box(double from, double to, double width, double sigma) {
        if (width <= NARROW_BOX * sigma) {
            return gaussian(from, to, Math.sqrt(sigma * sigma + width * width / 12.0));
        }
        double captured = boxed(to, width, sigma) - boxed(from, width, sigma);
        return Math.max(0.0, Math.min(1.0, captured));
    }

    /** G(z) = (sigma/X)[I((z+X/2)/sigma) - I((z-X/2)/sigma)], shifted by a constant: the distribution function less one half. */
    private static double boxed(double z, double width, double sigma) {
        if (sigma == 0.0) {
            return Math.max(-0.5, Math.min(0.5, z / width));
        }
        return sigma / (2.0 * width) * (evenRamp((z + width / 2.0) / sigma) - evenRamp((z - width / 2.0) / sigma));
    }

    /** 2 I(y) - y = y erf(y/sqrt 2) + 2 phi(y), even in y. */
    private static double evenRamp(double y) {
        return y * Erf.value(y / SQRT_TWO) + 2.0 * Math.exp(-y * y / 2.0) / SQRT_TWO_PI;
    }
}

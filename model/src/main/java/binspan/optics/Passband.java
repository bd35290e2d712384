package binspan.optics;

import binspan.scenario.PassbandShape;
import binspan.units.GaussianWidth;
import org.apache.commons.numbers.gamma.Erf;

/**
 * Power transmission of all filters of an arm together against the detuning W from its centre: exp(-W^2/(2 s^2)) inside |W| &lt; a, nothing outside.
 *
 * @param gaussianRms rms s of the Gaussian part, rad/s; infinite without one
 * @param halfWidth half width a of the flat-top part, rad/s; infinite without one
 */
public record Passband(double gaussianRms, double halfWidth) {
    /** No filter at all. */
    public static final Passband OPEN = new Passband(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY);

    private static final double SQRT_TWO_PI = Math.sqrt(2.0 * Math.PI);
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final double NEARLY_FLAT = 1e-2;

    /**
     * One filter.
     *
     * @param fwhmHz full width at half maximum, Hz
     * @param shape shape of its passband
     */
    public static Passband of(double fwhmHz, PassbandShape shape) {
        return shape == PassbandShape.GAUSSIAN
                ? new Passband(2.0 * Math.PI * GaussianWidth.rms(fwhmHz), Double.POSITIVE_INFINITY)
                : new Passband(Double.POSITIVE_INFINITY, Math.PI * fwhmHz);
    }

    /** Both filters in a row: Gaussian widths add as 1/s^2, the narrowest flat top cuts. */
    public Passband and(Passband other) {
        double inverse = 1.0 / (gaussianRms * gaussianRms) + 1.0 / (other.gaussianRms * other.gaussianRms);
        return new Passband(1.0 / Math.sqrt(inverse), Math.min(halfWidth, other.halfWidth));
    }

    /** Whether the other filters are exactly the same. */
    boolean same(Passband other) {
        return gaussianRms == other.gaussianRms && halfWidth == other.halfWidth;
    }

    /** Whether only Gaussian filters stand here. */
    public boolean gaussian() {
        return halfWidth == Double.POSITIVE_INFINITY;
    }

    /** Whether only flat-top filters stand here. */
    public boolean flat() {
        return gaussianRms == Double.POSITIVE_INFINITY;
    }

    /** Integral of the transmission over the detuning, rad/s. */
    public double area() {
        if (flat()) {
            return 2.0 * halfWidth;
        }
        return SQRT_TWO_PI * gaussianRms * (gaussian() ? 1.0 : Erf.value(halfWidth / (SQRT_TWO * gaussianRms)));
    }

    /** Width of the rectangle that passes as much white noise, Hz; 1.0645 FWHM for a Gaussian. */
    public double noiseBandwidthHz() {
        return area() / (2.0 * Math.PI);
    }

    /** Temporal modes per second of light with this spectrum, area^2/(2 pi integral of its square): s/sqrt(pi) for a Gaussian, B for a flat top. */
    public double modesPerSecond() {
        double squared = flat()
                ? 2.0 * halfWidth
                : Math.sqrt(Math.PI) * gaussianRms * (gaussian() ? 1.0 : Erf.value(halfWidth / gaussianRms));
        return area() * area() / (2.0 * Math.PI * squared);
    }

    /** Variance of the transmitted white light, (rad/s)^2. */
    public double variance() {
        double square = gaussianRms * gaussianRms;
        if (gaussian()) {
            return square;
        }
        double x = halfWidth / gaussianRms;
        if (x < NEARLY_FLAT) {
            return halfWidth * halfWidth / 3.0 * (1.0 - 2.0 * x * x / 15.0);
        }
        return square * (1.0 - 2.0 * x * Math.exp(-x * x / 2.0) / (SQRT_TWO_PI * Erf.value(x / SQRT_TWO)));
    }

    /** Relative transmission at a detuning in rad/s, 1 at the centre. */
    public double at(double detuning) {
        if (Math.abs(detuning) > halfWidth) {
            return 0.0;
        }
        double x = detuning / gaussianRms;
        return Math.exp(-x * x / 2.0);
    }
}

package binspan.optics;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * Captures where a flat-top filter shapes the spectrum, so that dispersion spreads the light into a box instead of a Gaussian.
 *
 * <p>A pair is born at a common time t0 (rms of the pulse) with detunings W_A, W_B and arrives at t0 + beta_X W_X, each photon blurred by its own
 * near field, detector and clock: captures are conditional on t0 and the detunings and then averaged over both.
 */
final class BoxedCapture {
    private static final GaussIntegrator BIRTH = new GaussIntegratorFactory().hermite(7);
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final double SQRT_PI = Math.sqrt(Math.PI);

    private BoxedCapture() {}

    /** The two ports of a coincidence. */
    record Ports(PortTiming a, PortTiming b) {}

    /** Captured share of the pairs. */
    static double of(PairSpectrum spectrum, double betaA, double betaB, Ports ports, Window windowA, Window windowB) {
        SpectralGrid grid = SpectralGrid.of(spectrum.alice(), spectrum.bob(), spectrum.pumpRms(), 1);
        double sigmaA = Math.sqrt(0.25 / spectrum.alice().variance() + ports.a().variance());
        double sigmaB = Math.sqrt(0.25 / spectrum.bob().variance() + ports.b().variance());
        double birthRms = Math.sqrt(spectrum.inversePump()) / 2.0;
        double sum = 0.0;
        for (int birth = 0; birth < BIRTH.getNumberOfPoints(); birth++) {
            double t0 = SQRT_TWO * birthRms * BIRTH.getPoint(birth);
            double captured = 0.0;
            double lastDetuning = Double.NaN;
            double captureA = 0.0;
            for (int i = 0; i < grid.probability.length; i++) {
                if (grid.alice[i] != lastDetuning) {
                    lastDetuning = grid.alice[i];
                    captureA = capture(ports.a(), windowA, t0 + betaA * lastDetuning, sigmaA);
                }
                captured +=
                        grid.probability[i] * captureA * capture(ports.b(), windowB, t0 + betaB * grid.bob[i], sigmaB);
            }
            sum += BIRTH.getWeight(birth) / SQRT_PI * captured;
        }
        return sum;
    }

    /**
     * Captured share of an arm's singles, whose spectrum its own filters alone shape.
     *
     * @param filters filters of the arm
     * @param inversePump 1/s_P^2 of the pump pulse, s^2
     * @param beta group-delay dispersion of the arm, s^2
     * @param port output port
     * @param window window about the mean arrival
     */
    static double singles(Passband filters, double inversePump, double beta, PortTiming port, Window window) {
        double sigma = Math.sqrt((1.0 / filters.variance() + inversePump) / 4.0 + port.variance());
        if (filters.flat() && !port.tailed()) {
            return WindowCapture.box(window.from(), window.to(), 2.0 * filters.halfWidth() * Math.abs(beta), sigma);
        }
        GaussLegendre rule = GaussLegendre.SIXTEEN;
        double reach = Math.min(filters.halfWidth(), 6.5 * filters.gaussianRms());
        double captured = 0.0;
        double mass = 0.0;
        for (int panel = -2; panel < 2; panel++) {
            for (int i = 0; i < rule.nodes.length; i++) {
                double detuning = reach * (panel + 0.5 + 0.5 * rule.nodes[i]) / 2.0;
                double weight = rule.weights[i] * filters.at(detuning);
                mass += weight;
                captured += weight * capture(port, window, beta * detuning, sigma);
            }
        }
        return captured / mass;
    }

    private static double capture(PortTiming port, Window window, double late, double sigma) {
        return port.capture(window.from() - late, window.to() - late, sigma);
    }
}

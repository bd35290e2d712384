package binspan.optics;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * Captures where a flat-top filter shapes the spectrum, so that dispersion spreads the light into a box instead of a Gaussian.
 *
 * <p>A pair is born at a common time t0 (rms of the pulse) with detunings W_A, W_B and arrives at t0 + beta_X W_X, each photon blurred by its own near
 * field, detector and clock: captures are conditional on t0 and the detunings and then averaged over both.
 */
final class BoxedCapture {
    private static final double SQRT_TWO = Math.sqrt(2.0);
    private static final double SQRT_PI = Math.sqrt(Math.PI);
    private static final double REACH = 6.5;

    private final PairSpectrum spectrum;
    private final double betaA;
    private final double betaB;
    private final SpectralGrid grid;
    private final double birthRms;

    BoxedCapture(PairSpectrum spectrum, double betaA, double betaB) {
        this.spectrum = spectrum;
        this.betaA = betaA;
        this.betaB = betaB;
        this.grid = SpectralGrid.of(spectrum.alice(), spectrum.bob(), spectrum.pumpRms(), 1);
        this.birthRms = Math.sqrt(spectrum.inversePump()) / 2.0;
    }

    /** Times of birth, weighted as a Gaussian pulse. */
    private static final class Birth {
        static final GaussIntegrator RULE = new GaussIntegratorFactory().hermite(7);
    }

    /** Captured share of the pairs, the windows about each photon's mean arrival. */
    double of(PortTiming a, PortTiming b, Window windowA, Window windowB) {
        GaussIntegrator birth = Birth.RULE;
        double earliest = SQRT_TWO * birthRms * Math.abs(birth.getPoint(0));
        CaptureTable captureA = table(spectrum.alice(), a, windowA, earliest + Math.abs(betaA) * grid.farthestAlice());
        CaptureTable captureB = table(spectrum.bob(), b, windowB, earliest + Math.abs(betaB) * grid.farthestBob());
        double sum = 0.0;
        for (int i = 0; i < birth.getNumberOfPoints(); i++) {
            double t0 = SQRT_TWO * birthRms * birth.getPoint(i);
            sum += birth.getWeight(i) / SQRT_PI * captured(captureA, captureB, t0);
        }
        return sum;
    }

    private static CaptureTable table(Passband filters, PortTiming port, Window window, double latest) {
        return CaptureTable.of(port, window, Math.sqrt(0.25 / filters.variance() + port.variance()), latest);
    }

    private double captured(CaptureTable captureA, CaptureTable captureB, double t0) {
        double captured = 0.0;
        double lastDetuning = Double.NaN;
        double ofAlice = 0.0;
        for (int i = 0; i < grid.probability.length; i++) {
            if (grid.alice[i] != lastDetuning) {
                lastDetuning = grid.alice[i];
                ofAlice = captureA.at(t0 + betaA * lastDetuning);
            }
            captured += grid.probability[i] * ofAlice * captureB.at(t0 + betaB * grid.bob[i]);
        }
        return captured;
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
        GaussLegendre rule = GaussLegendre.sixteen();
        double reach = Math.min(filters.halfWidth(), REACH * filters.gaussianRms());
        double captured = 0.0;
        double mass = 0.0;
        for (int panel = -2; panel < 2; panel++) {
            for (int i = 0; i < rule.nodes.length; i++) {
                double detuning = reach * (panel + 0.5 + 0.5 * rule.nodes[i]) / 2.0;
                double weight = rule.weights[i] * filters.at(detuning);
                double late = beta * detuning;
                mass += weight;
                captured += weight * port.capture(window.from() - late, window.to() - late, sigma);
            }
        }
        return captured / mass;
    }
}

package binspan.optics;

/**
 * Captures where a flat-top filter shapes the spectrum, so that dispersion spreads the light into a box instead of a Gaussian.
 *
 * <p>A pair is born at a common time t0 (rms of the pulse) with detunings W_A, W_B and arrives at t0 + beta_X W_X, each photon blurred by its own near
 * field, detector and clock: captures are conditional on t0 and the detunings and then averaged over both.
 */
final class BoxedCapture {
    private static final double BIRTH_REACH = 5.0;
    private static final double BIRTH_STEP = 1.2;
    private static final int MOST_BIRTHS = 40;
    private static final double SIGMAS_PER_PANEL = 12.0;
    private static final int MOST_PANELS = 8;
    private static final double REACH = 6.5;
    private static final double NEVER = 1e-18;

    private final PairSpectrum spectrum;
    private final double betaA;
    private final double betaB;
    private final double birthRms;
    private SpectralGrid grid;
    private int panelsAlice;
    private int panelsSum;

    BoxedCapture(PairSpectrum spectrum, double betaA, double betaB) {
        this.spectrum = spectrum;
        this.betaA = betaA;
        this.betaB = betaB;
        this.birthRms = Math.sqrt(spectrum.inversePump()) / 2.0;
    }

    /** Captured share of the pairs, the windows about each photon's mean arrival. */
    double of(PortTiming a, PortTiming b, Window windowA, Window windowB) {
        double sigmaA = Math.sqrt(0.25 / spectrum.alice().variance() + a.variance());
        double sigmaB = Math.sqrt(0.25 / spectrum.bob().variance() + b.variance());
        double step = birthStep(sigmaA, sigmaB);
        int steps = (int) Math.ceil(BIRTH_REACH * birthRms / step);
        resolve(sigmaA, sigmaB);
        double earliest = steps * step;
        CaptureTable captureA = CaptureTable.of(a, windowA, sigmaA, earliest + Math.abs(betaA) * grid.farthestAlice());
        CaptureTable captureB = CaptureTable.of(b, windowB, sigmaB, earliest + Math.abs(betaB) * grid.farthestBob());
        double sum = 0.0;
        double mass = 0.0;
        for (int i = -steps; i <= steps; i++) {
            double weight = birthWeight(i * step);
            mass += weight;
            sum += weight * captured(captureA, captureB, i * step);
        }
        return sum / mass;
    }

    /** The share of the pairs whose photon clicks inside alice's window and in each of bob's bins, both about each photon's mean arrival. */
    double[] binned(PortTiming a, PortTiming b, Window windowA, TimeBins binsB) {
        double sigmaA = Math.sqrt(0.25 / spectrum.alice().variance() + a.variance());
        double sigmaB = Math.sqrt(0.25 / spectrum.bob().variance() + b.variance());
        double step = birthStep(sigmaA, sigmaB);
        int steps = (int) Math.ceil(BIRTH_REACH * birthRms / step);
        resolve(sigmaA, sigmaB);
        double earliest = steps * step;
        CaptureTable captureA = CaptureTable.of(a, windowA, sigmaA, earliest + Math.abs(betaA) * grid.farthestAlice());
        double farthest = earliest + Math.abs(betaB) * grid.farthestBob();
        ArrivalDeposit deposit = new ArrivalDeposit(b, sigmaB, binsB, -farthest, farthest);
        double mass = 0.0;
        for (int i = -steps; i <= steps; i++) {
            mass += birthWeight(i * step);
        }
        for (int i = -steps; i <= steps; i++) {
            born(captureA, deposit, i * step, birthWeight(i * step) / mass);
        }
        return deposit.binned();
    }

    private double birthWeight(double t0) {
        double x = t0 / birthRms;
        return Math.exp(-x * x / 2.0);
    }

    /** Lays down bob's photons of the pairs born at one time. */
    private void born(CaptureTable captureA, ArrivalDeposit deposit, double t0, double weight) {
        double lastDetuning = Double.NaN;
        double ofAlice = 0.0;
        for (int i = 0; i < grid.probability.length; i++) {
            if (grid.alice[i] != lastDetuning) {
                lastDetuning = grid.alice[i];
                ofAlice = weight * captureA.at(t0 + betaA * lastDetuning);
            }
            if (ofAlice > NEVER) {
                deposit.put(t0 + betaB * grid.bob[i], ofAlice * grid.probability[i]);
            }
        }
    }

    /** Makes the grid so fine that a panel spreads the arrivals over few of the widths by which the clicks are blurred. */
    private void resolve(double sigmaA, double sigmaB) {
        double blursPerDetuning = Math.max(Math.abs(betaA) / sigmaA, Math.abs(betaB) / sigmaB) / SIGMAS_PER_PANEL;
        int alice = panels(
                blursPerDetuning * SpectralGrid.widestPanel(spectrum.alice(), spectrum.bob(), spectrum.pumpRms()));
        int sum = panels(Math.abs(betaB) / sigmaB / SIGMAS_PER_PANEL * 2.0 * REACH * spectrum.pumpRms());
        if (grid == null || alice != panelsAlice || sum != panelsSum) {
            grid = SpectralGrid.of(spectrum.alice(), spectrum.bob(), spectrum.pumpRms(), alice, sum);
            panelsAlice = alice;
            panelsSum = sum;
        }
    }

    private static int panels(double wanted) {
        return (int) Math.max(1.0, Math.min(MOST_PANELS, Math.ceil(wanted)));
    }

    /** Step of the trapezoidal rule over the time of birth: it converges exponentially once the blur of the clicks is resolved. */
    private double birthStep(double sigmaA, double sigmaB) {
        double fine = Math.sqrt(1.0 / (birthRms * birthRms) + 1.0 / (sigmaA * sigmaA) + 1.0 / (sigmaB * sigmaB));
        return Math.max(BIRTH_STEP / fine, BIRTH_REACH * birthRms / MOST_BIRTHS);
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
        DetuningNodes nodes =
                DetuningNodes.of(filters, beta, new DetuningNodes.View(window, sigma, port.tailTime(), 0.0));
        double captured = 0.0;
        for (int i = 0; i < nodes.count(); i++) {
            double late = beta * nodes.detuning[i];
            captured += nodes.weight[i] * port.capture(window.from() - late, window.to() - late, sigma);
        }
        return captured / filters.area();
    }

    /** The same in the bins of a histogram. */
    static double[] singles(Passband filters, double inversePump, double beta, PortTiming port, TimeBins bins) {
        double sigma = Math.sqrt((1.0 / filters.variance() + inversePump) / 4.0 + port.variance());
        Window all = new Window(bins.start(), bins.end());
        if (filters.flat() && !port.tailed()) {
            double width = 2.0 * filters.halfWidth() * Math.abs(beta);
            double[] shares = new double[bins.count()];
            for (int i = 0; i < shares.length; i++) {
                shares[i] = WindowCapture.box(bins.edge(i), bins.edge(i + 1), width, sigma);
            }
            return shares;
        }
        DetuningNodes nodes = DetuningNodes.of(filters, beta, new DetuningNodes.View(all, sigma, port.tailTime(), 0.0));
        if (nodes.count() == 0) {
            return new double[bins.count()];
        }
        double first = beta * nodes.detuning[0];
        double last = beta * nodes.detuning[nodes.count() - 1];
        ArrivalDeposit deposit = new ArrivalDeposit(port, sigma, bins, Math.min(first, last), Math.max(first, last));
        for (int i = 0; i < nodes.count(); i++) {
            deposit.put(beta * nodes.detuning[i], nodes.weight[i] / filters.area());
        }
        return deposit.binned();
    }
}

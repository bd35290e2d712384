package binspan.optics;

/**
 * Captures as plain sums over birth times and a grid of both detunings, cells so small that nothing changes across one: slow, and made of nothing but
 * the definition. A photon of detuning W born at t0 arrives at t0 + beta W, blurred by near field and detector.
 */
final class DetuningSum {
    private static final int CELLS = 500;
    private static final int BIRTHS = 161;
    private static final double BIRTH_REACH = 6.0;

    private final PairSpectrum spectrum;
    private final double betaA;
    private final double betaB;
    private final double[] alice;
    private final double[] bob;

    DetuningSum(PairSpectrum spectrum, double betaA, double betaB) {
        this.spectrum = spectrum;
        this.betaA = betaA;
        this.betaB = betaB;
        this.alice = cells(spectrum.alice());
        this.bob = cells(spectrum.bob());
    }

    private static double[] cells(Passband filters) {
        double reach = Math.min(filters.halfWidth(), 6.0 * filters.gaussianRms());
        double[] cells = new double[CELLS];
        for (int i = 0; i < CELLS; i++) {
            cells[i] = reach * (2.0 * (i + 0.5) / CELLS - 1.0);
        }
        return cells;
    }

    double pairs(PortTiming a, PortTiming b, Window windowA, Window windowB) {
        double[][] density = new double[CELLS][CELLS];
        double mass = 0.0;
        for (int i = 0; i < CELLS; i++) {
            for (int j = 0; j < CELLS; j++) {
                double x = (alice[i] + bob[j]) / spectrum.pumpRms();
                density[i][j] = Math.exp(-x * x / 2.0)
                        * spectrum.alice().at(alice[i])
                        * spectrum.bob().at(bob[j]);
                mass += density[i][j];
            }
        }
        double sigmaA = Math.sqrt(0.25 / spectrum.alice().variance() + a.variance());
        double sigmaB = Math.sqrt(0.25 / spectrum.bob().variance() + b.variance());
        double sum = 0.0;
        double weights = 0.0;
        for (int t = 0; t < BIRTHS; t++) {
            double z = BIRTH_REACH * (2.0 * t / (BIRTHS - 1) - 1.0);
            double t0 = z * 0.5 / spectrum.pumpRms();
            double[] ofAlice = captured(alice, betaA, t0, a, windowA, sigmaA);
            double[] ofBob = captured(bob, betaB, t0, b, windowB, sigmaB);
            double weight = Math.exp(-z * z / 2.0);
            weights += weight;
            sum += weight * product(ofAlice, density, ofBob);
        }
        return sum / (weights * mass);
    }

    double singles(PortTiming port, Window window) {
        double sigma = Math.sqrt((1.0 / spectrum.alice().variance() + spectrum.inversePump()) / 4.0 + port.variance());
        double reach =
                Math.min(spectrum.alice().halfWidth(), 6.0 * spectrum.alice().gaussianRms());
        int cells = 40 * CELLS;
        double sum = 0.0;
        double mass = 0.0;
        for (int i = 0; i < cells; i++) {
            double detuning = reach * (2.0 * (i + 0.5) / cells - 1.0);
            double weight = spectrum.alice().at(detuning);
            mass += weight;
            sum += weight * captured(port, window, betaA * detuning, sigma);
        }
        return sum / mass;
    }

    private static double[] captured(
            double[] detunings, double beta, double t0, PortTiming port, Window window, double sigma) {
        double[] captured = new double[detunings.length];
        for (int i = 0; i < captured.length; i++) {
            captured[i] = captured(port, window, t0 + beta * detunings[i], sigma);
        }
        return captured;
    }

    private static double captured(PortTiming port, Window window, double late, double sigma) {
        double from = window.from() - late;
        double to = window.to() - late;
        double core = Integral.normal(from / sigma, to / sigma);
        double p = port.tailFraction();
        return p == 0.0 ? core : (1.0 - p) * core + p * WindowCapture.tailed(from, to, sigma, port.tailTime());
    }

    private static double product(double[] ofAlice, double[][] density, double[] ofBob) {
        double sum = 0.0;
        for (int i = 0; i < ofAlice.length; i++) {
            if (ofAlice[i] > 0.0) {
                double row = 0.0;
                for (int j = 0; j < ofBob.length; j++) {
                    row += density[i][j] * ofBob[j];
                }
                sum += ofAlice[i] * row;
            }
        }
        return sum;
    }
}

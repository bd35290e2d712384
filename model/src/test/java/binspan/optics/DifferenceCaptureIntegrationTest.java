package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.PassbandShape;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Captured time differences of a continuous-pump pair against sums over detuning and the delays of both tails. */
final class DifferenceCaptureIntegrationTest {
    private static final double PICO = 1e-12;
    private static final double NO_MEASUREMENT = Double.NaN;
    private static final double[][] WINDOWS = {{-200.0, 200.0}, {-30.0, 60.0}, {250.0, 650.0}, {-900.0, -500.0}};

    @ParameterizedTest(name = "{0} with {1}, {2} ps^2, tails {3} of {4} ps and {5} of {6} ps")
    @CsvSource({
        "gaussian, gaussian, 0, 0, 0, 0, 0",
        "gaussian, gaussian, -6500, 0.2, 150, 0.3, 60",
        "gaussian, gaussian, 1000, 0, 0, 0.3, 60",
        "flat, flat, -6500, 0, 0, 0, 0",
        "flat, flat, -6500, 0.2, 150, 0, 0",
        "flat, flat, 650, 0.2, 150, 0.3, 60",
        "gaussian, flat, -6500, 0, 0, 0, 0",
        "gaussian, flat, 13000, 0, 0, 0, 0",
        "gaussian, flat, 3000, 0.1, 400, 0.4, 400",
        "flat, gaussian, 0, 0.1, 40, 0.4, 300"
    })
    void agreesWithTheSumOverDetuningsAndDelays(
            String a, String b, double beta, double p, double tailA, double q, double tailB) {
        PairSpectrum spectrum = spectrum(passband(a), passband(b));
        PortTiming alice = new PortTiming(900.0 * PICO * PICO, p, tailA * PICO);
        PortTiming bob = new PortTiming(100.0 * PICO * PICO, q, tailB * PICO);
        for (double[] w : WINDOWS) {
            Window window = new Window(w[0] * PICO, w[1] * PICO);
            double found = DifferenceCapture.of(spectrum, beta * PICO * PICO, alice, bob, window);
            double expected = sum(spectrum, beta * PICO * PICO, alice, bob, window);
            assertThat(found).as("%f to %f ps", w[0], w[1]).isCloseTo(expected, within(1e-8));
        }
    }

    /** Equal and opposite dispersions leave the difference as it was, to the last digit (Franson, Phys. Rev. A 45, 3126 (1992)). */
    @ParameterizedTest(name = "{0} ps/nm")
    @ValueSource(doubles = {5.0, 510.0, 1e5})
    void oppositeDispersionsCancelExactly(double dispersion) {
        PortTiming port = new PortTiming(400.0 * PICO * PICO, 0.1, 80.0 * PICO);
        double fibre = OpticalPaths.groupDelayDispersion(dispersion, 1550.0);
        double compensator = OpticalPaths.groupDelayDispersion(-dispersion, 1550.0);
        for (String shape : new String[] {"gaussian", "flat"}) {
            PairSpectrum spectrum = spectrum(passband(shape), passband("flat"));
            for (double[] w : WINDOWS) {
                Window window = new Window(w[0] * PICO, w[1] * PICO);
                assertThat(DifferenceCapture.of(spectrum, fibre + compensator, port, port, window))
                        .isEqualTo(DifferenceCapture.of(spectrum, 0.0, port, port, window));
            }
        }
    }

    /** Windows side by side see every pair once. */
    @Test
    void wholeLineCapturesEveryPair() {
        PortTiming port = new PortTiming(400.0 * PICO * PICO, 0.3, 200.0 * PICO);
        PairSpectrum spectrum = spectrum(passband("gaussian"), passband("flat"));
        double captured = 0.0;
        for (int i = -40; i < 40; i++) {
            captured +=
                    DifferenceCapture.of(spectrum, -6500e-24, port, port, new Window(i * 300e-12, (i + 1) * 300e-12));
        }
        assertThat(captured).isCloseTo(1.0, within(1e-8));
    }

    private static double sum(PairSpectrum spectrum, double betaSum, PortTiming a, PortTiming b, Window window) {
        double near = (1.0 / spectrum.alice().variance() + 1.0 / spectrum.bob().variance()) / 4.0;
        double sigma = Math.sqrt(near + a.variance() + b.variance());
        double reach = Math.min(reach(spectrum.alice()), reach(spectrum.bob()));
        int cells = 4000;
        double captured = 0.0;
        double mass = 0.0;
        for (int i = 0; i < cells; i++) {
            double detuning = reach * (2.0 * (i + 0.5) / cells - 1.0);
            double weight = spectrum.alice().at(detuning) * spectrum.bob().at(-detuning);
            mass += weight;
            captured += weight * difference(window.shifted(-betaSum * detuning), sigma, a, b);
        }
        return captured / mass;
    }

    private static double reach(Passband filters) {
        return Math.min(filters.halfWidth(), 7.0 * filters.gaussianRms());
    }

    private static double difference(Window w, double sigma, PortTiming a, PortTiming b) {
        double p = a.tailFraction();
        double q = b.tailFraction();
        double core = Integral.normal(w.from() / sigma, w.to() / sigma);
        if (p == 0.0 && q == 0.0) {
            return core;
        }
        double late = WindowCapture.tailed(w.from(), w.to(), sigma, a.tailTime());
        double early = WindowCapture.tailed(-w.to(), -w.from(), sigma, b.tailTime());
        double both = p * q == 0.0
                ? 0.0
                : exponential(v -> WindowCapture.tailed(
                        w.from() + v * b.tailTime(), w.to() + v * b.tailTime(), sigma, a.tailTime()));
        return (1.0 - p) * (1.0 - q) * core + p * (1.0 - q) * late + (1.0 - p) * q * early + p * q * both;
    }

    /** Mean over an exponential delay in units of its time constant. */
    private static double exponential(DoubleUnaryOperator value) {
        int panels = 40;
        double width = 36.0 / panels;
        double sum = 0.0;
        GaussLegendre rule = GaussLegendre.sixteen();
        for (int panel = 0; panel < panels; panel++) {
            for (int i = 0; i < rule.nodes.length; i++) {
                double v = width * (panel + 0.5 + 0.5 * rule.nodes[i]);
                sum += width / 2.0 * rule.weights[i] * Math.exp(-v) * value.applyAsDouble(v);
            }
        }
        return sum;
    }

    private static Passband passband(String shape) {
        return Passband.of(75e9, shape.equals("flat") ? PassbandShape.FLAT_TOP : PassbandShape.GAUSSIAN);
    }

    private static PairSpectrum spectrum(Passband a, Passband b) {
        return PairSpectra.of(new SpectrumInputs(a, b, 0.0, 0.0, NO_MEASUREMENT, NO_MEASUREMENT, NO_MEASUREMENT));
    }
}

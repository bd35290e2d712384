package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Shapes of the arrival time against integrals of their densities over the window. */
final class WindowCaptureIntegrationTest {
    private static final double PICO = 1e-12;
    private static final double SIGMA = 50.0 * PICO;
    private static final double[][] WINDOWS = {
        {-200.0, 200.0}, {-10.0, 15.0}, {100.0, 500.0}, {-700.0, -300.0}, {0.0, 50.0}, {2000.0, 2400.0}, {-1.0, 1.0}
    };

    /** Tails from far below the jitter to far above any window. */
    @ParameterizedTest(name = "time constant {0} s")
    @ValueSource(doubles = {1e-15, 1e-14, 1e-13, 1e-12, 5e-12, 2e-11, 5e-11, 1.5e-10, 1e-9, 1e-8, 1e-6, 1e-3, 1.0})
    void tailAgreesWithIntegral(double tau) {
        for (double[] w : WINDOWS) {
            double from = w[0] * PICO;
            double to = w[1] * PICO;
            double expected = delayed(from, to, tau);
            assertThat(WindowCapture.tailed(from, to, SIGMA, tau))
                    .as("%f to %f ps", w[0], w[1])
                    .isCloseTo(expected, within(1e-14));
        }
    }

    /** Far after the pulse only the tail is left, small and still exact. */
    @ParameterizedTest(name = "{0} time constants late")
    @ValueSource(doubles = {5.0, 20.0, 60.0, 200.0})
    void farTailKeepsItsRelativeAccuracy(double late) {
        double tau = 150.0 * PICO;
        double from = late * tau;
        double to = from + 400.0 * PICO;
        double expected = delayed(from, to, tau);
        assertThat(WindowCapture.tailed(from, to, SIGMA, tau)).isCloseTo(expected, within(1e-9 * expected));
    }

    /** No window and no shape may overflow or leave [0, 1]. */
    @Test
    void extremesStayProbabilities() {
        for (double tau : new double[] {0.0, 1e-18, 1e-15, 1e-12, 1.0, 1e6}) {
            for (double sigma : new double[] {0.0, 1e-18, 1e-12, 1e-9, 1e-3}) {
                for (double[] w : WINDOWS) {
                    double captured = WindowCapture.tailed(w[0] * PICO, w[1] * PICO, sigma, tau);
                    assertThat(captured).as("sigma %g, tau %g", sigma, tau).isBetween(0.0, 1.0);
                }
            }
        }
    }

    @ParameterizedTest(name = "box of {0} ps with {1} ps rms")
    @CsvSource({"0.001, 50", "0.05, 50", "1, 50", "30, 50", "200, 50", "800, 50", "800, 1", "800, 0.001", "5000, 20"})
    void boxAgreesWithIntegral(double widthPs, double rmsPs) {
        double width = widthPs * PICO;
        double sigma = rmsPs * PICO;
        for (double[] w : WINDOWS) {
            double from = w[0] * PICO;
            double to = w[1] * PICO;
            double expected = rectangle(from, to, width, sigma);
            assertThat(WindowCapture.box(from, to, width, sigma))
                    .as("%f to %f ps", w[0], w[1])
                    .isCloseTo(expected, within(2e-12));
        }
    }

    @Test
    void sharpBoxIsItsOverlap() {
        assertThat(WindowCapture.box(-10.0, 30.0, 100.0, 0.0)).isCloseTo(0.4, within(1e-15));
        assertThat(WindowCapture.box(40.0, 90.0, 100.0, 0.0)).isCloseTo(0.1, within(1e-15));
        assertThat(WindowCapture.box(60.0, 90.0, 100.0, 0.0)).isZero();
    }

    @ParameterizedTest(name = "from {0} rms")
    @ValueSource(doubles = {-30.0, -9.0, -2.0, 0.0, 1.0, 8.0, 25.0, 37.0})
    void gaussianAgreesWithIntegralInItsTails(double from) {
        double expected = Integral.over(Integral::density, from, from + 0.5, from + 2.0, from + 8.0);
        double found = WindowCapture.gaussian(from * SIGMA, (from + 8.0) * SIGMA, SIGMA);
        assertThat(found).isCloseTo(expected, within(1e-10 * expected));
    }

    /** Mean over the exponential delay u tau of what the window captures of the Gaussian. */
    private static double delayed(double from, double to, double tau) {
        double[] breaks = DoubleStream.concat(
                        DoubleStream.of(0.0, 1.0, 5.0, 20.0, 60.0, 300.0),
                        DoubleStream.of(-9.0, -3.0, 0.0, 3.0, 9.0)
                                .flatMap(k -> DoubleStream.of((from + k * SIGMA) / tau, (to + k * SIGMA) / tau)))
                .filter(u -> u >= 0.0 && u <= 300.0)
                .sorted()
                .toArray();
        return Integral.over(
                u -> Math.exp(-u) * Integral.normal((from - u * tau) / SIGMA, (to - u * tau) / SIGMA), breaks);
    }

    /** Mean over the rectangle of what the window captures of the Gaussian. */
    private static double rectangle(double from, double to, double width, double sigma) {
        double half = width / 2.0;
        double[] breaks = DoubleStream.concat(
                        DoubleStream.of(-half, half),
                        DoubleStream.of(-9.0, -3.0, 0.0, 3.0, 9.0)
                                .flatMap(k -> DoubleStream.of(from + k * sigma, to + k * sigma)))
                .filter(x -> x >= -half && x <= half)
                .sorted()
                .toArray();
        return Integral.over(x -> Integral.normal((from - x) / sigma, (to - x) / sigma), breaks) / width;
    }
}

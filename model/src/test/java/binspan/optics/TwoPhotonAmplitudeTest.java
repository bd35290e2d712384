package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.PassbandShape;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.transform.DftNormalization;
import org.apache.commons.math3.transform.FastFourierTransformer;
import org.apache.commons.math3.transform.TransformType;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Arrival times and captures against the Fourier transform of the two-photon amplitude: exact for Gaussian filters and pulses. Of a flat top the model
 * keeps the variance of its near field only, whose true shape has side lobes; the last test says what that costs.
 */
final class TwoPhotonAmplitudeTest {
    private static final double PICO = 1e-12;
    private static final double NO_MEASUREMENT = Double.NaN;
    private static final double BANDWIDTH = 75e9;
    private static final int SIZE = 512;

    /** Joint intensity of the arrival times on a grid. */
    private static final class Arrivals {
        private final double[][] probability;
        private final double step;

        Arrivals(double[][] probability, double step) {
            this.probability = probability;
            this.step = step;
        }

        double time(int i) {
            return (i - SIZE / 2) * step;
        }

        double mean(double[] a, double[] b) {
            double sum = 0.0;
            for (int i = 0; i < SIZE; i++) {
                for (int j = 0; j < SIZE; j++) {
                    sum += probability[i][j] * a[i] * b[j];
                }
            }
            return sum;
        }

        /** Mean of t_A^m t_B^n. */
        double moment(int m, int n) {
            double[] a = new double[SIZE];
            double[] b = new double[SIZE];
            for (int i = 0; i < SIZE; i++) {
                a[i] = Math.pow(time(i), m);
                b[i] = Math.pow(time(i), n);
            }
            return mean(a, b);
        }

        /** What a window of either side captures after Gaussian jitter. */
        double captured(double width, double jitter) {
            double[] inside = new double[SIZE];
            for (int i = 0; i < SIZE; i++) {
                inside[i] = Integral.normal((-width / 2.0 - time(i)) / jitter, (width / 2.0 - time(i)) / jitter);
            }
            return mean(inside, inside);
        }
    }

    @ParameterizedTest(name = "pulse {0} ps, dispersion {1} and {2} ps^2")
    @CsvSource({"40, 0, 0", "10, 0, 0", "40, -400, -250", "10, -300, 300", "15, 250, 0"})
    void gaussianArrivalsAreExact(double pulse, double betaA, double betaB) {
        PairSpectrum spectrum = spectrum(PassbandShape.GAUSSIAN, pulse);
        Arrivals arrivals = arrivals(spectrum, betaA * PICO * PICO, betaB * PICO * PICO, 7.0);
        ArrivalTime model = ArrivalTime.of(spectrum, betaA * PICO * PICO, betaB * PICO * PICO);

        assertThat(model.pairA()).isCloseTo(arrivals.moment(2, 0), within(1e-7 * model.pairA()));
        assertThat(model.pairB()).isCloseTo(arrivals.moment(0, 2), within(1e-7 * model.pairB()));
        assertThat(model.pairCovariance()).isCloseTo(arrivals.moment(1, 1), within(1e-7 * model.pairA()));
        assertThat(captured(spectrum, betaA, betaB, 100.0, 20.0))
                .isCloseTo(arrivals.captured(100.0 * PICO, 20.0 * PICO), within(1e-7));
    }

    /** Singles: bob's filters do not select, so that his photon may have any detuning. */
    @Test
    void gaussianSinglesAreExact() {
        PairSpectrum spectrum = spectrum(PassbandShape.GAUSSIAN, 20.0);
        Passband wide = new Passband(1e5 * spectrum.pumpRms(), Double.POSITIVE_INFINITY);
        PairSpectrum unselected = PairSpectra.of(new SpectrumInputs(
                spectrum.alice(), wide, spectrum.pumpRms(), 0.0, NO_MEASUREMENT, NO_MEASUREMENT, NO_MEASUREMENT));
        double beta = -900.0 * PICO * PICO;
        double expected = ArrivalTime.of(unselected, beta, 0.0).pairA();
        assertThat(ArrivalTime.of(spectrum, beta, beta).singlesA()).isCloseTo(expected, within(1e-8 * expected));
    }

    /**
     * A flat top's pulse is a sinc whose side lobes beyond half a window hold 2/(pi^2 B w) of a photon; after dispersion they start at the ends of
     * the box. The model has a Gaussian of the same near-field variance instead and is off by no more than what both photons' side lobes hold: 1 to
     * 3 % of the pairs for 75 GHz. Real filters with rounded edges have less of them.
     */
    @ParameterizedTest(name = "pulse {0} ps, dispersion {1} ps^2, window {2} ps, jitter {3} ps rms")
    @CsvSource({
        "40, 0, 100, 20",
        "40, 0, 300, 40",
        "10, 0, 150, 25",
        "40, -300, 300, 40",
        "10, -300, 250, 25",
        "20, -150, 150, 20"
    })
    void flatTopsAreRightUpToTheirSideLobes(double pulse, double beta, double window, double jitter) {
        PairSpectrum spectrum = spectrum(PassbandShape.FLAT_TOP, pulse);
        Arrivals arrivals = arrivals(spectrum, beta * PICO * PICO, beta * PICO * PICO, 4.0);
        double box = 2.0 * Math.PI * BANDWIDTH * Math.abs(beta) * PICO * PICO;
        double sideLobes = 4.0 / (Math.PI * Math.PI * BANDWIDTH * (window * PICO - box));
        assertThat(captured(spectrum, beta, beta, window, jitter))
                .isCloseTo(arrivals.captured(window * PICO, jitter * PICO), within(sideLobes));
    }

    private static double captured(PairSpectrum spectrum, double betaA, double betaB, double window, double jitter) {
        PortTiming port = new PortTiming(jitter * jitter * PICO * PICO, 0.0, 0.0);
        SlotCaptures captures = SlotCapturing.of(new CaptureInputs(
                spectrum,
                betaA * PICO * PICO,
                betaB * PICO * PICO,
                List.of(port),
                List.of(port),
                window * PICO,
                5e-9,
                0.0,
                0.0,
                false));
        return captures.pairs(0, 0).at(0, 0);
    }

    private static PairSpectrum spectrum(PassbandShape shape, double pulseFwhmPs) {
        Passband filter = Passband.of(BANDWIDTH, shape);
        double pumpRms = 0.5 / (pulseFwhmPs * PICO / 2.3548200450309493);
        return PairSpectra.of(
                new SpectrumInputs(filter, filter, pumpRms, 0.0, NO_MEASUREMENT, NO_MEASUREMENT, NO_MEASUREMENT));
    }

    /** Transforms exp(-(W_A+W_B)^2/(4 s_P^2)) sqrt(f_A f_B) exp(i (beta_A W_A^2 + beta_B W_B^2)/2), over a range of rms widths. */
    private static Arrivals arrivals(PairSpectrum spectrum, double betaA, double betaB, double widths) {
        double range = widths * Math.sqrt(spectrum.alice().variance());
        double cell = 2.0 * range / SIZE;
        Complex[][] amplitude = new Complex[SIZE][SIZE];
        for (int i = 0; i < SIZE; i++) {
            for (int j = 0; j < SIZE; j++) {
                double a = (i + 0.5 - SIZE / 2) * cell;
                double b = (j + 0.5 - SIZE / 2) * cell;
                double x = (a + b) / spectrum.pumpRms();
                double modulus = Math.exp(-x * x / 4.0)
                        * Math.sqrt(spectrum.alice().at(a) * spectrum.bob().at(b));
                double phase = 0.5 * (betaA * a * a + betaB * b * b);
                amplitude[i][j] = new Complex(modulus * Math.cos(phase), modulus * Math.sin(phase));
            }
        }
        return new Arrivals(intensity(transformed(transformed(amplitude))), 2.0 * Math.PI / (2.0 * range));
    }

    /** Transforms the rows and turns rows into columns. */
    private static Complex[][] transformed(Complex[][] amplitude) {
        FastFourierTransformer transformer = new FastFourierTransformer(DftNormalization.STANDARD);
        Complex[][] turned = new Complex[SIZE][SIZE];
        for (int i = 0; i < SIZE; i++) {
            Complex[] row = transformer.transform(amplitude[i], TransformType.FORWARD);
            for (int j = 0; j < SIZE; j++) {
                turned[(j + SIZE / 2) % SIZE][i] = row[j];
            }
        }
        return turned;
    }

    private static double[][] intensity(Complex[][] amplitude) {
        double[][] intensity = new double[SIZE][SIZE];
        double sum = 0.0;
        for (int i = 0; i < SIZE; i++) {
            for (int j = 0; j < SIZE; j++) {
                double modulus = amplitude[i][j].abs();
                intensity[i][j] = modulus * modulus;
                sum += intensity[i][j];
            }
        }
        for (double[] row : intensity) {
            for (int j = 0; j < SIZE; j++) {
                row[j] /= sum;
            }
        }
        return intensity;
    }
}

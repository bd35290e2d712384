package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.PassbandShape;
import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Captured shares of pairs and singles against sums over what they are averages of: the exponential delays of detector tails, and birth times and
 * detunings where a flat-top filter makes a box of the arrival time.
 */
final class JointCaptureIntegrationTest {
    private static final double PICO = 1e-12;
    private static final double NO_MEASUREMENT = Double.NaN;
    private static final double SEPARATION = 1000.0 * PICO;
    private static final Passband GAUSSIAN = Passband.of(75e9, PassbandShape.GAUSSIAN);
    private static final Passband FLAT = Passband.of(75e9, PassbandShape.FLAT_TOP);

    /** Two photons before their windows. */
    private record Setting(
            PairSpectrum spectrum, double betaA, double betaB, PortTiming a, PortTiming b, double width) {
        SlotCaptures captures() {
            return SlotCapturing.of(new CaptureInputs(
                    spectrum,
                    betaA,
                    betaB,
                    List.of(a),
                    List.of(b),
                    width,
                    SEPARATION,
                    40.0 * PICO,
                    -25.0 * PICO,
                    false));
        }

        Window windowA(int offset) {
            return Window.of(width, 40.0 * PICO + offset * SEPARATION);
        }

        Window windowB(int offset) {
            return Window.of(width, -25.0 * PICO + offset * SEPARATION);
        }
    }

    private static PairSpectrum spectrum(Passband a, Passband b, double pulseFwhmPs) {
        double pumpRms = 0.5 / (pulseFwhmPs * PICO / 2.3548200450309493);
        return PairSpectra.of(new SpectrumInputs(a, b, pumpRms, 0.0, NO_MEASUREMENT, NO_MEASUREMENT, NO_MEASUREMENT));
    }

    private static PortTiming port(double rmsPs, double tailFraction, double tailPs) {
        return new PortTiming(rmsPs * rmsPs * PICO * PICO, tailFraction, tailPs * PICO);
    }

    /** Gaussian light, no tails: the bivariate normal of the arrival covariance, slot by slot. */
    @ParameterizedTest(name = "dispersion {0} and {1} ps^2")
    @CsvSource({"0, 0", "-650, -650", "-3000, -2500", "1500, -1500"})
    void gaussianPairsFollowTheirCovariance(double betaA, double betaB) {
        Setting s = gaussian(betaA, betaB, port(30.0, 0.0, 0.0), port(20.0, 0.0, 0.0));
        SlotCaptures found = s.captures();
        for (int i = -1; i <= 1; i++) {
            for (int k = -1; k <= 1; k++) {
                double expected = rectangle(s, s.windowA(i), s.windowB(k));
                assertThat(found.pairs(0, 0).at(i, k)).as("slots %d, %d", i, k).isCloseTo(expected, within(1e-13));
            }
        }
    }

    /** Tails on one side or both: each photon's click is late by an exponential time with some probability. */
    @ParameterizedTest(name = "dispersion {0} and {1} ps^2, tails {2} of {3} ps, {4} of {5} ps")
    @CsvSource({
        "-650, -650, 0.2, 150, 0, 0",
        "-650, -650, 0, 0, 0.3, 60",
        "-650, -650, 0.2, 150, 0.3, 60",
        "-3000, -2500, 0.1, 400, 0.1, 400",
        "1500, -1500, 0.5, 100, 0.2, 5"
    })
    void tailedPairsAgreeWithTheSumOverDelays(
            double betaA, double betaB, double p, double tailA, double q, double tailB) {
        Setting s = gaussian(betaA, betaB, port(30.0, p, tailA), port(20.0, q, tailB));
        SlotCaptures found = s.captures();
        for (int i = -1; i <= 1; i++) {
            for (int k = -1; k <= 1; k++) {
                double expected = delayed(s, s.windowA(i), s.windowB(k));
                assertThat(found.pairs(0, 0).at(i, k)).as("slots %d, %d", i, k).isCloseTo(expected, within(1e-7));
            }
        }
    }

    private static Setting gaussian(double betaA, double betaB, PortTiming a, PortTiming b) {
        return new Setting(
                spectrum(GAUSSIAN, GAUSSIAN, 40.0), betaA * PICO * PICO, betaB * PICO * PICO, a, b, 400.0 * PICO);
    }

    private static double rectangle(Setting s, Window a, Window b) {
        ArrivalTime arrival = ArrivalTime.of(s.spectrum(), s.betaA(), s.betaB());
        double sigmaA = Math.sqrt(arrival.pairA() + s.a().variance());
        double sigmaB = Math.sqrt(arrival.pairB() + s.b().variance());
        return BivariateNormal.rectangle(
                a.from() / sigmaA,
                a.to() / sigmaA,
                b.from() / sigmaB,
                b.to() / sigmaB,
                arrival.pairCovariance() / (sigmaA * sigmaB));
    }

    private static double delayed(Setting s, Window a, Window b) {
        double p = s.a().tailFraction();
        double q = s.b().tailFraction();
        double sum = (1.0 - p) * (1.0 - q) * rectangle(s, a, b);
        GaussIntegrator rule = new GaussIntegratorFactory().legendre(24);
        int panels = 12;
        double width = 36.0 / panels;
        for (int i = 0; i < panels * rule.getNumberOfPoints(); i++) {
            double u = delay(rule, i, width);
            double weight = weight(rule, i, width) * Math.exp(-u);
            double lateA = u * s.a().tailTime();
            double lateB = u * s.b().tailTime();
            sum += weight * p * (1.0 - q) * rectangle(s, a.shifted(-lateA), b);
            sum += weight * (1.0 - p) * q * rectangle(s, a, b.shifted(-lateB));
            for (int k = 0; p * q > 0.0 && k < panels * rule.getNumberOfPoints(); k++) {
                double v = delay(rule, k, width);
                double both = weight * weight(rule, k, width) * Math.exp(-v);
                if (both > 1e-12) {
                    sum += both * p * q * rectangle(s, a.shifted(-lateA), b.shifted(-v * s.b().tailTime()));
                }
            }
        }
        return sum;
    }

    private static double delay(GaussIntegrator rule, int i, double width) {
        int panel = i / rule.getNumberOfPoints();
        return width * (panel + 0.5 + 0.5 * rule.getPoint(i % rule.getNumberOfPoints()));
    }

    private static double weight(GaussIntegrator rule, int i, double width) {
        return width / 2.0 * rule.getWeight(i % rule.getNumberOfPoints());
    }

    /** Flat tops, alone and with Gaussians, from no dispersion to that of 150 km in each arm, sharp detectors and blunt ones. */
    @ParameterizedTest(
            name = "{0} and {1}, pulse {2} ps, dispersion {3} ps^2, jitter {4} ps rms, window {5} ps, tail {6}")
    @CsvSource({
        "flat, flat, 40, 0, 30, 400, 0",
        "flat, flat, 40, -650, 30, 400, 0",
        "flat, flat, 40, -3250, 30, 400, 0",
        "flat, flat, 40, -3250, 5, 60, 0",
        "flat, flat, 5, -3250, 10, 100, 0",
        "flat, flat, 150, -1000, 8, 100, 0",
        "flat, gaussian, 40, -3250, 10, 200, 0",
        "gaussian, flat, 10, -650, 20, 400, 0",
        "both, flat, 20, -1500, 10, 150, 0",
        "flat, flat, 40, -3250, 30, 400, 0.2",
        "both, gaussian, 40, -1500, 15, 200, 0.3",
        "both, flat, 20, -6500, 25, 200, 0",
        "both, flat, 40, -6500, 12, 100, 0.2"
    })
    void boxedPairsAgreeWithTheSumOverDetunings(
            String a, String b, double pulse, double beta, double jitter, double width, double tail) {
        PortTiming port = port(jitter, tail, tail > 0.0 ? 120.0 : 0.0);
        Setting s = new Setting(
                spectrum(passband(a), passband(b), pulse),
                beta * PICO * PICO,
                0.8 * beta * PICO * PICO,
                port,
                port,
                width * PICO);
        SlotCaptures found = s.captures();
        DetuningSum sum = new DetuningSum(s.spectrum(), s.betaA(), s.betaB());
        for (int offset = -1; offset <= 1; offset++) {
            double expected = sum.pairs(s.a(), s.b(), s.windowA(offset), s.windowB(0));
            assertThat(found.pairs(0, 0).at(offset, 0))
                    .as("slot %d", offset)
                    .isCloseTo(expected, within(3e-5 * expected + 1e-9));
            assertThat(found.alice(0, offset))
                    .as("singles of slot %d", offset)
                    .isCloseTo(sum.singles(s.a(), s.windowA(offset)), within(1e-6));
        }
    }

    private static Passband passband(String shape) {
        return switch (shape) {
            case "flat" -> FLAT;
            case "gaussian" -> GAUSSIAN;
            default -> FLAT.and(Passband.of(100e9, PassbandShape.GAUSSIAN));
        };
    }

    /** All windows together see every pair once. */
    @Test
    void windowsThatTileTimeCaptureEveryPair() {
        PairSpectrum spectrum = spectrum(FLAT, FLAT, 40.0);
        double sum = 0.0;
        PortTiming port = port(30.0, 0.0, 0.0);
        SlotCaptures found = SlotCapturing.of(new CaptureInputs(
                spectrum,
                -650e-24,
                -650e-24,
                List.of(port),
                List.of(port),
                SEPARATION,
                SEPARATION,
                130e-12,
                60e-12,
                false));
        for (int i = -2; i <= 2; i++) {
            for (int k = -2; k <= 2; k++) {
                sum += found.pairs(0, 0).at(i, k);
            }
        }
        assertThat(sum).isCloseTo(1.0, within(1e-7));
    }
}

package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Joint spectra against direct integrals of their density exp(-(W_A + W_B)^2/(2 s_P^2)) f_A(W_A) f_B(W_B), and interference
 * factors against the mean of exp(i d.W + i W'kW/2) over it.
 */
final class SpectrumIntegrationTest {
    private static final double NO_MEASUREMENT = Double.NaN;
    private static final double GHZ = 2.0 * Math.PI * 1e9;
    private static final double NONE = Double.POSITIVE_INFINITY;
    private static final int NODES = 8;
    private static final GaussIntegrator GAUSS = new GaussIntegratorFactory().legendre(NODES);

    /** Passbands of both arms and the pump, GHz. */
    record Filters(double gaussA, double flatA, double gaussB, double flatB, double pump) {
        PairSpectrum spectrum() {
            return PairSpectra.of(new SpectrumInputs(
                    alice(), bob(), pump * GHZ, 0.0, NO_MEASUREMENT, NO_MEASUREMENT, NO_MEASUREMENT));
        }

        Passband alice() {
            return new Passband(gaussA * GHZ, flatA * GHZ);
        }

        Passband bob() {
            return new Passband(gaussB * GHZ, flatB * GHZ);
        }
    }

    static Stream<Filters> pulsed() {
        return Stream.of(
                new Filters(30.0, NONE, 30.0, NONE, 5.0),
                new Filters(30.0, NONE, 20.0, NONE, 40.0),
                new Filters(NONE, 37.5, NONE, 37.5, 4.7),
                new Filters(NONE, 37.5, NONE, 37.5, 40.0),
                new Filters(NONE, 37.5, NONE, 25.0, 0.5),
                new Filters(NONE, 50.0, NONE, 20.0, 300.0),
                new Filters(30.0, NONE, NONE, 37.5, 5.0),
                new Filters(NONE, 37.5, 20.0, NONE, 20.0),
                new Filters(NONE, 37.5, 20.0, NONE, 1.0),
                new Filters(15.0, NONE, NONE, 80.0, 60.0),
                new Filters(30.0, 37.5, 25.0, 50.0, 12.0),
                new Filters(40.0, 20.0, NONE, 30.0, 7.0),
                new Filters(10.0, NONE, 200.0, 300.0, 90.0));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("pulsed")
    void momentsAgreeWithIntegrals(Filters f) {
        PairSpectrum spectrum = f.spectrum();
        double mass = mean(f, (a, b) -> 1.0);
        double aa = mean(f, (a, b) -> a * a) / mass;
        double bb = mean(f, (a, b) -> b * b) / mass;
        double ab = mean(f, (a, b) -> a * b) / mass;

        assertThat(spectrum.varianceA() / (GHZ * GHZ)).isCloseTo(aa, within(1e-6 * aa));
        assertThat(spectrum.varianceB() / (GHZ * GHZ)).isCloseTo(bb, within(1e-6 * bb));
        assertThat(spectrum.covariance() / (GHZ * GHZ)).isCloseTo(ab, within(1e-6 * Math.sqrt(aa * bb)));
    }

    /** Of the photons that pass one arm's filters, whatever their partners do, those whose partner passes too. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("pulsed")
    void partnersPassAsTheIntegralSays(Filters f) {
        PairSpectrum spectrum = f.spectrum();
        double mass = mean(f, (a, b) -> 1.0);
        double free = Math.sqrt(2.0 * Math.PI) * f.pump();

        assertThat(spectrum.bobPassesGivenAlice()).isCloseTo(mass / (free * area(f.alice())), within(1e-8));
        assertThat(spectrum.alicePassesGivenBob()).isCloseTo(mass / (free * area(f.bob())), within(1e-8));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("pulsed")
    void interferenceAgreesWithIntegral(Filters f) {
        double[][] mismatches = {
            {1.0, 0.0, 0.0, 0.0},
            {2.0, 2.0, 0.0, 0.0},
            {3.0, -3.0, 0.0, 0.0},
            {0.0, 0.0, 20.0, 20.0},
            {0.0, 0.0, 30.0, -30.0},
            {1.5, -0.5, 10.0, 25.0}
        };
        PairSpectrum spectrum = f.spectrum();
        double mass = mean(f, (a, b) -> 1.0);
        for (double[] m : mismatches) {
            SpectralCoherence.Mismatch mismatch =
                    new SpectralCoherence.Mismatch(m[0] * 1e-12, m[1] * 1e-12, m[2] * 1e-24, m[3] * 1e-24);
            double cosines = mean(f, (a, b) -> Math.cos(angle(mismatch, a * GHZ, b * GHZ))) / mass;
            double sines = mean(f, (a, b) -> Math.sin(angle(mismatch, a * GHZ, b * GHZ))) / mass;
            assertThat(SpectralCoherence.of(spectrum, mismatch))
                    .as(Arrays.toString(m))
                    .isCloseTo(Math.hypot(cosines, sines), within(1e-7));
        }
    }

    private static double angle(SpectralCoherence.Mismatch m, double a, double b) {
        return m.mismatchA() * a + m.mismatchB() * b + 0.5 * (m.dispersionA() * a * a + m.dispersionB() * b * b);
    }

    /** Continuous pump: one detuning, the other opposite. */
    static Stream<Filters> continuous() {
        return Stream.of(
                new Filters(30.0, NONE, 45.0, NONE, 0.0),
                new Filters(NONE, 37.5, NONE, 25.0, 0.0),
                new Filters(30.0, NONE, NONE, 37.5, 0.0),
                new Filters(30.0, 50.0, 25.0, 20.0, 0.0));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("continuous")
    void continuousPumpAgreesWithIntegrals(Filters f) {
        PairSpectrum spectrum = f.spectrum();
        double mass = line(f, w -> 1.0);
        double variance = line(f, w -> w * w) / mass;
        assertThat(spectrum.varianceA() / (GHZ * GHZ)).isCloseTo(variance, within(1e-9 * variance));
        assertThat(spectrum.covariance()).isEqualTo(-spectrum.varianceA());
        assertThat(spectrum.bobPassesGivenAlice()).isCloseTo(mass / area(f.alice()), within(1e-9));
        assertThat(spectrum.alicePassesGivenBob()).isCloseTo(mass / area(f.bob()), within(1e-9));
        SpectralCoherence.Mismatch m = new SpectralCoherence.Mismatch(2.0e-12, -0.5e-12, 15e-24, 12e-24);
        double cosines = line(f, w -> Math.cos(angle(m, w * GHZ, -w * GHZ))) / mass;
        double sines = line(f, w -> Math.sin(angle(m, w * GHZ, -w * GHZ))) / mass;
        assertThat(SpectralCoherence.of(spectrum, m)).isCloseTo(Math.hypot(cosines, sines), within(1e-8));
    }

    /** Opposite dispersions of the analyzers do nothing to exactly opposite detunings (Franson, Phys. Rev. A 45, 3126 (1992)). */
    @ParameterizedTest(name = "{0}")
    @MethodSource("continuous")
    void dispersionOfTheAnalyzersCancelsNonlocally(Filters f) {
        SpectralCoherence.Mismatch opposite = new SpectralCoherence.Mismatch(0.0, 0.0, 500e-24, -500e-24);
        SpectralCoherence.Mismatch common = new SpectralCoherence.Mismatch(4e-12, 4e-12, 0.0, 0.0);
        assertThat(SpectralCoherence.of(f.spectrum(), opposite)).isCloseTo(1.0, within(1e-14));
        assertThat(SpectralCoherence.of(f.spectrum(), common)).isCloseTo(1.0, within(1e-14));
    }

    /** A measured g2 stands for the pump bandwidth that would give it. */
    @Test
    void measuredG2GivesTheSchmidtNumberOfItsPump() {
        Filters f = new Filters(30.0, NONE, 22.0, NONE, 17.0);
        PairSpectrum computed = f.spectrum();
        double g2 = PairSpectrum.unheraldedG2(computed.armSchmidtA());
        PairSpectrum measured = PairSpectra.of(
                new SpectrumInputs(f.alice(), f.bob(), 17.0 * GHZ, 0.0, NO_MEASUREMENT, g2, NO_MEASUREMENT));
        assertThat(measured.schmidtNumber()).isCloseTo(computed.schmidtNumber(), within(1e-9));
    }

    private static double area(Passband filters) {
        double reach = reach(filters);
        return Integral.over(w -> filters.at(w * GHZ), -reach, 0.0, reach);
    }

    private static double line(Filters f, DoubleUnaryOperator value) {
        double reach = Math.min(reach(f.alice()), reach(f.bob()));
        return Integral.over(
                w -> f.alice().at(w * GHZ) * f.bob().at(w * GHZ) * value.applyAsDouble(w),
                -reach,
                -reach / 3.0,
                reach / 3.0,
                reach);
    }

    private static double reach(Passband filters) {
        return Math.min(filters.halfWidth(), 9.0 * filters.gaussianRms()) / GHZ * (1.0 - 1e-15);
    }

    private interface OfDetunings {
        double at(double a, double b);
    }

    /** Integral of the density times a value: panels of a fixed rule, far finer than anything in the density or the value. */
    private static double mean(Filters f, OfDetunings value) {
        double reachA = reach(f.alice());
        double reachB = reach(f.bob());
        double sum = 0.0;
        double[][] outer =
                rule(Math.max(-reachA, -reachB - 9.0 * f.pump()), Math.min(reachA, reachB + 9.0 * f.pump()), f);
        for (int i = 0; i < outer[0].length; i++) {
            double a = outer[0][i];
            double[][] inner = rule(Math.max(-reachB, -a - 9.0 * f.pump()), Math.min(reachB, -a + 9.0 * f.pump()), f);
            double part = 0.0;
            for (int j = 0; j < inner[0].length; j++) {
                double b = inner[0][j];
                double x = (a + b) / f.pump();
                part += inner[1][j] * Math.exp(-x * x / 2.0) * f.bob().at(b * GHZ) * value.at(a, b);
            }
            sum += outer[1][i] * f.alice().at(a * GHZ) * part;
        }
        return sum;
    }

    /** Composite Gauss rule; panels of a fraction of the narrowest scale. */
    private static double[][] rule(double low, double high, Filters f) {
        double scale = DoubleStream.of(f.pump(), f.gaussA(), f.gaussB(), high - low)
                .min()
                .orElseThrow();
        int panels = (int) Math.ceil((high - low) / (0.7 * scale));
        double[][] rule = new double[2][Math.max(0, panels) * NODES];
        for (int i = 0; i < rule[0].length; i++) {
            double half = (high - low) / (2.0 * panels);
            int panel = i / NODES;
            rule[0][i] = low + (2 * panel + 1) * half + half * GAUSS.getPoint(i % NODES);
            rule[1][i] = half * GAUSS.getWeight(i % NODES);
        }
        return rule;
    }
}

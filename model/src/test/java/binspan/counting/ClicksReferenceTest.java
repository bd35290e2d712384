package binspan.counting;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.IdealLink;
import binspan.ReferenceCase;
import binspan.optics.PairSpectra;
import binspan.optics.PairSpectrum;
import binspan.optics.Passband;
import binspan.optics.SpectrumInputs;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Detector;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;
import org.apache.commons.math3.analysis.differentiation.FiniteDifferencesDifferentiator;
import org.apache.commons.math3.analysis.differentiation.UnivariateDifferentiableFunction;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Clicks of threshold detectors, photon statistics, multi-pair visibility and noise of detectors. */
final class ClicksReferenceTest {
    private static final double NO_MEASUREMENT = Double.NaN;

    /** So faint that the detection probability itself no longer matters. */
    private static final double FAINT = 1e-8;

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.of("clicks.csv");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("cases")
    void agrees(ReferenceCase c) {
        if (c.isLike("clk-")) {
            clicks(c);
        } else if (c.isLike("vis-mu")) {
            c.check("V_distinguishable_Poisson", visibility(c.in("mu_total_pairs_per_window"), 1e9));
            c.check("V_indistinguishable_K1", visibility(c.in("mu_total_pairs_per_window"), 1.0));
            c.check("V_K4", visibility(c.in("mu_total_pairs_per_window"), 4.0));
        } else if (c.isLike("g2-")) {
            c.check("g2_marginal", PairSpectrum.unheraldedG2(c.in("K")));
        } else if (c.isLike("det-fom")) {
            c.check("FOM", c.in("eta") / detector(c.in("eta"), c.in("dark_cps"), c.in("jitter_s")));
        } else if (c.isLike("dead-")) {
            c.check("recorded_cps", recorded(c.in("rate_cps"), c.in("dead_ns")));
        } else {
            others(c);
        }
        c.finish();
    }

    private static void others(ReferenceCase c) {
        switch (c.id()) {
            case "Schmidt-geom" -> geometric(c);
            case "vis-thr-0.1-0.2-dark" -> threshold(c);
            case "vis-scarani" -> c.check("V_approx", visibility(2.0 * c.in("rho_per_pulse"), 1e9));
            case "thermal-double" -> thermal(c);
            case "ent-pdc-Pn" -> twoModes(c);
            case "det-dark-gate" ->
                c.check(
                        "p_dark",
                        -Math.expm1(ClickStatistics.logNoClick(
                                0.0, detector(1.0, c.in("dark_cps"), c.in("gate_ns") * 1e-9), 1.0)));
            default -> throw new IllegalStateException("no test for " + c.id());
        }
    }

    private static void clicks(ReferenceCase c) {
        boolean dark = c.id().equals("clk-P00-cov");
        double modes = dark ? 1.0 : c.in("K");
        double noise = dark ? 0.0 : -Math.log1p(-c.in("dark_per_window"));
        double a = c.in("etaA") * c.in("mu");
        double b = c.in("etaB") * c.in("mu");
        double pairs = c.in("etaA") * c.in("etaB") * ClickStatistics.bunched(c.in("mu"), modes);
        double clickA = -Math.expm1(ClickStatistics.logNoClick(a, noise, modes));
        double clickB = -Math.expm1(ClickStatistics.logNoClick(b, noise, modes));
        double both = ClickStatistics.coincidence(a, noise, b, noise, pairs, modes);
        if (dark) {
            c.check("P_noclick_both", 1.0 - clickA - clickB + both);
            return;
        }
        c.check("P_A", clickA);
        c.check("P_B", clickB);
        c.check("P_AB", both);
        c.check("CAR", both / (clickA * clickB));
    }

    /** Raw visibility of a whole pulse-pair link whose pairs all pass both filters. */
    private static double visibility(double meanPairs, double modes) {
        Values link = IdealLink.pulsePair();
        SampleScenarios.part(link, "source")
                .put("meanPairsPerCycle", meanPairs)
                .put("schmidtNumber", modes)
                .put("partnerPassProbability", 1.0);
        IdealLink.detectors(link, "alice", "efficiency", FAINT);
        IdealLink.detectors(link, "bob", "efficiency", FAINT);
        return LinkPredictor.predict(IdealLink.build(link)).fringe().raw();
    }

    /** One mode for each of the two basis states, each with half of the pairs. */
    private static void threshold(ReferenceCase c) {
        double half = c.in("mu_total") / 2.0;
        double a = c.in("etaA") * half;
        double b = c.in("etaB") * half;
        double noise = -Math.log1p(-c.in("dark"));
        double pairs = c.in("etaA") * c.in("etaB") * ClickStatistics.bunched(half, 1.0);
        double max = ClickStatistics.coincidence(a, noise, b, noise, pairs, 1.0);
        double min = ClickStatistics.coincidence(a, noise, b, noise, 0.0, 1.0);
        c.check("V", (max - min) / (max + min));
    }

    /** The probability of n photons is the n-th Taylor coefficient of that of no click at detection probability 1 - s. */
    private static DerivativeStructure generating(double mean, double modes) {
        UnivariateDifferentiableFunction derivatives = new FiniteDifferencesDifferentiator(9, 0.05)
                .differentiate((org.apache.commons.math3.analysis.UnivariateFunction)
                        s -> Math.exp(ClickStatistics.logNoClick((1.0 - s) * mean, 0.0, modes)));
        return derivatives.value(new DerivativeStructure(1, 2, 0, 0.0));
    }

    private static void thermal(ReferenceCase c) {
        DerivativeStructure p = generating(c.in("mu"), 1.0);
        c.check("P1", p.getPartialDerivative(1));
        c.check("P2", p.getPartialDerivative(2) / 2.0);
        c.check("P2_over_P1", p.getPartialDerivative(2) / 2.0 / p.getPartialDerivative(1));
    }

    private static void twoModes(ReferenceCase c) {
        double mean = 2.0 * c.in("lambda");
        DerivativeStructure p = generating(mean, 2.0);
        c.check("P0", p.getValue());
        c.check("P1", p.getPartialDerivative(1));
        c.check("P2", p.getPartialDerivative(2) / 2.0);
        c.check("mean_pairs", mean);
    }

    /** Noise clicks of a detector in a window: efficiency over them, for a window as wide as its jitter, is its figure of merit. */
    private static double detector(double efficiency, double darkPerSecond, double window) {
        Values link = IdealLink.pulsePair();
        IdealLink.detectors(link, "alice", "efficiency", efficiency);
        IdealLink.detectors(link, "alice", "darkCountsPerSecond", darkPerSecond);
        Detector detector = IdealLink.build(link).alice().detectors().get(0);
        return DetectorLoad.of(detector, 0.0, 0.0, 1e8).noiseClicks(window, detector);
    }

    private static double recorded(double photonsPerSecond, double deadNs) {
        Values link = IdealLink.pulsePair();
        IdealLink.detectors(link, "alice", "deadTimeNs", deadNs);
        Detector detector = IdealLink.build(link).alice().detectors().get(0);
        return DetectorLoad.of(detector, photonsPerSecond, 0.0, 1e8).recordedPerSecond();
    }

    /**
     * Equal filters whose rms squared is 8 + 6 sqrt 2 of the pump's have K = 3. The singular values of the sampled joint amplitude
     * then fall as the table's geometric series, and their own Schmidt number is the model's.
     */
    private static void geometric(ReferenceCase c) {
        double pump = 1e11;
        Passband filter = new Passband(pump * Math.sqrt(8.0 + 6.0 * Math.sqrt(2.0)), Double.POSITIVE_INFINITY);
        PairSpectrum spectrum = PairSpectra.of(
                new SpectrumInputs(filter, filter, pump, 0.0, NO_MEASUREMENT, NO_MEASUREMENT, NO_MEASUREMENT));
        c.check("K", spectrum.schmidtNumber());

        double[] weights = schmidtWeights(spectrum);
        double squares = 0.0;
        for (double weight : weights) {
            squares += weight * weight;
        }
        assertThat(1.0 / squares).isCloseTo(c.expected("K"), within(1e-9));
        for (int k = 0; k < 8; k++) {
            assertThat(weights[k]).isCloseTo((1.0 - c.in("q")) * Math.pow(c.in("q"), k), within(1e-9));
        }
    }

    private static double[] schmidtWeights(PairSpectrum spectrum) {
        int size = 160;
        double reach = 9.0 * Math.sqrt(spectrum.varianceA());
        double[][] amplitude = new double[size][size];
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                double a = reach * (2.0 * i / (size - 1) - 1.0);
                double b = reach * (2.0 * j / (size - 1) - 1.0);
                double form = spectrum.inverseA() * a * a
                        + spectrum.inverseB() * b * b
                        + 2.0 * spectrum.inversePump() * a * b;
                amplitude[i][j] = Math.exp(-form / 4.0);
            }
        }
        double[] singular = new SingularValueDecomposition(new Array2DRowRealMatrix(amplitude)).getSingularValues();
        double sum = 0.0;
        for (double value : singular) {
            sum += value * value;
        }
        for (int i = 0; i < singular.length; i++) {
            singular[i] = singular[i] * singular[i] / sum;
        }
        return singular;
    }
}

package binspan.counting;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import binspan.IdealLink;
import binspan.counting.SqueezedPairs.Seen;
import binspan.merit.PhotonStatistics;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.statistics.distribution.PoissonDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Click probabilities against two-mode squeezed vacua in the basis of photon numbers, behind lossy analyzers, all slots and port pairs of a whole
 * predicted link.
 *
 * <p>Where the click formula is exact: one pair of windows, K equal Schmidt modes, a fixed phase. Each window then sees one mode of each of the K
 * copies; both together are a Gaussian state of mean photons n_a/K, n_b/K and anomalous correlation sqrt(c/K), c as the model composes it from both
 * ways of a pair. Where it is not: phase noise (the coherence multiplies the interference in c, right to first order in c), unequal Schmidt weights
 * and partners lost in filters (right to second order in the mean, through K), captures below 1 (likewise).
 */
final class NumberBasisTest {
    private static final double EARLY_SHARE = 0.42;
    private static final double[] PHASES = {0.0, 0.7, 1.5707963267948966, 2.5, 3.141592653589793};

    @ParameterizedTest(name = "mean pairs {0}")
    @ValueSource(doubles = {1e-4, 0.02, 0.3, 1.0})
    void everySlotAndPortOfOneSchmidtModeIsExact(double mean) {
        LinkPrediction predicted = LinkPredictor.predict(unbalanced(mean, 1.0));
        SqueezedPairs state = new SqueezedPairs(EARLY_SHARE * mean, (1.0 - EARLY_SHARE) * mean);
        for (int a = 0; a < 2; a++) {
            for (int b = 0; b < 2; b++) {
                for (double phase : PHASES) {
                    double expected = both(state, predicted, new Windows(a, b, 1, 1), phase);
                    double found = perCycle(
                            predicted, predicted.counts().central().of(a, b).perSecond(phase));
                    assertThat(found)
                            .as("ports %d, %d at %f", a, b, phase)
                            .isCloseTo(expected, within(1e-10 * expected + 1e-15));
                }
                outerSlots(state, predicted, a, b);
            }
        }
    }

    private static void outerSlots(SqueezedPairs state, LinkPrediction predicted, int a, int b) {
        int[][] slots = {{0, 0}, {2, 2}, {0, 2}, {2, 0}};
        for (int i = 0; i < slots.length; i++) {
            double expected = both(state, predicted, new Windows(a, b, slots[i][0], slots[i][1]), 0.0);
            double found = perCycle(
                    predicted, predicted.counts().timeBasis().get(i).of(a, b).perSecond(0.0));
            assertThat(found)
                    .as("slots %d of ports %d, %d", i, a, b)
                    .isCloseTo(expected, within(1e-10 * expected + 1e-15));
        }
    }

    /** Slots one apart: (0,1), (1,2), (1,0) and (2,1) of all ports together. */
    @Test
    void sidePeaksAreExact() {
        LinkPrediction predicted = LinkPredictor.predict(unbalanced(0.3, 1.0));
        SqueezedPairs state = new SqueezedPairs(EARLY_SHARE * 0.3, (1.0 - EARLY_SHARE) * 0.3);
        double expected = 0.0;
        for (int[] slots : new int[][] {{0, 1}, {1, 2}, {1, 0}, {2, 1}}) {
            for (int ports = 0; ports < 4; ports++) {
                expected += both(state, predicted, new Windows(ports / 2, ports % 2, slots[0], slots[1]), 0.0);
            }
        }
        double found = perCycle(predicted, predicted.counts().sidePerSecond());
        assertThat(found).isCloseTo(expected, within(1e-10 * expected));
    }

    /** K modes: as many independent states, each with a share of the pairs. */
    @ParameterizedTest(name = "{0} modes")
    @ValueSource(ints = {2, 3, 7})
    void severalEqualSchmidtModesAreExact(int modes) {
        double mean = 0.6;
        LinkPrediction predicted = LinkPredictor.predict(unbalanced(mean, modes));
        SqueezedPairs state = new SqueezedPairs(EARLY_SHARE * mean / modes, (1.0 - EARLY_SHARE) * mean / modes);
        for (double phase : PHASES) {
            Seen a = seen(predicted.counts().alice(), 0, 1);
            Seen b = seen(predicted.counts().bob(), 1, 1);
            double silentA =
                    quiet(predicted.counts().loadsA(), 0) * Math.pow(state.silent(a, Seen.NOTHING, phase), modes);
            double silentB =
                    quiet(predicted.counts().loadsB(), 1) * Math.pow(state.silent(Seen.NOTHING, b, phase), modes);
            double neither = quiet(predicted.counts().loadsA(), 0)
                    * quiet(predicted.counts().loadsB(), 1)
                    * Math.pow(state.silent(a, b, phase + Math.PI), modes);
            double found =
                    perCycle(predicted, predicted.counts().central().of(0, 1).perSecond(phase));
            assertThat(found).isCloseTo(1.0 - silentA - silentB + neither, within(1e-11));
        }
    }

    /** Independent pairs: each of k, Poisson distributed, is seen by alice, by bob or by both. */
    @Test
    void infinitelyManyModesArePoisson() {
        double mean = 0.8;
        double a = 0.3;
        double b = 0.2;
        double ab = 0.07;
        double dark = 1e-3;
        PoissonDistribution pairs = PoissonDistribution.of(mean);
        double expected = 0.0;
        for (int k = 0; k < 60; k++) {
            double silentA = Math.exp(-dark) * Math.pow(1.0 - a, k);
            double silentB = Math.pow(1.0 - b, k);
            double neither = Math.exp(-dark) * Math.pow(1.0 - a - b + ab, k);
            expected += pairs.probability(k) * (1.0 - silentA - silentB + neither);
        }
        double found = ClickStatistics.coincidence(a * mean, dark, b * mean, 0.0, ab * mean, Double.POSITIVE_INFINITY);
        assertThat(found).isCloseTo(expected, within(1e-14));
    }

    /** The approach to that limit goes with 1/K. */
    @Test
    void manyModesApproachThePoissonLimit() {
        double limit = coincidence(Double.POSITIVE_INFINITY);
        double thousand = coincidence(1e3) - limit;
        double million = coincidence(1e6) - limit;
        assertThat(thousand / limit).isBetween(1e-5, 1e-3);
        assertThat(thousand / million).isCloseTo(1e3, withinPercentage(1.0));
    }

    private static double coincidence(double modes) {
        double pairs = 0.3 * 0.2 * ClickStatistics.bunched(0.1, modes);
        return ClickStatistics.coincidence(0.03, 1e-6, 0.02, 1e-6, pairs, modes);
    }

    /** Photon numbers of one mode, summed: two detectors on a bare two-mode squeezed vacuum down to the smallest probabilities. */
    @ParameterizedTest(name = "mean {0}, detection {1} and {2}, noise {3}")
    @CsvSource({
        "1e-9, 1e-3, 1e-4, 0",
        "1e-3, 1e-4, 1e-5, 1e-9",
        "0.1, 0.2, 0.02, 1e-5",
        "0.7, 0.9, 0.5, 1e-2",
        "2.5, 0.3, 1.0, 0.1"
    })
    void bareSourceIsExact(double mean, double etaA, double etaB, double noise) {
        double expected = 0.0;
        double probability = 1.0 / (1.0 + mean);
        for (int n = 0; n < 400; n++) {
            double clickA = -Math.expm1(n * Math.log1p(-etaA) - noise);
            double clickB =
                    etaB == 1.0 ? (n > 0 ? 1.0 : -Math.expm1(-noise)) : -Math.expm1(n * Math.log1p(-etaB) - noise);
            expected += probability * clickA * clickB;
            probability *= mean / (1.0 + mean);
        }
        double pairs = etaA * etaB * ClickStatistics.bunched(mean, 1.0);
        double found = ClickStatistics.coincidence(etaA * mean, noise, etaB * mean, noise, pairs, 1.0);
        assertThat(found).isCloseTo(expected, within(2e-12 * expected));
    }

    /** Phase noise: the mean over the phase of the exact probability differs from the model's by less than its own share of c. */
    @Test
    void phaseNoiseIsRightToFirstOrderInThePairs() {
        double large = phaseNoiseDeviation(0.04);
        double small = phaseNoiseDeviation(0.02);
        assertThat(Math.abs(large)).isLessThan(0.04 * 0.04);
        assertThat(large / small).isCloseTo(4.0, within(0.2));
    }

    private static double phaseNoiseDeviation(double mean) {
        double rms = 0.4;
        Values link = IdealLink.pulsePair();
        SampleScenarios.part(link, "source")
                .put("meanPairsPerCycle", mean)
                .put("schmidtNumber", 1.0)
                .put("partnerPassProbability", 1.0);
        SampleScenarios.part(link, "alice.analyzer").put("phaseNoiseRmsRad", rms);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(link));
        SqueezedPairs state = new SqueezedPairs(mean / 2.0, mean / 2.0);
        GaussIntegrator hermite = new GaussIntegratorFactory().hermite(15);
        double expected = 0.0;
        for (int i = 0; i < hermite.getNumberOfPoints(); i++) {
            double phase = Math.sqrt(2.0) * rms * hermite.getPoint(i);
            expected +=
                    hermite.getWeight(i) / Math.sqrt(Math.PI) * both(state, predicted, new Windows(0, 0, 1, 1), phase);
        }
        return perCycle(predicted, predicted.counts().central().of(0, 0).perSecond(0.0)) - expected;
    }

    /**
     * Gaussian filters have geometric Schmidt weights, which the model takes as K equal ones of the same K. The coincidences keep
     * their second order; what is missed is of third order in the mean per mode.
     */
    @ParameterizedTest(name = "mean pairs {0}")
    @ValueSource(doubles = {0.01, 0.1, 0.3})
    void geometricSchmidtWeightsDifferInThirdOrderOnly(double mean) {
        double q = 0.5;
        double etaA = 0.2;
        double etaB = 0.3;
        double logA = 0.0;
        double logB = 0.0;
        double logBoth = 0.0;
        double pairs = 0.0;
        for (int k = 0; k < 60; k++) {
            double mode = mean * (1.0 - q) * Math.pow(q, k);
            logA -= Math.log1p(etaA * mode);
            logB -= Math.log1p(etaB * mode);
            logBoth -= Math.log1p((etaA + etaB - etaA * etaB) * mode);
            pairs += etaA * etaB * mode * (1.0 + mode);
        }
        double exact = 1.0 - Math.exp(logA) - Math.exp(logB) + Math.exp(logBoth);
        double modes = (1.0 + q) / (1.0 - q);
        double found = ClickStatistics.coincidence(
                etaA * mean, 0.0, etaB * mean, 0.0, etaA * etaB * ClickStatistics.bunched(mean, modes), modes);
        assertThat(pairs).isCloseTo(etaA * etaB * ClickStatistics.bunched(mean, modes), within(1e-15));
        assertThat(found).isCloseTo(exact, within(0.01 * mean * mean * exact));
    }

    /**
     * Heralded g2 of a bare source with a herald that hardly ever clicks: photon numbers weighed by the number of heralding photons. K equal modes have
     * the negative binomial distribution. The model's is right to first order: off by no more than the mean pairs of a mode.
     */
    @ParameterizedTest(name = "mean pairs {0}, {1} modes")
    @CsvSource({"0.001, 1", "0.05, 1", "0.3, 1", "0.1, 2", "0.3, 5", "0.3, 1000"})
    void heraldedG2IsRightToFirstOrder(double mean, double modes) {
        double ratio = mean / (mean + modes);
        double probability = Math.exp(-modes * Math.log1p(mean / modes));
        double heralds = 0.0;
        double photons = 0.0;
        double pairs = 0.0;
        for (int n = 0; n < 200; n++) {
            heralds += n * probability;
            photons += (double) n * n * probability;
            pairs += (double) n * n * (n - 1) * probability;
            probability *= ratio * (modes + n) / (n + 1);
        }
        double expected = pairs * heralds / (photons * photons);
        assertThat(PhotonStatistics.heraldedG2(mean, 1.0, modes, modes))
                .isCloseTo(expected, within(mean / modes * expected));
    }

    /** One pair of windows: ports and slots. */
    private record Windows(int portA, int portB, int slotA, int slotB) {}

    private static double both(SqueezedPairs state, LinkPrediction predicted, Windows w, double phase) {
        Seen a = seen(predicted.counts().alice(), w.portA(), w.slotA());
        Seen b = seen(predicted.counts().bob(), w.portB(), w.slotB());
        double noiseA = -Math.log(quiet(predicted.counts().loadsA(), w.portA()));
        double noiseB = -Math.log(quiet(predicted.counts().loadsB(), w.portB()));
        return state.both(a, b, phase + Math.PI * (w.portA() + w.portB()), noiseA, noiseB);
    }

    /** Slot 0 is early and short, 1 early and long with late and short, 2 late and long. */
    private static Seen seen(ArmLight arm, int port, int slot) {
        double shorts = Math.sqrt(arm.shortTo(port));
        double longs = Math.sqrt(arm.longTo(port));
        return switch (slot) {
            case 0 -> new Seen(shorts, 0.0);
            case 1 -> new Seen(longs, shorts);
            default -> new Seen(0.0, longs);
        };
    }

    private static double quiet(List<DetectorLoad> loads, int port) {
        return Math.exp(-loads.get(port).darkPerSecond() * 400e-12);
    }

    private static double perCycle(LinkPrediction predicted, double perSecond) {
        return perSecond / predicted.cyclesPerSecond();
    }

    /** Everything unequal that may be: bins, splitters, paths, efficiencies, dark counts. */
    private static Scenario unbalanced(double meanPairs, double modes) {
        Values link = IdealLink.pulsePair();
        SampleScenarios.part(link, "source")
                .put("meanPairsPerCycle", meanPairs)
                .put("schmidtNumber", modes)
                .put("partnerPassProbability", 1.0);
        SampleScenarios.part(link, "source.pump").put("earlyPairFraction", EARLY_SHARE);
        SampleScenarios.part(link, "alice.analyzer")
                .put("excessLossDb", 0.3)
                .put("longPathExtraLossDb", 0.7)
                .put("inputShortFraction", 0.45)
                .put("outputShortToPort1", 0.53);
        SampleScenarios.part(link, "bob.analyzer")
                .put("excessLossDb", 1.1)
                .put("inputShortFraction", 0.56)
                .put("outputShortToPort1", 0.48);
        SampleScenarios.part(link, "alice.detectors[0]").put("efficiency", 0.95).put("darkCountsPerSecond", 2e4);
        SampleScenarios.part(link, "alice.detectors[1]").put("efficiency", 0.8).put("darkCountsPerSecond", 3e5);
        SampleScenarios.part(link, "bob.detectors[0]").put("efficiency", 0.7).put("darkCountsPerSecond", 1e6);
        SampleScenarios.part(link, "bob.detectors[1]").put("efficiency", 0.6);
        return IdealLink.build(link);
    }
}

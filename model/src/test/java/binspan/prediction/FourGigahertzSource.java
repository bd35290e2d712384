package binspan.prediction;

import binspan.IdealLink;
import binspan.merit.SecretKey;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;

/**
 * The 4.09 GHz time-bin source of Mueller et al., arXiv:2310.01804 (2023), as a scenario: 80 ps of imbalance, three interferometers, filters of 82 GHz,
 * no long fibre.
 *
 * <p>Stated there and used here: repetition rate, imbalance, filter width, 2 ps pump pulse, share delta = 0.393 +- 0.012 of the photons whose partner
 * passes its filter, mean pairs with an error of 9e-6 or 6 %, early to late pairs 1.13 (read as numbers of pairs) and analyzers 1.24 and 1.15 (short to
 * long), ratio of the ports, windows of 70 ps between guard regions, and 3.84 million singles per second and detector at 5.0e-3 pairs, from which the
 * detection probability of an arm follows. Left out there and assumed: Gaussian filters, jitter of 10 to 20 ps FWHM, phase noise up to 0.03 rad rms in
 * each of the three interferometers, dead time from 0 to 23 ns (the shortest time between events of which it speaks), 100 dark counts per second; for
 * the accidentals that were subtracted, efficiencies eta from 0.15 (a whole arm) to 0.7 (its detectors).
 */
final class FourGigahertzSource {
    static final double CYCLES_PER_SECOND = 4.09e9;
    static final double DELTA = 0.393;

    private static final double HIGH_POWER = 5.0e-3;
    private static final double SINGLES = 3.84e6;
    private static final double LONGEST_DEAD_NS = 23.0;
    private static final double DELTA_ERROR = 0.012;
    private static final double MEAN_PAIRS_SHARE = 0.06;
    private static final double MEAN_PAIRS_ERROR = 9e-6;
    private static final double KEY_SIFTING = 0.81;
    private static final double KEY_EFFICIENCY = 1.1;
    private static final double ARM_EFFICIENCY = 0.15;
    private static final double DETECTOR_EFFICIENCY = 0.7;
    private static final int OPEN = 7;

    private FourGigahertzSource() {}

    /**
     * What is uncertain or left open.
     *
     * @param delta share of the photons whose partner passes
     * @param meanPairs sign of the error of the mean pairs
     * @param calibration sign of the error of the mean pairs at which the singles were counted
     * @param phaseNoise phase noise of each interferometer, rad rms
     * @param jitterPs jitter, ps FWHM
     * @param deadNs dead time, ns
     * @param eta efficiency by which accidentals of incompatible pairs were reckoned
     */
    record Open(
            double delta,
            int meanPairs,
            int calibration,
            double phaseNoise,
            double jitterPs,
            double deadNs,
            double eta) {
        double factor(double mean) {
            return 1.0 + meanPairs * Math.max(MEAN_PAIRS_SHARE, MEAN_PAIRS_ERROR / mean);
        }

        /** Detection probability of an arm: a port records half of its photons, mean pairs over delta in each period, while it is ready. */
        double detection() {
            double counted = SINGLES / (1.0 - SINGLES * deadNs * 1e-9);
            double photons = CYCLES_PER_SECOND * HIGH_POWER * (1.0 + calibration * MEAN_PAIRS_SHARE) / delta;
            return 2.0 * counted / photons;
        }
    }

    /** All ends of all intervals. */
    static List<Open> corners() {
        return IntStream.range(0, 1 << OPEN)
                .mapToObj(bits -> new Open(
                        DELTA + sign(bits) * DELTA_ERROR,
                        sign(bits >> 1),
                        sign(bits >> 2),
                        sign(bits >> 3) < 0 ? 0.0 : 0.03,
                        sign(bits >> 4) < 0 ? 10.0 : 20.0,
                        sign(bits >> 5) < 0 ? 0.0 : LONGEST_DEAD_NS,
                        sign(bits >> 6) < 0 ? ARM_EFFICIENCY : DETECTOR_EFFICIENCY))
                .toList();
    }

    private static int sign(int bits) {
        return bits % 2 == 0 ? -1 : 1;
    }

    /** Range of the visibility with accidentals subtracted, at stated mean pairs. */
    static Interval subtractedRange(double meanPairs) {
        return Interval.of(corners().stream().mapToDouble(open -> subtracted(predict(meanPairs, open), open)));
    }

    /** Range of a figure over all corners, at stated mean pairs. */
    static Interval range(double meanPairs, ToDoubleFunction<LinkPrediction> figure) {
        return Interval.of(corners().stream().mapToDouble(open -> figure.applyAsDouble(predict(meanPairs, open))));
    }

    static LinkPrediction predict(double meanPairs, Open open) {
        Values link = IdealLink.pulsePair().put("imbalanceNs", 0.08);
        SampleScenarios.part(link, "source")
                .put("meanPairsPerCycle", meanPairs * open.factor(meanPairs))
                .put("partnerPassProbability", open.delta());
        SampleScenarios.part(link, "source.pump")
                .put("repetitionRateMHz", 4090.0)
                .put("pairEmissionFwhmPs", 2.0)
                .put("earlyPairFraction", 1.13 / 2.13)
                .put("phaseNoiseRmsRad", open.phaseNoise());
        for (String band : List.of("signal", "idler")) {
            SampleScenarios.part(link, "source." + band).put("bandwidthFwhmGHz", 82.0);
        }
        SampleScenarios.part(link, "timing").put("windowWidthPs", 70.0);
        arm(link, "alice", 1.24, 0.99, open);
        arm(link, "bob", 1.15, 1.04, open);
        return LinkPredictor.predict(IdealLink.build(link));
    }

    private static void arm(Values link, String arm, double shortToLong, double secondPort, Open open) {
        SampleScenarios.part(link, arm + ".analyzer")
                .put("inputShortFraction", shortToLong / (1.0 + shortToLong))
                .put("phaseNoiseRmsRad", open.phaseNoise());
        IdealLink.detectors(link, arm, "jitterFwhmPs", open.jitterPs());
        IdealLink.detectors(link, arm, "darkCountsPerSecond", 100.0);
        IdealLink.detectors(link, arm, "deadTimeNs", open.deadNs());
        SampleScenarios.part(link, arm + ".detectors[0]")
                .put("efficiency", 2.0 * open.detection() / (1.0 + secondPort));
        SampleScenarios.part(link, arm + ".detectors[1]")
                .put("efficiency", 2.0 * open.detection() * secondPort / (1.0 + secondPort));
    }

    /**
     * Visibility with accidentals of incompatible pairs subtracted: C_acc = (1 - delta) S_A S_B [delta (1 - eta_A) + delta (1 - eta_B) + 1 - delta]/R
     * as the publication gives it; which efficiency eta is stands in a figure that was not at hand.
     */
    static double subtracted(LinkPrediction p, Open open) {
        double delta = open.delta();
        double share = (1.0 - delta) * (2.0 * delta * (1.0 - open.eta()) + 1.0 - delta);
        double max = p.fringe().maxPerSecond();
        double min = p.fringe().minPerSecond();
        return (max - min) / (max + min - 2.0 * share * p.fringe().accidentalPerSecond());
    }

    /** Key rate by the publication's formula, 0.81 C [1 - 1.1 h(E) - h(E)] with E = (1 - V)/2. */
    static double keyPerSecond(double visibility, double coincidencesPerSecond) {
        double error = (1.0 - visibility) / 2.0;
        return KEY_SIFTING * coincidencesPerSecond * SecretKey.secretFraction(error, error, KEY_EFFICIENCY);
    }

    static double keyPerSecond(LinkPrediction p) {
        return keyPerSecond(p.fringe().raw(), p.counts().allSlotsPerSecond());
    }
}

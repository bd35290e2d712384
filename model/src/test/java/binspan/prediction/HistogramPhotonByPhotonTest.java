package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.IdealLink;
import binspan.optics.TimeBins;
import binspan.prediction.PhotonSimulation.Side;
import binspan.prediction.histogram.ArrivalHistograms;
import binspan.prediction.histogram.CoincidenceHistogram;
import binspan.prediction.histogram.PairHistogram;
import binspan.prediction.histogram.SideHistogram;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.Arrays;
import org.junit.jupiter.api.Test;

/**
 * Predicted histograms against clicks drawn photon by photon from the same numbers, bin by bin: strong dispersion, so that the photons of a pair share
 * their lateness, detector tails at bob, a delay error at alice, dark counts, unequal paths and ports. There is no interference among the particles drawn:
 * their central peak is the mean of the best and the worst phase.
 */
final class HistogramPhotonByPhotonTest {
    private static final double PICO = PhotonSimulation.PICO;
    private static final double STANDARD_ERRORS = 4.0;
    private static final double FEWEST = 40.0;
    private static final double WINDOW = 400.0 * PICO;
    private static final double SEPARATION = 1e-9;
    private static final double EARLY = 0.45;
    private static final TimeBins BINS = new TimeBins(-2e-9, 40.0 * PICO, 110);

    @Test
    void pulsePair() {
        double mean = 0.012;
        int cycles = 60_000_000;
        Values stated = PhotonByPhotonTest.stated(IdealLink.pulsePair(), 1.0, -1000.0, -1000.0);
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", mean).put("schmidtNumber", 1e9);
        SampleScenarios.part(stated, "source.pump").put("earlyPairFraction", EARLY);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(stated));
        double pumpRms = PhotonByPhotonTest.pumpRms(predicted.scenario());
        Side[] sides = PhotonByPhotonTest.sides(predicted.scenario(), -1000.0, -1000.0);
        double widest = PhotonByPhotonTest.widest(sides, pumpRms);
        PhotonSimulation simulation = new PhotonSimulation(31_415L, pumpRms, widest);
        double born = mean / PhotonByPhotonTest.bothPass(sides, pumpRms, widest);
        HistogramTally tally = new HistogramTally(
                simulation,
                sides,
                new double[] {SEPARATION, WINDOW},
                new double[] {BINS.start(), BINS.width()},
                BINS.count());
        tally.run(cycles, () -> simulation.poisson(EARLY * born), () -> simulation.poisson((1.0 - EARLY) * born));

        double seconds = cycles / predicted.cyclesPerSecond();
        for (int side = 0; side < 2; side++) {
            SideHistogram histogram = ArrivalHistograms.side(predicted, side == 0, BINS);
            for (int port = 0; port < 2; port++) {
                agrees(
                        tally.singles(side, port),
                        histogram.ports().get(port).recorded().toArray(),
                        seconds);
            }
        }
        PairHistogram pairs = ArrivalHistograms.pair(predicted, BINS);
        agrees(tally.pairs(0, 0), meanPhase(pairs.first()), seconds);
        double[] all = new double[BINS.count()];
        for (int i = 0; i < all.length; i++) {
            all[i] = tally.pairs(0, 0)[i] + tally.pairs(0, 1)[i] + tally.pairs(1, 0)[i] + tally.pairs(1, 1)[i];
        }
        agrees(all, meanPhase(pairs.all()), seconds);
    }

    @Test
    void continuousPump() {
        double pairs = 2e7;
        double seconds = 0.2;
        Values stated = PhotonByPhotonTest.stated(IdealLink.continuous(), 1.0, -1600.0, 500.0);
        SampleScenarios.part(stated, "source").put("pairRatePerSecond", pairs);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(stated));
        Side[] sides = PhotonByPhotonTest.sides(predicted.scenario(), -1600.0, 500.0);
        double widest = PhotonByPhotonTest.widest(sides, 0.0);
        ContinuousTally tally =
                new ContinuousTally(new PhotonSimulation(271_828L, 0.0, widest), sides, SEPARATION, WINDOW);
        tally.run(seconds, pairs / PhotonByPhotonTest.bothPass(sides, 0.0, widest));
        PairHistogram histogram = ArrivalHistograms.pair(predicted, BINS);
        agrees(
                tally.differences(0, 0, BINS.start(), BINS.width(), BINS.count()),
                meanPhase(histogram.first()),
                seconds);
    }

    private static double[] meanPhase(CoincidenceHistogram histogram) {
        double[] sum = histogram.best().plus(histogram.worst()).toArray();
        return Arrays.stream(sum).map(each -> each / 2.0).toArray();
    }

    /** Each bin with enough counts within four standard errors, and all of them together spread as widely as counts do: chi-square per bin near 1. */
    private static void agrees(double[] counted, double[] perSecond, double seconds) {
        double squares = 0.0;
        int bins = 0;
        for (int i = 0; i < counted.length; i++) {
            double expected = perSecond[i] * seconds;
            if (expected > FEWEST) {
                double deviation = (counted[i] - expected) / Math.sqrt(expected);
                assertThat(deviation)
                        .as("bin %d: counted %.0f, expected %.1f", i, counted[i], expected)
                        .isBetween(-STANDARD_ERRORS, STANDARD_ERRORS);
                squares += deviation * deviation;
                bins++;
            }
        }
        assertThat(bins).isGreaterThan(counted.length / 3);
        double scatter = STANDARD_ERRORS * Math.sqrt(2.0 / bins);
        assertThat(squares / bins).isBetween(1.0 - scatter, 1.0 + scatter);
    }
}

package binspan.prediction.histogram;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import binspan.IdealLink;
import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.prediction.LinkPrediction;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import org.junit.jupiter.api.Test;

/** Shapes that are known in closed form (common practice), and the usual bins. */
final class HistogramShapesTest {
    private static final double T = 2e-9;
    private static final double TAIL = 150e-12;

    /** Balanced splitters send a quarter early and short, a quarter late and long, and half into the middle; so narrow that each falls into one bin. */
    @Test
    void idealPulsePairHasThreeSharpPeaks() {
        Values stated = IdealLink.pulsePair();
        SampleScenarios.part(stated, "source.pump").put("pairEmissionFwhmPs", 1.0);
        LinkPrediction prediction = HistogramLinks.predicted(stated);
        TimeBins bins = new TimeBins(-2.5e-9, 0.2e-9, 25);
        ClickHistogram clicks = ArrivalHistograms.side(prediction, true, bins).all();
        double all = prediction.cyclesPerSecond() * prediction.counts().alice().photons();
        for (int i = 0; i < bins.count(); i++) {
            double share = i == 2 || i == 22 ? 0.25 : i == 12 ? 0.5 : 0.0;
            assertThat(clicks.light().at(i)).as("bin %d", i).isCloseTo(share * all, within(1e-9 * all));
        }
        assertThat(clicks.peaks())
                .extracting(Peak::kind)
                .containsExactly(Peak.Kind.EARLY_SHORT, Peak.Kind.CENTRAL_SLOT, Peak.Kind.LATE_LONG);
        assertThat(clicks.peaks().get(2).time()).isCloseTo(T, within(1e-18));
    }

    /** Perfect interference: nothing in the central peak at worst phase, and half as much on average as in the side peaks together. */
    @Test
    void idealPairsInterfereInTheCentralPeakOnly() {
        LinkPrediction prediction = HistogramLinks.predicted(IdealLink.pulsePair());
        CoincidenceHistogram pairs = ArrivalHistograms.pair(prediction).first();
        double best = pairs.centralBest().total();
        assertThat(pairs.centralWorst().total()).isLessThan(1e-3 * best);
        assertThat(pairs.sidePeaks().total()).isCloseTo(best / 2.0, within(0.02 * best));
    }

    @Test
    void symmetricLinkHasSymmetricHistograms() {
        for (Values stated :
                new Values[] {SampleScenarios.pulsePair(), SampleScenarios.pulseTrain(), SampleScenarios.continuous()
                }) {
            LinkPrediction prediction = HistogramLinks.predicted(stated);
            symmetric(ArrivalHistograms.side(prediction, false).all().recorded());
            CoincidenceHistogram pairs = ArrivalHistograms.pair(prediction).all();
            symmetric(pairs.best());
            symmetric(pairs.worst());
        }
    }

    private static void symmetric(BinRates rates) {
        double largest = 0.0;
        for (double rate : rates.toArray()) {
            largest = Math.max(largest, rate);
        }
        for (int i = 0; i < rates.count(); i++) {
            assertThat(rates.at(i)).isCloseTo(rates.at(rates.count() - 1 - i), within(1e-9 * largest));
        }
    }

    /** Far behind the last peak clicks fall by exp(-bin/tau) from bin to bin; before the first one there are none. */
    @Test
    void tailsAreExponentialAndLateOnly() {
        for (boolean flat : new boolean[] {false, true}) {
            Values stated = HistogramLinks.tailed(SampleScenarios.pulsePair());
            LinkPrediction prediction = HistogramLinks.predicted(flat ? HistogramLinks.flat(stated) : stated);
            double rms = prediction.arrivalRms(true);
            double width = rms / 4.0;
            TimeBins after = new TimeBins(T + 9.0 * rms, width, 8);
            TimeBins before = new TimeBins(-T - 9.0 * rms - 8.0 * width, width, 8);
            BinRates tail =
                    ArrivalHistograms.side(prediction, true, after).all().light();
            for (int i = 1; i < tail.count(); i++) {
                assertThat(tail.at(i) / tail.at(i - 1)).isCloseTo(Math.exp(-width / TAIL), within(1e-6));
            }
            BinRates early =
                    ArrivalHistograms.side(prediction, true, before).all().light();
            assertThat(early.total()).isLessThan(1e-9 * tail.total());
        }
    }

    /** A tail at alice alone makes t_A - t_B later, one at bob alone earlier. */
    @Test
    void tailOfADifferenceLiesOnTheSideOfItsDetector() {
        for (String arm : new String[] {"alice", "bob"}) {
            Values stated = SampleScenarios.continuous();
            IdealLink.detectors(stated, arm, "jitterTailFraction", 0.3);
            IdealLink.detectors(stated, arm, "jitterTailPs", 150.0);
            LinkPrediction prediction = HistogramLinks.predicted(stated);
            double far = T + 10.0 * prediction.correlationRms();
            double late = pairsIn(prediction, new TimeBins(far, 1e-11, 20));
            double early = pairsIn(prediction, new TimeBins(-far - 20e-11, 1e-11, 20));
            assertThat(arm.equals("alice") ? early : late).isLessThan(1e-9 * (late + early));
        }
    }

    private static double pairsIn(LinkPrediction prediction, TimeBins bins) {
        CoincidenceHistogram pairs = ArrivalHistograms.pair(prediction, bins).first();
        return pairs.sidePeaks().plus(pairs.centralBest()).total();
    }

    @Test
    void usualBinsShowEverythingFinelyAndBeginWithTheWindow() {
        HistogramLinks.all().forEach((name, prediction) -> {
            for (boolean alice : new boolean[] {true, false}) {
                ClickHistogram clicks =
                        ArrivalHistograms.side(prediction, alice).all();
                usual(name, clicks.bins(), prediction, prediction.arrivalRms(alice));
                clicks.windows().forEach(window -> shown(name, clicks.bins(), window));
                clicks.peaks()
                        .forEach(peak -> assertThat(peak.time())
                                .as(name)
                                .isBetween(clicks.bins().start(), clicks.bins().end()));
            }
            CoincidenceHistogram pairs = ArrivalHistograms.pair(prediction).first();
            usual(name, pairs.bins(), prediction, prediction.arrivalRms(false));
            shown(name, pairs.bins(), pairs.window());
        });
    }

    private static void usual(String name, TimeBins bins, LinkPrediction prediction, double rms) {
        assertThat(bins.count()).as(name).isBetween(HistogramBins.USUAL_BINS, 2 * HistogramBins.MOST_BINS);
        assertThat(bins.width()).as(name).isLessThanOrEqualTo(rms / 4.0 * (1.0 + 1e-9));
        double edge = (prediction.windowWidth() / 2.0 - bins.start()) / bins.width();
        assertThat(edge).as(name).isCloseTo(Math.rint(edge), within(1e-6));
    }

    private static void shown(String name, TimeBins bins, Window window) {
        assertThat(window.from()).as(name).isGreaterThanOrEqualTo(bins.start() - 1e-18);
        assertThat(window.to()).as(name).isLessThanOrEqualTo(bins.end() + 1e-18);
    }

    @Test
    void callerChoosesTheNumberOfBins() {
        LinkPrediction prediction = HistogramLinks.predicted(SampleScenarios.pulsePair());
        assertThat(HistogramBins.side(prediction, true, 1500).count()).isBetween(1500, 3000);
        assertThat(HistogramBins.pair(prediction, 1500).count()).isBetween(1500, 3000);
    }

    @Test
    void ratesCannotBeChangedFromOutside() {
        BinRates rates = ArrivalHistograms.side(HistogramLinks.predicted(SampleScenarios.pulsePair()), true)
                .all()
                .light();
        double before = rates.at(5);
        rates.toArray()[5] = -1.0;
        assertThat(rates.at(5)).isEqualTo(before);
    }

    @Test
    void refusesBinsWithoutWidth() {
        assertThatThrownBy(() -> new TimeBins(0.0, 0.0, 10)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new TimeBins(0.0, 1.0, 0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new TimeBins(Double.NaN, 1.0, 3)).isInstanceOf(IllegalArgumentException.class);
    }
}

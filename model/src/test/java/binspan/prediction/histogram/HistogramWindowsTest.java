package binspan.prediction.histogram;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.counting.ClickStatistics;
import binspan.counting.DetectorLoad;
import binspan.counting.LinkCounts;
import binspan.counting.PortPairs;
import binspan.counting.PulsedPortPair;
import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RandomScenarios;
import java.util.Map;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The bins of a window against what the counting of the prediction, which knows no bins, found in that window. */
final class HistogramWindowsTest {
    private static final double AGREEMENT = 1e-6;
    private static final int TILES = 40;
    private static final int LINKS = 400;

    private static final Map<String, LinkPrediction> LINKS_OF_ALL_KINDS = HistogramLinks.all();

    static Stream<Arguments> links() {
        return LINKS_OF_ALL_KINDS.entrySet().stream().map(entry -> Arguments.of(entry.getKey(), entry.getValue()));
    }

    @ParameterizedTest
    @MethodSource("links")
    void coincidencesInTheWindowAreThePredictedOnes(String name, LinkPrediction prediction) {
        assertThat(worstOfPairs(prediction, ArrivalHistograms.pair(prediction))).isLessThan(AGREEMENT);
    }

    @Test
    void coincidencesOfRandomLinksAreThePredictedOnes() {
        double worst = random().parallel()
                .mapToDouble(prediction -> {
                    Window window = new Window(-prediction.windowWidth() / 2.0, prediction.windowWidth() / 2.0);
                    return worstOfPairs(prediction, ArrivalHistograms.pair(prediction, tiles(window)));
                })
                .max()
                .orElseThrow();
        assertThat(worst).isLessThan(AGREEMENT);
    }

    /**
     * Random links whose windows do not overlap: counting opens one gate for a window, however wide. Of trains those whose light counting follows over
     * all slots that it reaches, which are 40 at most.
     */
    private static Stream<LinkPrediction> random() {
        return IntStream.range(0, LINKS)
                .mapToObj(number -> LinkPredictor.predict(RandomScenarios.any(number)))
                .filter(prediction ->
                        prediction.windowWidth() <= prediction.imbalances().common())
                .filter(prediction -> !prediction.scenario().pulsed()
                        || prediction.optics().captures().reach() < 40);
    }

    private static TimeBins tiles(Window window) {
        return new TimeBins(window.from(), (window.to() - window.from()) / TILES, TILES);
    }

    /** Largest difference of a sum over the window and the predicted rate, as a share of the rate at best phase. */
    private static double worstOfPairs(LinkPrediction prediction, PairHistogram histogram) {
        PortPairs central = prediction.counts().central();
        double one = Math.max(central.of(0, 0).atCosine(1.0), Double.MIN_NORMAL);
        double all = Math.max(central.sum(1.0), Double.MIN_NORMAL);
        CoincidenceHistogram first = histogram.first();
        double accidentals = central.of(0, 0).accidentalPerSecond();
        return Stream.of(
                        (inWindow(first, first.best()) - one) / one,
                        (inWindow(first, first.worst()) - central.of(0, 0).atCosine(-1.0)) / one,
                        (inWindow(first, first.accidentals()) - accidentals) / Math.max(accidentals, Double.MIN_NORMAL),
                        (inWindow(histogram.all(), histogram.all().best()) - all) / all,
                        (inWindow(histogram.all(), histogram.all().worst()) - central.sum(-1.0)) / all)
                .mapToDouble(Math::abs)
                .max()
                .orElseThrow();
    }

    private static double inWindow(CoincidenceHistogram histogram, BinRates rates) {
        return total(rates, histogram.bins(), histogram.window());
    }

    /** Sum over the bins that make up a window, which must begin and end with a bin. */
    private static double total(BinRates rates, TimeBins bins, Window window) {
        double first = (window.from() - bins.start()) / bins.width();
        double end = (window.to() - bins.start()) / bins.width();
        assertThat(first).isCloseTo(Math.rint(first), within(1e-6));
        assertThat(end).isCloseTo(Math.rint(end), within(1e-6));
        return rates.total((int) Math.rint(first), (int) Math.rint(end));
    }

    /** Expected photons and noise of each window, made into clicks as counting makes them, give the accidentals of counting. */
    @Test
    void clicksInTheWindowsAreThoseOfCounting() {
        Stream.concat(LINKS_OF_ALL_KINDS.values().stream(), random())
                .filter(prediction -> prediction.scenario().pulsed())
                .forEach(HistogramWindowsTest::checkClicks);
    }

    private static void checkClicks(LinkPrediction prediction) {
        LinkCounts counts = prediction.counts();
        checkClicks(prediction, counts.central(), 0);
        if (counts.hasTimeBasis()) {
            checkClicks(prediction, counts.timeBasis().get(LinkCounts.EARLY_EARLY), -1);
            checkClicks(prediction, counts.timeBasis().get(LinkCounts.LATE_LATE), 1);
        }
    }

    private static void checkClicks(LinkPrediction prediction, PortPairs pairs, int slot) {
        double middle = slot * prediction.imbalances().common();
        double half = prediction.windowWidth() / 2.0;
        TimeBins tiles = tiles(new Window(middle - half, middle + half));
        SideHistogram alice = ArrivalHistograms.side(prediction, true, tiles);
        SideHistogram bob = ArrivalHistograms.side(prediction, false, tiles);
        for (int a = 0; a < pairs.portsA(); a++) {
            for (int b = 0; b < pairs.portsB(); b++) {
                double clickA = click(
                        prediction,
                        alice.ports().get(a),
                        prediction.counts().loadsA().get(a));
                double clickB = click(
                        prediction,
                        bob.ports().get(b),
                        prediction.counts().loadsB().get(b));
                double expected = ((PulsedPortPair) pairs.of(a, b)).accidental();
                assertThat(clickA * clickB)
                        .as("%s, slot %d", prediction.scenario().name(), slot)
                        .isCloseTo(expected, within(5 * AGREEMENT * expected));
            }
        }
    }

    private static double click(LinkPrediction prediction, ClickHistogram histogram, DetectorLoad load) {
        double gated = prediction.cyclesPerSecond() * load.gateShare();
        double live = gated * load.liveFraction();
        double noise = (histogram.dark().total() + histogram.background().total()) / live
                + histogram.afterpulses().total() / gated;
        return ClickStatistics.click(
                histogram.light().total() / live, noise, prediction.spectrum().schmidtNumber());
    }

    /** One cycle, period or, with a continuous pump, all of the time shown holds everything that is recorded. */
    @ParameterizedTest
    @MethodSource("links")
    void allBinsHoldWhatIsRecorded(String name, LinkPrediction prediction) {
        for (boolean alice : new boolean[] {true, false}) {
            double span = prediction.scenario().pulsed() ? 1.0 / prediction.cyclesPerSecond() : 1e-8;
            TimeBins bins = new TimeBins(-span / 2.0, span / 500, 500);
            LinkCounts counts = prediction.counts();
            double recorded = LinkCounts.recorded(alice ? counts.loadsA() : counts.loadsB());
            double found = ArrivalHistograms.side(prediction, alice, bins)
                    .all()
                    .recorded()
                    .total();
            assertThat(found).isCloseTo(recorded, within(AGREEMENT * recorded));
        }
    }
}

package binspan.planner;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.counting.PortPairs;
import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.prediction.ArmBudget;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.histogram.ArrivalHistograms;
import binspan.prediction.histogram.BinRates;
import binspan.prediction.histogram.CoincidenceHistogram;
import binspan.prediction.histogram.PairHistogram;
import java.nio.file.Path;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Histograms and loss budgets of the scenarios that come with the program against the rates and losses of their predictions. */
final class ShippedHistogramsTest {
    private static final double AGREEMENT = 1e-6;

    private static LinkPrediction predicted(String name) throws InvalidScenarioException {
        Path file = Path.of("..", "scenarios", name + ".json");
        return LinkPredictor.predict(ScenarioReader.read(file.toString()));
    }

    @ParameterizedTest
    @MethodSource("binspan.planner.ShippedScenariosTest#names")
    void windowOfTheHistogramHoldsThePredictedCoincidences(String name) throws InvalidScenarioException {
        LinkPrediction prediction = predicted(name);
        PairHistogram pairs = ArrivalHistograms.pair(prediction);
        PortPairs central = prediction.counts().central();
        CoincidenceHistogram first = pairs.first();
        double best = central.of(0, 0).atCosine(1.0);
        assertThat(inWindow(first, first.best())).isCloseTo(best, within(AGREEMENT * best));
        assertThat(inWindow(first, first.worst())).isCloseTo(central.of(0, 0).atCosine(-1.0), within(AGREEMENT * best));
        double accidentals = central.of(0, 0).accidentalPerSecond();
        assertThat(inWindow(first, first.accidentals())).isCloseTo(accidentals, within(AGREEMENT * accidentals));
        double all = central.sum(1.0);
        assertThat(inWindow(pairs.all(), pairs.all().best())).isCloseTo(all, within(AGREEMENT * all));
    }

    private static double inWindow(CoincidenceHistogram histogram, BinRates rates) {
        TimeBins bins = histogram.bins();
        Window window = histogram.window();
        double from = (window.from() - bins.start()) / bins.width();
        double to = (window.to() - bins.start()) / bins.width();
        assertThat(from).isCloseTo(Math.rint(from), within(1e-6));
        assertThat(to).isCloseTo(Math.rint(to), within(1e-6));
        return rates.total((int) Math.rint(from), (int) Math.rint(to));
    }

    @ParameterizedTest
    @MethodSource("binspan.planner.ShippedScenariosTest#names")
    void budgetOfEachArmAddsUpToItsLoss(String name) throws InvalidScenarioException {
        LinkPrediction prediction = predicted(name);
        assertThat(ArmBudget.of(prediction, true).lossDb())
                .isCloseTo(prediction.pathA().lossDb(), within(1e-12));
        assertThat(ArmBudget.of(prediction, false).lossDb())
                .isCloseTo(prediction.pathB().lossDb(), within(1e-12));
        assertThat(ArmBudget.of(prediction, true).dispersionPsPerNm())
                .isCloseTo(prediction.pathA().dispersionPsPerNm(), within(1e-9));
        assertThat(ArmBudget.of(prediction, false).dispersionPsPerNm())
                .isCloseTo(prediction.pathB().dispersionPsPerNm(), within(1e-9));
    }
}

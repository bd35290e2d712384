package binspan.prediction;

import binspan.merit.VisibilityBudget;
import binspan.scenario.Detector;
import binspan.scenario.ParameterPaths;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What can only lower the raw visibility of a link. Jitter and length are not among it: a narrow window cuts accidentals more than pairs. */
final class VisibilityPropertiesTest {
    private static final int LINKS = 600;

    @Test
    void noiseClicksNeverRaiseIt() {
        RandomChecks.none(LINKS, number -> {
            Scenario scenario = RandomScenarios.any(number);
            String arm = number % 2 == 0 ? "alice" : "bob";
            Detector first = (number % 2 == 0 ? scenario.alice() : scenario.bob())
                    .detectors()
                    .get(0);
            String path = first.gate().isPresent()
                    ? ".detectors[0].gate.darkProbability"
                    : ".detectors[0].darkCountsPerSecond";
            double most = first.gate().isPresent() ? 1.0 : 1e10;
            return falling(scenario, arm + path, most);
        });
    }

    @Test
    void phaseNoiseNeverRaisesIt() {
        RandomChecks.none(LINKS, number -> {
            Scenario scenario = RandomScenarios.any(number);
            boolean pump = scenario.source().pump().madeByInterferometer() && number % 2 == 0;
            return falling(scenario, pump ? "source.pump.phaseNoiseRmsRad" : "bob.analyzer.phaseNoiseRmsRad", 10.0);
        });
    }

    @Test
    void frequencyDriftNeverRaisesIt() {
        RandomChecks.none(
                LINKS, number -> falling(RandomScenarios.any(number), "source.pump.frequencyDriftRmsMHz", 1e6));
    }

    @Test
    void temperatureFluctuationNeverRaisesIt() {
        RandomChecks.none(
                LINKS, number -> falling(RandomScenarios.any(number), "alice.analyzer.temperatureRmsMilliK", 1e6));
    }

    /**
     * From aligned imbalances on, with growing delays. Two effects that are no mismatch are kept out: dispersion inside the analyzers of a link with
     * flat-top filters, whose overlap need not fall steadily, and slots that run into one another, which a longer delay parts.
     */
    @Test
    void growingMismatchNeverRaisesIt() {
        RandomChecks.none(LINKS, number -> {
            Scenario aligned = aligned(RandomScenarios.everyday(number));
            double overlap = LinkPredictor.predict(aligned).budget().factor(VisibilityBudget.Cause.SLOT_OVERLAP);
            boolean parted = aligned.source().pump().mode() == PumpMode.CONTINUOUS && overlap < 1.0 - 1e-9;
            String path = List.of("alice", "bob", "both").get(number % 3) + ".analyzer.mismatchPs";
            return parted ? "" : falling(aligned, path, 3.0);
        });
    }

    private static Scenario aligned(Scenario scenario) {
        Scenario aligned = with(scenario, "both.analyzer.mismatchPs", 0.0);
        aligned = with(aligned, "source.pump.mismatchPs", 0.0);
        boolean gaussian = LinkPredictor.predict(aligned).spectrum().gaussian();
        return gaussian ? aligned : with(aligned, "both.analyzer.pathDispersionPs2", 0.0);
    }

    /** Raises a parameter in steps from its planned value to a largest one and complains where the visibility rises. */
    private static String falling(Scenario scenario, String path, double most) {
        LinkPredictor predictor = new LinkPredictor();
        double planned = ParameterPaths.find(scenario, path).value(scenario).orElse(0.0);
        double last = predictor.of(scenario).fringe().raw();
        for (double share : new double[] {1e-9, 1e-6, 1e-3, 0.1, 0.4, 1.0}) {
            double value = planned + share * (most - planned);
            double raw = predictor.of(with(scenario, path, value)).fringe().raw();
            if (!(raw <= last * (1.0 + 1e-12) + Math.ulp(1.0))) {
                return path + " at " + value + " raises the visibility from " + last + " to " + raw;
            }
            last = raw;
        }
        return "";
    }

    private static Scenario with(Scenario scenario, String path, double value) {
        return ParameterPaths.find(scenario, path).with(scenario, value);
    }
}

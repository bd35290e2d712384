package binspan.optics;

import binspan.scenario.Analyzer;
import binspan.scenario.Pump;
import binspan.scenario.Scenario;
import binspan.units.Scale;

/**
 * What makes the two-photon phase fluctuate: variances in rad^2, all independent.
 *
 * @param analyzerA stated noise of alice's analyzer
 * @param analyzerB stated noise of bob's analyzer
 * @param temperatureA (2 pi nu T_A relativeDelayPerK temperatureRms)^2
 * @param temperatureB the same for bob
 * @param pumpInterferometer stated noise of the pump interferometer
 * @param pumpDrift (2 pi drift T_eff)^2
 */
public record PhaseVariance(
        double analyzerA,
        double analyzerB,
        double temperatureA,
        double temperatureB,
        double pumpInterferometer,
        double pumpDrift) {

    /** The variances of a scenario. */
    public static PhaseVariance of(Scenario scenario, Imbalances imbalances) {
        Pump pump = scenario.source().pump();
        return new PhaseVariance(
                square(scenario.alice().analyzer().phaseNoiseRmsRad()),
                square(scenario.bob().analyzer().phaseNoiseRmsRad()),
                square(radPerKelvin(
                                scenario.alice().analyzer(),
                                scenario.bandOf(scenario.alice()).centreHz(),
                                imbalances.alice())
                        * scenario.alice().analyzer().temperatureRmsMilliK()
                        * Scale.MILLI),
                square(radPerKelvin(
                                scenario.bob().analyzer(),
                                scenario.bandOf(scenario.bob()).centreHz(),
                                imbalances.bob())
                        * scenario.bob().analyzer().temperatureRmsMilliK()
                        * Scale.MILLI),
                pump.madeByInterferometer() ? square(pump.phaseNoiseRmsRad()) : 0.0,
                square(2.0 * Math.PI * pump.frequencyDriftRmsMHz() * Scale.MEGA * imbalances.effective(pump)));
    }

    /** Phase of an analyzer against temperature, 2 pi nu T_X relativeDelayPerK, rad/K. */
    public static double radPerKelvin(Analyzer analyzer, double frequencyHz, double imbalance) {
        return 2.0 * Math.PI * frequencyHz * imbalance * analyzer.relativeDelayPerK();
    }

    /** All together, rad^2. */
    public double total() {
        return analyzerA + analyzerB + temperatureA + temperatureB + pumpInterferometer + pumpDrift;
    }

    /** Factor on the visibility, exp(-variance/2). */
    public double coherence() {
        return Math.exp(-total() / 2.0);
    }

    private static double square(double x) {
        return x * x;
    }
}

package binspan.prediction;

import binspan.counting.ArmLight;
import binspan.optics.OpticalPath;
import binspan.optics.OpticalPaths;
import binspan.optics.PathInputs;
import binspan.optics.PortTiming;
import binspan.scenario.Arm;
import binspan.scenario.Band;
import binspan.scenario.Scenario;

/** The optics of one arm of the last scenario. */
@SuppressWarnings("ReferenceEquality") // identity is enough here and quicker than comparing the parts
final class ArmMemory {
    private Arm arm;
    private Band band;
    private double temperatureStepK;
    private PathInputs inputs;
    private OpticalPath path;
    private LinkOptics.ArmOptics optics;

    /** The optics of an arm, anew where something about it has changed. */
    LinkOptics.ArmOptics of(Scenario scenario, Arm present) {
        Band presentBand = scenario.bandOf(present);
        double presentStep = scenario.timing().cableTemperatureStepK();
        if (present != arm || presentBand != band || presentStep != temperatureStepK) {
            path(PathInputs.of(scenario, present));
            optics = new LinkOptics.ArmOptics(
                    path, PortTiming.of(present, path.pmdRms()), ArmLight.of(present, path, 0.0));
            arm = present;
            band = presentBand;
            temperatureStepK = presentStep;
        }
        return optics;
    }

    private void path(PathInputs present) {
        if (inputs == null || !present.same(inputs)) {
            path = OpticalPaths.of(present);
            inputs = present;
        }
    }
}

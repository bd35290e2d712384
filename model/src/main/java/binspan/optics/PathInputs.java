package binspan.optics;

import binspan.scenario.Arm;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.List;

/**
 * All that an arm's optical path depends on; equal inputs give equal paths.
 *
 * @param elements path elements from the source to the analyzer
 * @param wavelengthNm centre of the photon's band, nm
 * @param couplingLossDb loss from inside the passband to the first element, dB
 * @param repairMarginDb loss set aside for later splices, dB
 * @param excessLossDb excess loss of the analyzer, dB
 * @param temperatureStepK temperature step of the cables, K
 */
public record PathInputs(
        List<PathElement> elements,
        double wavelengthNm,
        double couplingLossDb,
        double repairMarginDb,
        double excessLossDb,
        double temperatureStepK) {

    /** Gathers them for one arm. */
    public static PathInputs of(Scenario scenario, Arm arm) {
        return new PathInputs(
                arm.path(),
                scenario.bandOf(arm).centreNm(),
                arm.sourceCouplingLossDb(),
                arm.repairMarginDb(),
                arm.analyzer().excessLossDb(),
                scenario.timing().cableTemperatureStepK());
    }

    /** Whether the other inputs are surely equal: the same list of elements and the same numbers. */
    @SuppressWarnings("ReferenceEquality") // identity is enough here and quicker than comparing the elements
    public boolean same(PathInputs other) {
        return elements == other.elements
                && wavelengthNm == other.wavelengthNm
                && couplingLossDb == other.couplingLossDb
                && repairMarginDb == other.repairMarginDb
                && excessLossDb == other.excessLossDb
                && temperatureStepK == other.temperatureStepK;
    }
}

package binspan.prediction;

import binspan.counting.ArmLight;
import binspan.optics.ArrivalTime;
import binspan.optics.Imbalances;
import binspan.optics.OpticalPath;
import binspan.optics.PairSpectrum;
import binspan.optics.PortTiming;
import binspan.optics.SlotCaptures;
import binspan.optics.TwoPhotonCoherence;
import java.util.List;

/**
 * All that happens to the light before it is counted; the number of pairs does not matter yet.
 *
 * @param spectrum joint spectrum of the pairs
 * @param alice alice's arm
 * @param bob bob's arm
 * @param imbalances delays of the interferometers
 * @param coherence two-photon coherence
 * @param captures captured shares by slot; null for a continuous pump
 * @param arrival spread of the arrival times by the light
 */
public record LinkOptics(
        PairSpectrum spectrum,
        ArmOptics alice,
        ArmOptics bob,
        Imbalances imbalances,
        TwoPhotonCoherence coherence,
        SlotCaptures captures,
        ArrivalTime arrival) {
    /**
     * One arm.
     *
     * @param path its optical path
     * @param ports timing of its ports
     * @param light what reaches its detectors of one photon
     */
    public record ArmOptics(OpticalPath path, List<PortTiming> ports, ArmLight light) {}
}

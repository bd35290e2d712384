package binspan.counting;

import java.util.List;

/**
 * All counts of a link.
 *
 * @param alice light of alice's arm
 * @param bob light of bob's arm
 * @param loadsA alice's detectors
 * @param loadsB bob's detectors
 * @param central coincidences of the interfering windows
 * @param timeBasis pulse pair: coincidences of the outer slots (0,0), (2,2), (0,2), (2,0) in this order; otherwise empty
 * @param sidePerSecond coincidences one separation apart, all ports, averaged over the phase, 1/s
 * @param allSlotsPerSecond coincidences of all slots and ports, averaged over the phase, 1/s
 * @param balanceContrast contrast of ports (1,1) after coherence and path balance, before slot overlap
 * @param noiseless ports (1,1) of the interfering windows without dark counts, background and afterpulses
 */
public record LinkCounts(
        ArmLight alice,
        ArmLight bob,
        List<DetectorLoad> loadsA,
        List<DetectorLoad> loadsB,
        PortPairs central,
        List<PortPairs> timeBasis,
        double sidePerSecond,
        double allSlotsPerSecond,
        double balanceContrast,
        PortPair noiseless) {

    /** Index of the outer slots in {@code timeBasis}: both photons early and short. */
    public static final int EARLY_EARLY = 0;

    /** Both photons late and long. */
    public static final int LATE_LATE = 1;

    /** Alice in slot 0, bob in slot 2: an error. */
    public static final int EARLY_LATE = 2;

    /** Alice in slot 2, bob in slot 0: an error. */
    public static final int LATE_EARLY = 3;

    /** Whether the outer slots make a time basis: with a pulse pair. */
    public boolean hasTimeBasis() {
        return !timeBasis.isEmpty();
    }

    /** Whether both sides detect both ports. */
    public boolean bothPorts() {
        return loadsA.size() == 2 && loadsB.size() == 2;
    }

    /** Recorded singles of all ports of a side, 1/s. */
    public static double recorded(List<DetectorLoad> loads) {
        double sum = 0.0;
        for (DetectorLoad load : loads) {
            sum += load.recordedPerSecond();
        }
        return sum;
    }
}

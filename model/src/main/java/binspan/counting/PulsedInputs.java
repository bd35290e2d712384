package binspan.counting;

import binspan.optics.SlotCaptures;

/**
 * What the counting of a pulsed source depends on.
 *
 * @param alice light of alice's arm
 * @param bob light of bob's arm
 * @param captures captured shares by slot offset
 * @param gamma two-photon coherence, 0 to 1
 * @param meanPairs mean pairs mu per cycle
 * @param earlyShare pulse pair: share of the pairs born early
 * @param modes Schmidt number K of one bin
 * @param cyclesPerSecond cycles f, 1/s
 * @param windowWidth full width of a slot's window, s
 * @param endless whether the source is a pulse train
 */
public record PulsedInputs(
        ArmLight alice,
        ArmLight bob,
        SlotCaptures captures,
        double gamma,
        double meanPairs,
        double earlyShare,
        double modes,
        double cyclesPerSecond,
        double windowWidth,
        boolean endless) {

    private static final double SLOTS_OF_A_PULSE_PAIR = 3.0;

    /** Slots per second: three for each cycle of a pulse pair, one for each pulse of a train. */
    public double slotsPerSecond() {
        return endless ? cyclesPerSecond : SLOTS_OF_A_PULSE_PAIR * cyclesPerSecond;
    }
}

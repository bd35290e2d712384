package binspan.prediction;

import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;

/**
 * Whether the slots of a link fit: a window no wider than the separation and, for a pulse pair, three separations and a window inside the pump cycle.
 * Beyond, neighbouring slots count as one or slots of successive cycles mix, which the model leaves out; searches stay inside.
 */
public final class SlotFit {
    private static final double NANO_PER_PICO = 1e-3;
    private static final double SLOTS = 3.0;

    private SlotFit() {}

    /** Room to the nearest limit as the logarithm of a ratio, negative where they do not fit. */
    public static double room(Scenario scenario) {
        double windowNs = scenario.timing().windowWidthPs() * NANO_PER_PICO;
        double room = Math.log(scenario.imbalanceNs() / windowNs);
        if (scenario.source().pump().mode() != PumpMode.PULSE_PAIR) {
            return room;
        }
        double cycleNs = 1.0 / (scenario.source().pump().repetitionRateMHz().orElseThrow() * Scale.MEGA * Scale.NANO);
        return Math.min(room, Math.log(cycleNs / (SLOTS * scenario.imbalanceNs() + windowNs)));
    }
}

package binspan.study;

import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;

/**
 * Where the slots of the model hold: a window no wider than the separation and, for a pulse pair, three separations and a window inside the pump cycle.
 * Searches for best settings stay inside, so that they do not exploit a link that the model cannot judge.
 */
final class ModelLimits {
    private static final double NANO_PER_PICO = 1e-3;
    private static final double SLOTS = 3.0;

    private ModelLimits() {}

    /** Room to the nearest limit as the logarithm of a ratio, negative outside. */
    static double room(Scenario scenario) {
        double windowNs = scenario.timing().windowWidthPs() * NANO_PER_PICO;
        double room = Math.log(scenario.imbalanceNs() / windowNs);
        if (scenario.source().pump().mode() != PumpMode.PULSE_PAIR) {
            return room;
        }
        double cycleNs = 1.0 / (scenario.source().pump().repetitionRateMHz().orElseThrow() * Scale.MEGA * Scale.NANO);
        return Math.min(room, Math.log(cycleNs / (SLOTS * scenario.imbalanceNs() + windowNs)));
    }
}

package binspan.study;

import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;
import java.util.Optional;
import java.util.function.DoubleFunction;

/**
 * Where the slots of the model hold: a window no wider than the separation and, for a pulse pair, three separations and a window inside the pump cycle.
 * Searches for best settings stay inside, so that they do not exploit a link that the model cannot judge.
 */
public final class ModelLimits {
    private static final double NANO_PER_PICO = 1e-3;
    private static final double SLOTS = 3.0;
    private static final double PRECISION = 1e-9;

    private ModelLimits() {}

    /** Room to the nearest limit as the logarithm of a ratio, negative outside. */
    public static double room(Scenario scenario) {
        double windowNs = scenario.timing().windowWidthPs() * NANO_PER_PICO;
        double room = Math.log(scenario.imbalanceNs() / windowNs);
        if (scenario.source().pump().mode() != PumpMode.PULSE_PAIR) {
            return room;
        }
        double cycleNs = 1.0 / (scenario.source().pump().repetitionRateMHz().orElseThrow() * Scale.MEGA * Scale.NANO);
        return Math.min(room, Math.log(cycleNs / (SLOTS * scenario.imbalanceNs() + windowNs)));
    }

    /**
     * The part of an interval of one parameter in which the slots hold, seen from a point inside.
     *
     * @param scenario the link as written
     * @param axis the parameter
     * @param from lower end of the interval
     * @param inside a point of it
     * @param to upper end
     * @return lower and upper end, within the interval; empty where the slots do not hold at the point itself
     */
    public static Optional<Interval> within(Scenario scenario, Axis axis, double from, double inside, double to) {
        DoubleFunction<Scenario> at = axis.parameter().over(scenario);
        if (room(at.apply(inside)) < 0.0) {
            return Optional.empty();
        }
        return Optional.of(new Interval(end(at, inside, from), end(at, inside, to)));
    }

    private static double end(DoubleFunction<Scenario> at, double inside, double end) {
        return room(at.apply(end)) >= 0.0
                ? end
                : Crossing.lastGood(value -> room(at.apply(value)), inside, end, PRECISION);
    }

    /**
     * An interval of a parameter.
     *
     * @param from lower end
     * @param to upper end
     */
    public record Interval(double from, double to) {}
}

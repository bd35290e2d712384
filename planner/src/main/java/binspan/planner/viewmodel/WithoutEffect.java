package binspan.planner.viewmodel;

import binspan.scenario.FibreSpan;
import binspan.scenario.Pump;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import java.util.Optional;
import java.util.Set;

/** Why a field has no meaning in a scenario as it is, mostly because of its pump. */
final class WithoutEffect {
    private static final Set<String> PAIR_ONLY =
            Set.of("repetitionRateMHz", "preparation", "mismatchPs", "earlyPairFraction");
    private static final Set<String> COHERENCE = Set.of("coherenceTimeNs", "linewidthMHz", "lineshape");
    private static final Set<String> PULSED_ONLY =
            Set.of("meanPairsPerCycle", "uncorrelatedPhotonsPerCycle", "schmidtNumber", "unheraldedG2");
    private static final Set<String> CONTINUOUS_ONLY = Set.of("pairRatePerSecond", "uncorrelatedPhotonsPerSecond");

    private static final Set<String> IN_MEASURED_LOSS =
            Set.of("attenuationDbPerKm", "connectors", "connectorLossDb", "splices", "spliceLossDb");

    private WithoutEffect() {}

    /** Why a field of a span is idle while its measured loss stands; it keeps its place, as the loss may be taken away. */
    static Optional<String> replaced(Scenario scenario, FieldPlace place) {
        boolean replaced = inPlace(place) && measured(scenario, place);
        return replaced ? Optional.of(Words.of("form.idle.measured")) : Optional.empty();
    }

    /** Whether a field can be idle without leaving its place. */
    static boolean inPlace(FieldPlace place) {
        return IN_MEASURED_LOSS.contains(place.field().name());
    }

    /** Whether a field belongs to a span whose loss is stated as measured. */
    static boolean measured(Scenario scenario, FieldPlace place) {
        return PlannedValue.at(scenario, place.parent())
                .filter(FibreSpan.class::isInstance)
                .filter(span -> ((FibreSpan) span).measuredLossDb().isPresent())
                .isPresent();
    }

    /** The reason in words, absent for a field that counts. */
    static Optional<String> reason(Scenario scenario, FieldPlace place) {
        String name = place.field().name();
        if (name.equals("formatVersion")) {
            return Optional.of(Words.of("form.idle.version"));
        }
        if (!place.parent().startsWith("source")) {
            return Optional.empty();
        }
        return place.parent().equals("source.pump") ? pump(scenario.source().pump(), name) : source(scenario, name);
    }

    private static Optional<String> pump(Pump pump, String name) {
        boolean pair = pump.mode() == PumpMode.PULSE_PAIR;
        boolean emission = name.equals("pairEmissionFwhmPs") && pump.mode() == PumpMode.CONTINUOUS;
        if (emission || (!pair && (PAIR_ONLY.contains(name) || name.equals("phaseNoiseRmsRad")))) {
            return mode(pump);
        }
        if (name.equals("phaseNoiseRmsRad") && !pump.madeByInterferometer()) {
            return Optional.of(Words.of("form.idle.modulator"));
        }
        return COHERENCE.contains(name) && pump.madeByInterferometer()
                ? Optional.of(Words.of("form.idle.interferometer"))
                : Optional.empty();
    }

    private static Optional<String> source(Scenario scenario, String name) {
        Set<String> idle = scenario.pulsed() ? CONTINUOUS_ONLY : PULSED_ONLY;
        return idle.contains(name) ? mode(scenario.source().pump()) : Optional.empty();
    }

    private static Optional<String> mode(Pump pump) {
        return Optional.of(Words.of("form.idle.pump", pump.mode().text()));
    }
}

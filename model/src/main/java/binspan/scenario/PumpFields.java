package binspan.scenario;

import java.util.Map;
import java.util.Optional;

/** Fields that count per pump cycle and their counterparts for a continuous pump, which has no cycles. */
final class PumpFields {
    private static final Map<String, String> PER_SECOND_BY_PER_CYCLE = Map.of(
            "meanPairsPerCycle", "pairRatePerSecond",
            "uncorrelatedPhotonsPerCycle", "uncorrelatedPhotonsPerSecond");

    private PumpFields() {}

    /**
     * What takes the place of a field that does not go with a pump mode.
     *
     * @return name of its counterpart, empty if the field goes with the mode
     */
    static Optional<String> insteadOf(String field, PumpMode mode) {
        if (mode == PumpMode.CONTINUOUS) {
            return Optional.ofNullable(PER_SECOND_BY_PER_CYCLE.get(field));
        }
        return PER_SECOND_BY_PER_CYCLE.entrySet().stream()
                .filter(entry -> entry.getValue().equals(field))
                .map(Map.Entry::getKey)
                .findFirst();
    }
}

package binspan.scenario;

import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** Fields that count per pump cycle and their counterparts for a continuous pump, which has no cycles. */
public final class PumpFields {
    private static final Map<String, String> PER_SECOND_BY_PER_CYCLE = Map.of(
            "meanPairsPerCycle", "pairRatePerSecond",
            "uncorrelatedPhotonsPerCycle", "uncorrelatedPhotonsPerSecond");
    private static final Map<String, String> PER_CYCLE_BY_PER_SECOND = PER_SECOND_BY_PER_CYCLE.entrySet().stream()
            .collect(Collectors.toUnmodifiableMap(Map.Entry::getValue, Map.Entry::getKey));

    private PumpFields() {}

    /**
     * What takes the place of a field that does not go with a pump mode.
     *
     * @param field name of a field of the source or of a band
     * @param mode how the pump light is emitted
     * @return name of its counterpart, empty if the field goes with the mode
     */
    public static Optional<String> insteadOf(String field, PumpMode mode) {
        return Optional.ofNullable(
                (mode == PumpMode.CONTINUOUS ? PER_SECOND_BY_PER_CYCLE : PER_CYCLE_BY_PER_SECOND).get(field));
    }
}

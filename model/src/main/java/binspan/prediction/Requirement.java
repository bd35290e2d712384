package binspan.prediction;

import binspan.scenario.Requirements;
import binspan.units.Scale;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;

/** The requirements that a scenario can state, with the figure each is held against. */
public enum Requirement {
    RAW_VISIBILITY("rawVisibilityAtLeast", "", true, Requirements::rawVisibilityAtLeast),
    CHSH("chshAtLeast", "", true, Requirements::chshAtLeast),
    PHASE_QBER("phaseBasisQberAtMost", "", false, Requirements::phaseBasisQberAtMost),
    TIME_QBER("timeBasisQberAtMost", "", false, Requirements::timeBasisQberAtMost),
    KEY_RATE("keyRateAtLeastBps", "bit/s", true, Requirements::keyRateAtLeastBps),
    CAR("carAtLeast", "", true, Requirements::carAtLeast),
    FIRST_KEY("firstKeyWithinHours", "h", false, Requirements::firstKeyWithinHours),
    FIVE_SIGMA("fiveSigmaWithinHours", "h", false, Requirements::fiveSigmaWithinHours),

    /** What no scenario states and every search keeps to: that the slots fit, see {@link SlotFit}. */
    SLOTS("slots", "", true, require -> OptionalDouble.empty());

    /** Standard errors of a convincing violation. */
    public static final double FIVE = 5.0;

    private static final List<Requirement> STATEABLE =
            Arrays.stream(values()).filter(each -> each != SLOTS).toList();

    private final String fieldName;
    private final String unit;
    private final boolean atLeast;
    private final Function<Requirements, OptionalDouble> stated;

    Requirement(String fieldName, String unit, boolean atLeast, Function<Requirements, OptionalDouble> stated) {
        this.fieldName = fieldName;
        this.unit = unit;
        this.atLeast = atLeast;
        this.stated = stated;
    }

    /** Those that a scenario can state, in their order. */
    public static List<Requirement> stateable() {
        return STATEABLE;
    }

    /** Name of the requirement in the scenario file. */
    public String fieldName() {
        return fieldName;
    }

    /** Unit of the required and the predicted figure, empty for a bare number. */
    public String unit() {
        return unit;
    }

    /** Whether the figure must be at least the required one; otherwise at most. */
    public boolean atLeast() {
        return atLeast;
    }

    /** The required figure, if the scenario states one. */
    public OptionalDouble required(Requirements require) {
        return stated.apply(require);
    }

    /** The predicted figure under the requirement's name and in its unit, as a column beside the figures of a check. */
    public ResultField figure() {
        ResultField.Stage stage = this == FIRST_KEY ? ResultField.Stage.FINITE_KEY : ResultField.Stage.COUNTS;
        return new ResultField(fieldName, unit, false, stage, (p, finite, port) -> predicted(p, finite));
    }

    /** The predicted figure; NaN or infinite where the link has none. */
    public double predicted(LinkPrediction p, FiniteKeyOutlook finite) {
        return switch (this) {
            case RAW_VISIBILITY -> p.fringe().raw();
            case CHSH -> p.bell().chsh();
            case PHASE_QBER -> p.key().errors().phase();
            case TIME_QBER -> p.key().errors().time();
            case KEY_RATE -> p.key().asymptoticPerSecond();
            case CAR -> p.fringe().car();
            case FIRST_KEY -> finite.secondsToFirstKey() / Scale.HOUR;
            case SLOTS -> Math.exp(SlotFit.room(p.scenario()));
            case FIVE_SIGMA -> p.bell().secondsTo(FIVE) / p.uptimeShare() / Scale.HOUR;
        };
    }

    /** Predicted minus required, or the reverse: 0 or more where the requirement is met, NaN where there is no figure. */
    double margin(double predicted, double required) {
        return atLeast ? predicted - required : required - predicted;
    }
}

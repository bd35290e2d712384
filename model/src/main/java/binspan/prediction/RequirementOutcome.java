package binspan.prediction;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * One requirement against the prediction.
 *
 * @param requirement which
 * @param required required figure
 * @param predicted predicted figure, absent where the link has none
 * @param margin how much room is left, in the requirement's own unit; negative where it fails, absent without a figure
 * @param met whether it is met
 */
public record RequirementOutcome(
        Requirement requirement, double required, OptionalDouble predicted, OptionalDouble margin, boolean met) {

    /** All stated requirements in their fixed order. */
    static List<RequirementOutcome> all(LinkPrediction prediction, FiniteKeyOutlook finite) {
        List<RequirementOutcome> outcomes = new ArrayList<>();
        for (Requirement requirement : Requirement.stateable()) {
            OptionalDouble required = requirement.required(prediction.scenario().require());
            if (required.isPresent()) {
                outcomes.add(of(requirement, required.getAsDouble(), requirement.predicted(prediction, finite)));
            }
        }
        return outcomes;
    }

    private static RequirementOutcome of(Requirement requirement, double required, double predicted) {
        double margin = requirement.margin(predicted, required);
        boolean figure = Double.isFinite(predicted);
        return new RequirementOutcome(
                requirement,
                required,
                figure ? OptionalDouble.of(predicted) : OptionalDouble.empty(),
                figure ? OptionalDouble.of(margin) : OptionalDouble.empty(),
                margin >= 0.0);
    }
}

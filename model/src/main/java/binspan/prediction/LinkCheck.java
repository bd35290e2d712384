package binspan.prediction;

import binspan.scenario.Scenario;
import java.util.List;

/**
 * The verdict on a link.
 *
 * @param prediction everything predicted
 * @param finite finite key of the acquisition
 * @param outcomes stated requirements against the prediction
 * @param headroom how far each quantity can drift
 * @param stability the same in the units of stabilisation
 * @param cautions what to be careful about
 */
public record LinkCheck(
        LinkPrediction prediction,
        FiniteKeyOutlook finite,
        List<RequirementOutcome> outcomes,
        List<Headroom> headroom,
        List<StabilityLimit> stability,
        List<Caution> cautions) {

    /** Checks a link against its requirements. */
    public static LinkCheck of(Scenario scenario) {
        LinkPrediction prediction = LinkPredictor.predict(scenario);
        FiniteKeyOutlook finite = FiniteKeyOutlook.of(prediction);
        List<RequirementOutcome> outcomes = RequirementOutcome.all(prediction, finite);
        List<Headroom> headroom = HeadroomSearch.of(scenario, outcomes);
        return new LinkCheck(
                prediction, finite, outcomes, headroom, StabilityLimit.of(headroom), Cautions.of(prediction, finite));
    }

    /** The verdict on a predicted link without its headroom, which takes longer than everything else. */
    public static LinkCheck brief(LinkPrediction prediction) {
        FiniteKeyOutlook finite = FiniteKeyOutlook.of(prediction);
        List<RequirementOutcome> outcomes = RequirementOutcome.all(prediction, finite);
        return new LinkCheck(prediction, finite, outcomes, List.of(), List.of(), Cautions.of(prediction, finite));
    }

    /** Whether all requirements are met; true where none is stated. */
    public boolean met() {
        return outcomes.stream().allMatch(RequirementOutcome::met);
    }
}

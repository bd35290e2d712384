package binspan.planner.viewmodel;

import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPredictor;
import binspan.prediction.LossRoom;
import binspan.prediction.LossShortage;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementOutcome;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * How much more loss the arms of a link bear.
 *
 * @param scenario the link it was computed for
 * @param stated whether any requirement is stated
 * @param unmet the requirements that fail already
 * @param loss room until the first of the others fails
 * @param shortage how much less loss an arm would need to meet all
 */
public record LinkRoom(
        Scenario scenario, boolean stated, List<Requirement> unmet, LossRoom loss, LossShortage shortage) {
    /** Copies the list. */
    public LinkRoom {
        unmet = List.copyOf(unmet);
    }

    /** The room of a link; predicts it. */
    static LinkRoom of(Scenario scenario) {
        List<RequirementOutcome> outcomes =
                LinkCheck.brief(LinkPredictor.predict(scenario)).outcomes();
        List<Requirement> unmet = outcomes.stream()
                .filter(outcome -> !outcome.met())
                .map(RequirementOutcome::requirement)
                .toList();
        LossShortage shortage = unmet.isEmpty()
                ? new LossShortage(OptionalDouble.empty(), OptionalDouble.empty())
                : LossShortage.of(scenario);
        return new LinkRoom(scenario, !outcomes.isEmpty(), unmet, LossRoom.of(scenario, outcomes), shortage);
    }

    /** The room of a site's arm alone. */
    public Optional<LossRoom.Room> at(Site site) {
        return site == Site.ALICE ? loss.alice() : loss.bob();
    }

    /** How much less loss a site's arm alone would need. */
    public OptionalDouble shortAt(Site site) {
        return site == Site.ALICE ? shortage.alice() : shortage.bob();
    }
}

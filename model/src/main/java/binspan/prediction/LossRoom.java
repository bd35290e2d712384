package binspan.prediction;

import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;

/**
 * How much more loss the arms bear until the first of the requirements that are met now fails. The loss is added as a repair margin: it weakens the
 * pairs, not the light of classical channels.
 *
 * @param alice of alice's arm alone; absent where nothing is met or no limit is found within the range of a repair margin
 * @param bob of bob's arm alone
 * @param both of each arm when both lose as much more at once
 */
public record LossRoom(Optional<Room> alice, Optional<Room> bob, Optional<Room> both) {
    private static final String ALICE = "alice.repairMarginDb";
    private static final String BOB = "bob.repairMarginDb";

    /**
     * Room for more loss.
     *
     * @param extraDb loss on top of the planned one at which the requirement fails, dB
     * @param requirement the first that fails
     */
    public record Room(double extraDb, Requirement requirement) {}

    /**
     * The room of a link.
     *
     * @param scenario the link
     * @param outcomes its requirements against its prediction, as {@link LinkCheck#outcomes} has them
     */
    public static LossRoom of(Scenario scenario, List<RequirementOutcome> outcomes) {
        Parameter alice = ParameterPaths.find(scenario, ALICE);
        Parameter bob = ParameterPaths.find(scenario, BOB);
        double plannedA = scenario.alice().repairMarginDb();
        double plannedB = scenario.bob().repairMarginDb();
        Parameter larger = plannedA >= plannedB ? alice : bob;
        double shift = plannedA - plannedB;
        DoubleFunction<Scenario> together = margin -> larger == alice
                ? bob.with(alice.with(scenario, margin), margin - shift)
                : alice.with(bob.with(scenario, margin), margin + shift);
        return new LossRoom(
                room(scenario, outcomes, alice, alice.over(scenario)),
                room(scenario, outcomes, bob, bob.over(scenario)),
                room(scenario, outcomes, larger, together));
    }

    private static Optional<Room> room(
            Scenario scenario, List<RequirementOutcome> outcomes, Parameter parameter, DoubleFunction<Scenario> along) {
        return HeadroomSearch.upwards(scenario, outcomes, parameter, along)
                .map(found -> new Room(found.limit() - found.value(), found.requirement()));
    }
}

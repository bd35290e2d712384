package binspan.study.tuning;

import binspan.prediction.Requirement;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.StudyTable;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.CancellationException;

/**
 * How far a link reaches: the greatest length of its fibre at which each requirement still holds, at the settings as written and re-tuned at every
 * length. All fibre is scaled in proportion.
 *
 * @param scenario the link as written
 * @param free parameters that are tuned at every length, possibly none
 * @param objective what they are tuned for, under the stated requirements while these can be met, beyond that for the least violation
 * @param columns figures of merit to tabulate against the length
 */
public record Reach(Scenario scenario, List<Axis> free, Objective objective, List<FigureColumn> columns) {
    /** Hours allowed for the first key and for five standard errors where the scenario states none (common practice). */
    public static final double USUAL_HOURS = 24.0;

    /**
     * Checks the description.
     *
     * @throws IllegalArgumentException if the link has no fibre, or if parameters cannot be varied here or not together
     */
    public Reach {
        free = List.copyOf(free);
        columns = List.copyOf(columns);
        if (!(new LinkLength().value(scenario).orElse(0.0) > 0.0)) {
            throw new IllegalArgumentException(LinkLength.PATH + ": the link has no fibre to scale");
        }
        if (!free.isEmpty()) {
            Tuning.of(scenario, free, objective);
        }
        for (Axis axis : free) {
            if (axis.parameter().path().equals(LinkLength.PATH)
                    || axis.parameter().path().endsWith(".lengthKm")) {
                throw new IllegalArgumentException(axis.parameter().path() + ": a length cannot be tuned for reach");
            }
        }
    }

    /**
     * A requirement whose reach is asked for.
     *
     * @param requirement which
     * @param required required figure
     * @param stated whether the scenario states it; otherwise the usual one
     */
    public record Goal(Requirement requirement, double required, boolean stated) {}

    /**
     * How far a requirement, or all of them, holds.
     *
     * @param goal the requirement
     * @param asWrittenKm greatest length at the settings as written; absent where it holds at no length
     * @param retunedKm greatest length re-tuned; absent likewise, or where nothing is free
     */
    public record Limit(Goal goal, OptionalDouble asWrittenKm, OptionalDouble retunedKm) {}

    /**
     * The reach.
     *
     * @param limits of each requirement: first the first key and five standard errors within their hours, then the others
     * @param all of all stated requirements together, its goal null; null where none is stated
     * @param asWritten figures against the length at the settings as written
     * @param retuned figures against the length, re-tuned; null where nothing is free
     */
    public record Outcome(List<Limit> limits, Limit all, StudyTable asWritten, StudyTable retuned) {}

    /** The requirements that are looked at, in the order in which an operator asks for them. */
    public List<Goal> goals() {
        List<Goal> goals = new ArrayList<>();
        goals.add(timed(Requirement.FIRST_KEY));
        goals.add(timed(Requirement.FIVE_SIGMA));
        for (Requirement requirement : Requirement.stateable()) {
            OptionalDouble required = requirement.required(scenario.require());
            if (required.isPresent() && requirement != Requirement.FIRST_KEY && requirement != Requirement.FIVE_SIGMA) {
                goals.add(new Goal(requirement, required.getAsDouble(), true));
            }
        }
        return List.copyOf(goals);
    }

    private Goal timed(Requirement requirement) {
        OptionalDouble required = requirement.required(scenario.require());
        return new Goal(requirement, required.orElse(USUAL_HOURS), required.isPresent());
    }

    /**
     * Searches.
     *
     * @throws CancellationException if it shall stop
     */
    public Outcome run(Execution execution) {
        return new ReachSearch(this).run(execution);
    }
}

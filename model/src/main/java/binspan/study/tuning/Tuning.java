package binspan.study.tuning;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementMargins;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Variation;
import java.util.List;
import java.util.concurrent.CancellationException;

/**
 * The best settings of a link under its requirements.
 *
 * @param scenario the link as written
 * @param free parameters to set, each within its axis
 * @param objective what is made as large as possible
 * @param margins requirements that must hold
 * @param seed seed of the search
 */
public record Tuning(Scenario scenario, List<Axis> free, Objective objective, RequirementMargins margins, long seed) {
    /** Most free parameters. */
    public static final int MOST_FREE = 12;

    /**
     * Checks the description.
     *
     * @throws IllegalArgumentException if nothing or too much is free, if parameters cannot be varied here or not together, if the link has no key to tune
     *     for or no requirement to keep a margin to
     */
    public Tuning {
        free = List.copyOf(free);
        if (free.isEmpty() || free.size() > MOST_FREE) {
            throw new IllegalArgumentException("found " + free.size() + " free parameters; allowed 1 to " + MOST_FREE);
        }
        Variation.check(scenario, free);
        if (objective == Objective.KEY && Objective.natural(LinkPredictor.predict(scenario)) != Objective.KEY) {
            throw new IllegalArgumentException("this link makes no key: both sides need both ports detected");
        }
        if (objective == Objective.MARGIN && margins.requirements().isEmpty()) {
            throw new IllegalArgumentException("the scenario states no requirement to keep a margin to");
        }
    }

    /** Under the scenario's own requirements, with the usual seed. */
    public static Tuning of(Scenario scenario, List<Axis> free, Objective objective) {
        return new Tuning(scenario, free, objective, RequirementMargins.of(scenario.require()), 1L);
    }

    /**
     * The best settings.
     *
     * @param scenario the link at these settings
     * @param values the free parameters
     * @param prediction prediction there
     * @param feasible whether all requirements hold; if not, these settings fail by the least
     * @param asWritten prediction of the scenario as written
     * @param evaluations how many settings were tried
     */
    public record Outcome(
            Scenario scenario,
            List<Double> values,
            LinkPrediction prediction,
            boolean feasible,
            LinkPrediction asWritten,
            int evaluations) {}

    /**
     * Searches.
     *
     * @throws CancellationException if it shall stop
     */
    public Outcome run(Execution execution) {
        return new TuningSearch(this, TuningSearch.THOROUGH, List.of()).run(execution);
    }

    /** Searches with less effort, for a study that tunes often. */
    public Outcome quickly(Execution execution) {
        return new TuningSearch(this, TuningSearch.QUICK, List.of()).run(execution);
    }

    /** Searches near the best settings of a similar link, for a study that walks from link to link. */
    Outcome nearby(List<Double> settings, Execution execution) {
        return new TuningSearch(this, TuningSearch.NEARBY, settings).run(execution);
    }
}

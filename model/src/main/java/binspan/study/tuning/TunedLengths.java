package binspan.study.tuning;

import binspan.prediction.RequirementMargins;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import java.util.List;

/** A link tuned at one length after the other, each search beginning at the best settings of the one before. */
final class TunedLengths {
    private static final long SEED = 1L;

    private final Scenario scenario;
    private final List<Axis> free;
    private final Objective objective;
    private final RequirementMargins margins;
    private final Execution execution;
    private final LinkLength length = new LinkLength();
    private List<Double> last;

    TunedLengths(
            Scenario scenario, List<Axis> free, Objective objective, RequirementMargins margins, Execution execution) {
        this.scenario = scenario;
        this.free = free;
        this.objective = objective;
        this.margins = margins;
        this.execution = execution;
    }

    /** The best settings at a length, km. */
    Tuning.Outcome at(double km) {
        if (last == null) {
            return afresh(km);
        }
        execution.stopIfCancelled();
        Tuning.Outcome outcome = tuning(km).nearby(last, execution.inside());
        last = outcome.values();
        return outcome;
    }

    /** The same by a search over all settings. */
    Tuning.Outcome afresh(double km) {
        execution.stopIfCancelled();
        Tuning.Outcome outcome = tuning(km).quickly(execution.inside());
        last = outcome.values();
        return outcome;
    }

    private Tuning tuning(double km) {
        return new Tuning(length.with(scenario, km), free, objective, margins, SEED);
    }
}

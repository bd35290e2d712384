package binspan.planner.viewmodel;

import binspan.planner.export.StudyDefaults;
import binspan.scenario.Scenario;
import binspan.study.DefaultAxes;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Tuning;
import java.util.Optional;

/** What a study makes as large as possible, as one chooses it. */
public enum Aim {
    /** The key where the detectors allow one, otherwise S. */
    USUAL(null),
    KEY(Objective.KEY),
    VISIBILITY(Objective.VISIBILITY),
    CHSH(Objective.CHSH),
    MARGIN(Objective.MARGIN);

    private final Objective objective;

    Aim(Objective objective) {
        this.objective = objective;
    }

    /** The objective if one is named. */
    public Optional<Objective> objective() {
        return Optional.ofNullable(objective);
    }

    /**
     * The objective for a link.
     *
     * @throws IllegalArgumentException if the link cannot have it
     */
    Objective of(Scenario scenario) {
        if (objective == null) {
            return StudyDefaults.objective(scenario);
        }
        return Tuning.of(scenario, DefaultAxes.tuned(scenario), objective).objective();
    }
}

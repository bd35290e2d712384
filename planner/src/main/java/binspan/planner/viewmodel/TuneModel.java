package binspan.planner.viewmodel;

import binspan.planner.export.TuneReport;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.tuning.Tuning;
import java.util.List;
import java.util.function.Function;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;

/** The best settings of the link under its requirements. */
public final class TuneModel extends StudyModel<Tuning.Outcome> {
    private final ObjectProperty<Aim> aim = new SimpleObjectProperty<>(this, "aim", Aim.USUAL);
    private final FreeParameters free;

    /** The study of a link, not run yet. */
    public TuneModel(Design design, Background background) {
        super("tune", design, background);
        free = new FreeParameters(design, this::check);
        follow(aim);
        check();
    }

    @Override
    Function<Execution, StudyRun.Result<Tuning.Outcome>> work(Scenario scenario) {
        List<Axis> axes = free.used(scenario);
        if (axes.isEmpty()) {
            throw new IllegalArgumentException("found 0 free parameters; allowed 1 to " + Tuning.MOST_FREE);
        }
        Aim wanted = aim.get();
        return execution -> {
            Tuning tuning = Tuning.of(scenario, axes, wanted.of(scenario));
            Tuning.Outcome outcome = tuning.run(execution);
            if (!outcome.feasible()) {
                throw new IllegalArgumentException(TuneReport.infeasible(tuning, outcome));
            }
            return new StudyRun.Result<>(TuneReport.of(tuning, outcome), outcome);
        };
    }

    /**
     * Takes the best settings over into the link, as one change; not if the link has changed since.
     *
     * @return whether it was done
     */
    public boolean apply() {
        if (run().resultProperty().get() == null || run().staleProperty().get()) {
            return false;
        }
        Scenario best = run().resultProperty().get().found().scenario();
        return design().change(Words.of("studies.tune.change"), null, scenario -> best);
    }

    /** What the settings are best for. */
    public ObjectProperty<Aim> aimProperty() {
        return aim;
    }

    /** What is set. */
    public FreeParameters free() {
        return free;
    }
}

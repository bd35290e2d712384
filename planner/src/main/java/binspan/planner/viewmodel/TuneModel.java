package binspan.planner.viewmodel;

import binspan.planner.export.TuneReport;
import binspan.planner.report.Figure;
import binspan.planner.report.ParameterWords;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.tuning.Tuning;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;

/** The best settings of the link under its requirements. */
public final class TuneModel extends StudyModel<TuneModel.Tuned> {
    private final ObjectProperty<Aim> aim = new SimpleObjectProperty<>(this, "aim", Aim.USUAL);
    private final FreeParameters free;

    /**
     * What was asked and what was found.
     *
     * @param tuning the study
     * @param outcome a feasible outcome
     */
    public record Tuned(Tuning tuning, Tuning.Outcome outcome) {
        /** Each parameter that was set, with its value before and after, in words. */
        public List<String> steps() {
            List<String> steps = new ArrayList<>();
            for (int i = 0; i < tuning.free().size(); i++) {
                Parameter parameter = tuning.free().get(i).parameter();
                String before = Figure.bare(parameter.value(tuning.scenario()).orElse(Double.NaN));
                String after = Figure.in(outcome.values().get(i), parameter.unit());
                steps.add(Words.of("studies.tune.step", ParameterWords.name(parameter.path()), before, after));
            }
            return steps;
        }
    }

    /** The study of a link, not run yet. */
    public TuneModel(Design design, Background background) {
        super("tune", design, background);
        free = new FreeParameters(design, this::check);
        followDesign(free::follow);
        follow(aim);
        check();
    }

    @Override
    Function<Execution, StudyRun.Result<Tuned>> work(Scenario scenario) {
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
            return new StudyRun.Result<>(TuneReport.of(tuning, outcome), new Tuned(tuning, outcome));
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
        Scenario best = run().resultProperty().get().found().outcome().scenario();
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

package binspan.planner.export;

import binspan.prediction.LinkPredictor;
import binspan.scenario.Scenario;
import binspan.study.FigureColumns;
import binspan.study.tolerance.ParameterSpread;
import binspan.study.tolerance.Tolerance;
import binspan.study.tuning.Objective;
import java.util.List;
import java.util.Map;

/** What a study does when nobody says otherwise; {@link binspan.study.DefaultAxes} has the free parameters and their ranges. */
public final class StudyDefaults {
    /** Builds of a tolerance study. */
    public static final int SAMPLES = 8192;

    /** Seed of a tolerance study. */
    public static final long SEED = 1L;

    /** Values of each parameter of a sweep of one, two, three and four of them. */
    public static final List<Integer> SWEEP_STEPS = List.of(201, 101, 21, 11);

    private StudyDefaults() {}

    /** What a link is tuned for: the key where its detectors allow one, otherwise S. */
    public static Objective objective(Scenario scenario) {
        return Objective.natural(LinkPredictor.predict(scenario));
    }

    /**
     * The tolerance study of the spreads that a scenario states, with all figures.
     *
     * @throws IllegalArgumentException if it states none, or one that has no meaning in it
     */
    public static Tolerance tolerance(Scenario scenario) {
        List<ParameterSpread> spreads = ParameterSpread.of(scenario, Map.of());
        return new Tolerance(scenario, spreads, SAMPLES, SEED, FigureColumns.all(scenario));
    }
}

package binspan.planner.cli;

import binspan.planner.report.RequiredFigure;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Tuning;
import java.util.Arrays;
import java.util.List;

/** What a study tunes for, and what it tunes, where the command line says so or does not. */
final class Objectives {
    private Objectives() {}

    /** The objective of an option {@code --for}, or the natural one. */
    static Objective of(String word, Scenario scenario) throws UsageException {
        if (word == null) {
            return Objective.natural(LinkPredictor.predict(scenario));
        }
        Objective objective = Arrays.stream(Objective.values())
                .filter(each -> each.text().equals(word))
                .findFirst()
                .orElseThrow(() -> UsageException.unknown("objective", word, words()));
        if (objective == Objective.MARGIN
                && RequiredFigure.of(scenario.require()).isEmpty()) {
            throw UsageException.of("--for margin: the scenario states no requirement to keep a margin to");
        }
        if (objective == Objective.KEY && Objective.natural(LinkPredictor.predict(scenario)) != Objective.KEY) {
            throw UsageException.of("--for key: this link makes no key: both sides need both ports detected");
        }
        return objective;
    }

    private static List<String> words() {
        return Arrays.stream(Objective.values()).map(Objective::text).toList();
    }

    /** The free parameters that were named, or the usual ones. */
    static List<Axis> free(FreeOptions free, Scenario scenario) throws UsageException {
        return free.given()
                ? free.axes(scenario, Tuning.MOST_FREE)
                : UsageException.unless("--free", () -> DefaultAxes.tuned(scenario));
    }
}

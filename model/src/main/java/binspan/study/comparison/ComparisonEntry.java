package binspan.study.comparison;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.tuning.ReachLimits;
import binspan.study.tuning.Tuning;
import java.util.List;
import java.util.OptionalDouble;

/** Tunes one link of a comparison at every setting of its devices and keeps the best. */
final class ComparisonEntry {
    private final Comparison comparison;
    private final LinkOption option;
    private final Execution execution;

    ComparisonEntry(Comparison comparison, LinkOption option, Execution execution) {
        this.comparison = comparison;
        this.option = option;
        this.execution = execution;
    }

    /** One setting with its best values. */
    private record Tuned(
            LinkOption.Setting setting, List<Axis> free, List<Double> values, LinkPrediction prediction, double least) {
        boolean meets() {
            return least >= 0.0;
        }
    }

    Comparison.Entry entry() {
        Tuned best = null;
        for (LinkOption.Setting setting : option.settings()) {
            execution.stopIfCancelled();
            Tuned tuned = tuned(setting);
            best = best == null || better(tuned, best) ? tuned : best;
        }
        RequirementMargins margins = margins(best.setting().scenario());
        Requirement tightest = margins.requirements().isEmpty()
                ? null
                : margins.requirements().get(margins.tightest(best.prediction()));
        return new Comparison.Entry(
                option,
                best.setting(),
                best.free(),
                best.values(),
                best.prediction(),
                FiniteKeyOutlook.of(best.prediction()),
                best.meets(),
                best.least(),
                tightest,
                reach(best, margins));
    }

    private Tuned tuned(LinkOption.Setting setting) {
        Scenario scenario = setting.scenario();
        List<Axis> free = comparison.free().apply(scenario);
        if (free.isEmpty()) {
            LinkPrediction prediction = LinkPredictor.predict(scenario);
            return new Tuned(
                    setting, free, List.of(), prediction, margins(scenario).least(prediction));
        }
        Tuning.Outcome outcome =
                Tuning.of(scenario, free, comparison.objective()).quickly(execution);
        return new Tuned(
                setting,
                free,
                outcome.values(),
                outcome.prediction(),
                margins(scenario).least(outcome.prediction()));
    }

    private boolean better(Tuned a, Tuned b) {
        if (a.meets() != b.meets()) {
            return a.meets();
        }
        return a.meets()
                ? comparison
                                .objective()
                                .merit(a.prediction(), margins(a.setting().scenario()))
                        > comparison
                                .objective()
                                .merit(b.prediction(), margins(b.setting().scenario()))
                : a.least() > b.least();
    }

    private OptionalDouble reach(Tuned best, RequirementMargins margins) {
        boolean fibre = new LinkLength().value(best.setting().scenario()).orElse(0.0) > 0.0;
        if (!fibre || margins.requirements().isEmpty()) {
            return OptionalDouble.empty();
        }
        ReachLimits limits = new ReachLimits(best.prediction().scenario(), margins);
        OptionalDouble asTuned = limits.asWritten();
        return best.free().isEmpty() ? asTuned : limits.retuned(best.free(), asTuned, execution);
    }

    private static RequirementMargins margins(Scenario scenario) {
        return RequirementMargins.of(scenario.require());
    }
}

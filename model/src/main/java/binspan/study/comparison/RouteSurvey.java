package binspan.study.comparison;

import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.Execution;
import binspan.study.PointEvaluator;
import binspan.study.Workers;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Tuning;
import java.util.List;
import java.util.concurrent.CancellationException;

/**
 * Many candidate routes through one scenario as template; they are judged in batches, so that a table of any length streams through.
 *
 * @param template the link
 * @param tuned whether each route is tuned, with the usual parameters: for the least margin, by which routes are ranked, or for the natural objective
 *     where nothing is required
 */
public record RouteSurvey(Scenario template, boolean tuned) {
    /**
     * What was found about one route.
     *
     * @param route the route
     * @param prediction prediction, tuned where asked
     * @param meets whether all requirements hold
     * @param leastMargin least margin of all requirements; NaN where none is stated
     * @param tightest requirement with the least margin; null where none is stated
     * @param refusal why the route cannot be judged, null if it can; then there is no prediction
     */
    public record Verdict(
            Route route,
            LinkPrediction prediction,
            boolean meets,
            double leastMargin,
            Requirement tightest,
            String refusal) {}

    /** The parameters that are tuned for every route, in the order of a table; none where nothing is tuned. */
    public List<Parameter> parameters() {
        return tuned ? DefaultAxes.tuned(template).stream().map(Axis::parameter).toList() : List.of();
    }

    /**
     * Judges a batch of routes, in their order.
     *
     * @throws CancellationException if it shall stop
     */
    public List<Verdict> judge(List<Route> routes, Execution execution) {
        Verdict[] verdicts = new Verdict[routes.size()];
        Workers.run(routes.size(), tuned ? 1 : 16, execution, () -> {
            PointEvaluator evaluator = new PointEvaluator(template, List.of());
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    verdicts[i] = verdict(routes.get(i), evaluator, execution.inside());
                }
            };
        });
        return List.of(verdicts);
    }

    private Verdict verdict(Route route, PointEvaluator evaluator, Execution execution) {
        try {
            Scenario along = route.through(template);
            if (tuned) {
                Objective objective = evaluator.margins().requirements().isEmpty()
                        ? Objective.natural(evaluator.predicted(along))
                        : Objective.MARGIN;
                along = Tuning.of(along, DefaultAxes.tuned(along), objective)
                        .quickly(execution)
                        .scenario();
            }
            LinkPrediction prediction = evaluator.predicted(along);
            RequirementMargins margins = evaluator.margins();
            Requirement tightest = margins.requirements().isEmpty()
                    ? null
                    : margins.requirements().get(margins.tightest(prediction));
            double least = tightest == null ? Double.NaN : margins.least(prediction);
            return new Verdict(route, prediction, margins.met(prediction), least, tightest, null);
        } catch (IllegalArgumentException e) {
            return new Verdict(route, null, false, Double.NaN, null, e.getMessage());
        }
    }
}

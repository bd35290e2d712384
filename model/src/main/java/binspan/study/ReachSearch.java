package binspan.study;

import binspan.prediction.RequirementMargins;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Carries out a study of the reach: the limit of each requirement, then the figures against the length to beyond the last limit. */
final class ReachSearch {
    private static final int LENGTHS = 61;
    private static final double BEYOND = 1.12;
    private static final double LIMITS_SHARE = 0.6;

    private final Reach reach;
    private final LinkLength length = new LinkLength();

    ReachSearch(Reach reach) {
        this.reach = reach;
    }

    Reach.Outcome run(Execution execution) {
        List<Reach.Goal> goals = reach.goals();
        RequirementMargins stated = RequirementMargins.of(reach.scenario().require());
        boolean all = !stated.requirements().isEmpty();
        Reach.Limit[] limits = new Reach.Limit[goals.size() + (all ? 1 : 0)];
        Execution searching = execution.part(0.0, LIMITS_SHARE);
        Workers.run(limits.length, 1, searching, () -> (first, end) -> {
            for (int i = first; i < end; i++) {
                Reach.Goal goal = i < goals.size() ? goals.get(i) : null;
                RequirementMargins margins =
                        goal == null ? stated : RequirementMargins.of(List.of(goal.requirement()), goal.required());
                limits[i] = limit(goal, margins, searching);
            }
        });
        List<Reach.Limit> each = List.of(limits).subList(0, goals.size());
        double farthest = farthest(List.of(limits));
        return new Reach.Outcome(
                List.copyOf(each),
                all ? limits[goals.size()] : null,
                table(List.of(), farthest, execution.part(LIMITS_SHARE, LIMITS_SHARE)),
                reach.free().isEmpty() ? null : table(reach.free(), farthest, execution.part(LIMITS_SHARE, 1.0)));
    }

    private Reach.Limit limit(Reach.Goal goal, RequirementMargins margins, Execution execution) {
        ReachLimits limits = new ReachLimits(reach.scenario(), margins);
        OptionalDouble asWritten = limits.asWritten();
        OptionalDouble retuned =
                reach.free().isEmpty() ? OptionalDouble.empty() : limits.retuned(reach.free(), asWritten, execution);
        return new Reach.Limit(goal, asWritten, retuned);
    }

    /** A little beyond the last limit. */
    private double farthest(List<Reach.Limit> limits) {
        double farthest = length.value(reach.scenario()).orElseThrow();
        for (Reach.Limit limit : limits) {
            farthest = Math.max(farthest, limit.asWrittenKm().orElse(0.0));
            farthest = Math.max(farthest, limit.retunedKm().orElse(0.0));
        }
        return Math.min(length.range().highest(), farthest * BEYOND);
    }

    private StudyTable table(List<Axis> free, double farthest, Execution execution) {
        List<String> paths = new ArrayList<>();
        paths.add(LinkLength.PATH);
        free.forEach(axis -> paths.add(axis.parameter().path()));
        StudyTable table = new StudyTable(paths, reach.columns(), LENGTHS);
        Workers.run(LENGTHS, 1, execution, () -> {
            PointEvaluator evaluator = new PointEvaluator(reach.scenario(), List.of(length));
            FigureReader reader = new FigureReader(reach.columns());
            return (first, end) -> {
                for (int row = first; row < end; row++) {
                    fill(table, row, farthest * row / (LENGTHS - 1), free, evaluator, reader, execution);
                }
            };
        });
        return table;
    }

    private void fill(
            StudyTable table,
            int row,
            double km,
            List<Axis> free,
            PointEvaluator evaluator,
            FigureReader reader,
            Execution execution) {
        Scenario there = length.with(reach.scenario(), km);
        int start = table.start(row);
        table.numbers()[start] = km;
        if (!free.isEmpty()) {
            Tuning.Outcome outcome = Tuning.of(there, free, reach.objective()).quickly(execution.inside());
            for (int i = 0; i < free.size(); i++) {
                table.numbers()[start + 1 + i] = outcome.values().get(i);
            }
            there = outcome.scenario();
        }
        var prediction = evaluator.predicted(there);
        reader.read(prediction, table.numbers(), start + 1 + free.size());
        table.meets(row, evaluator.margins().met(prediction));
    }
}

package binspan.study.tuning;

import binspan.prediction.LinkPrediction;
import binspan.prediction.RequirementMargins;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureReader;
import binspan.study.PointEvaluator;
import binspan.study.StudyTable;
import binspan.study.Workers;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Carries out a study of the reach: the limit of each requirement, then the figures against the length to beyond the last limit. */
final class ReachSearch {
    private static final int LENGTHS = 61;

    /** Lengths that are tuned one after the other, each from the settings of the one before. */
    private static final int NEIGHBOURS = 8;

    private static final double BEYOND = 1.05;

    /** Twelve even steps between round lengths. */
    private static final int ROWS = 12;

    private static final double[] ROUND = {1.0, 1.5, 2.0, 2.5, 3.0, 4.0, 5.0, 6.0, 8.0, 10.0};

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
                table(List.of(), farthest, farthest, execution.part(LIMITS_SHARE, LIMITS_SHARE)),
                reach.free().isEmpty()
                        ? null
                        : table(
                                reach.free(),
                                farthest,
                                all ? limits[goals.size()].retunedKm().orElse(-1.0) : Double.POSITIVE_INFINITY,
                                execution.part(LIMITS_SHARE, 1.0)));
    }

    private Reach.Limit limit(Reach.Goal goal, RequirementMargins margins, Execution execution) {
        ReachLimits limits = new ReachLimits(reach.scenario(), margins);
        OptionalDouble asWritten = limits.asWritten();
        OptionalDouble retuned =
                reach.free().isEmpty() ? OptionalDouble.empty() : limits.retuned(reach.free(), asWritten, execution);
        return new Reach.Limit(goal, asWritten, retuned);
    }

    /** A little beyond the last limit, at a round length. */
    private double farthest(List<Reach.Limit> limits) {
        double farthest = length.value(reach.scenario()).orElseThrow();
        for (Reach.Limit limit : limits) {
            farthest = Math.max(farthest, limit.asWrittenKm().orElse(0.0));
            farthest = Math.max(farthest, limit.retunedKm().orElse(0.0));
        }
        double needed = farthest * BEYOND / ROWS;
        double decade = Math.pow(10.0, Math.floor(Math.log10(needed)));
        double step = 10.0 * decade;
        for (double round : ROUND) {
            step = round * decade >= needed ? Math.min(step, round * decade) : step;
        }
        return Math.min(length.range().highest(), step * ROWS);
    }

    /** Figures against the length; beyond the reach of all requirements the settings are those that violate them least. */
    private StudyTable table(List<Axis> free, double farthest, double reached, Execution execution) {
        List<String> paths = new ArrayList<>();
        paths.add(LinkLength.PATH);
        free.forEach(axis -> paths.add(axis.parameter().path()));
        StudyTable table = new StudyTable(paths, reach.columns(), LENGTHS);
        Workers.run(LENGTHS, NEIGHBOURS, execution, () -> (first, end) -> {
            PointEvaluator evaluator = new PointEvaluator(reach.scenario(), List.of(length));
            FigureReader reader = new FigureReader(reach.columns());
            TunedLengths inside = tuned(free, reach.objective(), evaluator, execution);
            TunedLengths beyond = tuned(free, Objective.MARGIN, evaluator, execution);
            for (int row = first; row < end; row++) {
                double km = farthest * row / (LENGTHS - 1);
                Settings settings = free.isEmpty()
                        ? new Settings(km, List.of(), length.with(reach.scenario(), km))
                        : Settings.of(km, (km <= reached ? inside : beyond).at(km));
                fill(table, row, settings, evaluator, reader);
            }
        });
        return table;
    }

    private TunedLengths tuned(List<Axis> free, Objective objective, PointEvaluator evaluator, Execution execution) {
        return new TunedLengths(reach.scenario(), free, objective, evaluator.margins(), execution);
    }

    /** A link at one length with the tuned values. */
    private record Settings(double km, List<Double> values, Scenario scenario) {
        static Settings of(double km, Tuning.Outcome outcome) {
            return new Settings(km, outcome.values(), outcome.scenario());
        }
    }

    private static void fill(
            StudyTable table, int row, Settings settings, PointEvaluator evaluator, FigureReader reader) {
        int start = table.start(row);
        table.numbers()[start] = settings.km();
        for (int i = 0; i < settings.values().size(); i++) {
            table.numbers()[start + 1 + i] = settings.values().get(i);
        }
        LinkPrediction prediction = evaluator.predicted(settings.scenario());
        reader.read(prediction, table.numbers(), start + 1 + settings.values().size());
        table.meets(row, evaluator.margins().met(prediction));
    }
}

package binspan.study.window;

import binspan.study.Execution;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.TreeMap;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Finds where the requirements hold along a line, from samples. Every margin that turns back before it reaches zero is followed to its extremum, and all
 * requirements are looked at there: so intervals and gaps narrower than the samples are found, also those of a margin that is flat at the samples where
 * another one shows the way. The ends are solved.
 */
public final class IntervalSearch {
    /** Where a requirement holds, both ends included. */
    public record Interval(double from, double to) {}

    private static final double EXTREMUM_RELATIVE = 1e-9;
    private static final double EXTREMUM_ABSOLUTE = 1e-14;
    private static final int MOST_EVALUATIONS = 1000;
    private static final int FINER = 16;
    private static final int DEEPEST = 2;

    private final MarginLine line;
    private final double farthest;
    private final Execution execution;
    private final NavigableMap<Double, double[]> samples = new TreeMap<>();

    /**
     * A search.
     *
     * @param line the margins
     * @param farthest a turn is followed if it is no farther from zero than so many times the difference to its neighbours; infinite for all turns
     * @param execution stops the search when asked
     */
    public IntervalSearch(MarginLine line, double farthest, Execution execution) {
        this.line = line;
        this.farthest = farthest;
        this.execution = execution;
    }

    /**
     * The intervals of each requirement, in rising order and apart from one another.
     *
     * @param places where the margins are known, rising
     * @param margins the margins of all requirements there
     */
    public List<List<Interval>> intervals(double[] places, double[][] margins) {
        for (int i = 0; i < places.length; i++) {
            samples.put(places[i], margins[i]);
        }
        refine(new TreeMap<>(samples), 0);
        List<List<Interval>> intervals = new ArrayList<>();
        for (int k = 0; k < line.requirements(); k++) {
            intervals.add(intervals(k));
        }
        return intervals;
    }

    private void refine(NavigableMap<Double, double[]> part, int depth) {
        double[] places =
                part.keySet().stream().mapToDouble(Double::doubleValue).toArray();
        double[][] margins = part.values().toArray(double[][]::new);
        for (int k = 0; k < line.requirements(); k++) {
            execution.stopIfCancelled();
            for (int i = 0; i < places.length; i++) {
                if (turnsBack(k, margins, i)) {
                    double first = places[Math.max(0, i - 1)];
                    double last = places[Math.min(places.length - 1, i + 1)];
                    see(first, extremum(k, first, places[i], last, margins[i][k] >= 0.0), last, depth);
                }
            }
        }
    }

    /** Whether a margin is nearer to zero at a sample than at its neighbours and has not changed its sign. */
    private boolean turnsBack(int k, double[][] margins, int i) {
        double here = margins[i][k];
        double side = here < 0.0 ? 1.0 : -1.0;
        double before = i > 0 ? side * (here - margins[i - 1][k]) : 0.0;
        double after = i < margins.length - 1 ? side * (here - margins[i + 1][k]) : 0.0;
        double difference = Math.max(before, after);
        return before >= 0.0 && after >= 0.0 && difference > 0.0 && Math.abs(here) <= farthest * difference;
    }

    /** The place of a margin nearest to the other side of zero, or the first one found beyond it. */
    private double extremum(int k, double first, double middle, double last, boolean above) {
        double start = middle > first && middle < last ? middle : first + (last - first) / 2.0;
        BrentOptimizer optimizer = new BrentOptimizer(
                EXTREMUM_RELATIVE, EXTREMUM_ABSOLUTE, (step, before, now) -> now.getValue() >= 0.0 != above);
        return optimizer
                .optimize(
                        new UnivariateObjectiveFunction(place -> line.one(k, place)),
                        above ? GoalType.MINIMIZE : GoalType.MAXIMIZE,
                        new SearchInterval(first, last, start),
                        new MaxEval(MOST_EVALUATIONS))
                .getPoint();
    }

    /** Looks at a place; where some requirement there is on the other side than at both ends of the stretch, the stretch is looked at more finely. */
    private void see(double first, double place, double last, int depth) {
        double[] found = line.at(place);
        samples.put(place, found);
        if (depth < DEEPEST && differs(found, samples.get(first), samples.get(last))) {
            NavigableMap<Double, double[]> part = new TreeMap<>(samples.subMap(first, true, last, true));
            for (int i = 1; i < FINER; i++) {
                part.computeIfAbsent(first + (last - first) * i / FINER, line::at);
            }
            samples.putAll(part);
            refine(part, depth + 1);
        }
    }

    private static boolean differs(double[] found, double[] first, double[] last) {
        for (int k = 0; k < found.length; k++) {
            boolean holds = found[k] >= 0.0;
            if (holds != first[k] >= 0.0 && holds != last[k] >= 0.0) {
                return true;
            }
        }
        return false;
    }

    private List<Interval> intervals(int k) {
        DoubleUnaryOperator margin = place -> line.one(k, place);
        List<Interval> found = new ArrayList<>();
        double before = Double.NaN;
        double from = Double.NaN;
        for (Map.Entry<Double, double[]> sample : samples.entrySet()) {
            double here = sample.getKey();
            boolean inside = sample.getValue()[k] >= 0.0;
            if (inside && Double.isNaN(from)) {
                from = Double.isNaN(before) ? here : InnerRoot.between(margin, before, here);
            } else if (!inside && !Double.isNaN(from)) {
                found.add(new Interval(from, InnerRoot.between(margin, before, here)));
                from = Double.NaN;
            }
            before = here;
        }
        if (!Double.isNaN(from)) {
            found.add(new Interval(from, before));
        }
        return found;
    }
}

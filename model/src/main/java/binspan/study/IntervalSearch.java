package binspan.study;

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
 * Finds where a function of one variable is 0 or more, from samples: every sample that turns back before it reaches zero is followed to its extremum,
 * so that intervals and gaps narrower than the samples are found as well; the ends are solved.
 */
final class IntervalSearch {
    /** Where the function is 0 or more, both ends included. */
    record Interval(double from, double to) {}

    private static final double EXTREMUM_RELATIVE = 1e-9;
    private static final double EXTREMUM_ABSOLUTE = 1e-14;
    private static final int MOST_EVALUATIONS = 1000;
    private static final int FINER = 16;
    private static final int DEEPEST = 2;

    private final DoubleUnaryOperator function;
    private final double farthest;
    private final NavigableMap<Double, Double> samples = new TreeMap<>();

    /**
     * A search.
     *
     * @param function the function, finite everywhere
     * @param farthest a turn is followed if it is no farther from zero than so many times the difference to its neighbours; infinite for all turns
     */
    IntervalSearch(DoubleUnaryOperator function, double farthest) {
        this.function = function;
        this.farthest = farthest;
    }

    /**
     * The intervals, in rising order and apart from one another.
     *
     * @param places where the function is known, rising
     * @param values its values there
     */
    List<Interval> intervals(double[] places, double[] values) {
        for (int i = 0; i < places.length; i++) {
            samples.put(places[i], values[i]);
        }
        refine(new TreeMap<>(samples), 0);
        return between();
    }

    private void refine(NavigableMap<Double, Double> part, int depth) {
        double[] x = part.keySet().stream().mapToDouble(Double::doubleValue).toArray();
        double[] y = part.values().stream().mapToDouble(Double::doubleValue).toArray();
        for (int i = 0; i < x.length; i++) {
            if (turnsBack(y, i)) {
                follow(x[Math.max(0, i - 1)], x[i], x[Math.min(x.length - 1, i + 1)], y[i], depth);
            }
        }
    }

    /** Whether a sample is nearer to zero than its neighbours and on the same side. */
    private boolean turnsBack(double[] y, int i) {
        double side = y[i] < 0.0 ? 1.0 : -1.0;
        double before = i > 0 ? side * (y[i] - y[i - 1]) : 0.0;
        double after = i < y.length - 1 ? side * (y[i] - y[i + 1]) : 0.0;
        double difference = Math.max(before, after);
        return before >= 0.0 && after >= 0.0 && difference > 0.0 && Math.abs(y[i]) <= farthest * difference;
    }

    private void follow(double first, double middle, double last, double value, int depth) {
        boolean above = value >= 0.0;
        double place = extremum(first, middle, last, above);
        double found = function.applyAsDouble(place);
        if (found >= 0.0 == above) {
            return;
        }
        samples.put(place, found);
        if (depth < DEEPEST) {
            NavigableMap<Double, Double> part = new TreeMap<>(samples.subMap(first, true, last, true));
            for (int i = 1; i < FINER; i++) {
                part.computeIfAbsent(first + (last - first) * i / FINER, function::applyAsDouble);
            }
            samples.putAll(part);
            refine(part, depth + 1);
        }
    }

    /** The place nearest to the other side of zero, or the first one found beyond it. */
    private double extremum(double first, double middle, double last, boolean above) {
        double start = middle > first && middle < last ? middle : first + (last - first) / 2.0;
        BrentOptimizer optimizer = new BrentOptimizer(
                EXTREMUM_RELATIVE, EXTREMUM_ABSOLUTE, (step, before, now) -> now.getValue() >= 0.0 != above);
        return optimizer
                .optimize(
                        new UnivariateObjectiveFunction(function::applyAsDouble),
                        above ? GoalType.MINIMIZE : GoalType.MAXIMIZE,
                        new SearchInterval(first, last, start),
                        new MaxEval(MOST_EVALUATIONS))
                .getPoint();
    }

    private List<Interval> between() {
        List<Interval> found = new ArrayList<>();
        Map.Entry<Double, Double> before = null;
        double from = Double.NaN;
        for (Map.Entry<Double, Double> sample : samples.entrySet()) {
            boolean inside = sample.getValue() >= 0.0;
            if (inside && Double.isNaN(from)) {
                from = before == null ? sample.getKey() : InnerRoot.between(function, before.getKey(), sample.getKey());
            } else if (!inside && !Double.isNaN(from)) {
                found.add(new Interval(from, InnerRoot.between(function, before.getKey(), sample.getKey())));
                from = Double.NaN;
            }
            before = sample;
        }
        if (!Double.isNaN(from)) {
            found.add(new Interval(from, before.getKey()));
        }
        return found;
    }
}

package binspan.study.window;

import java.util.Comparator;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/** The place of a line at which the least margin is largest: samples, then a search about the highest peaks among them. */
final class LeastMarginLine {
    private static final int PEAKS = 8;
    private static final double RELATIVE = 1e-9;
    private static final double ABSOLUTE = 1e-13;
    private static final int MOST_EVALUATIONS = 500;

    private final DoubleUnaryOperator least;
    private final double from;
    private final double to;
    private final int samples;
    private double best;
    private double highest = Double.NEGATIVE_INFINITY;

    private LeastMarginLine(DoubleUnaryOperator least, double from, double to, int samples) {
        this.least = least;
        this.from = from;
        this.to = to;
        this.samples = samples;
        this.best = from;
    }

    /**
     * The place between two others, both included.
     *
     * @param least the least margin
     * @param from first place
     * @param to last place
     * @param samples number of equal steps between them
     */
    static double best(DoubleUnaryOperator least, double from, double to, int samples) {
        LeastMarginLine line = new LeastMarginLine(least, from, to, samples);
        if (from < to) {
            line.search();
        } else {
            line.see(from);
        }
        return line.best;
    }

    private double at(int sample) {
        return sample >= samples ? to : from + (to - from) * sample / samples;
    }

    private double see(double place) {
        double value = least.applyAsDouble(place);
        if (value > highest) {
            highest = value;
            best = place;
        }
        return value;
    }

    private void search() {
        double[] values = new double[samples + 1];
        for (int i = 0; i <= samples; i++) {
            values[i] = see(at(i));
        }
        IntStream.rangeClosed(0, samples)
                .filter(i -> peak(values, i))
                .boxed()
                .sorted(Comparator.comparingDouble(i -> -values[i]))
                .limit(PEAKS)
                .forEach(i -> climb(at(Math.max(0, i - 1)), at(i + 1)));
    }

    private static boolean peak(double[] values, int i) {
        int samples = values.length - 1;
        boolean overBefore = i == 0 || values[i] >= values[i - 1];
        boolean overAfter = i == samples || values[i] >= values[i + 1];
        boolean flat = (i == 0 || values[i] == values[i - 1]) && (i == samples || values[i] == values[i + 1]);
        return overBefore && overAfter && !flat;
    }

    private void climb(double first, double last) {
        see(new BrentOptimizer(RELATIVE, ABSOLUTE)
                .optimize(
                        new UnivariateObjectiveFunction(least::applyAsDouble),
                        GoalType.MAXIMIZE,
                        new SearchInterval(first, last),
                        new MaxEval(MOST_EVALUATIONS))
                .getPoint());
    }
}

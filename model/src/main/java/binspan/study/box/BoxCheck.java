package binspan.study.box;

import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.window.MarginFunction;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/** Checks a box at many points inside, those of a Sobol sequence, and where the margins lead to from the least of them and from hollows. */
final class BoxCheck {
    private static final int PORTION = 128;
    private static final int DESCENTS = 3;
    private static final double NEGLIGIBLE = 1e-9;

    private final ToleranceBox question;
    private final double[][] points;
    private final Execution execution;

    BoxCheck(ToleranceBox question, int points, Execution execution) {
        this.question = question;
        this.points = ShiftedSobol.plain(points, question.axes().size());
        this.execution = execution;
    }

    /**
     * The point with the least margin.
     *
     * @param relative the point in relative coordinates
     * @param margin its least margin
     */
    @SuppressWarnings("ArrayRecordComponent") // never compared
    record Worst(double[] relative, double margin) {
        /** Whether it violates a requirement. */
        boolean violates() {
            return margin < 0.0;
        }
    }

    /** The worst point of a box. */
    Worst worst(Box box, MarginFunction function) {
        double[] margins = margins(box);
        List<Integer> order = IntStream.range(0, margins.length)
                .boxed()
                .sorted(Comparator.comparingDouble(i -> margins[i]))
                .limit(DESCENTS)
                .toList();
        Worst worst = new Worst(points[order.get(0)], margins[order.get(0)]);
        if (worst.violates()) {
            return worst;
        }
        BoxDescent descent = new BoxDescent(box, function);
        List<double[]> followed = new ArrayList<>(descent.fromHollows());
        for (int start : order) {
            execution.stopIfCancelled();
            followed.add(descent.from(points[start]));
        }
        return lowest(followed, worst, box, function);
    }

    /** The lowest of the points that were followed, unless what it violates is less than rounding. */
    private static Worst lowest(List<double[]> followed, Worst otherwise, Box box, MarginFunction function) {
        Worst worst = otherwise;
        for (double[] point : followed) {
            double margin = function.least(box.at(point));
            worst = margin < Math.min(worst.margin(), -NEGLIGIBLE) ? new Worst(point, margin) : worst;
        }
        return worst;
    }

    private double[] margins(Box box) {
        double[] margins = new double[points.length];
        Workers.run(points.length, PORTION, execution, () -> {
            MarginFunction own = question.function();
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    margins[i] = own.least(box.at(points[i]));
                }
            };
        });
        return margins;
    }
}

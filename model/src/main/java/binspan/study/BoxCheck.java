package binspan.study;

import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Checks a box at many points inside: the points of a Sobol sequence, then a descent along the axes from the least of them, which finds what hides between
 * the points and on the faces.
 */
final class BoxCheck {
    private static final int PORTION = 128;
    private static final int DESCENTS = 3;
    private static final int ROUNDS = 3;
    private static final double TENTH = 0.1;
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
        for (int start : order) {
            execution.stopIfCancelled();
            Worst lower = descent(box, function, points[start]);
            boolean counts = worst.violates() || lower.margin() >= 0.0 || lower.margin() < -NEGLIGIBLE;
            worst = counts && lower.margin() < worst.margin() ? lower : worst;
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

    /** Goes down along one axis after the other, to the faces where they are lowest. */
    private static Worst descent(Box box, MarginFunction function, double[] start) {
        double[] place = start.clone();
        double margin = function.least(box.at(place));
        for (int round = 0; round < ROUNDS; round++) {
            for (int j = 0; j < place.length; j++) {
                double step = round == 0 ? TENTH : TENTH * TENTH;
                double present = place[j];
                for (double trial : new double[] {
                    0.0, 1.0, present - step, present + step, present - step / 2.0, present + step / 2.0
                }) {
                    double[] moved = place.clone();
                    moved[j] = Math.max(0.0, Math.min(1.0, trial));
                    double found = function.least(box.at(moved));
                    if (found < margin) {
                        margin = found;
                        place = moved;
                    }
                }
            }
        }
        return new Worst(place, margin);
    }

    /** Number of points of one check, the descents not counted. */
    int size() {
        return points.length;
    }
}

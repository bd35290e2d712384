package binspan.study.box;

import binspan.study.region.GridCrossings;
import binspan.study.window.MarginFunction;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Finds what hides between the checked points of a box and on its faces: the margins are followed downhill, along one axis after the other, from given points
 * and from every hollow on some lines through the box.
 */
final class BoxDescent {
    private static final int ROUNDS = 3;
    private static final double REACH = 1.0 / 16.0;
    private static final double ACCURACY = 1e-7;
    private static final int MOST_EVALUATIONS = 200;
    private static final int LINES = 3;
    private static final int STEPS = 32;

    private final Box box;
    private final MarginFunction function;

    BoxDescent(Box box, MarginFunction function) {
        this.box = box;
        this.function = function;
    }

    /** Where the tightest requirement at a point leads to, in relative coordinates. */
    double[] from(double[] point) {
        return from(function.tightest(box.at(point)), point);
    }

    private double[] from(int requirement, double[] point) {
        double[] place = point.clone();
        for (int round = 0; round < ROUNDS; round++) {
            for (int j = 0; j < place.length; j++) {
                place[j] = lowest(requirement, place, j);
            }
        }
        return place;
    }

    /** The lowest coordinate near the present one along an axis, the faces included. */
    private double lowest(int requirement, double[] place, int axis) {
        double present = place[axis];
        double first = Math.max(0.0, present - REACH);
        double last = Math.min(1.0, present + REACH);
        double found = new BrentOptimizer(ACCURACY, ACCURACY)
                .optimize(
                        new UnivariateObjectiveFunction(each -> margin(requirement, place, axis, each)),
                        GoalType.MINIMIZE,
                        new SearchInterval(first, last),
                        new MaxEval(MOST_EVALUATIONS))
                .getPoint();
        double lowest = present;
        for (double trial : new double[] {found, 0.0, 1.0}) {
            boolean lower = margin(requirement, place, axis, trial) < margin(requirement, place, axis, lowest);
            lowest = lower ? trial : lowest;
        }
        return lowest;
    }

    private double margin(int requirement, double[] place, int axis, double coordinate) {
        double[] moved = place.clone();
        moved[axis] = coordinate;
        return function.one(requirement, box.at(moved));
    }

    /** Where the hollows lead to that the margins have along each axis, on lines through the middle and through some other points. */
    List<double[]> fromHollows() {
        List<double[]> found = new ArrayList<>();
        double[][] through = ShiftedSobol.plain(LINES, box.axes());
        for (double[] point : through) {
            for (int axis = 0; axis < box.axes(); axis++) {
                hollows(point, axis, found);
            }
        }
        return found;
    }

    private void hollows(double[] through, int axis, List<double[]> found) {
        double[][] places = new double[STEPS + 1][];
        double[][] margins = new double[STEPS + 1][];
        for (int i = 0; i <= STEPS; i++) {
            places[i] = through.clone();
            places[i][axis] = (double) i / STEPS;
            margins[i] = function.at(box.at(places[i]));
        }
        for (int i = 1; i < STEPS; i++) {
            for (int k = 0; k < function.requirements(); k++) {
                double before = margins[i - 1][k] - margins[i][k];
                double after = margins[i + 1][k] - margins[i][k];
                double deepest = GridCrossings.FARTHEST * Math.max(before, after);
                if (before >= 0.0 && after >= 0.0 && before + after > 0.0 && margins[i][k] < deepest) {
                    found.add(from(k, places[i]));
                }
            }
        }
    }
}

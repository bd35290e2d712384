package binspan.study.box;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.optim.MaxIter;
import org.apache.commons.math3.optim.linear.LinearConstraint;
import org.apache.commons.math3.optim.linear.LinearConstraintSet;
import org.apache.commons.math3.optim.linear.LinearObjectiveFunction;
import org.apache.commons.math3.optim.linear.NonNegativeConstraint;
import org.apache.commons.math3.optim.linear.Relationship;
import org.apache.commons.math3.optim.linear.SimplexSolver;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;

/**
 * The largest product of some lengths, each linear in bounded numbers, while linear conditions hold: a linear problem for the simplex method, in which the
 * logarithm of each length is the lowest of its tangents. Inside, each number is counted as a share of the way between its bounds.
 */
final class LargestProduct {
    private static final int TANGENTS = 8;
    private static final double LEAST_SHARE = 1e-3;
    private static final double AT_END = 1.0 - 1e-9;
    private static final int MOST_PIVOTS = 3000;

    private final double[] numbers;
    private final double[] lowest;
    private final double[] highest;
    private final int lengths;
    private final List<LinearConstraint> rows = new ArrayList<>();

    /**
     * A problem.
     *
     * @param lengths factors of the numbers in each length
     * @param numbers the numbers from which conditions are counted
     * @param lowest lower bounds
     * @param highest upper bounds
     */
    LargestProduct(double[][] lengths, double[] numbers, double[] lowest, double[] highest) {
        this.numbers = numbers;
        this.lowest = lowest;
        this.highest = highest;
        this.lengths = lengths.length;
        double scale = 0.0;
        for (double[] length : lengths) {
            scale = Math.max(scale, Math.log(end(length, true) / shortest(length)));
        }
        for (int m = 0; m < lengths.length && scale > 0.0; m++) {
            tangents(lengths[m], m, scale);
        }
        for (int k = 0; k < numbers.length; k++) {
            double[] row = new double[numbers.length + lengths.length];
            row[k] = 1.0;
            rows.add(new LinearConstraint(row, Relationship.LEQ, 1.0));
        }
    }

    /** The shortest or longest that a length can become. */
    private double end(double[] length, boolean longest) {
        double end = 0.0;
        for (int k = 0; k < length.length; k++) {
            end += length[k] * (length[k] > 0.0 == longest ? highest[k] : lowest[k]);
        }
        return end;
    }

    private double shortest(double[] length) {
        return Math.max(end(length, false), LEAST_SHARE * end(length, true));
    }

    /** The logarithm of a length, counted from its least and in units of a scale, lies below its tangents. */
    private void tangents(double[] length, int m, double scale) {
        double least = shortest(length);
        double ratio = end(length, true) / least;
        for (int t = 0; t < TANGENTS; t++) {
            double touching = least * Math.pow(ratio, (double) t / (TANGENTS - 1));
            double[] row = new double[numbers.length + lengths];
            double right = Math.log(touching / least) - 1.0;
            for (int k = 0; k < numbers.length; k++) {
                row[k] = -length[k] * (highest[k] - lowest[k]) / touching / scale;
                right += length[k] * lowest[k] / touching;
            }
            row[numbers.length + m] = 1.0;
            rows.add(new LinearConstraint(row, Relationship.LEQ, right / scale));
        }
    }

    /**
     * Adds a condition: a value that must stay 0 or more.
     *
     * @param slopes how it grows with each number
     * @param value what it is now
     */
    void keep(double[] slopes, double value) {
        double[] row = new double[numbers.length + lengths];
        double atLowest = value;
        double worst = value;
        double largest = 0.0;
        for (int k = 0; k < numbers.length; k++) {
            row[k] = slopes[k] * (highest[k] - lowest[k]);
            atLowest -= slopes[k] * (numbers[k] - lowest[k]);
            worst -= Math.max(slopes[k] * (numbers[k] - lowest[k]), -slopes[k] * (highest[k] - numbers[k]));
            largest = Math.max(largest, Math.abs(row[k]));
        }
        if (worst < 0.0 && largest > 0.0) {
            for (int k = 0; k < numbers.length; k++) {
                row[k] /= largest;
            }
            rows.add(new LinearConstraint(row, Relationship.GEQ, -atLowest / largest));
        }
    }

    /** The numbers with the largest product; the present ones if the simplex method finds none. */
    double[] solved() {
        double[] objective = new double[numbers.length + lengths];
        for (int m = 0; m < lengths; m++) {
            objective[numbers.length + m] = 1.0;
        }
        try {
            return placed(new SimplexSolver()
                    .optimize(
                            new MaxIter(MOST_PIVOTS),
                            new LinearObjectiveFunction(objective, 0.0),
                            new LinearConstraintSet(rows),
                            GoalType.MAXIMIZE,
                            new NonNegativeConstraint(true))
                    .getPoint());
        } catch (MathIllegalStateException e) {
            return numbers;
        }
    }

    private double[] placed(double[] shares) {
        double[] placed = new double[numbers.length];
        for (int k = 0; k < placed.length; k++) {
            double share = Math.max(0.0, Math.min(1.0, shares[k]));
            placed[k] = share > AT_END ? highest[k] : lowest[k] + share * (highest[k] - lowest[k]);
        }
        return placed;
    }
}

package binspan.study.box;

import java.util.ArrayList;
import java.util.List;

/**
 * One step of a box search: the margins are taken as linear within a short reach, and the largest box of that problem is found. This is the sequential
 * linear programming of Griffith and Stewart (1961).
 */
final class BoxStep {
    private static final double SAFETY = 1.0;

    private final BoxConstraints constraints;
    private final BoxVariables variables;
    private final double[] numbers;
    private final double length;
    private final double[] lowest;
    private final double[] highest;
    private final List<Condition> conditions = new ArrayList<>();

    /**
     * A step.
     *
     * @param numbers the box to start from
     * @param length reach of the step, relative to the box
     */
    BoxStep(BoxConstraints constraints, BoxVariables variables, double[] numbers, double length) {
        this.constraints = constraints;
        this.variables = variables;
        this.numbers = numbers;
        this.length = length;
        this.lowest = variables.lowest(numbers, length);
        this.highest = variables.highest(numbers, length);
    }

    /** A value that must stay 0 or more: what it would be at the present box, and its slopes along the numbers. */
    @SuppressWarnings("ArrayRecordComponent") // never compared
    private record Condition(double value, double[] slopes) {}

    /**
     * Holds the box by its margins as they are near the present one.
     *
     * @param margins the margins of the present box at the relative places
     */
    void hold(double[][] margins) {
        add(numbers, margins, margins, near(margins));
    }

    /**
     * Holds the box by those margins also that an answer violated, as they are near another box.
     *
     * @param border a box at which they are about to be violated
     * @param margins its margins at the relative places
     * @param violated the margins of the answer
     */
    void hold(double[] border, double[][] margins, double[][] violated) {
        add(border, margins, violated, new double[margins[0].length]);
    }

    private void add(double[] at, double[][] margins, double[][] judged, double[] below) {
        BoxTangents tangents = new BoxTangents(constraints, variables, at, highest);
        for (int p = 0; p < margins.length; p++) {
            double[][] slopes = null;
            for (int i = 0; i < below.length; i++) {
                if (judged[p][i] < below[i]) {
                    slopes = slopes == null
                            ? tangents.slopes(constraints.relative().get(p), margins[p])
                            : slopes;
                    conditions.add(new Condition(atPresent(tangents, margins[p][i], slopes[i]), slopes[i]));
                }
            }
        }
    }

    private double atPresent(BoxTangents tangents, double margin, double[] slopes) {
        double value = margin;
        for (int k = 0; k < numbers.length; k++) {
            value += slopes[k] * (numbers[k] - tangents.numbers()[k]);
        }
        return value;
    }

    /** The numbers of the best box within reach, as the linear problem sees it; those of the present box if it has no answer. */
    double[] best() {
        LargestProduct problem = new LargestProduct(variables.lengths(numbers.length), numbers, lowest, highest);
        BoxTangents tangents = new BoxTangents(constraints, variables, numbers, highest);
        for (int j = 0; j < tangents.axes(); j++) {
            problem.keep(tangents.lowerFace(j), tangents.box().low()[j]);
            problem.keep(tangents.upperFace(j), 1.0 - tangents.box().high()[j]);
        }
        conditions.forEach(each -> problem.keep(each.slopes(), each.value()));
        return problem.solved();
    }

    /** Margins above these cannot come to zero within one step, judged by their spread over the box. */
    private double[] near(double[][] margins) {
        double[] near = new double[margins[0].length];
        for (int i = 0; i < near.length; i++) {
            double least = Double.POSITIVE_INFINITY;
            double most = Double.NEGATIVE_INFINITY;
            for (double[] each : margins) {
                least = Math.min(least, each[i]);
                most = Math.max(most, each[i]);
            }
            near[i] = SAFETY * length * (most - least);
        }
        return near;
    }
}

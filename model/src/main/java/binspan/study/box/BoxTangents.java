package binspan.study.box;

import binspan.study.window.MarginFunction;

/** How the faces of a box, and the margins at its relative places, change with its numbers. */
final class BoxTangents {
    private static final double SHIFT = 1e-4;
    private static final double LEAST_WIDTH = 1e-5;
    private static final double DIFFERENCE = 1e-6;

    private final MarginFunction function;
    private final double[] numbers;
    private final Box box;
    private final Box[] moved;
    private final double[] differences;

    /**
     * The tangents of a box.
     *
     * @param numbers its numbers
     * @param highest numbers to be reached, which tell the scale of each
     */
    BoxTangents(BoxConstraints constraints, BoxVariables variables, double[] numbers, double[] highest) {
        this.function = constraints.function();
        this.numbers = numbers;
        this.box = variables.box(numbers);
        this.moved = new Box[numbers.length];
        this.differences = new double[numbers.length];
        for (int k = 0; k < moved.length; k++) {
            double scale = Math.max(Math.abs(numbers[k]), Math.abs(highest[k]));
            differences[k] = DIFFERENCE * scale + Double.MIN_NORMAL;
            double[] changed = numbers.clone();
            changed[k] += differences[k];
            moved[k] = variables.box(changed);
        }
    }

    /** The numbers of the box. */
    double[] numbers() {
        return numbers;
    }

    /** The box. */
    Box box() {
        return box;
    }

    /** Number of axes. */
    int axes() {
        return box.axes();
    }

    /** How a lower face moves with each number. */
    double[] lowerFace(int axis) {
        double[] slopes = new double[numbers.length];
        for (int k = 0; k < slopes.length; k++) {
            slopes[k] = (moved[k].low()[axis] - box.low()[axis]) / differences[k];
        }
        return slopes;
    }

    /** How the room above an upper face changes with each number. */
    double[] upperFace(int axis) {
        double[] slopes = new double[numbers.length];
        for (int k = 0; k < slopes.length; k++) {
            slopes[k] = (box.high()[axis] - moved[k].high()[axis]) / differences[k];
        }
        return slopes;
    }

    /**
     * How the margin of each requirement at a relative place changes with each number.
     *
     * @param relative the place
     * @param here the margins there
     */
    double[][] slopes(double[] relative, double[] here) {
        double[] place = box.at(relative);
        double[][] slopes = new double[here.length][numbers.length];
        for (int j = 0; j < place.length; j++) {
            double shift = SHIFT * Math.max(LEAST_WIDTH, box.width(j)) * (relative[j] > Box.MIDDLE ? -1.0 : 1.0);
            double[] beside = place.clone();
            beside[j] += shift;
            double[] there = function.at(beside);
            for (int k = 0; k < numbers.length; k++) {
                double move = (moved[k].at(relative)[j] - place[j]) / differences[k];
                for (int i = 0; i < here.length; i++) {
                    slopes[i][k] += (there[i] - here[i]) / shift * move;
                }
            }
        }
        return slopes;
    }
}

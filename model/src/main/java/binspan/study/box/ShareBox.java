package binspan.study.box;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A box whose faces are free: its size is the product of the sides, each as a share of its axis. Its numbers are the lower faces, then the upper ones. */
final class ShareBox implements BoxVariables {
    private static final double INWARD = 0.9;
    private static final double LEAST_STEP = 1e-3;
    private static final double SAME = 1e-12;

    private final double[] highestLow;
    private final double[] lowestHigh;
    private final boolean held;

    private ShareBox(double[] highestLow, double[] lowestHigh, boolean held) {
        this.highestLow = highestLow;
        this.lowestHigh = lowestHigh;
        this.held = held;
    }

    /** All boxes of some axes. */
    static ShareBox free(int axes) {
        double[] ones = new double[axes];
        Arrays.fill(ones, 1.0);
        return new ShareBox(ones, new double[axes], false);
    }

    /**
     * The boxes that contain a place.
     *
     * @param below the place, or a little below it
     * @param above the place, or a little above it
     */
    static ShareBox holding(double[] below, double[] above) {
        return new ShareBox(below, above, true);
    }

    @Override
    public Box box(double[] numbers) {
        int axes = numbers.length / 2;
        double[] faces = Arrays.stream(numbers).map(ShareBox::exact).toArray();
        return new Box(Arrays.copyOf(faces, axes), Arrays.copyOfRange(faces, axes, 2 * axes));
    }

    /** Faces that lie at an end of their axis but for rounding lie there exactly. */
    private static double exact(double face) {
        return Math.abs(face) < SAME ? 0.0 : Math.abs(face - 1.0) < SAME ? 1.0 : face;
    }

    @Override
    public double[] around(double[] place, double size) {
        int axes = place.length;
        double[] numbers = new double[2 * axes];
        for (int j = 0; j < axes; j++) {
            numbers[j] = Math.max(0.0, place[j] - size);
            numbers[axes + j] = Math.max(held ? lowestHigh[j] : 0.0, Math.min(1.0, place[j] + size));
        }
        return numbers;
    }

    @Override
    public double[][] lengths(int numbers) {
        int axes = numbers / 2;
        double[][] lengths = new double[axes][numbers];
        for (int j = 0; j < axes; j++) {
            lengths[j][j] = -1.0;
            lengths[j][axes + j] = 1.0;
        }
        return lengths;
    }

    private static double width(double[] numbers, int axis) {
        return numbers[numbers.length / 2 + axis] - numbers[axis];
    }

    @Override
    public double[] lowest(double[] numbers, double length) {
        int axes = numbers.length / 2;
        double[] lowest = new double[numbers.length];
        for (int j = 0; j < axes; j++) {
            double width = width(numbers, j);
            lowest[j] = Math.max(0.0, numbers[j] - length * Math.max(LEAST_STEP, width));
            lowest[axes + j] = Math.max(lowestHigh[j], numbers[axes + j] - INWARD * length * width);
        }
        return lowest;
    }

    @Override
    public double[] highest(double[] numbers, double length) {
        int axes = numbers.length / 2;
        double[] highest = new double[numbers.length];
        for (int j = 0; j < axes; j++) {
            double width = width(numbers, j);
            highest[j] = Math.min(highestLow[j], numbers[j] + INWARD * length * width);
            highest[axes + j] = Math.min(1.0, numbers[axes + j] + length * Math.max(LEAST_STEP, width));
        }
        return highest;
    }

    @Override
    public double[] shrunk(double[] numbers, double share) {
        int axes = numbers.length / 2;
        double[] shrunk = new double[numbers.length];
        for (int j = 0; j < axes; j++) {
            double middle = (numbers[j] + numbers[axes + j]) / 2.0;
            shrunk[j] = numbers[j] + share * ((held ? highestLow[j] : middle) - numbers[j]);
            shrunk[axes + j] = numbers[axes + j] + share * ((held ? lowestHigh[j] : middle) - numbers[axes + j]);
        }
        return shrunk;
    }

    @Override
    public double[] shrunkInside(double[] numbers, double share) {
        int axes = numbers.length / 2;
        double[] shrunk = shrunk(numbers, share);
        for (int face = 0; face < numbers.length; face++) {
            boolean atEnd = exact(numbers[face]) == (face < axes ? 0.0 : 1.0);
            shrunk[face] = atEnd ? numbers[face] : shrunk[face];
        }
        return shrunk;
    }

    @Override
    public List<Retreat> retreats(double[] numbers, double[] relative) {
        int axes = numbers.length / 2;
        double[] place = box(numbers).at(relative);
        List<Retreat> retreats = new ArrayList<>();
        for (int face = 0; face < numbers.length; face++) {
            int axis = face % axes;
            boolean upper = face >= axes;
            double end = upper
                    ? Math.max(numbers[axis], lowestHigh[axis])
                    : Math.min(numbers[axes + axis], highestLow[axis]);
            if (upper ? place[axis] >= end : place[axis] <= end) {
                retreats.add(new Retreat(
                        with(numbers, face, place[axis]),
                        with(numbers, face, end),
                        with(relative, axis, upper ? 1.0 : 0.0)));
            }
        }
        return retreats;
    }

    @Override
    public List<double[]> pushes(double[] numbers) {
        int axes = numbers.length / 2;
        List<double[]> pushes = new ArrayList<>();
        for (int face = 0; face < numbers.length; face++) {
            double[] push = new double[numbers.length];
            push[face] = (face < axes ? 0.0 : 1.0) - numbers[face];
            pushes.add(push);
        }
        return pushes;
    }

    private static double[] with(double[] numbers, int index, double value) {
        double[] changed = numbers.clone();
        changed[index] = value;
        return changed;
    }
}

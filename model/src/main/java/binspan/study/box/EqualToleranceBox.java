package binspan.study.box;

import binspan.study.Axis;
import binspan.study.window.MarginFunction;
import java.util.Arrays;
import java.util.List;

/** A box of equal relative tolerance about its centre. Its numbers are the values of the centre, then the tolerance. */
final class EqualToleranceBox implements BoxVariables {
    private static final double SAME = 1e-12;
    private static final double CENTRE_REACH = 3.0;
    private static final double LARGEST = 1.0;

    private final List<Axis> axes;
    private final boolean held;

    /**
     * The boxes of some axes, none of which reaches zero.
     *
     * @param held whether the centre stays where it is
     */
    EqualToleranceBox(List<Axis> axes, boolean held) {
        this.axes = axes;
        this.held = held;
    }

    @Override
    public Box box(double[] numbers) {
        double[] low = new double[axes.size()];
        double[] high = new double[axes.size()];
        for (int j = 0; j < low.length; j++) {
            double half = Math.abs(numbers[j]) * tolerance(numbers);
            low[j] = share(axes.get(j), numbers[j] - half);
            high[j] = share(axes.get(j), numbers[j] + half);
        }
        return new Box(low, high);
    }

    private double tolerance(double[] numbers) {
        return numbers[axes.size()];
    }

    /** The share of a value, exactly 0 or 1 at the ends; below 0 where a logarithmic axis has none. */
    private static double share(Axis axis, double value) {
        double share = axis.logarithmic() && !(value > 0.0) ? -1.0 : axis.share(value);
        return Math.abs(share) < SAME ? 0.0 : Math.abs(share - 1.0) < SAME ? 1.0 : share;
    }

    @Override
    public double[] around(double[] place, double size) {
        double[] numbers = Arrays.copyOf(place, place.length + 1);
        double tolerance = size;
        for (int j = 0; j < place.length; j++) {
            Axis axis = axes.get(j);
            numbers[j] = MarginFunction.value(axis, place[j]);
            double room = Math.min(numbers[j] - axis.from(), axis.to() - numbers[j]);
            tolerance = Math.min(tolerance, room / Math.abs(numbers[j]));
        }
        numbers[place.length] = tolerance;
        return numbers;
    }

    @Override
    public double[][] lengths(int numbers) {
        double[][] lengths = new double[1][numbers];
        lengths[0][numbers - 1] = 1.0;
        return lengths;
    }

    @Override
    public double[] lowest(double[] numbers, double length) {
        double[] lowest = moved(numbers, -length);
        for (int j = 0; j < axes.size(); j++) {
            lowest[j] = Math.max(axes.get(j).from(), lowest[j]);
        }
        return lowest;
    }

    @Override
    public double[] highest(double[] numbers, double length) {
        double[] highest = moved(numbers, length);
        for (int j = 0; j < axes.size(); j++) {
            highest[j] = Math.min(axes.get(j).to(), highest[j]);
        }
        highest[axes.size()] = Math.min(LARGEST, highest[axes.size()]);
        return highest;
    }

    private double[] moved(double[] numbers, double length) {
        double[] moved = numbers.clone();
        for (int j = 0; j < axes.size(); j++) {
            moved[j] +=
                    held ? 0.0 : length * Math.min(LARGEST, CENTRE_REACH * tolerance(numbers)) * Math.abs(numbers[j]);
        }
        moved[axes.size()] += length * tolerance(numbers);
        return moved;
    }

    @Override
    public double[] shrunk(double[] numbers, double share) {
        double[] shrunk = numbers.clone();
        shrunk[axes.size()] *= 1.0 - share;
        return shrunk;
    }

    @Override
    public double[] shrunkInside(double[] numbers, double share) {
        return shrunk(numbers, share);
    }

    @Override
    public List<Retreat> retreats(double[] numbers, double[] relative) {
        Box box = box(numbers);
        double[] place = box.at(relative);
        double farthest = 0.0;
        double[] deviations = new double[place.length];
        for (int j = 0; j < place.length; j++) {
            double value = MarginFunction.value(axes.get(j), place[j]);
            deviations[j] = (value - numbers[j]) / Math.abs(numbers[j]);
            farthest = Math.max(farthest, Math.abs(deviations[j]));
        }
        if (farthest == 0.0) {
            return List.of();
        }
        double[] from = numbers.clone();
        from[axes.size()] = farthest;
        double[] onFace = box(from).relative(place);
        return List.of(new Retreat(from, shrunk(from, 1.0), onFace));
    }

    @Override
    public List<double[]> pushes(double[] numbers) {
        double[] push = new double[numbers.length];
        push[axes.size()] = LARGEST - tolerance(numbers);
        return List.of(push);
    }
}

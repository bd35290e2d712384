package binspan.study.box;

import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.study.window.MarginFunction;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.Optional;

/**
 * Where a box is held against the requirements while it is searched, for one thread: its corners, the middles of its faces, its centre, relative places
 * at which a check found it violating, and fixed places that it must not contain.
 */
final class BoxConstraints {
    private static final double OUTSIDE = -1.0;
    private static final double BEYOND = 1e-5;
    private static final int MOST_KNOWN = 4;

    private final MarginFunction function;
    private final BoxVariables variables;
    private final List<double[]> relative = new ArrayList<>();
    private final List<double[]> excluded = new ArrayList<>();
    private final Deque<Known> known = new ArrayDeque<>();

    BoxConstraints(MarginFunction function, BoxVariables variables, int axes) {
        this.function = function;
        this.variables = variables;
        for (int corner = 0; corner < 1 << axes; corner++) {
            relative.add(corner(corner, function.order()));
        }
        for (int face = 0; face < 2 * axes; face++) {
            double[] middle = new double[axes];
            Arrays.fill(middle, Box.MIDDLE);
            middle[face / 2] = face % 2;
            relative.add(middle);
        }
        double[] centre = new double[axes];
        Arrays.fill(centre, Box.MIDDLE);
        relative.add(centre);
    }

    /** The corners so that what is quick changes most often. */
    private static double[] corner(int corner, int[] order) {
        double[] place = new double[order.length];
        for (int k = 0; k < order.length; k++) {
            place[order[order.length - 1 - k]] = corner >> k & 1;
        }
        return place;
    }

    /** Adds a relative place, and the place itself as one that the box must not contain. */
    void add(double[] place, double[] fixed) {
        relative.add(place);
        excluded.add(fixed);
    }

    /** The relative places. */
    List<double[]> relative() {
        return relative;
    }

    MarginFunction function() {
        return function;
    }

    /** All margins at the relative places of a box; those of the last few boxes are remembered. */
    double[][] margins(double[] numbers) {
        for (Known each : known) {
            if (each.margins().length == relative.size() && Arrays.equals(each.numbers(), numbers)) {
                return each.margins();
            }
        }
        Box box = variables.box(numbers);
        double[][] margins =
                relative.stream().map(place -> function.at(box.at(place))).toArray(double[][]::new);
        known.addFirst(new Known(numbers, margins));
        if (known.size() > MOST_KNOWN) {
            known.removeLast();
        }
        return margins;
    }

    /** A box with its margins. */
    @SuppressWarnings("ArrayRecordComponent") // never compared
    private record Known(double[] numbers, double[][] margins) {}

    /** Whether the box of some numbers is allowed, as far as these places tell. */
    boolean allow(double[] numbers) {
        return inRange(numbers) && Arrays.stream(margins(numbers)).allMatch(BoxConstraints::met);
    }

    private boolean inRange(double[] numbers) {
        Box box = variables.box(numbers);
        return box.room() >= 0.0 && excluded.stream().noneMatch(box::contains);
    }

    private static boolean met(double[] margins) {
        return Arrays.stream(margins).allMatch(margin -> margin >= 0.0);
    }

    /** The same, given up at the first place that is violated. */
    boolean allowAtOnce(double[] numbers) {
        Box box = variables.box(numbers);
        return inRange(numbers) && relative.stream().allMatch(place -> function.least(box.at(place)) >= 0.0);
    }

    /** The requirement that fails just beyond a face of an allowed box; none where the range ends or nothing fails. */
    Optional<Requirement> beyond(Box box, int axis, boolean upper) {
        double[] low = box.low().clone();
        double[] high = box.high().clone();
        double step = BEYOND * box.width(axis);
        low[axis] -= upper ? 0.0 : step;
        high[axis] += upper ? step : 0.0;
        Box larger = new Box(low, high);
        if (larger.room() < 0.0) {
            return Optional.empty();
        }
        return relative.stream()
                .map(larger::at)
                .min(Comparator.comparingDouble(function::least))
                .filter(place -> function.least(place) < 0.0)
                .map(place -> function.margins().requirements().get(function.tightest(place)));
    }

    /** The relative places that are violated; none where the box leaves a range. */
    List<double[]> violated(double[] numbers) {
        List<double[]> violated = new ArrayList<>();
        if (variables.box(numbers).room() >= 0.0) {
            double[][] margins = margins(numbers);
            for (int p = 0; p < margins.length; p++) {
                if (!met(margins[p])) {
                    violated.add(relative.get(p));
                }
            }
        }
        return violated;
    }

    /** 0 or more if the box stays inside the ranges, without the excluded places and holds at the given relative places. */
    double least(double[] numbers, List<double[]> places) {
        Box box = variables.box(numbers);
        if (!inRange(numbers)) {
            return OUTSIDE;
        }
        double least = RequirementMargins.AMPLE;
        for (double[] place : places) {
            least = Math.min(least, function.least(box.at(place)));
        }
        return least;
    }
}

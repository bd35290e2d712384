package binspan.study.box;

import binspan.scenario.Range;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.window.MarginFunction;
import java.util.List;
import java.util.concurrent.CancellationException;

/**
 * The largest axis-parallel box of one to six parameters inside which every point meets all requirements: what an engineer writes into a specification.
 *
 * @param scenario the link as written, with at least one requirement
 * @param axes the parameters and the ranges that the box must not leave; their steps do not matter
 * @param sense what is made as large as possible
 * @param centred whether the box is held at the planned values: with {@link Sense#TOLERANCE} they are its centre, with {@link Sense#SHARE} they lie
 *     inside or on its border
 * @param seed shifts the points from which the search starts; the answer hardly depends on it
 */
public record ToleranceBox(Scenario scenario, List<Axis> axes, Sense sense, boolean centred, long seed) {
    /** Most parameters of a box. */
    public static final int MOST_AXES = 6;

    /** Seed where nothing else is asked for. */
    public static final long USUAL_SEED = 1L;

    /** Interior points at which the box is checked in the end. */
    public static final int CHECKED_POINTS = 10_000;

    /** What makes a box large. */
    public enum Sense {
        /** The product of its sides, each as a share of its axis in the axis' own linear or logarithmic scale. */
        SHARE,
        /** The relative tolerance t, the same for all: the sides run from c(1 - t) to c(1 + t) about the centre c. */
        TOLERANCE
    }

    /**
     * Checks the description.
     *
     * @throws IllegalArgumentException if nothing is required, if there are too many axes, if parameters cannot be varied here or not together, if a
     *     range of a relative tolerance touches zero, or if a planned value that shall be held is unknown or out of its range
     */
    public ToleranceBox {
        axes = List.copyOf(axes);
        if (axes.isEmpty() || axes.size() > MOST_AXES) {
            throw new IllegalArgumentException(
                    "found " + axes.size() + " parameters of a box; allowed 1 to " + MOST_AXES);
        }
        MarginFunction.check(scenario, axes);
        for (Axis axis : axes) {
            if (sense == Sense.TOLERANCE && axis.from() <= 0.0 && axis.to() >= 0.0) {
                throw new IllegalArgumentException(axis.parameter().path() + ": found " + words(axis)
                        + "; a relative tolerance needs a range on one side of 0");
            }
            if (centred) {
                planned(scenario, axis);
            }
        }
    }

    private static String words(Axis axis) {
        return Range.plain(axis.from()) + " to " + Range.plain(axis.to());
    }

    private static double planned(Scenario scenario, Axis axis) {
        String path = axis.parameter().path();
        double planned = axis.parameter()
                .value(scenario)
                .orElseThrow(() -> new IllegalArgumentException(
                        path + ": the scenario leaves it to be computed; state it to hold the box there"));
        if (planned < axis.from() || planned > axis.to()) {
            throw new IllegalArgumentException(path + ": found " + Range.plain(planned)
                    + " in the scenario; to hold the box there its range must contain it, found " + words(axis));
        }
        return planned;
    }

    /** The planned values as shares of the way along the axes, rounded so that they lie at or below what is planned. */
    double[] plannedShares() {
        return axes.stream()
                .mapToDouble(axis -> notAbove(axis, planned(scenario, axis)))
                .toArray();
    }

    /** The same, at or above what is planned. */
    private double[] plannedSharesAbove() {
        return axes.stream()
                .mapToDouble(axis -> notBelow(axis, planned(scenario, axis)))
                .toArray();
    }

    private static double notAbove(Axis axis, double planned) {
        double share = axis.share(planned);
        while (MarginFunction.value(axis, share) > planned) {
            share = Math.nextDown(share);
        }
        return share;
    }

    private static double notBelow(Axis axis, double planned) {
        double share = axis.share(planned);
        while (MarginFunction.value(axis, share) < planned) {
            share = Math.nextUp(share);
        }
        return share;
    }

    /** The margins over the axes, for one thread. */
    MarginFunction function() {
        return new MarginFunction(scenario, axes);
    }

    /** The boxes of this sense. */
    BoxVariables variables() {
        return sense == Sense.SHARE
                ? centred ? ShareBox.holding(plannedShares(), plannedSharesAbove()) : ShareBox.free(axes.size())
                : new EqualToleranceBox(axes, centred);
    }

    /**
     * Finds the box. Searches start at the roomiest points of a Sobol scan and go uphill by sequential linear programming, the box being held against its
     * corners and the middles of its faces; then faces are pushed to the exact border. The box is checked at many interior points; where one violates a
     * requirement, it is given up and the search goes on, until the check passes. The box is the largest one found, not proven to be the largest of all.
     *
     * @throws CancellationException if it shall stop
     */
    public OperatingBox run(Execution execution) {
        return new BoxHunt(this, execution).result();
    }
}

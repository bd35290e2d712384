package binspan.study;

import java.util.function.DoubleUnaryOperator;

/** Where a margin falls below zero. */
public final class Crossing {
    private static final int MOST_STEPS = 200;

    private Crossing() {}

    /**
     * The last point that still holds, between one that does and one that does not.
     *
     * @param margin margin, zero or more where it holds
     * @param good where it holds
     * @param bad where it does not, on either side
     * @param precision greatest distance to the true crossing, as a share of the larger end
     */
    public static double lastGood(DoubleUnaryOperator margin, double good, double bad, double precision) {
        double holds = good;
        double fails = bad;
        double above = margin.applyAsDouble(good);
        double below = margin.applyAsDouble(bad);
        double tolerance = precision * Math.max(Math.abs(good), Math.abs(bad));
        int sameSide = 0;
        for (int i = 0; i < MOST_STEPS && Math.abs(fails - holds) > tolerance; i++) {
            double x = sameSide >= 2 || i % 3 == 2
                    ? (holds + fails) / 2.0
                    : between(holds, fails, above, below, tolerance);
            double value = margin.applyAsDouble(x);
            if (value >= 0.0) {
                sameSide = sameSide > 0 ? sameSide + 1 : 1;
                holds = x;
                above = value;
            } else {
                sameSide = sameSide < 0 ? sameSide - 1 : -1;
                fails = x;
                below = value;
            }
        }
        return holds;
    }

    /** The secant's crossing, kept a little away from both ends so that each step shortens the bracket from the other side. */
    private static double between(double holds, double fails, double above, double below, double tolerance) {
        double share = above / (above - below);
        double width = Math.abs(fails - holds);
        double least = Math.min(0.5, 0.4 * tolerance / width);
        return holds + (fails - holds) * Math.max(least, Math.min(1.0 - least, share));
    }
}

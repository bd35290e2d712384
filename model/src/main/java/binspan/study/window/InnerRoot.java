package binspan.study.window;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.AllowedSolution;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;

/** Zeros of a margin, found from the side on which the requirement holds. */
public final class InnerRoot {
    private static final double RELATIVE = 1e-13;
    private static final double ABSOLUTE = 1e-17;
    private static final int ORDER = 5;
    private static final int MOST_EVALUATIONS = 1000;

    private InnerRoot() {}

    /**
     * The end of the last bracket about a zero at which the function is 0 or more.
     *
     * @param function negative at one of the places, 0 or more at the other
     * @param first one place
     * @param second the other place, above the first
     */
    public static double between(DoubleUnaryOperator function, double first, double second) {
        return new BracketingNthOrderBrentSolver(RELATIVE, ABSOLUTE, Double.MIN_VALUE, ORDER)
                .solve(
                        MOST_EVALUATIONS,
                        place -> held(function.applyAsDouble(place)),
                        first,
                        second,
                        AllowedSolution.ABOVE_SIDE);
    }

    /** Zero counts as held, so that a search goes on from it to where the margin turns negative. */
    private static double held(double margin) {
        return margin == 0.0 ? Double.MIN_NORMAL : margin;
    }
}

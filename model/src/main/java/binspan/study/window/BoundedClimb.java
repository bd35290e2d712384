package binspan.study.window;

import java.util.Arrays;
import org.apache.commons.math3.analysis.MultivariateFunction;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.PointValuePair;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.apache.commons.math3.random.MersenneTwister;

/** The highest value of a function within bounds, by the covariance matrix adaptation of Hansen and Ostermeier (2001); for functions with kinks. */
public final class BoundedClimb {
    private static final long SEED = 20_261_201L;
    private static final double FIRST_STEP = 0.25;
    private static final int FEWEST_OFFSPRING = 4;

    private final MultivariateFunction function;
    private final double[] lowest;
    private final double[] highest;

    /**
     * A climb.
     *
     * @param function what to maximise
     * @param lowest lower bounds
     * @param highest upper bounds, each above its lower one
     */
    public BoundedClimb(MultivariateFunction function, double[] lowest, double[] highest) {
        this.function = function;
        this.lowest = lowest;
        this.highest = highest;
    }

    /**
     * The highest place found, at least as high as the start.
     *
     * @param start where to begin, within the bounds
     * @param generations most generations
     * @param goal value beyond which to stop, 0 to go on to the end
     */
    public double[] from(double[] start, int generations, double goal) {
        int count = start.length;
        double[] step = new double[count];
        Arrays.fill(step, FIRST_STEP);
        double[] ones = new double[count];
        Arrays.fill(ones, 1.0);
        CMAESOptimizer optimizer =
                new CMAESOptimizer(generations, goal, true, 0, 0, new MersenneTwister(SEED), false, null);
        PointValuePair found = optimizer.optimize(
                new ObjectiveFunction(place -> function.value(placed(place))),
                GoalType.MAXIMIZE,
                MaxEval.unlimited(),
                new SimpleBounds(new double[count], ones),
                new InitialGuess(shares(start)),
                new CMAESOptimizer.Sigma(step),
                new CMAESOptimizer.PopulationSize(FEWEST_OFFSPRING + (int) (3.0 * Math.log(count + 1.0))));
        double[] best = placed(found.getPoint());
        return function.value(best) > function.value(start) ? best : start.clone();
    }

    private double[] placed(double[] shares) {
        double[] place = new double[shares.length];
        for (int i = 0; i < place.length; i++) {
            double value = lowest[i] + shares[i] * (highest[i] - lowest[i]);
            place[i] = Math.max(lowest[i], Math.min(highest[i], value));
        }
        return place;
    }

    private double[] shares(double[] place) {
        double[] shares = new double[place.length];
        for (int i = 0; i < place.length; i++) {
            double share = (place[i] - lowest[i]) / (highest[i] - lowest[i]);
            shares[i] = Math.max(0.0, Math.min(1.0, share));
        }
        return shares;
    }
}

package binspan.study.tuning;

import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.PointEvaluator;
import binspan.study.Workers;
import binspan.study.tuning.Landscape.Candidate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.SimplePointChecker;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.apache.commons.math3.random.SobolSequenceGenerator;
import org.apache.commons.math3.random.Well19937c;

/**
 * Global before local: a scan of Sobol points, evolution strategies (CMA-ES: Hansen, Ostermeier, Evol. Comput. 9, 159 (2001)) from the best of them that
 * lie apart, and finer ones from the best point of all. Where nothing meets the requirements, the same search for the least violation.
 */
final class TuningSearch {
    /** Effort for a study of its own. */
    static final Effort THOROUGH = new Effort(2048, 6, 200, 4);

    /** Effort for one of many. */
    static final Effort QUICK = new Effort(256, 2, 80, 2);

    /** Effort for one that begins at the best settings of a similar link. */
    static final Effort NEARBY = new Effort(64, 1, 40, 1);

    private static final double WEIGHT = 200.0;
    private static final double FIRST_SIGMA = 0.12;
    private static final double NEARBY_SIGMA = 0.04;
    private static final double FINER = 0.1;
    private static final double STRICTER = 10.0;
    private static final double APART = 0.15;
    private static final double PRECISION = 1e-11;

    /** A change of the merit that nobody would notice; less than the search's own precision would be pointless. */
    private static final double NO_DIFFERENCE = 1e-9;

    /**
     * How much is tried.
     *
     * @param scan points of the scan
     * @param starts evolution strategies
     * @param generations of each at most
     * @param refinements finer searches from the best point, each a tenth as wide and ten times as strict as the one before
     */
    record Effort(int scan, int starts, int generations, int refinements) {}

    private final Tuning tuning;
    private final Effort effort;
    private final List<Double> start;

    /**
     * A search.
     *
     * @param start settings to begin at as well; empty for those as written
     */
    TuningSearch(Tuning tuning, Effort effort, List<Double> start) {
        this.tuning = tuning;
        this.effort = effort;
        this.start = start;
    }

    Tuning.Outcome run(Execution execution) {
        Search search = search(tuning.objective(), execution.part(0.0, 0.7));
        if (!search.best.feasible() && tuning.objective() != Objective.MARGIN) {
            Search rescue = search(Objective.MARGIN, execution.part(0.7, 1.0));
            rescue.evaluations += search.evaluations;
            search = rescue.best.betterThan(search.best) ? rescue : search;
        }
        execution.reached(1.0);
        return outcome(search);
    }

    private Tuning.Outcome outcome(Search search) {
        PointEvaluator evaluator = evaluator();
        double[] numbers = unmoved(evaluator, search);
        List<Double> values = Arrays.stream(numbers).boxed().toList();
        Scenario best = evaluator.scenario(numbers);
        return new Tuning.Outcome(
                best,
                values,
                evaluator.at(numbers),
                search.best.feasible(),
                evaluator.predicted(tuning.scenario()),
                search.evaluations);
    }

    /** The best settings, with those parameters back at their planned values which make no difference. */
    private double[] unmoved(PointEvaluator evaluator, Search search) {
        double[] planned = planned();
        Landscape landscape = landscape(evaluator, tuning.objective(), WEIGHT);
        double[] point = search.best.point();
        double score = landscape.score(point);
        double[] values = new double[point.length];
        for (int i = 0; i < point.length; i++) {
            double found = point[i];
            point[i] = planned[i];
            double back = landscape.score(point);
            boolean indifferent = back >= score - NO_DIFFERENCE;
            point[i] = indifferent ? planned[i] : found;
            Axis axis = tuning.free().get(i);
            values[i] = axis.at(point[i]);
            double written = axis.parameter().value(tuning.scenario()).orElse(Double.NaN);
            if (indifferent && written >= axis.from() && written <= axis.to()) {
                values[i] = written;
            }
        }
        return values;
    }

    private PointEvaluator evaluator() {
        List<Parameter> parameters = tuning.free().stream().map(Axis::parameter).toList();
        return new PointEvaluator(tuning.scenario(), parameters, tuning.margins());
    }

    /** The best point found and what it took. */
    private static final class Search {
        private Candidate best;
        private int evaluations;

        void take(Landscape landscape) {
            evaluations += landscape.evaluations();
            if (landscape.best() != null && landscape.best().betterThan(best)) {
                best = landscape.best();
            }
        }
    }

    private Search search(Objective objective, Execution execution) {
        Search search = new Search();
        List<double[]> starts = scan(objective, search, execution.part(0.0, 0.3));
        Landscape[] climbed = new Landscape[starts.size()];
        Workers.run(starts.size(), 1, execution.part(0.3, 0.8), () -> {
            PointEvaluator evaluator = evaluator();
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    climbed[i] =
                            climb(landscape(evaluator, objective, WEIGHT), starts.get(i), sigma(), tuning.seed() + i);
                }
            };
        });
        Arrays.stream(climbed).forEach(search::take);
        PointEvaluator evaluator = evaluator();
        double sigma = sigma();
        double weight = WEIGHT;
        for (int i = 0; i < effort.refinements(); i++) {
            execution.stopIfCancelled();
            sigma *= FINER;
            weight *= STRICTER;
            search.take(
                    climb(landscape(evaluator, objective, weight), search.best.point(), sigma, tuning.seed() - 1 - i));
        }
        return search;
    }

    private double sigma() {
        return start.isEmpty() ? FIRST_SIGMA : NEARBY_SIGMA;
    }

    /** Scans the cube and returns the best points that lie apart, the scenario as written among the candidates. */
    private List<double[]> scan(Objective objective, Search search, Execution execution) {
        double[][] points = points();
        double[] scores = new double[points.length];
        Workers.run(points.length, 64, execution, () -> {
            Landscape landscape = landscape(evaluator(), objective, WEIGHT);
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    scores[i] = landscape.score(points[i]);
                }
            };
        });
        List<double[]> starts = apart(points, scores);
        Landscape best = landscape(evaluator(), objective, WEIGHT);
        starts.forEach(best::score);
        search.take(best);
        search.evaluations += points.length;
        return starts;
    }

    private double[][] points() {
        int dimension = tuning.free().size();
        SobolSequenceGenerator sobol = new SobolSequenceGenerator(dimension);
        SplittableRandom random = new SplittableRandom(tuning.seed());
        double[] shift = random.doubles(dimension).toArray();
        double[][] points = new double[effort.scan() + 1][];
        points[0] = first();
        for (int i = 1; i < points.length; i++) {
            points[i] = sobol.nextVector();
            for (int k = 0; k < dimension; k++) {
                points[i][k] = (points[i][k] + shift[k]) % 1.0;
            }
        }
        return points;
    }

    private double[] first() {
        if (start.isEmpty()) {
            return planned();
        }
        double[] shares = new double[start.size()];
        for (int i = 0; i < shares.length; i++) {
            shares[i] = Math.max(0.0, Math.min(1.0, tuning.free().get(i).share(start.get(i))));
        }
        return shares;
    }

    /** The scenario as written, moved into the cube where it lies outside. */
    private double[] planned() {
        return tuning.free().stream()
                .mapToDouble(axis -> {
                    double value = axis.parameter().value(tuning.scenario()).orElse(axis.from());
                    double share = axis.share(Math.max(axis.from(), Math.min(axis.to(), value)));
                    return share >= 0.0 && share <= 1.0 ? share : 0.5;
                })
                .toArray();
    }

    private List<double[]> apart(double[][] points, double[] scores) {
        Integer[] ranked = new Integer[points.length];
        Arrays.setAll(ranked, i -> i);
        Arrays.sort(ranked, (a, b) -> Double.compare(scores[b], scores[a]));
        List<double[]> starts = new ArrayList<>();
        for (int i = 0; i < ranked.length && starts.size() < effort.starts(); i++) {
            double[] point = points[ranked[i]];
            if (starts.stream().allMatch(other -> distance(point, other) > APART)) {
                starts.add(point);
            }
        }
        return starts;
    }

    private static double distance(double[] a, double[] b) {
        double largest = 0.0;
        for (int i = 0; i < a.length; i++) {
            largest = Math.max(largest, Math.abs(a[i] - b[i]));
        }
        return largest;
    }

    private Landscape landscape(PointEvaluator evaluator, Objective objective, double weight) {
        return new Landscape(evaluator, tuning.free(), objective, weight);
    }

    private Landscape climb(Landscape landscape, double[] start, double sigma, long seed) {
        int dimension = start.length;
        double[] sigmas = new double[dimension];
        double[] lower = new double[dimension];
        double[] upper = new double[dimension];
        Arrays.fill(sigmas, sigma);
        Arrays.fill(upper, 1.0);
        CMAESOptimizer optimizer = new CMAESOptimizer(
                effort.generations(),
                0.0,
                true,
                0,
                0,
                new Well19937c(seed),
                false,
                new SimplePointChecker<>(PRECISION, PRECISION));
        optimizer.optimize(
                new MaxEval(Integer.MAX_VALUE),
                new ObjectiveFunction(landscape::score),
                GoalType.MAXIMIZE,
                new InitialGuess(start),
                new SimpleBounds(lower, upper),
                new CMAESOptimizer.Sigma(sigmas),
                new CMAESOptimizer.PopulationSize(4 + (int) (3.0 * Math.log(dimension)) + 2));
        return landscape;
    }
}

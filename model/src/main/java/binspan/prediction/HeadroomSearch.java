package binspan.prediction;

import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import org.apache.commons.numbers.rootfinder.BrentSolver;

/**
 * Finds the nearest value of each drifting quantity at which the first requirement fails: steps that quadruple outwards until one fails, then a root
 * search for the least margin.
 */
final class HeadroomSearch {
    private static final BrentSolver ROOT = new BrentSolver(1e-6, 1e-15, 0.0);
    private static final double FIRST_SHARE = 0.05;
    private static final double UPWARDS_STEP = 0.1;
    private static final double STEEPEST = 10.0;
    private static final double NEGLIGIBLE = 1e-6;
    private static final double GROWTH = 4.0;
    private static final int MOST_STEPS = 80;

    private final Scenario scenario;
    private final LinkPredictor predictor = new LinkPredictor();
    private final RequirementMargins held;

    private HeadroomSearch(Scenario scenario, List<RequirementOutcome> outcomes) {
        this.scenario = scenario;
        this.held = RequirementMargins.ofMet(outcomes);
    }

    /** The headroom of every drifting quantity that has a limit, for the requirements that are met. */
    static List<Headroom> of(Scenario scenario, List<RequirementOutcome> outcomes) {
        HeadroomSearch search = new HeadroomSearch(scenario, outcomes);
        List<Headroom> headroom = new ArrayList<>();
        if (!search.held.requirements().isEmpty()) {
            DriftingQuantities.of(scenario).forEach(quantity -> search.add(quantity, headroom));
        }
        return headroom;
    }

    /**
     * The limit of a quantity that only grows, for the requirements that are met; absent where none is met or none fails within its range.
     *
     * @param scenario the link
     * @param outcomes its requirements
     * @param parameter the quantity, which has a planned value
     * @param scenarios the link at each value of it
     */
    static Optional<Headroom> upwards(
            Scenario scenario,
            List<RequirementOutcome> outcomes,
            Parameter parameter,
            DoubleFunction<Scenario> scenarios) {
        HeadroomSearch search = new HeadroomSearch(scenario, outcomes);
        if (search.held.requirements().isEmpty()) {
            return Optional.empty();
        }
        Axis axis = new Axis(parameter, scenarios, parameter.value(scenario).orElseThrow());
        OptionalDouble limit = search.limit(axis, UPWARDS_STEP, Double.POSITIVE_INFINITY);
        return limit.isPresent() ? Optional.of(search.headroom(axis, limit.getAsDouble())) : Optional.empty();
    }

    private void add(DriftingQuantities.Quantity quantity, List<Headroom> headroom) {
        Parameter parameter = ParameterPaths.find(scenario, quantity.path());
        Axis axis = new Axis(
                parameter, parameter.over(scenario), parameter.value(scenario).orElse(0.0));
        double outward = axis.planned() < 0.0 ? -1.0 : 1.0;
        if (quantity.bothWays()) {
            limit(axis, -outward * FIRST_SHARE * axis.planned(), quantity.widestStep())
                    .ifPresent(limit -> headroom.add(headroom(axis, limit)));
        }
        double step = Math.max(quantity.firstStep(), FIRST_SHARE * Math.abs(axis.planned()));
        limit(axis, outward * Math.min(step, quantity.widestStep()), quantity.widestStep())
                .ifPresent(limit -> headroom.add(headroom(axis, limit)));
    }

    /** One quantity with the scenarios along it. */
    private record Axis(Parameter parameter, DoubleFunction<Scenario> scenarios, double planned) {}

    private Headroom headroom(Axis axis, double limit) {
        return new Headroom(
                axis.parameter().path(), axis.parameter().unit(), axis.planned(), limit, worst(axis, limit));
    }

    private OptionalDouble limit(Axis axis, double firstStep, double widestStep) {
        double good = axis.planned();
        double step = firstStep;
        for (int i = 0; i < MOST_STEPS; i++) {
            double next = inside(axis.parameter().range(), good, tamed(good, step));
            if (next == good || Math.abs(next) < NEGLIGIBLE * Math.abs(axis.planned())) {
                return OptionalDouble.empty();
            }
            if (!(leastMargin(axis, next) >= 0.0)) {
                return OptionalDouble.of(
                        ROOT.findRoot(x -> finite(leastMargin(axis, x)), Math.min(good, next), Math.max(good, next)));
            }
            good = next;
            step = Math.copySign(Math.min(Math.abs(step) * GROWTH, widestStep), step);
        }
        return OptionalDouble.empty();
    }

    /** One step on, but towards zero never more than half of the way. */
    private static double tamed(double from, double step) {
        return from * step < 0.0 && Math.abs(step) > Math.abs(from) / 2.0 ? from / 2.0 : from + step;
    }

    /** The next value, pulled back into the range; half-way to an end that is itself excluded. */
    private static double inside(Range range, double from, double to) {
        if (to > range.highest()) {
            return range.highestOpen() ? (from + range.highest()) / 2.0 : range.highest();
        }
        if (to < range.lowest() || (to == range.lowest() && range.lowestOpen())) {
            return range.lowestOpen() ? (from + range.lowest()) / 2.0 : range.lowest();
        }
        return to;
    }

    private static double finite(double margin) {
        return margin >= -STEEPEST ? Math.min(margin, STEEPEST) : -STEEPEST;
    }

    private double leastMargin(Axis axis, double value) {
        return held.least(predictor.of(axis.scenarios().apply(value)));
    }

    private Requirement worst(Axis axis, double value) {
        int tightest = held.tightest(predictor.of(axis.scenarios().apply(value)));
        return held.requirements().get(tightest);
    }
}

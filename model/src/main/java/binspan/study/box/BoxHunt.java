package binspan.study.box;

import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.box.BindingPoint.Position;
import binspan.study.window.MarginFunction;
import binspan.study.window.WindowEnd;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** One search for the largest box: starts, climbs from the most promising ones, checks, the best of what passes. */
final class BoxHunt {
    private static final double STARTS_END = 0.2;
    private static final double ROUGH_END = 0.6;
    private static final double FINE_END = 0.85;
    private static final int CLIMBS = 6;
    private static final int FINISHED = 2;
    private static final int LIGHT = 1000;
    private static final int FEW_ROUNDS = 10;
    private static final int MOST_ROUNDS = 60;
    private static final double LAST_RESORT = 0.2;
    private static final double AS_TIGHT = 1e-9;

    private final ToleranceBox question;
    private final Execution execution;
    private final Execution silent;
    private final BoxVariables variables;

    BoxHunt(ToleranceBox question, Execution execution) {
        this.question = question;
        this.execution = execution;
        this.silent = execution.silent();
        this.variables = question.variables();
    }

    /** A box of one search with the places at which it is held. */
    @SuppressWarnings("ArrayRecordComponent") // never compared
    private record Candidate(double[] numbers, BoxConstraints constraints) {}

    OperatingBox result() {
        List<double[]> starts = new BoxStarts(question, execution.part(0.0, STARTS_END)).points();
        execution.reached(STARTS_END);
        MarginFunction function = question.function();
        double[] first = starts.get(0);
        if (function.least(first) < 0.0) {
            execution.reached(1.0);
            return new OperatingBox(question, List.of(), Optional.empty(), 0, Optional.of(function.verdict(first)));
        }
        List<Candidate> rough = climbed(promising(starts), BoxSearch.ROUGH, execution.part(STARTS_END, ROUGH_END));
        List<double[]> best =
                rough.stream().limit(FINISHED).map(Candidate::numbers).toList();
        List<Candidate> fine = climbed(best, BoxSearch.FINE, execution.part(ROUGH_END, FINE_END));
        Candidate passed = passed(fine);
        execution.reached(1.0);
        return box(passed);
    }

    /** The largest of the candidates after their final checks. */
    private Candidate passed(List<Candidate> candidates) {
        Candidate best = null;
        for (Candidate candidate : candidates) {
            if (best == null || gain(candidate) > gain(best)) {
                Candidate passed = passed(candidate);
                best = best == null || gain(passed) > gain(best) ? passed : best;
            }
        }
        return best;
    }

    private double gain(Candidate candidate) {
        return variables.gain(candidate.numbers());
    }

    private BoxConstraints constraints() {
        return new BoxConstraints(
                question.function(), variables, question.axes().size());
    }

    /** The largest boxes about the starts. */
    private List<double[]> promising(List<double[]> starts) {
        double[][] boxes = new double[starts.size()][];
        Workers.run(starts.size(), 1, silent, () -> {
            BoxSearch search = new BoxSearch(variables, constraints(), execution);
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    boxes[i] = search.about(starts.get(i));
                }
            };
        });
        return Arrays.stream(boxes)
                .sorted(Comparator.comparingDouble(numbers -> -variables.gain(numbers)))
                .limit(CLIMBS)
                .toList();
    }

    /** What climbs from them lead to, lightly checked, the largest first. */
    private List<Candidate> climbed(List<double[]> boxes, double shortest, Execution run) {
        Candidate[] climbed = new Candidate[boxes.size()];
        Workers.run(boxes.size(), 1, run, () -> (first, end) -> {
            for (int i = first; i < end; i++) {
                Candidate candidate = new Candidate(boxes.get(i), constraints());
                BoxCheck check = new BoxCheck(question, LIGHT, execution.inside());
                climbed[i] = given(candidate, shortest, check);
            }
        });
        return Arrays.stream(climbed)
                .sorted(Comparator.comparingDouble(candidate -> -gain(candidate)))
                .toList();
    }

    /** The candidate climbed, and climbed again after each place that a check makes it give up. */
    private Candidate given(Candidate candidate, double shortest, BoxCheck check) {
        BoxSearch search = new BoxSearch(variables, candidate.constraints(), execution);
        double[] numbers = search.climb(candidate.numbers(), shortest);
        for (int round = 0; round < FEW_ROUNDS; round++) {
            BoxCheck.Worst worst =
                    check.worst(variables.box(numbers), candidate.constraints().function());
            if (!worst.violates()) {
                break;
            }
            numbers = search.climb(search.without(numbers, worst.relative()), shortest);
        }
        return new Candidate(numbers, candidate.constraints());
    }

    /** The candidate pushed to the exact border and checked until it violates nothing. */
    private Candidate passed(Candidate candidate) {
        BoxCheck check = new BoxCheck(question, ToleranceBox.CHECKED_POINTS, silent);
        BoxConstraints constraints = candidate.constraints();
        BoxSearch search = new BoxSearch(variables, constraints, execution);
        double[] numbers = search.pushed(candidate.numbers());
        BoxCheck.Worst worst = check.worst(variables.box(numbers), constraints.function());
        for (int round = 0; worst.violates(); round++) {
            numbers = round < MOST_ROUNDS
                    ? search.pushed(search.climb(search.without(numbers, worst.relative()), BoxSearch.FINE))
                    : variables.shrunk(numbers, LAST_RESORT);
            worst = check.worst(variables.box(numbers), constraints.function());
        }
        return new Candidate(numbers, constraints);
    }

    private OperatingBox box(Candidate candidate) {
        Box box = variables.box(candidate.numbers());
        BoxConstraints constraints = candidate.constraints();
        List<BoxSide> sides = new ArrayList<>();
        for (int j = 0; j < box.axes(); j++) {
            sides.add(new BoxSide(
                    question.axes().get(j), face(box, constraints, j, false), face(box, constraints, j, true)));
        }
        int checked = constraints.relative().size() + ToleranceBox.CHECKED_POINTS;
        return new OperatingBox(question, sides, Optional.of(binding(box, constraints)), checked, Optional.empty());
    }

    private WindowEnd face(Box box, BoxConstraints constraints, int axis, boolean upper) {
        double share = upper ? box.high()[axis] : box.low()[axis];
        return new WindowEnd(
                MarginFunction.value(question.axes().get(axis), share), constraints.beyond(box, axis, upper));
    }

    /** The least margin, at a corner if one is as tight as any other point. */
    private static BindingPoint binding(Box box, BoxConstraints constraints) {
        double[] any = tightest(box, constraints, constraints.relative());
        List<double[]> corners = constraints.relative().subList(0, 1 << box.axes());
        double[] corner = tightest(box, constraints, corners);
        MarginFunction function = constraints.function();
        boolean asTight = function.least(box.at(corner)) <= function.least(box.at(any)) + AS_TIGHT;
        double[] binding = asTight ? corner : any;
        List<Position> positions = Arrays.stream(binding)
                .mapToObj(each -> each == 0.0 ? Position.LOW : each == 1.0 ? Position.HIGH : Position.INSIDE)
                .toList();
        return new BindingPoint(positions, function.verdict(box.at(binding)));
    }

    private static double[] tightest(Box box, BoxConstraints constraints, List<double[]> places) {
        return places.stream()
                .min(Comparator.comparingDouble(each -> constraints.function().least(box.at(each))))
                .orElseThrow();
    }
}

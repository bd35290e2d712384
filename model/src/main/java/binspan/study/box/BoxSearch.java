package binspan.study.box;

import binspan.study.Execution;
import binspan.study.box.BoxVariables.Retreat;
import binspan.study.window.InnerRoot;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;

/** Makes one box as large as its constraints allow, for one thread. */
final class BoxSearch {
    /** Shortest steps of a first look. */
    static final double ROUGH = 0.1;

    /** Shortest steps of a search to its end. */
    static final double FINE = 0.01;

    private static final double FIRST_LENGTH = 0.5;
    private static final double LONGER = 2.0;
    private static final double SHORTER = 0.3;
    private static final int CORRECTIONS = 6;
    private static final int MOST_STEPS = 60;
    private static final double SMALLEST = 1e-14;
    private static final double FIRST_SHRINK = 1e-7;
    private static final double LAST_SHRINK = 0.5;
    private static final double SHRINK_GROWTH = 8.0;
    private static final int MOST_SHRINKS = 6;
    private static final int MOST_HALVINGS = 100;
    private static final int MARCH = 32;
    private static final double FIRST_PUSH = 1e-6;
    private static final double PUSH_GROWTH = 3.0;

    private final BoxVariables variables;
    private final BoxConstraints constraints;
    private final Execution execution;

    BoxSearch(BoxVariables variables, BoxConstraints constraints, Execution execution) {
        this.variables = variables;
        this.constraints = constraints;
        this.execution = execution;
    }

    /** A box about a place that meets all requirements: the largest of those that halve in size, at least the place alone. */
    double[] about(double[] place) {
        for (double size = FIRST_LENGTH; size > SMALLEST; size /= 2.0) {
            double[] numbers = variables.around(place, size);
            if (constraints.allowAtOnce(numbers)) {
                return numbers;
            }
        }
        return variables.around(place, 0.0);
    }

    /**
     * The largest box that steps uphill lead to.
     *
     * @param shortest reach of the last steps, relative to the box: {@link #ROUGH} or {@link #FINE}
     */
    double[] climb(double[] start, double shortest) {
        double worthwhile = shortest * shortest / 10.0;
        double[] numbers = start;
        double length = FIRST_LENGTH;
        for (int step = 0; step < MOST_STEPS && length > shortest; step++) {
            execution.stopIfCancelled();
            double[] next = next(numbers, length, worthwhile);
            double gained = variables.gain(next) - variables.gain(numbers);
            if (gained > worthwhile) {
                numbers = next;
                length = Math.min(FIRST_LENGTH, length * LONGER);
            } else {
                length *= SHORTER;
            }
        }
        return numbers;
    }

    /** The best box that one step reaches: where its linear problem goes too far, it is given the tangents at the border and asked again. */
    private double[] next(double[] numbers, double length, double worthwhile) {
        BoxStep step = new BoxStep(constraints, variables, numbers, length);
        step.hold(constraints.margins(numbers));
        double[] best = numbers;
        for (int i = 0; i < CORRECTIONS; i++) {
            double[] answer = step.best();
            if (variables.gain(answer) < variables.gain(best) + worthwhile) {
                return best;
            }
            if (constraints.allow(answer)) {
                return answer;
            }
            double[] border = allowed(answer);
            if (border == null) {
                return best;
            }
            best = variables.gain(border) > variables.gain(best) ? border : best;
            step.hold(border, constraints.margins(border), constraints.margins(answer));
        }
        return best;
    }

    /** The box shrunk until its constraints allow it; null if that takes too much. */
    private double[] allowed(double[] numbers) {
        double[] shrunk = numbers;
        for (int i = 0; i < MOST_SHRINKS; i++) {
            if (constraints.allow(shrunk)) {
                return shrunk;
            }
            shrunk = shrunk(shrunk);
            if (shrunk == null) {
                return null;
            }
        }
        return null;
    }

    /** Shrunk until the places hold that are violated now, if possible without moving faces at the ends of their axes. */
    private double[] shrunk(double[] numbers) {
        List<double[]> violated = constraints.violated(numbers);
        double[] inside = shrunk(violated, share -> variables.shrunkInside(numbers, share));
        return inside == null ? shrunk(violated, share -> variables.shrunk(numbers, share)) : inside;
    }

    private double[] shrunk(List<double[]> violated, DoubleFunction<double[]> boxes) {
        DoubleUnaryOperator least = share -> constraints.least(boxes.apply(share), violated);
        double before = 0.0;
        for (double share = FIRST_SHRINK; share < LAST_SHRINK; share *= SHRINK_GROWTH) {
            if (least.applyAsDouble(share) >= 0.0) {
                return boxes.apply(InnerRoot.between(least, before, share));
            }
            before = share;
        }
        return null;
    }

    /** Pushes the faces outwards, one after the other, to where a constraint or the range stops them. */
    double[] pushed(double[] numbers) {
        double[] pushed = numbers;
        for (int way = 0; way < variables.pushes(numbers).size(); way++) {
            execution.stopIfCancelled();
            pushed = pushed(pushed, variables.pushes(pushed).get(way));
        }
        return pushed;
    }

    private double[] pushed(double[] numbers, double[] way) {
        List<double[]> moving = moving(numbers, along(numbers, way, 1.0));
        DoubleUnaryOperator least = share -> constraints.least(along(numbers, way, share), moving);
        double good = 0.0;
        for (double share = FIRST_PUSH; good < 1.0; share = Math.min(1.0, share * PUSH_GROWTH)) {
            if (least.applyAsDouble(share) < 0.0) {
                return along(numbers, way, InnerRoot.between(least, good, share));
            }
            good = share;
        }
        return along(numbers, way, 1.0);
    }

    /** The relative places that are not the same in two boxes. */
    private List<double[]> moving(double[] first, double[] second) {
        Box before = variables.box(first);
        Box after = variables.box(second);
        return constraints.relative().stream()
                .filter(place -> !Arrays.equals(before.at(place), after.at(place)))
                .toList();
    }

    private static double[] along(double[] numbers, double[] way, double share) {
        double[] moved = numbers.clone();
        for (int k = 0; k < moved.length; k++) {
            moved[k] += share * way[k];
        }
        return moved;
    }

    /**
     * The box without a place that violates a requirement, by the way on which it loses least.
     *
     * @param relative the place in relative coordinates
     */
    double[] without(double[] numbers, double[] relative) {
        double[] fixed = variables.box(numbers).at(relative);
        double[] best = null;
        double[] position = relative;
        for (Retreat retreat : variables.retreats(numbers, relative)) {
            double[] candidate = shortened(retreat);
            if (candidate != null && (best == null || variables.gain(candidate) > variables.gain(best))) {
                best = candidate;
                position = retreat.relative();
            }
        }
        constraints.add(position, fixed);
        double[] allowed = best == null ? null : allowed(best);
        return allowed == null ? halved(numbers) : allowed;
    }

    /** The box halved until it is allowed. */
    private double[] halved(double[] numbers) {
        double[] halved = numbers;
        for (int i = 0; i < MOST_HALVINGS && !constraints.allowAtOnce(halved); i++) {
            halved = variables.shrunk(halved, Box.MIDDLE);
        }
        return halved;
    }

    /** The first box along a retreat whose place on the face meets all requirements. */
    private double[] shortened(Retreat retreat) {
        DoubleUnaryOperator least = share ->
                constraints.function().least(variables.box(retreat.at(share)).at(retreat.relative()));
        double before = 0.0;
        for (int step = 0; step < MARCH; step++) {
            double share = (double) step / MARCH;
            if (least.applyAsDouble(share) >= 0.0) {
                return retreat.at(step == 0 ? 0.0 : InnerRoot.between(least, before, share));
            }
            before = share;
        }
        return null;
    }
}

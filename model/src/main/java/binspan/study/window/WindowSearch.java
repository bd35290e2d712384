package binspan.study.window;

import binspan.prediction.Requirement;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.window.IntervalSearch.Interval;
import binspan.study.window.RequirementIntervals.HeldInterval;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

/** One search for the operating windows of a parameter: scan, intervals of each requirement, what they have in common, the best point of each. */
final class WindowSearch {
    private static final double SCAN_SHARE = 0.6;
    private static final double INTERVALS_END = 0.8;
    private static final int PORTION = 64;
    private static final int STEPS_INSIDE = 512;

    private final OperatingWindow question;
    private final Axis axis;
    private final Execution execution;
    private final MarginFunction function;
    private final double[] places;
    private final double[][] margins;

    WindowSearch(OperatingWindow question, Execution execution) {
        this.question = question;
        this.axis = question.axis();
        this.execution = execution;
        this.function = new MarginFunction(question.scenario(), List.of(axis));
        int count = Math.max(OperatingWindow.FEWEST_SAMPLES, axis.steps());
        this.places = new double[count];
        this.margins = new double[count][];
    }

    OperatingIntervals result() {
        scan();
        MarginLine line = new MarginLine(function, new double[1], 0);
        List<List<Interval>> each =
                new IntervalSearch(line, Double.POSITIVE_INFINITY, execution).intervals(places, margins);
        execution.reached(INTERVALS_END);
        List<OperatingInterval> windows = new ArrayList<>();
        for (CommonInterval common : CommonInterval.of(each)) {
            windows.add(window(common));
        }
        Optional<PointVerdict> nearest =
                windows.isEmpty() ? Optional.of(best(0.0, 1.0, places.length - 1)) : Optional.empty();
        execution.reached(1.0);
        return new OperatingIntervals(axis, windows, requirements(each), curves(), nearest);
    }

    private void scan() {
        Workers.run(places.length, PORTION, execution.part(0.0, SCAN_SHARE), () -> {
            MarginFunction own = new MarginFunction(question.scenario(), List.of(axis));
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    places[i] = (double) i / (places.length - 1);
                    margins[i] = own.at(places[i]);
                }
            };
        });
    }

    private OperatingInterval window(CommonInterval common) {
        return new OperatingInterval(
                end(common.from(), common.fromBy()),
                end(common.to(), common.toBy()),
                best(common.from(), common.to(), STEPS_INSIDE));
    }

    private WindowEnd end(double place, int requirement) {
        return new WindowEnd(
                MarginFunction.value(axis, place),
                requirement == CommonInterval.RANGE ? Optional.empty() : Optional.of(requirement(requirement)));
    }

    private Requirement requirement(int index) {
        return function.margins().requirements().get(index);
    }

    private PointVerdict best(double from, double to, int samples) {
        DoubleUnaryOperator least = place -> {
            execution.stopIfCancelled();
            return function.least(place);
        };
        return function.verdict(LeastMarginLine.best(least, from, to, samples));
    }

    private List<RequirementIntervals> requirements(List<List<Interval>> each) {
        List<RequirementIntervals> found = new ArrayList<>();
        for (int i = 0; i < each.size(); i++) {
            List<HeldInterval> held = each.get(i).stream()
                    .map(interval -> new HeldInterval(
                            MarginFunction.value(axis, interval.from()), MarginFunction.value(axis, interval.to())))
                    .toList();
            found.add(
                    new RequirementIntervals(requirement(i), function.margins().required(i), held));
        }
        return found;
    }

    private MarginCurves curves() {
        double[] values = new double[places.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = MarginFunction.value(axis, places[i]);
        }
        return new MarginCurves(values, margins);
    }
}

package binspan.planner.viewmodel;

import binspan.prediction.LinkPrediction;
import binspan.prediction.RequirementMargins;
import binspan.prediction.SlotFit;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.PointEvaluator;
import binspan.study.box.ToleranceBox;
import binspan.study.region.OperatingRegion;
import binspan.study.window.PointVerdict;
import binspan.study.window.RequirementMargin;
import java.util.ArrayList;
import java.util.List;

/**
 * What a map depends on: the link with the two mapped parameters at reference values, so that moving the design on its
 * own map asks nothing new.
 *
 * @param base the link, both parameters at ends of their axes, where its slots fit if they fit at any end
 * @param horizontal first parameter
 * @param vertical second parameter
 */
record MapQuestion(Scenario base, Axis horizontal, Axis vertical) {
    /**
     * The question of a design.
     *
     * @throws IllegalArgumentException if it has no map, with the reason
     */
    static MapQuestion of(Scenario scenario, Axis horizontal, Axis vertical) {
        new OperatingRegion(scenario, horizontal, vertical);
        Scenario first = null;
        for (double x : new double[] {horizontal.to(), horizontal.from()}) {
            for (double y : new double[] {vertical.to(), vertical.from()}) {
                Scenario base = vertical.parameter().with(horizontal.parameter().with(scenario, x), y);
                first = first == null ? base : first;
                if (SlotFit.room(base) >= 0.0) {
                    return new MapQuestion(base, horizontal, vertical);
                }
            }
        }
        return new MapQuestion(first, horizontal, vertical);
    }

    /** Whether both have the same answer. */
    boolean sameAs(MapQuestion other) {
        return sameAxes(other) && Alike.are(base, other.base);
    }

    /** Whether both are drawn over the same axes. */
    boolean sameAxes(MapQuestion other) {
        return same(horizontal, other.horizontal) && same(vertical, other.vertical);
    }

    private static boolean same(Axis one, Axis other) {
        return one.parameter().path().equals(other.parameter().path())
                && one.from() == other.from()
                && one.to() == other.to()
                && one.logarithmic() == other.logarithmic();
    }

    /** The region, with so many steps along each axis. */
    OperatingRegion region(int steps) {
        return new OperatingRegion(base, with(horizontal, steps), with(vertical, steps));
    }

    private static Axis with(Axis axis, int steps) {
        return new Axis(axis.parameter(), axis.from(), axis.to(), steps, axis.logarithmic());
    }

    /** The largest box on the map. */
    ToleranceBox box(ToleranceBox.Sense sense) {
        return new ToleranceBox(base, List.of(horizontal, vertical), sense, false, ToleranceBox.USUAL_SEED);
    }

    /** Every requirement at a point. */
    PointVerdict verdict(double x, double y) {
        RequirementMargins stated = RequirementMargins.of(base.require());
        RequirementMargins margins = SlotFit.room(base) >= 0.0 ? stated.withSlots() : stated;
        LinkPrediction prediction =
                new PointEvaluator(base, List.of(horizontal.parameter(), vertical.parameter()), margins).at(x, y);
        List<RequirementMargin> each = new ArrayList<>();
        for (int i = 0; i < margins.requirements().size(); i++) {
            each.add(new RequirementMargin(
                    margins.requirements().get(i),
                    margins.required(i),
                    margins.predicted(i, prediction),
                    margins.margin(i, prediction)));
        }
        return new PointVerdict(List.of(x, y), each);
    }
}

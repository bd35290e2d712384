package binspan.planner.picture;

import binspan.planner.plot.BoxOutline;
import binspan.planner.plot.Interval;
import binspan.planner.plot.Picture;
import binspan.planner.plot.RangeBar;
import binspan.planner.plot.RangeBars;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.box.BoxSide;
import binspan.study.box.OperatingBox;
import java.util.ArrayList;
import java.util.List;

/** The largest tolerance box: drawn on the map of two parameters, otherwise as a bar for each parameter. */
public final class BoxPicture {
    private static final int MAPPED = 2;

    private BoxPicture() {}

    /** The picture of a box. */
    public static Picture of(Scenario scenario, OperatingBox box) {
        String subtitle = scenario.name() + "; all requirements hold everywhere inside";
        if (box.sides().size() == MAPPED) {
            List<Axis> axes = box.question().axes();
            BoxOutline outline = new BoxOutline(
                    "tolerance box",
                    interval(box.sides().get(0)),
                    interval(box.sides().get(1)));
            return new Picture(
                    "Tolerance box",
                    subtitle,
                    RegionPicture.heatMap(scenario, RegionPicture.region(scenario, axes), List.of(outline)));
        }
        List<RangeBar> bars = new ArrayList<>();
        for (BoxSide side : box.sides()) {
            bars.add(new RangeBar(
                    FigureAxes.of(side.axis()),
                    interval(side),
                    side.axis().parameter().value(scenario).orElse(Double.NaN)));
        }
        return new Picture("Tolerance box", subtitle, new RangeBars("", bars));
    }

    private static Interval interval(BoxSide side) {
        return new Interval(side.from().value(), side.to().value());
    }
}

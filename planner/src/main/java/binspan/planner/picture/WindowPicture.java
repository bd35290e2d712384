package binspan.planner.picture;

import binspan.planner.plot.Axis;
import binspan.planner.plot.CurvePanel;
import binspan.planner.plot.Curves;
import binspan.planner.plot.Interval;
import binspan.planner.plot.Mark;
import binspan.planner.plot.Picture;
import binspan.planner.plot.Point;
import binspan.planner.plot.Series;
import binspan.planner.report.RequiredFigure;
import binspan.scenario.Scenario;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import binspan.study.window.OperatingIntervals;
import java.util.ArrayList;
import java.util.List;

/** The operating windows of one parameter: every required figure along it, with the windows shaded. */
public final class WindowPicture {
    private static final int STEPS = 401;

    private WindowPicture() {}

    /** The picture of the windows that were found. */
    public static Picture of(Scenario scenario, OperatingIntervals found) {
        binspan.study.Axis searched = found.axis();
        binspan.study.Axis drawn = new binspan.study.Axis(
                searched.parameter(), searched.from(), searched.to(), STEPS, searched.logarithmic());
        StudyTable table = new Sweep(scenario, List.of(drawn), figures(scenario)).run(Execution.SINGLE);
        List<Interval> met = found.windows().stream()
                .map(window -> new Interval(window.from().value(), window.to().value()))
                .filter(interval -> interval.upper() > interval.lower())
                .toList();
        return new Picture(
                "Operating windows",
                scenario.name() + "; everything else as written",
                new Curves("", FigureAxes.of(searched), panels(scenario, table), met, planned(scenario, searched)));
    }

    /** The figures that something is required of. */
    private static List<FigureColumn> figures(Scenario scenario) {
        List<String> names = RequiredFigure.of(scenario.require()).stream()
                .map(RequiredFigure::figure)
                .toList();
        return FigureColumns.all(scenario).stream()
                .filter(column -> names.contains(column.name()))
                .toList();
    }

    /** A panel for each figure of a one-parameter table. */
    static List<CurvePanel> panels(Scenario scenario, StudyTable table) {
        List<CurvePanel> panels = new ArrayList<>();
        for (int column = 0; column < table.columns().size(); column++) {
            List<Point> points = new ArrayList<>();
            for (int row = 0; row < table.rows(); row++) {
                points.add(new Point(table.varied(0, row), table.figure(column, row)));
            }
            Axis y = FigureAxes.of(table, column);
            panels.add(new CurvePanel(
                    y,
                    List.of(new Series("predicted", points)),
                    RequirementLines.of(table.columns().get(column), scenario.require())));
        }
        return panels;
    }

    /** The planned value, where it lies on the axis. */
    static List<Mark> planned(Scenario scenario, binspan.study.Axis axis) {
        double planned = axis.parameter().value(scenario).orElse(Double.NaN);
        return planned >= axis.from() && planned <= axis.to() ? List.of(new Mark("as written", planned)) : List.of();
    }
}

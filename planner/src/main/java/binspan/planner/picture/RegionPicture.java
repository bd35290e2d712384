package binspan.planner.picture;

import binspan.planner.plot.BoxOutline;
import binspan.planner.plot.Contour;
import binspan.planner.plot.HeatLayer;
import binspan.planner.plot.HeatMap;
import binspan.planner.plot.Lattice;
import binspan.planner.plot.Overlays;
import binspan.planner.plot.Picture;
import binspan.planner.plot.Point;
import binspan.planner.plot.PointMark;
import binspan.planner.report.RequirementText;
import binspan.scenario.Scenario;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import binspan.study.region.MapLine;
import binspan.study.region.OperatingRegion;
import binspan.study.region.RegionMap;
import java.util.ArrayList;
import java.util.List;

/** The operating region of two parameters: a figure of merit in colour, a contour for each requirement, the region clear and the rest veiled. */
public final class RegionPicture {
    private static final int STEPS = 161;
    private static final double SAME = 1e-3;

    private RegionPicture() {}

    /** The picture of a region. */
    public static Picture of(Scenario scenario, RegionMap map) {
        return new Picture(
                "Operating region",
                scenario.name() + "; everything else as written",
                heatMap(scenario, map, List.of()));
    }

    /**
     * A map of the key, or of the visibility where there is no key, with the region of a study.
     *
     * @param boxes rectangles to draw in
     */
    static HeatMap heatMap(Scenario scenario, RegionMap map, List<BoxOutline> boxes) {
        boolean key = FigureColumns.all(scenario).stream()
                .anyMatch(column -> column.name().equals("key.asymptoticBps"));
        FigureColumn shown = FigureColumns.named(scenario, List.of(key ? "key.asymptoticBps" : "visibility.raw"))
                .get(0);
        List<binspan.study.Axis> axes = List.of(drawn(map.horizontal()), drawn(map.vertical()));
        StudyTable table = new Sweep(scenario, axes, List.of(shown)).run(Execution.SINGLE);
        return new HeatMap(
                "",
                FigureAxes.of(map.horizontal()),
                FigureAxes.of(map.vertical()),
                new HeatLayer(FigureAxes.of(table, 0), lattice(axes, table, 0), key ? "no key" : "none"),
                overlays(scenario, map, boxes));
    }

    private static binspan.study.Axis drawn(binspan.study.Axis axis) {
        return new binspan.study.Axis(axis.parameter(), axis.from(), axis.to(), STEPS, axis.logarithmic());
    }

    /** A figure of a two-parameter table on its grid. */
    static Lattice lattice(List<binspan.study.Axis> axes, StudyTable table, int column) {
        double[] x = axes.get(0).values();
        double[] y = axes.get(1).values();
        double[][] values = new double[y.length][x.length];
        for (int i = 0; i < x.length; i++) {
            for (int j = 0; j < y.length; j++) {
                values[j][i] = table.figure(column, i * y.length + j);
            }
        }
        return new Lattice(x, y, values);
    }

    /** Where the rows of a two-parameter table meet all requirements: 1, elsewhere -1. */
    static Lattice met(List<binspan.study.Axis> axes, StudyTable table) {
        double[] x = axes.get(0).values();
        double[] y = axes.get(1).values();
        double[][] values = new double[y.length][x.length];
        for (int i = 0; i < x.length; i++) {
            for (int j = 0; j < y.length; j++) {
                values[j][i] = table.meets(i * y.length + j) ? 1.0 : -1.0;
            }
        }
        return new Lattice(x, y, values);
    }

    /** Border, contours, the planned and the best point of a region. */
    static Overlays overlays(Scenario scenario, RegionMap map, List<BoxOutline> boxes) {
        List<Contour> contours = new ArrayList<>();
        for (RegionMap.RequirementContour contour : map.contours()) {
            if (!contour.lines().isEmpty()) {
                contours.add(new Contour(
                        RequirementText.of(contour.requirement(), contour.required()), lines(contour.lines())));
            }
        }
        return Overlays.NONE
                .withMargin(margins(map))
                .withContours(contours)
                .withPoints(points(scenario, map))
                .withBoxes(boxes);
    }

    private static List<List<Point>> lines(List<MapLine> lines) {
        return lines.stream()
                .map(line -> line.points().stream()
                        .map(point -> new Point(point.x(), point.y()))
                        .toList())
                .toList();
    }

    private static Lattice margins(RegionMap map) {
        double[] x = map.horizontal().values();
        double[] y = map.vertical().values();
        double[][] margins = new double[y.length][x.length];
        for (int i = 0; i < x.length; i++) {
            for (int j = 0; j < y.length; j++) {
                margins[j][i] = map.least(i, j);
            }
        }
        return new Lattice(x, y, margins);
    }

    private static List<PointMark> points(Scenario scenario, RegionMap map) {
        List<PointMark> points = new ArrayList<>();
        Point best = new Point(map.best().values().get(0), map.best().values().get(1));
        double x = map.horizontal().parameter().value(scenario).orElse(Double.NaN);
        double y = map.vertical().parameter().value(scenario).orElse(Double.NaN);
        boolean onMap = inside(map.horizontal(), x) && inside(map.vertical(), y);
        boolean same = onMap
                && Math.abs(map.horizontal().share(x) - map.horizontal().share(best.x())) < SAME
                && Math.abs(map.vertical().share(y) - map.vertical().share(best.y())) < SAME;
        if (onMap && !same) {
            points.add(new PointMark("as written", new Point(x, y)));
        }
        if (map.best().met()) {
            points.add(new PointMark(same ? "as written, most room" : "most room", best));
        }
        return points;
    }

    private static boolean inside(binspan.study.Axis axis, double value) {
        return value >= axis.from() && value <= axis.to();
    }

    /** The region on a small grid, for pictures of other studies; null where nothing is required. */
    static RegionMap region(Scenario scenario, List<binspan.study.Axis> axes) {
        if (binspan.planner.report.RequiredFigure.of(scenario.require()).isEmpty()) {
            return null;
        }
        return new OperatingRegion(scenario, mapped(axes.get(0)), mapped(axes.get(1))).run(Execution.SINGLE);
    }

    private static binspan.study.Axis mapped(binspan.study.Axis axis) {
        return new binspan.study.Axis(
                axis.parameter(), axis.from(), axis.to(), OperatingRegion.USUAL_STEPS, axis.logarithmic());
    }
}

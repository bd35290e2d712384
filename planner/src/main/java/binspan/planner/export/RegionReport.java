package binspan.planner.export;

import binspan.planner.picture.RegionPicture;
import binspan.planner.report.RequiredFigure;
import binspan.planner.report.WindowSummary;
import binspan.planner.table.Column;
import binspan.planner.table.StudyRows;
import binspan.planner.table.TableJson;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumns;
import binspan.study.Progress;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import binspan.study.region.MapLine;
import binspan.study.region.RegionMap;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The region of two parameters as a report; its table holds the points of the map with their least margin. */
public final class RegionReport {
    private RegionReport() {}

    /**
     * What a region has to show. Its table is computed when it is written.
     *
     * @param scenario the link as written
     * @param map a region that is not empty
     */
    public static StudyReport of(Scenario scenario, RegionMap map) {
        List<Axis> axes = List.of(map.horizontal(), map.vertical());
        int rows = map.vertical().steps();
        return new StudyReport(
                description(scenario, map, axes),
                StudyRows.later(
                        axes,
                        FigureColumns.all(scenario),
                        List.of(new Column("leastMargin", row -> map.least(row / rows, row % rows))),
                        () -> table(scenario, axes)),
                style -> WindowSummary.text(scenario, map, style),
                Optional.of(() -> RegionPicture.of(scenario, map)));
    }

    private static StudyTable table(Scenario scenario, List<Axis> axes) {
        return new Sweep(scenario, axes, FigureColumns.all(scenario)).run(Execution.parallel(Progress.NONE));
    }

    private static Map<String, Object> description(Scenario scenario, RegionMap map, List<Axis> axes) {
        Map<String, Object> description = TableJson.head(scenario.name(), "window");
        description.put("vary", StudyDescription.axes(axes));
        description.put("requirements", StudyDescription.requirements(RequiredFigure.of(scenario.require())));
        description.put("share", map.share());
        description.put("area", map.area());
        description.put("parts", map.parts());
        description.put("best", StudyDescription.values(axes, map.best().values()));
        description.put("leastMargin", map.best().leastMargin());
        description.put("border", lines(map.border()));
        List<Object> contours = new ArrayList<>();
        for (RegionMap.RequirementContour contour : map.contours()) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("name", contour.requirement().fieldName());
            entry.put("required", contour.required());
            entry.put("lines", lines(contour.lines()));
            contours.add(entry);
        }
        description.put("contours", contours);
        return description;
    }

    private static List<Object> lines(List<MapLine> lines) {
        List<Object> list = new ArrayList<>();
        for (MapLine line : lines) {
            List<Object> points = new ArrayList<>();
            line.points().forEach(point -> points.add(List.of(point.x(), point.y())));
            list.add(points);
        }
        return list;
    }
}

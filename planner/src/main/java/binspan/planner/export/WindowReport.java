package binspan.planner.export;

import binspan.planner.picture.WindowPicture;
import binspan.planner.report.RequiredFigure;
import binspan.planner.report.WindowSummary;
import binspan.planner.table.Column;
import binspan.planner.table.StudyRows;
import binspan.planner.table.TableJson;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.FigureColumns;
import binspan.study.PointTable;
import binspan.study.StudyTable;
import binspan.study.window.OperatingInterval;
import binspan.study.window.OperatingIntervals;
import binspan.study.window.RequirementIntervals;
import binspan.study.window.WindowEnd;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The windows of one parameter as a report; its table has three rows for each window: lower end, best point, upper end. */
public final class WindowReport {
    private static final String RANGE = "range";

    private WindowReport() {}

    /**
     * What the windows have to show.
     *
     * @param scenario the link as written
     * @param found at least one window
     */
    public static StudyReport of(Scenario scenario, OperatingIntervals found) {
        List<List<Double>> points = new ArrayList<>();
        List<Integer> numbers = new ArrayList<>();
        List<String> places = new ArrayList<>();
        List<String> endedBy = new ArrayList<>();
        for (OperatingInterval window : found.windows()) {
            points.add(List.of(window.from().value()));
            points.add(window.best().values());
            points.add(List.of(window.to().value()));
            places.addAll(List.of("from", "best", "to"));
            endedBy.addAll(List.of(name(window.from()), "", name(window.to())));
            int number = numbers.size() / 3 + 1;
            numbers.addAll(List.of(number, number, number));
        }
        StudyTable table = PointTable.of(scenario, List.of(found.axis()), FigureColumns.all(scenario), points);
        List<Column> own = List.of(
                new Column("window", numbers::get),
                new Column("point", places::get),
                new Column("endedBy", endedBy::get));
        return new StudyReport(
                description(scenario, found),
                StudyRows.of(table, table.columns(), own),
                style -> WindowSummary.text(scenario, found, style),
                Optional.of(() -> WindowPicture.of(scenario, found)));
    }

    /** What ends a window: the requirement by its name in the scenario, or the range. */
    static String name(WindowEnd end) {
        return end.requirement().isEmpty() ? RANGE : end.requirement().get().fieldName();
    }

    private static Map<String, Object> description(Scenario scenario, OperatingIntervals found) {
        Map<String, Object> description = TableJson.head(scenario.name(), "window");
        description.put("vary", StudyDescription.axes(List.of(found.axis())));
        description.put("requirements", StudyDescription.requirements(RequiredFigure.of(scenario.require())));
        List<Object> windows = new ArrayList<>();
        for (OperatingInterval window : found.windows()) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("from", window.from().value());
            entry.put("to", window.to().value());
            entry.put("fromEndedBy", name(window.from()));
            entry.put("toEndedBy", name(window.to()));
            entry.put("best", window.best().values().get(0));
            entry.put("leastMargin", window.best().leastMargin());
            windows.add(entry);
        }
        description.put("windows", windows);
        description.put("each", each(found.requirements(), found.axis()));
        return description;
    }

    private static List<Object> each(List<RequirementIntervals> requirements, Axis axis) {
        List<Object> list = new ArrayList<>();
        for (RequirementIntervals requirement : requirements) {
            List<Object> intervals = new ArrayList<>();
            requirement.intervals().forEach(interval -> {
                Map<String, Object> entry = new LinkedHashMap<>();
                entry.put("from", interval.from());
                entry.put("to", interval.to());
                intervals.add(entry);
            });
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("name", requirement.requirement().fieldName());
            entry.put("path", axis.parameter().path());
            entry.put("intervals", intervals);
            list.add(entry);
        }
        return list;
    }
}

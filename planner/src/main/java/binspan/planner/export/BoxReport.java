package binspan.planner.export;

import binspan.planner.picture.BoxPicture;
import binspan.planner.report.BoxSummary;
import binspan.planner.report.RequiredFigure;
import binspan.planner.table.Column;
import binspan.planner.table.StudyRows;
import binspan.planner.table.TableJson;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.FigureColumns;
import binspan.study.PointTable;
import binspan.study.StudyTable;
import binspan.study.box.BoxSide;
import binspan.study.box.OperatingBox;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** The largest box as a report; its table has four rows: lower corner, middle, upper corner, binding point. */
public final class BoxReport {
    private static final List<String> POINTS = List.of("from", "middle", "to", "binding");

    private BoxReport() {}

    /**
     * What a box has to show.
     *
     * @param scenario the link as written
     * @param box a box that was found
     * @throws java.util.NoSuchElementException if none was found
     */
    public static StudyReport of(Scenario scenario, OperatingBox box) {
        List<Axis> axes = box.question().axes();
        List<List<Double>> points = List.of(
                box.sides().stream().map(side -> side.from().value()).toList(),
                box.sides().stream().map(BoxSide::centre).toList(),
                box.sides().stream().map(side -> side.to().value()).toList(),
                box.binding().orElseThrow().verdict().values());
        StudyTable table = PointTable.of(scenario, axes, FigureColumns.all(scenario), points);
        return new StudyReport(
                description(scenario, box),
                StudyRows.of(table, table.columns(), List.of(new Column("point", POINTS::get))),
                style -> BoxSummary.text(scenario, box, style),
                Optional.of(() -> BoxPicture.of(scenario, box)));
    }

    private static Map<String, Object> description(Scenario scenario, OperatingBox box) {
        Map<String, Object> description = TableJson.head(scenario.name(), "window");
        description.put("vary", StudyDescription.ranges(box.question().axes()));
        description.put("requirements", StudyDescription.requirements(RequiredFigure.of(scenario.require())));
        Map<String, Object> found = new LinkedHashMap<>();
        found.put("sense", box.question().sense().name().toLowerCase(Locale.ROOT));
        found.put("centred", box.question().centred());
        found.put("volumeShare", box.volumeShare());
        found.put("tolerance", box.tolerance());
        found.put("pointsChecked", box.pointsChecked());
        List<Object> sides = new ArrayList<>();
        box.sides().forEach(side -> sides.add(side(side)));
        found.put("sides", sides);
        found.put(
                "binding",
                StudyDescription.values(
                        box.question().axes(),
                        box.binding().orElseThrow().verdict().values()));
        found.put(
                "bindingRequirement",
                box.binding().orElseThrow().verdict().tightest().requirement().fieldName());
        description.put("box", StudyDescription.finite(found));
        return description;
    }

    private static Map<String, Object> side(BoxSide side) {
        Map<String, Object> entry = new LinkedHashMap<>();
        entry.put("path", side.axis().parameter().path());
        entry.put("unit", side.axis().parameter().unit());
        entry.put("from", side.from().value());
        entry.put("to", side.to().value());
        entry.put("middle", side.centre());
        entry.put("share", side.share());
        entry.put("tolerance", side.tolerance());
        entry.put("fromEndedBy", WindowReport.name(side.from()));
        entry.put("toEndedBy", WindowReport.name(side.to()));
        return StudyDescription.finite(entry);
    }
}

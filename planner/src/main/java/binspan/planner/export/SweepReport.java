package binspan.planner.export;

import binspan.planner.picture.SweepPicture;
import binspan.planner.plot.Picture;
import binspan.planner.report.RequiredFigure;
import binspan.planner.report.SweepSummary;
import binspan.planner.table.StudyRows;
import binspan.planner.table.TableJson;
import binspan.scenario.Scenario;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;

/** A sweep as a report; its table holds every point with the figures that were asked for. */
public final class SweepReport {
    private SweepReport() {}

    /**
     * What a sweep has to show; without a picture where more than two parameters vary.
     *
     * @param sweep the study
     * @param table its points, at least with the figures to show; the summary speaks of those of {@link #computed} that it has
     * @param asked figures that were asked for; empty for all in the table and the usual ones in the picture
     */
    public static StudyReport of(Sweep sweep, StudyTable table, List<FigureColumn> asked) {
        Supplier<Picture> picture = () -> SweepPicture.of(sweep.scenario(), sweep.axes(), table, asked);
        return new StudyReport(
                description(sweep, table),
                StudyRows.of(table, asked.isEmpty() ? FigureColumns.all(sweep.scenario()) : asked, List.of()),
                style -> SweepSummary.text(sweep.scenario(), sweep.axes(), table, style),
                Optional.of(picture).filter(drawn -> sweep.axes().size() <= SweepPicture.MOST_AXES));
    }

    /**
     * The figures that a sweep computes: those to show and those that its summary speaks of.
     *
     * @param scenario the link as written
     * @param asked figures that were asked for; empty for all
     */
    public static List<FigureColumn> computed(Scenario scenario, List<FigureColumn> asked) {
        if (asked.isEmpty()) {
            return FigureColumns.all(scenario);
        }
        Set<FigureColumn> computed = new LinkedHashSet<>(asked);
        List<String> wanted = SweepSummary.figures(scenario);
        for (FigureColumn column : FigureColumns.all(scenario)) {
            if (wanted.contains(column.name())) {
                computed.add(column);
            }
        }
        return List.copyOf(computed);
    }

    private static Map<String, Object> description(Sweep sweep, StudyTable table) {
        Map<String, Object> description = TableJson.head(sweep.scenario().name(), "sweep");
        description.put("vary", StudyDescription.axes(sweep.axes()));
        description.put(
                "requirements",
                StudyDescription.requirements(RequiredFigure.of(sweep.scenario().require())));
        description.put("points", table.rows());
        description.put("pointsMet", table.met());
        return description;
    }
}

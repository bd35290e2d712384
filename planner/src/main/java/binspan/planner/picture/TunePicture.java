package binspan.planner.picture;

import binspan.planner.plot.CurvePanel;
import binspan.planner.plot.Curves;
import binspan.planner.plot.Mark;
import binspan.planner.plot.Panel;
import binspan.planner.plot.PanelGroup;
import binspan.planner.plot.Picture;
import binspan.planner.plot.Point;
import binspan.planner.plot.Series;
import binspan.planner.report.RequiredFigure;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import binspan.study.tuning.Tuning;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Tuned settings: key and visibility along each free parameter through the best point, the others held there. */
public final class TunePicture {
    private static final int STEPS = 161;
    private static final int COLUMNS = 2;

    private TunePicture() {}

    /** The picture of an outcome. */
    public static Picture of(Tuning tuning, Tuning.Outcome outcome) {
        List<Panel> panels = new ArrayList<>();
        for (int i = 0; i < tuning.free().size(); i++) {
            panels.add(along(tuning, outcome, i));
        }
        return new Picture(
                "Best settings for the " + tuning.objective().meaning(),
                tuning.scenario().name() + "; along each parameter the others are held at their best values",
                panels.size() == 1 ? panels.get(0) : new PanelGroup("", COLUMNS, panels));
    }

    private static Panel along(Tuning tuning, Tuning.Outcome outcome, int index) {
        Axis free = tuning.free().get(index);
        Axis axis = new Axis(free.parameter(), free.from(), free.to(), STEPS, free.logarithmic());
        Scenario best = outcome.scenario();
        StudyTable table = new Sweep(best, List.of(axis), shown(tuning, outcome)).run(Execution.SINGLE);
        List<CurvePanel> panels = new ArrayList<>();
        for (int column = 0; column < table.columns().size(); column++) {
            List<Point> points = new ArrayList<>();
            for (int row = 0; row < table.rows(); row++) {
                points.add(new Point(table.varied(0, row), table.figure(column, row)));
            }
            panels.add(new CurvePanel(
                    FigureAxes.of(table, column),
                    List.of(new Series("others at their best", points)),
                    RequirementLines.of(table.columns().get(column), best.require())));
        }
        return new Curves("", FigureAxes.of(axis), panels, MetRows.of(table), marks(tuning, outcome, index));
    }

    /** Key and visibility, and the figure of the requirement that leaves least room. */
    private static List<FigureColumn> shown(Tuning tuning, Tuning.Outcome outcome) {
        Scenario scenario = outcome.scenario();
        Set<String> names = new LinkedHashSet<>();
        boolean key = FigureColumns.all(scenario).stream()
                .anyMatch(column -> column.name().equals("key.asymptoticBps"));
        names.add(key ? "key.asymptoticBps" : "bell.chsh");
        names.add("visibility.raw");
        if (!tuning.margins().requirements().isEmpty()) {
            int tightest = tuning.margins().tightest(outcome.prediction());
            names.add(new RequiredFigure(
                            tuning.margins().requirements().get(tightest),
                            tuning.margins().required(tightest))
                    .figure());
        }
        return FigureColumns.named(scenario, List.copyOf(names));
    }

    private static List<Mark> marks(Tuning tuning, Tuning.Outcome outcome, int index) {
        Axis free = tuning.free().get(index);
        double best = outcome.values().get(index);
        double written = free.parameter().value(tuning.scenario()).orElse(Double.NaN);
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark(written == best ? "best, as written" : "best", best));
        if (written != best && written >= free.from() && written <= free.to()) {
            marks.add(new Mark("as written", written));
        }
        return marks;
    }
}

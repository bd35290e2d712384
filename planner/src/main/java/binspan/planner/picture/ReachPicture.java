package binspan.planner.picture;

import binspan.planner.plot.Axis;
import binspan.planner.plot.CurvePanel;
import binspan.planner.plot.Curves;
import binspan.planner.plot.Interval;
import binspan.planner.plot.Mark;
import binspan.planner.plot.Picture;
import binspan.planner.plot.Point;
import binspan.planner.plot.RequirementLine;
import binspan.planner.plot.Series;
import binspan.planner.report.RequiredFigure;
import binspan.scenario.LinkLength;
import binspan.study.FigureColumn;
import binspan.study.StudyTable;
import binspan.study.tuning.Reach;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The reach of a link: figures against the length of its fibre, as written and re-tuned. */
public final class ReachPicture {
    private static final String KEY = "key.asymptoticBps";
    private static final String BOUND = "key.repeaterlessBoundBps";
    private static final List<String> SHOWN =
            List.of(KEY, "visibility.raw", "bell.chsh", "key.secondsToFirstKey", "bell.secondsToFiveSigma");
    private static final double DEEPEST = 1e-9;

    private ReachPicture() {}

    /** The picture of a study. */
    public static Picture of(Reach reach, Reach.Outcome outcome) {
        List<CurvePanel> panels = new ArrayList<>();
        for (String name : SHOWN) {
            int column = outcome.asWritten().indexOf(name);
            if (column >= 0) {
                panels.add(panel(reach, outcome, column));
            }
        }
        double planned = new LinkLength().value(reach.scenario()).orElseThrow();
        double farthest = outcome.asWritten().varied(0, outcome.asWritten().rows() - 1);
        Axis length = Axis.linear("Fibre length of the link", "km").within(0.0, farthest);
        return new Picture(
                "Reach of the link",
                reach.scenario().name(),
                new Curves("", length, panels, met(outcome), List.of(new Mark("as planned", planned))));
    }

    private static CurvePanel panel(Reach reach, Reach.Outcome outcome, int column) {
        StudyTable table = outcome.asWritten();
        List<Series> series = new ArrayList<>();
        series.add(new Series("settings as written", points(table, column)));
        if (outcome.retuned() != null) {
            series.add(new Series("re-tuned at every length", points(outcome.retuned(), column)));
        }
        Axis y = FigureAxes.of(table, column);
        if (table.columns().get(column).name().equals(KEY) && table.indexOf(BOUND) >= 0) {
            series.add(new Series("repeaterless bound", points(table, table.indexOf(BOUND))));
            StudyTable lowest = outcome.retuned() == null ? table : outcome.retuned();
            y = deep(y, lowest.figuresOf(column), table.figuresOf(table.indexOf(BOUND)));
        }
        return new CurvePanel(y, series, line(reach, table.columns().get(column)));
    }

    /** The requirement, for the two times also where it is the usual one. */
    private static Optional<RequirementLine> line(Reach reach, FigureColumn column) {
        for (Reach.Goal goal : reach.goals()) {
            RequiredFigure required = new RequiredFigure(goal.requirement(), goal.required());
            if (!goal.stated() && required.figure().equals(column.name())) {
                return Optional.of(new RequirementLine("24 h asked for", required.limit(), false));
            }
        }
        return RequirementLines.of(column, reach.scenario().require());
    }

    /** The key falls over many decades before it ends. */
    private static Axis deep(Axis y, double[] key, double[] bound) {
        double largest = 0.0;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < key.length; i++) {
            largest = Math.max(largest, Double.isFinite(bound[i]) ? bound[i] : key[i]);
            least = key[i] > 0.0 ? Math.min(least, key[i]) : least;
        }
        double bottom = Math.max(least / 2.0, DEEPEST);
        return bottom < largest ? Axis.logarithmic(y.name(), y.unit()).within(bottom, 2.0 * largest) : y;
    }

    private static List<Point> points(StudyTable table, int column) {
        List<Point> points = new ArrayList<>();
        for (int row = 0; row < table.rows(); row++) {
            points.add(new Point(table.varied(0, row), table.figure(column, row)));
        }
        return points;
    }

    /** The lengths at which all stated requirements hold, re-tuned where that was asked for. */
    private static List<Interval> met(Reach.Outcome outcome) {
        if (outcome.all() == null) {
            return List.of();
        }
        double end =
                outcome.all().retunedKm().orElse(outcome.all().asWrittenKm().orElse(0.0));
        return end > 0.0 ? List.of(new Interval(0.0, end)) : List.of();
    }
}

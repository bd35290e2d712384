package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.prediction.Requirement;
import binspan.prediction.SlotFit;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import java.util.List;
import java.util.OptionalInt;

/** What a sweep tells a person: what was varied, where all requirements are met, and where each figure is best. */
public final class SweepSummary {
    private static final int LABEL = 9;
    private static final int NAME = 26;
    private static final int NUMBER = 13;
    private static final int MOST_INTERVALS = 6;
    private static final String BLANK = " ".repeat(LABEL);

    private final Scenario scenario;
    private final List<Axis> axes;
    private final StudyTable table;
    private final List<RequiredFigure> required;
    private final List<RequiredFigure> told;
    private final SweepFindings findings;
    private final TextPage page;

    private SweepSummary(Scenario scenario, List<Axis> axes, StudyTable table, TextStyle style) {
        this.scenario = scenario;
        this.axes = axes;
        this.table = table;
        this.required = RequiredFigure.of(scenario.require());
        this.told = spoken(scenario).stream().filter(each -> !leftOut(each)).toList();
        this.findings = new SweepFindings(table, told);
        this.page = new TextPage(style);
    }

    /**
     * The summary as a text that ends with a line break.
     *
     * @param scenario the link as written
     * @param axes varied parameters
     * @param table the points, with at least the figures of {@link #figures}
     * @param style colour and characters
     */
    public static String text(Scenario scenario, List<Axis> axes, StudyTable table, TextStyle style) {
        SweepSummary summary = new SweepSummary(scenario, axes, table, style);
        summary.page.wrapped(style.clean(scenario.name()));
        summary.answer();
        summary.page.gap();
        summary.varied();
        if (!summary.required.isEmpty()) {
            summary.intervals();
            summary.room();
        }
        summary.slots();
        summary.best();
        return summary.page.toString();
    }

    /** Names of the figures that the summary of a sweep speaks of; of the finite key, which takes long, only where the table has it. */
    public static List<String> figures(Scenario scenario) {
        return spoken(scenario).stream()
                .filter(each -> each.requirement() != Requirement.FIRST_KEY)
                .map(RequiredFigure::figure)
                .toList();
    }

    /** Whether a figure was left out of the table. */
    private boolean leftOut(RequiredFigure figure) {
        return figure.requirement() == Requirement.FIRST_KEY
                && table.indexOf(figure.figure()) < 0
                && FigureColumns.all(scenario).stream()
                        .anyMatch(column -> column.name().equals(figure.figure()));
    }

    /** The stated requirements; without any, visibility and key. */
    private static List<RequiredFigure> spoken(Scenario scenario) {
        List<RequiredFigure> required = RequiredFigure.of(scenario.require());
        return required.isEmpty()
                ? List.of(
                        new RequiredFigure(Requirement.RAW_VISIBILITY, Double.NaN),
                        new RequiredFigure(Requirement.KEY_RATE, Double.NaN))
                : required;
    }

    private void answer() {
        TextStyle style = page.style();
        String all = required.size() == 1 ? "the requirement" : "all " + required.size() + " requirements";
        int met = table.met();
        if (required.isEmpty()) {
            page.line("No requirement is stated: these are predictions without a verdict.");
        } else if (met == 0) {
            page.line(style.bad(style.notMet() + " NONE of " + table.rows() + " points MEETS " + all));
        } else {
            String share = met == table.rows()
                    ? "ALL " + met + " points MEET " + all
                    : met + " of " + table.rows() + " points MEET " + all + ", "
                            + Figure.percent((double) met / table.rows());
            page.line(style.good(style.met() + " " + share));
        }
    }

    private void varied() {
        String label = "varied";
        for (Axis axis : axes) {
            labelled(label, AxisWords.described(axis, scenario));
            label = "";
        }
    }

    private void labelled(String label, String words) {
        page.wrapped(left(label, LABEL), BLANK, page.style().clean(words));
    }

    private void intervals() {
        List<SweepFindings.Run> runs = findings.met();
        if (axes.size() > 1 || runs.isEmpty()) {
            return;
        }
        StringBuilder words = new StringBuilder();
        for (SweepFindings.Run run : runs.subList(0, Math.min(MOST_INTERVALS, runs.size()))) {
            words.append(words.isEmpty() ? "" : "; ").append(interval(run));
        }
        if (runs.size() > MOST_INTERVALS) {
            words.append("; and ").append(runs.size() - MOST_INTERVALS).append(" more");
        }
        labelled("met", words + ". Read off the points; binspan window solves the ends exactly.");
    }

    private String interval(SweepFindings.Run run) {
        Axis axis = axes.get(0);
        return run.first() == run.last()
                ? "at " + AxisWords.value(axis, table.varied(0, run.first()))
                : "from " + AxisWords.range(axis, table.varied(0, run.first()), table.varied(0, run.last()));
    }

    /** Says where slots no longer fit at an end of the ranges. */
    private void slots() {
        boolean unfit = false;
        for (int corner = 0; corner < 1 << axes.size(); corner++) {
            Scenario at = scenario;
            for (int i = 0; i < axes.size(); i++) {
                Axis axis = axes.get(i);
                at = axis.parameter().with(at, (corner >> i & 1) == 0 ? axis.from() : axis.to());
            }
            unfit |= SlotFit.room(at) < 0.0;
        }
        if (unfit) {
            labelled("caution", "in a part of these ranges " + SlotWords.END + "; binspan window keeps clear of it.");
        }
    }

    private void room() {
        if (told.isEmpty()) {
            return;
        }
        int row = findings.roomiest();
        boolean met = table.met() > 0;
        RequiredFigure tightest = findings.tightest(row);
        labelled(
                met ? "best" : "nearest",
                AxisWords.named(axes, point(row)) + (met ? " leaves most room; " : " comes nearest; ")
                        + "the tightest there is the " + RequirementWords.name(tightest.requirement()) + ", "
                        + predicted(tightest, row) + " where " + demand(tightest) + " is required.");
    }

    private double[] point(int row) {
        double[] point = new double[axes.size()];
        for (int i = 0; i < point.length; i++) {
            point[i] = table.varied(i, row);
        }
        return point;
    }

    private String demand(RequiredFigure figure) {
        String bound = figure.requirement().atLeast()
                ? page.style().atLeast()
                : page.style().atMost();
        return bound + " " + RequirementWords.required(figure.requirement(), figure.required());
    }

    private String predicted(RequiredFigure figure, int row) {
        double value = findings.value(figure, row);
        return Double.isFinite(value)
                ? RequirementWords.predicted(figure.requirement(), value, figure.required())
                : "none";
    }

    private void best() {
        boolean stated = !required.isEmpty();
        page.gap();
        title(stated ? "Requirement" : "Figure", stated ? "required" : "", stated ? "best" : "largest");
        for (RequiredFigure figure : spoken(scenario)) {
            line(figure, stated ? demand(figure) : "");
        }
    }

    private void title(String name, String demand, String best) {
        page.line(page.style().strong(left(name, NAME) + right(demand, NUMBER) + right(best, NUMBER) + "  where"));
    }

    private void line(RequiredFigure figure, String demand) {
        if (!told.contains(figure)) {
            line(figure, demand, "not shown", "--show " + figure.figure() + " does");
            return;
        }
        OptionalInt best = findings.best(figure);
        String value = best.isPresent() ? predicted(figure, best.getAsInt()) : "none";
        line(figure, demand, value, where(figure, best));
    }

    private void line(RequiredFigure figure, String demand, String value, String where) {
        String name = left(RequirementWords.name(figure.requirement()), NAME);
        page.wrapped(name + right(demand, NUMBER) + right(value, NUMBER) + "  ", " ".repeat(NAME + 2), where);
    }

    private String where(RequiredFigure figure, OptionalInt best) {
        if (best.isEmpty()) {
            return "nowhere";
        }
        return findings.steady(figure) ? "everywhere" : AxisWords.values(axes, point(best.getAsInt()));
    }
}

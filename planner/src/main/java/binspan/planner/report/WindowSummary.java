package binspan.planner.report;

import static binspan.planner.report.TextPage.left;

import binspan.prediction.Requirement;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.region.RegionMap;
import binspan.study.window.OperatingInterval;
import binspan.study.window.OperatingIntervals;
import binspan.study.window.PointVerdict;
import binspan.study.window.RequirementIntervals;
import binspan.study.window.RequirementMargin;
import binspan.study.window.WindowEnd;
import java.util.ArrayList;
import java.util.List;

/** Operating windows for a person: the intervals with what ends them, or the region of two parameters. */
public final class WindowSummary {
    private static final int LABEL = 9;
    private static final int NAME = 28;
    private static final int DIGITS = 7;
    private static final int FEW_DIGITS = 4;
    private static final double PERCENT = 100.0;

    private final Scenario scenario;
    private final TextPage page;

    private WindowSummary(Scenario scenario, TextStyle style) {
        this.scenario = scenario;
        this.page = new TextPage(style);
        page.wrapped(style.clean(scenario.name()));
    }

    /** The windows of one parameter as a text that ends with a line break. */
    public static String text(Scenario scenario, OperatingIntervals found, TextStyle style) {
        WindowSummary summary = new WindowSummary(scenario, style);
        summary.intervals(found);
        return summary.page.toString();
    }

    /** The region of two parameters. */
    public static String text(Scenario scenario, RegionMap map, TextStyle style) {
        WindowSummary summary = new WindowSummary(scenario, style);
        summary.region(map);
        return summary.page.toString();
    }

    private void intervals(OperatingIntervals found) {
        TextStyle style = page.style();
        Axis axis = found.axis();
        int count = found.windows().size();
        page.wrapped(style.good(style.met() + " " + count + (count == 1 ? " window" : " windows") + " of "
                + style.clean(axis.parameter().path())));
        page.gap();
        labelled("searched", AxisWords.range(axis, axis.from(), axis.to()) + planned(axis));
        for (OperatingInterval window : found.windows()) {
            page.gap();
            page.line(style.strong(value(axis, window.from().value(), DIGITS) + " to "
                    + value(axis, window.to().value(), DIGITS)));
            labelled("", "below: " + end(window.from()));
            labelled("", "above: " + end(window.to()));
            labelled(
                    "",
                    "most room at " + value(axis, window.best().values().get(0), FEW_DIGITS) + ", "
                            + room(window.best()));
        }
        page.heading("Each requirement by itself");
        for (RequirementIntervals each : found.requirements()) {
            page.wrapped(
                    "  " + left(RequirementWords.name(each.requirement()), NAME),
                    " ".repeat(NAME + 2),
                    held(axis, each));
        }
    }

    private static String held(Axis axis, RequirementIntervals each) {
        List<String> words = new ArrayList<>();
        each.intervals()
                .forEach(interval -> words.add(
                        value(axis, interval.from(), FEW_DIGITS) + " to " + value(axis, interval.to(), FEW_DIGITS)));
        return words.isEmpty() ? "nowhere" : String.join("; ", words);
    }

    private String planned(Axis axis) {
        double planned = axis.parameter().value(scenario).orElse(Double.NaN);
        return Double.isNaN(planned) ? "" : "; planned " + value(axis, planned, FEW_DIGITS);
    }

    private void region(RegionMap map) {
        TextStyle style = page.style();
        String parts = map.parts() == 1 ? "one piece" : map.parts() + " separate pieces";
        page.line(style.good(style.met() + " All requirements hold on " + Figure.percent(map.share())
                + " of the map as drawn, in " + parts));
        page.gap();
        List<Axis> axes = List.of(map.horizontal(), map.vertical());
        String label = "searched";
        for (Axis axis : axes) {
            labelled(
                    label,
                    axis.parameter().path() + " from " + AxisWords.range(axis, axis.from(), axis.to()) + planned(axis));
            label = "";
        }
        labelled("area", Figure.digits(map.area(), FEW_DIGITS, areaUnit(axes)));
        labelled("best", AxisWords.named(axes, point(map.best())) + "; " + room(map.best()));
        page.heading("Contours");
        for (RegionMap.RequirementContour contour : map.contours()) {
            String words = contour.lines().isEmpty()
                    ? "none: it " + (holds(map, contour.requirement()) ? "holds" : "fails") + " on the whole map"
                    : contour.lines().size() + (contour.lines().size() == 1 ? " line" : " lines");
            page.row(RequirementWords.name(contour.requirement()), words);
        }
    }

    private static boolean holds(RegionMap map, Requirement requirement) {
        return map.best().requirements().stream()
                .filter(each -> each.requirement() == requirement)
                .allMatch(RequirementMargin::met);
    }

    private static String areaUnit(List<Axis> axes) {
        List<String> units = new ArrayList<>();
        axes.forEach(axis -> {
            if (!axis.parameter().unit().isEmpty()) {
                units.add(axis.parameter().unit());
            }
        });
        return String.join(" ", units);
    }

    private static double[] point(PointVerdict verdict) {
        return verdict.values().stream().mapToDouble(Double::doubleValue).toArray();
    }

    /** What ends a window. */
    static String end(WindowEnd end) {
        return end.requirement().isEmpty()
                ? "the range ends; nothing fails yet"
                : end.requirement().get() == Requirement.SLOTS
                        ? SlotWords.END
                        : "the " + RequirementWords.noun(end.requirement().get()) + " fails";
    }

    /** The room that the tightest requirement leaves. */
    static String room(PointVerdict verdict) {
        RequirementMargin tightest = verdict.tightest();
        return "where the " + RequirementWords.noun(tightest.requirement()) + " has "
                + Figure.digits(PERCENT * Math.expm1(tightest.margin()), 2, "%") + " of room";
    }

    /** A value with its unit. */
    static String value(Axis axis, double value, int digits) {
        String unit =
                axis.parameter().unit().equals("1/s") ? "/s" : axis.parameter().unit();
        return Figure.digits(value, digits, unit).replace(' ', TextPage.GLUE);
    }

    private void labelled(String label, String words) {
        page.wrapped(left(label, LABEL), " ".repeat(LABEL), page.style().clean(words));
    }
}

package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.prediction.Requirement;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.box.BindingPoint;
import binspan.study.box.BoxSide;
import binspan.study.box.OperatingBox;
import binspan.study.box.ToleranceBox;
import binspan.study.window.WindowEnd;
import java.util.List;

/** The largest tolerance box for a person: what goes into a specification. */
public final class BoxSummary {
    private static final int NAME = 27;
    private static final int NUMBER = 13;
    private static final int DIGITS = 5;
    private static final int FEW_DIGITS = 4;
    private static final double NOTHING = 1e-4;

    private final Scenario scenario;
    private final OperatingBox box;
    private final TextPage page;

    private BoxSummary(Scenario scenario, OperatingBox box, TextStyle style) {
        this.scenario = scenario;
        this.box = box;
        this.page = new TextPage(style);
    }

    /** The summary as a text that ends with a line break. */
    public static String text(Scenario scenario, OperatingBox box, TextStyle style) {
        BoxSummary summary = new BoxSummary(scenario, box, style);
        summary.page.wrapped(style.clean(scenario.name()));
        summary.answer();
        summary.sides();
        summary.outside();
        summary.binding();
        return summary.page.toString();
    }

    private void answer() {
        TextStyle style = page.style();
        String size = box.question().sense() == ToleranceBox.Sense.TOLERANCE
                ? style.plusMinus() + " " + Figure.percent(box.tolerance()) + " of every value"
                : Figure.percent(box.volumeShare()) + " of the searched volume";
        page.line(style.good(style.met() + " All requirements hold everywhere in this box: " + size));
    }

    private void sides() {
        page.gap();
        page.line(page.style()
                .strong(left("Parameter", NAME)
                        + right("from", NUMBER)
                        + right("to", NUMBER)
                        + right("middle", NUMBER)
                        + right("planned", NUMBER)));
        for (BoxSide side : box.sides()) {
            Axis axis = side.axis();
            String name = page.style().clean(axis.parameter().path());
            if (name.length() > NAME) {
                page.line(name);
                name = "";
            }
            double middle = box.question().sense() == ToleranceBox.Sense.TOLERANCE
                    ? (side.from().value() + side.to().value()) / 2.0
                    : side.centre();
            page.line(left(name, NAME)
                    + right(WindowSummary.value(axis, side.from().value(), FEW_DIGITS), NUMBER)
                    + right(WindowSummary.value(axis, side.to().value(), FEW_DIGITS), NUMBER)
                    + right(WindowSummary.value(axis, middle, FEW_DIGITS), NUMBER)
                    + right(planned(axis), NUMBER));
            page.wrapped("    below: ", "           ", end(side.from()));
            page.wrapped("    above: ", "           ", end(side.to()));
        }
    }

    private String planned(Axis axis) {
        double planned = axis.parameter().value(scenario).orElse(Double.NaN);
        return Double.isNaN(planned) ? "computed" : WindowSummary.value(axis, planned, FEW_DIGITS);
    }

    /** Says where the link as written lies outside. */
    private void outside() {
        List<String> names = box.sides().stream()
                .filter(side -> {
                    double planned = side.axis()
                            .parameter()
                            .value(scenario)
                            .orElse(side.from().value());
                    return planned < side.from().value() || planned > side.to().value();
                })
                .map(side -> side.axis().parameter().path())
                .toList();
        if (!names.isEmpty()) {
            page.wrapped(page.style()
                    .clean("Outside the box as written: " + String.join(", ", names)
                            + ". --centred keeps the box at the planned values."));
        }
    }

    private static String end(WindowEnd end) {
        return end.requirement().isEmpty()
                ? "the range ends, or the other sides' sizes hold it"
                : end.requirement().get() == Requirement.SLOTS
                        ? SlotWords.END
                        : "the " + RequirementWords.noun(end.requirement().get()) + " fails at some point beyond";
    }

    private void binding() {
        BindingPoint binding = box.binding().orElseThrow();
        List<BoxSide> sides = box.sides();
        StringBuilder where = new StringBuilder();
        for (int i = 0; i < sides.size(); i++) {
            Axis axis = sides.get(i).axis();
            where.append(i == 0 ? "" : ", ")
                    .append(page.style().clean(axis.parameter().path()))
                    .append(' ')
                    .append(WindowSummary.value(axis, binding.verdict().values().get(i), DIGITS));
        }
        page.gap();
        double margin = binding.verdict().leastMargin();
        page.wrapped((binding.corner() ? "The binding corner: " : "The binding point: ") + where + "; the "
                + RequirementWords.noun(binding.verdict().tightest().requirement()) + " is met there with "
                + (margin < NOTHING
                        ? "nothing to spare."
                        : Figure.percent(Math.expm1(margin)) + " to spare: the ranges end before anything fails."));
        page.wrapped("Checked at " + box.pointsChecked() + " points: all corners, the middles of all faces and "
                + ToleranceBox.CHECKED_POINTS + " points inside. Between them nothing is proven.");
    }
}

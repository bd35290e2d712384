package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.scenario.Range;
import binspan.study.Axis;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Tuning;
import java.util.List;

/** What tuning tells a person: the best settings, what they gain, and how each requirement fares. */
public final class TuneSummary {
    private static final int NAME = 34;
    private static final int NUMBER = 14;
    private static final int REQUIREMENT = 26;
    private static final int REQUIRED = 16;
    private static final double AT_BOUND = 1e-6;

    private final Tuning tuning;
    private final Tuning.Outcome outcome;
    private final TextPage page;

    private TuneSummary(Tuning tuning, Tuning.Outcome outcome, TextStyle style) {
        this.tuning = tuning;
        this.outcome = outcome;
        this.page = new TextPage(style);
    }

    /** The summary as a text that ends with a line break. */
    public static String text(Tuning tuning, Tuning.Outcome outcome, TextStyle style) {
        TuneSummary summary = new TuneSummary(tuning, outcome, style);
        summary.page.wrapped(style.clean(tuning.scenario().name()));
        summary.answer();
        summary.settings();
        summary.requirements();
        summary.figures();
        return summary.page.toString();
    }

    /** The objective's figure, for a person. */
    static String value(Objective objective, double value) {
        return switch (objective) {
            case KEY -> Figure.bits(value);
            case MARGIN -> Figure.signed(100.0 * Math.expm1(value), "%");
            default -> Figure.bare(value);
        };
    }

    private double of(LinkPrediction prediction) {
        return tuning.objective().value(prediction, tuning.margins());
    }

    private void answer() {
        TextStyle style = page.style();
        double best = of(outcome.prediction());
        double written = of(outcome.asWritten());
        page.line(style.good(style.met() + " " + tuning.objective().meaning() + " " + value(tuning.objective(), best))
                + gain(best, written));
        if (!tuning.margins().requirements().isEmpty() && !tuning.margins().met(outcome.asWritten())) {
            page.line("  As written the link does not meet its requirements; tuned it does.");
        }
    }

    private String gain(double best, double written) {
        String before = ", as written " + value(tuning.objective(), written);
        if (tuning.objective() != Objective.KEY || !(written > 0.0)) {
            return before;
        }
        return before + ", " + Figure.signed(100.0 * (best / written - 1.0), "%");
    }

    private void settings() {
        page.gap();
        page.line(page.style().strong(left("Setting", NAME) + right("best", NUMBER) + right("as written", NUMBER)));
        List<Axis> free = tuning.free();
        for (int i = 0; i < free.size(); i++) {
            Axis axis = free.get(i);
            double best = outcome.values().get(i);
            String written = axis.parameter().value(tuning.scenario()).isPresent()
                    ? with(axis, axis.parameter().value(tuning.scenario()).getAsDouble())
                    : "computed";
            String name = page.style().clean(axis.parameter().path());
            if (name.length() > NAME) {
                page.line(name);
                name = "";
            }
            page.line(left(name, NAME) + right(with(axis, best), NUMBER) + right(written, NUMBER) + remark(axis, best));
        }
    }

    private static String with(Axis axis, double value) {
        String unit =
                axis.parameter().unit().equals("1/s") ? "/s" : axis.parameter().unit();
        return Figure.digits(value, 4, unit);
    }

    private String remark(Axis axis, double best) {
        double share = axis.share(best);
        if (share < AT_BOUND || share > 1.0 - AT_BOUND) {
            return "  end of its range";
        }
        boolean kept = axis.parameter().value(tuning.scenario()).orElse(Double.NaN) == best;
        return kept ? "  kept: no gain" : "";
    }

    private void requirements() {
        if (tuning.margins().requirements().isEmpty()) {
            page.gap();
            page.line("No requirement is stated: nothing limits the search but the ranges.");
            return;
        }
        page.gap();
        page.line(page.style()
                .strong(left("Requirement", REQUIREMENT)
                        + right("required", REQUIRED)
                        + right("tuned", NUMBER)
                        + right("as written", NUMBER)));
        for (int i = 0; i < tuning.margins().requirements().size(); i++) {
            Requirement requirement = tuning.margins().requirements().get(i);
            double required = tuning.margins().required(i);
            TextStyle style = page.style();
            boolean met = tuning.margins().margin(i, outcome.asWritten()) >= 0.0;
            page.line(left(RequirementWords.name(requirement), REQUIREMENT)
                    + right(
                            (requirement.atLeast() ? style.atLeast() : style.atMost()) + " "
                                    + RequirementWords.required(requirement, required),
                            REQUIRED)
                    + right(predicted(requirement, outcome.prediction(), required, true), NUMBER)
                    + right(predicted(requirement, outcome.asWritten(), required, met), NUMBER)
                    + (met ? "" : "  " + style.notMet() + " fails"));
        }
    }

    private static String predicted(Requirement requirement, LinkPrediction prediction, double required, boolean met) {
        double value = requirement.predicted(prediction, FiniteKeyOutlook.of(prediction));
        return RequirementWords.tuned(requirement, value, required, met);
    }

    private void figures() {
        LinkPrediction p = outcome.prediction();
        page.gap();
        page.wrapped(
                "At these settings: raw visibility " + Figure.bare(p.fringe().raw()) + ", CHSH S "
                        + Figure.bare(p.bell().chsh())
                        + (Double.isNaN(p.key().asymptoticPerSecond())
                                ? ""
                                : ", secret key rate " + Figure.bits(p.key().asymptoticPerSecond()))
                        + ". " + Range.plain(outcome.evaluations()) + " settings were tried.");
    }
}

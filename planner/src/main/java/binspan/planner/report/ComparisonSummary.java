package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.counting.DetectorLoad;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.study.comparison.Comparison;
import java.util.ArrayList;
import java.util.List;

/** Links side by side for a person: the ranking first, then each link with its requirements, singles, live fractions and what limits it. */
public final class ComparisonSummary {
    private static final int NAME = 30;
    private static final int NUMBER = 12;
    private static final int FOUR = 4;
    private static final double NO_ROOM = 1e-4;

    private final List<Comparison.Entry> entries;
    private final TextPage page;

    private ComparisonSummary(List<Comparison.Entry> entries, TextStyle style) {
        this.entries = entries;
        this.page = new TextPage(style);
    }

    /**
     * The summary as a text that ends with a line break.
     *
     * @param title what is compared
     * @param entries the links, best first
     * @param style colour and characters
     */
    public static String text(String title, List<Comparison.Entry> entries, TextStyle style) {
        ComparisonSummary summary = new ComparisonSummary(entries, style);
        summary.page.wrapped(style.clean(title));
        summary.ranking();
        entries.forEach(summary::entry);
        return summary.page.toString();
    }

    private void ranking() {
        page.gap();
        page.line(page.style()
                .strong(left("", 5)
                        + left("Link", NAME)
                        + right("key", NUMBER)
                        + right("visibility", NUMBER)
                        + right("reach", NUMBER)));
        for (int i = 0; i < entries.size(); i++) {
            Comparison.Entry entry = entries.get(i);
            TextStyle style = page.style();
            named(
                    left(i + 1 + ".", 3) + sign(entry) + " ",
                    style.clean(entry.option().name()),
                    right(key(entry.prediction()), NUMBER)
                            + right(Figure.bare(entry.prediction().fringe().raw()), NUMBER)
                            + right(reach(entry), NUMBER));
        }
    }

    /** A name too long for its column stands on a line of its own. */
    private void named(String start, String name, String figures) {
        boolean fits = name.length() <= NAME;
        if (!fits) {
            page.wrapped(start, " ".repeat(5), name);
        }
        page.line((fits ? start : " ".repeat(5)) + left(fits ? name : "", NAME) + figures);
    }

    private String sign(Comparison.Entry entry) {
        TextStyle style = page.style();
        if (entry.tightest() == null) {
            return " ";
        }
        return entry.meets() ? style.good(style.met()) : style.bad(style.notMet());
    }

    private static String key(LinkPrediction prediction) {
        double key = prediction.key().asymptoticPerSecond();
        return key > 0.0 ? Figure.bits(key) : "none";
    }

    private static String reach(Comparison.Entry entry) {
        return entry.tightest() == null ? "-" : ReachSummary.km(entry.reachKm());
    }

    private void entry(Comparison.Entry entry) {
        LinkPrediction p = entry.prediction();
        String setting = entry.setting().meaning();
        page.gap();
        page.line(page.style().strong(page.style().clean(entry.option().name())));
        if (!setting.isEmpty()) {
            page.row("operating point", setting);
        }
        for (int i = 0; i < entry.free().size(); i++) {
            String unit = entry.free().get(i).parameter().unit();
            page.row(
                    page.style()
                            .clean(ParameterWords.name(
                                    entry.free().get(i).parameter().path())),
                    Figure.digits(entry.values().get(i), FOUR, unit.equals("1/s") ? "/s" : unit));
        }
        page.row(
                "singles, alice; bob",
                singles(p.counts().loadsA()) + "; " + singles(p.counts().loadsB()));
        page.row(
                "live fraction, alice; bob",
                live(p.counts().loadsA()) + "; " + live(p.counts().loadsB()));
        requirements(entry);
        page.row("limited by", page.style().clean(limit(entry)));
    }

    private static String singles(List<DetectorLoad> loads) {
        List<String> words = new ArrayList<>();
        loads.forEach(load -> words.add(Figure.counts(load.recordedPerSecond())));
        return String.join(", ", words);
    }

    private static String live(List<DetectorLoad> loads) {
        List<String> words = new ArrayList<>();
        loads.forEach(load -> words.add(Figure.percent(load.liveFraction())));
        return String.join(", ", words);
    }

    private void requirements(Comparison.Entry entry) {
        RequirementMargins margins =
                RequirementMargins.of(entry.prediction().scenario().require());
        TextStyle style = page.style();
        for (int i = 0; i < margins.requirements().size(); i++) {
            Requirement requirement = margins.requirements().get(i);
            double required = margins.required(i);
            boolean met = margins.margin(i, entry.prediction()) >= 0.0;
            String value = RequirementWords.tuned(
                    requirement, requirement.predicted(entry.prediction(), entry.finite()), required, met);
            page.row(
                    RequirementWords.name(requirement),
                    value + ", required " + (requirement.atLeast() ? style.atLeast() : style.atMost()) + " "
                            + RequirementWords.required(requirement, required) + "  "
                            + (met ? style.met() : style.notMet()));
        }
    }

    /** The tightest requirement and what costs it most; where none is stated, what costs the visibility most. */
    private static String limit(Comparison.Entry entry) {
        LargestCost cost = new LargestCost(LinkCheck.brief(entry.prediction()));
        if (entry.tightest() == null) {
            return cost.of(Requirement.RAW_VISIBILITY);
        }
        String room = !entry.meets()
                ? ", which it fails. "
                : entry.leastMargin() < NO_ROOM
                        ? ", no room left. "
                        : ", " + Figure.percent(Math.expm1(entry.leastMargin())) + " of room. ";
        return RequirementWords.name(entry.tightest()) + room + cost.of(entry.tightest());
    }
}

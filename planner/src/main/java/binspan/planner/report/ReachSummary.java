package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.scenario.LinkLength;
import binspan.study.Axis;
import binspan.study.StudyTable;
import binspan.study.tuning.Reach;
import binspan.study.tuning.SourcePosition;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** What a study of the reach tells a person: how far first key and violation come, then every requirement, then key and visibility against length. */
public final class ReachSummary {
    private static final int NAME = 26;
    private static final int NUMBER = 14;
    private static final int REQUIRED = 16;
    private static final int LENGTH = 10;
    private static final int ROWS = 13;
    private static final double FAINTEST = 0.001;
    private static final double NOWHERE_KM = 0.0;

    private final Reach reach;
    private final Reach.Outcome outcome;
    private final TextPage page;
    private final boolean tuned;

    private ReachSummary(Reach reach, Reach.Outcome outcome, TextStyle style) {
        this.reach = reach;
        this.outcome = outcome;
        this.page = new TextPage(style);
        this.tuned = outcome.retuned() != null;
    }

    /** The summary as a text that ends with a line break. */
    public static String text(Reach reach, Reach.Outcome outcome, TextStyle style) {
        ReachSummary summary = new ReachSummary(reach, outcome, style);
        summary.page.wrapped(style.clean(reach.scenario().name()));
        summary.answers();
        summary.premises();
        summary.limits();
        summary.curve();
        return summary.page.toString();
    }

    private void answers() {
        for (Reach.Limit limit : outcome.limits().subList(0, 2)) {
            String what = RequirementWords.name(limit.goal().requirement()) + " within "
                    + RequirementWords.required(
                            limit.goal().requirement(), limit.goal().required());
            String far = tuned
                    ? km(limit.retunedKm()) + " re-tuned, " + km(limit.asWrittenKm()) + " as written"
                    : km(limit.asWrittenKm());
            boolean any = limit.asWrittenKm().isPresent() || limit.retunedKm().isPresent();
            String line = (any ? page.style().met() : page.style().notMet()) + " " + what + ": " + far;
            page.line(any ? page.style().good(line) : page.style().bad(line));
        }
    }

    /** A reach in whole kilometres, rounded down; to a tenth below ten. */
    public static String km(OptionalDouble length) {
        if (length.isEmpty()) {
            return "nowhere";
        }
        double km = length.getAsDouble();
        if (km >= new LinkLength().range().highest()) {
            return "any length";
        }
        return km == NOWHERE_KM ? "0 km" : (km < 10.0 ? Figure.bare(km) : Long.toString((long) Math.floor(km))) + " km";
    }

    private void premises() {
        double planned = new LinkLength().value(reach.scenario()).orElseThrow();
        page.gap();
        page.wrapped(
                left("fibre", 9),
                " ".repeat(9),
                Figure.stated(planned, "km") + " planned in all, "
                        + Figure.percent(SourcePosition.of(reach.scenario()))
                        + " of it alice's; both arms are scaled in proportion");
        if (tuned) {
            List<String> free = new ArrayList<>();
            for (Axis axis : reach.free()) {
                free.add(ParameterWords.name(axis.parameter().path()));
            }
            page.wrapped(
                    left("tuned", 9),
                    " ".repeat(9),
                    page.style().clean(String.join("; ", free)) + "; for the "
                            + reach.objective().meaning());
        }
    }

    private void limits() {
        page.gap();
        page.line(page.style()
                .strong(left("Requirement", NAME)
                        + right("required", REQUIRED)
                        + right("as written", NUMBER)
                        + (tuned ? right("re-tuned", NUMBER) : "")));
        boolean assumed = false;
        for (Reach.Limit limit : outcome.limits()) {
            TextStyle style = page.style();
            String sign = limit.goal().requirement().atLeast() ? style.atLeast() : style.atMost();
            String demand = sign + " "
                    + RequirementWords.required(
                            limit.goal().requirement(), limit.goal().required());
            line(RequirementWords.name(limit.goal().requirement()), demand, limit);
            assumed |= !limit.goal().stated();
        }
        if (outcome.all() != null) {
            line("all that are required", "", outcome.all());
        }
        if (tuned) {
            page.wrapped("Re-tuned: each requirement at the settings that are best for it alone; the last line at"
                    + " settings that meet all of them.");
        }
        if (assumed) {
            page.wrapped("The scenario does not state all of these hours; where it is silent, "
                    + Figure.stated(Reach.USUAL_HOURS, "h") + " are asked for.");
        }
    }

    private void line(String name, String demand, Reach.Limit limit) {
        page.line(left(name, NAME)
                + right(demand, REQUIRED)
                + right(km(limit.asWrittenKm()), NUMBER)
                + (tuned ? right(km(limit.retunedKm()), NUMBER) : ""));
    }

    private void curve() {
        StudyTable table = outcome.asWritten();
        int key = table.indexOf("key.asymptoticBps");
        int visibility = table.indexOf("visibility.raw");
        String pair = (key < 0 ? "" : right("key", NUMBER)) + right("visibility", NUMBER);
        page.gap();
        if (tuned) {
            page.line(page.style()
                    .strong(" ".repeat(LENGTH)
                            + right("as written", pair.length())
                            + right("re-tuned", pair.length())));
        }
        page.line(page.style().strong(left("Length", LENGTH) + pair + (tuned ? pair : "")));
        int last = table.rows() - 1;
        for (int i = 0; i < ROWS; i++) {
            int row = (int) Math.round((double) i * last / (ROWS - 1));
            StringBuilder line = new StringBuilder(left(Figure.bare(table.varied(0, row)) + " km", LENGTH));
            cells(line, table, key, visibility, row);
            if (tuned) {
                cells(line, outcome.retuned(), key, visibility, row);
            }
            page.line(line.toString());
        }
    }

    private static void cells(StringBuilder line, StudyTable table, int key, int visibility, int row) {
        if (key >= 0) {
            double rate = table.figure(key, row);
            line.append(right(rate > 0.0 ? Figure.bits(rate) : "none", NUMBER));
        }
        double seen = table.figure(visibility, row);
        line.append(right(seen < FAINTEST ? "< " + FAINTEST : Figure.bare(seen), NUMBER));
    }
}

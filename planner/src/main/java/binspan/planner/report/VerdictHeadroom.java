package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.prediction.Headroom;
import binspan.prediction.LinkCheck;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** How far each quantity may drift before the first requirement fails, the tightest first. */
final class VerdictHeadroom {
    private static final int NAME = 36;
    private static final int NUMBER = 13;

    private final TextPage page;

    private VerdictHeadroom(TextPage page) {
        this.page = page;
    }

    static void write(LinkCheck check, TextPage page) {
        VerdictHeadroom table = new VerdictHeadroom(page);
        if (check.headroom().isEmpty()) {
            table.none(check);
            return;
        }
        table.title(check);
        List<Headroom> sorted = new ArrayList<>(check.headroom());
        sorted.sort(Comparator.comparingDouble(VerdictHeadroom::relativeRoom));
        for (int i = 0; i < sorted.size(); i++) {
            table.entry(sorted.get(i), i == 0);
        }
    }

    private void none(LinkCheck check) {
        page.heading("Headroom");
        String why = check.outcomes().isEmpty()
                ? "State a requirement to see how far each quantity may drift before it fails."
                : "None: no stated requirement is met.";
        page.wrapped("  ", "  ", why);
    }

    private void title(LinkCheck check) {
        String which = check.met() ? "" : " of what is met";
        page.heading("Headroom" + which, "one quantity at a time, the tightest first");
        String path = "      path " + page.style().arrow() + " what fails first";
        page.line(page.style()
                .faint(left("  quantity", NAME)
                        + right("planned", NUMBER)
                        + right("limit", NUMBER)
                        + right("room", NUMBER)));
        page.line(page.style().faint(path));
    }

    private static double relativeRoom(Headroom headroom) {
        return DriftWords.relativeRoom(headroom.path(), headroom.value(), headroom.limit());
    }

    private void entry(Headroom each, boolean tightest) {
        String unit = each.unit().equals("1/s") ? "/s" : each.unit();
        String planned = unit.equals("/s") ? Figure.statedCounts(each.value()) : Figure.stated(each.value(), unit);
        String limit = unit.equals("/s") ? Figure.counts(each.limit()) : Figure.in(each.limit(), unit);
        double room = each.limit() - each.value();
        String left = unit.equals("/s") ? Figure.signedRate(room, unit) : Figure.signed(room, unit);
        String mark = tightest ? "> " : "  ";
        String name = left(mark + DriftWords.of(each.path()), NAME);
        String line = name + right(planned, NUMBER) + right(limit, NUMBER) + right(left, NUMBER);
        page.line(tightest ? page.style().strong(line) : line);
        String end = each.path() + " " + page.style().arrow() + " " + RequirementWords.name(each.requirement());
        page.line(page.style().faint("      " + end));
    }
}

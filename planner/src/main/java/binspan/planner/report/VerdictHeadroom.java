package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.prediction.Headroom;
import binspan.prediction.LinkCheck;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** How far each quantity may drift before the first requirement fails, the tightest first. */
public final class VerdictHeadroom {
    /** How the table is ordered. */
    public static final String ORDER = "one quantity at a time, the tightest first";

    private static final String TITLE = "Headroom";
    private static final int NAME = 36;
    private static final int NUMBER = 13;

    private final TextPage page;

    private VerdictHeadroom(TextPage page) {
        this.page = page;
    }

    static void write(LinkCheck check, TextPage page) {
        VerdictHeadroom table = new VerdictHeadroom(page);
        if (check.headroom().isEmpty()) {
            table.tellNone(check);
            return;
        }
        table.title(check);
        List<Headroom> sorted = sorted(check);
        for (int i = 0; i < sorted.size(); i++) {
            table.entry(sorted.get(i), i == 0);
        }
    }

    /** The headroom of a check, the tightest first. */
    public static List<Headroom> sorted(LinkCheck check) {
        List<Headroom> sorted = new ArrayList<>(check.headroom());
        sorted.sort(Comparator.comparingDouble(VerdictHeadroom::relativeRoom));
        return sorted;
    }

    /** Why there is no headroom. */
    public static String none(LinkCheck check) {
        return check.outcomes().isEmpty()
                ? "State a requirement to see how far each quantity may drift before it fails."
                : "None: no stated requirement is met.";
    }

    private void tellNone(LinkCheck check) {
        page.heading(TITLE);
        page.wrapped("  ", "  ", none(check));
    }

    /** What the table is about: of the requirements that are met alone, where one fails. */
    public static String title(boolean met) {
        return met ? TITLE : TITLE + " of what is met";
    }

    private void title(LinkCheck check) {
        page.heading(title(check.met()), ORDER);
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
        String mark = tightest ? "> " : "  ";
        String name = left(mark + DriftWords.of(each.path()), NAME);
        String line = name + right(planned(each), NUMBER) + right(limit(each), NUMBER) + right(room(each), NUMBER);
        page.line(tightest ? page.style().strong(line) : line);
        String end = each.path() + " " + page.style().arrow() + " " + RequirementWords.name(each.requirement());
        page.line(page.style().faint("      " + end));
    }

    /** The planned value. */
    public static String planned(Headroom each) {
        return rate(each) ? Figure.statedCounts(each.value()) : Figure.stated(each.value(), each.unit());
    }

    /** The value at which the first requirement fails. */
    public static String limit(Headroom each) {
        return rate(each) ? Figure.counts(each.limit()) : Figure.in(each.limit(), each.unit());
    }

    /** On which side of the planned value the limit lies. */
    public static String side(Headroom each) {
        return each.limit() < each.value() ? "down to" : "up to";
    }

    /** How far it is there, with its sign. */
    public static String room(Headroom each) {
        double room = each.limit() - each.value();
        return rate(each) ? Figure.signedRate(room, "/s") : Figure.signed(room, each.unit());
    }

    private static boolean rate(Headroom each) {
        return each.unit().equals("1/s");
    }
}

package binspan.planner.report;

import static binspan.planner.report.TextPage.left;

import binspan.prediction.LinkCheck;
import binspan.prediction.StabilityLimit;

/** How tightly temperatures, phases, frequencies and delays must be held. */
public final class VerdictStability {
    /** Title of the table. */
    public static final String TITLE = "Stability";

    /** What its limits mean. */
    public static final String MEANING = "each to be held below, the others as planned";

    private static final int NAME = 42;

    private VerdictStability() {}

    static void write(LinkCheck check, TextPage page) {
        if (check.stability().isEmpty()) {
            return;
        }
        page.heading(TITLE, MEANING);
        for (StabilityLimit limit : check.stability()) {
            page.line("  " + left(limit.quantity(), NAME) + value(limit));
        }
    }

    /** Temperatures of analyzers are held to millikelvins. */
    public static String value(StabilityLimit limit) {
        boolean milli = limit.unit().equals("K") && Math.abs(limit.limit()) < 1.0;
        return milli ? Figure.in(limit.limit() * 1e3, "mK") : Figure.in(limit.limit(), limit.unit());
    }
}

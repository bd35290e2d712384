package binspan.planner.report;

import static binspan.planner.report.TextPage.left;

import binspan.prediction.LinkCheck;
import binspan.prediction.StabilityLimit;

/** How tightly temperatures, phases, frequencies and delays must be held. */
final class VerdictStability {
    private static final int NAME = 42;

    private VerdictStability() {}

    static void write(LinkCheck check, TextPage page) {
        if (check.stability().isEmpty()) {
            return;
        }
        page.heading("Stability", "each to be held below, the others as planned");
        for (StabilityLimit limit : check.stability()) {
            page.line("  " + left(limit.quantity(), NAME) + value(limit));
        }
    }

    /** Temperatures of analyzers are held to millikelvins. */
    private static String value(StabilityLimit limit) {
        boolean milli = limit.unit().equals("K") && Math.abs(limit.limit()) < 1.0;
        return milli ? Figure.in(limit.limit() * 1e3, "mK") : Figure.in(limit.limit(), limit.unit());
    }
}

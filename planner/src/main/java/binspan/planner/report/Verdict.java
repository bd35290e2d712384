package binspan.planner.report;

import binspan.prediction.LinkCheck;

/**
 * The verdict on a link for a person: whether it meets its requirements, what it costs where, how much may drift, and
 * what to be careful about. ASCII or UTF-8 text of at most 80 columns.
 */
public final class Verdict {
    private Verdict() {}

    /** The verdict as a text that ends with a line break. */
    public static String text(LinkCheck check, TextStyle style) {
        TextPage page = new TextPage(style);
        VerdictHead.write(check, page);
        VerdictRequirements.write(check, page);
        VerdictFailure.write(check, page);
        VerdictBudget.write(check, page);
        VerdictRates.write(check, page);
        VerdictKey.write(check, page);
        VerdictArms.write(check, page);
        VerdictHeadroom.write(check, page);
        VerdictStability.write(check, page);
        VerdictNotes.write(check, page);
        return page.toString();
    }
}

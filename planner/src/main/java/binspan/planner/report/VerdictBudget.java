package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.merit.VisibilityBudget;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.scenario.Acquisition;
import binspan.units.Digits;

/** What each cause takes from the visibility, as bars that step down from 1. */
public final class VerdictBudget {
    /** Title. */
    public static final String TITLE = "Visibility budget";

    /** Name of the visibility that remains. */
    public static final String RAW = "raw visibility";

    /** Name of the same with accidentals subtracted. */
    public static final String NET = "net of accidentals";

    private static final int NAME = 22;
    private static final int NUMBER = 9;
    private static final int BAR = 36;
    private static final double STEP = 0.1;
    private static final double NOTHING = 5e-6;

    private final TextPage page;
    private final double floor;

    private VerdictBudget(TextPage page, double raw) {
        this.page = page;
        this.floor = floor(raw);
    }

    /** The visibility at which the scale of the bars begins: a tenth below the raw one, 0 or more. */
    public static double floor(double raw) {
        double below = Math.floor((raw - 0.02) / STEP) * STEP;
        return Double.isFinite(below) ? Math.max(0.0, below) : 0.0;
    }

    static void write(LinkCheck check, TextPage page) {
        LinkPrediction p = check.prediction();
        VerdictBudget budget = new VerdictBudget(page, p.fringe().raw());
        page.gap();
        String scale = left(Digits.decimals(budget.floor, 1), BAR - 1) + "1";
        page.line(page.style().strong(left(TITLE, NAME) + right("factor", NUMBER) + right("loss", NUMBER)) + "  "
                + scale);
        double visibility = 1.0;
        for (VisibilityBudget.Entry entry : p.budget().entries()) {
            double after = visibility * entry.factor();
            budget.line("  " + entry.cause().text(), entry.factor(), visibility, after);
            visibility = after;
        }
        budget.total(p);
    }

    private void line(String name, double factor, double before, double after) {
        String numbers = left(name, NAME) + right(Digits.decimals(factor, 4), NUMBER) + right(loss(factor), NUMBER);
        page.line(numbers + "  " + bar(before, after));
    }

    /** Loss of one cause, or its gain. */
    public static String loss(double factor) {
        double loss = 1.0 - factor;
        if (Math.abs(loss) < NOTHING) {
            return "none";
        }
        String percent = Digits.decimals(Math.abs(loss) * 100.0, Math.abs(loss) < 0.01 ? 3 : 2) + " %";
        return loss > 0.0 ? percent : "gain " + percent;
    }

    private String bar(double before, double after) {
        int from = columns(Math.min(before, after));
        int to = columns(Math.max(before, after));
        return String.valueOf(page.style().bar()).repeat(from)
                + page.style().bad(String.valueOf(page.style().lost()).repeat(to - from));
    }

    private int columns(double visibility) {
        double share = (visibility - floor) / (1.0 - floor);
        return share >= 0.0 ? (int) Math.round(Math.min(1.0, share) * BAR) : 0;
    }

    private void total(LinkPrediction p) {
        Acquisition scan = p.scenario().acquisition();
        page.row(RAW, Figure.withError(p.fringe().raw(), p.visibilitySigma(), page.style()));
        page.row(NET, Figure.bare(p.fringe().net()));
        String points = scan.fringePoints() + " points of " + Figure.stated(scan.secondsPerPoint(), "s");
        page.row("fringe scan", points + ", " + Digits.shortest(p.countsPerPoint(), 2) + " counts in each");
    }
}

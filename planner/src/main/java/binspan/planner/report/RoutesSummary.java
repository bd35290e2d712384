package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.planner.table.RouteLedger;
import binspan.scenario.Scenario;
import java.io.IOException;

/** Ranked routes for a person: the best ones, and the first that fail with their reason. */
public final class RoutesSummary {
    private static final int NAME = 32;
    private static final int NUMBER = 14;
    private static final int BEST = 12;
    private static final int FAILING = 5;
    private static final double PERCENT = 100.0;
    private static final double FINEST = 0.01;

    private final boolean required;
    private final RouteLedger ledger;
    private final TextPage page;
    private int failing;

    private RoutesSummary(Scenario template, RouteLedger ledger, TextStyle style) {
        this.required = !RequiredFigure.of(template.require()).isEmpty();
        this.ledger = ledger;
        this.page = new TextPage(style);
    }

    /**
     * The summary as a text that ends with a line break.
     *
     * @param template the scenario
     * @param ledger the routes
     * @param bad number of rows that could not be read
     * @param style colour and characters
     */
    public static String text(Scenario template, RouteLedger ledger, int bad, TextStyle style) throws IOException {
        RoutesSummary summary = new RoutesSummary(template, ledger, style);
        summary.page.wrapped(style.clean(template.name()));
        summary.answer(bad);
        if (ledger.count() > 0) {
            summary.best();
        }
        summary.failing();
        return summary.page.toString();
    }

    private void answer(int bad) {
        TextStyle style = page.style();
        if (required && ledger.count() > 0) {
            String words = ledger.met() + " of " + ledger.count() + (ledger.count() == 1 ? " route " : " routes ")
                    + (ledger.met() == 1 ? "meets" : "meet") + " all requirements";
            page.line(
                    ledger.met() > 0 ? style.good(style.met() + " " + words) : style.bad(style.notMet() + " " + words));
        } else if (!required) {
            page.line("No requirement is stated: the routes stand in the order of their table.");
        }
        if (bad > 0) {
            page.line(
                    style.bad(style.notMet() + " " + bad + (bad == 1 ? " row is" : " rows are") + " bad and left out"));
        }
    }

    private void best() throws IOException {
        int key = position("key.asymptoticBps");
        int visibility = position("visibility.raw");
        page.gap();
        page.line(page.style()
                .strong(left("", 6)
                        + left("Route", NAME)
                        + right("visibility", NUMBER)
                        + (key < 0 ? "" : right("key", NUMBER))
                        + right("least margin", NUMBER)));
        ledger.ranked((rank, entry) -> {
            if (rank > BEST) {
                return false;
            }
            named(
                    left(rank + ".", 4) + sign(entry) + " ",
                    page.style().clean(entry.name()),
                    right(figure(entry, visibility), NUMBER)
                            + (key < 0 ? "" : right(bits(entry, key), NUMBER))
                            + right(margin(entry), NUMBER));
            return true;
        });
        if (ledger.count() > BEST) {
            page.line("and " + (ledger.count() - BEST) + " more");
        }
    }

    /** A name too long for its column stands on a line of its own. */
    private void named(String start, String name, String figures) {
        boolean fits = name.length() <= NAME;
        if (!fits) {
            page.wrapped(start, " ".repeat(6), name);
        }
        page.line((fits ? start : " ".repeat(6)) + left(fits ? name : "", NAME) + figures);
    }

    private String sign(RouteLedger.Entry entry) {
        TextStyle style = page.style();
        return !required ? " " : entry.meets() ? style.good(style.met()) : style.bad(style.notMet());
    }

    private int position(String name) {
        for (int i = 0; i < ledger.columns().size(); i++) {
            if (ledger.columns().get(i).name().equals(name)) {
                return i;
            }
        }
        return -1;
    }

    private static String figure(RouteLedger.Entry entry, int column) {
        return entry.figures().isEmpty() ? "-" : Figure.bare(entry.figures().get(column));
    }

    private static String bits(RouteLedger.Entry entry, int column) {
        if (entry.figures().isEmpty()) {
            return "-";
        }
        double key = entry.figures().get(column);
        return key > 0.0 ? Figure.bits(key) : "none";
    }

    /** The least margin as a share of the requirement. */
    static String margin(RouteLedger.Entry entry) {
        double percent = PERCENT * Math.expm1(entry.leastMargin());
        if (Double.isNaN(percent)) {
            return "-";
        }
        return Math.abs(percent) < FINEST ? "0 %" : Figure.signed(percent, "%");
    }

    /** The first that fail, with the reason. */
    private void failing() throws IOException {
        ledger.ranked((rank, entry) -> {
            if (entry.meets()) {
                return true;
            }
            if (failing == 0) {
                page.heading("Why the best of those that fail do so");
            }
            failing++;
            String name = page.style().clean(entry.name());
            page.wrapped("  " + name + ": ", "    ", page.style().clean(entry.reason()));
            return failing < FAILING;
        });
    }
}

package binspan.worksheet;

import binspan.counting.LinkCounts;
import binspan.counting.PortPairs;
import java.util.ArrayList;
import java.util.List;

/**
 * Coincidence rates of the interfering windows at a phase: one line for each port pair and phase, stated when it is
 * first needed.
 */
final class WorksheetRates {
    /** The phase averaged over. */
    static final String MEAN = "mean";

    /** The phase at which ports (1,1) coincide most. */
    static final String BEST = "max";

    /** The phase at which they coincide least. */
    static final String WORST = "min";

    private WorksheetRates() {}

    /** Symbol of the rate of a port pair at a phase of the given name. */
    static String symbol(int a, int b, String phase) {
        return "R" + WorksheetCounts.pair(a, b) + "(" + phase + ")";
    }

    /**
     * The sum of all port pairs at a phase, ready to stand in a formula.
     *
     * @param phase name of the phase; its cosine stands on the line {@code cos_name}
     */
    static String sum(WorksheetPage page, String phase) {
        List<String> rates = new ArrayList<>();
        PortPairs pairs = page.prediction().counts().central();
        for (int a = 0; a < pairs.portsA(); a++) {
            for (int b = 0; b < pairs.portsB(); b++) {
                rates.add(rate(page, a, b, phase));
            }
        }
        return String.join(" + ", rates);
    }

    /** The rate of one port pair at a phase, ready to stand in a formula. */
    static String rate(WorksheetPage page, int a, int b, String phase) {
        String symbol = symbol(a, b, phase);
        if (!page.has(symbol)) {
            cosine(page, phase);
            LinkCounts counts = page.prediction().counts();
            double rate = counts.central().of(a, b).atCosine(page.value(cosineSymbol(phase)));
            String formula = page.scenario().pulsed()
                    ? pulsed(page, a, b, cosineSymbol(phase))
                    : WorksheetContinuousPairs.rate(a, b, cosineSymbol(phase));
            page.line(symbol, WorksheetCounts.ports(a, b) + "coincidences " + words(phase), formula, rate, "1/s");
        }
        return "{" + symbol + "}";
    }

    private static String pulsed(WorksheetPage page, int a, int b, String cosine) {
        String at = WorksheetCounts.pair(a, b);
        WorksheetClicks clicks = WorksheetPulsedPairs.interfering(page, a, b);
        return clicks.rate(page, "({c" + at + "} + {k" + at + "} x {" + cosine + "})");
    }

    /** States the cosine of a phase that has a fixed one. */
    private static void cosine(WorksheetPage page, String phase) {
        if (page.has(cosineSymbol(phase))) {
            return;
        }
        switch (phase) {
            case MEAN -> page.line(cosineSymbol(phase), "cosine of the phase, its mean", "0", 0.0, "");
            case BEST -> page.line(cosineSymbol(phase), "cosine of the best phase", "1", 1.0, "");
            case WORST -> page.line(cosineSymbol(phase), "cosine of the worst phase", "-1", -1.0, "");
            default -> throw new IllegalStateException("worksheet knows no phase " + phase);
        }
    }

    /** States the cosine of a phase at the setting that an experiment aims for, the static error added. */
    static void cosine(WorksheetPage page, String phase, String formula, double radians) {
        if (!page.has(cosineSymbol(phase))) {
            page.line(cosineSymbol(phase), "cosine of the phase " + words(phase), formula, Math.cos(radians), "");
        }
    }

    private static String cosineSymbol(String phase) {
        return "cos_" + phase;
    }

    private static String words(String phase) {
        return switch (phase) {
            case MEAN -> "averaged over the phase";
            case BEST -> "at the best phase";
            case WORST -> "at the worst phase";
            case "delta" -> "at the static phase error";
            case "anti" -> "half a fringe from the static phase error";
            default -> "at setting " + phase;
        };
    }
}

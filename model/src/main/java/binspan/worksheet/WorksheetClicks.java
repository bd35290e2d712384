package binspan.worksheet;

import binspan.counting.ClickStatistics;

/**
 * Section 6: coincidences of one pair of windows from detected photons, noise and detected pairs.
 *
 * @param a alice's port
 * @param b bob's port
 * @param slotA slot of alice's window
 * @param slotB slot of bob's window
 * @param suffix what tells the symbols of these windows from those of others; empty for the interfering ones
 */
record WorksheetClicks(int a, int b, int slotA, int slotB, String suffix) {
    /** States what the click formula needs besides the pairs: chance clicks and the spread of the modes. */
    void state(WorksheetPage page) {
        String qa = WorksheetPhotons.symbol("q", page.sides().get(0), a, slotA);
        String qb = WorksheetPhotons.symbol("q", page.sides().get(1), b, slotB);
        String words = WorksheetCounts.ports(a, b);
        double chance = page.value(qa) * page.value(qb);
        page.line("acc" + at(), words + "both click by chance", "{" + qa + "} {" + qb + "}", chance, "");
        double silent = (1.0 - page.value(qa)) * (1.0 - page.value(qb));
        page.line(
                "sil" + at(), words + "neither clicks by chance", "(1 - {" + qa + "}) (1 - {" + qb + "})", silent, "");
        if (!poisson(page)) {
            spread(page);
        }
    }

    private void spread(WorksheetPage page) {
        String na = WorksheetPhotons.symbol("n", page.sides().get(0), a, slotA);
        String nb = WorksheetPhotons.symbol("n", page.sides().get(1), b, slotB);
        double modes = page.value("K");
        double value = (1.0 + page.value(na) / modes) * (1.0 + page.value(nb) / modes);
        String formula = "(1 + {" + na + "}/{K}) (1 + {" + nb + "}/{K})";
        page.line("sp" + at(), WorksheetCounts.ports(a, b) + "photons against the modes", formula, value, "");
    }

    /** Formula of the rate with so many detected pairs. */
    String rate(WorksheetPage page, String pairs) {
        String more = poisson(page) ? "exp(" + pairs + ") - 1" : "(1 - " + pairs + "/({K} {sp" + at() + "}))^-{K} - 1";
        return "{f" + WorksheetCounts.pair(a, b) + "} ({acc" + at() + "} + {sil" + at() + "} (" + more + "))";
    }

    /** The rate with so many detected pairs, 1/s. */
    double value(WorksheetPage page, double pairs) {
        double modes = page.prediction().spectrum().schmidtNumber();
        double spread = poisson(page) ? 1.0 : page.value("sp" + at());
        double more = ClickStatistics.correlation(pairs, spread, modes);
        double cycles = page.value("f" + WorksheetCounts.pair(a, b));
        return cycles * (page.value("acc" + at()) + page.value("sil" + at()) * more);
    }

    /** End of the symbols of these windows. */
    String at() {
        return WorksheetCounts.pair(a, b) + suffix;
    }

    private static boolean poisson(WorksheetPage page) {
        return Double.isInfinite(page.prediction().spectrum().schmidtNumber());
    }
}

package binspan.worksheet;

import binspan.counting.DetectorLoad;
import binspan.counting.LinkCounts;

/** Sections 6 and 7: coincidences of all port pairs, then their sums. */
final class WorksheetCounts {
    private WorksheetCounts() {}

    static void write(WorksheetPage page) {
        boolean pulsed = page.scenario().pulsed();
        if (pulsed) {
            page.section("7 Clicks");
            WorksheetPhotons.write(page);
            WorksheetPulsedPairs.write(page);
        } else {
            page.section("7 Coincidences with a continuous pump");
            WorksheetContinuousPairs.write(page);
        }
        LinkCounts counts = page.prediction().counts();
        String central = WorksheetRates.sum(page, WorksheetRates.MEAN);
        String meaning = "coincidences of the interfering windows, all ports, mean over the phase";
        page.line("C", meaning, central, counts.central().sum(0.0), "1/s");
        String aside = pulsed ? WorksheetTimeBasis.aside(page) : WorksheetContinuousPairs.aside(page);
        page.line("C_side", "coincidences one separation apart, all ports", aside, counts.sidePerSecond(), "1/s");
        outer(page, counts);
    }

    private static void outer(WorksheetPage page, LinkCounts counts) {
        String outer = "";
        if (counts.hasTimeBasis()) {
            WorksheetTimeBasis.write(page);
            outer = " + {C_00} + {C_22} + {C_02} + {C_20}";
        }
        page.line(
                "C_all",
                "coincidences of all slots and ports",
                "{C} + {C_side}" + outer,
                counts.allSlotsPerSecond(),
                "1/s");
    }

    /** States the share of the time in which both detectors of a port pair are ready. */
    static void ready(WorksheetPage page, int a, int b, double common, String formula) {
        LinkCounts counts = page.prediction().counts();
        String ports = ports(a, b);
        page.line("m" + pair(a, b), ports + "pairs that reach both detectors, in any slots", formula, common, "1/s");
        double live =
                DetectorLoad.jointLive(counts.loadsA().get(a), counts.loadsB().get(b), common);
        String ready = joint(a, b, "live_A" + (a + 1), "live_B" + (b + 1));
        page.line("jl" + pair(a, b), ports + "share of the time in which both are ready", ready, live, "");
    }

    /** Formula of that share from the lines of both detectors' own. */
    static String joint(int a, int b, String liveA, String liveB) {
        String both = "{" + liveA + "} {" + liveB + "}";
        String dead = "min({td_A" + (a + 1) + "}, {td_B" + (b + 1) + "})";
        String correlated = both + " (1 + {m" + pair(a, b) + "} " + dead + " sqrt(" + both + "))";
        return "min(" + correlated + ", {" + liveA + "}, {" + liveB + "})";
    }

    /** Shares of a pair's photons that two ports detect, ready to stand in a formula. */
    static String into(int a, int b) {
        return "({sh_A" + (a + 1) + "} + {lo_A" + (a + 1) + "}) ({sh_B" + (b + 1) + "} + {lo_B" + (b + 1) + "})";
    }

    static String pair(int a, int b) {
        return "_" + (a + 1) + (b + 1);
    }

    static String ports(int a, int b) {
        return "ports (" + (a + 1) + "," + (b + 1) + "): ";
    }
}

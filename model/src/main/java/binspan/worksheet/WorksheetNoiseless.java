package binspan.worksheet;

import binspan.counting.ClickStatistics;
import binspan.counting.DetectorLoad;
import binspan.counting.PortPair;
import binspan.scenario.Detector;

/**
 * Section 8: the fringe of ports (1,1) without dark counts, background and afterpulses, from which the budget takes
 * their cost.
 */
final class WorksheetNoiseless {
    private final WorksheetPage page;

    private WorksheetNoiseless(WorksheetPage page) {
        this.page = page;
    }

    /** States that fringe at its best and worst phase. */
    static void write(WorksheetPage page) {
        WorksheetNoiseless quiet = new WorksheetNoiseless(page);
        if (page.scenario().pulsed()) {
            quiet.clicks();
        } else {
            quiet.continuous();
        }
    }

    private void clicks() {
        String slot = page.endless() ? "(0)" : "(1)";
        for (WorksheetSide side : page.sides()) {
            String n = side.of("n", 0) + slot;
            double modes = page.prediction().spectrum().schmidtNumber();
            String formula = Double.isInfinite(modes) ? "1 - exp(-{" + n + "})" : "1 - (1 + {" + n + "}/{K})^-{K}";
            double click = ClickStatistics.click(page.value(n), 0.0, modes);
            page.line(side.of("q0"), side.name() + " port 1: click probability without noise", formula, click, "");
        }
        double chance = page.value("q0_A") * page.value("q0_B");
        double silent = (1.0 - page.value("q0_A")) * (1.0 - page.value("q0_B"));
        page.line("acc_0", "ports (1,1), no noise: both click by chance", "{q0_A} {q0_B}", chance, "");
        page.line("sil_0", "ports (1,1), no noise: neither clicks by chance", "(1 - {q0_A}) (1 - {q0_B})", silent, "");
        rate(WorksheetRates.BEST, clicks("cos_max"));
        rate(WorksheetRates.WORST, clicks("cos_min"));
    }

    private String clicks(String cosine) {
        return WorksheetPulsedPairs.interfering(page, 0, 0)
                .rate(page, "({c_11} + {k_11} x {" + cosine + "})")
                .replace("{acc_11}", "{acc_0}")
                .replace("{sil_11}", "{sil_0}");
    }

    private void continuous() {
        for (WorksheetSide side : page.sides()) {
            Detector detector = side.arm().detectors().get(0);
            DetectorLoad quiet = DetectorLoad.noiseless(detector, side.loads().get(0));
            String live = "1/(1 + " + side.in("ph", 0) + " " + side.in("td", 0) + ")";
            page.line(
                    side.of("live0"),
                    side.name() + " port 1: share of the time in which it is ready, no noise",
                    live,
                    quiet.liveFraction(),
                    "");
        }
        DetectorLoad a = DetectorLoad.noiseless(
                page.scenario().alice().detectors().get(0),
                page.prediction().counts().loadsA().get(0));
        DetectorLoad b = DetectorLoad.noiseless(
                page.scenario().bob().detectors().get(0),
                page.prediction().counts().loadsB().get(0));
        double ready = DetectorLoad.jointLive(a, b, page.value("m_11"));
        String both = WorksheetCounts.joint(0, 0, "live0_A", "live0_B");
        page.line("jl_0", "ports (1,1): share of the time in which both are ready, no noise", both, ready, "");
        double chance = a.recordedPerSecond() * b.recordedPerSecond() * page.value("w");
        String formula = "{ph_A1} {live0_A} {ph_B1} {live0_B} {w}";
        page.line("acc_0", "ports (1,1): accidental coincidences, no noise", formula, chance, "1/s");
        rate(WorksheetRates.BEST, "({c_11} + {k_11}) {jl_0}/{jl_11} + {acc_0}");
        rate(WorksheetRates.WORST, "({c_11} - {k_11}) {jl_0}/{jl_11} + {acc_0}");
    }

    private void rate(String phase, String formula) {
        PortPair quiet = page.prediction().counts().noiseless();
        boolean best = phase.equals(WorksheetRates.BEST);
        String meaning = "ports (1,1): coincidences without noise at the " + (best ? "best" : "worst") + " phase";
        page.line("R0(" + phase + ")", meaning, formula, quiet.atCosine(best ? 1.0 : -1.0), "1/s");
    }
}

package binspan.worksheet;

import binspan.counting.PortPair;
import binspan.merit.FringeVisibility;
import binspan.merit.VisibilityBudget;
import binspan.optics.TwoPhotonCoherence;
import binspan.prediction.LinkPrediction;
import binspan.scenario.Acquisition;

/** Section 8: the fringe of ports (1,1) and what each cause takes from its visibility. */
final class WorksheetVisibility {
    private final WorksheetPage page;
    private final LinkPrediction p;
    private int steps;

    private WorksheetVisibility(WorksheetPage page) {
        this.page = page;
        this.p = page.prediction();
    }

    static void write(WorksheetPage page) {
        page.section("8 Visibility");
        WorksheetVisibility sheet = new WorksheetVisibility(page);
        sheet.fringe();
        sheet.error();
        sheet.budget();
    }

    private void fringe() {
        FringeVisibility fringe = p.fringe();
        String max = WorksheetRates.rate(page, 0, 0, WorksheetRates.BEST);
        String min = WorksheetRates.rate(page, 0, 0, WorksheetRates.WORST);
        String accidental = "{acc_11}";
        if (page.scenario().pulsed()) {
            page.line(
                    "A_11",
                    "ports (1,1): accidental coincidences",
                    "{f_11} {acc_11}",
                    fringe.accidentalPerSecond(),
                    "1/s");
            accidental = "{A_11}";
        }
        page.line("V", "raw visibility", "(" + max + " - " + min + ")/(" + max + " + " + min + ")", fringe.raw(), "");
        String net = "(" + max + " - " + min + ")/(" + max + " + " + min + " - 2 " + accidental + ")";
        page.line("V_net", "visibility net of accidentals", net, fringe.net(), "");
        page.line(
                "CAR",
                "coincidences to accidentals",
                "(" + max + " + " + min + ")/(2 " + accidental + ")",
                fringe.car(),
                "");
    }

    private void error() {
        Acquisition scan = page.scenario().acquisition();
        page.input("M", "phase settings of a fringe scan", scan.fringePoints(), "", "acquisition.fringePoints");
        page.input("t_M", "measuring time at each", scan.secondsPerPoint(), "s", "acquisition.secondsPerPoint");
        page.line("N_M", "mean counts of a point", "({R_11(max)} + {R_11(min)})/2 x {t_M}", p.countsPerPoint(), "");
        page.line(
                "sig_V",
                "counting error of the raw visibility",
                "sqrt((2 - {V}^2)/({M} {N_M}))",
                p.visibilitySigma(),
                "");
    }

    private void budget() {
        TwoPhotonCoherence coherence = p.coherence();
        double spectral = coherence.pump() * coherence.spectral();
        step(VisibilityBudget.Cause.PUMP_COHERENCE, "{g_pump}", coherence.pump());
        step(VisibilityBudget.Cause.SPECTRAL, "{V_1} {g_spec}", spectral);
        step(VisibilityBudget.Cause.PHASE, "{V_2} {g_phase}", spectral * coherence.phase());
        step(VisibilityBudget.Cause.POLARIZATION, "{V_3} {g_pol}", coherence.gamma());
        step(VisibilityBudget.Cause.PATH_BALANCE, balance(), p.counts().balanceContrast());
        PortPair pair = p.counts().central().of(0, 0);
        step(VisibilityBudget.Cause.SLOT_OVERLAP, "{k_11}/{c_11}", pair.pairContrast());
        WorksheetNoiseless.write(page);
        double noiseless = FringeVisibility.of(p.counts().noiseless()).raw();
        step(VisibilityBudget.Cause.MULTI_PAIR, "({R0(max)} - {R0(min)})/({R0(max)} + {R0(min)})", noiseless);
        step(VisibilityBudget.Cause.NOISE, "{V}", p.fringe().raw());
    }

    private String balance() {
        boolean pair = page.scenario().pulsed() && !page.endless();
        String longs = (pair ? "{b_E} " : "") + "{l1_A} {l1_B}";
        String shorts = (pair ? "{b_L} " : "") + "{s1_A} {s1_B}";
        return "2 sqrt(" + longs + " " + shorts + ") {gamma}/(" + longs + " + " + shorts + ")";
    }

    private void step(VisibilityBudget.Cause cause, String formula, double visibility) {
        int index = ++steps;
        page.line("V_" + index, "visibility with " + cause.text() + " and the causes above", formula, visibility, "");
        String before = index == 1 ? "1" : "{V_" + (index - 1) + "}";
        page.line(
                "F_" + index,
                "factor of " + cause.text(),
                "{V_" + index + "}/" + before,
                p.budget().factor(cause),
                "");
    }
}

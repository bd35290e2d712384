package binspan.worksheet;

import binspan.merit.BellTest;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.scenario.Acquisition;

/** Section 8: the CHSH test. */
final class WorksheetBell {
    private final WorksheetPage page;
    private final LinkPrediction p;

    private WorksheetBell(WorksheetPage page) {
        this.page = page;
        this.p = page.prediction();
    }

    static void write(WorksheetPage page) {
        page.section("9 Bell test");
        WorksheetBell bell = new WorksheetBell(page);
        bell.value();
        bell.error();
        bell.times();
    }

    private void value() {
        double delta = p.coherence().phaseOffset();
        if (!p.counts().bothPorts()) {
            page.line(
                    "S",
                    "CHSH value, settings half a turn apart",
                    "2 sqrt(2) {V} cos({delta})",
                    p.bell().chsh(),
                    "");
            return;
        }
        correlation("a", "{delta} - pi/4", delta - Math.PI / 4.0);
        correlation("b", "{delta} + pi/4", delta + Math.PI / 4.0);
        correlation("c", "{delta} + 3 pi/4", delta + 3.0 * Math.PI / 4.0);
        page.line("S", "CHSH value", "{E_a} + 2 {E_b} - {E_c}", p.bell().chsh(), "");
    }

    private void correlation(String index, String phase, double radians) {
        WorksheetRates.cosine(page, index, "cos(" + phase + ")", radians);
        String equal = WorksheetRates.rate(page, 0, 0, index) + " + " + WorksheetRates.rate(page, 1, 1, index);
        String unequal = WorksheetRates.rate(page, 0, 1, index) + " + " + WorksheetRates.rate(page, 1, 0, index);
        double cosine = Math.cos(radians);
        double all = p.counts().central().sum(cosine);
        double correlation = all > 0.0 ? p.counts().central().equalLessUnequal(cosine) / all : 0.0;
        String formula = "(" + equal + " - " + unequal.replace(" + ", " - ") + ")/(" + equal + " + " + unequal + ")";
        page.line(
                "E_" + index,
                "correlation at phase " + phase.replace("{", "").replace("}", ""),
                formula,
                correlation,
                "");
    }

    private void error() {
        Acquisition run = page.scenario().acquisition();
        BellTest bell = p.bell();
        page.input("t_run", "wall-clock time of a run", run.durationS(), "s", "acquisition.durationS");
        page.input("up", "share of it in which the link works", run.uptimeShare(), "", "acquisition.uptimeShare");
        page.line("t_up", "working time of a run", "{t_run} {up}", p.uptime(), "s");
        double counts = bell.coincidencesPerSecond() * p.uptime() / 4.0;
        page.line("N_E", "coincidences for each of the four correlation values", "{C} {t_up}/4", counts, "");
        page.line("sig_S", "counting error of S", "2 sqrt((1 - {S}^2/16)/{N_E})", bell.sigma(p.uptime()), "");
    }

    private void times() {
        if (p.bell().chsh() > 2.0) {
            time("t_3", 3.0, "three");
            time("t_5", Requirement.FIVE, "five");
        }
    }

    private void time(String symbol, double sigmas, String words) {
        String k = String.valueOf((int) sigmas);
        String formula = "16 x " + k + "^2 (1 - {S}^2/16)/(({S} - 2)^2 {C} {up})";
        page.line(
                symbol,
                "time until S exceeds 2 by " + words + " standard errors",
                formula,
                p.bell().secondsTo(sigmas) / p.uptimeShare(),
                "s");
    }
}

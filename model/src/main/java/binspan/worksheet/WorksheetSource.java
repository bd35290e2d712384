package binspan.worksheet;

import binspan.counting.LinkCounts;
import binspan.merit.RepeaterlessBound;
import binspan.optics.PairSpectrum;
import binspan.prediction.LinkPrediction;
import binspan.prediction.ResultField;
import binspan.prediction.ResultFields;
import binspan.units.Decibels;
import java.util.ArrayList;
import java.util.List;

/** Section 8: what a calibration of the source would show, and the benchmark without repeaters. */
final class WorksheetSource {
    private static final String BENCHMARK = "Pirandola et al., Nat. Commun. 8, 15043 (2017), arXiv:1510.08863";

    private final WorksheetPage page;
    private final LinkPrediction p;

    private WorksheetSource(WorksheetPage page) {
        this.page = page;
        this.p = page.prediction();
    }

    static void write(WorksheetPage page) {
        page.section("12 Source and benchmark");
        WorksheetSource sheet = new WorksheetSource(page);
        if (page.scenario().pulsed()) {
            sheet.g2();
            sheet.apparent();
        }
        sheet.singles();
        sheet.benchmark();
    }

    private void g2() {
        double pass = p.spectrum().alicePassesGivenBob() * p.spectrum().bobPassesGivenAlice();
        String bin = page.endless() ? "{mu}" : page.value("mu_E") >= page.value("mu_L") ? "{mu_E}" : "{mu_L}";
        page.line(
                "x",
                "pairs of the brighter bin before the partners' filters",
                bin + "/({h_AB} {h_BA})",
                p.binPairs() / pass,
                "");
        for (WorksheetSide side : page.sides()) {
            double modes =
                    side.isAlice() ? p.spectrum().armSchmidtA() : p.spectrum().armSchmidtB();
            String k = side.in("K");
            page.line(
                    side.of("g2"),
                    side.name() + ": unheralded g2(0), one bin",
                    "1 + 1/" + k,
                    PairSpectrum.unheraldedG2(modes),
                    "");
            String mixed = "(1 + (1/{K} + 1/" + k + ")/2)";
            String formula = "({x}^2 (1 + 1/" + k + ") + 2 {x} " + mixed + ")/(1 + {x})^2";
            page.line(
                    side.of("g2h"),
                    side.name() + ": heralded g2(0), one bin, weak herald",
                    formula,
                    result(side.name() + ".heraldedG2"),
                    "");
        }
    }

    private void apparent() {
        String formula = "(" + recorded(page.sides().get(0)) + ") ("
                + recorded(page.sides().get(1)) + ")/({C_all} {f})";
        page.line(
                "mu_app",
                "mean pairs that a naive calibration would state",
                formula,
                result("source.apparentMeanPairs"),
                "");
    }

    private void singles() {
        for (WorksheetSide side : page.sides()) {
            String formula = "{C}/(" + recorded(side) + ")";
            double value = p.counts().central().sum(0.0) / LinkCounts.recorded(side.loads());
            page.line(side.of("cps"), side.name() + ": coincidences per single", formula, value, "");
        }
    }

    private static String recorded(WorksheetSide side) {
        List<String> singles = new ArrayList<>();
        for (int port = 0; port < side.loads().size(); port++) {
            singles.add(side.in("S", port));
        }
        return String.join(" + ", singles);
    }

    private void benchmark() {
        double transmittance =
                Decibels.transmittance(p.pathA().fibreLossDb() + p.pathB().fibreLossDb());
        page.line("eta", "transmittance of all fibre, end to end", "10^(-({fib_A} + {fib_B})/10)", transmittance, "");
        page.cited(BENCHMARK)
                .line(
                        "bpm",
                        "secret bits per mode without a repeater, at most",
                        "-log2(1 - {eta})",
                        RepeaterlessBound.bitsPerMode(transmittance),
                        "bit");
        page.line("modes", "modes that the source can fill", modes(), p.modesPerSecond(), "1/s");
        page.line("bound", "repeaterless benchmark", "{bpm} {modes}", result("key.repeaterlessBoundBps"), "bit/s");
    }

    private String modes() {
        if (page.scenario().pulsed()) {
            return page.endless() ? "{f} {K}" : "2 {f} {K}";
        }
        boolean flat = p.spectrum().alice().flat() && p.spectrum().bob().flat();
        if (flat) {
            return "min({a_A}, {a_B})/pi";
        }
        return p.spectrum().gaussian()
                ? "sqrt({Sigma_AA}/pi)"
                : "squared area of both filters over 2 pi times the area of their square";
    }

    private double result(String name) {
        for (ResultField field : ResultFields.ALL) {
            if (field.name().equals(name)) {
                return field.of(page.check(), 0);
            }
        }
        throw new IllegalStateException("no result " + name);
    }
}

package binspan.worksheet;

import binspan.merit.ErrorRates;
import binspan.merit.SecretKey;
import binspan.prediction.LinkPrediction;

/** Section 8: error rates, sifted and asymptotic key. */
final class WorksheetKey {
    private static final String D = "delta";
    private static final String OPPOSITE = "anti";

    private final WorksheetPage page;
    private final LinkPrediction p;
    private final ErrorRates errors;

    private WorksheetKey(WorksheetPage page) {
        this.page = page;
        this.p = page.prediction();
        this.errors = p.key().errors();
    }

    static void write(WorksheetPage page) {
        page.section("10 Errors and key");
        WorksheetKey key = new WorksheetKey(page);
        key.phaseErrors();
        if (page.has("C_00")) {
            key.timeErrors();
        }
        key.sifted();
        key.asymptotic();
    }

    private void phaseErrors() {
        WorksheetRates.cosine(page, D, "cos({delta})", p.coherence().phaseOffset());
        page.line("Q_X", "coincidences of the phase basis, all ports", central(), total(), "1/s");
        String formula = p.counts().bothPorts() ? "({R_12(delta)} + {R_21(delta)})/{Q_X}" : "(1 - {V} {cos_delta})/2";
        page.line("e_X", "error rate of the phase basis", formula, errors.phase(), "");
    }

    /** With one port on a side right and wrong outcomes need settings half a turn apart: the mean over both. */
    private String central() {
        String central = WorksheetRates.sum(page, D);
        if (p.counts().bothPorts()) {
            return central;
        }
        oppositePhase();
        return "(" + central + " + " + WorksheetRates.sum(page, OPPOSITE) + ")/2";
    }

    private void oppositePhase() {
        if (!page.has("cos_" + OPPOSITE)) {
            WorksheetRates.cosine(
                    page, OPPOSITE, "cos({delta} + pi)", p.coherence().phaseOffset() + Math.PI);
        }
    }

    private double total() {
        double sifted = p.key().siftedPhasePerSecond();
        return page.has("C_00") ? sifted : 2.0 * sifted;
    }

    private void timeErrors() {
        page.line(
                "Q_Z",
                "coincidences of the time basis, all ports",
                "{C_00} + {C_22} + {C_02} + {C_20}",
                p.key().siftedTimePerSecond(),
                "1/s");
        page.line("e_Z", "error rate of the time basis", "({C_02} + {C_20})/{Q_Z}", errors.time(), "");
        interference();
        double ratio = ratio();
        String formula = "({l1_A} + {l2_A}) ({s1_B} + {s2_B})/(({s1_A} + {s2_A}) ({l1_B} + {l2_B}))";
        page.line("ratio", "how slot 1 weighs early-late pairs against slots 0 and 2", formula, ratio, "");
        page.line(
                "eph_X",
                "phase error of the phase bits",
                "min(1/2, ({C_02} {ratio} + {C_20}/{ratio})/{Q_X})",
                errors.phaseErrorOfPhaseKey(),
                "");
    }

    private double ratio() {
        return (page.value("l1_A") + page.value("l2_A"))
                * (page.value("s1_B") + page.value("s2_B"))
                / ((page.value("s1_A") + page.value("s2_A")) * (page.value("l1_B") + page.value("l2_B")));
    }

    /** I = sum over port pairs of (-1)^(o + q) [P(delta) - P(delta + pi)]/2. */
    private void interference() {
        oppositePhase();
        StringBuilder sum = new StringBuilder();
        for (int a = 0; a < p.counts().central().portsA(); a++) {
            for (int b = 0; b < p.counts().central().portsB(); b++) {
                String sign = a == b ? " + " : " - ";
                String term = WorksheetRates.rate(page, a, b, D) + " - " + WorksheetRates.rate(page, a, b, OPPOSITE);
                sum.append(sum.length() == 0 ? "" : sign)
                        .append('(')
                        .append(term)
                        .append(')');
            }
        }
        double cosine = page.value("cos_delta");
        double swing = (p.counts().central().equalLessUnequal(cosine)
                        - p.counts().central().equalLessUnequal(-cosine))
                / 2.0;
        page.line("I", "interference of the phase basis", "[" + sum + "]/2", swing, "1/s");
        page.line(
                "eph_Z",
                "phase error of the time bits",
                "min(1/2, max(0, (1 - {I}/{Q_Z})/2))",
                errors.phaseErrorOfTimeKey(),
                "");
    }

    private void sifted() {
        if (!page.has("Q_Z")) {
            page.line(
                    "sift",
                    "sifted bits, two phase settings on each side",
                    "{Q_X}/2",
                    p.key().siftedPhasePerSecond(),
                    "bit/s");
        }
    }

    private void asymptotic() {
        double efficiency = page.scenario().protocol().errorCorrectionEfficiency();
        page.input(
                "f_EC",
                "bits disclosed by error correction over the Shannon limit",
                efficiency,
                "",
                "protocol.errorCorrectionEfficiency");
        entropy("h_X", "e_X", errors.phase());
        if (!page.has("Q_Z")) {
            fraction("r_X", "{h_X}", "{h_X}", SecretKey.secretFraction(errors.phase(), errors.phase(), efficiency));
            total("{sift} {r_X}");
            return;
        }
        entropy("h_Z", "e_Z", errors.time());
        entropy("hp_Z", "eph_Z", errors.phaseErrorOfTimeKey());
        entropy("hp_X", "eph_X", errors.phaseErrorOfPhaseKey());
        fraction(
                "r_Z",
                "{h_Z}",
                "{hp_Z}",
                SecretKey.secretFraction(errors.time(), errors.phaseErrorOfTimeKey(), efficiency));
        fraction(
                "r_X",
                "{h_X}",
                "{hp_X}",
                SecretKey.secretFraction(errors.phase(), errors.phaseErrorOfPhaseKey(), efficiency));
        total(p.counts().bothPorts() ? "{Q_Z} {r_Z} + {Q_X} {r_X}" : "{Q_Z} {r_Z}");
    }

    private void entropy(String symbol, String error, double value) {
        String e = "{" + error + "}";
        String formula = "-" + e + " log2(" + e + ") - (1 - " + e + ") log2(1 - " + e + ")";
        page.line(symbol, "binary entropy of " + error, formula, SecretKey.binaryEntropy(value), "bit");
    }

    private void fraction(String symbol, String bits, String phases, double value) {
        String basis = symbol.endsWith("Z") ? "time" : "phase";
        page.line(
                symbol,
                "secret bits for each sifted bit of the " + basis + " basis",
                "max(0, 1 - {f_EC} " + bits + " - " + phases + ")",
                value,
                "");
    }

    private void total(String formula) {
        if (!Double.isNaN(p.key().asymptoticPerSecond())) {
            page.line("key", "secret key of an endless run", formula, p.key().asymptoticPerSecond(), "bit/s");
        }
    }
}

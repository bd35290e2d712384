package binspan.worksheet;

import binspan.merit.FiniteKeyBlock;
import binspan.merit.FiniteKeyBound;
import binspan.merit.SecretKey;
import binspan.prediction.FiniteKeyOutlook;
import binspan.scenario.Protocol;

/** Section 8: the finite key of the acquisition by both bounds. */
final class WorksheetFiniteKey {
    private static final String TLGR =
            "Tomamichel, Lim, Gisin, Renner, Nat. Commun. 3, 634 (2012), arXiv:1103.4130, from memory";
    private static final String LXPE =
            "Lim, Xu, Pan, Ekert, Phys. Rev. Lett. 126, 100501 (2021), arXiv:2009.04882, from memory";

    private final WorksheetPage page;
    private final FiniteKeyBlock block;

    private WorksheetFiniteKey(WorksheetPage page) {
        this.page = page;
        this.block = page.prediction().finiteKey().block(page.prediction().uptime());
    }

    static void write(WorksheetPage page) {
        if (Double.isNaN(page.prediction().key().asymptoticPerSecond())) {
            return;
        }
        page.section("11 Finite key");
        WorksheetFiniteKey sheet = new WorksheetFiniteKey(page);
        sheet.protocol(page.scenario().protocol());
        sheet.block();
        sheet.bounds();
        sheet.outlook();
    }

    private void protocol(Protocol protocol) {
        page.input("eps_s", "failure probability of secrecy", protocol.secrecyEpsilon(), "", "protocol.secrecyEpsilon");
        page.input(
                "eps_c",
                "failure probability of correctness",
                protocol.correctnessEpsilon(),
                "",
                "protocol.correctnessEpsilon");
    }

    private void block() {
        boolean timeBasis = page.has("Q_Z");
        page.line(
                "n",
                "bits kept for the key" + (timeBasis ? ", time basis" : ""),
                timeBasis ? "{Q_Z} {t_up}" : "{sift} {t_up}/2",
                block.keyBits(),
                "bit");
        page.line(
                "k",
                "bits disclosed to test" + (timeBasis ? ", phase basis" : ""),
                timeBasis ? "{Q_X} {t_up}" : "{sift} {t_up}/2",
                block.testBits(),
                "bit");
        page.line("e_bit", "error rate of the key bits", timeBasis ? "{e_Z}" : "{e_X}", block.bitError(), "");
        page.line(
                "e_ph",
                "error rate of the test bits as their phase error",
                timeBasis ? "{eph_Z}" : "{e_X}",
                block.phaseError(),
                "");
        double entropy = SecretKey.binaryEntropy(block.bitError());
        String leak = timeBasis ? "{f_EC} {h_Z} {n}" : "{f_EC} {h_X} {n}";
        page.line(
                "leak",
                "bits disclosed by error correction",
                leak,
                block.efficiency() * entropy * block.keyBits(),
                "bit");
    }

    private void bounds() {
        if (block.keyBits() < 50.0 || block.testBits() < 1.0) {
            return;
        }
        double n = block.keyBits();
        double k = block.testBits();
        double deviation = Math.sqrt((n + k) / (n * k) * (k + 1.0) / k * Math.log(4.0 / block.secrecy()));
        page.cited(TLGR)
                .line(
                        "dev",
                        "how far the key's phase errors may exceed the tested ones",
                        "sqrt(({n} + {k})/({n} {k}) ({k} + 1)/{k} ln(4/{eps_s}))",
                        deviation,
                        "");
        double entropy =
                block.phaseError() + deviation < 0.5 ? SecretKey.binaryEntropy(block.phaseError() + deviation) : 1.0;
        page.line("h_dev", "binary entropy of both together, 1 from 1/2 on", "h({e_ph} + {dev})", entropy, "bit");
        page.cited(TLGR)
                .line(
                        "l_1",
                        "key length by the bound of 2012",
                        "{n} (1 - {h_dev}) - {leak} - log2(2/({eps_s}^2 {eps_c}))",
                        FiniteKeyBound.TOMAMICHEL_2012.bits(block),
                        "bit");
        String searched = "{n} (1 - h({e_ph} + nu)) - {leak} - log2(1/{eps_c})"
                + " + 2 log2(2 ({eps_s} - 2 eps_pe(nu, {n}, {k}))), the best nu searched";
        page.cited(LXPE)
                .line("l_2", "key length by the bound of 2021", searched, FiniteKeyBound.LIM_2021.bits(block), "bit");
    }

    private void outlook() {
        FiniteKeyOutlook finite = page.check().finite();
        String longest =
                page.has("l_1") ? "max(0, floor(max({l_1}, {l_2})))" : "0, fewer than 50 key bits or one test bit";
        page.line("l", "key length of the run", longest, finite.bits(), "bit");
        page.line("l_s", "the same over the wall-clock time", "{l}/{t_run}", finite.bitsPerSecond(), "bit/s");
        if (Double.isFinite(finite.secondsToFirstKey())) {
            String root = "time at which the longer bound reaches 1 bit, searched, over {up}";
            page.line("t_key", "time to the first key", root, finite.secondsToFirstKey(), "s");
        }
    }
}

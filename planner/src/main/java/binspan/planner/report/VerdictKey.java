package binspan.planner.report;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.units.Digits;

/** Sifted, asymptotic and finite key, and the benchmark without repeaters. */
final class VerdictKey {
    private final LinkCheck check;
    private final LinkPrediction p;
    private final Results results;
    private final TextPage page;

    private VerdictKey(LinkCheck check, TextPage page) {
        this.check = check;
        this.p = check.prediction();
        this.results = new Results(check);
        this.page = page;
    }

    static void write(LinkCheck check, TextPage page) {
        VerdictKey key = new VerdictKey(check, page);
        page.heading("Key");
        if (Double.isNaN(key.p.key().asymptoticPerSecond())) {
            key.none();
            return;
        }
        key.sifted();
        key.endless();
        key.finite();
        key.benchmark();
    }

    private void none() {
        String why = p.scenario().pulsed() ? "a pulse train" : "a continuous pump";
        page.wrapped(
                "  ",
                "  ",
                "No key: with " + why + " the bits are the ports, and one side or both detect one port only.");
    }

    private void sifted() {
        boolean testOnly = p.counts().hasTimeBasis() && !p.counts().bothPorts();
        String phase = Figure.bits(p.key().siftedPhasePerSecond());
        page.row("sifted, phase basis", testOnly ? phase + "; test bits only, no key" : phase);
        if (results.has("key.siftedTimeBps")) {
            page.row("sifted, time basis", Figure.bits(p.key().siftedTimePerSecond()));
        }
    }

    private void endless() {
        double rate = p.key().asymptoticPerSecond();
        page.row("secret, endless run", rate > 0.0 ? Figure.bits(rate) : "none: the errors leave no secret bits");
    }

    private void finite() {
        FiniteKeyOutlook finite = check.finite();
        String run = Figure.statedDuration(p.scenario().acquisition().durationS());
        String amount = finite.bits() > 0.0
                ? Digits.prefixed(finite.bits(), "bit", 3) + ", " + Figure.bits(finite.bitsPerSecond())
                : "none yet";
        page.row("secret, run of " + run, amount);
        page.row(
                "time to the first key",
                Double.isFinite(finite.secondsToFirstKey()) ? Figure.duration(finite.secondsToFirstKey()) : "never");
    }

    private void benchmark() {
        if (results.has("key.repeaterlessBoundBps")) {
            page.row(
                    "repeaterless benchmark",
                    Figure.bits(results.at("key.repeaterlessBoundBps")) + " over this fibre with these modes");
        }
    }
}

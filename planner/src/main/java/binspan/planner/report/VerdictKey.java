package binspan.planner.report;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.scenario.Scenario;
import binspan.units.Digits;

/** Sifted, asymptotic and finite key, and the benchmark without repeaters. */
public final class VerdictKey {
    /** Title. */
    public static final String TITLE = "Key";

    /** Name of the key of an endless run. */
    public static final String ENDLESS = "secret, endless run";

    /** Name of the time to the first key. */
    public static final String FIRST = "time to the first key";

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
        page.heading(TITLE);
        if (Double.isNaN(key.p.key().asymptoticPerSecond())) {
            key.none();
            return;
        }
        key.sifted();
        key.endless();
        key.finite();
        key.benchmark();
    }

    /** Name of the key of the scenario's run. */
    public static String run(Scenario scenario) {
        return "secret, run of " + Figure.statedDuration(scenario.acquisition().durationS());
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
        page.row(ENDLESS, rate > 0.0 ? Figure.bits(rate) : "none: the errors leave no secret bits");
    }

    private void finite() {
        FiniteKeyOutlook finite = check.finite();
        String amount = finite.bits() > 0.0
                ? Digits.prefixed(finite.bits(), "bit", 3) + ", " + Figure.bits(finite.bitsPerSecond())
                : "none yet";
        page.row(run(p.scenario()), amount);
        page.row(
                FIRST,
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

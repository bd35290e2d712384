package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.scenario.PumpMode;
import binspan.units.Digits;

/** Figures of the source and of both arms side by side. */
final class VerdictArms {
    private static final int NAME = 33;
    private static final int NUMBER = 16;

    private final LinkPrediction p;
    private final Results results;
    private final TextPage page;

    private VerdictArms(LinkCheck check, TextPage page) {
        this.p = check.prediction();
        this.results = new Results(check);
        this.page = page;
    }

    static void write(LinkCheck check, TextPage page) {
        VerdictArms arms = new VerdictArms(check, page);
        arms.source();
        page.gap();
        page.line(page.style().strong(left("Arms", NAME) + right("alice", NUMBER) + right("bob", NUMBER)));
        arms.path();
        arms.detectors();
        arms.photons();
    }

    private void source() {
        if (!p.scenario().pulsed()) {
            return;
        }
        page.heading("Source");
        String mean = Figure.stated(p.scenario().source().meanPairsPerCycle().orElseThrow(), "");
        boolean train = p.scenario().source().pump().mode() == PumpMode.PULSE_TRAIN;
        page.row(train ? "mean pairs per pulse" : "mean pairs per cycle", mean);
        if (results.has("source.apparentMeanPairs")) {
            String apparent = Figure.bare(results.at("source.apparentMeanPairs")) + " by singles over coincidences";
            page.row("apparent mean pairs", apparent);
        }
        if (results.has("source.schmidtNumber")) {
            page.row("Schmidt number, one bin", Figure.bare(results.at("source.schmidtNumber")));
        }
    }

    private void path() {
        row("loss in all", decibels("alice.lossDb"), decibels("bob.lossDb"));
        row("  of it fibre and joints", decibels("alice.fibreLossDb"), decibels("bob.fibreLossDb"));
        row("dispersion left", dispersion("alice"), dispersion("bob"));
        if (results.has("alice.arrivalRmsPs")) {
            row("spread of arrival, rms", figure("alice.arrivalRmsPs", "ps"), figure("bob.arrivalRmsPs", "ps"));
        }
        row("late against the windows", late("alice"), late("bob"));
    }

    private void detectors() {
        for (int port = 0; port < 2; port++) {
            boolean alice = port < p.counts().loadsA().size();
            boolean bob = port < p.counts().loadsB().size();
            if (alice || bob) {
                String name = ", port " + (port + 1);
                row("singles" + name, singles(alice, "alice", port), singles(bob, "bob", port));
                row("  ready" + name, ready(alice, "alice", port), ready(bob, "bob", port));
            }
        }
        row(
                "background, all ports",
                Figure.counts(results.at("alice.backgroundPerSecond")),
                Figure.counts(results.at("bob.backgroundPerSecond")));
    }

    private void photons() {
        row("coincidences per single", percent("alice.coincidencesPerSingle"), percent("bob.coincidencesPerSingle"));
        row(
                "partner passes its filters",
                percent("alice.partnerPassProbability"),
                percent("bob.partnerPassProbability"));
        if (results.has("alice.unheraldedG2")) {
            row("g2(0) unheralded, one bin", figure("alice.unheraldedG2", ""), figure("bob.unheraldedG2", ""));
            row("g2(0) heralded, one bin", figure("alice.heraldedG2", ""), figure("bob.heraldedG2", ""));
        }
    }

    private String decibels(String name) {
        return Figure.decibels(results.at(name));
    }

    private String dispersion(String arm) {
        return Digits.decimals(results.at(arm + ".dispersionPsPerNm"), 0) + " ps/nm";
    }

    private String late(String arm) {
        double late = results.at(arm + ".delayErrorPs");
        return late == 0.0 ? "0 ps" : Figure.in(late, "ps");
    }

    private String figure(String name, String unit) {
        return Figure.in(results.at(name), unit);
    }

    private String percent(String name) {
        return results.has(name) ? Figure.percent(results.at(name)) : "none";
    }

    private String singles(boolean detected, String arm, int port) {
        return detected ? Figure.counts(results.at(arm + ".singlesPerSecond", port)) : "not detected";
    }

    private String ready(boolean detected, String arm, int port) {
        return detected ? Digits.decimals(results.at(arm + ".liveFraction", port) * 100.0, 1) + " % of time" : "";
    }

    private void row(String name, String alice, String bob) {
        page.line("  " + left(name, NAME - 2) + right(alice, NUMBER) + right(bob, NUMBER));
    }
}

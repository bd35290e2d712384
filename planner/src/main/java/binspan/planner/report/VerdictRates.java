package binspan.planner.report;

import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;

/** Fringe and coincidence rates, Bell test, error rates. */
public final class VerdictRates {
    /** Title of the Bell test. */
    public static final String BELL = "Bell test";

    /** Title of the error rates. */
    public static final String ERRORS = "Error rates";

    private final LinkPrediction p;
    private final Results results;
    private final TextPage page;

    private VerdictRates(LinkCheck check, TextPage page) {
        this.p = check.prediction();
        this.results = new Results(check);
        this.page = page;
    }

    static void write(LinkCheck check, TextPage page) {
        VerdictRates rates = new VerdictRates(check, page);
        rates.fringe();
        rates.bell();
        rates.errors();
    }

    private void fringe() {
        page.heading("Coincidences");
        page.row("ports (1,1), best phase", Figure.counts(p.fringe().maxPerSecond()));
        page.row("ports (1,1), worst phase", Figure.counts(p.fringe().minPerSecond()));
        String accidental = Figure.counts(p.fringe().accidentalPerSecond());
        page.row(
                "ports (1,1), accidental",
                results.has("coincidence.car")
                        ? accidental + "; coincidences to accidentals "
                                + Figure.bare(p.fringe().car())
                        : accidental);
        String slot = p.scenario().pulsed() ? "central slot, all ports" : "central peak, all ports";
        page.row(slot, Figure.counts(results.at("coincidence.allPortsPerSecond")));
        page.row("one separation aside", Figure.counts(results.at("coincidence.sidePerSecond")));
        if (results.has("coincidence.correlationRmsPs")) {
            page.row(
                    "spread of the time difference",
                    Figure.in(results.at("coincidence.correlationRmsPs"), "ps") + " rms");
        }
    }

    private void bell() {
        page.heading(
                BELL,
                "after " + Figure.statedDuration(p.scenario().acquisition().durationS()));
        page.row(
                "S",
                Figure.withError(p.bell().chsh(), results.at("bell.sigma"), page.style())
                        + (p.bell().chsh() > 2.0 ? "" : "; no violation"));
        if (results.has("bell.secondsToFiveSigma")) {
            page.row("time to S > 2 by 3 sigma", Figure.duration(results.at("bell.secondsToThreeSigma")));
            page.row("time to S > 2 by 5 sigma", Figure.duration(results.at("bell.secondsToFiveSigma")));
        }
    }

    private void errors() {
        page.heading(ERRORS);
        page.row("phase basis", Figure.percent(results.at("qber.phase")));
        if (results.has("qber.time")) {
            page.row("time basis", Figure.percent(results.at("qber.time")));
        }
    }
}

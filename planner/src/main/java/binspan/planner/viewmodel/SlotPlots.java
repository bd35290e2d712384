package binspan.planner.viewmodel;

import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.planner.report.Figure;
import binspan.planner.viewmodel.SlotPlot.Kind;
import binspan.planner.viewmodel.SlotPlot.Layer;
import binspan.planner.viewmodel.SlotPlot.NamedPeak;
import binspan.prediction.LinkPrediction;
import binspan.prediction.histogram.ArrivalHistograms;
import binspan.prediction.histogram.BinRates;
import binspan.prediction.histogram.ClickHistogram;
import binspan.prediction.histogram.CoincidenceHistogram;
import binspan.prediction.histogram.PairHistogram;
import binspan.prediction.histogram.Peak;
import java.util.ArrayList;
import java.util.List;

/** Turns the histograms of a prediction into what the page of the slots draws. */
final class SlotPlots {
    private static final int CENTRAL = 1;
    private static final double PICO = 1e12;

    private SlotPlots() {}

    /** The plots of a link: both sides and the pair; with a continuous pump, whose singles are flat in time, the pair alone. */
    static List<SlotPlot> of(LinkPrediction prediction, boolean allPorts) {
        List<SlotPlot> plots = new ArrayList<>();
        if (prediction.scenario().pulsed()) {
            plots.add(side(prediction, Site.ALICE));
            plots.add(side(prediction, Site.BOB));
        }
        plots.add(pair(prediction, allPorts));
        return List.copyOf(plots);
    }

    private static SlotPlot side(LinkPrediction prediction, Site site) {
        boolean alice = site == Site.ALICE;
        ClickHistogram clicks = ArrivalHistograms.side(prediction, alice).all();
        double inWindow =
                within(clicks.recorded(), clicks.bins(), clicks.windows().get(CENTRAL));
        String note = Words.of(
                "slots.note.side",
                Figure.counts(inWindow),
                Figure.in(prediction.arrivalRms(alice) * PICO, "ps"),
                Figure.in(clicks.bins().width() * PICO, "ps"));
        return new SlotPlot(
                site.path(),
                Words.of("slots.title." + site.path()),
                note,
                "slots.axis.time",
                clicks.bins(),
                List.of(
                        layer(Kind.NOISE, "noise", clicks.noise().toArray()),
                        layer(Kind.LIGHT, "light", clicks.light().toArray())),
                clicks.windows(),
                CENTRAL,
                named(clicks.peaks()));
    }

    private static Layer layer(Kind kind, String name, double[] perSecond) {
        return new Layer(kind, Words.of("slots.layer." + name), perSecond);
    }

    private static SlotPlot pair(LinkPrediction prediction, boolean allPorts) {
        PairHistogram pair = ArrivalHistograms.pair(prediction);
        CoincidenceHistogram shown = allPorts ? pair.all() : pair.first();
        boolean pulsed = prediction.scenario().pulsed();
        String title = (pulsed ? "slots.title.pair" : "slots.title.difference") + (allPorts ? ".all" : "");
        return new SlotPlot(
                "pair",
                Words.of(title),
                note(shown),
                pulsed ? "slots.axis.pair" : "slots.axis.difference",
                shown.bins(),
                layers(shown),
                List.of(shown.window()),
                0,
                named(shown.peaks()));
    }

    private static List<Layer> layers(CoincidenceHistogram shown) {
        double[] worst = shown.centralWorst().toArray();
        double[] contrast = shown.centralBest().toArray();
        for (int i = 0; i < contrast.length; i++) {
            // Of unequal ports the best phase is the other's worst: all ports together may show no contrast at all.
            contrast[i] = Math.max(0.0, contrast[i] - worst[i]);
        }
        return List.of(
                layer(Kind.NOISE, "accidentals", shown.accidentals().toArray()),
                layer(Kind.LIGHT, "sidePeaks", shown.sidePeaks().toArray()),
                layer(Kind.WORST, "worst", worst),
                layer(Kind.CONTRAST, "best", contrast));
    }

    private static String note(CoincidenceHistogram shown) {
        return Words.of(
                "slots.note.pair",
                Figure.counts(within(shown.best(), shown.bins(), shown.window())),
                Figure.counts(within(shown.worst(), shown.bins(), shown.window())),
                Figure.counts(within(shown.accidentals(), shown.bins(), shown.window())));
    }

    /** Events per second in the bins whose middle lies in a window. */
    private static double within(BinRates rates, TimeBins bins, Window window) {
        int first = (int) Math.ceil((window.from() - bins.middle(0)) / bins.width() - 1e-9);
        int end = (int) Math.floor((window.to() - bins.middle(0)) / bins.width() + 1e-9) + 1;
        return rates.total(Math.max(0, first), Math.max(0, Math.min(bins.count(), end)));
    }

    private static List<NamedPeak> named(List<Peak> peaks) {
        return peaks.stream()
                .map(peak -> new NamedPeak(
                        peak.time(), Words.of("slots.peak." + peak.kind().name())))
                .toList();
    }
}

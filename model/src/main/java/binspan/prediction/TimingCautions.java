package binspan.prediction;

import binspan.scenario.LinkLength;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;

/** Where windows, slots and arrival times strain the model. */
final class TimingCautions {
    private static final double CLEAR_OF_NEIGHBOURS = 6.0;
    private static final double MISMATCH_WITHOUT_SELECTION = 0.3e-12;
    private static final double LITTLE = 1.02;
    /** Less than this comes from the saturation of the detectors, not from the window. */
    private static final double NOTICEABLE = 5e-6;

    private TimingCautions() {}

    static void add(LinkPrediction p, Cautions cautions) {
        double separation = p.imbalances().common();
        double window = p.windowWidth();
        cautions.when(
                window > separation,
                "window-wider-than-separation",
                "The window (%.0f ps) is wider than the slot separation (%.0f ps): neighbouring slots are counted as central ones.",
                window / Scale.PICO,
                separation / Scale.PICO);
        double rms = Math.max(p.arrivalRms(true), p.arrivalRms(false));
        cautions.when(
                separation < CLEAR_OF_NEIGHBOURS * rms,
                "slots-overlap",
                "The slot separation (%.0f ps) is less than six rms of the arrival times (%.0f ps rms): slots run into one another.",
                separation / Scale.PICO,
                rms / Scale.PICO);
        cycle(p, separation, window, cautions);
        double late = late(p);
        cautions.when(
                late > window / 2.0,
                "windows-missed",
                "The photons arrive %.0f ps off the centre of windows of %.0f ps, so that most of them miss: align the windows more often or correct"
                        + " the delay.",
                late / Scale.PICO,
                window / Scale.PICO);
        selection(p, window, cautions);
        if (late <= window / 2.0) {
            rising(p, cautions);
        }
    }

    private static void cycle(LinkPrediction p, double separation, double window, Cautions cautions) {
        boolean pair = p.scenario().source().pump().mode() == PumpMode.PULSE_PAIR;
        double cycle = 1.0 / p.cyclesPerSecond();
        cautions.when(
                pair && 3.0 * separation + window > cycle,
                "cycle-too-short",
                "Three separations and a window (%.2f ns) do not fit into the pump cycle (%.2f ns): slots of successive cycles mix.",
                (3.0 * separation + window) / Scale.NANO,
                cycle / Scale.NANO);
    }

    /** With a continuous pump only the difference of the imbalances and the sum of the dispersions matter. */
    private static void selection(LinkPrediction p, double window, Cautions cautions) {
        double offA = p.imbalances().alice() - p.imbalances().pump();
        double offB = p.imbalances().bob() - p.imbalances().pump();
        double betaA = p.pathA().groupDelayDispersion();
        double betaB = p.pathB().groupDelayDispersion();
        boolean pulsed = p.scenario().pulsed();
        double mismatch = pulsed ? Math.max(Math.abs(offA), Math.abs(offB)) : Math.abs(offA - offB);
        double far = pulsed
                ? Math.max(
                        Math.abs(betaA) * Math.sqrt(p.spectrum().alice().variance()),
                        Math.abs(betaB) * Math.sqrt(p.spectrum().bob().variance()))
                : Math.abs(betaA + betaB) * Math.sqrt(p.spectrum().varianceA());
        cautions.when(
                mismatch > MISMATCH_WITHOUT_SELECTION && window < 4.0 * far,
                "window-selects-spectrum",
                "An imbalance is off by %.2f ps and the window is narrow against the dispersed light: it selects part of the spectrum, so the spectral"
                        + " loss of visibility is overstated.",
                mismatch / Scale.PICO);
    }

    /** How far the photons arrive off the centres of their windows, s; with a continuous pump only the difference of the arms counts. */
    private static double late(LinkPrediction p) {
        double lateA = LinkPrediction.late(p.scenario().alice(), p.pathA());
        double lateB = LinkPrediction.late(p.scenario().bob(), p.pathB());
        return p.scenario().pulsed() ? Math.max(Math.abs(lateA), Math.abs(lateB)) : Math.abs(lateA - lateB);
    }

    private static void rising(LinkPrediction p, Cautions cautions) {
        double visibility = p.fringe().raw();
        Scenario scenario = p.scenario();
        LinkLength length = new LinkLength();
        double present = length.value(scenario).orElse(0.0);
        boolean withLength = present > 0.0
                && LITTLE * present <= length.range().highest()
                && LinkPredictor.predict(length.with(scenario, LITTLE * present))
                                .fringe()
                                .raw()
                        > visibility * (1.0 + NOTICEABLE);
        cautions.when(
                withLength,
                "visibility-rises-with-length",
                "The visibility rises a little with length: the narrow window cuts accidentals more than pairs. True, and no reason to add fibre.");
        boolean withJitter =
                LinkPredictor.predict(MoreJitter.of(scenario, LITTLE)).fringe().raw() > visibility * (1.0 + NOTICEABLE);
        cautions.when(
                withJitter,
                "visibility-rises-with-jitter",
                "The visibility rises a little with detector jitter: the narrow window cuts accidentals more than pairs. True, and no reason to want"
                        + " jitter.");
    }
}

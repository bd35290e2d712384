package binspan.prediction.histogram;

import binspan.optics.ArrivalTime;
import binspan.optics.PortTiming;
import binspan.optics.TimeBins;
import binspan.prediction.LinkPrediction;
import binspan.scenario.PumpMode;
import java.util.List;

/**
 * Bins that show everything: all peaks and {@value #SPAN_RMS} rms beyond, windows included; of a pulse train one and a half periods to each side. At least
 * {@value #BINS_PER_RMS} bins for an rms unless that takes more than {@value #MOST_BINS}. The edges of the central window are edges of bins, and those of
 * the others as well where the separation is a simple multiple of the bins.
 */
public final class HistogramBins {
    /** Bins where nothing else is asked for, at least. */
    public static final int USUAL_BINS = 300;

    /** Most bins that are made for a sharp arrival. */
    public static final int MOST_BINS = 4000;

    private static final double SPAN_RMS = 6.0;
    private static final double BINS_PER_RMS = 4.0;
    private static final double PERIODS = 1.5;
    private static final double ALIGNED = 1e-9;

    private HistogramBins() {}

    /**
     * Bins for the clicks of a side.
     *
     * @param prediction the link
     * @param alice whether alice's side is meant, else bob's
     * @param atLeast number of bins, at least
     */
    public static TimeBins side(LinkPrediction prediction, boolean alice, int atLeast) {
        if (!prediction.scenario().pulsed()) {
            return pair(prediction, atLeast);
        }
        ArrivalTime arrival = prediction.arrival();
        double light = alice ? arrival.singlesA() : arrival.singlesB();
        double sharpest = Math.sqrt(light + sharpest(alice ? prediction.portsA() : prediction.portsB()));
        return slots(prediction, alice, sharpest, atLeast);
    }

    /** Bins for the coincidences of a link: pulsed, of bob's arrival; continuous, of the time difference. */
    public static TimeBins pair(LinkPrediction prediction, int atLeast) {
        if (prediction.scenario().pulsed()) {
            return slots(prediction, false, conditionalRms(prediction), atLeast);
        }
        double rms = prediction.correlationRms();
        double late = late(prediction, true) - late(prediction, false);
        double beyond = SPAN_RMS * rms + Math.abs(late) + prediction.windowWidth() / 2.0;
        double separation = prediction.imbalances().common();
        return new Layout(prediction.windowWidth(), separation, rms / BINS_PER_RMS, atLeast)
                .over(
                        -prediction.imbalances().bob() - beyond,
                        prediction.imbalances().alice() + beyond);
    }

    private static TimeBins slots(LinkPrediction prediction, boolean alice, double sharpest, int atLeast) {
        double separation = prediction.imbalances().common();
        double beyond = SPAN_RMS * prediction.arrivalRms(alice)
                + Math.abs(late(prediction, alice))
                + prediction.windowWidth() / 2.0;
        boolean train = prediction.scenario().source().pump().mode() == PumpMode.PULSE_TRAIN;
        double reach = train ? PERIODS * separation : separation + beyond;
        return new Layout(prediction.windowWidth(), separation, sharpest / BINS_PER_RMS, atLeast).over(-reach, reach);
    }

    static double late(LinkPrediction prediction, boolean alice) {
        return alice
                ? LinkPrediction.late(prediction.scenario().alice(), prediction.pathA())
                : LinkPrediction.late(prediction.scenario().bob(), prediction.pathB());
    }

    private static double sharpest(List<PortTiming> ports) {
        return ports.stream().mapToDouble(PortTiming::variance).min().orElseThrow();
    }

    /** Rms of bob's photon where alice's time is known exactly: no peak of the pair is sharper. */
    private static double conditionalRms(LinkPrediction prediction) {
        ArrivalTime arrival = prediction.arrival();
        double varianceA = arrival.pairA() + sharpest(prediction.portsA());
        double varianceB = arrival.pairB() + sharpest(prediction.portsB());
        return Math.sqrt(varianceB - arrival.pairCovariance() * arrival.pairCovariance() / varianceA);
    }

    /**
     * How to lay bins.
     *
     * @param window full width of the windows, s
     * @param separation distance of the windows, s
     * @param widest widest bins that resolve the peaks, s
     * @param atLeast number of bins, at least
     */
    private record Layout(double window, double separation, double widest, int atLeast) {
        TimeBins over(double from, double to) {
            double finest = (to - from) / Math.max(MOST_BINS, atLeast);
            double width = Math.max(finest, Math.min(widest, (to - from) / atLeast));
            if (window < finest) {
                return from(from, to, width, 0.0);
            }
            return from(from, to, window / perWindow(width, window / finest), window / 2.0);
        }

        /** Bins in a window: as few as the width allows, a little more where all windows then have their edges on bins. */
        private double perWindow(double width, double most) {
            double fewest = Math.ceil(window / width * (1.0 - ALIGNED));
            for (double bins = fewest; bins <= Math.min(most, 2.0 * fewest + 8.0); bins++) {
                double apart = separation / window * bins;
                if (Math.abs(apart - Math.rint(apart)) < ALIGNED * apart) {
                    return bins;
                }
            }
            return fewest;
        }

        /** Bins over a span, one edge at a given time before zero. */
        private static TimeBins from(double from, double to, double width, double edge) {
            double before = Math.ceil((-edge - from) / width * (1.0 - ALIGNED));
            double after = Math.ceil((to + edge) / width * (1.0 - ALIGNED));
            return new TimeBins(-edge - before * width, width, (int) (before + after));
        }
    }
}

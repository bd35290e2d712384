package binspan.prediction.histogram;

import binspan.counting.ArmLight;
import binspan.counting.DetectorLoad;
import binspan.optics.CaptureInputs;
import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.prediction.LinkPrediction;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * Makes the histograms of a predicted link. Shapes are those of the model: Gaussian light with jitter, clock, tag bin, polarization mode dispersion and
 * chromatic dispersion, a detector's exponential tail, the box of a flat top in the far field, lateness.
 */
public final class ArrivalHistograms {
    private ArrivalHistograms() {}

    /**
     * Recorded clicks of a side in the usual bins.
     *
     * @param prediction the link
     * @param alice whether alice's side is meant, else bob's
     */
    public static SideHistogram side(LinkPrediction prediction, boolean alice) {
        return side(prediction, alice, HistogramBins.side(prediction, alice, HistogramBins.USUAL_BINS));
    }

    /** Recorded clicks of a side in given bins about the centre of the central slot. */
    public static SideHistogram side(LinkPrediction prediction, boolean alice, TimeBins bins) {
        ArmLight arm = alice ? prediction.counts().alice() : prediction.counts().bob();
        List<ClickHistogram> ports = new ArrayList<>();
        for (int port = 0; port < arm.ports(); port++) {
            boolean known = port > 0 && arm.portsAlike();
            ports.add(known ? ports.get(0) : port(prediction, alice, port, bins));
        }
        return new SideHistogram(ClickHistogram.sum(ports), ports);
    }

    /** Coincidences in the usual bins. */
    public static PairHistogram pair(LinkPrediction prediction) {
        return pair(prediction, HistogramBins.pair(prediction, HistogramBins.USUAL_BINS));
    }

    /** Coincidences in given bins: pulsed, of bob's arrival about the centre of his central slot; continuous, of t_A - t_B. */
    public static PairHistogram pair(LinkPrediction prediction, TimeBins bins) {
        return prediction.scenario().pulsed()
                ? new PulsedCoincidences(prediction, bins).histogram()
                : new ContinuousCoincidences(prediction, bins).histogram();
    }

    private static ClickHistogram port(LinkPrediction prediction, boolean alice, int port, TimeBins bins) {
        return prediction.scenario().pulsed()
                ? pulsed(prediction, alice, new PortArrivals(prediction, alice, port), bins)
                : flat(
                        (alice
                                        ? prediction.counts().loadsA()
                                        : prediction.counts().loadsB())
                                .get(port),
                        bins);
    }

    private static ClickHistogram pulsed(
            LinkPrediction prediction, boolean alice, PortArrivals arrivals, TimeBins bins) {
        DetectorLoad load = arrivals.load();
        CaptureInputs in = prediction.optics().captures().inputs();
        double gated = prediction.cyclesPerSecond() * load.gateShare();
        double noise = load.darkPerSecond() + load.backgroundPerSecond() + afterpulses(load);
        double[] open = arrivals.open(bins);
        double perOpen = noise > 0.0 ? gated * load.noiseDensity() / noise : 0.0;
        double live = load.liveFraction();
        return new ClickHistogram(
                bins,
                windows(in),
                peaks(in, alice ? in.lateA() : in.lateB()),
                scaled(arrivals.photons(bins), photons -> gated * live * photons),
                scaled(open, time -> perOpen * live * load.darkPerSecond() * time),
                scaled(open, time -> perOpen * live * load.backgroundPerSecond() * time),
                scaled(open, time -> perOpen * afterpulses(load) * time));
    }

    /** Continuous pump: all clicks spread over the time shown. */
    private static ClickHistogram flat(DetectorLoad load, TimeBins bins) {
        double[] even = new double[bins.count()];
        Arrays.fill(even, 1.0 / bins.count());
        double live = load.liveFraction();
        return new ClickHistogram(
                bins,
                List.of(),
                List.of(),
                scaled(even, share -> load.photonsPerSecond() * live * share),
                scaled(even, share -> load.darkPerSecond() * live * share),
                scaled(even, share -> load.backgroundPerSecond() * live * share),
                scaled(even, share -> afterpulses(load) * share));
    }

    /** Recorded afterpulses, 1/s: what is recorded beyond the first clicks. */
    private static double afterpulses(DetectorLoad load) {
        double first = load.photonsPerSecond() + load.darkPerSecond() + load.backgroundPerSecond();
        return Math.max(0.0, load.recordedPerSecond() - first * load.liveFraction());
    }

    private static BinRates scaled(double[] values, DoubleUnaryOperator rate) {
        return new BinRates(Arrays.stream(values).map(rate).toArray());
    }

    private static List<Window> windows(CaptureInputs in) {
        Window central = Window.of(in.windowWidth(), 0.0);
        return List.of(central.shifted(-in.separation()), central, central.shifted(in.separation()));
    }

    private static List<Peak> peaks(CaptureInputs in, double late) {
        boolean train = in.endless();
        return List.of(
                new Peak(train ? Peak.Kind.TRAIN_SLOT : Peak.Kind.EARLY_SHORT, late - in.separation()),
                new Peak(train ? Peak.Kind.TRAIN_SLOT : Peak.Kind.CENTRAL_SLOT, late),
                new Peak(train ? Peak.Kind.TRAIN_SLOT : Peak.Kind.LATE_LONG, late + in.separation()));
    }
}

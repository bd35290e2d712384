package binspan.prediction.histogram;

import binspan.counting.ArmLight;
import binspan.counting.DetectorLoad;
import binspan.optics.BinnedCaptures;
import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.prediction.LinkPrediction;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Coincidences of a continuous pump by t_A - t_B: peaks at 0, +T_A and -T_B over accidentals in proportion to both recorded singles. */
final class ContinuousCoincidences {
    private final LinkPrediction prediction;
    private final TimeBins bins;
    private final ArmLight alice;
    private final ArmLight bob;
    private final double late;

    ContinuousCoincidences(LinkPrediction prediction, TimeBins bins) {
        this.prediction = prediction;
        this.bins = bins;
        this.alice = prediction.counts().alice();
        this.bob = prediction.counts().bob();
        this.late = HistogramBins.late(prediction, true) - HistogramBins.late(prediction, false);
    }

    PairHistogram histogram() {
        List<CoincidenceHistogram> pairs = new ArrayList<>();
        List<Shapes> shapes = new ArrayList<>();
        for (int a = 0; a < alice.ports(); a++) {
            for (int b = 0; b < bob.ports(); b++) {
                int likeA = alice.portsAlike() ? 0 : a;
                int likeB = bob.portsAlike() ? 0 : b;
                boolean known = likeA < a || likeB < b;
                shapes.add(known ? shapes.get(likeA * bob.ports() + likeB) : shapes(a, b));
                pairs.add(scaled(a, b, shapes.get(shapes.size() - 1)));
            }
        }
        return new PairHistogram(pairs.get(0), CoincidenceHistogram.sum(pairs));
    }

    /** Captured shares of the three peaks in each bin. */
    private static final class Shapes {
        private final double[] same;
        private final double[] aliceLong;
        private final double[] bobLong;

        Shapes(double[] same, double[] aliceLong, double[] bobLong) {
            this.same = same;
            this.aliceLong = aliceLong;
            this.bobLong = bobLong;
        }
    }

    private Shapes shapes(int a, int b) {
        return new Shapes(
                captured(a, b, 0.0),
                captured(a, b, prediction.imbalances().alice()),
                captured(a, b, -prediction.imbalances().bob()));
    }

    private double[] captured(int a, int b, double peak) {
        double beta =
                prediction.pathA().groupDelayDispersion() + prediction.pathB().groupDelayDispersion();
        return BinnedCaptures.difference(
                prediction.spectrum(),
                beta,
                prediction.portsA().get(a),
                prediction.portsB().get(b),
                bins.shifted(-late - peak));
    }

    private CoincidenceHistogram scaled(int a, int b, Shapes shapes) {
        DetectorLoad loadA = prediction.counts().loadsA().get(a);
        DetectorLoad loadB = prediction.counts().loadsB().get(b);
        double pairs = prediction.scenario().source().pairRatePerSecond().orElseThrow();
        double rate = pairs * DetectorLoad.jointLive(loadA, loadB, pairs * alice.into(a) * bob.into(b));
        double shorts = alice.shortTo(a) * bob.shortTo(b);
        double longs = alice.longTo(a) * bob.longTo(b);
        double contrast = (a == b ? 2.0 : -2.0)
                * Math.sqrt(shorts * longs)
                * prediction.coherence().gamma();
        double all = loadA.recordedPerSecond() * loadB.recordedPerSecond() * bins.width();
        double light = light(loadA) * light(loadB) * bins.width();
        return new CoincidenceHistogram(
                bins,
                Window.of(prediction.windowWidth(), 0.0),
                peaks(),
                rates(shapes.aliceLong, rate * alice.longTo(a) * bob.shortTo(b))
                        .plus(rates(shapes.bobLong, rate * alice.shortTo(a) * bob.longTo(b))),
                rates(shapes.same, rate * Math.max(0.0, shorts + longs + contrast)),
                rates(shapes.same, rate * Math.max(0.0, shorts + longs - contrast)),
                even(light),
                even(Math.max(0.0, all - light)));
    }

    private static double light(DetectorLoad load) {
        return load.photonsPerSecond() * load.liveFraction();
    }

    private static BinRates rates(double[] values, double factor) {
        return new BinRates(Arrays.stream(values).map(value -> factor * value).toArray());
    }

    private BinRates even(double value) {
        double[] rates = new double[bins.count()];
        Arrays.fill(rates, value);
        return new BinRates(rates);
    }

    private List<Peak> peaks() {
        return List.of(
                new Peak(Peak.Kind.BOB_LONG, late - prediction.imbalances().bob()),
                new Peak(Peak.Kind.SAME_PATHS, late),
                new Peak(Peak.Kind.ALICE_LONG, late + prediction.imbalances().alice()));
    }
}

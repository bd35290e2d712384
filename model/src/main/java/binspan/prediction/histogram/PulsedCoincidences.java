package binspan.prediction.histogram;

import binspan.counting.ArmLight;
import binspan.counting.ClickStatistics;
import binspan.counting.PulsedPortPair;
import binspan.optics.BinnedCaptures;
import binspan.optics.CaptureInputs;
import binspan.optics.PairCaptures;
import binspan.optics.SlotCaptures;
import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.prediction.LinkPrediction;
import java.util.ArrayList;
import java.util.List;

/** Coincidences of a pulsed link by bob's arrival, alice's click inside her central window. */
final class PulsedCoincidences {
    /** Share of alice's photons of a slot in her central window below which that slot is left out. */
    private static final double NEVER = 1e-16;

    private final LinkPrediction prediction;
    private final TimeBins bins;
    private final ArmLight alice;
    private final ArmLight bob;
    private final SlotCaptures captures;
    private final double modes;
    private final double early;
    private final double late;

    PulsedCoincidences(LinkPrediction prediction, TimeBins bins) {
        this.prediction = prediction;
        this.bins = bins;
        this.alice = prediction.counts().alice();
        this.bob = prediction.counts().bob();
        this.captures = prediction.optics().captures();
        this.modes = prediction.spectrum().schmidtNumber();
        double pairs = prediction.scenario().source().meanPairsPerCycle().orElseThrow();
        double share = prediction.scenario().source().pump().earlyPairFraction();
        this.early = ClickStatistics.bunched(endless() ? pairs : share * pairs, modes);
        this.late = ClickStatistics.bunched(endless() ? pairs : (1.0 - share) * pairs, modes);
    }

    private boolean endless() {
        return captures.inputs().endless();
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

    /** What pairs and single clicks of two ports do in each bin, events per cycle, before the click statistics. */
    private static final class Shapes {
        /** Detected pairs that do not interfere. */
        private final double[] side;

        /** Captured share of those that do. */
        private final double[] central;

        /** Bob's photons. */
        private final double[] photons;

        /** Bob's noise clicks. */
        private final double[] noise;

        Shapes(double[] side, double[] central, double[] photons, double[] noise) {
            this.side = side;
            this.central = central;
            this.photons = photons;
            this.noise = noise;
        }
    }

    private Shapes shapes(int a, int b) {
        double[] side = new double[bins.count()];
        double[] central = new double[bins.count()];
        int reach = endless() ? captures.reach() : 1;
        for (int offset = -reach; offset <= reach; offset++) {
            if (captures.alice(a, offset) < NEVER) {
                continue;
            }
            for (int apart = -1; apart <= 1; apart++) {
                boolean interferes = apart == 0 && (endless() || offset == 0);
                double weight = interferes ? 1.0 : weight(a, b, offset, offset + apart);
                if (weight > 0.0) {
                    add(interferes ? central : side, weight, joint(a, b, offset, offset + apart));
                }
            }
        }
        PortArrivals arrivals = new PortArrivals(prediction, false, b);
        double[] noise = arrivals.open(bins);
        for (int i = 0; i < noise.length; i++) {
            noise[i] *= arrivals.load().noiseDensity();
        }
        return new Shapes(side, central, arrivals.photons(bins), noise);
    }

    private static void add(double[] to, double weight, double[] shares) {
        for (int i = 0; i < to.length; i++) {
            to[i] += weight * shares[i];
        }
    }

    /** Captured share of pairs that belong the given slots off the central ones. */
    private double[] joint(int a, int b, int offsetA, int offsetB) {
        CaptureInputs in = captures.inputs();
        Window windowA = Window.of(in.windowWidth(), in.lateA() + offsetA * in.separation());
        return BinnedCaptures.bob(captures, a, b, windowA, bins.shifted(-in.lateB() - offsetB * in.separation()));
    }

    /** Detected pairs per cycle that do not interfere, by the slots of both photons counted from the central ones. */
    private double weight(int a, int b, int offsetA, int offsetB) {
        if (endless()) {
            return offsetB > offsetA
                    ? early * alice.shortTo(a) * bob.longTo(b)
                    : early * alice.longTo(a) * bob.shortTo(b);
        }
        if (Math.abs(offsetB) > 1) {
            return 0.0;
        }
        double bornEarly = path(offsetA < 0, alice, a) * path(offsetB < 0, bob, b);
        double bornLate = path(offsetA <= 0, alice, a) * path(offsetB <= 0, bob, b);
        return offsetA + offsetB < 0 ? early * bornEarly : late * bornLate;
    }

    private static double path(boolean isShort, ArmLight arm, int port) {
        return isShort ? arm.shortTo(port) : arm.longTo(port);
    }

    /** Detected pairs per cycle that interfere, averaged over the phase, were all captured. */
    private double centralWeight(int a, int b) {
        double shorts = alice.shortTo(a) * bob.shortTo(b);
        double longs = alice.longTo(a) * bob.longTo(b);
        return endless() ? early * (shorts + longs) : early * longs + late * shorts;
    }

    /** The click statistics of the central windows, laid over the shapes. */
    private CoincidenceHistogram scaled(int a, int b, Shapes shapes) {
        PulsedPortPair pair = (PulsedPortPair) prediction.counts().central().of(a, b);
        PairCaptures window = captures.pairs(a, b);
        double captured = endless() ? window.apart(0) : window.at(0, 0);
        double sideInWindow = Math.max(0.0, pair.base() - centralWeight(a, b) * captured);
        double fewest = Math.max(0.0, pair.base() - Math.abs(pair.amplitude()));
        double perPair = fewest > 0.0
                ? perSecond(pair, fewest) / fewest
                : pair.cyclesPerSecond() * pair.noClick() / pair.spread();
        double best = perSecond(pair, Math.max(0.0, pair.base() + pair.amplitude())) - perPair * sideInWindow;
        double worst = perSecond(pair, Math.max(0.0, pair.base() - pair.amplitude())) - perPair * sideInWindow;
        double perShare = captured > 0.0 ? 1.0 / captured : 0.0;
        Accidentals accidentals = accidentals(pair, a, b);
        return new CoincidenceHistogram(
                bins,
                Window.of(captures.inputs().windowWidth(), 0.0),
                peaks(),
                rates(shapes.side, perPair),
                rates(shapes.central, Math.max(0.0, best) * perShare),
                rates(shapes.central, Math.max(0.0, worst) * perShare),
                rates(shapes.photons, accidentals.perClick() * accidentals.lightShare()),
                accidentals.noisy(shapes));
    }

    /** Coincidences beyond the accidentals, 1/s. */
    private double perSecond(PulsedPortPair pair, double pairs) {
        return pair.cyclesPerSecond() * pair.noClick() * ClickStatistics.correlation(pairs, pair.spread(), modes);
    }

    /**
     * Accidentals of the central windows.
     *
     * @param perClick accidentals per expected click of bob's, 1/s
     * @param lightShare share of alice's clicks that light makes
     */
    private record Accidentals(double perClick, double lightShare) {
        BinRates noisy(Shapes shapes) {
            double[] rates = new double[shapes.noise.length];
            for (int i = 0; i < rates.length; i++) {
                rates[i] = perClick * (shapes.noise[i] + (1.0 - lightShare) * shapes.photons[i]);
            }
            return new BinRates(rates);
        }
    }

    private Accidentals accidentals(PulsedPortPair pair, int a, int b) {
        PortArrivals ofAlice = new PortArrivals(prediction, true, a);
        PortArrivals ofBob = new PortArrivals(prediction, false, b);
        double photons = ofAlice.photonsInWindow();
        double clicks = photons + ofAlice.noiseInWindow();
        double expected = ofBob.photonsInWindow() + ofBob.noiseInWindow();
        return new Accidentals(
                expected > 0.0 ? pair.accidentalPerSecond() / expected : 0.0, clicks > 0.0 ? photons / clicks : 0.0);
    }

    private static BinRates rates(double[] values, double factor) {
        double[] rates = new double[values.length];
        for (int i = 0; i < rates.length; i++) {
            rates[i] = factor * values[i];
        }
        return new BinRates(rates);
    }

    private List<Peak> peaks() {
        CaptureInputs in = captures.inputs();
        return List.of(
                new Peak(Peak.Kind.ALICE_LONG, in.lateB() - in.separation()),
                new Peak(Peak.Kind.SAME_PATHS, in.lateB()),
                new Peak(Peak.Kind.BOB_LONG, in.lateB() + in.separation()));
    }
}

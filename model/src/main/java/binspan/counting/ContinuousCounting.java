package binspan.counting;

import binspan.optics.AnalyzerPaths;
import binspan.optics.DifferenceCapture;
import binspan.optics.Window;
import java.util.List;

/**
 * Counts with a continuous pump: peaks of t_A - t_B at 0 (sA sB + lA lB and their interference), +T_A (lA sB) and -T_B (sA lB), each captured in the
 * window about 0, and accidentals in proportion to both recorded singles.
 */
public final class ContinuousCounting {
    private final ContinuousInputs in;
    private final List<DetectorLoad> loadsA;
    private final List<DetectorLoad> loadsB;
    private final Peaks[] known;

    private ContinuousCounting(ContinuousInputs in) {
        this.in = in;
        this.loadsA = in.alice().loads(1.0, Double.POSITIVE_INFINITY);
        this.loadsB = in.bob().loads(1.0, Double.POSITIVE_INFINITY);
        this.known = new Peaks[loadsA.size() * loadsB.size()];
    }

    /** The counts of a continuous-pump source. */
    public static LinkCounts of(ContinuousInputs in) {
        return new ContinuousCounting(in).counts();
    }

    private LinkCounts counts() {
        PortPair[] central = new PortPair[loadsA.size() * loadsB.size()];
        double side = 0.0;
        for (int a = 0; a < loadsA.size(); a++) {
            for (int b = 0; b < loadsB.size(); b++) {
                Peaks peaks = peaks(a, b);
                central[a * loadsB.size() + b] = pair(a, b, loadsA.get(a), loadsB.get(b), peaks.central());
                side += pair(a, b, loadsA.get(a), loadsB.get(b), peaks.aliceLong())
                                .atCosine(0.0)
                        + pair(a, b, loadsA.get(a), loadsB.get(b), peaks.bobLong())
                                .atCosine(0.0);
            }
        }
        DetectorLoad quietA =
                DetectorLoad.noiseless(in.alice().arm().detectors().get(0), loadsA.get(0));
        DetectorLoad quietB = DetectorLoad.noiseless(in.bob().arm().detectors().get(0), loadsB.get(0));
        PortPairs pairs = new PortPairs(central, loadsB.size());
        return new LinkCounts(
                in.alice(),
                in.bob(),
                loadsA,
                loadsB,
                pairs,
                List.of(),
                side,
                pairs.mean() + side,
                balanceContrast(),
                pair(0, 0, quietA, quietB, peaks(0, 0).central()));
    }

    /** Captured shares of the three peaks in one window: same paths, alice long and bob short, alice short and bob long. */
    private record Captured(double same, double aliceLong, double bobLong) {}

    /** What the windows about the three peaks capture. */
    private record Peaks(Captured central, Captured aliceLong, Captured bobLong) {}

    private Peaks peaks(int a, int b) {
        int likeA = in.portsA().get(a).same(in.portsA().get(0)) ? 0 : a;
        int likeB = in.portsB().get(b).same(in.portsB().get(0)) ? 0 : b;
        int index = likeA * loadsB.size() + likeB;
        if (known[index] == null) {
            known[index] = capturePeaks(likeA, likeB);
        }
        return known[index];
    }

    private Peaks capturePeaks(int a, int b) {
        double ta = in.imbalanceA();
        double tb = in.imbalanceB();
        double same = capture(a, b, 0.0);
        return new Peaks(
                new Captured(same, capture(a, b, -ta), capture(a, b, tb)),
                new Captured(capture(a, b, ta), same, capture(a, b, ta + tb)),
                new Captured(capture(a, b, -tb), capture(a, b, -ta - tb), same));
    }

    private ContinuousPortPair pair(int a, int b, DetectorLoad loadA, DetectorLoad loadB, Captured captured) {
        ArmLight alice = in.alice();
        ArmLight bob = in.bob();
        double common = in.pairsPerSecond() * alice.into(a) * bob.into(b);
        double rate = in.pairsPerSecond() * DetectorLoad.jointLive(loadA, loadB, common);
        double shorts = alice.shortTo(a) * bob.shortTo(b);
        double longs = alice.longTo(a) * bob.longTo(b);
        double base = captured.same() * (shorts + longs)
                + captured.aliceLong() * alice.longTo(a) * bob.shortTo(b)
                + captured.bobLong() * alice.shortTo(a) * bob.longTo(b);
        double sign = a == b ? 1.0 : -1.0;
        double amplitude = sign * captured.same() * 2.0 * Math.sqrt(shorts * longs) * in.gamma();
        double accidental = loadA.recordedPerSecond() * loadB.recordedPerSecond() * in.windowWidth();
        return new ContinuousPortPair(rate * base, rate * amplitude, accidental);
    }

    /** Captured share of a peak by a window centred the given time after it. */
    private double capture(int a, int b, double after) {
        Window window = Window.of(in.windowWidth(), in.late() - after);
        return DifferenceCapture.of(
                in.spectrum(), in.betaSum(), in.portsA().get(a), in.portsB().get(b), window);
    }

    private double balanceContrast() {
        AnalyzerPaths a = in.alice().paths();
        AnalyzerPaths b = in.bob().paths();
        double longs = a.long1() * b.long1();
        double shorts = a.short1() * b.short1();
        return 2.0 * Math.sqrt(longs * shorts) * in.gamma() / (longs + shorts);
    }
}

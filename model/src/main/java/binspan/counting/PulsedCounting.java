package binspan.counting;

import java.util.List;

/** Counts of a pulsed source: threshold-detector statistics of every pair of windows. Ports that are alike are computed once. */
public final class PulsedCounting {
    private final PulsedInputs in;
    private final SlotPattern pattern;
    private final int slots;
    private final Side alice;
    private final Side bob;
    private final double[] readyCycles;

    private PulsedCounting(PulsedInputs in) {
        this.in = in;
        this.pattern = in.endless() ? new PulseTrainPattern(in) : new PulsePairPattern(in);
        this.slots = pattern.slots();
        this.alice = new Side(in.alice(), in, slots);
        this.bob = new Side(in.bob(), in, slots);
        for (int slot = 0; slot < slots; slot++) {
            for (int port = 0; port < alice.distinct; port++) {
                alice.clicks[port * slots + slot] = clicks(alice, port, pattern.alice(port, slot));
            }
            for (int port = 0; port < bob.distinct; port++) {
                bob.clicks[port * slots + slot] = clicks(bob, port, pattern.bob(port, slot));
            }
        }
        this.readyCycles = new double[alice.distinct * bob.distinct];
        for (int i = 0; i < readyCycles.length; i++) {
            readyCycles[i] = readyCycles(i / bob.distinct, i % bob.distinct);
        }
    }

    /** One side: its detectors and their clicks in each slot, for ports that differ. */
    private static final class Side {
        private final ArmLight light;
        private final List<DetectorLoad> loads;
        private final int distinct;
        private final WindowClicks[] clicks;

        Side(ArmLight light, PulsedInputs in, int slots) {
            this.light = light;
            this.loads = light.loads(in.cyclesPerSecond(), in.slotsPerSecond());
            this.distinct = light.portsAlike() ? 1 : loads.size();
            this.clicks = new WindowClicks[distinct * slots];
        }
    }

    /** The counts of a pulsed source. */
    public static LinkCounts of(PulsedInputs in) {
        return new PulsedCounting(in).counts();
    }

    private WindowClicks clicks(Side side, int port, double photons) {
        double noise = side.loads
                .get(port)
                .noiseClicks(in.windowWidth(), side.light.arm().detectors().get(port));
        return WindowClicks.of(photons, noise, in.modes());
    }

    /** Clicks of a port in a slot; the slots of an endless train are all alike. */
    private WindowClicks clicks(Side side, int port, int slot) {
        return side.clicks[port * slots + (in.endless() ? 0 : slot)];
    }

    private LinkCounts counts() {
        int central = pattern.central();
        PortPairs centre = windows(central, central);
        List<PortPairs> outer =
                in.endless() ? List.of() : List.of(windows(0, 0), windows(2, 2), windows(0, 2), windows(2, 0));
        double all = centre.mean();
        for (int i = 0; i < outer.size(); i++) {
            all += outer.get(i).mean();
        }
        double side = apart(central, 1) + apart(central, -1);
        return new LinkCounts(
                in.alice(),
                in.bob(),
                alice.loads,
                bob.loads,
                centre,
                outer,
                side,
                all + side,
                pattern.balanceContrast(),
                noiseless());
    }

    /** Coincidences of the windows one slot apart that touch the central one, averaged over the phase, 1/s. */
    private double apart(int central, int step) {
        double sum = meanPerSecond(central, central + step);
        return in.endless() ? sum : sum + meanPerSecond(central - step, central);
    }

    private double meanPerSecond(int slotA, int slotB) {
        double sum = 0.0;
        for (int a = 0; a < alice.distinct; a++) {
            for (int b = 0; b < bob.distinct; b++) {
                WindowClicks first = clicks(alice, a, slotA);
                WindowClicks second = clicks(bob, b, slotB);
                double pairs = pattern.base(a, b, slotA, slotB);
                double both = ClickStatistics.correlation(pairs, first.spread() * second.spread(), in.modes());
                sum += readyCycles[a * bob.distinct + b]
                        * (first.click() * second.click() + first.noClick() * second.noClick() * both);
            }
        }
        return sum * alice.loads.size() / alice.distinct * bob.loads.size() / bob.distinct;
    }

    private PortPairs windows(int slotA, int slotB) {
        int portsB = bob.loads.size();
        PulsedPortPair[] pairs = new PulsedPortPair[alice.loads.size() * portsB];
        for (int i = 0; i < pairs.length; i++) {
            int a = i / portsB;
            int b = i % portsB;
            pairs[i] = a < alice.distinct && b < bob.distinct
                    ? pair(a, b, new SlotPair(slotA, slotB), clicks(alice, a, slotA), clicks(bob, b, slotB))
                    : like(pairs, a, b);
        }
        return new PortPairs(pairs, portsB);
    }

    /** A port that is like port 1 sees the same coincidences, those of the opposite phase if the other port is not exchanged as well. */
    private PulsedPortPair like(PulsedPortPair[] pairs, int a, int b) {
        int portsB = bob.loads.size();
        boolean likeA = a >= alice.distinct;
        boolean likeB = b >= bob.distinct;
        if (likeA && likeB) {
            return pairs[0];
        }
        boolean known = likeA && bob.light.portsAlike();
        return known ? pairs[1] : pairs[(likeA ? 0 : a) * portsB + (likeB ? 0 : b)].opposite();
    }

    /** Ports (1,1) without noise clicks. */
    private PulsedPortPair noiseless() {
        int central = pattern.central();
        WindowClicks first = WindowClicks.of(pattern.alice(0, central), 0.0, in.modes());
        WindowClicks second = WindowClicks.of(pattern.bob(0, central), 0.0, in.modes());
        return pair(0, 0, new SlotPair(central, central), first, second);
    }

    private record SlotPair(int a, int b) {}

    private PulsedPortPair pair(int a, int b, SlotPair slotPair, WindowClicks first, WindowClicks second) {
        return new PulsedPortPair(
                readyCycles[a * bob.distinct + b],
                first.click() * second.click(),
                first.noClick() * second.noClick(),
                first.spread() * second.spread(),
                in.modes(),
                pattern.base(a, b, slotPair.a(), slotPair.b()),
                pattern.amplitude(a, b, slotPair.a(), slotPair.b()));
    }

    /** Cycles that have a gate on both sides (both sides gate the same slots) and find both detectors ready, 1/s. */
    private double readyCycles(int a, int b) {
        DetectorLoad loadA = alice.loads.get(a);
        DetectorLoad loadB = bob.loads.get(b);
        double gated = Math.min(loadA.gateShare(), loadB.gateShare()) * in.cyclesPerSecond();
        double common = gated * in.meanPairs() * in.alice().into(a) * in.bob().into(b);
        return gated * DetectorLoad.jointLive(loadA, loadB, common);
    }
}

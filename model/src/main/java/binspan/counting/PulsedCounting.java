package binspan.counting;

import java.util.List;

/** Counts of a pulsed source: threshold-detector statistics of every pair of windows. */
public final class PulsedCounting {
    private final PulsedInputs in;
    private final SlotPattern pattern;
    private final List<DetectorLoad> loadsA;
    private final List<DetectorLoad> loadsB;
    private final WindowClicks[][] clicksA;
    private final WindowClicks[][] clicksB;
    private final double[][] readyCycles;

    private PulsedCounting(PulsedInputs in) {
        this.in = in;
        this.pattern = in.endless() ? new PulseTrainPattern(in) : new PulsePairPattern(in);
        this.loadsA = in.alice().loads(in.cyclesPerSecond(), in.slotsPerSecond());
        this.loadsB = in.bob().loads(in.cyclesPerSecond(), in.slotsPerSecond());
        this.clicksA = new WindowClicks[loadsA.size()][pattern.slots()];
        this.clicksB = new WindowClicks[loadsB.size()][pattern.slots()];
        for (int slot = 0; slot < pattern.slots(); slot++) {
            for (int port = 0; port < clicksA.length; port++) {
                clicksA[port][slot] =
                        WindowClicks.of(pattern.alice(port, slot), noise(in.alice(), loadsA, port), in.modes());
            }
            for (int port = 0; port < clicksB.length; port++) {
                clicksB[port][slot] =
                        WindowClicks.of(pattern.bob(port, slot), noise(in.bob(), loadsB, port), in.modes());
            }
        }
        this.readyCycles = new double[clicksA.length][clicksB.length];
        for (int a = 0; a < clicksA.length; a++) {
            for (int b = 0; b < clicksB.length; b++) {
                readyCycles[a][b] = readyCycles(a, b);
            }
        }
    }

    /** The counts of a pulsed source. */
    public static LinkCounts of(PulsedInputs in) {
        return new PulsedCounting(in).counts();
    }

    private double noise(ArmLight arm, List<DetectorLoad> loads, int port) {
        return loads.get(port)
                .noiseClicks(in.windowWidth(), arm.arm().detectors().get(port));
    }

    private LinkCounts counts() {
        int central = pattern.central();
        PortPairs centre = windows(central, central);
        List<PortPairs> outer =
                in.endless() ? List.of() : List.of(windows(0, 0), windows(2, 2), windows(0, 2), windows(2, 0));
        double all = centre.sum(0.0);
        for (PortPairs pairs : outer) {
            all += pairs.sum(0.0);
        }
        double side = apart(central, 1) + apart(central, -1);
        return new LinkCounts(
                in.alice(),
                in.bob(),
                loadsA,
                loadsB,
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
        for (int a = 0; a < clicksA.length; a++) {
            for (int b = 0; b < clicksB.length; b++) {
                WindowClicks first = clicksA[a][Math.floorMod(slotA, pattern.slots())];
                WindowClicks second = clicksB[b][Math.floorMod(slotB, pattern.slots())];
                double pairs = pattern.base(a, b, slotA, slotB);
                double both = ClickStatistics.correlation(pairs, first.spread() * second.spread(), in.modes());
                sum += readyCycles[a][b] * (first.click() * second.click() + first.noClick() * second.noClick() * both);
            }
        }
        return sum;
    }

    private PortPairs windows(int slotA, int slotB) {
        PortPair[][] pairs = new PortPair[clicksA.length][clicksB.length];
        for (int a = 0; a < clicksA.length; a++) {
            for (int b = 0; b < clicksB.length; b++) {
                WindowClicks first = clicksA[a][Math.floorMod(slotA, pattern.slots())];
                WindowClicks second = clicksB[b][Math.floorMod(slotB, pattern.slots())];
                pairs[a][b] = pair(a, b, new SlotPair(slotA, slotB), first, second);
            }
        }
        return new PortPairs(pairs);
    }

    private PulsedPortPair noiseless() {
        int central = pattern.central();
        WindowClicks first = WindowClicks.of(pattern.alice(0, central), 0.0, in.modes());
        WindowClicks second = WindowClicks.of(pattern.bob(0, central), 0.0, in.modes());
        return pair(0, 0, new SlotPair(central, central), first, second);
    }

    private record SlotPair(int a, int b) {}

    private PulsedPortPair pair(int a, int b, SlotPair slots, WindowClicks first, WindowClicks second) {
        return new PulsedPortPair(
                readyCycles[a][b],
                first.click() * second.click(),
                first.noClick() * second.noClick(),
                first.spread() * second.spread(),
                in.modes(),
                pattern.base(a, b, slots.a(), slots.b()),
                pattern.amplitude(a, b, slots.a(), slots.b()));
    }

    /** Cycles that have a gate on both sides (both sides gate the same slots) and find both detectors ready, 1/s. */
    private double readyCycles(int a, int b) {
        double gated = Math.min(loadsA.get(a).gateShare(), loadsB.get(b).gateShare()) * in.cyclesPerSecond();
        double common = gated * in.meanPairs() * in.alice().into(a) * in.bob().into(b);
        return gated * DetectorLoad.jointLive(loadsA.get(a), loadsB.get(b), common);
    }
}

package binspan.counting;

import binspan.optics.AnalyzerPaths;
import binspan.optics.PairCaptures;

/**
 * The endless slots of a pulse train: photons s + l in every slot; pairs in the same slot b (sA sB + lA lB + 2 sqrt(sA sB lA lB) gamma cos), in the
 * next slot b sA lB or b lA sB. Slots are counted from any one of them.
 */
final class PulseTrainPattern implements SlotPattern {
    private final PulsedInputs in;
    private final double bunched;

    PulseTrainPattern(PulsedInputs in) {
        this.in = in;
        this.bunched = ClickStatistics.bunched(in.meanPairs(), in.modes());
    }

    @Override
    public double alice(int port, int slot) {
        double captured = 0.0;
        for (int offset = -in.captures().reach(); offset <= in.captures().reach(); offset++) {
            captured += in.captures().alice(port, offset);
        }
        return in.alice().photons() * in.alice().into(port) * captured;
    }

    @Override
    public double bob(int port, int slot) {
        double captured = 0.0;
        for (int offset = -in.captures().reach(); offset <= in.captures().reach(); offset++) {
            captured += in.captures().bob(port, offset);
        }
        return in.bob().photons() * in.bob().into(port) * captured;
    }

    @Override
    public double base(int portA, int portB, int slotA, int slotB) {
        double sa = in.alice().shortTo(portA);
        double la = in.alice().longTo(portA);
        double sb = in.bob().shortTo(portB);
        double lb = in.bob().longTo(portB);
        int apart = slotB - slotA;
        PairCaptures captures = in.captures().pairs(portA, portB);
        return bunched
                * ((sa * sb + la * lb) * captures.apart(-apart)
                        + sa * lb * captures.apart(1 - apart)
                        + la * sb * captures.apart(-1 - apart));
    }

    @Override
    public double amplitude(int portA, int portB, int slotA, int slotB) {
        double product = in.alice().longTo(portA)
                * in.bob().longTo(portB)
                * in.alice().shortTo(portA)
                * in.bob().shortTo(portB);
        double sign = portA == portB ? 1.0 : -1.0;
        return sign
                * bunched
                * in.captures().pairs(portA, portB).apart(slotA - slotB)
                * 2.0
                * Math.sqrt(product)
                * in.gamma();
    }

    @Override
    public int central() {
        return 0;
    }

    @Override
    public int slots() {
        return 1;
    }

    @Override
    public double balanceContrast() {
        AnalyzerPaths a = in.alice().paths();
        AnalyzerPaths b = in.bob().paths();
        double longs = a.long1() * b.long1();
        double shorts = a.short1() * b.short1();
        return 2.0 * Math.sqrt(longs * shorts) * in.gamma() / (longs + shorts);
    }
}

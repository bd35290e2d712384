package binspan.counting;

import binspan.optics.AnalyzerPaths;
import binspan.optics.PairCaptures;
import binspan.optics.SlotCaptures;

/**
 * Three slots of a pulse pair: early-short, early-long with late-short, late-long.
 *
 * <p>Photons: e s | e l + (1-e) s | (1-e) l. Pairs: C00 = b_E sA sB, C01 = b_E sA lB, C10 = b_E lA sB, C22 = b_L lA lB, C12 = b_L sA lB, C21 = b_L lA
 * sB, C11 = b_E lA lB + b_L sA sB + 2 sqrt(b_E b_L lA lB sA sB) gamma cos(phi + pi (o + q)).
 */
final class PulsePairPattern implements SlotPattern {
    private static final int SLOTS = 3;
    private static final int CENTRAL = 1;

    private final PulsedInputs in;
    private final double early;
    private final double late;

    PulsePairPattern(PulsedInputs in) {
        this.in = in;
        this.early = ClickStatistics.bunched(in.meanPairs() * in.earlyShare(), in.modes());
        this.late = ClickStatistics.bunched(in.meanPairs() * (1.0 - in.earlyShare()), in.modes());
    }

    @Override
    public double alice(int port, int slot) {
        SlotCaptures captures = in.captures();
        return photons(
                in.alice(),
                port,
                captures.alice(port, -slot),
                captures.alice(port, 1 - slot),
                captures.alice(port, 2 - slot));
    }

    @Override
    public double bob(int port, int slot) {
        SlotCaptures captures = in.captures();
        return photons(
                in.bob(), port, captures.bob(port, -slot), captures.bob(port, 1 - slot), captures.bob(port, 2 - slot));
    }

    private double photons(ArmLight arm, int port, double first, double second, double third) {
        double e = in.earlyShare();
        double s = arm.shortTo(port);
        double l = arm.longTo(port);
        return arm.photons() * (first * e * s + second * (e * l + (1.0 - e) * s) + third * (1.0 - e) * l);
    }

    @Override
    public double base(int portA, int portB, int slotA, int slotB) {
        double sa = in.alice().shortTo(portA);
        double la = in.alice().longTo(portA);
        double sb = in.bob().shortTo(portB);
        double lb = in.bob().longTo(portB);
        PairCaptures captures = in.captures().pairs(portA, portB);
        double middle = captures.at(1 - slotA, 1 - slotB);
        double bornEarly = sa * (sb * captures.at(-slotA, -slotB) + lb * captures.at(-slotA, 1 - slotB))
                + la * (sb * captures.at(1 - slotA, -slotB) + lb * middle);
        double bornLate = sa * (sb * middle + lb * captures.at(1 - slotA, 2 - slotB))
                + la * (sb * captures.at(2 - slotA, 1 - slotB) + lb * captures.at(2 - slotA, 2 - slotB));
        return early * bornEarly + late * bornLate;
    }

    @Override
    public double amplitude(int portA, int portB, int slotA, int slotB) {
        double captured = in.captures().pairs(portA, portB).at(1 - slotA, 1 - slotB);
        if (captured == 0.0) {
            return 0.0;
        }
        double product = early
                * late
                * in.alice().longTo(portA)
                * in.bob().longTo(portB)
                * in.alice().shortTo(portA)
                * in.bob().shortTo(portB);
        double sign = portA == portB ? 1.0 : -1.0;
        return sign * captured * 2.0 * Math.sqrt(product) * in.gamma();
    }

    @Override
    public int central() {
        return CENTRAL;
    }

    @Override
    public int slots() {
        return SLOTS;
    }

    @Override
    public double balanceContrast() {
        AnalyzerPaths a = in.alice().paths();
        AnalyzerPaths b = in.bob().paths();
        double longs = early * a.long1() * b.long1();
        double shorts = late * a.short1() * b.short1();
        return 2.0 * Math.sqrt(longs * shorts) * in.gamma() / (longs + shorts);
    }
}

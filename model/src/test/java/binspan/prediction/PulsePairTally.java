package binspan.prediction;

import binspan.prediction.PhotonSimulation.Click;
import binspan.prediction.PhotonSimulation.Side;
import java.util.Arrays;
import java.util.function.IntSupplier;

/** Clicks in the three windows of each cycle. */
final class PulsePairTally {
    private static final int SLOTS = 3;
    private final PhotonSimulation simulation;
    private final Side[] sides;
    private final double separation;
    private final double window;
    private final long[] photons = new long[4];
    private final long[] single = new long[12];
    private final long[][] both = new long[6][6];
    private final int[] clicked = new int[2];
    private final Click[] clicks = {null, null, new Click(), new Click()};
    private long cycles;

    PulsePairTally(PhotonSimulation simulation, Side[] sides, double separation, double window) {
        this.simulation = simulation;
        this.sides = sides;
        this.separation = separation;
        this.window = window;
    }

    void run(int count, IntSupplier early, IntSupplier late) {
        double dark = sides[0].darkPerSecond() * window * 12.0;
        for (int cycle = 0; cycle < count; cycle++) {
            Arrays.fill(clicked, 0);
            born(early.getAsInt(), 0);
            born(late.getAsInt(), 1);
            for (int n = simulation.poisson(dark); n > 0; n--) {
                int where = (int) (12.0 * simulation.uniform());
                clicked[where / 6] |= 1 << (where % 6);
            }
            if (clicked[0] != 0 || clicked[1] != 0) {
                tally();
            }
        }
        cycles += count;
    }

    private void born(int pairs, int bin) {
        for (int n = 0; n < pairs; n++) {
            simulation.pair(sides[0], sides[1], clicks);
            for (int side = 0; side < 2; side++) {
                if (clicks[side] != null) {
                    click(side, clicks[side], bin);
                }
            }
        }
    }

    private void click(int side, Click click, int bin) {
        photons[2 * side + click.port]++;
        double time = (bin + (click.longPath ? 1 : 0)) * separation + click.time;
        int slot = (int) Math.rint(time / separation);
        if (slot >= 0 && slot < SLOTS && Math.abs(time - slot * separation) < window / 2.0) {
            clicked[side] |= 1 << (SLOTS * click.port + slot);
        }
    }

    private void tally() {
        for (int i = 0; i < 6; i++) {
            boolean alice = (clicked[0] >> i & 1) == 1;
            single[i] += alice ? 1 : 0;
            single[6 + i] += clicked[1] >> i & 1;
            for (int k = 0; alice && k < 6; k++) {
                both[i][k] += clicked[1] >> k & 1;
            }
        }
    }

    double cycles() {
        return cycles;
    }

    double photons(int side, int port) {
        return photons[2 * side + port];
    }

    double singles(int side, int port, int slot) {
        return single[6 * side + SLOTS * port + slot];
    }

    double pairs(int portA, int slotA, int portB, int slotB) {
        return both[SLOTS * portA + slotA][SLOTS * portB + slotB];
    }

    double sidePairs() {
        double sum = 0.0;
        for (int ports = 0; ports < 4; ports++) {
            for (int slot = 0; slot < 2; slot++) {
                sum += pairs(ports / 2, slot, ports % 2, slot + 1) + pairs(ports / 2, slot + 1, ports % 2, slot);
            }
        }
        return sum;
    }
}

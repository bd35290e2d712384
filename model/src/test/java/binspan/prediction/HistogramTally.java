package binspan.prediction;

import binspan.prediction.PhotonSimulation.Click;
import binspan.prediction.PhotonSimulation.Side;
import java.util.function.IntSupplier;

/** Clicks of a pulse pair in bins of their time about the centre of the central slot, and bob's in the cycles in which alice clicks in her central window. */
final class HistogramTally {
    private final PhotonSimulation simulation;
    private final Side[] sides;
    private final double separation;
    private final double window;
    private final double start;
    private final double width;
    private final double[][] single;
    private final double[][] given;
    private final double[] bobTimes = new double[64];
    private final int[] bobPorts = new int[64];
    private final Click[] clicks = {null, null, new Click(), new Click()};
    private int bobs;
    private int alicePorts;

    HistogramTally(PhotonSimulation simulation, Side[] sides, double[] separationAndWindow, double[] bins, int count) {
        this.simulation = simulation;
        this.sides = sides;
        this.separation = separationAndWindow[0];
        this.window = separationAndWindow[1];
        this.start = bins[0];
        this.width = bins[1];
        this.single = new double[4][count];
        this.given = new double[4][count];
    }

    void run(int cycles, IntSupplier early, IntSupplier late) {
        double span = width * single[0].length;
        double dark = sides[0].darkPerSecond() * span;
        for (int cycle = 0; cycle < cycles; cycle++) {
            bobs = 0;
            alicePorts = 0;
            born(early.getAsInt(), -separation);
            born(late.getAsInt(), 0.0);
            for (int n = simulation.poisson(4.0 * dark); n > 0; n--) {
                int where = (int) (4.0 * simulation.uniform());
                click(where / 2, where % 2, start + simulation.uniform() * span);
            }
            for (int i = 0; alicePorts != 0 && i < bobs; i++) {
                for (int a = 0; a < 2; a++) {
                    add(given[2 * a + bobPorts[i]], bobTimes[i], alicePorts >> a & 1);
                }
            }
        }
    }

    private void born(int pairs, double at) {
        for (int n = 0; n < pairs; n++) {
            simulation.pair(sides[0], sides[1], clicks);
            for (int side = 0; side < 2; side++) {
                Click click = clicks[side];
                if (click != null) {
                    click(side, click.port, at + (click.longPath ? separation : 0.0) + click.time);
                }
            }
        }
    }

    private void click(int side, int port, double time) {
        add(single[2 * side + port], time, 1.0);
        if (side == 0) {
            alicePorts |= Math.abs(time) < window / 2.0 ? 1 << port : 0;
        } else {
            bobTimes[bobs] = time;
            bobPorts[bobs++] = port;
        }
    }

    private void add(double[] counts, double time, double weight) {
        double bin = Math.floor((time - start) / width);
        if (bin >= 0.0 && bin < counts.length) {
            counts[(int) bin] += weight;
        }
    }

    /** Clicks of a port of a side, 0 for alice. */
    double[] singles(int side, int port) {
        return single[2 * side + port];
    }

    /** Bob's clicks at a port in the cycles in which alice's port clicked inside her central window. */
    double[] pairs(int portA, int portB) {
        return given[2 * portA + portB];
    }
}

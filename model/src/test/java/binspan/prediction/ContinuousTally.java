package binspan.prediction;

import binspan.prediction.PhotonSimulation.Click;
import binspan.prediction.PhotonSimulation.Side;
import java.util.Arrays;

/** Click times of a continuous pump. */
final class ContinuousTally {
    private final PhotonSimulation simulation;
    private final Side[] sides;
    private final double imbalance;
    private final double window;
    private final double[][] times = new double[4][];
    private final int[] count = new int[4];

    ContinuousTally(PhotonSimulation simulation, Side[] sides, double imbalance, double window) {
        this.simulation = simulation;
        this.sides = sides;
        this.imbalance = imbalance;
        this.window = window;
    }

    void run(double seconds, double bornPerSecond) {
        for (int i = 0; i < 4; i++) {
            times[i] = new double[(int) (seconds * (bornPerSecond + 2.0 * sides[0].darkPerSecond())) + 1000];
        }
        Click[] clicks = {null, null, new Click(), new Click()};
        for (double time = simulation.wait(bornPerSecond); time < seconds; time += simulation.wait(bornPerSecond)) {
            simulation.pair(sides[0], sides[1], clicks);
            for (int side = 0; side < 2; side++) {
                Click click = clicks[side];
                if (click != null) {
                    add(2 * side + click.port, time + (click.longPath ? imbalance : 0.0) + click.time);
                }
            }
        }
        for (int i = 0; i < 4; i++) {
            for (double time = simulation.wait(sides[0].darkPerSecond());
                    time < seconds;
                    time += simulation.wait(sides[0].darkPerSecond())) {
                add(i, time);
            }
            times[i] = Arrays.copyOf(times[i], count[i]);
            Arrays.sort(times[i]);
        }
    }

    /** Numbers of time differences t_A - t_B of two ports in bins of equal width. */
    double[] differences(int portA, int portB, double start, double width, int bins) {
        double[] counts = new double[bins];
        int first = 0;
        for (double alice : times[portA]) {
            double latest = alice - start;
            double earliest = latest - bins * width;
            while (first < times[2 + portB].length && times[2 + portB][first] <= earliest) {
                first++;
            }
            for (int k = first; k < times[2 + portB].length && times[2 + portB][k] <= latest; k++) {
                int bin = (int) ((alice - times[2 + portB][k] - start) / width);
                counts[Math.min(bins - 1, bin)]++;
            }
        }
        return counts;
    }

    /** Drops the clicks that come while their detector is dead. */
    void deaden(double deadTime) {
        for (int i = 0; i < 4; i++) {
            int kept = 0;
            double ready = 0.0;
            for (double time : times[i]) {
                if (time >= ready) {
                    times[i][kept++] = time;
                    ready = time + deadTime;
                }
            }
            times[i] = Arrays.copyOf(times[i], kept);
            count[i] = kept;
        }
    }

    private void add(int detector, double time) {
        times[detector][count[detector]++] = time;
    }

    double singles(int side, int port) {
        return count[2 * side + port];
    }

    /** Pairs of clicks whose difference lies in the window about the given one. */
    double pairs(int portA, int portB, double difference) {
        double[] alice = times[portA];
        double[] bob = times[2 + portB];
        double sum = 0.0;
        int from = 0;
        int to = 0;
        for (double time : alice) {
            double centre = time - difference;
            while (from < bob.length && bob[from] <= centre - window / 2.0) {
                from++;
            }
            while (to < bob.length && bob[to] < centre + window / 2.0) {
                to++;
            }
            sum += to - from;
        }
        return sum;
    }
}

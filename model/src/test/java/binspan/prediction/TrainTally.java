package binspan.prediction;

import binspan.prediction.PhotonSimulation.Click;
import binspan.prediction.PhotonSimulation.Side;

/** Clicks in the windows of an endless train. */
final class TrainTally {
    private final PhotonSimulation simulation;
    private final Side[] sides;
    private final double period;
    private final double window;
    private byte[][] clicked;

    TrainTally(PhotonSimulation simulation, Side[] sides, double period, double window) {
        this.simulation = simulation;
        this.sides = sides;
        this.period = period;
        this.window = window;
    }

    void run(int pulses, double born) {
        clicked = new byte[2][pulses];
        Click[] clicks = {null, null, new Click(), new Click()};
        double dark = sides[0].darkPerSecond() * window * 4.0;
        for (int pulse = 0; pulse < pulses; pulse++) {
            for (int n = simulation.poisson(born); n > 0; n--) {
                simulation.pair(sides[0], sides[1], clicks);
                for (int side = 0; side < 2; side++) {
                    if (clicks[side] != null) {
                        click(side, clicks[side], pulse);
                    }
                }
            }
            for (int n = simulation.poisson(dark); n > 0; n--) {
                int where = (int) (4.0 * simulation.uniform());
                clicked[where / 2][pulse] |= (byte) (1 << (where % 2));
            }
        }
    }

    /** Time counts from the pulse, so that no digit is lost in a long train. */
    private void click(int side, Click click, int pulse) {
        double time = (click.longPath ? period : 0.0) + click.time;
        int slots = (int) Math.rint(time / period);
        int slot = Math.floorMod(pulse + slots, clicked[side].length);
        if (Math.abs(time - slots * period) < window / 2.0) {
            clicked[side][slot] |= (byte) (1 << click.port);
        }
    }

    double pulses() {
        return clicked[0].length;
    }

    double pairs(int portA, int portB, int apart) {
        double sum = 0.0;
        for (int slot = 0; slot < clicked[0].length; slot++) {
            int other = Math.floorMod(slot + apart, clicked[1].length);
            sum += (clicked[0][slot] >> portA) & (clicked[1][other] >> portB) & 1;
        }
        return sum;
    }
}

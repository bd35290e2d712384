package binspan.optics;

/**
 * Captured shares of photons and pairs by how many slots away from the window they belong.
 *
 * <p>A photon of slot j seen by the window of slot a has the offset j - a; slots whose tails do not reach the window are left at 0.
 */
public final class SlotCaptures {
    private final CaptureInputs inputs;
    private final JointCapture light;
    private final int reach;
    private final double[][] singlesA;
    private final double[][] singlesB;
    private final PairCaptures[] joint;

    SlotCaptures(
            CaptureInputs inputs,
            JointCapture light,
            int reach,
            double[][] singlesA,
            double[][] singlesB,
            PairCaptures[] joint) {
        this.inputs = inputs;
        this.light = light;
        this.reach = reach;
        this.singlesA = singlesA;
        this.singlesB = singlesB;
        this.joint = joint;
    }

    /** What they were computed from. */
    public CaptureInputs inputs() {
        return inputs;
    }

    /** How the light spreads, whatever windows look at it. */
    JointCapture light() {
        return light;
    }

    /** Largest offset kept, in slots. */
    public int reach() {
        return reach;
    }

    /** Spread of the light. */
    public ArrivalTime arrival() {
        return light.arrival();
    }

    /** Captured share of alice's photons. */
    public double alice(int port, int offset) {
        return Math.abs(offset) > reach ? 0.0 : singlesA[port][offset + reach];
    }

    /** Captured share of bob's photons. */
    public double bob(int port, int offset) {
        return Math.abs(offset) > reach ? 0.0 : singlesB[port][offset + reach];
    }

    /** Captured shares of the pairs of two ports. */
    public PairCaptures pairs(int portA, int portB) {
        return joint[portA * singlesB.length + portB];
    }
}

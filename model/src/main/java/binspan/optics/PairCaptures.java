package binspan.optics;

/** Captured shares of the pairs of one port pair by how many slots each photon lies off its window. */
public final class PairCaptures {
    private final int reach;
    private final int side;
    private final double[] captures;

    PairCaptures(int reach, double[] captures) {
        this.reach = reach;
        this.side = 2 * reach + 1;
        this.captures = captures;
    }

    /** Largest offset kept, in slots; no farther one may be asked for. */
    public int reach() {
        return reach;
    }

    /** Captured share of the pairs whose photons lie the given slots off alice's and bob's windows. */
    public double at(int offsetA, int offsetB) {
        return captures[(offsetA + reach) * side + offsetB + reach];
    }

    /** Captured share of pairs whose offsets differ by the given number of slots, summed over an endless train. */
    public double apart(int difference) {
        double sum = 0.0;
        int first = Math.max(-reach, -reach - difference);
        int last = Math.min(reach, reach - difference);
        for (int offset = first; offset <= last; offset++) {
            sum += at(offset, offset + difference);
        }
        return sum;
    }
}

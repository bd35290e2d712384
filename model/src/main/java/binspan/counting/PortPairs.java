package binspan.counting;

/** Coincidences of all ports of alice with all ports of bob in one pair of windows. */
public final class PortPairs {
    private final PortPair[][] pairs;

    /** Wraps the pairs, [alice's port][bob's port]; the array is not copied and must not be changed. */
    PortPairs(PortPair[][] pairs) {
        this.pairs = pairs;
    }

    /** One pair of ports, 0 for port 1 and 1 for port 2. */
    public PortPair of(int portA, int portB) {
        return pairs[portA][portB];
    }

    /** Number of alice's ports. */
    public int portsA() {
        return pairs.length;
    }

    /** Number of bob's ports. */
    public int portsB() {
        return pairs[0].length;
    }

    /** Coincidences of all port pairs at a cosine of the phase, 1/s. */
    public double sum(double cosine) {
        double sum = 0.0;
        for (PortPair[] row : pairs) {
            for (PortPair pair : row) {
                sum += pair.atCosine(cosine);
            }
        }
        return sum;
    }

    /** Coincidences of equal ports less those of unequal ports at a cosine of the phase, 1/s. */
    public double equalLessUnequal(double cosine) {
        double difference = 0.0;
        for (int a = 0; a < pairs.length; a++) {
            for (int b = 0; b < pairs[a].length; b++) {
                double rate = pairs[a][b].atCosine(cosine);
                difference += a == b ? rate : -rate;
            }
        }
        return difference;
    }
}

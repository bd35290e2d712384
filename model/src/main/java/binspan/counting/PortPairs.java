package binspan.counting;

/** Coincidences of all ports of alice with all ports of bob in one pair of windows. */
public final class PortPairs {
    private final PortPair[] pairs;
    private final int portsB;
    private final boolean balanced;
    private final double mean;

    /**
     * Wraps the pairs.
     *
     * @param pairs alice's first port with each of bob's, then her second; the array is not copied and must not be changed
     * @param portsB number of bob's ports
     */
    @SuppressWarnings("ReferenceEquality") // pairs known to be alike are the same object
    PortPairs(PortPair[] pairs, int portsB) {
        this.pairs = pairs;
        this.portsB = portsB;
        this.balanced = pairs.length == 4 && pairs[0] == pairs[3] && pairs[1] == pairs[2];
        this.mean = balanced ? 4.0 * pairs[0].atCosine(0.0) : at(0.0).sum();
    }

    /** One pair of ports, 0 for port 1 and 1 for port 2. */
    public PortPair of(int portA, int portB) {
        return pairs[portA * portsB + portB];
    }

    /** Number of alice's ports. */
    public int portsA() {
        return pairs.length / portsB;
    }

    /** Number of bob's ports. */
    public int portsB() {
        return portsB;
    }

    /** Coincidences of all port pairs half-way between best and worst phase, 1/s. */
    public double mean() {
        return mean;
    }

    /** Coincidences at a cosine of the phase. */
    public PortRates at(double cosine) {
        if (balanced) {
            return new PortRates(2.0 * pairs[0].atCosine(cosine), 2.0 * pairs[1].atCosine(cosine));
        }
        double equal = 0.0;
        double unequal = 0.0;
        for (int i = 0; i < pairs.length; i++) {
            double rate = pairs[i].atCosine(cosine);
            if (i / portsB == i % portsB) {
                equal += rate;
            } else {
                unequal += rate;
            }
        }
        return new PortRates(equal, unequal);
    }

    /** Coincidences of all port pairs at a cosine of the phase, 1/s. */
    public double sum(double cosine) {
        return at(cosine).sum();
    }

    /** Coincidences of equal ports less those of unequal ports at a cosine of the phase, 1/s. */
    public double equalLessUnequal(double cosine) {
        return at(cosine).difference();
    }
}

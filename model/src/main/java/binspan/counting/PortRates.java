package binspan.counting;

/**
 * Coincidences of all port pairs at one phase, 1/s.
 *
 * @param equal of ports (1,1) and (2,2)
 * @param unequal of ports (1,2) and (2,1)
 */
public record PortRates(double equal, double unequal) {
    /** All together. */
    public double sum() {
        return equal + unequal;
    }

    /** Equal ports less unequal ones. */
    public double difference() {
        return equal - unequal;
    }
}

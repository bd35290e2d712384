package binspan.optics;

/** Captured shares of photons of one slot in the bins of a histogram; a bin captures what a window of its own would. */
public final class BinnedCaptures {
    private static final double REACH = 9.0;
    private static final double TAIL_TIMES = 40.0;

    private BinnedCaptures() {}

    /**
     * An arm's singles.
     *
     * @param light spread of the light and timing of the ports
     * @param alice whether alice's photons are meant, else bob's
     * @param port output port, from 0
     * @param bins bins about the photons' mean arrival
     * @return the share in each bin
     */
    public static double[] singles(SlotCaptures light, boolean alice, int port, TimeBins bins) {
        CaptureInputs in = light.inputs();
        PairSpectrum spectrum = in.spectrum();
        PortTiming timing = (alice ? in.portsA() : in.portsB()).get(port);
        Passband filters = alice ? spectrum.alice() : spectrum.bob();
        double beta = alice ? in.betaA() : in.betaB();
        if (!filters.gaussian()) {
            return BoxedCapture.singles(filters, spectrum.inversePump(), beta, timing, bins);
        }
        double variance = alice ? light.arrival().singlesA() : light.arrival().singlesB();
        double sigma = Math.sqrt(variance + timing.variance());
        return each(bins, sigma, timing, (from, to) -> timing.capture(from, to, sigma));
    }

    /**
     * Bob's photons of pairs whose other photon alice's window captures.
     *
     * @param light spread of the light and timing of the ports
     * @param portA alice's port, from 0
     * @param portB bob's port, from 0
     * @param windowA alice's window about her photon's mean arrival
     * @param binsB bins about bob's photon's mean arrival
     * @return the share of all pairs in each bin
     */
    public static double[] bob(SlotCaptures light, int portA, int portB, Window windowA, TimeBins binsB) {
        PortTiming a = light.inputs().portsA().get(portA);
        PortTiming b = light.inputs().portsB().get(portB);
        return light.light().binned(a, b, windowA, binsB);
    }

    /**
     * Time differences t_A - t_B of pairs of a continuous pump.
     *
     * @param spectrum joint spectrum
     * @param betaSum beta_A + beta_B, s^2
     * @param a alice's port
     * @param b bob's port
     * @param bins bins about the mean difference
     * @return the share of the pairs in each bin
     */
    public static double[] difference(
            PairSpectrum spectrum, double betaSum, PortTiming a, PortTiming b, TimeBins bins) {
        double[] shares = new double[bins.count()];
        for (int i = 0; i < shares.length; i++) {
            shares[i] = DifferenceCapture.of(spectrum, betaSum, a, b, bins.bin(i));
        }
        return shares;
    }

    /** Captured share between two times. */
    interface Captured {
        double between(double from, double to);
    }

    /** The share of each bin within reach. */
    static double[] each(TimeBins bins, double sigma, PortTiming port, Captured captured) {
        double[] shares = new double[bins.count()];
        double latest = REACH * sigma + TAIL_TIMES * port.tailTime();
        for (int i = 0; i < shares.length; i++) {
            double from = bins.edge(i);
            double to = bins.edge(i + 1);
            if (to > -REACH * sigma && from < latest) {
                shares[i] = captured.between(from, to);
            }
        }
        return shares;
    }
}

package binspan.optics;

/**
 * Photons of many mean arrivals blurred alike into bins. Each is laid down on a grid by the cubic through four points, the transpose of the interpolation
 * in {@link CaptureTable} and as exact; the grid divides the bins, so that one table of captures serves all of them.
 */
final class ArrivalDeposit {
    private static final double POINTS_PER_SIGMA = 24.0;
    private static final int MOST_NODES = 400_000;
    private static final int MARGIN = 2;
    private static final double REACH = 9.0;
    private static final double TAIL_TIMES = 40.0;

    private final PortTiming port;
    private final double sigma;
    private final TimeBins bins;
    private final int perBin;
    private final double step;
    private final int first;
    private final double[] weights;

    /**
     * An empty grid.
     *
     * @param port port whose clicks are binned
     * @param sigma rms of the Gaussian blur, its jitter included, above 0, s
     * @param bins the bins
     * @param earliest no mean arrival comes earlier, s
     * @param latest none comes later, s
     */
    ArrivalDeposit(PortTiming port, double sigma, TimeBins bins, double earliest, double latest) {
        this.port = port;
        this.sigma = sigma;
        this.bins = bins;
        double wanted = Math.ceil(POINTS_PER_SIGMA * bins.width() / sigma);
        double most = Math.floor(MOST_NODES * bins.width() / Math.max(latest - earliest, bins.width()));
        this.perBin = (int) Math.max(1.0, Math.min(wanted, most));
        this.step = bins.width() / perBin;
        this.first = (int) Math.floor((earliest - bins.start()) / step) - MARGIN;
        this.weights = new double[(int) Math.ceil((latest - earliest) / step) + 2 * MARGIN + 2];
    }

    /** Adds photons. */
    void put(double arrival, double weight) {
        double position = (arrival - bins.start()) / step - first;
        int i = (int) position;
        double x = position - i;
        weights[i - 1] -= weight * x * (1.0 - x) * (2.0 - x) / 6.0;
        weights[i] += weight * (1.0 - x * x) * (2.0 - x) / 2.0;
        weights[i + 1] += weight * x * (1.0 + x) * (2.0 - x) / 2.0;
        weights[i + 2] -= weight * x * (1.0 - x) * (1.0 + x) / 6.0;
    }

    /** The weight that clicks in each bin. */
    double[] binned() {
        int ends = bins.count() * perBin - first;
        int lowest = (int) Math.max(-(double) (first + weights.length), -REACH * sigma / step - perBin);
        int highest = (int) Math.min(ends, (REACH * sigma + TAIL_TIMES * port.tailTime()) / step);
        double[] shares = new double[bins.count()];
        if (highest < lowest) {
            return shares;
        }
        double[] captures = new double[highest - lowest + 1];
        for (int i = 0; i < captures.length; i++) {
            captures[i] = port.capture((lowest + i) * step, (lowest + i + perBin) * step, sigma);
        }
        for (int i = 0; i < weights.length; i++) {
            if (weights[i] != 0.0) {
                add(shares, captures, lowest, first + i, weights[i]);
            }
        }
        return shares;
    }

    /** Adds what one node sends into each bin: bin k starts k perBin - node steps after it. */
    private void add(double[] shares, double[] captures, int lowest, int node, double weight) {
        int from = Math.max(0, Math.floorDiv(lowest + node + perBin - 1, perBin));
        int to = Math.min(shares.length - 1, Math.floorDiv(lowest + captures.length - 1 + node, perBin));
        for (int k = from; k <= to; k++) {
            shares[k] += weight * captures[k * perBin - node - lowest];
        }
    }
}

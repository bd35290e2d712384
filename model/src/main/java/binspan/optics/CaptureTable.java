package binspan.optics;

/**
 * Captured share of one window against how late a photon is, tabulated for the many evaluations of a spectral average and interpolated by cubics
 * through four points; off by less than 1e-6.
 */
final class CaptureTable {
    private static final double POINTS_PER_SIGMA = 24.0;
    private static final int MOST_POINTS = 20_000;
    private static final int MARGIN = 2;

    private final double start;
    private final double step;
    private final double[] values;

    private CaptureTable(double start, double step, double[] values) {
        this.start = start;
        this.step = step;
        this.values = values;
    }

    /**
     * Tabulates a window.
     *
     * @param port output port
     * @param window window about the arrival of a photon that is not late, s
     * @param sigma rms of the arrival, s
     * @param latest the table covers photons up to this early and this late, s
     */
    static CaptureTable of(PortTiming port, Window window, double sigma, double latest) {
        double finest = 2.0 * latest / MOST_POINTS;
        double step = Math.max(finest, sigma / POINTS_PER_SIGMA);
        double start = -latest - MARGIN * step;
        double[] values = new double[(int) Math.ceil(2.0 * latest / step) + 2 * MARGIN + 2];
        for (int i = 0; i < values.length; i++) {
            double late = start + i * step;
            values[i] = port.capture(window.from() - late, window.to() - late, sigma);
        }
        return new CaptureTable(start, step, values);
    }

    /** Captured share of photons that are late by the given time, s. */
    double at(double late) {
        double position = (late - start) / step;
        int i = (int) position;
        double x = position - i;
        double before = values[i - 1];
        double left = values[i];
        double right = values[i + 1];
        double after = values[i + 2];
        return left * (1.0 - x * x) * (2.0 - x) / 2.0
                + right * x * (1.0 + x) * (2.0 - x) / 2.0
                - before * x * (1.0 - x) * (2.0 - x) / 6.0
                - after * x * (1.0 - x) * (1.0 + x) / 6.0;
    }
}

package binspan.planner.report;

/**
 * The drifting quantities of a headroom table in the words of the trade, by the last field of their scenario path.
 *
 * <p>The usual size of each (common practice) only orders quantities that are planned at 0 among the others.
 */
public enum DriftWords {
    LENGTH("lengthKm", "fibre length, both arms", 50.0),
    CABLE_TEMPERATURE("cableTemperatureStepK", "cable temperature step", 1.0),
    WINDOW("windowWidthPs", "window width", 400.0),
    MEAN_PAIRS("meanPairsPerCycle", "mean pairs per cycle", 0.02),
    PAIR_RATE("pairRatePerSecond", "pair rate", 4e6),
    PUMP_DRIFT("frequencyDriftRmsMHz", "pump frequency drift, rms", 10.0),
    MISMATCH("mismatchPs", "imbalance mismatch", 0.5),
    PHASE_NOISE("phaseNoiseRmsRad", "phase noise, rms", 0.05),
    EXTRA_LOSS("repairMarginDb", "extra loss", 1.0),
    DELAY_ERROR("delayErrorPs", "delay error", 50.0),
    CLOCK_JITTER("clockJitterRmsPs", "clock jitter, rms", 10.0),
    ANALYZER_TEMPERATURE("temperatureRmsMilliK", "analyzer temperature, rms", 10.0),
    DETECTOR_JITTER("jitterFwhmPs", "detector jitter, FWHM", 60.0),
    GATE_DARK("darkProbability", "dark clicks of a gate", 2e-5),
    DARK("darkCountsPerSecond", "dark counts", 100.0);

    private final String field;
    private final String words;
    private final double usual;

    DriftWords(String field, String words, double usual) {
        this.field = field;
        this.words = words;
        this.usual = usual;
    }

    /** The quantity of a path in words, with its site or port. */
    public static String of(String path) {
        DriftWords known = find(path);
        return known == null ? path : place(path) + known.words;
    }

    /** Room as a share of the planned value, or of the usual size where 0 is planned. */
    public static double relativeRoom(String path, double planned, double limit) {
        DriftWords known = find(path);
        double size = planned != 0.0 ? Math.abs(planned) : known == null ? 1.0 : known.usual;
        return Math.abs(limit - planned) / size;
    }

    private static DriftWords find(String path) {
        String last = path.substring(path.lastIndexOf('.') + 1);
        for (DriftWords known : values()) {
            if (known.field.equals(last)) {
                return known;
            }
        }
        return null;
    }

    private static String place(String path) {
        if (path.startsWith("source.pump.mismatch") || path.startsWith("source.pump.phaseNoise")) {
            return "pump ";
        }
        boolean site = path.startsWith("alice.") || path.startsWith("bob.");
        String name = site ? path.substring(0, path.indexOf('.')) + " " : "";
        boolean analyzer = path.contains(".analyzer.m") || path.contains(".analyzer.p");
        int port = path.indexOf('[');
        String number = port < 0 ? "" : "port " + (path.charAt(port + 1) - '0' + 1) + " ";
        return name + (analyzer ? "analyzer " : "") + number;
    }
}

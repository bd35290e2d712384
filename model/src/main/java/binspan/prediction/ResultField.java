package binspan.prediction;

/**
 * One figure of a prediction under its published name, as JSON results, tables and studies call it.
 *
 * @param name dotted name
 * @param unit unit, empty for a bare number
 * @param perPort whether it has a value for each detected port of its arm
 * @param stage what it depends on
 * @param reading how it is read; the port is 0 where there is only one value
 */
public record ResultField(String name, String unit, boolean perPort, Stage stage, Reading reading) {
    /** What a figure depends on, each stage on those before it. */
    public enum Stage {
        /** The light before it is counted: the same as long as the prediction's optics are the same object. */
        OPTICS,
        /** The counts. */
        COUNTS,
        /** The finite key, which takes longer than the rest together. */
        FINITE_KEY
    }

    /** Reads a figure; NaN or infinite where it does not apply. */
    @FunctionalInterface
    public interface Reading {
        /**
         * The figure.
         *
         * @param prediction the prediction
         * @param finite its finite key; may be null for a figure that needs none
         * @param port 0 for port 1
         */
        double at(LinkPrediction prediction, FiniteKeyOutlook finite, int port);
    }

    /** The figure of a check. */
    public double of(LinkCheck check, int port) {
        return reading.at(check.prediction(), check.finite(), port);
    }

    /** Number of values in a prediction. */
    public int count(LinkPrediction prediction) {
        if (!perPort) {
            return 1;
        }
        return (name.startsWith("alice")
                        ? prediction.counts().loadsA()
                        : prediction.counts().loadsB())
                .size();
    }
}

package binspan.prediction;

/**
 * One figure of a check under its published name, as JSON results, tables and studies call it.
 *
 * @param name dotted name
 * @param unit unit, empty for a bare number
 * @param perPort whether it has a value for each detected port of its arm
 * @param reading how it is read; the port is 0 where there is only one value
 */
public record ResultField(String name, String unit, boolean perPort, Reading reading) {
    /** Reads a figure; NaN or infinite where it does not apply. */
    @FunctionalInterface
    public interface Reading {
        /** The figure of a check. */
        double at(LinkCheck check, int port);
    }

    /** Number of values in a check. */
    public int count(LinkCheck check) {
        if (!perPort) {
            return 1;
        }
        return (name.startsWith("alice")
                        ? check.prediction().counts().loadsA()
                        : check.prediction().counts().loadsB())
                .size();
    }
}

package binspan.units;

/** Argument checks of the public methods; written so that NaN fails every one of them. */
public final class Require {
    private Require() {}

    /**
     * Checks a closed interval.
     *
     * @param name argument name for the message
     * @param value value found
     * @param lowest smallest allowed value
     * @param highest largest allowed value
     * @return the value
     * @throws IllegalArgumentException if the value lies outside or is NaN
     */
    public static double within(String name, double value, double lowest, double highest) {
        if (value >= lowest && value <= highest) {
            return value;
        }
        throw new IllegalArgumentException(name + " must be " + lowest + " to " + highest + ", found " + value);
    }

    /**
     * Checks a value above zero, infinity allowed.
     *
     * @param name argument name for the message
     * @param value value found
     * @return the value
     * @throws IllegalArgumentException if the value is zero, negative or NaN
     */
    public static double positive(String name, double value) {
        if (value > 0.0) {
            return value;
        }
        throw new IllegalArgumentException(name + " must be above 0, found " + value);
    }
}

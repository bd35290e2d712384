package binspan.planner.plot;

/**
 * The whole range of a quantity with the part that is allowed.
 *
 * @param quantity name and unit; its ends, both stated, are the whole range
 * @param box the part that is allowed
 * @param planned value marked in it, NaN for none
 */
public record RangeBar(Axis quantity, Interval box, double planned) {
    /** Checks that the whole range is stated. */
    public RangeBar {
        if (Double.isNaN(quantity.lowest()) || Double.isNaN(quantity.highest())) {
            throw new IllegalArgumentException(quantity.name() + ": a range bar needs both ends");
        }
    }
}

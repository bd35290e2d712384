package binspan.study.region;

/**
 * A point of a map as shares of the way along both axes.
 *
 * @param u share along the first axis
 * @param v share along the second axis
 */
record Spot(double u, double v) {
    /** How far this lies to the left of a line from one spot to another, times the line's length; negative to the right. */
    public double leftOf(Spot from, Spot to) {
        return (to.u - from.u) * (v - from.v) - (to.v - from.v) * (u - from.u);
    }
}

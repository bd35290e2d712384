package binspan.study.region;

/**
 * A straight piece of a line with a direction: what holds lies to its left.
 *
 * @param from where it begins
 * @param to where it ends
 */
record Stretch(Spot from, Spot to) {
    /** The same piece the other way. */
    Stretch reversed() {
        return new Stretch(to, from);
    }
}

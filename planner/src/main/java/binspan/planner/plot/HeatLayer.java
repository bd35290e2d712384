package binspan.planner.plot;

/**
 * What the colours of a map show.
 *
 * @param z quantity, unit and kind of the colour bar
 * @param values the quantity
 * @param blank what it means where a value is missing or cannot be shown, for example {@code no key}
 */
public record HeatLayer(Axis z, Lattice values, String blank) {}

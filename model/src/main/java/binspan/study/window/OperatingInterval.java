package binspan.study.window;

/**
 * An interval in which all requirements hold.
 *
 * @param from lower end
 * @param to upper end
 * @param best the point inside at which the least margin is largest
 */
public record OperatingInterval(WindowEnd from, WindowEnd to, PointVerdict best) {
    /** Its width in the parameter's unit. */
    public double width() {
        return to.value() - from.value();
    }
}

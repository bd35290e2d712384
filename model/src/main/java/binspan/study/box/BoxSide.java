package binspan.study.box;

import binspan.study.Axis;
import binspan.study.window.WindowEnd;

/**
 * One side of a box.
 *
 * @param axis the parameter and its range
 * @param from lower end, with the requirement that fails just beyond it; none where the range ends or where the end is tied to another side's
 * @param to upper end
 */
public record BoxSide(Axis axis, WindowEnd from, WindowEnd to) {
    /** The middle in the axis' own scale. */
    public double centre() {
        return axis.at((axis.share(from.value()) + axis.share(to.value())) / 2.0);
    }

    /** The length as a share of the axis, in its own scale. */
    public double share() {
        return axis.share(to.value()) - axis.share(from.value());
    }

    /** Half of the length over the arithmetic middle: the relative tolerance about it. */
    public double tolerance() {
        return (to.value() - from.value()) / Math.abs(to.value() + from.value());
    }
}

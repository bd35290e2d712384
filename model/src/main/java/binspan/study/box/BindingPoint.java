package binspan.study.box;

import binspan.study.window.PointVerdict;
import java.util.List;

/**
 * The point of a box that meets the requirements most narrowly.
 *
 * @param positions where it lies along each side
 * @param verdict the point with its requirements; {@link PointVerdict#tightest()} is the one that binds
 */
public record BindingPoint(List<Position> positions, PointVerdict verdict) {
    /** A place along a side. */
    public enum Position {
        /** Its lower end. */
        LOW,
        /** Between the ends. */
        INSIDE,
        /** Its upper end. */
        HIGH
    }

    /** Copies the list. */
    public BindingPoint {
        positions = List.copyOf(positions);
    }

    /** Whether it is a corner of the box. */
    public boolean corner() {
        return !positions.contains(Position.INSIDE);
    }
}

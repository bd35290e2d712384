package binspan.planner.viewmodel;

import binspan.study.window.PointVerdict;

/**
 * What the link does at a point of the map.
 *
 * @param kind what the point is
 * @param verdict its values and all requirements there
 */
public record MapReading(Kind kind, PointVerdict verdict) {
    /** Which point is read. */
    public enum Kind {
        /** The design as it is. */
        PRESENT,
        /** The point that was clicked. */
        PICKED,
        /** The point under the pointer. */
        UNDER_POINTER
    }

    /** Along the horizontal axis, in its unit. */
    public double x() {
        return verdict.values().get(0);
    }

    /** Along the vertical axis. */
    public double y() {
        return verdict.values().get(1);
    }
}

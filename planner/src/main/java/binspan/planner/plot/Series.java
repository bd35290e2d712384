package binspan.planner.plot;

import java.util.List;

/**
 * A named line. Series of one name look alike in all panels of the same curves.
 *
 * @param name its words in the legend
 * @param points its points from left to right; NaN interrupts the line
 */
public record Series(String name, List<Point> points) {
    /** Copies the points. */
    public Series {
        points = List.copyOf(points);
    }
}

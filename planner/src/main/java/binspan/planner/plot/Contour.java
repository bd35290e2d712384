package binspan.planner.plot;

import java.util.List;

/**
 * A line on a map along which something holds, for example a requirement with equality.
 *
 * @param label its words in the legend
 * @param lines its pieces, each a list of points
 */
public record Contour(String label, List<List<Point>> lines) {
    /** Copies the pieces. */
    public Contour {
        lines = lines.stream().map(List::copyOf).toList();
    }
}

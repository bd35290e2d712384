package binspan.planner.viewmodel;

import binspan.planner.plot.Point;
import binspan.prediction.Requirement;
import java.util.List;

/**
 * Where one requirement holds with equality.
 *
 * @param requirement which
 * @param required required figure
 * @param lines its pieces, none where it holds or fails on the whole map; places are shares of the way along the axes, and the requirement holds to the
 *     left of each piece with the vertical axis pointing upwards
 */
public record MapContour(Requirement requirement, double required, List<List<Point>> lines) {
    /** Copies the pieces. */
    public MapContour {
        lines = lines.stream().map(List::copyOf).toList();
    }
}

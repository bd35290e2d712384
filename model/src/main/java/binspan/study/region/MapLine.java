package binspan.study.region;

import java.util.List;

/**
 * A line on a map.
 *
 * @param points its corners in order, two or more; the first is repeated at the end if the line closes
 */
public record MapLine(List<MapPoint> points) {
    /** Copies the list. */
    public MapLine {
        points = List.copyOf(points);
    }

    /** Whether it closes. */
    public boolean closed() {
        return points.get(0).equals(points.get(points.size() - 1));
    }
}

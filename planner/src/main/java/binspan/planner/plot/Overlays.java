package binspan.planner.plot;

import java.util.List;
import java.util.Optional;

/**
 * What lies over the colours of a map.
 *
 * @param margin zero or more where all requirements are met, less or NaN elsewhere; its zero is the border
 * @param contours lines with labels
 * @param points points with labels
 * @param boxes rectangles with labels
 */
public record Overlays(
        Optional<Lattice> margin, List<Contour> contours, List<PointMark> points, List<BoxOutline> boxes) {
    /** Nothing over the colours. */
    public static final Overlays NONE = new Overlays(Optional.empty(), List.of(), List.of(), List.of());

    /** Copies the lists. */
    public Overlays {
        contours = List.copyOf(contours);
        points = List.copyOf(points);
        boxes = List.copyOf(boxes);
    }

    /** The same with another margin. */
    public Overlays withMargin(Lattice newMargin) {
        return new Overlays(Optional.of(newMargin), contours, points, boxes);
    }

    /** The same with other contours. */
    public Overlays withContours(List<Contour> newContours) {
        return new Overlays(margin, newContours, points, boxes);
    }

    /** The same with other points. */
    public Overlays withPoints(List<PointMark> newPoints) {
        return new Overlays(margin, contours, newPoints, boxes);
    }

    /** The same with other boxes. */
    public Overlays withBoxes(List<BoxOutline> newBoxes) {
        return new Overlays(margin, contours, points, newBoxes);
    }
}

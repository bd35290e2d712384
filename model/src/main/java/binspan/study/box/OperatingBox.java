package binspan.study.box;

import binspan.study.window.PointVerdict;
import java.util.List;
import java.util.Optional;

/**
 * The largest box found in which every point meets all requirements.
 *
 * @param question what was asked
 * @param sides one for each axis; none where no point that the box could contain meets all requirements
 * @param binding the point of the box that meets them most narrowly; absent without a box
 * @param pointsChecked number of points at which the box was checked, corners and middles of faces included
 * @param nearest without a box: the point with the largest least margin, or the planned one if the box is held there
 */
public record OperatingBox(
        ToleranceBox question,
        List<BoxSide> sides,
        Optional<BindingPoint> binding,
        int pointsChecked,
        Optional<PointVerdict> nearest) {
    /** Copies the list. */
    public OperatingBox {
        sides = List.copyOf(sides);
    }

    /** Whether there is a box. */
    public boolean found() {
        return !sides.isEmpty();
    }

    /** The product of the sides as shares of their axes, in the axes' own scales; 0 without a box. */
    public double volumeShare() {
        return found() ? sides.stream().mapToDouble(BoxSide::share).reduce(1.0, (a, b) -> a * b) : 0.0;
    }

    /** The least relative tolerance of all sides: with equal tolerances the common one; 0 without a box. */
    public double tolerance() {
        return sides.stream().mapToDouble(BoxSide::tolerance).min().orElse(0.0);
    }
}

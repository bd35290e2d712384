package binspan.study.region;

import binspan.prediction.Requirement;
import binspan.study.Axis;
import binspan.study.window.PointVerdict;
import java.util.List;
import java.util.Optional;

/** The region of two parameters in which all requirements hold: margins on a grid, contours, border, area. */
public final class RegionMap {
    private final OperatingRegion question;
    private final RegionGrid grid;
    private final List<RequirementContour> contours;
    private final RegionOutline outline;

    RegionMap(OperatingRegion question, RegionGrid grid, List<RequirementContour> contours, RegionOutline outline) {
        this.question = question;
        this.grid = grid;
        this.contours = List.copyOf(contours);
        this.outline = outline;
    }

    /**
     * The zero of one requirement's margin.
     *
     * @param requirement which
     * @param required required figure
     * @param lines the contour, none where the requirement holds or fails on the whole map; it holds to the left of each line in the axes' scales
     */
    public record RequirementContour(Requirement requirement, double required, List<MapLine> lines) {
        /** Copies the list. */
        public RequirementContour {
            lines = List.copyOf(lines);
        }
    }

    /** The first parameter and its columns. */
    public Axis horizontal() {
        return question.horizontal();
    }

    /** The second parameter and its rows. */
    public Axis vertical() {
        return question.vertical();
    }

    /** The margin of a requirement at a point of the grid, on the scale of {@link binspan.prediction.RequirementMargins}. */
    public double margin(int requirement, int column, int row) {
        return grid.margin(requirement, column, row);
    }

    /** The least margin at a point of the grid. */
    public double least(int column, int row) {
        return grid.least(column, row);
    }

    /** Whether all requirements hold at a point of the grid. */
    public boolean meets(int column, int row) {
        return least(column, row) >= 0.0;
    }

    /** One contour for each requirement, in their order. */
    public List<RequirementContour> contours() {
        return contours;
    }

    /** The border of the region, the frame of the map included: closed lines with the region to their left in the axes' scales. */
    public List<MapLine> border() {
        return outline.border();
    }

    /** Number of parts of the region that do not touch; 0 where nothing holds. */
    public int parts() {
        return outline.parts();
    }

    /** Its area in the unit of the first parameter times that of the second. */
    public double area() {
        return outline.area();
    }

    /** Its area as a share of the map, in the axes' own scales. */
    public double share() {
        return outline.share();
    }

    /** The point with the largest least margin: the best one of the region, or the nearest one where nothing holds. */
    public PointVerdict best() {
        return outline.best();
    }

    /** Where nothing holds: the point at which the least margin is largest. */
    public Optional<PointVerdict> nearest() {
        return outline.best().met() ? Optional.empty() : Optional.of(outline.best());
    }
}

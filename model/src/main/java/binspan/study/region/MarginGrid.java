package binspan.study.region;

import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.study.Axis;
import java.util.List;

/**
 * The margins of all requirements at the points of a map of two parameters, without contours: what {@link OperatingRegion#survey} returns. Margins are on
 * the scale of {@link RequirementMargins}, 0 or more where the requirement holds. The fit of the slots counts as one more requirement, the last, where
 * the slots fit as written.
 */
public final class MarginGrid {
    private final OperatingRegion question;
    private final RequirementMargins stated;
    private final RegionGrid grid;

    MarginGrid(OperatingRegion question, RequirementMargins stated, RegionGrid grid) {
        this.question = question;
        this.stated = stated;
        this.grid = grid;
    }

    /** The first parameter; its steps are the columns. */
    public Axis horizontal() {
        return question.horizontal();
    }

    /** The second parameter; its steps are the rows. */
    public Axis vertical() {
        return question.vertical();
    }

    /** The requirements, in the order in which {@link #margin} counts them. */
    public List<Requirement> requirements() {
        return stated.requirements();
    }

    /** The required figure of one of them, in its unit. */
    public double required(int requirement) {
        return stated.required(requirement);
    }

    /**
     * The margin of one requirement at a point.
     *
     * @param requirement its index, from 0
     * @param column step of the first parameter, from 0
     * @param row step of the second parameter, from 0
     */
    public double margin(int requirement, int column, int row) {
        return grid.margin(requirement, column, row);
    }

    /** The least margin at a point. */
    public double least(int column, int row) {
        return grid.least(column, row);
    }

    /** The index of the requirement with the least margin at a point, the first of equal ones. */
    public int tightest(int column, int row) {
        return grid.tightest(column, row);
    }

    /** Whether all requirements hold at a point. */
    public boolean meets(int column, int row) {
        return least(column, row) >= 0.0;
    }
}

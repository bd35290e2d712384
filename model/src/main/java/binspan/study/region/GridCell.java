package binspan.study.region;

import binspan.study.window.MarginFunction;
import java.util.ArrayList;
import java.util.List;

/**
 * A cell of a map. Where a requirement holds in it is bounded by straight stretches between the places at which its margin passes zero on the four
 * edges. Where there are more than two such places, the margin half-way between them says whether the parts that hold are joined.
 */
final class GridCell {
    private final RegionGrid grid;
    private final GridCrossings crossings;
    private final MarginFunction function;
    private final int i;
    private final int j;

    /**
     * A cell.
     *
     * @param i index of its lower line along the first axis
     * @param j index of its lower line along the second axis
     */
    GridCell(RegionGrid grid, GridCrossings crossings, MarginFunction function, int i, int j) {
        this.grid = grid;
        this.crossings = crossings;
        this.function = function;
        this.i = i;
        this.j = j;
    }

    /** Its corners, counter-clockwise. */
    List<Spot> corners() {
        return List.of(grid.spot(i, j), grid.spot(i + 1, j), grid.spot(i + 1, j + 1), grid.spot(i, j + 1));
    }

    /**
     * The parts of the cell in which a requirement holds: each is what lies to the left of all its stretches. None where it fails throughout, one without
     * a stretch where it holds throughout.
     */
    List<List<Stretch>> parts(int requirement) {
        List<Spot> around = around(requirement);
        boolean holds = grid.margin(requirement, i, j) >= 0.0;
        if (around.isEmpty()) {
            return holds ? List.of(List.of()) : List.of();
        }
        int entering = holds ? 1 : 0;
        if (around.size() == 2) {
            return List.of(List.of(new Stretch(around.get(1 - entering), around.get(entering))));
        }
        return function.one(requirement, mean(around).u(), mean(around).v()) >= 0.0
                ? List.of(joined(around, entering))
                : apart(around, entering);
    }

    /** Whether a requirement holds at a spot of the cell, by the stretches. */
    boolean holds(int requirement, Spot spot) {
        return parts(requirement).stream()
                .anyMatch(part -> part.stream().allMatch(each -> spot.leftOf(each.from(), each.to()) >= 0.0));
    }

    /** Where the margin passes zero, counter-clockwise from the lower corner. */
    private List<Spot> around(int requirement) {
        List<Spot> around = new ArrayList<>();
        double[] bottom = crossings.on(requirement, GridEdge.bottom(i, j));
        double[] right = crossings.on(requirement, GridEdge.right(i, j));
        double[] top = crossings.on(requirement, GridEdge.top(i, j));
        double[] left = crossings.on(requirement, GridEdge.left(i, j));
        for (double u : bottom) {
            around.add(new Spot(u, grid.v()[j]));
        }
        for (double v : right) {
            around.add(new Spot(grid.u()[i + 1], v));
        }
        for (int k = top.length - 1; k >= 0; k--) {
            around.add(new Spot(top[k], grid.v()[j + 1]));
        }
        for (int k = left.length - 1; k >= 0; k--) {
            around.add(new Spot(grid.u()[i], left[k]));
        }
        return around;
    }

    private static Spot mean(List<Spot> spots) {
        return new Spot(
                spots.stream().mapToDouble(Spot::u).average().orElseThrow(),
                spots.stream().mapToDouble(Spot::v).average().orElseThrow());
    }

    /** One part, from which the pieces beyond the stretches are cut off. */
    private static List<Stretch> joined(List<Spot> around, int entering) {
        List<Stretch> cuts = new ArrayList<>();
        for (int k = entering + 1; k < around.size() + entering; k += 2) {
            cuts.add(new Stretch(around.get(k % around.size()), around.get((k + 1) % around.size())));
        }
        return cuts;
    }

    /** One part behind each stretch. */
    private static List<List<Stretch>> apart(List<Spot> around, int entering) {
        List<List<Stretch>> parts = new ArrayList<>();
        for (int k = entering; k < around.size() + entering; k += 2) {
            parts.add(List.of(new Stretch(around.get((k + 1) % around.size()), around.get(k % around.size()))));
        }
        return parts;
    }
}

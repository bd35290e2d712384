package binspan.study;

import binspan.study.IntervalSearch.Interval;
import java.util.Arrays;
import java.util.List;

/** Where the margin of each requirement passes zero along the lines of a grid, solved. */
final class GridCrossings {
    /** A turn of a margin between two lines is followed if zero is no farther than this many times its difference to the neighbours. */
    static final double FARTHEST = 8.0;

    private static final double[] NONE = {};

    private final RegionGrid grid;
    private final double[][][] rows;
    private final double[][][] columns;

    private GridCrossings(RegionGrid grid) {
        this.grid = grid;
        this.rows = new double[grid.requirements()][(grid.u().length - 1) * grid.v().length][];
        this.columns = new double[grid.requirements()][grid.u().length * (grid.v().length - 1)][];
    }

    static GridCrossings of(OperatingRegion region, RegionGrid grid, Execution execution) {
        GridCrossings crossings = new GridCrossings(grid);
        int rows = grid.v().length;
        Workers.run(rows + grid.u().length, 1, execution, () -> {
            MarginFunction function = region.function();
            return (first, end) -> {
                for (int line = first; line < end; line++) {
                    crossings.solve(function, line < rows, line < rows ? line : line - rows, execution);
                }
            };
        });
        return crossings;
    }

    private void solve(MarginFunction function, boolean row, int line, Execution execution) {
        for (int k = 0; k < grid.requirements(); k++) {
            execution.stopIfCancelled();
            int requirement = k;
            double across = row ? grid.v()[line] : grid.u()[line];
            IntervalSearch search = new IntervalSearch(
                    place -> row ? function.one(requirement, place, across) : function.one(requirement, across, place),
                    FARTHEST);
            double[] places = row ? grid.u() : grid.v();
            double[] values = row ? grid.row(k, line) : grid.column(k, line);
            file(search.intervals(places, values), places, row ? rows[k] : columns[k], line * (places.length - 1));
        }
    }

    /** Puts the ends of the intervals to the edges on which they lie: an end at a crossing of lines to the edge that leaves the interval there. */
    private static void file(List<Interval> intervals, double[] places, double[][] edges, int start) {
        for (Interval interval : intervals) {
            if (interval.from() > 0.0) {
                int found = Arrays.binarySearch(places, interval.from());
                add(edges, start + (found >= 0 ? found - 1 : -found - 2), interval.from());
            }
            if (interval.to() < 1.0) {
                int found = Arrays.binarySearch(places, interval.to());
                add(edges, start + (found >= 0 ? found : -found - 2), interval.to());
            }
        }
    }

    private static void add(double[][] edges, int edge, double place) {
        double[] present = edges[edge] == null ? NONE : edges[edge];
        edges[edge] = Arrays.copyOf(present, present.length + 1);
        edges[edge][present.length] = place;
    }

    /** The crossings on the edge from a crossing of lines along the first axis, in rising order. */
    double[] alongU(int requirement, int i, int j) {
        double[] found = rows[requirement][j * (grid.u().length - 1) + i];
        return found == null ? NONE : found;
    }

    /** The crossings on the edge from a crossing of lines along the second axis. */
    double[] alongV(int requirement, int i, int j) {
        double[] found = columns[requirement][i * (grid.v().length - 1) + j];
        return found == null ? NONE : found;
    }
}

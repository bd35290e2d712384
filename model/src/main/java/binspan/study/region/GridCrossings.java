package binspan.study.region;

import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.window.IntervalSearch;
import binspan.study.window.IntervalSearch.Interval;
import binspan.study.window.MarginFunction;
import binspan.study.window.MarginLine;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;

/** Where the margin of each requirement passes zero along the lines of a grid, solved. */
public final class GridCrossings {
    /** A turn of a margin between two lines is followed if zero is no farther than this many times its difference to the neighbours. */
    public static final double FARTHEST = 8.0;

    private static final double[] NONE = {};

    private final RegionGrid grid;
    private final double[][][] rows;
    private final double[][][] columns;

    private GridCrossings(RegionGrid grid) {
        this.grid = grid;
        this.rows = new double[grid.requirements()][(grid.u().length - 1) * grid.v().length][];
        this.columns = new double[grid.requirements()][grid.u().length * (grid.v().length - 1)][];
    }

    /** Solves the crossings on all lines, then looks more closely where a margin enters a cell and seems not to leave it. */
    static GridCrossings of(OperatingRegion region, RegionGrid grid, Execution execution) {
        GridCrossings crossings = new GridCrossings(grid);
        int rows = grid.v().length;
        Workers.run(rows + grid.u().length, 1, execution, () -> {
            MarginFunction function = region.function();
            return (first, end) -> {
                for (int number = first; number < end; number++) {
                    boolean row = number < rows;
                    crossings.solveLine(new GridEdge(row, row ? number : number - rows, 0), function, execution);
                }
            };
        });
        new LooseEnds(grid, crossings, region.function(), execution).follow();
        return crossings;
    }

    /** Solves the line on which an edge lies. */
    private void solveLine(GridEdge edge, MarginFunction function, Execution execution) {
        double[] places = edge.row() ? grid.u() : grid.v();
        double[][] margins = edge.row() ? grid.row(edge.line()) : grid.column(edge.line());
        IntervalSearch search = new IntervalSearch(line(edge, function), FARTHEST, execution);
        List<List<Interval>> intervals = search.intervals(places, margins);
        for (int k = 0; k < intervals.size(); k++) {
            file(intervals.get(k), places, edges(k, edge.row()), edge.line() * (places.length - 1));
        }
    }

    /** The margins along the line on which an edge lies. */
    private MarginLine line(GridEdge edge, MarginFunction function) {
        double across = edge.row() ? grid.v()[edge.line()] : grid.u()[edge.line()];
        return new MarginLine(function, new double[] {across, across}, edge.row() ? 0 : 1);
    }

    /**
     * Solves one edge anew, with more samples.
     *
     * @return whether it has more crossings than were known
     */
    boolean solveEdge(GridEdge edge, int samples, MarginFunction function, Execution execution) {
        MarginLine line = line(edge, function);
        double[] places = places(edge, samples);
        double[][] margins = Arrays.stream(places).mapToObj(line::at).toArray(double[][]::new);
        List<List<Interval>> found = new IntervalSearch(line, FARTHEST, execution).intervals(places, margins);
        boolean more = false;
        for (int k = 0; k < found.size(); k++) {
            double[][] solved = new double[samples][];
            file(found.get(k), places, solved, 0);
            double[] all = Arrays.stream(solved)
                    .filter(Objects::nonNull)
                    .flatMapToDouble(Arrays::stream)
                    .toArray();
            if (all.length > on(k, edge).length) {
                edges(k, edge.row())[index(edge)] = all;
                more = true;
            }
        }
        return more;
    }

    /** Places from one end of an edge to the other. */
    private double[] places(GridEdge edge, int steps) {
        double[] lines = edge.row() ? grid.u() : grid.v();
        double first = lines[edge.step()];
        double last = lines[edge.step() + 1];
        double[] places = new double[steps + 1];
        for (int i = 0; i < steps; i++) {
            places[i] = first + (last - first) * i / steps;
        }
        places[steps] = last;
        return places;
    }

    /** Puts the ends of the intervals to the edges on which they lie: an end at a crossing of lines to the edge that leaves the interval there. */
    private static void file(List<Interval> intervals, double[] places, double[][] edges, int start) {
        for (Interval interval : intervals) {
            if (interval.from() > places[0]) {
                int found = Arrays.binarySearch(places, interval.from());
                add(edges, start + (found >= 0 ? found - 1 : -found - 2), interval.from());
            }
            if (interval.to() < places[places.length - 1]) {
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

    private double[][] edges(int requirement, boolean row) {
        return row ? rows[requirement] : columns[requirement];
    }

    private int index(GridEdge edge) {
        int steps = (edge.row() ? grid.u().length : grid.v().length) - 1;
        return edge.line() * steps + edge.step();
    }

    /** The crossings of a requirement on an edge, in rising order. */
    double[] on(int requirement, GridEdge edge) {
        double[] found = edges(requirement, edge.row())[index(edge)];
        return found == null ? NONE : found;
    }
}

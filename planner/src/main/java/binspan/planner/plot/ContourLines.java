package binspan.planner.plot;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Lines of equal value on a lattice by marching squares: straight pieces between the points of the cells' edges where the
 * value, taken as linear along each edge, passes the level. Cells with a missing corner have no line.
 */
public final class ContourLines {
    private final double[] x;
    private final double[] y;
    private final double[][] z;
    private final double level;
    private final Map<Integer, List<Integer>> links = new LinkedHashMap<>();

    private ContourLines(double[] x, double[] y, double[][] z, double level) {
        this.x = x;
        this.y = y;
        this.z = z;
        this.level = level;
    }

    /**
     * The pieces of the line where a lattice has a value. Along a logarithmic axis the value is taken as linear in its
     * logarithm.
     *
     * @param xAxis kind of the horizontal axis
     * @param yAxis kind of the vertical axis
     * @param lattice values
     * @param level the value wanted
     * @return pieces in the units of the axes; a closed one ends with its first point
     */
    public static List<List<Point>> of(Axis xAxis, Axis yAxis, Lattice lattice, double level) {
        double[] x = positions(xAxis, lattice.x());
        double[] y = positions(yAxis, lattice.y());
        return trace(x, y, lattice.values(), level).stream()
                .map(line -> line.stream()
                        .map(point -> new Point(xAxis.value(point.x()), yAxis.value(point.y())))
                        .toList())
                .toList();
    }

    /** The positions of values along an axis. */
    static double[] positions(Axis axis, double[] values) {
        double[] positions = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            positions[i] = axis.position(values[i]);
            if (Double.isNaN(positions[i])) {
                throw new IllegalArgumentException(axis.name() + ": " + values[i] + " has no place on its axis");
            }
        }
        return positions;
    }

    /** The pieces in positions. */
    static List<List<Point>> trace(double[] x, double[] y, double[][] z, double level) {
        ContourLines made = new ContourLines(x, y, z, level);
        for (int row = 0; row + 1 < y.length; row++) {
            for (int column = 0; column + 1 < x.length; column++) {
                made.cell(column, row);
            }
        }
        return made.chains();
    }

    private boolean above(int column, int row) {
        return z[row][column] >= level;
    }

    private double mean(int column, int row) {
        return 0.25 * (z[row][column] + z[row][column + 1] + z[row + 1][column] + z[row + 1][column + 1]);
    }

    private void cell(int column, int row) {
        double mean = mean(column, row);
        if (Double.isNaN(mean)) {
            return;
        }
        List<Integer> crossed = crossed(column, row);
        boolean saddle = crossed.size() > 2;
        if (saddle && above(column, row) != mean >= level) {
            crossed.add(0, crossed.remove(crossed.size() - 1));
        }
        for (int i = 0; i < crossed.size(); i += 2) {
            link(crossed.get(i), crossed.get(i + 1));
        }
    }

    /** The edges of a cell that the line passes, against the clock from the one below. */
    private List<Integer> crossed(int column, int row) {
        int[] edges = {edge(column, row, 0), edge(column + 1, row, 1), edge(column, row + 1, 0), edge(column, row, 1)};
        boolean[] corners = {
            above(column, row), above(column + 1, row), above(column + 1, row + 1), above(column, row + 1)
        };
        List<Integer> crossed = new ArrayList<>();
        for (int i = 0; i < edges.length; i++) {
            if (corners[i] != corners[(i + 1) % edges.length]) {
                crossed.add(edges[i]);
            }
        }
        return crossed;
    }

    private int edge(int column, int row, int upright) {
        return 2 * (row * x.length + column) + upright;
    }

    private void link(int one, int other) {
        links.computeIfAbsent(one, edge -> new ArrayList<>(2)).add(other);
        links.computeIfAbsent(other, edge -> new ArrayList<>(2)).add(one);
    }

    private List<List<Point>> chains() {
        List<List<Point>> chains = new ArrayList<>();
        List<Integer> starts = new ArrayList<>();
        links.forEach((edge, next) -> starts.add(next.size() == 1 ? 0 : starts.size(), edge));
        for (int start : starts) {
            if (!links.get(start).isEmpty()) {
                chains.add(chain(start));
            }
        }
        return chains;
    }

    private List<Point> chain(int start) {
        List<Point> chain = new ArrayList<>(List.of(point(start)));
        int at = start;
        while (!links.get(at).isEmpty()) {
            Integer next = links.get(at).remove(0);
            links.get(next).remove((Integer) at);
            chain.add(point(next));
            at = next;
        }
        return chain;
    }

    private Point point(int edge) {
        int row = edge / 2 / x.length;
        int column = edge / 2 % x.length;
        double from = z[row][column];
        if (edge % 2 == 0) {
            double share = share(from, z[row][column + 1]);
            return new Point(x[column] + share * (x[column + 1] - x[column]), y[row]);
        }
        double share = share(from, z[row + 1][column]);
        return new Point(x[column], y[row] + share * (y[row + 1] - y[row]));
    }

    private double share(double from, double to) {
        double share = (level - from) / (to - from);
        return Double.isFinite(share) ? Math.max(0.0, Math.min(1.0, share)) : 0.5;
    }
}

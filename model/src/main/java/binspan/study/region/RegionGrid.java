package binspan.study.region;

import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.window.MarginFunction;
import java.util.Arrays;
import java.util.stream.IntStream;

/** The margins of all requirements at the crossings of some lines across a map. */
final class RegionGrid {
    private final double[] u;
    private final double[] v;
    private final double[][] margins;

    private RegionGrid(double[] u, double[] v, int requirements) {
        this.u = u;
        this.v = v;
        this.margins = new double[requirements][u.length * v.length];
    }

    /**
     * Computes the margins.
     *
     * @param region the map
     * @param u shares along the first axis of the lines that cross it, rising
     * @param v shares along the second axis
     * @param execution threads, progress, cancellation
     */
    static RegionGrid of(OperatingRegion region, double[] u, double[] v, Execution execution) {
        RegionGrid grid = new RegionGrid(u, v, region.function().requirements());
        boolean alongU = region.function().order()[0] == 1;
        Workers.run(alongU ? v.length : u.length, 1, execution, () -> {
            MarginFunction function = region.function();
            return (first, end) -> {
                for (int line = first; line < end; line++) {
                    for (int step = 0; step < (alongU ? u.length : v.length); step++) {
                        grid.fill(function, alongU ? step : line, alongU ? line : step);
                    }
                }
            };
        });
        return grid;
    }

    /** The shares of the way along an axis at which its steps lie. */
    static double[] shares(Axis axis) {
        double[] shares = new double[axis.steps()];
        for (int i = 0; i < shares.length; i++) {
            shares[i] = (double) i / (shares.length - 1);
        }
        return shares;
    }

    private void fill(MarginFunction function, int i, int j) {
        double[] here = function.at(u[i], v[j]);
        for (int k = 0; k < here.length; k++) {
            margins[k][j * u.length + i] = here[k];
        }
    }

    /** Shares of the lines across the first axis. */
    double[] u() {
        return u;
    }

    /** Shares of the lines across the second axis. */
    double[] v() {
        return v;
    }

    /** Number of requirements. */
    int requirements() {
        return margins.length;
    }

    /** The margin of a requirement at a crossing. */
    double margin(int requirement, int i, int j) {
        return margins[requirement][j * u.length + i];
    }

    /** The least margin at a crossing. */
    double least(int i, int j) {
        double least = Double.POSITIVE_INFINITY;
        for (double[] each : margins) {
            least = Math.min(least, each[j * u.length + i]);
        }
        return least;
    }

    /** A crossing. */
    Spot spot(int i, int j) {
        return new Spot(u[i], v[j]);
    }

    /** The requirement with the least margin at a crossing, the first of equal ones. */
    int tightest(int i, int j) {
        int tightest = 0;
        for (int k = 1; k < margins.length; k++) {
            if (margin(k, i, j) < margin(tightest, i, j)) {
                tightest = k;
            }
        }
        return tightest;
    }

    /** The margins of all requirements along a line across the second axis. */
    double[][] row(int j) {
        return IntStream.range(0, u.length).mapToObj(i -> at(i, j)).toArray(double[][]::new);
    }

    /** The margins of all requirements along a line across the first axis. */
    double[][] column(int i) {
        return IntStream.range(0, v.length).mapToObj(j -> at(i, j)).toArray(double[][]::new);
    }

    private double[] at(int i, int j) {
        return IntStream.range(0, requirements())
                .mapToDouble(k -> margin(k, i, j))
                .toArray();
    }

    /** The lines between which a place lies: the index of the lower one. */
    static int cell(double[] lines, double place) {
        int found = Arrays.binarySearch(lines, place);
        int lower = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(lines.length - 2, lower));
    }
}

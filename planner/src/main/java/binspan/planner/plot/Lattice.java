package binspan.planner.plot;

/** Values on a rectangular grid of points, evenly spaced or not. */
public final class Lattice {
    private final double[] x;
    private final double[] y;
    private final double[][] values;

    /**
     * Copies the values.
     *
     * @param x at least two ascending values along the horizontal axis
     * @param y at least two ascending values along the vertical axis
     * @param values a row for each y, in it a value for each x; NaN where there is none
     */
    public Lattice(double[] x, double[] y, double[][] values) {
        if (!ascending(x) || !ascending(y) || values.length != y.length) {
            throw new IllegalArgumentException("a lattice needs ascending x and y, and a row of values for each y");
        }
        this.x = x.clone();
        this.y = y.clone();
        this.values = new double[y.length][];
        for (int row = 0; row < y.length; row++) {
            if (values[row].length != x.length) {
                throw new IllegalArgumentException("row " + row + " has not one value for each x");
            }
            this.values[row] = values[row].clone();
        }
    }

    private static boolean ascending(double[] values) {
        for (int i = 1; i < values.length; i++) {
            if (!(values[i] > values[i - 1])) {
                return false;
            }
        }
        return values.length >= 2;
    }

    /** Values along the horizontal axis. */
    public double[] x() {
        return x.clone();
    }

    /** Values along the vertical axis. */
    public double[] y() {
        return y.clone();
    }

    /** The values, a row for each y. */
    public double[][] values() {
        double[][] copy = new double[values.length][];
        for (int row = 0; row < values.length; row++) {
            copy[row] = values[row].clone();
        }
        return copy;
    }
}

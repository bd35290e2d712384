package binspan.planner.plot;

import java.util.function.DoubleBinaryOperator;

/** Lattices of functions. */
final class Lattices {
    private Lattices() {}

    static Lattice of(double[] x, double[] y, DoubleBinaryOperator function) {
        double[][] values = new double[y.length][x.length];
        for (int row = 0; row < y.length; row++) {
            for (int column = 0; column < x.length; column++) {
                values[row][column] = function.applyAsDouble(x[column], y[row]);
            }
        }
        return new Lattice(x, y, values);
    }

    static double[] even(double from, double to, int count) {
        double[] values = new double[count];
        for (int i = 0; i < count; i++) {
            values[i] = from + (to - from) * i / (count - 1);
        }
        return values;
    }
}

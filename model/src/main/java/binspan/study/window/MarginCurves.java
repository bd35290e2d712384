package binspan.study.window;

/** The margins of all requirements at many values of one parameter, for a picture. */
public final class MarginCurves {
    private final double[] values;
    private final double[][] margins;

    /**
     * Curves.
     *
     * @param values values of the parameter, rising
     * @param margins for each value the margins of all requirements
     */
    MarginCurves(double[] values, double[][] margins) {
        this.values = values;
        this.margins = margins;
    }

    /** Number of values. */
    public int size() {
        return values.length;
    }

    /** A value of the parameter. */
    public double value(int index) {
        return values[index];
    }

    /** The margin of a requirement at a value. */
    public double margin(int requirement, int index) {
        return margins[index][requirement];
    }

    /** The least margin at a value. */
    public double least(int index) {
        double least = Double.POSITIVE_INFINITY;
        for (double margin : margins[index]) {
            least = Math.min(least, margin);
        }
        return least;
    }
}

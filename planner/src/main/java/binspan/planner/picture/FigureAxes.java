package binspan.planner.picture;

import binspan.planner.plot.Axis;
import binspan.planner.report.FigureWords;
import binspan.planner.report.ParameterWords;
import binspan.study.FigureColumn;
import binspan.study.StudyTable;

/** Axes of pictures, named and with units. */
final class FigureAxes {
    private static final double DECADE = 10.0;
    private static final double DEEPEST = 1e-6;
    private static final double SHORTEST = 0.005;

    private FigureAxes() {}

    /** The axis of a varied parameter over its whole range. */
    static Axis of(binspan.study.Axis varied) {
        return new Axis(
                ParameterWords.title(varied.parameter().path()),
                varied.parameter().unit(),
                varied.logarithmic(),
                varied.from(),
                varied.to());
    }

    /** The axis of a figure: logarithmic where it spans more than a decade of positive values and usually does, then at most six decades: of times the shortest. */
    static Axis of(FigureColumn column, double... values) {
        double least = Double.POSITIVE_INFINITY;
        double largest = Double.NEGATIVE_INFINITY;
        for (double value : values) {
            if (Double.isFinite(value) && value > 0.0) {
                least = Math.min(least, value);
                largest = Math.max(largest, value);
            }
        }
        String title = FigureWords.title(column);
        if (!FigureWords.spansDecades(column) || !(largest > DECADE * least)) {
            return flat(Axis.linear(title, column.unit()), values);
        }
        Axis axis = Axis.logarithmic(title, column.unit());
        if (least >= DEEPEST * largest) {
            return axis;
        }
        return column.field().name().contains("secondsTo")
                ? axis.within(least / 2.0, least / DEEPEST)
                : axis.within(DEEPEST * largest, 2.0 * largest);
    }

    /** An axis at least half a per cent long, so that no picture makes a mountain of rounding. */
    private static Axis flat(Axis axis, double... values) {
        double least = Double.POSITIVE_INFINITY;
        double largest = Double.NEGATIVE_INFINITY;
        for (double value : values) {
            if (Double.isFinite(value)) {
                least = Math.min(least, value);
                largest = Math.max(largest, value);
            }
        }
        double half = SHORTEST * Math.max(Math.abs(least), Math.abs(largest)) / 2.0;
        double middle = (least + largest) / 2.0;
        return half > 0.0 && Double.isFinite(half) && largest - least < 2.0 * half
                ? axis.within(middle - half, middle + half)
                : axis;
    }

    /** The axis of a column of a table. */
    static Axis of(StudyTable table, int column) {
        return of(table.columns().get(column), table.figuresOf(column));
    }
}

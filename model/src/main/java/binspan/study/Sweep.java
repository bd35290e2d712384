package binspan.study;

import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CancellationException;

/**
 * The figures of merit of a link on a grid of one to four parameters.
 *
 * @param scenario the link as written
 * @param axes varied parameters; the last changes quickest in the table
 * @param columns figures of merit to tabulate
 */
public record Sweep(Scenario scenario, List<Axis> axes, List<FigureColumn> columns) {
    /** Most parameters of a sweep. */
    public static final int MOST_AXES = 4;

    /** Most numbers of a table, some 400 MB. */
    public static final long MOST_NUMBERS = 50_000_000L;

    private static final int PORTION = 64;

    /**
     * Checks the description.
     *
     * @throws IllegalArgumentException if there are too many axes or points, or if parameters cannot be varied here or not together
     */
    public Sweep {
        axes = List.copyOf(axes);
        columns = List.copyOf(columns);
        if (axes.isEmpty() || axes.size() > MOST_AXES) {
            throw new IllegalArgumentException(
                    "found " + axes.size() + " varied parameters; allowed 1 to " + MOST_AXES);
        }
        Variation.check(
                scenario,
                parameters(axes),
                axes.stream().mapToDouble(Axis::from).toArray());
        double numbers =
                axes.stream().mapToDouble(Axis::steps).reduce(1.0, (a, b) -> a * b) * (axes.size() + columns.size());
        if (numbers > MOST_NUMBERS) {
            throw new IllegalArgumentException(String.format(
                    Locale.ROOT,
                    "found %.3g numbers in the table; allowed %d: take fewer steps or fewer figures",
                    numbers,
                    MOST_NUMBERS));
        }
    }

    static List<Parameter> parameters(List<Axis> axes) {
        return axes.stream().map(Axis::parameter).toList();
    }

    /** Number of points. */
    public int points() {
        return axes.stream().mapToInt(Axis::steps).reduce(1, (a, b) -> a * b);
    }

    /**
     * Computes the table.
     *
     * @throws CancellationException if it shall stop
     */
    public StudyTable run(Execution execution) {
        return new SweepGrid(this).run(execution, PORTION);
    }
}

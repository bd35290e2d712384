package binspan.planner.viewmodel;

import binspan.planner.plot.Axis;
import binspan.planner.plot.ContourLines;
import binspan.planner.plot.Lattice;
import binspan.planner.plot.Point;
import binspan.study.region.MapLine;
import binspan.study.region.MarginGrid;
import binspan.study.region.RegionMap;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.IntBinaryOperator;
import java.util.function.ToDoubleBiFunction;

/**
 * What is drawn of a map, in shares of the way along its axes.
 *
 * @param contours one for each requirement
 * @param border closed lines about the region in which all requirements hold, islands and holes by the even-odd rule
 * @param anywhere whether there is such a region
 * @param exact whether the lines are solved; otherwise they are interpolated on a grid
 */
public record MapShape(List<MapContour> contours, List<List<Point>> border, boolean anywhere, boolean exact) {
    private static final Axis SHARES = Axis.linear("share", "");
    private static final double FRAME = 1e-6;
    private static final int PROBES = 7;

    /** Copies the lists. */
    public MapShape {
        contours = List.copyOf(contours);
        border = List.copyOf(border);
    }

    /** The lines interpolated between the points of a grid. */
    static MapShape of(MarginGrid grid) {
        List<MapContour> contours = new ArrayList<>();
        for (int i = 0; i < grid.requirements().size(); i++) {
            int requirement = i;
            Lattice margins = lattice(grid, (column, row) -> grid.margin(requirement, column, row));
            contours.add(new MapContour(grid.requirements().get(i), grid.required(i), turned(margins)));
        }
        Lattice least = lattice(grid, grid::least);
        List<List<Point>> border = ContourLines.of(SHARES, SHARES, framed(least), 0.0);
        return new MapShape(contours, border, !border.isEmpty(), false);
    }

    /** The lines of a solved map. */
    static MapShape of(RegionMap map) {
        List<MapContour> contours = new ArrayList<>();
        for (RegionMap.RequirementContour contour : map.contours()) {
            contours.add(new MapContour(contour.requirement(), contour.required(), shares(map, contour.lines())));
        }
        return new MapShape(contours, shares(map, map.border()), map.best().met(), true);
    }

    private static List<List<Point>> shares(RegionMap map, List<MapLine> lines) {
        return lines.stream()
                .map(line -> line.points().stream()
                        .map(point -> new Point(
                                map.horizontal().share(point.x()),
                                map.vertical().share(point.y())))
                        .toList())
                .toList();
    }

    private static Lattice lattice(MarginGrid grid, ToDoubleBiFunction<Integer, Integer> margin) {
        int columns = grid.horizontal().steps();
        int rows = grid.vertical().steps();
        double[][] values = new double[rows][columns];
        for (int row = 0; row < rows; row++) {
            for (int column = 0; column < columns; column++) {
                values[row][column] = margin.applyAsDouble(column, row);
            }
        }
        return new Lattice(steps(columns), steps(rows), values);
    }

    private static double[] steps(int count) {
        double[] steps = new double[count];
        for (int i = 0; i < count; i++) {
            steps[i] = (double) i / (count - 1);
        }
        return steps;
    }

    /** A frame of points at which nothing holds, so that all borders close. */
    private static Lattice framed(Lattice inner) {
        double[][] values = inner.values();
        double[][] framed = new double[values.length + 2][values[0].length + 2];
        for (int row = 0; row < framed.length; row++) {
            for (int column = 0; column < framed[row].length; column++) {
                boolean outside = row == 0 || column == 0 || row > values.length || column > values[0].length;
                framed[row][column] = outside ? -1.0 : values[row - 1][column - 1];
            }
        }
        return new Lattice(framed(inner.x()), framed(inner.y()), framed);
    }

    private static double[] framed(double[] steps) {
        double[] framed = new double[steps.length + 2];
        System.arraycopy(steps, 0, framed, 1, steps.length);
        framed[0] = -FRAME;
        framed[framed.length - 1] = 1.0 + FRAME;
        return framed;
    }

    /** The zero lines, turned so that the margin is positive to their left. */
    private static List<List<Point>> turned(Lattice margins) {
        double[][] values = margins.values();
        return ContourLines.of(SHARES, SHARES, margins, 0.0).stream()
                .map(line -> holdsToTheLeft(values, line) ? line : reversed(line))
                .toList();
    }

    private static List<Point> reversed(List<Point> line) {
        List<Point> reversed = new ArrayList<>(line);
        Collections.reverse(reversed);
        return reversed;
    }

    /** Some corners of the cells that the line passes vote by the side on which they lie. */
    private static boolean holdsToTheLeft(double[][] values, List<Point> line) {
        int votes = 0;
        int pieces = line.size() - 1;
        for (int probe = 0; probe < PROBES; probe++) {
            int piece = Math.min(pieces - 1, pieces * probe / PROBES);
            votes += vote(values, line.get(piece), line.get(piece + 1));
        }
        return votes >= 0;
    }

    private static int vote(double[][] values, Point from, Point to) {
        int rows = values.length - 1;
        int columns = values[0].length - 1;
        int row = cell((from.y() + to.y()) / 2.0 * rows, rows);
        int column = cell((from.x() + to.x()) / 2.0 * columns, columns);
        IntBinaryOperator side = (right, up) -> {
            double across = (to.x() - from.x()) * ((double) (row + up) / rows - from.y())
                    - (to.y() - from.y()) * ((double) (column + right) / columns - from.x());
            boolean left = across >= 0.0;
            return left == (values[row + up][column + right] >= 0.0) ? 1 : -1;
        };
        int votes = side.applyAsInt(0, 0) + side.applyAsInt(1, 0) + side.applyAsInt(0, 1) + side.applyAsInt(1, 1);
        return Integer.signum(votes);
    }

    private static int cell(double place, int cells) {
        return Math.max(0, Math.min(cells - 1, (int) Math.floor(place)));
    }
}

package binspan.planner.plot;

import java.awt.geom.Path2D;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The region of a map where all requirements are met.
 *
 * @param inside its loops, closed along the edge of the lattice
 * @param border its border without the edge of the lattice
 */
record FeasibleRegion(Path2D inside, List<List<Point>> border) {
    /** The region where a lattice, its points at positions, is not negative. */
    static FeasibleRegion of(double[] x, double[] y, double[][] margin) {
        List<List<Point>> loops = ContourLines.trace(framed(x), framed(y), framed(margin), 0.0);
        Path2D inside = new Path2D.Double(Path2D.WIND_EVEN_ODD);
        List<List<Point>> border = new ArrayList<>();
        for (List<Point> loop : loops) {
            inside.moveTo(loop.get(0).x(), loop.get(0).y());
            loop.stream().skip(1).forEach(point -> inside.lineTo(point.x(), point.y()));
            inside.closePath();
            border.addAll(withoutEdge(x, y, loop));
        }
        return new FeasibleRegion(inside, border);
    }

    /** The pieces of a loop that do not run along the edge of the lattice. */
    private static List<List<Point>> withoutEdge(double[] x, double[] y, List<Point> loop) {
        List<List<Point>> pieces = new ArrayList<>();
        List<Point> piece = new ArrayList<>(List.of(loop.get(0)));
        for (int i = 1; i < loop.size(); i++) {
            Point from = loop.get(i - 1);
            Point to = loop.get(i);
            if (along(x, from.x(), to.x()) || along(y, from.y(), to.y())) {
                pieces.add(piece);
                piece = new ArrayList<>();
            }
            piece.add(to);
        }
        pieces.add(piece);
        pieces.removeIf(points -> points.size() < 2);
        return pieces;
    }

    private static boolean along(double[] positions, double from, double to) {
        return from == to && (from == positions[0] || from == positions[positions.length - 1]);
    }

    /** The ends doubled, so that loops close without a step. */
    private static double[] framed(double[] positions) {
        double[] framed = new double[positions.length + 2];
        System.arraycopy(positions, 0, framed, 1, positions.length);
        framed[0] = positions[0];
        framed[framed.length - 1] = positions[positions.length - 1];
        return framed;
    }

    /** A frame of unmet points; missing values are unmet, as far as the others are on the whole. */
    private static double[][] framed(double[][] margin) {
        double unmet = -Arrays.stream(margin)
                .flatMapToDouble(Arrays::stream)
                .filter(Double::isFinite)
                .map(Math::abs)
                .average()
                .orElse(1.0);
        double outside = unmet < 0.0 ? unmet : -1.0;
        double[][] framed = new double[margin.length + 2][margin[0].length + 2];
        for (double[] row : framed) {
            Arrays.fill(row, outside);
        }
        for (int row = 0; row < margin.length; row++) {
            for (int column = 0; column < margin[row].length; column++) {
                double value = margin[row][column];
                framed[row + 1][column + 1] = Double.isNaN(value) ? outside : finite(value);
            }
        }
        return framed;
    }

    private static double finite(double value) {
        return Math.max(-Double.MAX_VALUE / 8.0, Math.min(Double.MAX_VALUE / 8.0, value));
    }
}

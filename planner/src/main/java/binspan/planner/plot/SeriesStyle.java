package binspan.planner.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/**
 * How a series looks: a colour, a dash pattern and a marker, any one of which tells it from the others.
 *
 * @param colour apart from the others also without red or green cones
 * @param stroke with its dash pattern
 * @param marker about eight pixels wide, centred on zero
 */
public record SeriesStyle(Color colour, Stroke stroke, Shape marker) {
    private static final float WIDTH = 2.2f;
    private static final double SIZE = 8.0;

    private static final float[][] DASHES = {
        {},
        {11.0f, 4.0f},
        {3.0f, 3.0f},
        {12.0f, 3.0f, 2.5f, 3.0f},
        {18.0f, 5.0f},
        {6.0f, 3.0f},
        {14.0f, 3.0f, 2.5f, 3.0f, 2.5f, 3.0f},
        {1.5f, 4.0f}
    };

    private static final Path2D TRIANGLE = polygon(0.0, -0.55, 0.55, 0.45, -0.55, 0.45);
    private static final Path2D DIAMOND = polygon(0.0, -0.6, 0.6, 0.0, 0.0, 0.6, -0.6, 0.0);
    private static final Path2D HOURGLASS = polygon(-0.5, -0.5, 0.5, -0.5, -0.5, 0.5, 0.5, 0.5);
    private static final Path2D POINTER = polygon(-0.45, -0.55, 0.55, 0.0, -0.45, 0.55);
    private static final Path2D PLUS = polygon(
            -0.17, -0.55, 0.17, -0.55, 0.17, -0.17, 0.55, -0.17, 0.55, 0.17, 0.17, 0.17, 0.17, 0.55, -0.17, 0.55, -0.17,
            0.17, -0.55, 0.17, -0.55, -0.17, -0.17, -0.17);

    private static final List<Shape> MARKERS = List.of(
            new Ellipse2D.Double(-0.45, -0.45, 0.9, 0.9),
            new Rectangle2D.Double(-0.42, -0.42, 0.84, 0.84),
            TRIANGLE,
            DIAMOND,
            AffineTransform.getScaleInstance(1.0, -1.0).createTransformedShape(TRIANGLE),
            PLUS,
            POINTER,
            HOURGLASS);

    /** The style of the series with an index from 0. */
    public static SeriesStyle of(int index, PlotTheme theme) {
        return new SeriesStyle(theme.seriesColour(index), dashed(index, WIDTH), marker(index, SIZE));
    }

    /** The dashes of the series with an index from 0: lengths of strokes and gaps in turn, in points; empty for a whole line. */
    public static List<Double> dashes(int index) {
        List<Double> lengths = new ArrayList<>();
        for (float length : DASHES[Math.floorMod(index, DASHES.length)]) {
            lengths.add((double) length);
        }
        return lengths;
    }

    /** A stroke of a width with the dash pattern of an index. */
    static Stroke dashed(int index, float width) {
        float[] dashes = DASHES[Math.floorMod(index, DASHES.length)];
        return dashes.length == 0
                ? new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND)
                : new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10.0f, dashes, 0.0f);
    }

    /** The marker of an index in a size. */
    static Shape marker(int index, double size) {
        return AffineTransform.getScaleInstance(size, size)
                .createTransformedShape(MARKERS.get(Math.floorMod(index, MARKERS.size())));
    }

    private static Path2D polygon(double... corners) {
        Path2D path = new Path2D.Double();
        path.moveTo(corners[0], corners[1]);
        for (int i = 2; i < corners.length; i += 2) {
            path.lineTo(corners[i], corners[i + 1]);
        }
        path.closePath();
        return path;
    }
}

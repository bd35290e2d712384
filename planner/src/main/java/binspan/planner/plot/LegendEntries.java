package binspan.planner.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Paint;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.LegendItem;

/**
 * Entries of a legend: the same fills, hatchings and lines as in the plot.
 *
 * @param theme colours
 */
record LegendEntries(PlotTheme theme) {
    private static final double SWATCH_WIDTH = 26.0;
    private static final double SWATCH_HEIGHT = 13.0;
    private static final double LINE_LENGTH = 44.0;
    private static final Color CLEAR = new Color(0, 0, 0, 0);

    /** A series with its marker. */
    LegendItem series(String label, SeriesStyle style) {
        return new LegendItem(
                label,
                null,
                null,
                null,
                true,
                style.marker(),
                true,
                style.colour(),
                false,
                style.colour(),
                PlotStyle.HAIRLINE,
                true,
                line(),
                style.stroke(),
                style.colour());
    }

    /** A line. */
    LegendItem line(String label, Stroke stroke, Paint paint) {
        return new LegendItem(label, null, null, null, line(), stroke, paint);
    }

    /** A marker with an outline. */
    LegendItem marker(String label, Shape marker) {
        return new LegendItem(
                label,
                null,
                null,
                null,
                marker,
                theme.ground().background(),
                PlotStyle.LIMIT,
                theme.ink().text());
    }

    /** A filled box. */
    LegendItem filled(String label, Paint fill) {
        Shape box = new Rectangle2D.Double(0.0, 0.0, SWATCH_WIDTH, SWATCH_HEIGHT);
        return swatch(label, fill, box, theme.ink().soft());
    }

    /** A hatched box. */
    LegendItem hatched(String label, boolean rising, Paint lines) {
        return swatch(label, CLEAR, Hatching.swatch(SWATCH_WIDTH, SWATCH_HEIGHT, rising), lines);
    }

    /** The stretch where all requirements are met: a tinted box with toothed sides. */
    LegendItem met(String label) {
        Path2D edges = new Path2D.Double();
        MetStretch.edge(edges, new Line2D.Double(0.0, 0.0, 0.0, SWATCH_HEIGHT), 1.0);
        MetStretch.edge(edges, new Line2D.Double(SWATCH_WIDTH, 0.0, SWATCH_WIDTH, SWATCH_HEIGHT), -1.0);
        return swatch(label, theme.fill().met(), edges, theme.fill().metEdge());
    }

    /** That parts have no room. */
    LegendItem leftOut(int parts) {
        String label = parts + (parts == 1 ? " more panel needs" : " more panels need") + " a larger picture";
        return new LegendItem(label, null, null, null, new Line2D.Double(), PlotStyle.HAIRLINE, CLEAR);
    }

    /** The library fills the shape over its line: a line as wide as the box is the fill, the shape only an outline. */
    private LegendItem swatch(String label, Paint fill, Shape outline, Paint outlinePaint) {
        Stroke wide = new BasicStroke((float) SWATCH_HEIGHT, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER);
        return new LegendItem(
                label,
                null,
                null,
                null,
                true,
                outline,
                false,
                CLEAR,
                true,
                outlinePaint,
                PlotStyle.HAIRLINE,
                true,
                new Line2D.Double(0.0, 0.0, SWATCH_WIDTH, 0.0),
                wide,
                fill);
    }

    private static Shape line() {
        return new Line2D.Double(-LINE_LENGTH / 2.0, 0.0, LINE_LENGTH / 2.0, 0.0);
    }
}

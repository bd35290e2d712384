package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/**
 * A stretch of the horizontal axis where all requirements are met: tinted, its edges toothed towards the inside. Where it
 * reaches the end of the axis it has no edge.
 */
final class MetStretch extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;
    private static final double TOOTH = 5.0;
    private static final double PITCH = 6.0;

    private final double from;
    private final double to;
    private final transient PlotTheme theme;

    /** The stretch between two positions. */
    MetStretch(double from, double to, PlotTheme theme) {
        this.from = from;
        this.to = to;
        this.theme = theme;
    }

    @Override
    public void draw(
            Graphics2D g2,
            XYPlot plot,
            Rectangle2D dataArea,
            ValueAxis domain,
            ValueAxis range,
            int rendererIndex,
            PlotRenderingInfo info) {
        if (!(to > domain.getLowerBound()) || from >= domain.getUpperBound()) {
            return;
        }
        Rectangle2D strip = PlotArea.strip(dataArea, domain, plot.getDomainAxisEdge(), from, to);
        g2.setPaint(theme.fill().met());
        g2.fill(strip);
        Path2D edges = new Path2D.Double();
        if (from > domain.getLowerBound()) {
            edge(edges, new Line2D.Double(strip.getMinX(), strip.getMinY(), strip.getMinX(), strip.getMaxY()), 1.0);
        }
        if (to < domain.getUpperBound()) {
            edge(edges, new Line2D.Double(strip.getMaxX(), strip.getMinY(), strip.getMaxX(), strip.getMaxY()), -1.0);
        }
        g2.setPaint(theme.fill().metEdge());
        g2.setStroke(PlotStyle.LIMIT);
        g2.draw(edges);
    }

    /** Adds an upright line with slanting teeth, to its right for a direction of 1 and to its left for -1. */
    static void edge(Path2D path, Line2D line, double direction) {
        path.append(line, false);
        for (double y = line.getY1() + TOOTH; y <= line.getY2(); y += PITCH) {
            path.moveTo(line.getX1(), y);
            path.lineTo(line.getX1() + direction * TOOTH, y - TOOTH);
        }
    }
}

package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;

/** Where positions of the axes lie in the drawn area, whichever way the plot is turned. */
final class PlotArea {
    private PlotArea() {}

    /** The part of the data area between two positions of one axis. */
    static Rectangle2D strip(Rectangle2D dataArea, ValueAxis axis, RectangleEdge edge, double from, double to) {
        double first = axis.valueToJava2D(clamp(axis, from), dataArea, edge);
        double second = axis.valueToJava2D(clamp(axis, to), dataArea, edge);
        double start = Math.min(first, second);
        double size = Math.abs(second - first);
        return RectangleEdge.isTopOrBottom(edge)
                ? new Rectangle2D.Double(start, dataArea.getY(), size, dataArea.getHeight())
                : new Rectangle2D.Double(dataArea.getX(), start, dataArea.getWidth(), size);
    }

    /** Horizontal pixel of a position in a plot that is not turned. */
    static double x(XYPlot plot, Rectangle2D dataArea, ValueAxis axis, double position) {
        return axis.valueToJava2D(position, dataArea, plot.getDomainAxisEdge());
    }

    /** Vertical pixel of a position in a plot that is not turned. */
    static double y(XYPlot plot, Rectangle2D dataArea, ValueAxis axis, double position) {
        return axis.valueToJava2D(position, dataArea, plot.getRangeAxisEdge());
    }

    /** Stretches an image over a rectangle; a graphics that writes numbers keeps its own transform exactly. */
    static void fill(Graphics2D g2, BufferedImage image, Rectangle2D area, Object interpolation) {
        AffineTransform saved = g2.getTransform();
        g2.setRenderingHint(RenderingHints.KEY_INTERPOLATION, interpolation);
        g2.translate(area.getX(), area.getY());
        g2.scale(area.getWidth() / image.getWidth(), area.getHeight() / image.getHeight());
        g2.drawImage(image, 0, 0, null);
        g2.setTransform(saved);
    }

    private static double clamp(ValueAxis axis, double position) {
        return Math.max(axis.getLowerBound(), Math.min(axis.getUpperBound(), position));
    }
}

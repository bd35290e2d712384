package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.data.Range;

/** The axis of a map's colours to its right, with the colours beside it, exactly as high as the map. */
final class ColourBarAxis extends ScaledAxis {
    private static final long serialVersionUID = 1L;
    private static final double GAP = 14.0;
    private static final double WIDTH = 18.0;
    private static final int SHADES = 256;

    private final transient PlotTheme theme;

    ColourBarAxis(Axis axis, Range positions, PlotTheme theme) {
        super(axis, positions, theme);
        this.theme = theme;
    }

    @Override
    public AxisSpace reserveSpace(Graphics2D g2, Plot plot, Rectangle2D plotArea, RectangleEdge edge, AxisSpace space) {
        AxisSpace reserved = super.reserveSpace(g2, plot, plotArea, edge, space);
        reserved.add(GAP + WIDTH, edge);
        return reserved;
    }

    @Override
    public AxisState draw(
            Graphics2D g2,
            double cursor,
            Rectangle2D plotArea,
            Rectangle2D dataArea,
            RectangleEdge edge,
            PlotRenderingInfo plotState) {
        Rectangle2D bar = new Rectangle2D.Double(cursor + GAP, dataArea.getY(), WIDTH, dataArea.getHeight());
        PlotArea.fill(g2, shades(), bar, RenderingHints.VALUE_INTERPOLATION_NEAREST_NEIGHBOR);
        g2.setPaint(theme.ink().soft());
        g2.setStroke(PlotStyle.HAIRLINE);
        g2.draw(bar);
        return super.draw(g2, bar.getMaxX(), plotArea, dataArea, edge, plotState);
    }

    private static BufferedImage shades() {
        BufferedImage image = new BufferedImage(1, SHADES, BufferedImage.TYPE_INT_RGB);
        for (int row = 0; row < SHADES; row++) {
            image.setRGB(0, row, ColourScale.rgb(1.0 - (row + 0.5) / SHADES));
        }
        return image;
    }
}

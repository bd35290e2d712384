package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Area;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.Optional;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** The image of a map, veiled and hatched outside its feasible region. */
final class HeatAnnotation extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;
    private static final double SPACING = 12.0;

    private final transient BufferedImage image;
    private final transient Rectangle2D positions;
    private final transient Optional<FeasibleRegion> region;
    private final transient PlotTheme theme;

    /** An image that fills a rectangle of positions. */
    HeatAnnotation(BufferedImage image, Rectangle2D positions, Optional<FeasibleRegion> region, PlotTheme theme) {
        this.image = image;
        this.positions = positions;
        this.region = region;
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
        AffineTransform toPixels = toPixels(plot, dataArea, domain, range);
        Rectangle2D area = toPixels.createTransformedShape(positions).getBounds2D();
        PlotArea.fill(g2, image, area, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
        region.ifPresent(feasible -> veil(g2, feasible, toPixels, dataArea));
    }

    private static AffineTransform toPixels(XYPlot plot, Rectangle2D dataArea, ValueAxis domain, ValueAxis range) {
        double x0 = PlotArea.x(plot, dataArea, domain, domain.getLowerBound());
        double x1 = PlotArea.x(plot, dataArea, domain, domain.getUpperBound());
        double y0 = PlotArea.y(plot, dataArea, range, range.getLowerBound());
        double y1 = PlotArea.y(plot, dataArea, range, range.getUpperBound());
        AffineTransform transform = AffineTransform.getTranslateInstance(x0, y0);
        transform.scale(
                (x1 - x0) / domain.getRange().getLength(),
                (y1 - y0) / range.getRange().getLength());
        transform.translate(-domain.getLowerBound(), -range.getLowerBound());
        return transform;
    }

    private void veil(Graphics2D g2, FeasibleRegion region, AffineTransform toPixels, Rectangle2D dataArea) {
        Area outside = new Area(dataArea);
        outside.subtract(new Area(toPixels.createTransformedShape(region.inside())));
        g2.setPaint(theme.veil());
        g2.fill(outside);
        Hatching.rising(g2, outside, SPACING, theme.mapHatch());
    }
}

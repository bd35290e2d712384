package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** The hatched side of a requirement on the axis of the values. */
final class FailingSide extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;

    private final double from;
    private final double to;
    private final transient Paint hatch;
    private final boolean onDomainAxis;

    private FailingSide(double limit, boolean below, Paint hatch, boolean onDomainAxis) {
        this.from = below ? Double.NEGATIVE_INFINITY : limit;
        this.to = below ? limit : Double.POSITIVE_INFINITY;
        this.hatch = hatch;
        this.onDomainAxis = onDomainAxis;
    }

    /** For values on the range axis. */
    static FailingSide ofRange(double limit, boolean below, PlotTheme theme) {
        return new FailingSide(limit, below, theme.ink().hatch(), false);
    }

    /** For values on the domain axis, dark enough to lie over bars. */
    static FailingSide ofDomain(double limit, boolean below, PlotTheme theme) {
        return new FailingSide(limit, below, theme.ink().soft(), true);
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
        Rectangle2D strip = onDomainAxis
                ? PlotArea.strip(dataArea, domain, plot.getDomainAxisEdge(), from, to)
                : PlotArea.strip(dataArea, range, plot.getRangeAxisEdge(), from, to);
        Hatching.rising(g2, strip, PlotStyle.HATCH_SPACING, hatch);
    }
}

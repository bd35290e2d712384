package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.geom.RectangularShape;
import java.util.function.IntPredicate;
import org.jfree.chart.renderer.xy.XYBarPainter;
import org.jfree.chart.renderer.xy.XYBarRenderer;
import org.jfree.chart.ui.RectangleEdge;

/** Paints bars filled or hatched, all with an outline. */
final class PatternPainter implements XYBarPainter {
    private static final double SPACING = 5.0;

    private final Paint fill;
    private final IntPredicate filled;
    private final PlotTheme theme;

    /** A painter that fills the bars whose index passes a test and hatches the others. */
    PatternPainter(Paint fill, IntPredicate filled, PlotTheme theme) {
        this.fill = fill;
        this.filled = filled;
        this.theme = theme;
    }

    /** A renderer without shadows that uses a painter. */
    static XYBarRenderer renderer(PatternPainter painter) {
        XYBarRenderer renderer = new XYBarRenderer();
        renderer.setBarPainter(painter);
        renderer.setShadowVisible(false);
        renderer.setUseYInterval(true);
        return renderer;
    }

    @Override
    public void paintBar(
            Graphics2D g2, XYBarRenderer renderer, int row, int column, RectangularShape bar, RectangleEdge base) {
        boolean solid = filled.test(column);
        g2.setPaint(solid ? fill : theme.ground().background());
        g2.fill(bar);
        if (!solid) {
            Hatching.falling(g2, bar, SPACING, theme.ink().text());
        }
        g2.setPaint(theme.ink().text());
        g2.setStroke(PlotStyle.HAIRLINE);
        g2.draw(bar);
    }

    @Override
    public void paintBarShadow(
            Graphics2D g2,
            XYBarRenderer renderer,
            int row,
            int column,
            RectangularShape bar,
            RectangleEdge base,
            boolean pegShadow) {
        // bars have no shadows
    }
}

package binspan.planner.plot;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.util.Collection;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.LegendItem;
import org.jfree.chart.block.RectangleConstraint;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.title.Title;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.Range;

/** What stands around the panels of a page of given size: titles, legend, a narrow margin. */
final class PageFrame {
    private static final double MARGIN = 4.0;
    private static final Font SMALL = PlotStyle.TICK.deriveFont(12.5f);

    /** Both margins together. */
    static final double SIDES = 2.0 * MARGIN;

    private PageFrame() {}

    /** The page with a narrow margin. */
    static JFreeChart page(Picture picture, Plot plot, Collection<LegendItem> legend, PlotTheme theme) {
        JFreeChart chart = PlotStyle.page(picture, plot, legend, theme);
        for (Object each : chart.getSubtitles()) {
            if (each instanceof LegendTitle entries) {
                narrow(entries);
            }
        }
        chart.setPadding(new RectangleInsets(MARGIN, MARGIN, MARGIN, MARGIN));
        return chart;
    }

    private static void narrow(LegendTitle legend) {
        legend.setItemFont(SMALL);
        legend.setItemLabelPadding(new RectangleInsets(1.0, 2.0, 1.0, 8.0));
        legend.setLegendItemGraphicPadding(new RectangleInsets(1.0, 2.0, 1.0, 3.0));
        legend.setPadding(new RectangleInsets(2.0, 2.0, 0.0, 2.0));
    }

    /** Height of all that is not panels. */
    static double height(Picture picture, Collection<LegendItem> legend, PlotTheme theme, double width) {
        JFreeChart empty = page(picture, PanelGrid.empty(), legend, theme);
        double inner = Math.max(1.0, width - SIDES);
        Graphics2D g2 = new BufferedImage(1, 1, BufferedImage.TYPE_INT_RGB).createGraphics();
        RectangleConstraint room = new RectangleConstraint(new Range(0.0, inner), new Range(0.0, Double.MAX_VALUE));
        double height = SIDES;
        for (Object each : empty.getSubtitles()) {
            height += ((Title) each).arrange(g2, room).getHeight();
        }
        g2.dispose();
        return height;
    }
}

package binspan.planner.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;
import java.util.Collection;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.LegendItem;
import org.jfree.chart.LegendItemCollection;
import org.jfree.chart.annotations.XYTitleAnnotation;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.block.FlowArrangement;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.text.TextUtils;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.title.Title;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.VerticalAlignment;

/** Fonts, colours and strokes that all pictures share. Sizes are in pixels of 1/96 inch: 13.5 is about 10 pt. */
final class PlotStyle {
    static final Color INK = new Color(0x1f2328);
    static final Color SOFT_INK = new Color(0x50575e);
    static final Color GRID = new Color(0xe2e4e7);
    static final Color FAINT_GRID = new Color(0xf0f1f3);
    static final Color HATCH = new Color(0xb4b9bf);
    static final Color FILL = new Color(OkLab.ofHue(0.56, 0.09, 245.0).rgb());
    static final Color LIGHT_FILL = new Color(OkLab.ofHue(0.80, 0.06, 245.0).rgb());
    static final Color MET_FILL = new Color(0x2f, 0x9e, 0x77, 0x38);
    static final Color MET_EDGE = new Color(OkLab.ofHue(0.42, 0.09, 165.0).rgb());
    static final Color BLANK = new Color(0xe6e6e6);
    static final Color HALO = new Color(0xff, 0xff, 0xff, 0xdc);

    static final Stroke HAIRLINE = new BasicStroke(1.0f);
    static final Stroke LIMIT = new BasicStroke(1.8f);
    static final Stroke MARK =
            new BasicStroke(1.6f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10.0f, new float[] {7.0f, 3.0f}, 0.0f);

    static final Font TICK = font(Font.PLAIN, 13.5f);
    static final Font AXIS = font(Font.PLAIN, 14.5f);
    static final Font PANEL = font(Font.BOLD, 14.5f);
    static final Font TITLE = font(Font.BOLD, 17.3f);
    static final Font SUBTITLE = font(Font.PLAIN, 14.5f);

    static final double HATCH_SPACING = 9.0;

    private static final FlowArrangement LEFT_ALIGNED_ROWS =
            new FlowArrangement(HorizontalAlignment.LEFT, VerticalAlignment.CENTER, 0.0, 0.0);

    static {
        // Otherwise the library writes turned texts as outlines, which nobody can search or edit.
        TextUtils.setUseDrawRotatedStringWorkaround(false);
    }

    private PlotStyle() {}

    private static Font font(int style, float size) {
        return new Font(Font.SANS_SERIF, style, 1).deriveFont(size);
    }

    /** Fonts, colours and ticks of an axis. */
    static void dress(NumberAxis axis) {
        axis.setLabelFont(AXIS);
        axis.setLabelPaint(INK);
        axis.setLabelInsets(new RectangleInsets(6.0, 6.0, 6.0, 6.0));
        axis.setTickLabelFont(TICK);
        axis.setTickLabelPaint(INK);
        axis.setTickLabelInsets(new RectangleInsets(4.0, 7.0, 4.0, 7.0));
        axis.setAxisLinePaint(SOFT_INK);
        axis.setTickMarkPaint(SOFT_INK);
        axis.setTickMarkOutsideLength(5.0f);
        axis.setMinorTickMarkOutsideLength(3.0f);
    }

    /** A white plot with a light grid. */
    static XYPlot plot(ValueAxis domain, ValueAxis range) {
        XYPlot plot = new XYPlot(null, domain, range, null);
        plot.setBackgroundPaint(Color.WHITE);
        plot.setOutlinePaint(SOFT_INK);
        plot.setOutlineStroke(HAIRLINE);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setInsets(RectangleInsets.ZERO_INSETS);
        grid(plot);
        return plot;
    }

    /** Says that there is nothing to see, over whatever else is drawn. */
    static void sayEmpty(XYPlot plot) {
        TextTitle message = new TextTitle("no values to show", AXIS);
        message.setPaint(SOFT_INK);
        message.setBackgroundPaint(Color.WHITE);
        message.setPadding(new RectangleInsets(4.0, 10.0, 4.0, 10.0));
        plot.addAnnotation(new XYTitleAnnotation(0.5, 0.5, message, RectangleAnchor.CENTER));
    }

    private static void grid(XYPlot plot) {
        plot.setDomainGridlinePaint(GRID);
        plot.setDomainGridlineStroke(HAIRLINE);
        plot.setRangeGridlinePaint(GRID);
        plot.setRangeGridlineStroke(HAIRLINE);
        plot.setDomainMinorGridlinePaint(FAINT_GRID);
        plot.setDomainMinorGridlineStroke(HAIRLINE);
        plot.setRangeMinorGridlinePaint(FAINT_GRID);
        plot.setRangeMinorGridlineStroke(HAIRLINE);
    }

    /** A chart of one panel, without a legend. */
    static JFreeChart chart(String title, Plot plot) {
        JFreeChart chart = new JFreeChart(null, null, plot, false);
        chart.setBackgroundPaint(Color.WHITE);
        chart.setPadding(new RectangleInsets(4.0, 8.0, 4.0, 14.0));
        if (!title.isEmpty()) {
            chart.addSubtitle(heading(title, PANEL, 8.0));
        }
        return chart;
    }

    /** The whole page: titles above, the legend of all panels below. */
    static JFreeChart page(Picture picture, Plot plot, Collection<LegendItem> legend) {
        JFreeChart chart = new JFreeChart(null, null, plot, false);
        chart.setBackgroundPaint(Color.WHITE);
        chart.setPadding(new RectangleInsets(10.0, 14.0, 10.0, 14.0));
        chart.addSubtitle(heading(picture.title(), TITLE, 3.0));
        if (!picture.subtitle().isEmpty()) {
            TextTitle subtitle = heading(picture.subtitle(), SUBTITLE, 10.0);
            subtitle.setPaint(SOFT_INK);
            chart.addSubtitle(subtitle);
        }
        if (!legend.isEmpty()) {
            chart.addSubtitle(legend(legend));
        }
        return chart;
    }

    private static TextTitle heading(String text, Font font, double below) {
        TextTitle title = new TextTitle(
                text,
                font,
                INK,
                RectangleEdge.TOP,
                HorizontalAlignment.LEFT,
                Title.DEFAULT_VERTICAL_ALIGNMENT,
                new RectangleInsets(2.0, 6.0, below, 6.0));
        title.setTextAlignment(HorizontalAlignment.LEFT);
        return title;
    }

    private static LegendTitle legend(Collection<LegendItem> items) {
        LegendItemCollection collection = new LegendItemCollection();
        items.forEach(collection::add);
        LegendTitle legend = new LegendTitle(() -> collection, LEFT_ALIGNED_ROWS, LEFT_ALIGNED_ROWS);
        legend.setPosition(RectangleEdge.BOTTOM);
        legend.setHorizontalAlignment(HorizontalAlignment.LEFT);
        legend.setItemFont(TICK);
        legend.setItemPaint(INK);
        legend.setItemLabelPadding(new RectangleInsets(3.0, 4.0, 3.0, 18.0));
        legend.setLegendItemGraphicPadding(new RectangleInsets(3.0, 4.0, 3.0, 4.0));
        legend.setPadding(new RectangleInsets(6.0, 4.0, 2.0, 4.0));
        return legend;
    }
}

package binspan.planner.plot;

import java.awt.BasicStroke;
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

/** Fonts, strokes and distances that all pictures share. Sizes are in pixels of 1/96 inch: 13.5 is about 10 pt. */
final class PlotStyle {
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
    static void dress(NumberAxis axis, PlotTheme theme) {
        axis.setLabelFont(AXIS);
        axis.setLabelPaint(theme.ink().text());
        axis.setLabelInsets(new RectangleInsets(6.0, 6.0, 6.0, 6.0));
        axis.setTickLabelFont(TICK);
        axis.setTickLabelPaint(theme.ink().text());
        axis.setTickLabelInsets(new RectangleInsets(4.0, 7.0, 4.0, 7.0));
        axis.setAxisLinePaint(theme.ink().soft());
        axis.setTickMarkPaint(theme.ink().soft());
        axis.setTickMarkOutsideLength(5.0f);
        axis.setMinorTickMarkOutsideLength(3.0f);
    }

    /** A plain plot with a faint grid. */
    static XYPlot plot(ValueAxis domain, ValueAxis range, PlotTheme theme) {
        XYPlot plot = new XYPlot(null, domain, range, null);
        plot.setBackgroundPaint(theme.ground().background());
        plot.setOutlinePaint(theme.ink().soft());
        plot.setOutlineStroke(HAIRLINE);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setInsets(RectangleInsets.ZERO_INSETS);
        grid(plot, theme);
        return plot;
    }

    /** Says that there is nothing to see, over whatever else is drawn. */
    static void sayEmpty(XYPlot plot, PlotTheme theme) {
        TextTitle message = new TextTitle("no values to show", AXIS);
        message.setPaint(theme.ink().soft());
        message.setBackgroundPaint(theme.ground().background());
        message.setPadding(new RectangleInsets(4.0, 10.0, 4.0, 10.0));
        plot.addAnnotation(new XYTitleAnnotation(0.5, 0.5, message, RectangleAnchor.CENTER));
    }

    private static void grid(XYPlot plot, PlotTheme theme) {
        plot.setDomainGridlinePaint(theme.ink().grid());
        plot.setDomainGridlineStroke(HAIRLINE);
        plot.setRangeGridlinePaint(theme.ink().grid());
        plot.setRangeGridlineStroke(HAIRLINE);
        plot.setDomainMinorGridlinePaint(theme.ink().faintGrid());
        plot.setDomainMinorGridlineStroke(HAIRLINE);
        plot.setRangeMinorGridlinePaint(theme.ink().faintGrid());
        plot.setRangeMinorGridlineStroke(HAIRLINE);
    }

    /** A chart of one panel, without a legend. */
    static JFreeChart chart(String title, Plot plot, PlotTheme theme) {
        JFreeChart chart = new JFreeChart(null, null, plot, false);
        chart.setBackgroundPaint(theme.ground().background());
        chart.setPadding(new RectangleInsets(4.0, 8.0, 4.0, 14.0));
        if (!title.isEmpty()) {
            chart.addSubtitle(heading(title, PANEL, 8.0, theme));
        }
        return chart;
    }

    /** The same with as little around it as can be. */
    static JFreeChart tight(String title, Plot plot, PlotTheme theme) {
        JFreeChart chart = chart(title, plot, theme);
        chart.setPadding(new RectangleInsets(6.0, 2.0, 1.0, 14.0));
        return chart;
    }

    /** A chart of one panel in a room. */
    static JFreeChart chart(String title, Plot plot, PlotTheme theme, Room room) {
        return room.given() ? tight(title, plot, theme) : chart(title, plot, theme);
    }

    /** The whole page: titles above, the legend of all panels below. */
    static JFreeChart page(Picture picture, Plot plot, Collection<LegendItem> legend, PlotTheme theme) {
        JFreeChart chart = new JFreeChart(null, null, plot, false);
        chart.setBackgroundPaint(theme.ground().background());
        chart.setPadding(new RectangleInsets(10.0, 14.0, 10.0, 14.0));
        if (!picture.title().isEmpty()) {
            chart.addSubtitle(heading(picture.title(), TITLE, 3.0, theme));
        }
        if (!picture.subtitle().isEmpty()) {
            TextTitle subtitle = heading(picture.subtitle(), SUBTITLE, 10.0, theme);
            subtitle.setPaint(theme.ink().soft());
            chart.addSubtitle(subtitle);
        }
        if (!legend.isEmpty()) {
            chart.addSubtitle(legend(legend, theme));
        }
        return chart;
    }

    private static TextTitle heading(String text, Font font, double below, PlotTheme theme) {
        TextTitle title = new TextTitle(
                text,
                font,
                theme.ink().text(),
                RectangleEdge.TOP,
                HorizontalAlignment.LEFT,
                Title.DEFAULT_VERTICAL_ALIGNMENT,
                new RectangleInsets(2.0, 6.0, below, 6.0));
        title.setTextAlignment(HorizontalAlignment.LEFT);
        return title;
    }

    private static LegendTitle legend(Collection<LegendItem> items, PlotTheme theme) {
        LegendItemCollection collection = new LegendItemCollection();
        items.forEach(collection::add);
        LegendTitle legend = new LegendTitle(() -> collection, LEFT_ALIGNED_ROWS, LEFT_ALIGNED_ROWS);
        legend.setPosition(RectangleEdge.BOTTOM);
        legend.setHorizontalAlignment(HorizontalAlignment.LEFT);
        legend.setItemFont(TICK);
        legend.setItemPaint(theme.ink().text());
        legend.setItemLabelPadding(new RectangleInsets(3.0, 4.0, 3.0, 18.0));
        legend.setLegendItemGraphicPadding(new RectangleInsets(3.0, 4.0, 3.0, 4.0));
        legend.setPadding(new RectangleInsets(6.0, 4.0, 2.0, 4.0));
        return legend;
    }
}

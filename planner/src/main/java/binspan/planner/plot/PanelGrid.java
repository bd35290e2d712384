package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.function.IntUnaryOperator;
import java.util.function.ToIntFunction;
import java.util.stream.IntStream;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.PlotState;

/** Charts in rows and columns, as wide and high as suits the largest of each column and row. */
final class PanelGrid extends Plot {
    private static final long serialVersionUID = 1L;

    private final transient List<PanelChart> panels;
    private final int columns;

    private PanelGrid(List<PanelChart> panels, int columns) {
        this.panels = panels;
        this.columns = columns;
        setBackgroundPaint(null);
        setOutlineVisible(false);
    }

    /** One panel that fills the page. */
    static PanelGrid alone(PanelChart panel) {
        return new PanelGrid(List.of(panel), 1);
    }

    /** A group as one chart. */
    static PanelChart of(PanelGroup group, PlotTheme theme) {
        List<PanelChart> charts =
                group.panels().stream().map(panel -> panel.chart(theme)).toList();
        PanelGrid grid = new PanelGrid(charts, Math.min(group.columns(), charts.size()));
        return new PanelChart(
                PlotStyle.chart(group.title(), grid, theme),
                charts.stream().flatMap(chart -> chart.legend().stream()).toList(),
                IntStream.of(grid.widths()).sum(),
                IntStream.of(grid.heights()).sum());
    }

    @Override
    public String getPlotType() {
        return "panels";
    }

    @Override
    public void draw(Graphics2D g2, Rectangle2D area, Point2D anchor, PlotState parentState, PlotRenderingInfo info) {
        int[] widths = widths();
        int[] heights = heights();
        double across = area.getWidth() / IntStream.of(widths).sum();
        double down = area.getHeight() / IntStream.of(heights).sum();
        for (int i = 0; i < panels.size(); i++) {
            int column = i % columns;
            int row = i / columns;
            Rectangle2D cell = new Rectangle2D.Double(
                    area.getX() + across * IntStream.of(widths).limit(column).sum(),
                    area.getY() + down * IntStream.of(heights).limit(row).sum(),
                    across * widths[column],
                    down * heights[row]);
            panels.get(i).chart().draw(g2, cell);
        }
    }

    private int[] widths() {
        return largest(columns, i -> i % columns, PanelChart::width);
    }

    private int[] heights() {
        return largest((panels.size() + columns - 1) / columns, i -> i / columns, PanelChart::height);
    }

    private int[] largest(int lines, IntUnaryOperator line, ToIntFunction<PanelChart> size) {
        int[] sizes = new int[lines];
        for (int i = 0; i < panels.size(); i++) {
            int at = line.applyAsInt(i);
            sizes[at] = Math.max(sizes[at], size.applyAsInt(panels.get(i)));
        }
        return sizes;
    }
}

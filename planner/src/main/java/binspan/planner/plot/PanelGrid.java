package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntUnaryOperator;
import java.util.function.ToIntFunction;
import java.util.stream.IntStream;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.LegendItem;
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

    /** No panel. */
    static PanelGrid empty() {
        return new PanelGrid(List.of(), 1);
    }

    /** A group as one chart. */
    static PanelChart of(PanelGroup group, PlotTheme theme, Room room) {
        if (room.given()) {
            return within(group, theme, room);
        }
        List<PanelChart> charts = group.panels().stream()
                .map(panel -> panel.chart(theme, Room.FREE))
                .toList();
        PanelGrid grid = new PanelGrid(charts, Math.min(group.columns(), charts.size()));
        return new PanelChart(
                PlotStyle.chart(group.title(), grid, theme),
                charts.stream().flatMap(chart -> chart.legend().stream()).toList(),
                IntStream.of(grid.widths()).sum(),
                IntStream.of(grid.heights()).sum());
    }

    private static PanelChart within(PanelGroup group, PlotTheme theme, Room room) {
        Room below = new Room(room.width(), Math.max(1.0, room.height() - group.headHeight()));
        PanelLayout layout = PanelLayout.of(group.panels(), group.columns(), below);
        List<PanelChart> charts = new ArrayList<>();
        List<LegendItem> legend = new ArrayList<>();
        for (int i = 0; i < layout.shown().size(); i++) {
            charts.add(layout.shown().get(i).chart(theme, layout.rooms().get(i)));
            legend.addAll(charts.get(i).legend());
        }
        int leftOut =
                layout.hidden() + charts.stream().mapToInt(PanelChart::leftOut).sum();
        PanelGrid grid = new PanelGrid(charts, layout.columns());
        return grid.chart(PlotStyle.tight(group.title(), grid, theme), legend, leftOut);
    }

    /** Charts of equal width side by side; those that do not fit into the row stand below. */
    static PanelGrid sideBySide(List<PanelChart> charts, int columns) {
        return new PanelGrid(charts, columns);
    }

    /** The grid as a panel. */
    PanelChart chart(JFreeChart around, List<LegendItem> legend, int leftOut) {
        return new PanelChart(
                around,
                legend,
                IntStream.of(widths()).sum(),
                IntStream.of(heights()).sum(),
                leftOut);
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

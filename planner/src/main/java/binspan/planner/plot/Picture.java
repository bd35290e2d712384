package binspan.planner.plot;

import java.util.LinkedHashMap;
import java.util.Map;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.LegendItem;

/**
 * A whole picture: title, subtitle, panels and one legend for all of them.
 *
 * @param title what is to be seen
 * @param subtitle for example the scenario and what is held fixed; empty for none
 * @param content what is drawn
 */
public record Picture(String title, String subtitle, Panel content) {
    private static final int NARROWEST = 1200;
    private static final int MAP_HEIGHT = 680;
    private static final int HEAD_HEIGHT = 70;
    private static final int LEGEND_HEIGHT = 50;

    /** The legend takes room from the panels, and the panels that are left out stand in the legend. */
    private static final int LEGEND_ROUNDS = 2;

    private static final double LARGE = 1e5;

    /** The picture as a chart in the light theme, with the size that suits it. */
    public PanelChart chart() {
        return chart(PlotTheme.LIGHT);
    }

    /** The picture as a chart in the colours of a theme, with the size that suits it. */
    public PanelChart chart(PlotTheme theme) {
        PanelChart panel = content.chart(theme, Room.FREE);
        Map<String, LegendItem> legend = legend(panel, theme);
        JFreeChart chart = PlotStyle.page(this, PanelGrid.alone(panel), legend.values(), theme);
        int inner = content instanceof HeatMap ? MAP_HEIGHT : panel.height();
        int height = inner + HEAD_HEIGHT + (legend.isEmpty() ? 0 : LEGEND_HEIGHT);
        return new PanelChart(chart, panel.legend(), Math.max(NARROWEST, panel.width()), height);
    }

    /** The picture as a chart that fills a room; parts for which there is none are left out, and the legend says how many. */
    PanelChart chart(PlotTheme theme, Room room) {
        PanelChart panel = content.chart(theme, within(room, 0.0));
        for (int i = 0; i < LEGEND_ROUNDS; i++) {
            double around = PageFrame.height(this, legend(panel, theme).values(), theme, room.width());
            panel = content.chart(theme, within(room, around));
        }
        JFreeChart chart = PageFrame.page(
                this, PanelGrid.alone(panel), legend(panel, theme).values(), theme);
        return new PanelChart(chart, panel.legend(), room.wide(NARROWEST), room.high(MAP_HEIGHT), panel.leftOut());
    }

    private static Room within(Room room, double around) {
        return new Room(Math.max(1.0, room.width() - PageFrame.SIDES), Math.max(1.0, room.height() - around));
    }

    /**
     * The height in which all parts can be read.
     *
     * @param width width in points
     * @return height in points; with less, parts are left out
     */
    public int fullHeight(int width) {
        Room room = within(new Room(width, LARGE), 0.0);
        PanelChart panel = content.chart(PlotTheme.LIGHT, room);
        double around = PageFrame.height(this, legend(panel, PlotTheme.LIGHT).values(), PlotTheme.LIGHT, width);
        return (int) Math.ceil(content.fullHeight(room.width()) + around);
    }

    /**
     * The height in which one panel can be read with the legend of all.
     *
     * @param width width in points
     * @return height in points
     */
    public int leastHeight(int width) {
        PanelChart panel = content.chart(PlotTheme.LIGHT, within(new Room(width, 1.0), 0.0));
        double around = PageFrame.height(this, legend(panel, PlotTheme.LIGHT).values(), PlotTheme.LIGHT, width);
        return (int) Math.ceil(content.least().height() + around);
    }

    /**
     * How many panels have no room in a size.
     *
     * @param width width in points
     * @param height height in points
     */
    public int leftOut(int width, int height) {
        return chart(PlotTheme.LIGHT, new Room(width, height)).leftOut();
    }

    /** The same picture without title and subtitle, for a surface that shows them itself. */
    public Picture untitled() {
        return new Picture("", "", content);
    }

    private static Map<String, LegendItem> legend(PanelChart panel, PlotTheme theme) {
        Map<String, LegendItem> legend = new LinkedHashMap<>();
        panel.legend().forEach(item -> legend.putIfAbsent(item.getLabel(), item));
        if (panel.leftOut() > 0) {
            LegendItem note = new LegendEntries(theme).leftOut(panel.leftOut());
            legend.put(note.getLabel(), note);
        }
        return legend;
    }
}

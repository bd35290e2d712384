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

    /** The picture as a chart in the light theme, with the size that suits it. */
    public PanelChart chart() {
        return chart(PlotTheme.LIGHT);
    }

    /** The picture as a chart in the colours of a theme, with the size that suits it. */
    public PanelChart chart(PlotTheme theme) {
        PanelChart panel = content.chart(theme);
        Map<String, LegendItem> legend = new LinkedHashMap<>();
        panel.legend().forEach(item -> legend.putIfAbsent(item.getLabel(), item));
        JFreeChart chart = PlotStyle.page(this, PanelGrid.alone(panel), legend.values(), theme);
        int inner = content instanceof HeatMap ? MAP_HEIGHT : panel.height();
        int height = inner + HEAD_HEIGHT + (legend.isEmpty() ? 0 : LEGEND_HEIGHT);
        return new PanelChart(chart, panel.legend(), Math.max(NARROWEST, panel.width()), height);
    }
}

package binspan.planner.plot;

import java.util.List;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.LegendItem;

/**
 * A panel ready for drawing.
 *
 * @param chart the chart without a legend
 * @param legend what the legend of the picture has to say about it
 * @param width width that suits it, in points
 * @param height height that suits it, in points
 * @param leftOut how many of its parts had no room
 */
public record PanelChart(JFreeChart chart, List<LegendItem> legend, int width, int height, int leftOut) {
    /** Copies the legend. */
    public PanelChart {
        legend = List.copyOf(legend);
    }

    /** A panel that shows all its parts. */
    PanelChart(JFreeChart chart, List<LegendItem> legend, int width, int height) {
        this(chart, legend, width, height, 0);
    }
}

package binspan.planner.plot;

import org.jfree.chart.LegendItem;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;

/** Lines and words that requirements have in common in all panels. */
final class Limits {
    static final String ALL_MET = "all requirements met";
    static final String NOT_MET = "failing side of a requirement";

    private Limits() {}

    /** A requirement as a line across the range axis. */
    static void line(XYPlot plot, double position) {
        plot.addRangeMarker(marker(position), Layer.FOREGROUND);
    }

    /** A requirement as a line across the domain axis. */
    static void domainLine(XYPlot plot, double position) {
        plot.addDomainMarker(marker(position), Layer.FOREGROUND);
    }

    private static ValueMarker marker(double position) {
        ValueMarker marker = new ValueMarker(position, PlotStyle.INK, PlotStyle.LIMIT);
        marker.setAlpha(1.0f);
        return marker;
    }

    /** What the hatching means. */
    static LegendItem failingEntry() {
        return LegendEntries.hatched(NOT_MET, true, PlotStyle.HATCH);
    }
}

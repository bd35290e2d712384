package binspan.planner.plot;

import java.util.List;
import org.jfree.chart.LegendItem;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;
import org.jfree.data.Range;

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

    /**
     * A requirement as a line across the range axis, with its failing side and its words; nothing where the axis has no place for it.
     *
     * @param plot the panel
     * @param axis what the range axis shows
     * @param requirement the requirement
     * @param range positions along the axis that are drawn
     * @param words where the words stand
     */
    static void labelled(XYPlot plot, Axis axis, RequirementLine requirement, Range range, AxisLocation words) {
        double position = axis.position(requirement.value());
        if (Double.isNaN(position)) {
            return;
        }
        plot.getRenderer().addAnnotation(FailingSide.ofRange(position, requirement.atLeast()), Layer.BACKGROUND);
        line(plot, position);
        plot.setRangeAxis(1, new LabelAxis("", List.of(new Mark(requirement.label(), position)), range));
        plot.setRangeAxisLocation(1, words);
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

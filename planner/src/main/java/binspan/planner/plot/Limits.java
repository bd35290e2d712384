package binspan.planner.plot;

import java.util.List;
import org.jfree.chart.LegendItem;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;
import org.jfree.data.Range;

/**
 * Lines and words that requirements have in common in all panels.
 *
 * @param theme colours
 */
record Limits(PlotTheme theme) {
    static final String ALL_MET = "all requirements met";
    static final String NOT_MET = "failing side of a requirement";

    /** A requirement as a line across the range axis. */
    void line(XYPlot plot, double position) {
        plot.addRangeMarker(marker(position), Layer.FOREGROUND);
    }

    /** A requirement as a line across the domain axis. */
    void domainLine(XYPlot plot, double position) {
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
    void labelled(XYPlot plot, Axis axis, RequirementLine requirement, Range range, AxisLocation words) {
        double position = axis.position(requirement.value());
        if (Double.isNaN(position)) {
            return;
        }
        plot.getRenderer().addAnnotation(FailingSide.ofRange(position, requirement.atLeast(), theme), Layer.BACKGROUND);
        line(plot, position);
        plot.setRangeAxis(1, new LabelAxis("", List.of(new Mark(requirement.label(), position)), range, theme));
        plot.setRangeAxisLocation(1, words);
    }

    private ValueMarker marker(double position) {
        ValueMarker marker = new ValueMarker(position, theme.ink().text(), PlotStyle.LIMIT);
        marker.setAlpha(1.0f);
        return marker;
    }

    /** What the hatching means. */
    LegendItem failingEntry() {
        return new LegendEntries(theme).hatched(NOT_MET, true, theme.ink().hatch());
    }
}

package binspan.planner.plot;

/** A part of a picture: one chart, or a group of them. */
public sealed interface Panel permits Curves, HeatMap, RankedBars, Histogram, RangeBars, PanelGroup {
    /** The chart that shows it, in the colours of a theme. */
    PanelChart chart(PlotTheme theme);
}

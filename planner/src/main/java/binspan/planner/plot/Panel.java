package binspan.planner.plot;

/** A part of a picture: one chart, or a group of them. */
public sealed interface Panel permits Curves, HeatMap, RankedBars, Histogram, RangeBars, PanelGroup {
    /**
     * The chart that shows it.
     *
     * @param theme colours
     * @param room room for it; parts for which there is none are left out, and the legend says how many
     */
    PanelChart chart(PlotTheme theme, Room room);

    /** The least room in which it can be read, of several parts the first. */
    Room least();

    /** The height in which all its parts can be read, at a width in points. */
    double fullHeight(double width);
}

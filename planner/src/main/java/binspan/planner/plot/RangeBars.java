package binspan.planner.plot;

import java.util.List;

/**
 * Allowed parts of several ranges, one below the other.
 *
 * @param title of these bars alone, empty if the picture's says it
 * @param bars from top to bottom, up to about six
 */
public record RangeBars(String title, List<RangeBar> bars) implements Panel {
    /** Copies the bars. */
    public RangeBars {
        bars = List.copyOf(bars);
    }

    @Override
    public PanelChart chart(PlotTheme theme) {
        return new RangeBarsChart(this, theme).build();
    }
}

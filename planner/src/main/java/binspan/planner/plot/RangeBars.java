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
    public PanelChart chart(PlotTheme theme, Room room) {
        return new RangeBarsChart(this, theme, room).build();
    }

    @Override
    public Room least() {
        return new Room(RangeBarsChart.LEAST_WIDTH, RangeBarsChart.leastHeight(this));
    }

    @Override
    public double fullHeight(double width) {
        return least().height();
    }
}

package binspan.planner.plot;

import java.util.List;
import java.util.Optional;

/**
 * How often a quantity takes which values.
 *
 * @param title of this histogram alone, for example how many meet the requirement; may be empty
 * @param x the quantity
 * @param bins its bars
 * @param requirement required value
 * @param quantiles labelled values, in the same order in all histograms of a picture: their look goes by the order
 */
public record Histogram(
        String title, Axis x, List<Bin> bins, Optional<RequirementLine> requirement, List<Mark> quantiles)
        implements Panel {
    /** Copies the lists. */
    public Histogram {
        bins = List.copyOf(bins);
        quantiles = List.copyOf(quantiles);
    }

    @Override
    public PanelChart chart(PlotTheme theme, Room room) {
        return new HistogramChart(this, theme, room).build();
    }

    @Override
    public Room least() {
        return HistogramChart.LEAST;
    }

    @Override
    public double fullHeight(double width) {
        return HistogramChart.FULL_HEIGHT;
    }
}

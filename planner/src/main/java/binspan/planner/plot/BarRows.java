package binspan.planner.plot;

import java.util.List;
import org.jfree.chart.axis.SymbolAxis;
import org.jfree.data.xy.XYIntervalSeries;
import org.jfree.data.xy.XYIntervalSeriesCollection;

/** Rows of horizontal bars: their labels, and bars as intervals around whole numbers from 0 for the topmost row. */
final class BarRows {
    private static final double HALF_ROW = 0.5;

    private BarRows() {}

    /** The labels of the rows. */
    static SymbolAxis labels(List<String> labels, PlotTheme theme) {
        SymbolAxis axis = new SymbolAxis(null, labels.toArray(String[]::new));
        PlotStyle.dress(axis, theme);
        axis.setGridBandsVisible(false);
        axis.setTickMarksVisible(false);
        axis.setInverted(true);
        axis.setRange(-HALF_ROW - 0.1, Math.max(1, labels.size()) - HALF_ROW + 0.1);
        return axis;
    }

    /** An empty series of bars. */
    static XYIntervalSeries series() {
        return new XYIntervalSeries("bars", false, true);
    }

    /** Adds a bar between two positions to a row. */
    static void add(XYIntervalSeries series, int row, double halfHeight, Interval positions) {
        series.add(row, row - halfHeight, row + halfHeight, positions.upper(), positions.lower(), positions.upper());
    }

    /** A dataset of one series. */
    static XYIntervalSeriesCollection dataset(XYIntervalSeries series) {
        XYIntervalSeriesCollection dataset = new XYIntervalSeriesCollection();
        dataset.addSeries(series);
        return dataset;
    }
}

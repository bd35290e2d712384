package binspan.planner.plot;

import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.XYDataset;

/** Lines with a marker at about every tenth of them, and at every point that stands alone between gaps. */
final class SparseMarkers extends XYLineAndShapeRenderer {
    private static final long serialVersionUID = 1L;
    private static final int MARKERS = 10;
    private static final int STAGGER = 3;

    SparseMarkers() {
        super(true, true);
        setDrawSeriesLineAsPath(true);
    }

    /** Gives a series its look. */
    void dress(int series, SeriesStyle style) {
        setSeriesPaint(series, style.colour());
        setSeriesStroke(series, style.stroke());
        setSeriesShape(series, style.marker());
    }

    @Override
    public boolean getItemShapeVisible(int series, int item) {
        XYPlot plot = getPlot();
        XYDataset dataset = plot.getDataset(plot.getIndexOf(this));
        int every = Math.max(1, dataset.getItemCount(series) / MARKERS);
        int first = every * (series % STAGGER) / STAGGER + every / 2;
        return every == 1 || item % every == first % every || alone(dataset, series, item);
    }

    private static boolean alone(XYDataset dataset, int series, int item) {
        return gap(dataset, series, item - 1) && gap(dataset, series, item + 1);
    }

    private static boolean gap(XYDataset dataset, int series, int item) {
        return item < 0 || item >= dataset.getItemCount(series) || Double.isNaN(dataset.getYValue(series, item));
    }
}

package binspan.planner.plot;

import java.util.List;
import java.util.stream.Stream;
import org.jfree.chart.LegendItem;
import org.jfree.chart.annotations.XYTextAnnotation;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.PlotOrientation;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.Range;
import org.jfree.data.xy.DefaultXYDataset;
import org.jfree.data.xy.XYIntervalSeries;

/** Draws ranges of different quantities in one length, with their ends, the allowed part and the planned value. */
final class RangeBarsChart {
    private static final int WIDTH = 1172;
    private static final int ROW_HEIGHT = 92;
    private static final int FRAME_HEIGHT = 24;
    static final double LEAST_WIDTH = 320.0;
    private static final double TIGHT_ROW = 66.0;
    private static final double MOST_LABEL_SHARE = 0.3;
    private static final double TEXT_MARGIN = 12.0;
    private static final double BESIDE = 0.13;
    private static final double HALF_BAR = 0.14;
    private static final double GAP = 0.008;
    private static final double GAP_POINTS = 9.0;
    private static final double TEXT_DISTANCE = 0.2;
    private static final double MARKER_SIZE = 15.0;
    private static final int DIAMOND = 3;

    private final RangeBars ranges;
    private final PlotTheme theme;
    private final Room room;
    private final XYPlot plot;

    RangeBarsChart(RangeBars ranges, PlotTheme theme, Room room) {
        this.theme = theme;
        this.room = room;
        this.ranges = ranges;
        List<String> names =
                ranges.bars().stream().map(bar -> bar.quantity().name()).toList();
        this.plot = PlotStyle.plot(
                BarRows.labels(fitted(names), theme), new ScaledAxis(Axis.linear("", ""), shares(names), theme), theme);
    }

    /** The height of its rows. */
    static double leastHeight(RangeBars ranges) {
        return FRAME_HEIGHT + TIGHT_ROW * Math.max(2, ranges.bars().size());
    }

    private List<String> fitted(List<String> names) {
        return room.given()
                ? names.stream()
                        .map(name -> Words.shortened(name, PlotStyle.TICK, MOST_LABEL_SHARE * room.width()))
                        .toList()
                : names;
    }

    /** The shares of a range that are drawn, room for the ends in words beside them. */
    private Range shares(List<String> names) {
        double beside = BESIDE;
        if (room.given()) {
            double labels = fitted(names).stream()
                    .mapToDouble(RangeBarsChart::length)
                    .max()
                    .orElse(0.0);
            double ends = ranges.bars().stream()
                    .flatMap(bar -> Stream.of(
                                    bar.quantity().lowest(), bar.quantity().highest())
                            .map(end -> bar.quantity().text(end)))
                    .mapToDouble(RangeBarsChart::length)
                    .max()
                    .orElse(0.0);
            double left = Math.max(1.0, room.width() - labels - FRAME_HEIGHT - 2.0 * ends);
            beside = Math.min(1.0, GAP + (ends + TEXT_MARGIN) / left);
        }
        return new Range(-beside, 1.0 + beside);
    }

    private static double length(String text) {
        return Words.length(text, PlotStyle.TICK);
    }

    PanelChart build() {
        plot.setOrientation(PlotOrientation.HORIZONTAL);
        plot.setOutlineVisible(false);
        plot.setDomainGridlinesVisible(false);
        plot.setRangeGridlinesVisible(false);
        plot.getRangeAxis().setVisible(false);
        plot.getDomainAxis().setAxisLineVisible(false);
        plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
        XYIntervalSeries wholes = BarRows.series();
        XYIntervalSeries boxes = BarRows.series();
        DefaultXYDataset planned = new DefaultXYDataset();
        for (int row = 0; row < ranges.bars().size(); row++) {
            RangeBar bar = ranges.bars().get(row);
            BarRows.add(wholes, row, HALF_BAR, new Interval(0.0, 1.0));
            Interval box = new Interval(
                    share(bar, bar.box().lower()), share(bar, bar.box().upper()));
            BarRows.add(boxes, row, HALF_BAR, box);
            planned.addSeries(row, new double[][] {{row}, {share(bar, bar.planned())}});
            texts(bar, row, box);
        }
        draw(wholes, boxes, planned);
        int height = FRAME_HEIGHT + ROW_HEIGHT * Math.max(2, ranges.bars().size());
        return new PanelChart(
                PlotStyle.chart(ranges.title(), plot, theme, room), legend(), room.wide(WIDTH), room.high(height));
    }

    /** Where a value lies between the ends of its range, 0 to 1; zero on a logarithmic axis is its beginning. */
    private static double share(RangeBar bar, double value) {
        Axis axis = bar.quantity();
        double from = axis.position(axis.lowest());
        double share = (axis.position(value) - from) / (axis.position(axis.highest()) - from);
        boolean beforeAll = Double.isNaN(share) && !Double.isNaN(value);
        return beforeAll ? 0.0 : Math.max(0.0, Math.min(1.0, share));
    }

    private void draw(XYIntervalSeries wholes, XYIntervalSeries boxes, DefaultXYDataset planned) {
        plot.setDataset(0, BarRows.dataset(wholes));
        plot.setRenderer(
                0, PatternPainter.renderer(new PatternPainter(theme.ground().range(), i -> true, theme)));
        plot.setDataset(1, BarRows.dataset(boxes));
        plot.setRenderer(
                1, PatternPainter.renderer(new PatternPainter(theme.fill().bar(), i -> true, theme)));
        XYLineAndShapeRenderer markers = new XYLineAndShapeRenderer(false, true);
        markers.setUseFillPaint(true);
        markers.setDefaultFillPaint(theme.ground().background());
        markers.setUseOutlinePaint(true);
        markers.setDefaultOutlinePaint(theme.ink().text());
        markers.setDefaultOutlineStroke(PlotStyle.LIMIT);
        markers.setAutoPopulateSeriesShape(false);
        markers.setDefaultShape(SeriesStyle.marker(DIAMOND, MARKER_SIZE));
        plot.setDataset(2, planned);
        plot.setRenderer(2, markers);
    }

    /** Ends of the range beside the bar, those of the box below and away from each other, the planned value above. */
    private void texts(RangeBar bar, int row, Interval box) {
        Axis axis = bar.quantity();
        double gap = room.given() ? GAP_POINTS / room.width() : GAP;
        text(axis.text(axis.lowest()), row, -gap, TextAnchor.CENTER_RIGHT);
        text(axis.text(axis.highest()), row, 1.0 + gap, TextAnchor.CENTER_LEFT);
        if (box.lower() > 0.0) {
            text(axis.text(bar.box().lower()), row + TEXT_DISTANCE, box.lower(), TextAnchor.TOP_RIGHT);
        }
        if (box.upper() < 1.0) {
            text(axis.text(bar.box().upper()), row + TEXT_DISTANCE, box.upper(), TextAnchor.TOP_LEFT);
        }
        if (!Double.isNaN(bar.planned())) {
            text(axis.text(bar.planned()), row - TEXT_DISTANCE, share(bar, bar.planned()), TextAnchor.BOTTOM_CENTER);
        }
    }

    private void text(String text, double row, double share, TextAnchor anchor) {
        XYTextAnnotation annotation = new XYTextAnnotation(text, row, share);
        annotation.setFont(PlotStyle.TICK);
        annotation.setPaint(theme.ink().text());
        annotation.setTextAnchor(anchor);
        plot.addAnnotation(annotation);
    }

    private List<LegendItem> legend() {
        return List.of(
                new LegendEntries(theme).filled("whole range", theme.ground().range()),
                new LegendEntries(theme).filled("allowed", theme.fill().bar()),
                new LegendEntries(theme).marker("planned", SeriesStyle.marker(DIAMOND, MARKER_SIZE)));
    }
}

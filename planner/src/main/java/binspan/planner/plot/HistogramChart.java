package binspan.planner.plot;

import java.awt.Stroke;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import org.jfree.chart.LegendItem;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;
import org.jfree.data.Range;
import org.jfree.data.xy.XYIntervalSeries;

/** Draws a histogram with its requirement and quantiles. */
final class HistogramChart {
    private static final int WIDTH = 520;
    private static final int HEIGHT = 330;
    static final Room LEAST = new Room(220.0, 140.0);
    static final double FULL_HEIGHT = 180.0;
    private static final double FRAME = 60.0;
    private static final double MARGIN = 0.05;
    private static final double LEAST_COUNT = 5.0;
    private static final Axis COUNT = Axis.linear("Count", "");

    private final Histogram histogram;
    private final PlotTheme theme;
    private final Room room;
    private final Range range;

    HistogramChart(Histogram histogram, PlotTheme theme, Room room) {
        this.theme = theme;
        this.room = room;
        this.histogram = histogram;
        DoubleStream ends = histogram.bins().stream().flatMapToDouble(bin -> DoubleStream.of(bin.lower(), bin.upper()));
        DoubleStream limit = histogram.requirement().stream().mapToDouble(RequirementLine::value);
        this.range = Positions.of(histogram.x(), DoubleStream.concat(ends, limit), MARGIN);
    }

    PanelChart build() {
        DoubleStream counts = histogram.bins().stream().mapToDouble(Bin::count);
        Range up = Positions.of(COUNT, DoubleStream.concat(DoubleStream.of(0.0, LEAST_COUNT), counts), MARGIN);
        ScaledAxis across = new ScaledAxis(histogram.x(), range, theme);
        if (room.given()) {
            across.wrapped(room.width() - FRAME);
        }
        ScaledAxis counted = new ScaledAxis(COUNT, up, theme);
        counted.setDense(room.given());
        XYPlot plot = PlotStyle.plot(across, counted, theme);
        plot.setDomainGridlinesVisible(false);
        plot.setRenderer(PatternPainter.renderer(new PatternPainter(theme.fill().histogram(), i -> true, theme)));
        plot.setDomainAxis(1, LabelAxis.blank(range, theme));
        plot.setDomainAxisLocation(1, AxisLocation.TOP_OR_RIGHT);
        plot.setDataset(BarRows.dataset(bars()));
        if (histogram.bins().isEmpty()) {
            PlotStyle.sayEmpty(plot, theme);
        }
        histogram.requirement().ifPresent(requirement -> limit(plot, requirement));
        quantiles(plot);
        return new PanelChart(
                PlotStyle.chart(histogram.title(), plot, theme, room), legend(), room.wide(WIDTH), room.high(HEIGHT));
    }

    private XYIntervalSeries bars() {
        XYIntervalSeries series = BarRows.series();
        for (Bin bin : histogram.bins()) {
            double from = histogram.x().position(bin.lower());
            double to = histogram.x().position(bin.upper());
            if (!Double.isNaN(from) && !Double.isNaN(to)) {
                series.add((from + to) / 2.0, from, to, bin.count(), 0.0, bin.count());
            }
        }
        return series;
    }

    private void limit(XYPlot plot, RequirementLine requirement) {
        double position = histogram.x().position(requirement.value());
        if (Double.isNaN(position)) {
            return;
        }
        plot.getRenderer()
                .addAnnotation(FailingSide.ofDomain(position, requirement.atLeast(), theme), Layer.FOREGROUND);
        new Limits(theme).domainLine(plot, position);
        plot.setDomainAxis(1, new LabelAxis("", List.of(new Mark(label(requirement), position)), range, theme));
    }

    private String label(RequirementLine requirement) {
        boolean fits = Words.length(requirement.label(), PlotStyle.TICK) < room.width() - 2.0 * FRAME;
        return fits ? requirement.label() : requirement.brief().label();
    }

    private void quantiles(XYPlot plot) {
        for (int i = 0; i < histogram.quantiles().size(); i++) {
            double position =
                    histogram.x().position(histogram.quantiles().get(i).value());
            if (!Double.isNaN(position)) {
                ValueMarker marker = new ValueMarker(position, theme.ink().text(), stroke(i));
                marker.setAlpha(1.0f);
                plot.addDomainMarker(marker, Layer.FOREGROUND);
            }
        }
    }

    private static Stroke stroke(int index) {
        return SeriesStyle.dashed(index + 1, 1.8f);
    }

    private List<LegendItem> legend() {
        List<LegendItem> items = new ArrayList<>();
        for (int i = 0; i < histogram.quantiles().size(); i++) {
            items.add(new LegendEntries(theme)
                    .line(
                            histogram.quantiles().get(i).label(),
                            stroke(i),
                            theme.ink().text()));
        }
        if (histogram.requirement().isPresent()) {
            items.add(new Limits(theme).failingEntry());
        }
        return items;
    }
}

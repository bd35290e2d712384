package binspan.planner.plot;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.jfree.chart.LegendItem;
import org.jfree.chart.axis.AxisLabelLocation;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.Range;
import org.jfree.data.xy.DefaultXYDataset;

/** Puts curves into panels that share their horizontal axis. */
final class CurvesChart {
    private static final int WIDTH = 760;
    private static final int AXIS_HEIGHT = 70;
    private static final int ONLY_PANEL = 600;
    private static final int PANEL_HEIGHT = 260;
    private static final int LEAST_PANEL_HEIGHT = 165;
    private static final int TALLEST = 1500;
    private static final int MARK_HEIGHT = 24;
    private static final double MARGIN = 0.07;

    private final Curves curves;
    private final PlotTheme theme;
    private final Range xPositions;
    private final List<String> names;
    private final boolean several;

    CurvesChart(Curves curves, PlotTheme theme) {
        this.theme = theme;
        this.curves = curves;
        this.xPositions = Positions.of(curves.x(), xValues(), 0.0);
        Set<String> distinct = new LinkedHashSet<>();
        curves.panels().forEach(panel -> panel.series().forEach(series -> distinct.add(series.name())));
        this.names = List.copyOf(distinct);
        this.several = curves.panels().stream().anyMatch(panel -> panel.series().size() > 1);
    }

    private DoubleStream xValues() {
        DoubleStream points = curves.panels().stream()
                .flatMap(panel -> panel.series().stream())
                .flatMap(series -> series.points().stream())
                .mapToDouble(Point::x);
        return DoubleStream.concat(points, curves.marks().stream().mapToDouble(Mark::value));
    }

    PanelChart build() {
        ScaledAxis x = new ScaledAxis(curves.x(), xPositions, theme);
        CombinedDomainXYPlot combined = new CombinedDomainXYPlot(x);
        combined.setInsets(RectangleInsets.ZERO_INSETS);
        combined.setGap(6.0);
        for (int i = 0; i < curves.panels().size(); i++) {
            boolean labelled = i == 0 && !curves.marks().isEmpty();
            combined.add(subplot(curves.panels().get(i), i == 0), each() + (labelled ? MARK_HEIGHT : 0));
        }
        int count = curves.panels().size();
        int height = AXIS_HEIGHT + count * each();
        return new PanelChart(PlotStyle.chart(curves.title(), combined, theme), legend(), WIDTH, height);
    }

    private int each() {
        int count = curves.panels().size();
        return count == 1 ? ONLY_PANEL : Math.max(LEAST_PANEL_HEIGHT, Math.min(PANEL_HEIGHT, TALLEST / count));
    }

    private XYPlot subplot(CurvePanel panel, boolean first) {
        DoubleStream limit = panel.requirement().stream().mapToDouble(RequirementLine::value);
        Range range = Positions.of(panel.y(), DoubleStream.concat(yValues(panel), limit), MARGIN);
        ScaledAxis y = new ScaledAxis(panel.y(), range, theme);
        y.setLabel(null);
        XYPlot plot = PlotStyle.plot(null, y, theme);
        plot.setRenderer(renderer(panel));
        plot.setDataset(dataset(panel));
        if (yValues(panel).map(panel.y()::position).noneMatch(Double::isFinite)) {
            PlotStyle.sayEmpty(plot, theme);
        }
        heading(plot, panel, first);
        bands(plot);
        panel.requirement()
                .ifPresent(requirement ->
                        new Limits(theme).labelled(plot, panel.y(), requirement, range, AxisLocation.BOTTOM_OR_RIGHT));
        return plot;
    }

    private static DoubleStream yValues(CurvePanel panel) {
        return panel.series().stream()
                .flatMap(series -> series.points().stream())
                .mapToDouble(Point::y);
    }

    /** The title of the vertical axis stands level above its panel: readable, and never longer than the panel is high. */
    private void heading(XYPlot plot, CurvePanel panel, boolean first) {
        List<Mark> marks = new ArrayList<>();
        for (Mark mark : curves.marks()) {
            double position = curves.x().position(mark.value());
            ValueMarker line = new ValueMarker(position, theme.ink().text(), PlotStyle.MARK);
            line.setAlpha(1.0f);
            plot.addDomainMarker(line, Layer.FOREGROUND);
            marks.add(new Mark(mark.label(), position));
        }
        LabelAxis top = new LabelAxis(panel.y().title(), first ? marks : List.of(), xPositions, theme);
        top.setLabelLocation(AxisLabelLocation.LOW_END);
        top.setLabelInsets(new RectangleInsets(4.0, 0.0, 4.0, 0.0));
        plot.setDomainAxis(1, top);
        plot.setDomainAxisLocation(1, AxisLocation.TOP_OR_RIGHT);
    }

    private void bands(XYPlot plot) {
        for (Interval met : curves.met()) {
            double from = curves.x().position(met.lower());
            double to = curves.x().position(met.upper());
            plot.getRenderer()
                    .addAnnotation(
                            new MetStretch(Double.isNaN(from) ? Double.NEGATIVE_INFINITY : from, to, theme),
                            Layer.BACKGROUND);
        }
    }

    private SparseMarkers renderer(CurvePanel panel) {
        SparseMarkers renderer = new SparseMarkers();
        for (int i = 0; i < panel.series().size(); i++) {
            renderer.dress(i, style(panel.series().get(i)));
        }
        return renderer;
    }

    /** Where each panel has one series, its title says which: all look alike. */
    private SeriesStyle style(Series series) {
        return SeriesStyle.of(several ? names.indexOf(series.name()) : 0, theme);
    }

    private DefaultXYDataset dataset(CurvePanel panel) {
        DefaultXYDataset dataset = new DefaultXYDataset();
        for (int i = 0; i < panel.series().size(); i++) {
            List<Point> points = panel.series().get(i).points();
            double[] x = points.stream()
                    .mapToDouble(point -> curves.x().position(point.x()))
                    .toArray();
            double[] y = points.stream()
                    .mapToDouble(point -> panel.y().position(point.y()))
                    .toArray();
            boolean any = DoubleStream.of(y).anyMatch(Double::isFinite);
            dataset.addSeries(i, any ? new double[][] {x, y} : new double[2][0]);
        }
        return dataset;
    }

    private List<LegendItem> legend() {
        Stream<LegendItem> series = several
                ? names.stream()
                        .map(name -> new LegendEntries(theme).series(name, SeriesStyle.of(names.indexOf(name), theme)))
                : Stream.empty();
        Stream<LegendItem> met =
                curves.met().isEmpty() ? Stream.empty() : Stream.of(new LegendEntries(theme).met(Limits.ALL_MET));
        boolean limits =
                curves.panels().stream().anyMatch(panel -> panel.requirement().isPresent());
        Stream<LegendItem> failing = limits ? Stream.of(new Limits(theme).failingEntry()) : Stream.empty();
        return Stream.of(series, met, failing).flatMap(items -> items).toList();
    }
}

package binspan.planner.plot;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.jfree.chart.JFreeChart;
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
    private static final double TIGHT_AXIS = 54.0;
    private static final double TIGHT_PANEL = 84.0;
    private static final double FULL_PANEL = 120.0;
    private static final double FULL_ONLY_PANEL = 200.0;
    private static final double COLUMN = 250.0;
    private static final double NARROW = 420.0;
    private static final double LEFT = 70.0;

    static final Room LEAST = new Room(COLUMN, TIGHT_AXIS + TIGHT_PANEL);

    private final Curves curves;
    private final PlotTheme theme;
    private final Room room;
    private final Range xPositions;
    private final List<String> names;
    private final boolean several;

    CurvesChart(Curves curves, PlotTheme theme, Room room) {
        this.theme = theme;
        this.room = room;
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

    /** The height in which so many panels can be read, one below the other. */
    static double fullHeight(int panels) {
        return TIGHT_AXIS + (panels == 1 ? FULL_ONLY_PANEL : panels * FULL_PANEL);
    }

    PanelChart build() {
        if (room.given()) {
            return within();
        }
        int count = curves.panels().size();
        CombinedDomainXYPlot combined = column(curves.panels(), WIDTH);
        int height = AXIS_HEIGHT + count * each();
        return new PanelChart(PlotStyle.chart(curves.title(), combined, theme), legend(), WIDTH, height);
    }

    /** One column, or two where the panels would be too low in one; of those that do not fit the first ones. */
    private PanelChart within() {
        int rows = new Room(room.width(), room.height() - TIGHT_AXIS).rows(TIGHT_PANEL);
        int count = curves.panels().size();
        int columns = Math.min(count > rows || squat() ? 2 : 1, room.columns(COLUMN));
        int shown = Math.min(count, rows * columns);
        int high = (shown + columns - 1) / columns;
        List<PanelChart> charts = new ArrayList<>();
        for (int first = 0; first < shown; first += high) {
            List<CurvePanel> panels = curves.panels().subList(first, Math.min(shown, first + high));
            double width = room.width() / columns;
            JFreeChart chart = PlotStyle.tight("", column(panels, width), theme);
            charts.add(new PanelChart(chart, List.of(), Math.max(1, (int) width), room.high(1)));
        }
        PanelGrid grid = PanelGrid.sideBySide(charts, columns);
        return grid.chart(PlotStyle.tight(curves.title(), grid, theme), legend(), count - shown);
    }

    /** Whether one column would be low and wide. */
    private boolean squat() {
        boolean low = room.height() < fullHeight(curves.panels().size());
        return low && curves.panels().size() > 1 && room.width() > 2.0 * NARROW;
    }

    private CombinedDomainXYPlot column(List<CurvePanel> panels, double width) {
        ScaledAxis x = new ScaledAxis(curves.x(), xPositions, theme);
        if (room.given()) {
            x.wrapped(width - LEFT);
        }
        CombinedDomainXYPlot combined = new CombinedDomainXYPlot(x);
        combined.setInsets(RectangleInsets.ZERO_INSETS);
        combined.setGap(6.0);
        for (int i = 0; i < panels.size(); i++) {
            boolean labelled = i == 0 && !curves.marks().isEmpty();
            int height = room.given() ? (int) TIGHT_PANEL : each();
            combined.add(subplot(panels.get(i), i == 0, width), height + (labelled ? MARK_HEIGHT : 0));
        }
        return combined;
    }

    private int each() {
        int count = curves.panels().size();
        return count == 1 ? ONLY_PANEL : Math.max(LEAST_PANEL_HEIGHT, Math.min(PANEL_HEIGHT, TALLEST / count));
    }

    private XYPlot subplot(CurvePanel panel, boolean first, double width) {
        DoubleStream limit = panel.requirement().stream().mapToDouble(RequirementLine::value);
        Range range = Positions.of(panel.y(), DoubleStream.concat(yValues(panel), limit), MARGIN);
        ScaledAxis y = new ScaledAxis(panel.y(), range, theme);
        y.setDense(room.given());
        y.setLabel(null);
        XYPlot plot = PlotStyle.plot(null, y, theme);
        plot.setRenderer(renderer(panel));
        plot.setDataset(dataset(panel));
        if (yValues(panel).map(panel.y()::position).noneMatch(Double::isFinite)) {
            PlotStyle.sayEmpty(plot, theme);
        }
        heading(plot, panel, first, width);
        bands(plot);
        panel.requirement()
                .ifPresent(requirement -> new Limits(theme)
                        .labelled(
                                plot,
                                panel.y(),
                                width < NARROW ? requirement.brief() : requirement,
                                range,
                                AxisLocation.BOTTOM_OR_RIGHT));
        return plot;
    }

    private static DoubleStream yValues(CurvePanel panel) {
        return panel.series().stream()
                .flatMap(series -> series.points().stream())
                .mapToDouble(Point::y);
    }

    /** The title of the vertical axis stands level above its panel: readable, and never longer than the panel is high. */
    private void heading(XYPlot plot, CurvePanel panel, boolean first, double width) {
        List<Mark> marks = new ArrayList<>();
        for (Mark mark : curves.marks()) {
            double position = curves.x().position(mark.value());
            ValueMarker line = new ValueMarker(position, theme.ink().text(), PlotStyle.MARK);
            line.setAlpha(1.0f);
            plot.addDomainMarker(line, Layer.FOREGROUND);
            marks.add(new Mark(mark.label(), position));
        }
        String title = room.given()
                ? Words.shortened(panel.y().title(), PlotStyle.AXIS, width - LEFT)
                : panel.y().title();
        LabelAxis top = new LabelAxis(title, first ? marks : List.of(), xPositions, theme);
        top.setApart(room.given());
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

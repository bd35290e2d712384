package binspan.planner.plot;

import java.awt.BasicStroke;
import java.awt.Stroke;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.jfree.chart.LegendItem;
import org.jfree.chart.annotations.XYBoxAnnotation;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.data.Range;
import org.jfree.data.xy.DefaultXYDataset;

/** Puts colours, feasible region, contours, points and boxes into one map. */
final class HeatMapChart {
    private static final int WIDTH = 660;
    private static final int HEIGHT = 540;
    static final Room LEAST = new Room(330.0, 160.0);
    static final double FULL_HEIGHT = 260.0;
    private static final double FRAME_WIDTH = 150.0;
    private static final double FRAME_HEIGHT = 66.0;
    private static final double HEAD_HEIGHT = 30.0;
    private static final double POINT_SIZE = 13.0;
    private static final float CONTOUR = 2.2f;
    private static final Stroke CASING = new BasicStroke(4.8f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    private static final Stroke BORDER = new BasicStroke(4.2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
    private static final Stroke BORDER_CASING = new BasicStroke(8.0f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
    private static final int[] TENTHS = {5, 3, 7, 2, 8, 4, 6, 1, 9};

    private final HeatMap map;
    private final PlotTheme theme;
    private final Room room;
    private final double[] x;
    private final double[] y;
    private final XYPlot plot;
    private final List<MapLabels.Label> labels = new ArrayList<>();
    private final List<MapLabels.Label> numbers = new ArrayList<>();
    private int layers;

    HeatMapChart(HeatMap map, PlotTheme theme, Room room) {
        this.theme = theme;
        this.room = room;
        this.map = map;
        Lattice lattice = map.heat().values();
        this.x = ContourLines.positions(map.x(), lattice.x());
        this.y = ContourLines.positions(map.y(), lattice.y());
        Range across = Positions.of(map.x(), DoubleStream.of(lattice.x()), 0.0);
        Range up = Positions.of(map.y(), DoubleStream.of(lattice.y()), 0.0);
        this.plot = PlotStyle.plot(
                fitted(new ScaledAxis(map.x(), across, theme), room.width() - FRAME_WIDTH),
                fitted(new ScaledAxis(map.y(), up, theme), upright()),
                theme);
    }

    PanelChart build() {
        plot.setBackgroundPaint(theme.ground().blank());
        plot.setDomainGridlinesVisible(false);
        plot.setRangeGridlinesVisible(false);
        plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
        Optional<FeasibleRegion> region = map.overlays().margin().map(this::region);
        contours();
        region.ifPresent(this::border);
        points();
        boxes();
        colours(region);
        labels.addAll(numbers);
        plot.addAnnotation(new MapLabels(labels, theme));
        return new PanelChart(
                PlotStyle.chart(map.title(), plot, theme, room), legend(), room.wide(WIDTH), room.high(HEIGHT));
    }

    /** Length of a title that runs beside the map. */
    private double upright() {
        return room.height() - FRAME_HEIGHT - (map.title().isEmpty() ? 0.0 : HEAD_HEIGHT);
    }

    private ScaledAxis fitted(ScaledAxis axis, double length) {
        return room.given() ? axis.wrapped(length) : axis;
    }

    private void colours(Optional<FeasibleRegion> region) {
        double[][] values = map.heat().values().values();
        Axis z = map.heat().z();
        Range colours = Positions.of(z, Arrays.stream(values).flatMapToDouble(Arrays::stream), 0.0);
        double[][] positions = Arrays.stream(values)
                .map(row -> Arrays.stream(row).map(z::position).toArray())
                .toArray(double[][]::new);
        Rectangle2D extent = new Rectangle2D.Double(x[0], y[0], x[x.length - 1] - x[0], y[y.length - 1] - y[0]);
        BufferedImage image = HeatImage.of(x, y, positions, colours);
        plot.getRenderer(0).addAnnotation(new HeatAnnotation(image, extent, region, theme), Layer.BACKGROUND);
        if (missing() == (long) values.length * x.length) {
            PlotStyle.sayEmpty(plot, theme);
            return;
        }
        plot.setRangeAxis(1, fitted(new ColourBarAxis(z, colours, theme), upright()));
        plot.setRangeAxisLocation(1, AxisLocation.BOTTOM_OR_RIGHT);
    }

    /** How many values the colours cannot show. */
    private long missing() {
        return Arrays.stream(map.heat().values().values())
                .flatMapToDouble(Arrays::stream)
                .filter(value -> Double.isNaN(map.heat().z().position(value)))
                .count();
    }

    private FeasibleRegion region(Lattice margin) {
        return FeasibleRegion.of(
                ContourLines.positions(map.x(), margin.x()),
                ContourLines.positions(map.y(), margin.y()),
                margin.values());
    }

    private void contours() {
        DefaultXYDataset lines = new DefaultXYDataset();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        List<Contour> contours = map.overlays().contours();
        for (int i = 0; i < contours.size(); i++) {
            List<List<Point>> pieces = contours.get(i).lines().stream()
                    .map(line -> line.stream().map(this::position).toList())
                    .toList();
            lines.addSeries(i, joined(pieces));
            renderer.setSeriesStroke(i, SeriesStyle.dashed(i, CONTOUR));
            number(i + 1, pieces);
        }
        addCased(lines, renderer, CASING);
    }

    private void border(FeasibleRegion region) {
        DefaultXYDataset line = new DefaultXYDataset();
        line.addSeries(0, joined(region.border()));
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        renderer.setSeriesStroke(0, BORDER);
        addCased(line, renderer, BORDER_CASING);
    }

    /** Lines are drawn twice, in the background's colour and wide below, so that they show on dark and light colours. */
    private void addCased(DefaultXYDataset lines, XYLineAndShapeRenderer renderer, Stroke casingStroke) {
        XYLineAndShapeRenderer casing = new XYLineAndShapeRenderer(true, false);
        for (int i = 0; i < lines.getSeriesCount(); i++) {
            casing.setSeriesPaint(i, theme.ground().background());
            casing.setSeriesStroke(i, casingStroke);
            renderer.setSeriesPaint(i, theme.ink().text());
        }
        casing.setDrawSeriesLineAsPath(true);
        renderer.setDrawSeriesLineAsPath(true);
        add(lines, casing);
        add(lines, renderer);
    }

    private void add(DefaultXYDataset dataset, XYLineAndShapeRenderer renderer) {
        plot.setDataset(layers, dataset);
        plot.setRenderer(layers, renderer);
        layers++;
    }

    /** Pieces one after the other, with gaps between them. */
    private static double[][] joined(List<List<Point>> pieces) {
        List<Point> points = new ArrayList<>();
        for (List<Point> piece : pieces) {
            points.addAll(piece);
            points.add(new Point(Double.NaN, Double.NaN));
        }
        return new double[][] {
            points.stream().mapToDouble(Point::x).toArray(),
            points.stream().mapToDouble(Point::y).toArray()
        };
    }

    /** A contour's number stands on its longest piece. */
    private void number(int number, List<List<Point>> pieces) {
        List<Point> longest = pieces.stream()
                .max((one, other) -> Integer.compare(one.size(), other.size()))
                .orElse(List.of());
        if (!longest.isEmpty()) {
            List<Point> anchors = IntStream.of(TENTHS)
                    .mapToObj(tenth -> longest.get(tenth * longest.size() / 10))
                    .toList();
            numbers.add(new MapLabels.Label(Integer.toString(number), anchors, false));
        }
    }

    private Point position(Point point) {
        return new Point(map.x().position(point.x()), map.y().position(point.y()));
    }

    private void points() {
        DefaultXYDataset points = new DefaultXYDataset();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(false, true);
        renderer.setUseFillPaint(true);
        renderer.setDrawOutlines(true);
        renderer.setDefaultFillPaint(theme.ground().background());
        renderer.setDefaultOutlineStroke(PlotStyle.LIMIT);
        renderer.setUseOutlinePaint(true);
        renderer.setDefaultOutlinePaint(theme.ink().text());
        for (int i = 0; i < map.overlays().points().size(); i++) {
            PointMark mark = map.overlays().points().get(i);
            Point at = position(mark.point());
            points.addSeries(i, new double[][] {{at.x()}, {at.y()}});
            renderer.setSeriesShape(i, SeriesStyle.marker(i, POINT_SIZE));
            labels.add(new MapLabels.Label(mark.label(), List.of(at), true));
        }
        add(points, renderer);
    }

    private void boxes() {
        for (BoxOutline box : map.overlays().boxes()) {
            Point low = position(new Point(box.x().lower(), box.y().lower()));
            Point high = position(new Point(box.x().upper(), box.y().upper()));
            plot.addAnnotation(new XYBoxAnnotation(
                    low.x(), low.y(), high.x(), high.y(), CASING, theme.ground().background(), null));
            plot.addAnnotation(new XYBoxAnnotation(
                    low.x(),
                    low.y(),
                    high.x(),
                    high.y(),
                    PlotStyle.LIMIT,
                    theme.ink().text(),
                    null));
            List<Point> corners = List.of(high, new Point(low.x(), high.y()), low, new Point(high.x(), low.y()));
            labels.add(new MapLabels.Label(box.label(), corners, true));
        }
    }

    private List<LegendItem> legend() {
        List<LegendItem> items = new ArrayList<>();
        List<Contour> contours = map.overlays().contours();
        for (int i = 0; i < contours.size(); i++) {
            String label = (i + 1) + "  " + contours.get(i).label();
            items.add(new LegendEntries(theme)
                    .line(label, SeriesStyle.dashed(i, CONTOUR), theme.ink().text()));
        }
        if (map.overlays().margin().isPresent()) {
            items.add(new LegendEntries(theme)
                    .hatched("not all requirements met", true, theme.ink().soft()));
        }
        if (missing() > 0) {
            items.add(new LegendEntries(theme)
                    .filled(map.heat().blank(), theme.ground().blank()));
        }
        return items;
    }
}

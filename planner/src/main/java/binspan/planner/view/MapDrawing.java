package binspan.planner.view;

import binspan.planner.plot.Point;
import binspan.planner.plot.Ticks;
import binspan.planner.view.ContourLabels.Line;
import binspan.planner.viewmodel.MapContour;
import binspan.planner.viewmodel.MapRecommendation;
import binspan.planner.viewmodel.MapShape;
import binspan.planner.viewmodel.Words;
import binspan.study.box.OperatingBox;
import binspan.study.region.MapPoint;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.BoundingBox;
import javafx.geometry.Bounds;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.FillRule;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;

/** Draws what of the map stands still while the handle moves: axes, region, lines, recommended point, box. */
final class MapDrawing {
    private static final double HATCH_EVERY = 0.8;
    private static final double HATCH_LENGTH = 0.42;
    private static final double HATCH_SLANT = 0.5;
    private static final double TICK = 0.35;
    private static final double SHORT_TICK = 0.2;
    private static final double GAP = 0.3;
    private static final double TITLE = 1.9;
    private static final double STAR = 0.75;
    private static final double STAR_INNER = 0.4;
    private static final int STAR_CORNERS = 10;
    private static final double PLATE = 0.25;
    private static final double NAME = 0.92;
    private static final double KEPT_FREE = 1.1;
    private static final double APART = 0.5;
    private static final double FINEST = 0.7;

    private final GraphicsContext pen;
    private final Look look;
    private final MapFrame frame;

    /** A drawing over a cleared canvas. */
    MapDrawing(GraphicsContext pen, Look look, MapFrame frame) {
        this.pen = pen;
        this.look = look;
        this.frame = frame;
    }

    /** Draws everything; what is null is left out. */
    void draw(MapShape shape, MapRecommendation recommended, OperatingBox box, MapPoint handle) {
        pen.setLineDashes();
        pen.clearRect(0.0, 0.0, pen.getCanvas().getWidth(), pen.getCanvas().getHeight());
        pen.setFill(look.palette().panel());
        pen.fillRect(frame.left(), frame.top(), frame.width(), frame.height());
        grid();
        if (shape != null) {
            clipped(() -> {
                region(shape);
                shape.contours().forEach(this::contour);
                if (box != null) {
                    rectangle(box);
                }
            });
        }
        axes();
        if (recommended != null) {
            star(frame.xOf(recommended.x()), frame.yOf(recommended.y()));
        }
        if (shape != null) {
            names(shape, recommended, handle);
        }
    }

    private void clipped(Runnable drawing) {
        pen.save();
        pen.beginPath();
        pen.rect(frame.left(), frame.top(), frame.width(), frame.height());
        pen.clip();
        drawing.run();
        pen.restore();
    }

    private void grid() {
        pen.setStroke(look.palette().grid());
        pen.setLineWidth(1.0);
        for (Ticks.Placed tick : frame.across(look)) {
            if (!tick.label().isEmpty()) {
                double x = crisp(frame.x(tick.share()));
                pen.strokeLine(x, frame.top(), x, frame.top() + frame.height());
            }
        }
        for (Ticks.Placed tick : frame.upwards(look)) {
            if (!tick.label().isEmpty()) {
                double y = crisp(frame.y(tick.share()));
                pen.strokeLine(frame.left(), y, frame.left() + frame.width(), y);
            }
        }
    }

    private static double crisp(double pixel) {
        return Math.floor(pixel) + 0.5;
    }

    private void axes() {
        pen.setLineDashes();
        pen.setStroke(look.palette().soft());
        pen.setFill(look.palette().soft());
        pen.setLineWidth(1.0);
        double bottom = frame.top() + frame.height();
        pen.strokeRect(crisp(frame.left()), crisp(frame.top()), Math.floor(frame.width()), Math.floor(frame.height()));
        pen.setFont(look.font(NAME));
        for (Ticks.Placed tick : frame.across(look)) {
            double x = crisp(frame.x(tick.share()));
            pen.strokeLine(x, bottom, x, bottom + length(tick));
            text(tick.label(), x, bottom + look.em(TICK + GAP), TextAlignment.CENTER, VPos.TOP);
        }
        for (Ticks.Placed tick : frame.upwards(look)) {
            double y = crisp(frame.y(tick.share()));
            pen.strokeLine(frame.left() - length(tick), y, frame.left(), y);
            text(tick.label(), frame.left() - look.em(TICK + GAP), y, TextAlignment.RIGHT, VPos.CENTER);
        }
        titles(bottom);
    }

    private double length(Ticks.Placed tick) {
        return look.em(tick.label().isEmpty() ? SHORT_TICK : TICK);
    }

    private void titles(double bottom) {
        pen.setFont(look.font(1.0));
        pen.setFill(look.palette().ink());
        double middle = frame.left() + frame.width() / 2.0;
        text(MapFrame.title(frame.horizontal()), middle, bottom + look.em(TITLE), TextAlignment.CENTER, VPos.TOP);
        pen.save();
        pen.translate(look.em(GAP), frame.top() + frame.height() / 2.0);
        pen.rotate(-90.0);
        text(MapFrame.title(frame.vertical()), 0.0, 0.0, TextAlignment.CENTER, VPos.TOP);
        pen.restore();
    }

    private void text(String words, double x, double y, TextAlignment alignment, VPos baseline) {
        pen.setTextAlign(alignment);
        pen.setTextBaseline(baseline);
        pen.fillText(words, x, y);
    }

    private void region(MapShape shape) {
        Color good = look.palette().good();
        double opacity = look.themeProperty().get() == Theme.DARK ? 0.26 : 0.16;
        pen.setFill(good.deriveColor(0.0, 1.0, 1.0, opacity));
        pen.setFillRule(FillRule.EVEN_ODD);
        pen.beginPath();
        shape.border().forEach(this::trace);
        pen.fill();
    }

    /** A path along a line, without the corners that one cannot see. */
    private void trace(List<Point> line) {
        double x = frame.x(line.get(0).x());
        double y = frame.y(line.get(0).y());
        pen.moveTo(x, y);
        for (int i = 1; i < line.size(); i++) {
            double nextX = frame.x(line.get(i).x());
            double nextY = frame.y(line.get(i).y());
            if (i == line.size() - 1 || Math.abs(nextX - x) + Math.abs(nextY - y) >= FINEST) {
                pen.lineTo(nextX, nextY);
                x = nextX;
                y = nextY;
            }
        }
    }

    private void contour(MapContour contour) {
        MapInk ink = MapInk.of(contour.requirement());
        ink.ready(pen, look);
        pen.beginPath();
        contour.lines().forEach(this::trace);
        pen.stroke();
        pen.setLineDashes();
        pen.setLineWidth(1.0);
        pen.setStroke(ink.colour(look).deriveColor(0.0, 1.0, 1.0, 0.6));
        pen.beginPath();
        contour.lines().forEach(this::hatch);
        pen.stroke();
    }

    /** Short strokes on the failing side, which is to the right of the line. */
    private void hatch(List<Point> line) {
        double every = look.em(HATCH_EVERY);
        double ahead = every / 2.0;
        for (int i = 1; i < line.size(); i++) {
            double x = frame.x(line.get(i - 1).x());
            double y = frame.y(line.get(i - 1).y());
            double dx = frame.x(line.get(i).x()) - x;
            double dy = frame.y(line.get(i).y()) - y;
            double length = Math.hypot(dx, dy);
            for (; ahead <= length && length > 0.0; ahead += every) {
                stroke(x + dx * ahead / length, y + dy * ahead / length, dx / length, dy / length);
            }
            ahead -= length;
        }
    }

    private void stroke(double x, double y, double dx, double dy) {
        double reach = look.em(HATCH_LENGTH);
        pen.moveTo(x, y);
        pen.lineTo(x + reach * (-dy - HATCH_SLANT * dx), y + reach * (dx - HATCH_SLANT * dy));
    }

    private void rectangle(OperatingBox box) {
        double left = frame.xOf(box.sides().get(0).from().value());
        double right = frame.xOf(box.sides().get(0).to().value());
        double bottom = frame.yOf(box.sides().get(1).from().value());
        double top = frame.yOf(box.sides().get(1).to().value());
        pen.setStroke(look.palette().ink());
        pen.setLineWidth(look.em(0.1));
        pen.setLineDashes(look.em(0.5), look.em(0.35));
        pen.strokeRect(left, top, right - left, bottom - top);
        pen.setLineDashes();
    }

    private void star(double x, double y) {
        double[] xs = new double[STAR_CORNERS];
        double[] ys = new double[STAR_CORNERS];
        for (int i = 0; i < STAR_CORNERS; i++) {
            double radius = look.em(i % 2 == 0 ? STAR : STAR * STAR_INNER);
            double angle = Math.PI * (2.0 * i / STAR_CORNERS - 0.5);
            xs[i] = x + radius * Math.cos(angle);
            ys[i] = y + radius * Math.sin(angle);
        }
        pen.setFill(look.palette().good());
        pen.fillPolygon(xs, ys, STAR_CORNERS);
        pen.setStroke(look.palette().panel());
        pen.setLineWidth(look.em(0.1));
        pen.strokePolygon(xs, ys, STAR_CORNERS);
    }

    private void names(MapShape shape, MapRecommendation recommended, MapPoint handle) {
        List<MapContour> drawn = shape.contours().stream()
                .filter(each -> !each.lines().isEmpty())
                .toList();
        List<Line> lines = new ArrayList<>();
        drawn.forEach(contour -> lines.add(line(contour)));
        List<Bounds> taken = new ArrayList<>();
        if (recommended != null) {
            taken.add(about(recommended.x(), recommended.y()));
        }
        if (handle != null) {
            taken.add(about(handle.x(), handle.y()));
        }
        Bounds plot = new BoundingBox(
                frame.left() + look.em(PLATE),
                frame.top() + look.em(PLATE),
                frame.width() - look.em(2.0 * PLATE),
                frame.height() - look.em(2.0 * PLATE));
        List<Bounds> places = ContourLabels.places(plot, lines, taken);
        for (int i = 0; i < places.size(); i++) {
            if (places.get(i) != null) {
                name(drawn.get(i), places.get(i));
            }
        }
    }

    private Bounds about(double x, double y) {
        double reach = look.em(KEPT_FREE);
        return new BoundingBox(frame.xOf(x) - reach, frame.yOf(y) - reach, 2.0 * reach, 2.0 * reach);
    }

    private Line line(MapContour contour) {
        Text text = new Text(shortName(contour));
        text.setFont(look.font(NAME));
        Bounds size = text.getLayoutBounds();
        return new Line(places(contour), size.getWidth() + look.em(2.0 * PLATE), size.getHeight());
    }

    /** Pixels along a contour, as far apart as names are high. */
    private List<Point> places(MapContour contour) {
        double apart = look.em(APART);
        List<Point> places = new ArrayList<>();
        for (List<Point> line : contour.lines()) {
            Point last = null;
            for (Point each : line) {
                Point at = new Point(frame.x(each.x()), frame.y(each.y()));
                if (last == null || Math.hypot(at.x() - last.x(), at.y() - last.y()) >= apart) {
                    places.add(at);
                    last = at;
                }
            }
        }
        return places;
    }

    private static String shortName(MapContour contour) {
        return Words.of("map.short." + contour.requirement().name());
    }

    private void name(MapContour contour, Bounds place) {
        pen.setFill(look.palette().panel().deriveColor(0.0, 1.0, 1.0, 0.88));
        double round = look.em(0.4);
        pen.fillRoundRect(place.getMinX(), place.getMinY(), place.getWidth(), place.getHeight(), round, round);
        pen.setFill(MapInk.of(contour.requirement()).colour(look));
        pen.setFont(look.font(NAME));
        text(shortName(contour), place.getCenterX(), place.getCenterY(), TextAlignment.CENTER, VPos.CENTER);
    }
}

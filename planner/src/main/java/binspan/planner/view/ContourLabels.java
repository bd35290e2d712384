package binspan.planner.view;

import binspan.planner.plot.Point;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.BoundingBox;
import javafx.geometry.Bounds;

/** Finds a place for the name of each line, upon it or beside it, where it covers as little as possible of the others. */
final class ContourLabels {
    private static final int CANDIDATES = 24;
    private static final double OTHER_NAME = 1000.0;
    private static final double OTHER_LINE = 40.0;
    private static final double OTHER_LINE_BESIDE = 100.0;
    private static final double OFF_CENTRE = 10.0;
    private static final double OWN_LINE = 6.0;
    private static final double[] SIDES = {0.0, 1.0, -1.0};
    private static final double TOO_MUCH = 900.0;

    private final Bounds plot;
    private final List<Line> lines;
    private final List<Bounds> taken = new ArrayList<>();

    /**
     * A line that wants its name.
     *
     * @param points places along it in pixels, close enough that no name fits between them
     * @param width of the name
     * @param height of the name
     */
    record Line(List<Point> points, double width, double height) {}

    private ContourLabels(Bounds plot, List<Line> lines, List<Bounds> taken) {
        this.plot = plot;
        this.lines = lines;
        this.taken.addAll(taken);
    }

    /** A place for each line's name, null where there is none without covering another. */
    static List<Bounds> places(Bounds plot, List<Line> lines, List<Bounds> taken) {
        ContourLabels labels = new ContourLabels(plot, lines, taken);
        List<Bounds> places = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            places.add(labels.place(i));
        }
        return places;
    }

    private Bounds place(int index) {
        Line line = lines.get(index);
        Bounds best = null;
        double least = TOO_MUCH;
        List<Point> along = candidates(line);
        for (int i = 0; i < along.size(); i++) {
            double offCentre = Math.abs(2.0 * i / along.size() - 1.0);
            for (double side : SIDES) {
                Bounds box = inside(along.get(i), line, side * (line.width() + line.height()) / 2.0);
                double cost = cost(box, index, side != 0.0) + OFF_CENTRE * offCentre + (side == 0.0 ? OWN_LINE : 0.0);
                if (cost < least) {
                    least = cost;
                    best = box;
                }
            }
        }
        if (best != null) {
            taken.add(best);
        }
        return best;
    }

    private static List<Point> candidates(Line line) {
        List<Point> points = line.points();
        int every = Math.max(1, points.size() / CANDIDATES);
        List<Point> some = new ArrayList<>();
        for (int i = every / 2; i < points.size(); i += every) {
            some.add(points.get(i));
        }
        return some;
    }

    /** The box about a point, pushed onto the plot. */
    private Bounds inside(Point at, Line line, double beside) {
        double wanted = at.x() + beside - line.width() / 2.0;
        double x = Math.max(plot.getMinX(), Math.min(plot.getMaxX() - line.width(), wanted));
        double y = Math.max(plot.getMinY(), Math.min(plot.getMaxY() - line.height(), at.y() - line.height() / 2.0));
        return new BoundingBox(x, y, line.width(), line.height());
    }

    private double cost(Bounds box, int own, boolean beside) {
        double cost = 0.0;
        for (Bounds other : taken) {
            cost += box.intersects(other) ? OTHER_NAME : 0.0;
        }
        for (int i = 0; i < lines.size() && cost < TOO_MUCH; i++) {
            if (i != own && covers(box, lines.get(i).points())) {
                cost += beside ? OTHER_LINE_BESIDE : OTHER_LINE;
            }
        }
        return cost;
    }

    private static boolean covers(Bounds box, List<Point> points) {
        double right = box.getMaxX();
        double bottom = box.getMaxY();
        for (Point at : points) {
            if (at.x() >= box.getMinX() && at.x() <= right && at.y() >= box.getMinY() && at.y() <= bottom) {
                return true;
            }
        }
        return false;
    }
}

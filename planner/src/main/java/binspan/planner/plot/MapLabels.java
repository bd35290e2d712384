package binspan.planner.plot;

import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** The labels of a map, each put where it covers no other: names beside points, numbers on contours. */
final class MapLabels extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;
    private static final double PADDING = 3.0;
    private static final double CLEARANCE = 11.0;
    private static final double OUTSIDE_PENALTY = 1e6;
    private static final double LATER_PENALTY = 0.5;
    private static final double[][] SIDES = {{1, 0}, {1, -1}, {1, 1}, {-1, 0}, {-1, -1}, {-1, 1}, {0, -1}, {0, 1}};

    private final transient List<Label> labels;
    private final transient PlotTheme theme;

    /** Labels, those with the least choice of places first. */
    MapLabels(List<Label> labels, PlotTheme theme) {
        this.labels = List.copyOf(labels);
        this.theme = theme;
    }

    /**
     * A text and the positions where it may stand.
     *
     * @param text its words
     * @param anchors positions, the best ones first
     * @param beside whether it stands beside its anchor, otherwise upon it
     */
    record Label(String text, List<Point> anchors, boolean beside) {}

    @Override
    public void draw(
            Graphics2D g2,
            XYPlot plot,
            Rectangle2D dataArea,
            ValueAxis domain,
            ValueAxis range,
            int rendererIndex,
            PlotRenderingInfo info) {
        g2.setFont(PlotStyle.TICK);
        List<List<Point2D>> anchors = new ArrayList<>();
        List<Rectangle2D> taken = new ArrayList<>();
        for (Label label : labels) {
            List<Point2D> pixels = new ArrayList<>();
            for (Point anchor : label.anchors()) {
                double x = PlotArea.x(plot, dataArea, domain, anchor.x());
                pixels.add(new Point2D.Double(x, PlotArea.y(plot, dataArea, range, anchor.y())));
            }
            anchors.add(pixels);
            if (label.beside()) {
                pixels.forEach(at -> taken.add(box(at, 2.0 * CLEARANCE, 2.0 * CLEARANCE)));
            }
        }
        for (int i = 0; i < labels.size(); i++) {
            taken.add(place(g2, labels.get(i), anchors.get(i), taken, dataArea));
        }
    }

    private Rectangle2D place(
            Graphics2D g2, Label label, List<Point2D> anchors, List<Rectangle2D> taken, Rectangle2D dataArea) {
        FontMetrics metrics = g2.getFontMetrics();
        double width = metrics.stringWidth(label.text()) + 2.0 * PADDING;
        double height = metrics.getAscent() + metrics.getDescent() + PADDING;
        Rectangle2D best = null;
        double least = Double.POSITIVE_INFINITY;
        double order = 0.0;
        for (Rectangle2D candidate : candidates(label, anchors, width, height)) {
            double cost = cost(candidate, taken, dataArea) + LATER_PENALTY * order++;
            if (cost < least) {
                least = cost;
                best = candidate;
            }
        }
        return draw(g2, label, best);
    }

    private static List<Rectangle2D> candidates(Label label, List<Point2D> anchors, double width, double height) {
        List<Rectangle2D> boxes = new ArrayList<>();
        for (Point2D anchor : anchors) {
            if (!label.beside()) {
                boxes.add(box(anchor, Math.max(width, height), height));
                continue;
            }
            for (double[] side : SIDES) {
                double x = anchor.getX() + side[0] * (CLEARANCE + width / 2.0);
                double y = anchor.getY() + side[1] * (CLEARANCE + height / 2.0) * (side[0] == 0.0 ? 1.0 : 0.8);
                boxes.add(box(new Point2D.Double(x, y), width, height));
            }
        }
        return boxes;
    }

    private static Rectangle2D box(Point2D centre, double width, double height) {
        return new Rectangle2D.Double(centre.getX() - width / 2.0, centre.getY() - height / 2.0, width, height);
    }

    private static double cost(Rectangle2D box, List<Rectangle2D> taken, Rectangle2D dataArea) {
        double cost = dataArea.contains(box) ? 0.0 : OUTSIDE_PENALTY;
        for (Rectangle2D other : taken) {
            Rectangle2D common = box.createIntersection(other);
            cost += common.isEmpty() ? 0.0 : common.getWidth() * common.getHeight();
        }
        return cost;
    }

    private Rectangle2D draw(Graphics2D g2, Label label, Rectangle2D box) {
        double round = label.beside() ? 4.0 : box.getHeight();
        RoundRectangle2D plate =
                new RoundRectangle2D.Double(box.getX(), box.getY(), box.getWidth(), box.getHeight(), round, round);
        g2.setPaint(theme.halo());
        g2.fill(plate);
        g2.setPaint(theme.ink().text());
        if (!label.beside()) {
            g2.setStroke(PlotStyle.HAIRLINE);
            g2.draw(plate);
        }
        FontMetrics metrics = g2.getFontMetrics();
        double x = box.getCenterX() - metrics.stringWidth(label.text()) / 2.0;
        double y = box.getCenterY() + (metrics.getAscent() - metrics.getDescent()) / 2.0;
        g2.drawString(label.text(), (float) x, (float) y);
        return box;
    }
}

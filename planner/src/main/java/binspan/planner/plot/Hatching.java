package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/** Parallel slanting lines inside a shape. */
final class Hatching {
    private Hatching() {}

    /** Lines that rise to the right, on a raster that adjacent shapes share. */
    static void rising(Graphics2D g2, Shape shape, double spacing, Paint paint) {
        draw(g2, shape, risingLines(shape.getBounds2D(), spacing), paint);
    }

    /** Lines that fall to the right. */
    static void falling(Graphics2D g2, Shape shape, double spacing, Paint paint) {
        draw(g2, shape, fallingLines(shape.getBounds2D(), spacing), paint);
    }

    private static void draw(Graphics2D g2, Shape shape, Shape lines, Paint paint) {
        Shape clip = g2.getClip();
        g2.clip(shape);
        g2.setPaint(paint);
        g2.setStroke(PlotStyle.HAIRLINE);
        g2.draw(lines);
        g2.setClip(clip);
    }

    private static Path2D risingLines(Rectangle2D box, double spacing) {
        Path2D lines = new Path2D.Double();
        double last = box.getMaxX() + box.getMaxY();
        for (double sum = Math.ceil((box.getMinX() + box.getMinY()) / spacing) * spacing; sum < last; sum += spacing) {
            lines.moveTo(sum - box.getMaxY(), box.getMaxY());
            lines.lineTo(sum - box.getMinY(), box.getMinY());
        }
        return lines;
    }

    private static Path2D fallingLines(Rectangle2D box, double spacing) {
        Path2D lines = new Path2D.Double();
        double last = box.getMaxX() - box.getMinY();
        for (double gap = Math.ceil((box.getMinX() - box.getMaxY()) / spacing) * spacing; gap < last; gap += spacing) {
            lines.moveTo(gap + box.getMinY(), box.getMinY());
            lines.lineTo(gap + box.getMaxY(), box.getMaxY());
        }
        return lines;
    }

    /** The lines of a legend swatch: a small box with three strokes. */
    static Shape swatch(double width, double height, boolean rising) {
        Path2D lines = new Path2D.Double(new Rectangle2D.Double(0.0, 0.0, width, height));
        double step = width / 3.0;
        for (double x = 0.0; x + height <= width + step; x += step) {
            double end = Math.min(width, x + height);
            lines.moveTo(x, rising ? height : 0.0);
            lines.lineTo(end, rising ? height - (end - x) : end - x);
        }
        return lines;
    }
}

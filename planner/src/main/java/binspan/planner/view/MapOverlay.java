package binspan.planner.view;

import binspan.planner.viewmodel.MapModel;
import binspan.study.region.MapPoint;
import javafx.scene.canvas.GraphicsContext;

/** Draws what moves over the map: the present point as a handle and the point that was clicked. */
final class MapOverlay {
    /** Radius of the handle, and of the area that takes hold of it. */
    static final double RADIUS = 0.6;

    static final double HOLD = 1.2;

    private static final double ARM = 1.25;
    private static final double HALO = 0.34;
    private static final double LINE = 0.16;
    private static final double CROSS = 0.45;

    private final GraphicsContext pen;
    private final Look look;
    private final MapFrame frame;

    /** A drawing over a cleared canvas. */
    MapOverlay(GraphicsContext pen, Look look, MapFrame frame) {
        this.pen = pen;
        this.look = look;
        this.frame = frame;
    }

    /** Draws handle and picked point. */
    void draw(MapModel model) {
        pen.setLineDashes();
        pen.clearRect(0.0, 0.0, pen.getCanvas().getWidth(), pen.getCanvas().getHeight());
        MapPoint picked = model.reader().pickedProperty().get();
        if (picked != null) {
            picked(frame.xOf(picked.x()), frame.yOf(picked.y()));
        }
        model.handle().shown().ifPresent(at -> handle(model.handle().onMap(), frame.xOf(at.x()), frame.yOf(at.y())));
    }

    private void picked(double x, double y) {
        double reach = look.em(CROSS);
        for (boolean halo : new boolean[] {true, false}) {
            pen.setStroke(halo ? look.palette().panel() : look.palette().ink());
            pen.setLineWidth(look.em(halo ? HALO : LINE));
            pen.strokeLine(x - reach, y - reach, x + reach, y + reach);
            pen.strokeLine(x - reach, y + reach, x + reach, y - reach);
        }
    }

    private void handle(boolean onMap, double x, double y) {
        double radius = look.em(RADIUS);
        double arm = look.em(ARM);
        for (boolean halo : new boolean[] {true, false}) {
            pen.setStroke(halo ? look.palette().panel() : look.palette().accent());
            pen.setLineWidth(look.em(halo ? HALO : LINE));
            pen.setLineDashes(onMap || halo ? new double[0] : new double[] {look.em(0.3), look.em(0.2)});
            pen.strokeOval(x - radius, y - radius, 2.0 * radius, 2.0 * radius);
            if (onMap) {
                cross(x, y, radius, arm);
            }
        }
        if (onMap) {
            pen.setFill(look.palette().accent());
            double dot = look.em(LINE);
            pen.fillOval(x - dot, y - dot, 2.0 * dot, 2.0 * dot);
        }
    }

    private void cross(double x, double y, double inner, double outer) {
        pen.strokeLine(x - outer, y, x - inner, y);
        pen.strokeLine(x + inner, y, x + outer, y);
        pen.strokeLine(x, y - outer, x, y - inner);
        pen.strokeLine(x, y + inner, x, y + outer);
    }
}

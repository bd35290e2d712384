package binspan.planner.view;

import binspan.planner.viewmodel.LinkItem.Kind;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.Group;
import javafx.scene.shape.Circle;
import javafx.scene.shape.Line;
import javafx.scene.shape.SVGPath;
import javafx.scene.shape.Shape;

/**
 * The symbols of the drawn link, for a text size of 12 px, with the light along y = 0. They are drawn for alice's arm:
 * light comes from the right. All colours are those of the style sheet.
 */
final class LinkSymbols {
    /** How far over and under the light the two outputs of an analyzer go. */
    static final double PORT_Y = 11.0;

    private static final double LOOP = 6.5;

    private final double half;
    private final List<Shape> shapes = new ArrayList<>();

    private LinkSymbols(double width) {
        this.half = width / 2.0;
    }

    /**
     * A symbol.
     *
     * @param kind what it stands for
     * @param width width of its column in units of the drawing
     * @param ports count of detectors at its site
     * @param toScale whether fibre is drawn to scale
     */
    static Group of(Kind kind, double width, int ports, boolean toScale) {
        LinkSymbols symbol = new LinkSymbols(width);
        switch (kind) {
            case CLOCK -> symbol.clock(ports);
            case PORT -> symbol.port();
            case ANALYZER -> symbol.analyzer(ports);
            case FIBRE -> symbol.fibre(toScale);
            case SOURCE -> symbol.source();
            case REPAIR -> symbol.repair();
            default -> symbol.component(kind);
        }
        return new Group(List.copyOf(symbol.shapes));
    }

    private void component(Kind kind) {
        line("link-light", -half, 0.0, half, 0.0);
        switch (kind) {
            case LOSS -> path("link-body", "M-9,-8 L-4,-8 L0,3 L4,-8 L9,-8 L9,8 L-9,8 Z");
            case COUPLING -> path("link-body", "M0,-11 C6,-4 6,4 0,11 C-6,4 -6,-4 0,-11 Z");
            case COMPENSATOR -> compensator();
            default -> filter(kind == Kind.BAND ? 5.0 : 0.0);
        }
    }

    private void filter(double corner) {
        path("link-body", box(corner));
        path("link-mark", "M-8.5,5.5 C-2.5,5.5 -4,-6 0,-6 C4,-6 2.5,5.5 8.5,5.5");
    }

    private void compensator() {
        path("link-body", box(0.0));
        path("link-mark", "M-8.5,-6 V6 M-6.8,-6 V6 M-4.6,-6 V6 M-1.6,-6 V6 M2.3,-6 V6 M7.4,-6 V6");
    }

    private static String box(double corner) {
        String round = " a" + corner + "," + corner + " 0 0 1 ";
        double across = 22.0 - 2.0 * corner;
        double down = 18.0 - 2.0 * corner;
        return "M" + (corner - 11.0) + ",-9 h" + across + round + corner + "," + corner + " v" + down + round + -corner
                + "," + corner + " h" + -across + round + -corner + "," + -corner + " v" + -down + round + corner + ","
                + -corner + " Z";
    }

    private void source() {
        for (int side = -1; side <= 1; side += 2) {
            line("link-light", side * 10.0, 0.0, side * half, 0.0);
            double tip = side * (half - 1.5);
            double back = tip - side * 5.0;
            path("link-solid", "M" + tip + ",0 L" + back + ",-3.4 L" + back + ",3.4 Z");
        }
        path("link-glow", "M-6,-11 L6,-11 L12,0 L6,11 L-6,11 L-12,0 Z");
        path("link-star", "M0,-7.5 L1.8,-1.8 L7.5,0 L1.8,1.8 L0,7.5 L-1.8,1.8 L-7.5,0 L-1.8,-1.8 Z");
    }

    private void fibre(boolean toScale) {
        line("link-fibre", -half, 0.0, half, 0.0);
        double[] loops = toScale ? new double[] {-7.0, 0.0, 7.0} : new double[] {-7.5, -2.5};
        for (double x : loops) {
            Circle loop = new Circle(x, -LOOP, LOOP);
            add("link-mark", loop);
        }
        if (!toScale) {
            path("link-gap", "M7.5,5 L11.5,-5 L14.5,-5 L10.5,5 Z");
            path("link-mark", "M7.5,5 L11.5,-5 M10.5,5 L14.5,-5");
        }
        add("link-solid", new Circle(-half, 0.0, 2.0));
        add("link-solid", new Circle(half, 0.0, 2.0));
    }

    private void repair() {
        line("link-light", -half, 0.0, -9.0, 0.0);
        line("link-light", 9.0, 0.0, half, 0.0);
        line("link-spare", -9.0, 0.0, 9.0, 0.0);
        add("link-spare", new Circle(0.0, -LOOP, LOOP));
    }

    private void analyzer(int ports) {
        line("link-light", 13.0, 0.0, half, 0.0);
        path("link-light", "M-13,0 C-16,0 -15,-11 " + -half + ",-11");
        path(ports > 1 ? "link-light" : "link-spare", "M-13,0 C-16,0 -15,11 " + -half + ",11");
        path("link-light", "M13,0 C9,0 11,-8 6,-8 L-6,-8 C-11,-8 -9,0 -13,0");
        path("link-light", "M13,0 C9,0 11,6 6,6 L-6,6 C-11,6 -9,0 -13,0");
        add("link-light", new Circle(-3.0, -13.0, 5.0));
        add("link-light", new Circle(3.0, -13.0, 5.0));
        add("link-solid", new Circle(13.0, 0.0, 2.6));
        add("link-solid", new Circle(-13.0, 0.0, 2.6));
    }

    private void port() {
        line("link-light", 4.0, 0.0, half, 0.0);
        line("link-wire", -half, 0.0, -6.0, 0.0);
        path("link-body", "M5,-7.5 L5,7.5 L0.5,7.5 A7.5,7.5 0 0 1 0.5,-7.5 Z");
    }

    private void clock(int ports) {
        for (int port = 0; port < ports; port++) {
            double side = port == 0 ? -1.0 : 1.0;
            line("link-wire", half, side * PORT_Y, 6.0, side * 5.0);
        }
        add("link-body", new Circle(0.0, 0.0, 8.5));
        path("link-mark", "M0,-5.5 L0,0 L3.8,2.2");
    }

    private void line(String style, double fromX, double fromY, double toX, double toY) {
        add(style, new Line(fromX, fromY, toX, toY));
    }

    private void path(String style, String content) {
        SVGPath path = new SVGPath();
        path.setContent(content);
        add(style, path);
    }

    private void add(String style, Shape shape) {
        shape.getStyleClass().add(style);
        shapes.add(shape);
    }
}

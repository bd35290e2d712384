package binspan.planner.view;

import java.util.ArrayList;
import java.util.List;
import javafx.css.PseudoClass;
import javafx.scene.layout.Region;

/** A bar between two shares of its width, with a second, quieter one and marks. */
final class SpanBar extends Region {
    private static final PseudoClass BAD = PseudoClass.getPseudoClass("bad");
    private static final double THINNEST = 1.0;
    private static final double NOTHING = 1e-4;
    private static final double FILL = 0.55;

    private final Region quiet = part("span-quiet");
    private final Region fill = part("span-fill");
    private final List<Region> marks = new ArrayList<>();
    private final double[] places;
    private double quietTo;
    private double from;
    private double to;

    /** A bar with marks at shares of its width; the one at {@code zero} is heavier. */
    SpanBar(double zero, double... places) {
        this.places = places.clone();
        getStyleClass().add("span-bar");
        getChildren().addAll(quiet, fill);
        for (double place : places) {
            marks.add(part(place == zero ? "span-zero" : "span-mark"));
        }
        getChildren().addAll(marks);
    }

    private static Region part(String style) {
        Region part = new Region();
        part.getStyleClass().add(style);
        part.setManaged(false);
        return part;
    }

    /** Shows the bar between two shares, in either order. */
    void show(double first, double second, boolean bad) {
        from = Math.min(first, second);
        to = Math.max(first, second);
        fill.pseudoClassStateChanged(BAD, bad);
        requestLayout();
    }

    /** Shows the quiet bar from the left end to a share. */
    void showQuiet(double share) {
        quietTo = share;
        requestLayout();
    }

    /** The shares between which the bar stands. */
    double[] span() {
        return new double[] {from, to};
    }

    @Override
    protected void layoutChildren() {
        double width = getWidth();
        double height = getHeight();
        double bar = snapSizeY(FILL * height);
        double top = snapPositionY((height - bar) / 2.0);
        quiet.resizeRelocate(0.0, top, snapSizeX(quietTo * width), bar);
        double left = snapPositionX(from * width);
        double span = to - from > NOTHING ? Math.max(THINNEST, snapPositionX(to * width) - left) : 0.0;
        fill.resizeRelocate(left, top, span, bar);
        for (int i = 0; i < marks.size(); i++) {
            double at = snapPositionX(places[i] * (width - THINNEST));
            marks.get(i).resizeRelocate(at, 0.0, THINNEST, height);
        }
    }
}

package binspan.planner.view;

import binspan.planner.plot.Ticks;
import binspan.planner.report.ParameterWords;
import binspan.study.Axis;
import java.util.List;
import org.jfree.data.Range;

/**
 * Where a map lies on the screen: pixels of its plot and the two axes along it.
 *
 * @param left left edge
 * @param top upper edge
 * @param width width
 * @param height height
 * @param horizontal axis across
 * @param vertical axis upwards
 */
record MapFrame(double left, double top, double width, double height, Axis horizontal, Axis vertical) {
    private static final double BELOW = 3.3;
    private static final double BESIDE = 5.2;
    private static final double OVER = 0.7;
    private static final double BEYOND = 1.2;
    private static final double LABEL_WIDTH = 5.5;
    private static final double LABEL_HEIGHT = 2.6;
    private static final int MOST_LABELS = 10;

    /** The plot within a drawing of a size, room for titles and numbers left. */
    static MapFrame of(Look look, double width, double height, Axis horizontal, Axis vertical) {
        double left = look.em(BESIDE);
        double top = look.em(OVER);
        return new MapFrame(
                left,
                top,
                Math.max(1.0, width - left - look.em(BEYOND)),
                Math.max(1.0, height - top - look.em(BELOW)),
                horizontal,
                vertical);
    }

    /** Pixel of a share of the way along the horizontal axis. */
    double x(double share) {
        return left + share * width;
    }

    /** Pixel of a share of the way up. */
    double y(double share) {
        return top + (1.0 - share) * height;
    }

    /** Pixel of a value of the horizontal parameter. */
    double xOf(double value) {
        return x(horizontal.share(value));
    }

    /** Pixel of a value of the vertical parameter. */
    double yOf(double value) {
        return y(vertical.share(value));
    }

    /** Value of the horizontal parameter at a pixel, that of the nearest end beyond the plot. */
    double valueAtX(double pixel) {
        return horizontal.at(clamped((pixel - left) / width));
    }

    /** Value of the vertical parameter at a pixel. */
    double valueAtY(double pixel) {
        return vertical.at(clamped(1.0 - (pixel - top) / height));
    }

    private static double clamped(double share) {
        return Math.max(0.0, Math.min(1.0, share));
    }

    /** Whether a pixel lies on the plot. */
    boolean contains(double x, double y) {
        return x >= left && x <= left + width && y >= top && y <= top + height;
    }

    /** Ticks across, their positions as shares. */
    List<Ticks.Tick> across(Look look) {
        return ticks(horizontal, width / look.em(LABEL_WIDTH));
    }

    /** Ticks upwards. */
    List<Ticks.Tick> upwards(Look look) {
        return ticks(vertical, height / look.em(LABEL_HEIGHT));
    }

    private static List<Ticks.Tick> ticks(Axis axis, double room) {
        boolean logarithmic = axis.logarithmic();
        double from = logarithmic ? Math.log10(axis.from()) : axis.from();
        double to = logarithmic ? Math.log10(axis.to()) : axis.to();
        int most = Math.max(2, Math.min(MOST_LABELS, (int) room));
        return Ticks.of(drawn(axis), new Range(from, to), most).stream()
                .map(tick -> new Ticks.Tick((tick.position() - from) / (to - from), tick.label()))
                .toList();
    }

    /** Name and unit of an axis. */
    static String title(Axis axis) {
        return drawn(axis).title();
    }

    private static binspan.planner.plot.Axis drawn(Axis axis) {
        return new binspan.planner.plot.Axis(
                ParameterWords.title(axis.parameter().path()),
                axis.parameter().unit(),
                axis.logarithmic(),
                axis.from(),
                axis.to());
    }
}

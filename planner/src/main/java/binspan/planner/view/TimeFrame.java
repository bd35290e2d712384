package binspan.planner.view;

import binspan.optics.TimeBins;
import binspan.planner.plot.Axis;
import binspan.planner.plot.Ticks;
import java.util.List;
import org.jfree.data.Range;

/**
 * Where a histogram lies on the screen.
 *
 * @param left left edge of the plot, pixels
 * @param top upper edge
 * @param width width
 * @param height height
 * @param from time at the left edge, s
 * @param to time at the right edge, s
 * @param highest rate at the upper edge, 1/s
 * @param logarithmic whether rates are drawn on a logarithmic scale
 */
record TimeFrame(
        double left,
        double top,
        double width,
        double height,
        double from,
        double to,
        double highest,
        boolean logarithmic) {
    /** Decades that a logarithmic scale shows. */
    private static final double DECADES = 5.0;

    private static final double HEADROOM = 1.12;
    private static final double LABEL_WIDTH = 4.5;
    private static final double LABEL_HEIGHT = 2.0;
    private static final double NANO = 1e9;
    private static final double PICO = 1e12;
    private static final double FEW_PICOSECONDS = 2e-9;

    /** The frame of a histogram in a drawing of a size, room for titles and numbers left. */
    static TimeFrame of(Look look, double width, double height, SlotPlotFrame content) {
        double left = look.em(4.6);
        double top = look.em(0.4);
        double right = look.em(0.8);
        double bottom = look.em(content.titled() ? 2.9 : 1.7);
        TimeBins bins = content.bins();
        return new TimeFrame(
                left,
                top,
                Math.max(1.0, width - left - right),
                Math.max(1.0, height - top - bottom),
                bins.start(),
                bins.end(),
                Math.max(Double.MIN_NORMAL, content.highest() * HEADROOM),
                content.logarithmic());
    }

    /** The same frame over other times. */
    TimeFrame over(double newFrom, double newTo) {
        return new TimeFrame(left, top, width, height, newFrom, newTo, highest, logarithmic);
    }

    /** What the frame depends on. */
    record SlotPlotFrame(TimeBins bins, double highest, boolean logarithmic, boolean titled) {}

    /** Pixel of a time. */
    double x(double time) {
        return left + (time - from) / (to - from) * width;
    }

    /** Time at a pixel, s. */
    double time(double x) {
        return from + (x - left) / width * (to - from);
    }

    /** Pixel of a rate; what lies below the scale stands at its foot. */
    double y(double rate) {
        double share = logarithmic ? 1.0 + Math.log10(rate / highest) / DECADES : rate / highest;
        return top + height * (1.0 - (share > 0.0 ? Math.min(1.0, share) : 0.0));
    }

    /** Unit of the time axis: picoseconds where little is shown. */
    String unit() {
        return to - from < FEW_PICOSECONDS ? "ps" : "ns";
    }

    /** Ticks along the time axis, their positions in pixels. */
    List<Ticks.Tick> across(Look look) {
        double scale = unit().equals("ps") ? PICO : NANO;
        Axis axis = new Axis("t", unit(), false, from * scale, to * scale);
        int most = Math.max(2, (int) (width / look.em(LABEL_WIDTH)));
        return Ticks.of(axis, new Range(from * scale, to * scale), most).stream()
                .map(tick -> new Ticks.Tick(x(tick.position() / scale), tick.label()))
                .toList();
    }

    /** Ticks along the axis of rates, their positions in pixels. */
    List<Ticks.Tick> upwards(Look look) {
        double lowest = logarithmic ? highest * Math.pow(10.0, -DECADES) : 0.0;
        Axis axis = new Axis("rate", "1/s", logarithmic, logarithmic ? lowest : Double.NaN, highest);
        Range positions = logarithmic ? new Range(Math.log10(lowest), Math.log10(highest)) : new Range(lowest, highest);
        int most = Math.max(2, (int) (height / look.em(LABEL_HEIGHT)));
        return Ticks.of(axis, positions, most).stream()
                .map(tick -> new Ticks.Tick(
                        y(logarithmic ? Math.pow(10.0, tick.position()) : tick.position()), tick.label()))
                .toList();
    }
}

package binspan.planner.view;

import binspan.optics.Window;
import binspan.planner.plot.Ticks;
import binspan.planner.report.Figure;
import binspan.planner.view.TimeFrame.SlotPlotFrame;
import binspan.planner.viewmodel.Site;
import binspan.planner.viewmodel.SlotPlot;
import binspan.planner.viewmodel.SlotsModel;
import binspan.planner.viewmodel.Words;
import binspan.units.Digits;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Region;

/** One histogram with the handles of its window and of its separation. */
final class HistogramPlot extends Region {
    private static final double PICO = 1e12;
    private static final double NANO = 1e9;
    private static final double KEY_STEP = 0.01;
    private static final double NAMES = 1.3;

    private final SlotsModel model;
    private final Look look;
    private final Canvas canvas = new Canvas();
    private final TimeHandle left;
    private final TimeHandle right;
    private final TimeHandle separation;
    private SlotPlot plot;
    private TimeFrame frame;
    private final Runnable held;
    private boolean still;
    /** From the separation to the last peak; does not change with the separation. */
    private double offset;

    HistogramPlot(SlotsModel model, Look look, String id, Runnable held) {
        this.model = model;
        this.look = look;
        left = new TimeHandle(look, "window-edge", this::window, this::settled);
        right = new TimeHandle(look, "window-edge", this::window, this::settled);
        separation = new TimeHandle(look, "separation", this::separation, this::settled);
        this.held = held;
        left.setId("slots-" + id + "-window-left");
        right.setId("slots-" + id + "-window-right");
        separation.setId("slots-" + id + "-separation");
        right.steps(steps -> model.window(model.window() * (1.0 + KEY_STEP * steps), right));
        separation.steps(steps -> model.separation(model.separation() * (1.0 + KEY_STEP * steps), separation));
        canvas.setManaged(false);
        getChildren().addAll(canvas, separation, left, right);
        getStyleClass().add("histogram");
        setId("slots-" + id);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        look.follow(this::draw);
    }

    /** Shows a histogram. */
    void show(SlotPlot shown) {
        plot = shown;
        setAccessibleText(shown.title() + ": " + shown.note());
        draw();
    }

    @Override
    protected void layoutChildren() {
        draw();
    }

    private void draw() {
        if (plot == null || getWidth() <= 0.0 || getHeight() <= 0.0) {
            return;
        }
        canvas.setWidth(getWidth());
        canvas.setHeight(getHeight());
        TimeFrame fresh = TimeFrame.of(
                look,
                getWidth(),
                getHeight(),
                new SlotPlotFrame(
                        plot.bins(), plot.highest(), model.logarithmicProperty().get(), titled()));
        frame = still && frame != null ? fresh.over(frame.from(), frame.to()) : fresh;
        new HistogramDrawing(canvas.getGraphicsContext2D(), look, frame)
                .draw(plot, Words.of("slots.axis.rate"), titled() ? Words.of(plot.timeAxis(), frame.unit()) : "");
        handles();
    }

    /** The plots of both sides share one title of their time axes. */
    private boolean titled() {
        return !plot.id().equals(Site.ALICE.path());
    }

    /** Whether the mouse holds one of its handles. */
    boolean held() {
        return left.held() || right.held() || separation.held();
    }

    /** Lets the time axis stand still, or follow the histogram again. */
    void still(boolean axis) {
        still = axis;
        draw();
    }

    private void handles() {
        Window window = plot.windows().get(plot.central());
        // The names of the peaks stand above the lines.
        double top = frame.top() + look.em(NAMES);
        double height = frame.height() - look.em(NAMES);
        left.place(frame.x(window.from()), top, height);
        right.place(frame.x(window.to()), top, height);
        double peak = plot.peaks().get(plot.peaks().size() - 1).time();
        // While a newer plot is on its way, this one is not that of the present separation.
        offset = model.runningProperty().get() ? offset : peak - model.separation();
        separation.setVisible(peak > 0.0 && peak < frame.to());
        separation.place(frame.x(peak), top, height);
        right.setAccessibleText(Words.of("slots.handle.window", Figure.in(model.window() * PICO, "ps")));
        separation.setAccessibleText(Words.of("slots.handle.separation", Figure.in(model.separation() * NANO, "ns")));
    }

    private void settled() {
        model.settle();
        held.run();
    }

    private void window(double x) {
        held.run();
        Window window = plot.windows().get(plot.central());
        double centre = (window.from() + window.to()) / 2.0;
        model.window(rounded(2.0 * Math.abs(frame.time(x) - centre)), canvas);
    }

    private void separation(double x) {
        held.run();
        double wanted = frame.time(x) - offset;
        if (wanted > 0.0) {
            model.separation(rounded(wanted), separation);
        }
    }

    /** A time to the last place that a pixel can tell. */
    private double rounded(double time) {
        double pixel = (frame.to() - frame.from()) / frame.width();
        double step = Ticks.niceStep(pixel / 2.0);
        return Math.max(step, Double.parseDouble(Digits.significant(Math.rint(time / step) * step, 12)));
    }
}

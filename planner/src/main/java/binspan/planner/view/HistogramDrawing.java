package binspan.planner.view;

import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.planner.viewmodel.SlotPlot;
import binspan.planner.viewmodel.SlotPlot.Kind;
import binspan.planner.viewmodel.SlotPlot.Layer;
import binspan.planner.viewmodel.SlotPlot.NamedPeak;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;

/** Draws a histogram: layers on one another, windows as bands, names over the peaks, axes. */
final class HistogramDrawing {
    private static final double SMALL = 0.88;
    private static final double HATCH = 0.55;

    private final GraphicsContext pen;
    private final Look look;
    private final TimeFrame frame;

    HistogramDrawing(GraphicsContext pen, Look look, TimeFrame frame) {
        this.pen = pen;
        this.look = look;
        this.frame = frame;
    }

    /** Draws everything. */
    void draw(SlotPlot plot, String rateTitle, String timeTitle) {
        pen.clearRect(0.0, 0.0, pen.getCanvas().getWidth(), pen.getCanvas().getHeight());
        pen.setFill(look.palette().panel());
        pen.fillRect(frame.left(), frame.top(), frame.width(), frame.height());
        plot.windows().forEach(this::band);
        grid();
        layers(plot);
        axes(rateTitle, timeTitle);
        peaks(plot);
    }

    private void band(Window window) {
        double from = Math.max(frame.left(), frame.x(window.from()));
        double to = Math.min(frame.left() + frame.width(), frame.x(window.to()));
        if (to > from) {
            pen.setFill(look.palette().accent().deriveColor(0.0, 1.0, 1.0, 0.13));
            pen.fillRect(from, frame.top(), to - from, frame.height());
        }
    }

    private void grid() {
        pen.setStroke(look.palette().grid());
        pen.setLineWidth(1.0);
        for (TimeFrame.Mark tick : frame.upwards(look)) {
            if (!tick.label().isEmpty()) {
                double y = crisp(tick.pixel());
                pen.strokeLine(frame.left(), y, frame.left() + frame.width(), y);
            }
        }
    }

    private static double crisp(double pixel) {
        return Math.floor(pixel) + 0.5;
    }

    private void layers(SlotPlot plot) {
        double[] below = new double[plot.bins().count()];
        for (Layer layer : plot.layers()) {
            double[] above = below.clone();
            for (int bin = 0; bin < above.length; bin++) {
                above[bin] += layer.perSecond()[bin];
            }
            layer(plot.bins(), layer.kind(), below, above);
            below = above;
        }
    }

    private void layer(TimeBins bins, Kind kind, double[] below, double[] above) {
        outline(bins, below, above);
        pen.setFill(fill(kind));
        pen.fill();
        if (kind == Kind.LIGHT) {
            hatched(bins, below, above);
        }
        steps(bins, above);
        pen.setStroke(edge(kind));
        pen.setLineWidth(look.em(0.1));
        if (kind == Kind.CONTRAST) {
            pen.setLineDashes(look.em(0.4), look.em(0.25));
        }
        pen.stroke();
        pen.setLineDashes();
    }

    private void outline(TimeBins bins, double[] below, double[] above) {
        steps(bins, above);
        for (int bin = bins.count() - 1; bin >= 0; bin--) {
            double y = frame.y(below[bin]);
            pen.lineTo(frame.x(bins.edge(bin + 1)), y);
            pen.lineTo(frame.x(bins.edge(bin)), y);
        }
        pen.closePath();
    }

    private void steps(TimeBins bins, double[] heights) {
        pen.beginPath();
        for (int bin = 0; bin < bins.count(); bin++) {
            double y = frame.y(heights[bin]);
            if (bin == 0) {
                pen.moveTo(frame.x(bins.edge(0)), y);
            } else {
                pen.lineTo(frame.x(bins.edge(bin)), y);
            }
            pen.lineTo(frame.x(bins.edge(bin + 1)), y);
        }
    }

    private void hatched(TimeBins bins, double[] below, double[] above) {
        pen.save();
        outline(bins, below, above);
        pen.clip();
        hatch(frame.left(), frame.top(), frame.width(), frame.height());
        pen.restore();
    }

    private void hatch(double left, double top, double width, double height) {
        pen.setStroke(look.palette().soft().deriveColor(0.0, 1.0, 1.0, 0.55));
        pen.setLineWidth(1.0);
        for (double x = left - height; x < left + width; x += look.em(HATCH)) {
            pen.strokeLine(x, top + height, x + height, top);
        }
    }

    private Color fill(Kind kind) {
        return switch (kind) {
            case NOISE -> look.palette().bad().deriveColor(0.0, 1.0, 1.0, 0.55);
            case LIGHT -> look.palette().soft().deriveColor(0.0, 1.0, 1.0, 0.16);
            case WORST -> look.palette().accent().deriveColor(0.0, 1.0, 1.0, 0.75);
            case CONTRAST -> look.palette().accent().deriveColor(0.0, 1.0, 1.0, 0.25);
        };
    }

    private Color edge(Kind kind) {
        return switch (kind) {
            case NOISE -> look.palette().bad();
            case LIGHT -> look.palette().soft();
            case WORST, CONTRAST -> look.palette().accent();
        };
    }

    /** A swatch for a legend. */
    void swatch(Kind kind, double left, double top, double width, double height) {
        pen.setFill(fill(kind));
        pen.fillRect(left, top, width, height);
        if (kind == Kind.LIGHT) {
            pen.save();
            pen.beginPath();
            pen.rect(left, top, width, height);
            pen.clip();
            hatch(left, top, width, height);
            pen.restore();
        }
        pen.setStroke(edge(kind));
        pen.setLineWidth(1.0);
        if (kind == Kind.CONTRAST) {
            pen.setLineDashes(look.em(0.25), look.em(0.2));
        }
        pen.strokeRect(crisp(left), crisp(top), Math.floor(width), Math.floor(height));
        pen.setLineDashes();
    }

    private void axes(String rateTitle, String timeTitle) {
        double bottom = frame.top() + frame.height();
        pen.setLineDashes();
        pen.setLineWidth(1.0);
        pen.setStroke(look.palette().soft());
        pen.strokeRect(crisp(frame.left()), crisp(frame.top()), Math.floor(frame.width()), Math.floor(frame.height()));
        pen.setFont(look.font(SMALL));
        pen.setFill(look.palette().soft());
        for (TimeFrame.Mark tick : frame.across(look)) {
            double x = crisp(tick.pixel());
            pen.strokeLine(x, bottom, x, bottom + look.em(tick.label().isEmpty() ? 0.2 : 0.35));
            text(tick.label(), x, bottom + look.em(0.4), TextAlignment.CENTER, VPos.TOP);
        }
        for (TimeFrame.Mark tick : frame.upwards(look)) {
            double y = crisp(tick.pixel());
            pen.strokeLine(frame.left() - look.em(0.3), y, frame.left(), y);
            text(tick.label(), frame.left() - look.em(0.45), y, TextAlignment.RIGHT, VPos.CENTER);
        }
        text(timeTitle, frame.left() + frame.width() / 2.0, bottom + look.em(1.6), TextAlignment.CENTER, VPos.TOP);
        pen.save();
        pen.translate(look.em(0.2), frame.top() + frame.height() / 2.0);
        pen.rotate(-90.0);
        text(rateTitle, 0.0, 0.0, TextAlignment.CENTER, VPos.TOP);
        pen.restore();
    }

    /** Names over the peaks; of names that would touch the later ones are left out, the middle one first in line. */
    private void peaks(SlotPlot plot) {
        pen.setFont(look.font(SMALL));
        pen.setFill(look.palette().ink());
        List<NamedPeak> order = new ArrayList<>(plot.peaks());
        order.sort(Comparator.comparingDouble(peak -> Math.abs(peak.time())));
        List<double[]> taken = new ArrayList<>();
        for (NamedPeak peak : order) {
            Text words = new Text(peak.name());
            words.setFont(look.font(SMALL));
            double half = words.getLayoutBounds().getWidth() / 2.0 + look.em(0.3);
            double x = frame.x(peak.time());
            boolean free = taken.stream().allMatch(other -> x + half < other[0] || x - half > other[1]);
            if (free && x - half > frame.left() && x + half < frame.left() + frame.width()) {
                taken.add(new double[] {x - half, x + half});
                text(peak.name(), x, frame.top() + look.em(0.2), TextAlignment.CENTER, VPos.TOP);
            }
        }
    }

    private void text(String words, double x, double y, TextAlignment alignment, VPos baseline) {
        pen.setTextAlign(alignment);
        pen.setTextBaseline(baseline);
        pen.fillText(words, x, y);
    }
}

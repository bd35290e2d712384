package binspan.planner.plot;

import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.Range;

/** An axis over positions that labels them with the values they stand for. */
class ScaledAxis extends NumberAxis {
    private static final long serialVersionUID = 1L;
    private static final double HORIZONTAL_SPACING = 78.0;
    private static final double VERTICAL_SPACING = 24.0;
    private static final double DENSE_VERTICAL_SPACING = 17.0;
    private static final int MOST_LABELS = 12;
    private static final int MOST_LINES = 3;
    private static final double LEAST_SPACING = 40.0;
    private static final double LABEL_GAP = 10.0;
    private static final double LINE_PITCH = 1.2;
    private static final double SHORTEST_LINE = 60.0;

    private final transient Axis axis;
    private transient List<String> lines = List.of();
    private boolean dense;

    ScaledAxis(Axis axis, Range positions, PlotTheme theme) {
        super(axis.title());
        this.axis = axis;
        setRange(positions);
        PlotStyle.dress(this, theme);
        setMinorTickMarksVisible(true);
    }

    /** Breaks the title into lines no longer than a given length. */
    ScaledAxis wrapped(double length) {
        dense = true;
        lines = Words.lines(axis.title(), getLabelFont(), Math.max(SHORTEST_LINE, length), MOST_LINES);
        setLabel(lines.size() == 1 ? lines.get(0) : axis.title());
        return this;
    }

    /** Lets ticks stand as close as their labels allow. */
    void setDense(boolean closeTicks) {
        dense = closeTicks;
    }

    private double lineHeight() {
        return getLabelFont().getSize2D() * LINE_PITCH;
    }

    @Override
    protected Rectangle2D getLabelEnclosure(Graphics2D g2, RectangleEdge edge) {
        Rectangle2D one = super.getLabelEnclosure(g2, edge);
        double more = Math.max(0, lines.size() - 1) * lineHeight();
        boolean level = RectangleEdge.isTopOrBottom(edge);
        one.setRect(
                one.getX(), one.getY(), one.getWidth() + (level ? 0.0 : more), one.getHeight() + (level ? more : 0.0));
        return one;
    }

    @Override
    protected AxisState drawLabel(
            String label,
            Graphics2D g2,
            Rectangle2D plotArea,
            Rectangle2D dataArea,
            RectangleEdge edge,
            AxisState state) {
        if (lines.size() < 2 || label == null) {
            return super.drawLabel(label, g2, plotArea, dataArea, edge, state);
        }
        double cursor = state.getCursor();
        double step = (edge.equals(RectangleEdge.TOP) || edge.equals(RectangleEdge.LEFT) ? -1.0 : 1.0) * lineHeight();
        boolean downwards = edge.equals(RectangleEdge.BOTTOM);
        for (int i = 0; i < lines.size(); i++) {
            state.setCursor(cursor + i * step);
            super.drawLabel(lines.get(downwards ? i : lines.size() - 1 - i), g2, plotArea, dataArea, edge, state);
        }
        return state;
    }

    @Override
    public List<NumberTick> refreshTicks(Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
        boolean horizontal = RectangleEdge.isTopOrBottom(edge);
        double upright = dense ? DENSE_VERTICAL_SPACING : VERTICAL_SPACING;
        double most = horizontal ? dataArea.getWidth() / HORIZONTAL_SPACING : dataArea.getHeight() / upright;
        List<Ticks.Tick> ticks = !dense || !horizontal
                ? ticks((int) most)
                : close(g2.getFontMetrics(getTickLabelFont()), dataArea, edge);
        List<NumberTick> made = new ArrayList<>();
        for (Ticks.Tick tick : ticks) {
            TickType type = tick.label().isEmpty() ? TickType.MINOR : TickType.MAJOR;
            TextAnchor anchor = anchor(edge);
            made.add(new NumberTick(type, tick.position(), tick.label(), anchor, anchor, 0.0));
        }
        return made;
    }

    private List<Ticks.Tick> ticks(int most) {
        return Ticks.of(axis, getRange(), Math.max(2, Math.min(MOST_LABELS, most)));
    }

    /** The most ticks whose labels stand apart. */
    private List<Ticks.Tick> close(FontMetrics metrics, Rectangle2D dataArea, RectangleEdge edge) {
        int most = Math.max(2, Math.min(MOST_LABELS, (int) (dataArea.getWidth() / LEAST_SPACING)));
        while (most > 2 && touching(ticks(most), metrics, dataArea, edge)) {
            most--;
        }
        return ticks(most);
    }

    private boolean touching(List<Ticks.Tick> ticks, FontMetrics metrics, Rectangle2D dataArea, RectangleEdge edge) {
        double used = Double.NEGATIVE_INFINITY;
        for (Ticks.Tick tick : ticks) {
            double half = metrics.stringWidth(tick.label()) / 2.0;
            double centre = valueToJava2D(tick.position(), dataArea, edge);
            if (!tick.label().isEmpty() && centre - half < used + LABEL_GAP) {
                return true;
            }
            used = tick.label().isEmpty() ? used : centre + half;
        }
        return false;
    }

    /** Which point of a label touches its tick. */
    static TextAnchor anchor(RectangleEdge edge) {
        if (RectangleEdge.isTopOrBottom(edge)) {
            return edge.equals(RectangleEdge.TOP) ? TextAnchor.BOTTOM_CENTER : TextAnchor.TOP_CENTER;
        }
        return edge.equals(RectangleEdge.LEFT) ? TextAnchor.CENTER_RIGHT : TextAnchor.CENTER_LEFT;
    }
}

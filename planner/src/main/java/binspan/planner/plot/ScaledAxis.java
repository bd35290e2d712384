package binspan.planner.plot;

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
    private static final int MOST_LABELS = 12;

    private final transient Axis axis;

    ScaledAxis(Axis axis, Range positions, PlotTheme theme) {
        super(axis.title());
        this.axis = axis;
        setRange(positions);
        PlotStyle.dress(this, theme);
        setMinorTickMarksVisible(true);
    }

    @Override
    public List<NumberTick> refreshTicks(Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
        boolean horizontal = RectangleEdge.isTopOrBottom(edge);
        double most = horizontal ? dataArea.getWidth() / HORIZONTAL_SPACING : dataArea.getHeight() / VERTICAL_SPACING;
        List<NumberTick> made = new ArrayList<>();
        for (Ticks.Tick tick : Ticks.of(axis, getRange(), Math.max(2, Math.min(MOST_LABELS, (int) most)))) {
            TickType type = tick.label().isEmpty() ? TickType.MINOR : TickType.MAJOR;
            TextAnchor anchor = anchor(edge);
            made.add(new NumberTick(type, tick.position(), tick.label(), anchor, anchor, 0.0));
        }
        return made;
    }

    /** Which point of a label touches its tick. */
    static TextAnchor anchor(RectangleEdge edge) {
        if (RectangleEdge.isTopOrBottom(edge)) {
            return edge.equals(RectangleEdge.TOP) ? TextAnchor.BOTTOM_CENTER : TextAnchor.TOP_CENTER;
        }
        return edge.equals(RectangleEdge.LEFT) ? TextAnchor.CENTER_RIGHT : TextAnchor.CENTER_LEFT;
    }
}

package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.Range;

/** An axis without a line that carries the labels of marks outside the plot, where no curve crosses them. */
final class LabelAxis extends NumberAxis {
    private static final long serialVersionUID = 1L;
    private static final double GAP = 12.0;
    private static final String NO_BREAK_SPACE = "\u00a0";

    private final transient List<Mark> marks;
    private boolean apart;

    /**
     * An axis of labels.
     *
     * @param title its own words, drawn at its lower end; empty for none
     * @param marks what it labels, at positions
     * @param positions the same as those of the axis opposite
     * @param theme colours
     */
    LabelAxis(String title, List<Mark> marks, Range positions, PlotTheme theme) {
        super(title.isEmpty() ? null : title);
        this.marks = marks.stream()
                .filter(mark -> positions.contains(mark.value()))
                .sorted(Comparator.comparingDouble(Mark::value))
                .toList();
        setRange(positions);
        PlotStyle.dress(this, theme);
        setAxisLineVisible(false);
        setTickLabelsVisible(!this.marks.isEmpty());
    }

    /** Whether labels on both sides of close marks keep a blank between them. */
    void setApart(boolean keepApart) {
        apart = keepApart;
    }

    /** As high as one with labels, but without any, so that plots side by side begin level. */
    static LabelAxis blank(Range positions, PlotTheme theme) {
        LabelAxis axis = new LabelAxis("", List.of(new Mark(" ", positions.getCentralValue())), positions, theme);
        axis.setTickMarksVisible(false);
        return axis;
    }

    @Override
    public List<NumberTick> refreshTicks(Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
        boolean crowded = RectangleEdge.isTopOrBottom(edge) && crowded(g2, dataArea, edge);
        List<NumberTick> made = new ArrayList<>();
        for (int i = 0; i < marks.size(); i++) {
            TextAnchor anchor = crowded ? aside(i) : inside(g2, marks.get(i), dataArea, edge);
            String label = crowded ? spaced(i) : marks.get(i).label();
            made.add(new NumberTick(TickType.MAJOR, marks.get(i).value(), label, anchor, anchor, 0.0));
        }
        return made;
    }

    private TextAnchor aside(int index) {
        return index < marks.size() / 2 ? TextAnchor.BOTTOM_RIGHT : TextAnchor.BOTTOM_LEFT;
    }

    private String spaced(int index) {
        String words = joined(index);
        if (!apart || words.isEmpty()) {
            return words;
        }
        return index < marks.size() / 2 ? words + NO_BREAK_SPACE : NO_BREAK_SPACE + words;
    }

    /** The words of the left half at its last mark, those of the right half at its first, nothing at the others. */
    private String joined(int index) {
        int middle = marks.size() / 2;
        if (index < middle - 1 || index > middle) {
            return "";
        }
        List<Mark> half = index < middle ? marks.subList(0, middle) : marks.subList(middle, marks.size());
        return half.stream().map(Mark::label).collect(Collectors.joining(", "));
    }

    /** Centred above its tick, unless it would stick out at a side. */
    private TextAnchor inside(Graphics2D g2, Mark mark, Rectangle2D dataArea, RectangleEdge edge) {
        if (RectangleEdge.isLeftOrRight(edge)) {
            return ScaledAxis.anchor(edge);
        }
        double half = halfWidth(g2, mark);
        double centre = valueToJava2D(mark.value(), dataArea, edge);
        if (centre + half > dataArea.getMaxX()) {
            return TextAnchor.BOTTOM_RIGHT;
        }
        return centre - half < dataArea.getMinX() ? TextAnchor.BOTTOM_LEFT : ScaledAxis.anchor(edge);
    }

    private double halfWidth(Graphics2D g2, Mark mark) {
        return g2.getFontMetrics(getTickLabelFont()).stringWidth(mark.label()) / 2.0;
    }

    /** Whether centred labels would touch each other. */
    private boolean crowded(Graphics2D g2, Rectangle2D dataArea, RectangleEdge edge) {
        double used = Double.NEGATIVE_INFINITY;
        for (Mark mark : marks) {
            double half = halfWidth(g2, mark);
            double centre = valueToJava2D(mark.value(), dataArea, edge);
            if (centre - half < used + GAP) {
                return true;
            }
            used = centre + half;
        }
        return false;
    }
}

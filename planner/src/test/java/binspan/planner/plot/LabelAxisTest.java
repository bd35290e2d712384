package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.Range;
import org.junit.jupiter.api.Test;

final class LabelAxisTest {
    private static List<TextAnchor> anchors(Mark... marks) {
        return ticks(marks).stream().map(NumberTick::getTextAnchor).toList();
    }

    private static List<NumberTick> ticks(Mark... marks) {
        Graphics2D g2 = new BufferedImage(10, 10, BufferedImage.TYPE_INT_RGB).createGraphics();
        return new LabelAxis("", List.of(marks), new Range(0.0, 1.0), PlotTheme.LIGHT)
                .refreshTicks(g2, new AxisState(), new Rectangle2D.Double(0.0, 0.0, 1000.0, 10.0), RectangleEdge.TOP);
    }

    @Test
    void labelsFarApartAreCentred() {
        assertThat(anchors(new Mark("as written", 0.3), new Mark("tuned", 0.6)))
                .containsExactly(TextAnchor.BOTTOM_CENTER, TextAnchor.BOTTOM_CENTER);
    }

    @Test
    void closeLabelsTurnAwayFromEachOther() {
        assertThat(anchors(new Mark("tuned", 0.51), new Mark("as written", 0.5)))
                .containsExactly(TextAnchor.BOTTOM_RIGHT, TextAnchor.BOTTOM_LEFT);
    }

    @Test
    void ofThreeCloseLabelsTwoShareAPlace() {
        Mark[] marks = {new Mark("as written", 0.5), new Mark("tuned", 0.51), new Mark("measured", 0.53)};
        assertThat(ticks(marks).stream().map(NumberTick::getText)).containsExactly("as written", "tuned, measured", "");
        assertThat(anchors(marks).subList(0, 2)).containsExactly(TextAnchor.BOTTOM_RIGHT, TextAnchor.BOTTOM_LEFT);
    }

    @Test
    void labelsAtTheSidesStayInside() {
        assertThat(anchors(new Mark("as written", 0.001), new Mark("tuned", 0.999)))
                .containsExactly(TextAnchor.BOTTOM_LEFT, TextAnchor.BOTTOM_RIGHT);
    }

    @Test
    void marksBeyondTheAxisHaveNoLabel() {
        assertThat(anchors(new Mark("tuned", 1.5))).isEmpty();
    }
}

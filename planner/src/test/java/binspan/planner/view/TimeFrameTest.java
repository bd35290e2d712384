package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.optics.TimeBins;
import binspan.planner.view.TimeFrame.SlotPlotFrame;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Where times and rates stand on the screen; plain geometry. */
class TimeFrameTest {
    private static final TimeBins BINS = new TimeBins(-2e-9, 1e-11, 400);

    private static final String RAISED = "⁻⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final String PLAIN = "-0123456789";

    private final Look look = new Look();

    private TimeFrame frame(boolean logarithmic) {
        return TimeFrame.of(look, 600.0, 200.0, new SlotPlotFrame(BINS, 1000.0, logarithmic, true));
    }

    @Test
    void timesRunFromTheFirstEdgeToTheLast() {
        TimeFrame frame = frame(false);
        assertThat(frame.x(-2e-9)).isCloseTo(frame.left(), within(1e-9));
        assertThat(frame.x(2e-9)).isCloseTo(frame.left() + frame.width(), within(1e-9));
        for (double time = -2e-9; time <= 2e-9; time += 3.7e-10) {
            assertThat(frame.time(frame.x(time))).isCloseTo(time, within(1e-18));
        }
    }

    @Test
    void linearRatesAreProportionalWithRoomAboveTheHighest() {
        TimeFrame frame = frame(false);
        double foot = frame.top() + frame.height();
        assertThat(frame.y(0.0)).isEqualTo(foot);
        assertThat(foot - frame.y(1000.0)).isCloseTo(2.0 * (foot - frame.y(500.0)), within(1e-9));
        assertThat(frame.y(1000.0)).isGreaterThan(frame.top() + look.em(1.0));
        assertThat(frame.y(1e9)).as("nothing above the frame").isEqualTo(frame.top());
    }

    @Test
    void logarithmicRatesFallByTheSameWayForEachDecadeDownToTheFoot() {
        TimeFrame frame = frame(true);
        double decade = frame.y(10.0) - frame.y(100.0);
        assertThat(frame.y(1.0) - frame.y(10.0)).isCloseTo(decade, within(1e-9));
        assertThat(decade).isCloseTo(frame.height() / 5.0, within(1e-9));
        double foot = frame.top() + frame.height();
        assertThat(frame.y(1e-9)).isEqualTo(foot);
        assertThat(frame.y(0.0)).isEqualTo(foot);
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void ticksStandWhereTheirNumbersBelong(boolean logarithmic) {
        TimeFrame frame = frame(logarithmic);
        assertThat(frame.unit()).isEqualTo("ns");
        for (TimeFrame.Mark mark : labelled(frame.across(look))) {
            assertThat(mark.pixel()).isCloseTo(frame.x(number(mark) * 1e-9), within(1e-6));
        }
        List<TimeFrame.Mark> upwards = labelled(frame.upwards(look));
        assertThat(upwards).hasSizeGreaterThan(1);
        for (TimeFrame.Mark mark : upwards) {
            if (number(mark) > 0.0) {
                assertThat(mark.pixel()).isCloseTo(frame.y(number(mark)), within(1e-6));
            }
        }
    }

    private static List<TimeFrame.Mark> labelled(List<TimeFrame.Mark> marks) {
        return marks.stream().filter(mark -> !mark.label().isEmpty()).toList();
    }

    private static double number(TimeFrame.Mark mark) {
        String label = mark.label().replace('\u2212', '-');
        if (!label.startsWith("10") || label.chars().allMatch(each -> each < 128)) {
            return Double.parseDouble(label);
        }
        StringBuilder exponent = new StringBuilder();
        label.substring(2).chars().forEach(each -> exponent.append(PLAIN.charAt(RAISED.indexOf(each))));
        return Math.pow(10.0, Integer.parseInt(exponent.toString()));
    }

    @Test
    void shortTimesAreInPicoseconds() {
        TimeFrame narrow = frame(false).over(-0.9e-9, 0.9e-9);
        assertThat(narrow.unit()).isEqualTo("ps");
        for (TimeFrame.Mark mark : labelled(narrow.across(look))) {
            assertThat(mark.pixel()).isCloseTo(narrow.x(number(mark) * 1e-12), within(1e-6));
        }
    }

    @Test
    void emptyHistogramAndTinyDrawingDoNotBreakIt() {
        TimeFrame empty = TimeFrame.of(look, 10.0, 5.0, new SlotPlotFrame(BINS, 0.0, true, true));
        assertThat(empty.y(0.0)).isFinite();
        assertThat(empty.width()).isEqualTo(1.0);
        assertThat(empty.height()).isEqualTo(1.0);
        assertThat(empty.upwards(look)).allMatch(mark -> Double.isFinite(mark.pixel()));
    }

    @Test
    void everythingGrowsWithTheScale() {
        double before = frame(false).left();
        look.scalePercentProperty().set(200);
        assertThat(frame(false).left()).isEqualTo(2.0 * before);
    }
}

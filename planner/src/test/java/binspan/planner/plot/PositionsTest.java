package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.stream.DoubleStream;
import org.jfree.data.Range;
import org.junit.jupiter.api.Test;

final class PositionsTest {
    private static Range of(Axis axis, double... values) {
        return Positions.of(axis, DoubleStream.of(values), 0.1);
    }

    @Test
    void dataAndMarginsMakeTheRange() {
        assertThat(of(Axis.linear("V", ""), 10.0, Double.NaN, 20.0)).isEqualTo(new Range(9.0, 21.0));
        assertThat(of(Axis.logarithmic("V", ""), 0.0, -1.0, 10.0, 1000.0)).isEqualTo(new Range(0.8, 3.2));
    }

    @Test
    void valuesThatAreNeverNegativeKeepZeroAsTheEnd() {
        assertThat(of(Axis.linear("V", ""), 0.5, 10.5)).isEqualTo(new Range(0.0, 11.5));
        assertThat(of(Axis.linear("V", ""), -0.5, 9.5)).isEqualTo(new Range(-1.5, 10.5));
    }

    @Test
    void statedEndsAreKept() {
        assertThat(of(Axis.linear("V", "").within(0.7, 1.0), 0.2, 3.0)).isEqualTo(new Range(0.7, 1.0));
        assertThat(of(Axis.logarithmic("V", "").within(10.0, 1000.0))).isEqualTo(new Range(1.0, 3.0));
        assertThat(of(new Axis("V", "", false, 5.0, Double.NaN), 1.0, 2.0).getLowerBound())
                .isEqualTo(5.0);
    }

    @Test
    void oneValueOrNoneStillMakesARange() {
        assertThat(of(Axis.linear("V", ""), 0.9).contains(0.9)).isTrue();
        assertThat(of(Axis.linear("V", ""), 0.9).getLength()).isPositive();
        assertThat(of(Axis.linear("V", ""), 0.0)).isEqualTo(new Range(0.0, 1.1));
        assertThat(of(Axis.logarithmic("V", ""), 0.0).getLength()).isPositive();
        assertThat(of(Axis.linear("V", "")).getLength()).isPositive();
    }

    @Test
    void endsThatCannotBeShownAreRefused() {
        assertThatThrownBy(() -> Axis.logarithmic("Window width", "ps").within(0.0, 1.0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("Window width");
        assertThatThrownBy(() -> Axis.linear("Window width", "ps").within(2.0, 1.0))
                .isInstanceOf(IllegalArgumentException.class);
    }
}

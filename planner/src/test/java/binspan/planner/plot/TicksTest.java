package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.stream.Collectors;
import org.assertj.core.data.Offset;
import org.jfree.data.Range;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class TicksTest {
    private static String labels(List<Ticks.Tick> ticks) {
        return ticks.stream()
                .map(Ticks.Tick::label)
                .filter(label -> !label.isEmpty())
                .collect(Collectors.joining(" "));
    }

    @ParameterizedTest
    @CsvSource({
        "0, 2000, 10, 0 200 400 600 800 1000 1200 1400 1600 1800 2000",
        "0.823, 0.953, 8, 0.84 0.86 0.88 0.90 0.92 0.94",
        "-4, 4, 4, \u22124 \u22122 0 2 4",
        "0, 0.0004, 4, 0 10\u207b\u2074 2\u00d710\u207b\u2074 3\u00d710\u207b\u2074 4\u00d710\u207b\u2074",
        "0, 40000, 4, 0 10\u2009000 20\u2009000 30\u2009000 40\u2009000",
        "0, 0.3, 3, 0 0.1 0.2 0.3",
        "0, 3e6, 3, 0 10\u2076 2\u00d710\u2076 3\u00d710\u2076"
    })
    void linearAxesTakeEvenSteps(double from, double to, int most, String labels) {
        Axis axis = Axis.linear("Quantity", "");
        assertThat(labels(Ticks.of(axis, new Range(from, to), most))).isEqualTo(labels);
    }

    @ParameterizedTest
    @CsvSource({
        "1e-3, 1e2, 10, 10\u207b\u00b3 10\u207b\u00b2 10\u207b\u00b9 10\u2070 10\u00b9 10\u00b2",
        "1e-9, 1e3, 4, 10\u207b\u2079 10\u207b\u2076 10\u207b\u00b3 10\u2070 10\u00b3",
        "50, 2000, 10, 50 100 200 500 1000 2000",
        "0.1, 10, 10, 0.1 0.2 0.5 1 2 5 10",
        "0.1, 10, 3, 10\u207b\u00b9 10\u2070 10\u00b9",
        "100, 900, 10, 200 400 600 800",
        "0.90, 0.99, 5, 0.90 0.92 0.94 0.96 0.98",
        "12, 99, 3, 20 50"
    })
    void logarithmicAxesTakeWhatFits(double from, double to, int most, String labels) {
        Axis axis = Axis.logarithmic("Quantity", "");
        Range positions = new Range(Math.log10(from), Math.log10(to));
        assertThat(labels(Ticks.of(axis, positions, most))).isEqualTo(labels);
    }

    @Test
    void labelsStandAtTheirValues() {
        Axis axis = Axis.logarithmic("Quantity", "");
        for (Ticks.Tick tick : Ticks.of(axis, new Range(0.0, 2.0), 20)) {
            if (!tick.label().isEmpty()) {
                assertThat(axis.value(tick.position()))
                        .isCloseTo(Double.parseDouble(tick.label()), within(tick.label()));
            }
        }
    }

    private static Offset<Double> within(String label) {
        return Offset.offset(1e-9 * Double.parseDouble(label));
    }

    @Test
    void everyDecadeHasItsMinorTicks() {
        List<Ticks.Tick> ticks = Ticks.of(Axis.logarithmic("Quantity", ""), new Range(0.0, 4.0), 8);
        assertThat(ticks).hasSize(37);
        assertThat(ticks.get(1).position()).isEqualTo(Math.log10(2.0));
    }

    /** Against counting: never more labels than asked for, always within the axis, shares by proportion. */
    @ParameterizedTest
    @CsvSource({"0, 1, false", "-3.7, 12.2, false", "100, 1500, false", "1e-3, 0.2, true", "2, 7, true", "1, 1e9, true"
    })
    void ticksForOtherCanvasesKeepToTheirNumber(double from, double to, boolean logarithmic) {
        for (int most = 1; most <= 12; most++) {
            List<Ticks.Placed> ticks = Ticks.of(from, to, logarithmic, most);
            assertThat(ticks.stream().filter(tick -> !tick.label().isEmpty())).hasSizeBetween(1, most);
            for (Ticks.Placed tick : ticks) {
                double share = logarithmic
                        ? Math.log(tick.value() / from) / Math.log(to / from)
                        : (tick.value() - from) / (to - from);
                assertThat(tick.share()).isBetween(0.0, 1.0).isCloseTo(share, Offset.offset(1e-9));
            }
        }
    }

    @Test
    void axisThatGoesNowhereIsRefused() {
        assertThatThrownBy(() -> Ticks.of(1.0, 1.0, false, 5)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Ticks.of(0.0, 1.0, true, 5)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Ticks.of(Double.NaN, 1.0, false, 5)).isInstanceOf(IllegalArgumentException.class);
    }
}

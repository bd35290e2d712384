package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.BasicStroke;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Area;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Against the colour spaces of {@link Vision}. */
final class SeriesStyleTest {
    private static final int COUNT = 8;

    @ParameterizedTest
    @EnumSource(Vision.class)
    void eightColoursAreApartForAllEyes(Vision vision) {
        for (int i = 0; i < COUNT; i++) {
            for (int j = 0; j < i; j++) {
                int one = SeriesStyle.of(i, PlotTheme.LIGHT).colour().getRGB();
                int other = SeriesStyle.of(j, PlotTheme.LIGHT).colour().getRGB();
                assertThat(vision.distance(one, other)).isGreaterThan(0.1);
            }
        }
    }

    @Test
    void dashesAndMarkersAlsoDiffer() {
        assertThat(IntStream.range(0, COUNT)
                        .mapToObj(i -> SeriesStyle.of(i, PlotTheme.LIGHT).stroke())
                        .distinct()
                        .toArray(Stroke[]::new))
                .hasSize(COUNT);
        for (int i = 0; i < COUNT; i++) {
            for (int j = 0; j < i; j++) {
                assertThat(different(
                                SeriesStyle.of(i, PlotTheme.LIGHT).marker(),
                                SeriesStyle.of(j, PlotTheme.LIGHT).marker()))
                        .isTrue();
            }
        }
    }

    private static boolean different(Shape one, Shape other) {
        Area rest = new Area(one);
        rest.exclusiveOr(new Area(other));
        return !rest.isEmpty();
    }

    @Test
    void dashesInNumbersAreThoseOfTheStroke() {
        for (int i = 0; i < COUNT; i++) {
            float[] drawn = ((BasicStroke) SeriesStyle.of(i, PlotTheme.DARK).stroke()).getDashArray();
            double[] lengths = drawn == null
                    ? new double[0]
                    : IntStream.range(0, drawn.length)
                            .mapToDouble(k -> drawn[k])
                            .toArray();
            assertThat(SeriesStyle.dashes(i).stream()
                            .mapToDouble(Double::doubleValue)
                            .toArray())
                    .isEqualTo(lengths);
        }
    }
}

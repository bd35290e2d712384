package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

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
                int one = SeriesStyle.of(i).colour().getRGB();
                int other = SeriesStyle.of(j).colour().getRGB();
                assertThat(vision.distance(one, other)).isGreaterThan(0.1);
            }
        }
    }

    /** A ratio of 3 to 1 for parts of graphics is asked for by WCAG 2.1, criterion 1.4.11. */
    @Test
    void coloursStandOutFromWhite() {
        for (int i = 0; i < COUNT; i++) {
            double luminance = luminance(SeriesStyle.of(i).colour().getRGB());
            assertThat(1.05 / (luminance + 0.05)).isGreaterThanOrEqualTo(3.0);
        }
    }

    private static double luminance(int rgb) {
        double[] weights = {0.0722, 0.7152, 0.2126};
        double sum = 0.0;
        for (int i = 0; i < weights.length; i++) {
            double c = ((rgb >> (8 * i)) & 0xff) / 255.0;
            sum += weights[i] * (c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4));
        }
        return sum;
    }

    @Test
    void dashesAndMarkersAlsoDiffer() {
        assertThat(IntStream.range(0, COUNT)
                        .mapToObj(i -> SeriesStyle.of(i).stroke())
                        .distinct()
                        .toArray(Stroke[]::new))
                .hasSize(COUNT);
        for (int i = 0; i < COUNT; i++) {
            for (int j = 0; j < i; j++) {
                assertThat(different(
                                SeriesStyle.of(i).marker(), SeriesStyle.of(j).marker()))
                        .isTrue();
            }
        }
    }

    private static boolean different(Shape one, Shape other) {
        Area rest = new Area(one);
        rest.exclusiveOr(new Area(other));
        return !rest.isEmpty();
    }
}

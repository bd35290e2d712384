package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.DoubleSummaryStatistics;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Against the colour spaces of {@link Vision}. */
final class ColourScaleTest {
    /** Each step is then fifteen of the 256 colours. */
    private static final int STEPS = 17;

    private static int colour(int step, int steps) {
        return ColourScale.rgb((double) step / steps);
    }

    @ParameterizedTest
    @EnumSource(Vision.class)
    void lightnessRisesAllTheWayForAllEyes(Vision vision) {
        for (int i = 0; i < STEPS; i++) {
            assertThat(vision.lab(colour(i + 1, STEPS))[0]).isGreaterThan(vision.lab(colour(i, STEPS))[0] + 0.012);
        }
        assertThat(vision.lab(ColourScale.rgb(0.0))[0]).isLessThan(0.3);
        assertThat(vision.lab(ColourScale.rgb(1.0))[0]).isGreaterThan(0.94);
    }

    /** Half a unit of eight bits in one channel alone moves a step by some two per cent. */
    @Test
    void stepsLookEqual() {
        DoubleSummaryStatistics steps = IntStream.range(0, STEPS)
                .mapToDouble(i -> Vision.NORMAL.distance(colour(i, STEPS), colour(i + 1, STEPS)))
                .summaryStatistics();
        assertThat(steps.getMax()).isLessThan(1.05 * steps.getAverage());
        assertThat(steps.getMin()).isGreaterThan(0.95 * steps.getAverage());
    }

    @ParameterizedTest
    @EnumSource(Vision.class)
    void twelveShadesAreToldApartByAllEyes(Vision vision) {
        for (int i = 0; i < 12; i++) {
            for (int j = 0; j < i; j++) {
                assertThat(vision.distance(colour(i, 11), colour(j, 11))).isGreaterThan(0.05 * (i - j));
            }
        }
    }

    /** Relative luminance by ITU-R BT.709 decides what a greyscale print shows. */
    @Test
    void greyscaleKeepsTheOrder() {
        for (int i = 0; i < STEPS; i++) {
            assertThat(grey(colour(i + 1, STEPS))).isGreaterThan(grey(colour(i, STEPS)));
        }
    }

    private static double grey(int rgb) {
        return 0.2126 * (rgb >> 16 & 0xff) + 0.7152 * (rgb >> 8 & 0xff) + 0.0722 * (rgb & 0xff);
    }

    @Test
    void sharesBeyondTheScaleTakeItsEnds() {
        assertThat(ColourScale.rgb(-3.0)).isEqualTo(ColourScale.rgb(0.0));
        assertThat(ColourScale.rgb(7.0)).isEqualTo(ColourScale.rgb(1.0));
    }

    /** A colour that had been cut off at the border of sRGB would come back changed. */
    @Test
    void colourSurvivesTheWayToSrgbAndBack() {
        OkLab colour = OkLab.ofHue(0.6, 0.09, 200.0);
        double[] back = Vision.NORMAL.lab(colour.rgb());
        assertThat(colour.distance(new OkLab(back[0], back[1], back[2]))).isLessThan(0.003);
    }
}

package binspan.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

final class GaussianWidthTest {

    /** The definition itself: half the peak is reached half a width from the centre. */
    @ParameterizedTest
    @MethodSource("widths")
    void gaussianFallsToHalfAtHalfTheFullWidth(double rms) {
        double offset = GaussianWidth.fwhm(rms) / 2.0 / rms;

        assertThat(Math.exp(-offset * offset / 2.0)).isCloseTo(0.5, within(1e-14));
    }

    @ParameterizedTest
    @MethodSource("widths")
    void rmsUndoesFwhm(double width) {
        assertThat(GaussianWidth.rms(GaussianWidth.fwhm(width))).isCloseTo(width, within(1e-14 * width));
    }

    static DoubleStream widths() {
        return new SplittableRandom(12).doubles(20, 1e-3, 1e4);
    }
}

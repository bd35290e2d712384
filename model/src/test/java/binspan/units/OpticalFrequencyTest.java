package binspan.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

final class OpticalFrequencyTest {

    /** Customary numbers of the C band: 190 THz plus a tenth of the number. */
    @ParameterizedTest
    @CsvSource({"31, 193.1", "30, 193.0", "21, 192.1", "60, 196.0", "30.5, 193.05", "0, 190.0", "-10, 189.0"})
    void channelNumberCountsTenthsOfATerahertz(double channel, double frequencyTHz) {
        assertThat(OpticalFrequency.ofChannel(channel)).isCloseTo(frequencyTHz * 1e12, within(0.1));
    }

    @Test
    void channelsOnTheGridAreExact() {
        assertThat(OpticalFrequency.ofChannel(30)).isEqualTo(193.0e12);
        assertThat(OpticalFrequency.ofChannel(30.5)).isEqualTo(193.05e12);
    }

    @ParameterizedTest
    @MethodSource("wavelengths")
    void wavelengthAndFrequencyUndoEachOther(double wavelengthNm) {
        double back = OpticalFrequency.toWavelengthNm(OpticalFrequency.ofWavelengthNm(wavelengthNm));

        assertThat(back).isCloseTo(wavelengthNm, within(1e-12 * wavelengthNm));
    }

    /**
     * The edges c/(f -+ df/2) lie exactly l^2 df/c / (1 - (df/2f)^2) apart: the narrow-band width with its correction.
     */
    @ParameterizedTest
    @MethodSource("wavelengths")
    void widthIsTheDistanceOfTheEdges(double wavelengthNm) {
        double centre = OpticalFrequency.ofWavelengthNm(wavelengthNm);
        double widthHz = 50e9;
        double edges = OpticalFrequency.toWavelengthNm(centre - widthHz / 2.0)
                - OpticalFrequency.toWavelengthNm(centre + widthHz / 2.0);
        double relative = widthHz / (2.0 * centre);

        assertThat(OpticalFrequency.widthNm(widthHz, wavelengthNm))
                .isCloseTo(edges * (1.0 - relative * relative), within(1e-11 * edges));
    }

    static DoubleStream wavelengths() {
        return new SplittableRandom(13).doubles(30, 400.0, 2000.0);
    }
}

package binspan.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

final class DecibelsTest {

    /** Powers of ten and the customary 3 dB, 10^-0.3 = 0.501187. */
    @ParameterizedTest
    @CsvSource({"0, 1", "10, 0.1", "30, 1e-3", "-10, 10", "200, 1e-20", "3, 0.5011872336272722"})
    void transmittanceFollowsTheDefinition(double lossDb, double transmittance) {
        assertThat(Decibels.transmittance(lossDb)).isCloseTo(transmittance, within(1e-14 * transmittance));
    }

    @ParameterizedTest
    @MethodSource("losses")
    void lossesInARowMultiply(double lossDb) {
        double split = Decibels.transmittance(lossDb / 3.0) * Decibels.transmittance(2.0 * lossDb / 3.0);

        assertThat(Decibels.transmittance(lossDb)).isCloseTo(split, within(1e-13 * split));
        assertThat(-10.0 * Math.log10(Decibels.transmittance(lossDb))).isCloseTo(lossDb, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({"0, 1e-3", "30, 1", "-30, 1e-6", "10, 1e-2"})
    void levelIsPowerAgainstOneMilliwatt(double levelDbm, double watts) {
        assertThat(Decibels.watts(levelDbm)).isCloseTo(watts, within(1e-14 * watts));
    }

    @Test
    void oneDecibelInNepersIsTheTextbookNumber() {
        // 0.2302585 per dB: any textbook of fibre optics
        assertThat(Decibels.NEPERS_PER_DB).isCloseTo(0.230258509299, within(1e-12));
    }

    static DoubleStream losses() {
        return new SplittableRandom(11).doubles(50, 0.0, 120.0);
    }
}

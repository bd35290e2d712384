package binspan.units;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class DigitsTest {
    @ParameterizedTest
    @CsvSource({
        "0, 3, 0",
        "1, 3, 1.00",
        "0.9996, 3, 1.00",
        "9.996, 3, 10.0",
        "999.6, 3, 1000",
        "12345, 3, 12300",
        "999999, 3, 1.00e6",
        "0.001234, 3, 0.00123",
        "0.0009996, 3, 0.00100",
        "0.0001234, 3, 1.23e-4",
        "-42.5, 2, -43",
        "2.5e-13, 1, 3e-13",
        "1.5e300, 2, 1.5e300",
        "4.9e-324, 1, 5e-324"
    })
    void significantDigitsAreKept(double value, int digits, String text) {
        assertThat(Digits.significant(value, digits)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({"1, 1", "0.25, 0.25", "400, 400", "1546.12, 1546.12", "7.000000000000001, 7", "1e-10, 1e-10", "8e7, 8e7"
    })
    void shortestLeavesOutZerosAndDust(double value, String text) {
        assertThat(Digits.shortest(value, 6)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "0, 2, 0.00",
        "0.005, 2, 0.01",
        "0.004, 2, 0.00",
        "-0.004, 2, 0.00",
        "-1.25, 1, -1.3",
        "12.3456, 0, 12",
        "0.96, 1, 1.0"
    })
    void placesAreFixed(double value, int places, String text) {
        assertThat(Digits.decimals(value, places)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "2100, bit/s, 2.10 kbit/s",
        "999.6, Hz, 1.00 kHz",
        "4e-10, s, 400 ps",
        "193.9e12, Hz, 194 THz",
        "0, s, 0 s",
        "-3.2e-7, s, -320 ns",
        "1e30, Hz, 1.00e15 PHz"
    })
    void prefixesAreThoseOfTheTrade(double value, String unit, String text) {
        assertThat(Digits.prefixed(value, unit, 3)).isEqualTo(text);
    }

    @Test
    void whatIsNoNumberIsAWord() {
        assertThat(Digits.significant(Double.POSITIVE_INFINITY, 3)).isEqualTo("infinite");
        assertThat(Digits.significant(Double.NEGATIVE_INFINITY, 3)).isEqualTo("-infinite");
        assertThat(Digits.significant(Double.NaN, 3)).isEqualTo("undefined");
        assertThat(Digits.prefixed(Double.POSITIVE_INFINITY, "s", 3)).isEqualTo("infinite s");
    }

    @Test
    void numbersTooLargeForPlacesAreWrittenInFull() {
        assertThat(Digits.decimals(1e300, 2)).isEqualTo("1.00000000000000e300");
    }

    @Test
    void textReadsBackWithinHalfADigit() {
        Random random = new Random(20261101);
        for (int i = 0; i < 20_000; i++) {
            double value = Math.exp(random.nextGaussian() * 30.0) * (random.nextBoolean() ? 1.0 : -1.0);
            int digits = 1 + random.nextInt(12);
            double read = Double.parseDouble(Digits.significant(value, digits));
            assertThat(Math.abs(read - value))
                    .isLessThanOrEqualTo(0.5000001 * Math.abs(value) * Math.pow(10.0, 1 - digits));
            assertThat(Double.parseDouble(Digits.shortest(value, digits))).isEqualTo(read);
        }
    }

    @Test
    void localeDoesNotMatter() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(Digits.decimals(1.5, 1)).isEqualTo("1.5");
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void exponentIsThatOfTheRoundedNumber() {
        assertThat(Digits.exponent(999.6, 3)).isEqualTo(3);
        assertThat(Digits.exponent(999.4, 3)).isEqualTo(2);
        assertThat(Digits.exponent(0.001, 1)).isEqualTo(-3);
    }
}

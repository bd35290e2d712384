package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class FigureTest {
    @ParameterizedTest
    @CsvSource({
        "0, 0 bit/s",
        "0.0123, 0.0123 bit/s",
        "0.0001234, 1.23e-4 bit/s",
        "12.3, 12.3 bit/s",
        "999.6, 1.00 kbit/s",
        "2100, 2.10 kbit/s",
        "3.46e9, 3.46 Gbit/s"
    })
    void ratesTakePrefixesFromAThousandOn(double perSecond, String text) {
        assertThat(Figure.bits(perSecond)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "0.338, 338 ms",
        "59, 59.0 s",
        "90, 1.50 min",
        "4332, 1.20 h",
        "172799, 48.0 h",
        "172800, 2.00 days",
        "4e6, 46.3 days",
        "1e9, 31.7 years",
        "Infinity, never"
    })
    void durationsAreSaidAsAPersonWould(double seconds, String text) {
        assertThat(Figure.duration(seconds)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({"0.0123, +1.2 pt, +1.2 percentage points", "-0.34, -34 pt, -34 percentage points"})
    void differencesOfRatiosAreInPercentagePoints(double difference, String text, String spelt) {
        assertThat(Figure.points(difference)).isEqualTo(text);
        assertThat(Figure.spelt(text)).isEqualTo(spelt);
        assertThat(Figure.spelt("+1.2 kbit/s")).isEqualTo("+1.2 kbit/s");
    }

    @ParameterizedTest
    @CsvSource({"30, 30 s", "3600, 1 h", "5400, 1.5 h", "120, 2 min", "864000, 10 days"})
    void statedDurationsKeepNoZeros(double seconds, String text) {
        assertThat(Figure.statedDuration(seconds)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({"0.0812, 8.12 %", "0.5, 50.0 %", "0.0001, 0.0100 %", "0.00001234, 0.001 %"})
    void ratiosArePercentages(double ratio, String text) {
        assertThat(Figure.percent(ratio)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "0.956217, 0.0026, 0.956 +- 0.003",
        "0.97234, 0.0014, 0.9723 +- 0.0014",
        "2.51, 0.036, 2.51 +- 0.04",
        "0.888, 0.0996, 0.89 +- 0.10",
        "0.9, 2.4, 0.9 +- 2.4",
        "0.9, 1e-9, 0.900000 +- 0.000000"
    })
    void errorsHaveOneDigitOrTwoAndValuesTheSamePlace(double value, double error, String text) {
        assertThat(Figure.withError(value, error, TextStyle.PLAIN)).isEqualTo(text);
    }

    @Test
    void errorThatIsNoNumberIsLeftOut() {
        assertThat(Figure.withError(0.9, Double.POSITIVE_INFINITY, TextStyle.PLAIN))
                .isEqualTo("0.900");
        assertThat(Figure.withError(0.9, Double.NaN, TextStyle.PLAIN)).isEqualTo("0.900");
    }

    @Test
    void marginsHaveTheirSign() {
        assertThat(Figure.signed(0.0617, "")).isEqualTo("+0.062");
        assertThat(Figure.signed(-4.25, "%")).isEqualTo("-4.3 %");
        assertThat(Figure.signed(0.0, "h")).isEqualTo("0 h");
        assertThat(Figure.signedRate(1731.6, "bit/s")).isEqualTo("+1.73 kbit/s");
        assertThat(Figure.signedRate(-99.6, "bit/s")).isEqualTo("-99.6 bit/s");
        assertThat(Figure.signedRate(-37_700_000.0, "/s")).isEqualTo("-37.7 M/s");
    }

    @Test
    void statedNumbersLoseFloatingPointDust() {
        assertThat(Figure.stated(0.07 * 100.0, "%")).isEqualTo("7 %");
        assertThat(Figure.statedCounts(4e6)).isEqualTo("4 M/s");
        assertThat(Figure.statedCounts(100.0)).isEqualTo("100 /s");
        assertThat(Figure.statedPairs(4e6)).isEqualTo("4 M pairs/s");
        assertThat(Figure.statedPairs(225.0)).isEqualTo("225 pairs/s");
    }
}

package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class RangeTest {

    @ParameterizedTest
    @CsvSource({
        "-1, true, false, false",
        "0, true, false, false",
        "0.5, true, true, true",
        "1, true, true, false",
        "1.5, false, false, false"
    })
    void endsBelongAsTheRangeSays(double value, boolean inWide, boolean inAbove, boolean inBetween) {
        assertThat(Range.of(-1, 1).contains(value)).isEqualTo(inWide);
        assertThat(Range.above(0, 1).contains(value)).isEqualTo(inAbove);
        assertThat(Range.between(0, 1).contains(value)).isEqualTo(inBetween);
    }

    @Test
    void nothingThatIsNoNumberBelongs() {
        Range all = Range.of(-Double.MAX_VALUE, Double.MAX_VALUE);

        assertThat(all.contains(Double.NaN)).isFalse();
        assertThat(all.contains(Double.POSITIVE_INFINITY)).isFalse();
        assertThat(all.contains(Double.NEGATIVE_INFINITY)).isFalse();
    }

    @Test
    void wordsNameTheEnds() {
        assertThat(Range.of(0, 1000).text("km")).isEqualTo("0 to 1000 km");
        assertThat(Range.above(0, 1).text("")).isEqualTo("above 0 to 1");
        assertThat(Range.between(0, 1).text("")).isEqualTo("above 0 to below 1");
        assertThat(Range.above(0, 0.1).text("")).isEqualTo("above 0 to 0.1");
        assertThat(Range.of(1, 1).text("")).isEqualTo("1");
        assertThat(Range.of(2, 2).text("nm")).isEqualTo("2 nm");
    }

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "-0.0, 0",
        "12, 12",
        "0.05, 0.05",
        "1e-10, 1e-10",
        "8.2e-6, 8.2e-6",
        "1e7, 1e7",
        "9999999, 9999999",
        "1e13, 1e13",
        "-2.5, -2.5",
        "1.25e9, 1.25e9",
        "NaN, NaN"
    })
    void numbersAreWrittenAsAPersonWritesThem(double value, String text) {
        assertThat(Range.plain(value)).isEqualTo(text);
    }
}

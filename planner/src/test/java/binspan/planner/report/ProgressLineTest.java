package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class ProgressLineTest {
    @ParameterizedTest
    @CsvSource({
        "0, a few seconds left",
        "4.9, a few seconds left",
        "5, about 5 seconds left",
        "8.1, about 10 seconds left",
        "59, about 60 seconds left",
        "61, about 1 minute left",
        "95, about 2 minutes left",
        "3700, about 1 hour left",
        "86400, about 24 hours left",
        "1e9, more than two days left"
    })
    void timeLeftIsSaidInWords(double seconds, String words) {
        assertThat(ProgressLine.left(seconds)).isEqualTo(words);
    }

    @ParameterizedTest
    @CsvSource({"1e-9, 1", "0.5, 1", "0.9999, 1e6", "1, 5e9"})
    void lineFitsTheScreen(double share, double seconds) {
        assertThat(ProgressLine.of(share, seconds, TextStyle.PLAIN)).hasSizeLessThan(80);
    }

    @Test
    void beginningAndEnd() {
        assertThat(ProgressLine.of(0.0, 2.0, TextStyle.PLAIN)).isEqualTo("   0 %  " + "-".repeat(40));
        assertThat(ProgressLine.of(1.0, 2.0, TextStyle.PLAIN))
                .isEqualTo(" 100 %  " + "#".repeat(40) + "  a few seconds left");
    }
}

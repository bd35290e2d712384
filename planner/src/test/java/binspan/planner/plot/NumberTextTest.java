package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class NumberTextTest {
    private final Locale before = Locale.getDefault();

    @AfterEach
    void restoreLocale() {
        Locale.setDefault(before);
    }

    @ParameterizedTest
    @CsvSource({
        "0, ps, 0\u2009ps",
        "-12.5, GHz, \u221212.5\u2009GHz",
        "0.88, '', 0.88",
        "1234, /s, 1234\u2009/s",
        "100000, /s, 100\u2009000\u2009/s",
        "0.0001, '', 10\u207b\u2074",
        "-0.00025, rad, \u22122.5\u00d710\u207b\u2074\u2009rad",
        "2.5e12, /s, 2.5\u00d710\u00b9\u00b2\u2009/s",
        "Infinity, h, infinite\u2009h"
    })
    void numbersAreSetAsInPrint(double value, String unit, String text) {
        assertThat(NumberText.withUnit(value, unit)).isEqualTo(text);
    }

    @Test
    void localeOfTheMachineDoesNotMatter() {
        Locale.setDefault(Locale.GERMANY);
        assertThat(NumberText.decimals(12345.678, 2)).isEqualTo("12\u2009345.68");
        assertThat(NumberText.decimals(-0.5, 1)).isEqualTo("\u22120.5");
    }
}

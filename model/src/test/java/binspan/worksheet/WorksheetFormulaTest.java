package binspan.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** How numbers are put into a formula. */
final class WorksheetFormulaTest {
    private static final Map<String, WorksheetLine> KNOWN = Map.of(
            "B",
            line("B", 75e9, "Hz"),
            "t",
            line("t", 4e-10, "s"),
            "run",
            line("run", 3600.0, "s"),
            "x",
            line("x", 0.25, ""),
            "y",
            line("y", -3.5e-7, ""),
            "beta",
            line("beta", -6.4e-22, "s^2"),
            "k",
            line("k", 8.2e-6, "1/K"));

    private static WorksheetLine line(String symbol, double value, String unit) {
        return new WorksheetLine("1 Test", symbol, "a number", "", "", value, unit, "test", List.of());
    }

    @ParameterizedTest
    @CsvSource({
        "2 pi {B}/2.354820, 2 pi B/2.354820, 2 pi (75 GHz)/2.354820",
        "exp({t}), exp(t), exp(400 ps)",
        "{t}, t, 400 ps",
        "2 {x}, 2 x, 2 x 0.25",
        "{x} {x}^2, x x^2, 0.25 x 0.25^2",
        "1 + {y}, 1 + y, 1 + (-3.5e-7)",
        "{beta}^2, beta^2, (-640 ps^2)^2",
        "{B} {run}, B run, (75 GHz) (3600 s)",
        "2 {k}, 2 k, 2 (8.2e-6 1/K)"
    })
    void numbersStandWithTheirUnits(String template, String symbols, String numbers) {
        WorksheetFormula formula = WorksheetFormula.of(template, KNOWN);
        assertThat(formula.symbols()).isEqualTo(symbols);
        assertThat(formula.numbers()).isEqualTo(numbers);
    }

    @Test
    void eachNumberIsATermOnce() {
        WorksheetFormula formula = WorksheetFormula.of("{x} {t} {x}", KNOWN);
        assertThat(formula.terms()).extracting(WorksheetTerm::symbol).containsExactly("x", "t");
    }

    @Test
    void unknownSymbolIsAnError() {
        assertThatThrownBy(() -> WorksheetFormula.of("{z}", KNOWN))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("worksheet puts in z before stating it");
    }
}

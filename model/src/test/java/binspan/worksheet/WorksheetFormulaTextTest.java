package binspan.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The formulas as they are printed give the values as they are printed, unless they are told in words. */
final class WorksheetFormulaTextTest {
    /** Quantities that mix units of the trade, so that a power of ten comes with them. */
    private static final List<String> MIXED = List.of("nu_", "lambda_", "tau_", "dt_", "beta_", "dl_", "leak_");

    private static final double ACCURACY = 1e-6;

    static Stream<Values> links() {
        return WorksheetTest.links();
    }

    @ParameterizedTest
    @MethodSource("links")
    void formulaGivesTheValue(Values stated) {
        List<WorksheetLine> lines = WorksheetScenarios.sheet(stated).lines();
        List<String> inWords = new ArrayList<>();
        int evaluated = 0;
        for (WorksheetLine line : lines) {
            if (line.input()) {
                continue;
            }
            double value;
            try {
                value = FormulaText.value(line.formula(), line.terms());
            } catch (IllegalArgumentException e) {
                inWords.add(line.symbol());
                continue;
            }
            assertThat(agrees(line, value))
                    .as("%s = %s = %s, found %s", line.symbol(), line.formula(), line.value(), value)
                    .isTrue();
            evaluated++;
        }
        assertThat(evaluated).isGreaterThan(200);
        assertThat(inWords).hasSizeLessThan(evaluated / 10);
    }

    private static boolean agrees(WorksheetLine line, double value) {
        double power = MIXED.stream().anyMatch(line.symbol()::startsWith) && value != 0.0
                ? Math.rint(Math.log10(value / line.value()))
                : 0.0;
        double scaled = value / Math.pow(10.0, power);
        return scaled == line.value() || Math.abs(scaled - line.value()) <= ACCURACY * Math.abs(line.value()) + 1e-14;
    }

    @ParameterizedTest
    @CsvSource({
        "2 a b/4, 3",
        "1/2 a, 1",
        "-a^2, -4",
        "a^-1 b, 1.5",
        "(a - b)^2, 1",
        "[a + b]/2, 2.5",
        "2 |a - b| b, 6",
        "sqrt 2 sqrt(2), 2",
        "'min(a, b, 1)', 1",
        "'max(0, a - b)', 0",
        "a b(1), 10",
        "h(1/2), 1",
        "2 THz, 2e12"
    })
    void readerFollowsTheUsualOrder(String formula, double value) {
        List<WorksheetTerm> terms = List.of(
                new WorksheetTerm("a", 2.0, ""), new WorksheetTerm("b", 3.0, ""), new WorksheetTerm("b(1)", 5.0, ""));
        assertThat(FormulaText.value(formula, terms))
                .isCloseTo(value, org.assertj.core.api.Assertions.within(1e-9 * Math.abs(value)));
    }

    @Test
    void wordsAreNoFormula() {
        assertThatThrownBy(() -> FormulaText.value("share of the light", List.of()))
                .isInstanceOf(IllegalArgumentException.class);
    }
}

package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.prediction.LinkCheck;
import binspan.scenario.Values;
import binspan.worksheet.Worksheet;
import binspan.worksheet.WorksheetLine;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

final class WorksheetTextTest {
    private static String plain(Values stated) {
        return WorksheetText.text(ReportScenarios.check(stated), TextStyle.PLAIN);
    }

    static Stream<Values> links() {
        return Stream.of(
                ReportScenarios.good(),
                ReportScenarios.continuous(),
                ReportScenarios.pulseTrain(),
                ReportScenarios.onePort());
    }

    @ParameterizedTest
    @MethodSource("links")
    void everyLineIsPrintedInEightyColumns(Values stated) {
        LinkCheck check = ReportScenarios.check(stated);
        String text = WorksheetText.text(check, TextStyle.PLAIN);
        assertThat(text).isASCII().doesNotContain("\u001b");
        assertThat(text.lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
        String flowing = text.replaceAll("\\s+", " ");
        for (WorksheetLine line : Worksheet.of(check).lines()) {
            assertThat(text).contains("\n" + line.symbol() + " ");
            assertThat(flowing)
                    .contains(" " + line.meaning())
                    .contains("= " + line.formula())
                    .contains("= " + line.numbers())
                    .contains(line.valueText());
        }
    }

    @Test
    void formulaNumbersAndValueStandUnderOneAnother() {
        assertThat(plain(ReportScenarios.good())).contains("""
                s_P         rms bandwidth of the pump pulse, transform limited
                            = 1/(2 t_p)
                            = 1/(2 (16.9864 ps))
                            = 2.94353e10 rad/s
                """);
    }

    @Test
    void sourcesAreNamed() {
        assertThat(plain(ReportScenarios.good()))
                .contains("L_A1        alice, cable: length, G.652.D = 30 km [measured 2026-10-02]\n")
                .contains("L_B1        bob, cable: length, G.652.D = 28 km [scenario]\n")
                .contains("[three-term law of ITU-T G.650.1, from memory]");
    }

    @Test
    void notesFromTheFileCannotSteerTheTerminal() {
        Values stated = ReportScenarios.good().put("provenance", Map.of("imbalanceNs", "\u001b[31mred"));
        assertThat(plain(stated)).doesNotContain("\u001b").contains("[?[31mred]");
    }

    @Test
    void namesTheLink() {
        assertThat(plain(ReportScenarios.onePort())).startsWith("Worksheet of Never ending\n");
    }
}

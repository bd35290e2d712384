package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.table.Table;
import binspan.prediction.Requirement;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Tables of studies for the screen. */
final class TableLinesTest {
    private final Scenario kestrel = scenario();

    private static Scenario scenario() {
        try {
            return ScenarioReader.read("../scenarios/kestrel-dam-to-millbrook.json");
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }

    private static Table table(int rows) {
        return new Table(
                List.of("bell.chsh", "timing.windowWidthPs", "protocol.testShare", "rank", "tightest", "meets"),
                writer -> {
                    for (int i = 0; i < rows; i++) {
                        writer.number(2.123456);
                        writer.number(400.125);
                        writer.number(Double.NaN);
                        writer.number(i + 1.0);
                        writer.text(Requirement.RAW_VISIBILITY.fieldName());
                        writer.flag(i == 0);
                        writer.endRow();
                    }
                });
    }

    private static List<String> texts(TableLines lines, int row) {
        return IntStream.range(0, lines.columns().size())
                .mapToObj(i -> lines.columns().get(i).text(lines.rows().get(row).get(i)))
                .toList();
    }

    @Test
    void columnsSayWhatTheyHoldWithTheUnitAndStandInAnOrderToRead() {
        TableLines lines = TableLines.of(table(1), kestrel);
        assertThat(lines.columns().stream().map(TableLines.Column::title).limit(5))
                .containsExactly("Rank", "Tightest requirement", "Window width (ps)", "Test share", "Meets all");
        assertThat(lines.columns().get(5).title()).isEqualTo("CHSH S");
    }

    @Test
    void cellsHaveThreeDigitsButVariedValuesAll() {
        TableLines lines = TableLines.of(table(2), kestrel);
        assertThat(texts(lines, 0)).containsExactly("1", "raw visibility", "400.125", "", "yes", "2.12");
        assertThat(texts(lines, 1).get(4)).isEqualTo("no");
    }

    @Test
    void onlyTheFirstTenThousandRowsAreKeptAndAllAreCounted() {
        TableLines lines = TableLines.of(table(10_001), kestrel);
        assertThat(lines.rows()).hasSize(10_000);
        assertThat(lines.total()).isEqualTo(10_001);
    }
}

package binspan.planner.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Tables as CSV, read back by Apache Commons CSV; layout by RFC 4180, section 2. */
final class TableCsvTest {
    private static String written(Table table) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        TableCsv.write(table, out);
        return out.toString(StandardCharsets.UTF_8);
    }

    private static List<CSVRecord> read(String csv) throws IOException {
        try (CSVParser parser = CSVParser.parse(csv, CSVFormat.RFC4180)) {
            return parser.getRecords();
        }
    }

    private static Table oneCell(String header, Object cell) {
        return new Table(List.of(header), writer -> {
            writer.cell(cell);
            writer.endRow();
        });
    }

    @Test
    void rowsStandUnderTheirHeader() throws IOException {
        Table table = new Table(List.of("timing.windowWidthPs", "bell.chsh", "settings", "meets"), writer -> {
            writer.number(400.0);
            writer.number(2.5980762113533160);
            writer.text("first");
            writer.flag(true);
            writer.endRow();
            writer.number(-0.125);
            writer.number(Double.NaN);
            writer.text("");
            writer.flag(false);
            writer.endRow();
        });
        assertThat(written(table)).isEqualTo("""
                        timing.windowWidthPs,bell.chsh,settings,meets\r
                        400,2.598076211353316,first,true\r
                        -0.125,,,false\r
                        """);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "alice.path.upper duct.lengthKm",
                "alice.path.duct, north.lengthKm",
                "alice.path.\"new\" duct.lengthKm",
                "two\r\nlines",
                " blanks ",
                "größer",
                "plain"
            })
    void everyTextReadsBack(String text) throws IOException {
        List<CSVRecord> records = read(written(oneCell(text, text)));
        assertThat(records).hasSize(2);
        assertThat(records.get(0).values()).containsExactly(text);
        assertThat(records.get(1).values()).containsExactly(text);
    }

    @ParameterizedTest
    @CsvSource(
            value = {"plain|plain", "a b|a b", "a,b|\"a,b\"", "a\"b|\"a\"\"b\""},
            delimiter = '|',
            quoteCharacter = '\u0001')
    void onlyWhatNeedsQuotesHasThem(String text, String cell) throws IOException {
        assertThat(written(oneCell("x", text))).isEqualTo("x\r\n" + cell + "\r\n");
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void whatDoesNotApplyIsAnEmptyCell(double value) throws IOException {
        assertThat(written(oneCell("x", value))).isEqualTo("x\r\n\r\n");
        assertThat(written(oneCell("x", null))).isEqualTo("x\r\n\r\n");
    }

    @Test
    void numbersReadBackExactly() throws IOException {
        SplittableRandom random = new SplittableRandom(4180);
        double[] numbers = random.longs(20_000)
                .mapToDouble(Double::longBitsToDouble)
                .filter(Double::isFinite)
                .toArray();
        Table table = new Table(List.of("x"), writer -> {
            for (double number : numbers) {
                writer.number(number);
                writer.endRow();
            }
        });
        List<CSVRecord> records = read(written(table));
        assertThat(records).hasSize(numbers.length + 1).hasSizeGreaterThan(19_000);
        for (int i = 0; i < numbers.length; i++) {
            assertThat(Double.parseDouble(records.get(i + 1).get(0))).isEqualTo(numbers[i]);
        }
    }

    /** The shortest decimals that read back as these numbers, by hand. */
    @ParameterizedTest
    @CsvSource({"0.1, 0.1", "0.30000000000000004, 0.30000000000000004", "2e-3, 0.002", "2.0E23, 2.0E23", "1e7, 1.0E7"})
    void numbersAreNoLongerThanNeeded(double number, String text) throws IOException {
        assertThat(written(oneCell("x", number))).isEqualTo("x\r\n" + text + "\r\n");
    }

    @Test
    void rowOfAnotherWidthIsAnError() {
        Table table = new Table(List.of("x", "y"), writer -> {
            writer.number(1.0);
            writer.endRow();
        });
        assertThatThrownBy(() -> written(table)).isInstanceOf(IllegalStateException.class);
        assertThatThrownBy(() -> new Table(List.of("x", "x"), writer -> {}))
                .isInstanceOf(IllegalArgumentException.class);
    }
}

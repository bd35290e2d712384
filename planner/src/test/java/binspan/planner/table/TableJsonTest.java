package binspan.planner.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.planner.report.JsonTree;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Tables as JSON, read back by a strict parser. */
final class TableJsonTest {
    private static final Table TABLE = new Table(List.of("link.lengthKm", "bell.chsh", "limits", "meets"), writer -> {
        writer.number(60.0);
        writer.number(2.25);
        writer.text("dark \"counts\"");
        writer.flag(true);
        writer.endRow();
        writer.number(0.1);
        writer.number(Double.POSITIVE_INFINITY);
        writer.text("");
        writer.flag(false);
        writer.endRow();
    });

    private static String written(Table table) throws IOException {
        Map<String, Object> description = TableJson.head("Dam to town", "sweep");
        description.put("vary", List.of(Map.of("path", "link.lengthKm")));
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        TableJson.write(description, table, out);
        return out.toString(StandardCharsets.UTF_8);
    }

    @Test
    void headDescriptionAndRowsStandInTheirOrder() throws IOException {
        assertThat(written(TABLE)).isEqualTo("""
                        {
                          "formatVersion": 1,
                          "version": "(unpackaged)",
                          "scenario": "Dam to town",
                          "study": "sweep",
                          "vary": [
                            { "path": "link.lengthKm" }
                          ],
                          "rows": [
                            { "link.lengthKm": 60, "bell.chsh": 2.25, "limits": "dark \\"counts\\"", "meets": true },
                            { "link.lengthKm": 0.1, "meets": false }
                          ]
                        }
                        """);
    }

    @Test
    void whatDoesNotApplyIsAbsent() throws IOException {
        JsonTree.Node tree = JsonTree.of(written(TABLE));
        List<JsonTree.Node> rows = tree.at("rows").items();
        assertThat(rows.get(0).at("limits").value()).isEqualTo("dark \"counts\"");
        assertThat(rows.get(1).at("link.lengthKm").value()).isEqualTo(0.1);
        assertThat(((Map<?, ?>) rows.get(1).value()).keySet().toString()).isEqualTo("[link.lengthKm, meets]");
    }

    @Test
    void tableWithoutRowsIsStillWhole() throws IOException {
        JsonTree.Node tree = JsonTree.of(written(new Table(List.of("x"), writer -> {})));
        assertThat(tree.at("rows").items()).isEmpty();
    }

    @Test
    void outputThatFailsIsToldAsSuch() {
        OutputStream full = new OutputStream() {
            @Override
            public void write(int b) throws IOException {
                throw new IOException("No space left on device");
            }
        };
        Table large = new Table(List.of("x"), writer -> {
            for (int i = 0; i < 100_000; i++) {
                writer.number(i);
                writer.endRow();
            }
        });
        assertThatThrownBy(() -> TableJson.write(Map.of(), large, full))
                .isInstanceOf(IOException.class)
                .hasMessageContaining("No space");
    }
}

package binspan.planner.table;

import binspan.planner.io.JsonText;
import binspan.planner.report.Version;
import java.io.IOException;
import java.io.OutputStream;
import java.util.LinkedHashMap;
import java.util.Map;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.exc.JacksonIOException;
import tools.jackson.core.io.SerializedString;

/**
 * Writes studies as JSON: {@code formatVersion}, {@code version}, {@code scenario}, {@code study}, its description, then {@code rows}, each an object of
 * named values on a line of its own. What does not apply is absent.
 */
public final class TableJson implements RowWriter {
    private static final int FORMAT_VERSION = 1;

    private final JsonGenerator json;
    private final SerializedString[] names;
    private int cells;
    private boolean begun;

    private TableJson(JsonGenerator json, Table table) {
        this.json = json;
        this.names = table.header().stream().map(SerializedString::new).toArray(SerializedString[]::new);
    }

    /**
     * The beginning of a study's JSON.
     *
     * @param scenario name of the scenario
     * @param study name of the study, that of its command
     * @return a map to which the study adds its description
     */
    public static Map<String, Object> head(String scenario, String study) {
        Map<String, Object> head = new LinkedHashMap<>();
        head.put("formatVersion", FORMAT_VERSION);
        head.put("version", Version.text());
        head.put("scenario", scenario);
        head.put("study", study);
        return head;
    }

    /**
     * Writes a study.
     *
     * @param description head and description: maps, lists, texts, numbers and flags
     * @param table header and rows
     * @param out where to; left open
     */
    public static void write(Map<String, Object> description, Table table, OutputStream out) throws IOException {
        try (JsonGenerator json = JsonText.generator(out)) {
            write(description, table, json);
        } catch (JacksonIOException e) {
            throw e.getCause();
        }
        out.write('\n');
    }

    private static void write(Map<String, Object> description, Table table, JsonGenerator json) throws IOException {
        json.writeStartObject();
        JsonText.members(json, description);
        json.writeName("rows");
        json.writeStartArray();
        table.rows().to(new TableJson(json, table));
        json.writeEndArray();
        json.writeEndObject();
    }

    @Override
    public void number(double value) {
        if (Double.isFinite(value)) {
            name();
            JsonText.number(json, value);
        }
        cells++;
    }

    @Override
    public void text(String value) {
        if (!value.isEmpty()) {
            name();
            json.writeString(value);
        }
        cells++;
    }

    @Override
    public void flag(boolean value) {
        name();
        json.writeBoolean(value);
        cells++;
    }

    @Override
    public void endRow() {
        if (cells != names.length) {
            throw new IllegalStateException("found a row of " + cells + " cells; allowed " + names.length);
        }
        begin();
        json.writeEndObject();
        cells = 0;
        begun = false;
    }

    private void name() {
        begin();
        json.writeName(names[cells]);
    }

    private void begin() {
        if (!begun) {
            json.writeStartObject();
            begun = true;
        }
    }
}

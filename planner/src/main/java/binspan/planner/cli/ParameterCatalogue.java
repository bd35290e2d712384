package binspan.planner.cli;

import binspan.scenario.Choice;
import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.LinkLength;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Every field of the scenario file as a listing. */
final class ParameterCatalogue {
    /** Stands for the label of a path element. */
    static final String LABEL = "LABEL";

    /** Stands for a scenario path. */
    static final String PATH = "PATH";

    private static final String NOTE =
            "alice and bob have the same parameters, listed once; both.detectors.efficiency stands for both arms."
                    + " alice.detectors.efficiency is that of both ports, alice.detectors[1].efficiency that of the"
                    + " second. A path element is addressed by its label or as alice.path[0].";

    private final List<Entry> entries = new ArrayList<>();

    /**
     * One field.
     *
     * @param path scenario path
     * @param type type of the path element that has it, empty for others
     * @param field its entry in the registry
     */
    record Entry(String path, String type, Field field) {}

    private ParameterCatalogue() {}

    /** Every field with its path, in the order of the file, bob's apart. */
    static List<Entry> entries() {
        ParameterCatalogue catalogue = new ParameterCatalogue();
        catalogue.section(ScenarioSections.SCENARIO, "", "");
        return List.copyOf(catalogue.entries);
    }

    private void section(Section section, String prefix, String type) {
        for (Field field : section.fields()) {
            String path = prefix + field.name();
            if (!path.equals("bob")) {
                field(field, path, type);
            }
        }
    }

    private void field(Field field, String path, String type) {
        switch (field.kind()) {
            case SECTION -> content(field.content(), path + ".", type);
            case LIST -> content(field.content(), path + (field.content().typed() ? "." + LABEL + "." : "."), type);
            case ENTRIES -> entriesOf(field, path + "." + PATH, type);
            default -> entries.add(new Entry(path, type, field));
        }
    }

    private void entriesOf(Field field, String path, String type) {
        if (field.content().byType().isEmpty()) {
            entries.add(new Entry(path, type, field));
        }
        content(field.content(), path + ".", type);
    }

    private void content(Content content, String prefix, String type) {
        content.byType().forEach((name, section) -> section(section, prefix, name.isEmpty() ? type : name));
    }

    /** The listing for a terminal. */
    static String text() {
        StringBuilder text = new StringBuilder(Paragraph.of(NOTE, 0)).append('\n');
        LinkLength length = new LinkLength();
        append(text, length.path(), length.range().text(length.unit()) + ": " + length.meaning());
        for (Entry entry : entries()) {
            append(text, entry.path() + element(entry), words(entry.field()));
        }
        return text.toString();
    }

    private static String element(Entry entry) {
        return entry.type().isEmpty() ? "" : " (" + entry.type() + ")";
    }

    private static void append(StringBuilder text, String path, String words) {
        text.append(path).append('\n').append(Paragraph.of(words, 4));
    }

    private static String words(Field field) {
        boolean text = field.kind() == Field.Kind.ENTRIES;
        String allowed = text ? "a text" : field.allowed();
        return allowed + ", " + presence(field) + ": " + field.meaning();
    }

    private static String optional(String otherwise) {
        if (otherwise.isEmpty()) {
            return "optional";
        }
        return otherwise.contains("needed") ? otherwise : "optional (otherwise " + otherwise + ")";
    }

    private static String presence(Field field) {
        return switch (field.presence()) {
            case REQUIRED -> "required";
            case OPTIONAL -> optional(field.defaultText());
            case DEFAULTED -> field.kind() == Field.Kind.ENTRIES ? "optional" : "default " + field.defaultText();
        };
    }

    /** The listing as rows of named values; what does not apply is absent. */
    static List<Map<String, Object>> rows() {
        List<Map<String, Object>> rows = new ArrayList<>();
        for (Entry entry : entries()) {
            rows.add(row(entry));
        }
        return rows;
    }

    private static Map<String, Object> row(Entry entry) {
        Field field = entry.field();
        Map<String, Object> row = new LinkedHashMap<>();
        row.put("path", entry.path());
        putText(row, "element", entry.type());
        row.put("meaning", field.meaning());
        if (field.kind().numeric()) {
            putText(row, "unit", field.unit());
            row.put("lowest", field.range().lowest());
            row.put("highest", field.range().highest());
        }
        if (!field.choices().isEmpty()) {
            row.put("choices", field.choices().stream().map(Choice::text).toList());
        }
        row.put("required", field.presence() == Field.Presence.REQUIRED);
        putText(row, "default", field.kind() == Field.Kind.ENTRIES ? "" : field.defaultText());
        return row;
    }

    private static void putText(Map<String, Object> row, String name, String text) {
        if (!text.isEmpty()) {
            row.put(name, text);
        }
    }
}

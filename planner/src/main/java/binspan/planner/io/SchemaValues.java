package binspan.planner.io;

import binspan.scenario.Choice;
import binspan.scenario.Field;
import binspan.scenario.Range;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The JSON Schema of single values. */
final class SchemaValues {
    private SchemaValues() {}

    /** Meaning, unit and default in words. */
    static String description(Field field) {
        String unit = field.unit().isEmpty() ? "" : ", in " + field.unit();
        return field.meaning() + unit + (inWords(field) ? "; where absent: " + field.defaultText() : "");
    }

    /** Whether only words can say what stands where the field is absent. */
    private static boolean inWords(Field field) {
        return switch (field.kind()) {
            case SECTION, LIST, ENTRIES -> false;
            default -> literal(field) == null && !field.defaultText().isEmpty();
        };
    }

    /** Adds what a field that is neither object nor list may hold. */
    static void add(Field field, Map<String, Object> schema) {
        switch (field.kind()) {
            case NUMBER -> number("number", field.range(), schema);
            case COUNT -> number("integer", field.range(), schema);
            case FLAG -> schema.put("type", "boolean");
            case CHOICE ->
                schema.put("enum", field.choices().stream().map(Choice::text).toList());
            case CHANNEL -> channel(schema);
            default -> schema.putAll(text());
        }
        Object literal = literal(field);
        if (literal != null) {
            schema.put("default", literal);
        }
    }

    /** A text on one line. */
    static Map<String, Object> text() {
        Map<String, Object> text = new LinkedHashMap<>();
        text.put("type", "string");
        text.put("minLength", 1);
        text.put("maxLength", ScalarReader.LONGEST_TEXT);
        text.put("pattern", "^[^\\u0000-\\u001f\\u007f-\\u009f\\u2028\\u2029]*$");
        return text;
    }

    private static void number(String type, Range range, Map<String, Object> schema) {
        schema.put("type", type);
        schema.put(range.lowestOpen() ? "exclusiveMinimum" : "minimum", range.lowest());
        schema.put(range.highestOpen() ? "exclusiveMaximum" : "maximum", range.highest());
    }

    private static void channel(Map<String, Object> schema) {
        schema.put("type", "string");
        schema.put("pattern", "^C?-?[0-9]+(\\.[0-9]+)?$");
        schema.put("examples", List.of("C30", "C30.5"));
    }

    /** A default that is the same whatever the other fields say, or null. */
    private static Object literal(Field field) {
        Object value = field.byDefault().given(Map.of());
        if (value instanceof Choice choice) {
            return choice.text();
        }
        return value instanceof Number || value instanceof Boolean ? value : null;
    }
}

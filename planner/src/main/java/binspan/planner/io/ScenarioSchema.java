package binspan.planner.io;

import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The JSON Schema (draft 2020-12) of scenario files, made from the parameter registry. It says what a field may hold
 * and which fields exclude one another; what one part of a scenario asks of another, such as the fields that a pump
 * mode needs, only reading finds.
 */
public final class ScenarioSchema {
    private static final String DIALECT = "https://json-schema.org/draft/2020-12/schema";
    private static final String DEFINITIONS = "$defs";

    private final Map<String, Object> definitions = new LinkedHashMap<>();

    private ScenarioSchema() {}

    /** The schema as indented JSON with a line end. */
    public static String text() {
        return JsonText.of(new ScenarioSchema().root()) + "\n";
    }

    private Map<String, Object> root() {
        Map<String, Object> root = new LinkedHashMap<>();
        root.put("$schema", DIALECT);
        root.put("title", "Binspan scenario");
        root.put("description", "A planned time-bin entanglement link over optical fibre.");
        root.putAll(object(ScenarioSections.SCENARIO, ""));
        properties(root).put("$schema", named());
        root.put(DEFINITIONS, definitions);
        return root;
    }

    private static Map<String, Object> named() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("description", "names this schema for editors");
        schema.putAll(SchemaValues.text());
        return schema;
    }

    @SuppressWarnings("unchecked")
    private static Map<String, Object> properties(Map<String, Object> object) {
        return (Map<String, Object>) object.get("properties");
    }

    private Map<String, Object> object(Section section, String type) {
        Map<String, Object> properties = new LinkedHashMap<>();
        List<String> required = new ArrayList<>();
        if (!type.isEmpty()) {
            properties.put(Content.TYPE, Map.of("const", type));
            required.add(Content.TYPE);
        }
        for (Field field : section.fields()) {
            properties.put(field.name(), field(field));
            if (field.presence() == Field.Presence.REQUIRED) {
                required.add(field.name());
            }
        }
        Map<String, Object> object = new LinkedHashMap<>();
        object.put("type", "object");
        object.put("properties", properties);
        object.put("additionalProperties", false);
        object.put("required", required);
        SchemaConditions.add(section, object);
        return object;
    }

    private Map<String, Object> field(Field field) {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("description", SchemaValues.description(field));
        switch (field.kind()) {
            case SECTION -> schema.putAll(reference(field.content()));
            case LIST -> list(field, schema);
            case ENTRIES -> entries(field, schema);
            default -> SchemaValues.add(field, schema);
        }
        return schema;
    }

    private void list(Field field, Map<String, Object> schema) {
        schema.put("type", "array");
        schema.put("items", reference(field.content()));
        schema.put("minItems", field.range().lowest());
        schema.put("maxItems", field.range().highest());
    }

    private void entries(Field field, Map<String, Object> schema) {
        boolean texts = field.content().byType().isEmpty();
        schema.put("type", "object");
        schema.put("additionalProperties", texts ? SchemaValues.text() : reference(field.content()));
    }

    private Map<String, Object> reference(Content content) {
        List<Map<String, Object>> references = new ArrayList<>();
        content.byType().forEach((type, section) -> references.add(reference(section, type)));
        return references.size() == 1 ? references.get(0) : Map.of("oneOf", references);
    }

    private Map<String, Object> reference(Section section, String type) {
        String name = section.name().replace(' ', '-');
        if (!definitions.containsKey(name)) {
            definitions.put(name, Map.of());
            definitions.put(name, object(section, type));
        }
        return Map.of("$ref", "#/" + DEFINITIONS + "/" + name);
    }
}

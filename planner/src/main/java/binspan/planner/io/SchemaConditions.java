package binspan.planner.io;

import binspan.scenario.Field;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** What the fields of one object ask of one another, as JSON Schema. */
final class SchemaConditions {
    private SchemaConditions() {}

    /** Adds the alternatives of a section, and the fields that only a catalogue class can stand in for. */
    static void add(Section section, Map<String, Object> object) {
        List<Object> all = new ArrayList<>();
        for (Section.Alternatives group : section.alternatives()) {
            all.add(group.needed() ? exactlyOne(group.fields()) : Map.of("not", Map.of("required", group.fields())));
        }
        List<String> undetermined = undetermined(section);
        if (!undetermined.isEmpty()) {
            all.add(Map.of("anyOf", List.of(required(catalogue(section)), required(undetermined))));
        }
        if (!all.isEmpty()) {
            object.put("allOf", all);
        }
    }

    private static Object exactlyOne(List<String> fields) {
        List<Object> each = new ArrayList<>();
        for (String field : fields) {
            each.add(required(List.of(field)));
        }
        return Map.of("oneOf", each);
    }

    private static Map<String, Object> required(List<String> fields) {
        return Map.of("required", fields);
    }

    /** Fields whose default another field determines, those apart that exclude one another. */
    private static List<String> undetermined(Section section) {
        List<String> names = new ArrayList<>();
        for (Field field : section.fields()) {
            boolean determined = field.byDefault().given(Map.of()) != null;
            if (field.presence() == Field.Presence.DEFAULTED && !determined && !isAlternative(section, field)) {
                names.add(field.name());
            }
        }
        return names;
    }

    private static boolean isAlternative(Section section, Field field) {
        return section.alternatives().stream().anyMatch(group -> group.fields().contains(field.name()));
    }

    /** The field that names a class with values of its own. */
    private static List<String> catalogue(Section section) {
        return section.fields().stream()
                .filter(field -> field.kind() == Field.Kind.CHOICE && field.presence() == Field.Presence.OPTIONAL)
                .map(Field::name)
                .toList();
    }
}

package binspan.planner.viewmodel;

import binspan.planner.report.ParameterWords;
import binspan.planner.report.RequirementWords;
import binspan.prediction.Requirement;
import binspan.scenario.Field;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;

/** What differs between two scenarios, found by a walk through the registry of parameters. */
final class ScenarioChanges {
    private static final String REQUIRE = "require.";

    private final List<ScenarioChange> found = new ArrayList<>();

    private ScenarioChanges() {}

    /** The differences in the order of the scenario file. */
    static List<ScenarioChange> between(Scenario before, Scenario after) {
        ScenarioChanges changes = new ScenarioChanges();
        changes.records(ScenarioSections.SCENARIO, before, after, "");
        return List.copyOf(changes.found);
    }

    private void records(Section section, Record before, Record after, String path) {
        for (int i = 0; i < section.fields().size(); i++) {
            Object old = section.component(before, i);
            Object present = section.component(after, i);
            if (!old.equals(present)) {
                field(section.fields().get(i), old, present, path);
            }
        }
    }

    private void field(Field field, Object before, Object after, String parent) {
        String path = parent + field.name();
        switch (field.kind()) {
            case SECTION -> object(field, before, after, path);
            case LIST -> list(field, (List<?>) before, (List<?>) after, path);
            case ENTRIES -> entries(field, (Map<?, ?>) before, (Map<?, ?>) after);
            default -> add(path, ScenarioValueText.of(field, path, before), ScenarioValueText.of(field, path, after));
        }
    }

    private void object(Field field, Object before, Object after, String path) {
        Object old = unwrapped(before);
        Object present = unwrapped(after);
        if (old instanceof Record was && present instanceof Record is) {
            records(field.content().sectionOf(was), was, is, path + ".");
        } else {
            add(path, ScenarioValueText.presence(old != null), ScenarioValueText.presence(present != null));
        }
    }

    private static Object unwrapped(Object component) {
        return component instanceof Optional<?> optional ? optional.orElse(null) : component;
    }

    /** Elements are the same if their labels are, without labels if their kind and their place among such are. */
    private void list(Field field, List<?> before, List<?> after, String path) {
        Map<String, Integer> old = names(field, before);
        Map<String, Integer> present = names(field, after);
        String side = path.substring(0, path.indexOf('.'));
        for (String name : old.keySet()) {
            if (!present.containsKey(name)) {
                tell("verdict.changed.removed", side, name);
            }
        }
        for (Map.Entry<String, Integer> entry : present.entrySet()) {
            Integer index = old.get(entry.getKey());
            if (index == null) {
                tell("verdict.changed.added", side, entry.getKey());
            } else {
                pair(field, before.get(index), after.get(entry.getValue()), elementPath(path, after, entry.getValue()));
            }
        }
        List<String> kept = new ArrayList<>(old.keySet());
        kept.retainAll(present.keySet());
        List<String> order = new ArrayList<>(present.keySet());
        order.retainAll(old.keySet());
        if (!kept.equals(order)) {
            tell("verdict.changed.order", side, String.join(", ", order));
        }
    }

    private void pair(Field field, Object before, Object after, String path) {
        Section section = field.content().sectionOf((Record) before);
        if (section.type().isInstance(after)) {
            records(section, (Record) before, (Record) after, path + ".");
        } else {
            String kind = field.content().sectionOf((Record) after).name();
            add(path, section.name(), kind);
        }
    }

    private static Map<String, Integer> names(Field field, List<?> elements) {
        Map<String, Integer> names = new LinkedHashMap<>();
        for (int i = 0; i < elements.size(); i++) {
            String label = label(elements.get(i));
            String kind = field.content().sectionOf((Record) elements.get(i)).name();
            String first = label.isEmpty() ? kind : label;
            String name = first;
            for (int number = 2; names.containsKey(name); number++) {
                name = first + " " + number;
            }
            names.put(name, i);
        }
        return names;
    }

    private static String elementPath(String path, List<?> elements, int index) {
        String label = label(elements.get(index));
        return label.isEmpty() ? path + "[" + index + "]" : path + "." + label;
    }

    private static String label(Object element) {
        return element instanceof PathElement known ? known.label().orElse("") : "";
    }

    private void entries(Field field, Map<?, ?> before, Map<?, ?> after) {
        TreeSet<String> paths = new TreeSet<>();
        before.keySet().forEach(path -> paths.add((String) path));
        after.keySet().forEach(path -> paths.add((String) path));
        for (String path : paths) {
            String old = ScenarioValueText.ofEntry(before.get(path));
            String present = ScenarioValueText.ofEntry(after.get(path));
            if (!old.equals(present)) {
                found.add(new ScenarioChange(field.name() + ", " + ParameterWords.name(path), old, present));
            }
        }
    }

    private void add(String path, String before, String after) {
        found.add(new ScenarioChange(name(path), before, after));
    }

    private void tell(String key, String side, String what) {
        found.add(new ScenarioChange(Words.of(key, side, what), "", ""));
    }

    private static String name(String path) {
        return path.startsWith(REQUIRE)
                ? Words.of("verdict.changed.required", RequirementWords.name(requirement(path)))
                : ParameterWords.name(path);
    }

    static Requirement requirement(String path) {
        String field = path.substring(REQUIRE.length());
        return Requirement.stateable().stream()
                .filter(each -> each.fieldName().equals(field))
                .findFirst()
                .orElseThrow();
    }
}

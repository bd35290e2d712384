package binspan.planner.document;

import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import binspan.scenario.Field;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Finds what a document must state differently so that its scenario becomes another one of the same structure. */
public final class Differences {
    private final List<Change> changes = new ArrayList<>();

    private Differences() {}

    /**
     * The changes that lead from one scenario to another. A value that only follows from a changed class is removed, so
     * that it follows on.
     *
     * @param before the scenario of the document
     * @param after the scenario it shall state
     * @throws IllegalArgumentException if a list has not the same elements, by number and type, in both
     */
    public static List<Change> between(Scenario before, Scenario after) {
        Differences differences = new Differences();
        differences.section(ScenarioSections.SCENARIO, before, after, "");
        return List.copyOf(differences.changes);
    }

    private void section(Section section, Record before, Record after, String path) {
        if (before.equals(after)) {
            return;
        }
        Map<String, Object> siblingsBefore = StatedFields.siblings(section, before);
        Map<String, Object> siblingsAfter = StatedFields.siblings(section, after);
        for (int i = 0; i < section.fields().size(); i++) {
            Field field = section.fields().get(i);
            Object from = StatedFields.present(section.component(before, i));
            Object to = StatedFields.present(section.component(after, i));
            String at = path.isEmpty() ? field.name() : path + "." + field.name();
            boolean follows = same(from, StatedFields.byDefault(field, siblingsBefore))
                    && same(to, StatedFields.byDefault(field, siblingsAfter));
            boolean excluded = section.excluding(after, field)
                    .filter(other -> !other.equals(field))
                    .isPresent();
            if (!same(from, to)) {
                if (to == null || follows || excluded) {
                    changes.add(new Remove(at));
                } else {
                    field(field, from, to, at);
                }
            }
        }
    }

    private void field(Field field, Object from, Object to, String path) {
        if (from instanceof Record before && to instanceof Record after) {
            checkAlike(before, after, path);
            section(field.content().sectionOf(after), before, after, path);
        } else if (from instanceof List<?> before && to instanceof List<?> after) {
            list(field, before, after, path);
        } else if (from instanceof Map<?, ?> before && to instanceof Map<?, ?> after) {
            entries(field, before, after, path);
        } else {
            changes.add(new Put(path, StatedFields.written(field, to)));
        }
    }

    private void list(Field field, List<?> before, List<?> after, String path) {
        if (before.size() != after.size()) {
            throw new IllegalArgumentException(
                    path + ": found " + after.size() + " elements; allowed " + before.size() + " as before");
        }
        for (int i = 0; i < before.size(); i++) {
            if (!before.get(i).equals(after.get(i))) {
                field(field, before.get(i), after.get(i), path + "[" + i + "]");
            }
        }
    }

    private void entries(Field field, Map<?, ?> before, Map<?, ?> after, String path) {
        before.keySet().stream()
                .filter(key -> !after.containsKey(key))
                .forEach(key -> changes.add(new Remove(path + "." + key)));
        after.forEach((key, value) -> {
            if (!value.equals(before.get(key))) {
                changes.add(new Put(path + "." + key, StatedFields.written(field, value)));
            }
        });
    }

    private static void checkAlike(Record before, Record after, String path) {
        if (before.getClass() != after.getClass()) {
            throw new IllegalArgumentException(path + ": found an element of another type; allowed the same as before");
        }
    }

    private static boolean same(Object one, Object other) {
        return one == null ? other == null : one.equals(other);
    }
}

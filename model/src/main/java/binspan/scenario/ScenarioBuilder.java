package binspan.scenario;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Turns what a scenario file states into the scenario: fills in defaults and finds what is missing or contradictory.
 */
public final class ScenarioBuilder {
    private final List<Problem> problems = new ArrayList<>();

    private ScenarioBuilder() {}

    /**
     * A scenario, or all that is wrong with it.
     *
     * @param scenario the scenario, absent if there is any problem
     * @param problems all problems, in the order of the file
     */
    public record Outcome(Optional<Scenario> scenario, List<Problem> problems) {}

    /**
     * Builds a scenario.
     *
     * @param stated what the file states, each number already inside its range
     */
    public static Outcome build(Values stated) {
        ScenarioBuilder builder = new ScenarioBuilder();
        ScenarioRules.check(stated, builder.problems);
        Record scenario = builder.section(ScenarioSections.SCENARIO, PartnerPhoton.complete(stated), "");
        return builder.problems.isEmpty()
                ? new Outcome(Optional.of((Scenario) scenario), List.of())
                : new Outcome(Optional.empty(), List.copyOf(builder.problems));
    }

    private Record section(Section section, Values stated, String path) {
        int before = problems.size();
        section.alternatives().forEach(group -> choose(group, stated, path));
        Object[] components = new Object[section.fields().size()];
        for (int i = 0; i < components.length; i++) {
            Field field = section.fields().get(i);
            components[i] = component(field, stated, path.isEmpty() ? field.name() : path + "." + field.name());
        }
        return problems.size() == before ? section.construct(components) : null;
    }

    private void choose(Section.Alternatives group, Values stated, String path) {
        List<String> found = group.fields().stream().filter(stated::has).toList();
        String names = String.join(", ", group.fields());
        if (found.isEmpty() && group.needed()) {
            problems.add(new Problem(path, "missing one of " + names));
        }
        if (found.size() > 1) {
            problems.add(new Problem(
                    path + "." + found.get(1), "found beside " + found.get(0) + "; allowed only one of " + names));
        }
    }

    private Object component(Field field, Values stated, String path) {
        Object value = stated.get(field.name());
        if (value != null) {
            return field.component(resolve(field, value, path));
        }
        Object byDefault = field.byDefault().given(stated.asMap());
        if (field.presence() == Field.Presence.OPTIONAL) {
            return byDefault == null ? field.absent() : field.component(byDefault);
        }
        if (byDefault == null) {
            problems.add(new Problem(path, field.missing()));
            return null;
        }
        return resolve(field, byDefault, path);
    }

    private Object resolve(Field field, Object value, String path) {
        if (value instanceof Values object) {
            return section(field.content().section(object.type()).orElseThrow(), object, path);
        }
        if (value instanceof List<?> items) {
            return items(field, items, path);
        }
        return value instanceof Map<?, ?> entries ? entries(field, entries, path) : value;
    }

    private List<Record> items(Field field, List<?> values, String path) {
        List<Record> items = new ArrayList<>();
        for (int i = 0; i < values.size(); i++) {
            items.add((Record) resolve(field, values.get(i), path + "[" + i + "]"));
        }
        return items;
    }

    private Map<String, Object> entries(Field field, Map<?, ?> values, String path) {
        Map<String, Object> entries = new LinkedHashMap<>();
        values.forEach((key, value) -> entries.put((String) key, resolve(field, value, path + "." + key)));
        return entries;
    }
}

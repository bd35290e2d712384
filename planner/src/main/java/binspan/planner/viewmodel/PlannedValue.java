package binspan.planner.viewmodel;

import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Values and objects of a scenario by their path, its defaults filled in. Elements of lists go by their index. */
final class PlannedValue {
    private Object value;
    private FieldPlace place;

    private PlannedValue(Scenario scenario, String path) {
        value = scenario;
        Section section = ScenarioSections.SCENARIO;
        StringBuilder parent = new StringBuilder();
        for (String step : path.split("\\.", -1)) {
            String name = step.split("\\[", 2)[0];
            Field field = section.field(name).orElseThrow();
            place = new FieldPlace(parent.toString(), section, field);
            value = value == null ? null : component(section, field);
            if (step.endsWith("]") && value != null) {
                value = item(Integer.parseInt(step.substring(name.length() + 1, step.length() - 1)));
            }
            parent.append(parent.isEmpty() ? "" : ".").append(step);
            section = below(field.content(), section);
        }
    }

    /** The value or object of a path, the scenario itself for an empty one; absent where the scenario leaves it open or has no such place. */
    static Optional<Object> at(Scenario scenario, String path) {
        return path.isEmpty() ? Optional.of(scenario) : Optional.ofNullable(new PlannedValue(scenario, path).value);
    }

    /** The registry's entry of a path, the index of an element left out. */
    static FieldPlace place(Scenario scenario, String path) {
        return new PlannedValue(scenario, path).place;
    }

    private Section below(Content content, Section here) {
        if (content.byType().isEmpty()) {
            return here;
        }
        return content.typed() && value != null && !(value instanceof List<?>)
                ? content.sectionOf((Record) value)
                : content.byType().values().iterator().next();
    }

    private Object component(Section section, Field field) {
        Object found = section.component((Record) value, section.indexOf(field.name()));
        return found instanceof Optional<?> optional ? optional.orElse(null) : number(found);
    }

    private static Object number(Object found) {
        if (found instanceof OptionalDouble optional) {
            return optional.isPresent() ? (Object) optional.getAsDouble() : null;
        }
        return found instanceof Integer whole ? (Object) whole.doubleValue() : found;
    }

    private Object item(int index) {
        List<?> items = (List<?>) value;
        return index < items.size() ? items.get(index) : null;
    }
}

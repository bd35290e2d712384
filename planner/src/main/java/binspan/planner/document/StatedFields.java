package binspan.planner.document;

import binspan.scenario.Choice;
import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.Section;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** What a file must state for an object of the scenario: the fields that differ from their defaults. */
final class StatedFields {
    private StatedFields() {}

    /** The fields of a record, its type in front where the file needs it. */
    static Map<String, Object> of(Content content, Record element) {
        Section section = content.sectionOf(element);
        Map<String, Object> stated = new LinkedHashMap<>();
        if (content.typed()) {
            stated.put(Content.TYPE, section.name());
        }
        Map<String, Object> siblings = siblings(section, element);
        for (int i = 0; i < section.fields().size(); i++) {
            Field field = section.fields().get(i);
            Object component = present(section.component(element, i));
            if (component != null
                    && !component.equals(byDefault(field, siblings))
                    && section.excluding(element, field)
                            .filter(other -> !other.equals(field))
                            .isEmpty()) {
                stated.put(field.name(), written(field, component));
            }
        }
        return stated;
    }

    /** A value as a file states it: a channel by its number, an object or list as a tree. */
    static Object written(Field field, Object component) {
        if (component instanceof List<?> items) {
            List<Object> trees = new ArrayList<>();
            items.forEach(item -> trees.add(of(field.content(), (Record) item)));
            return trees;
        }
        if (component instanceof Record element) {
            return of(field.content(), element);
        }
        if (component instanceof Choice choice) {
            return choice.text();
        }
        return field.kind() == Field.Kind.CHANNEL ? channel((Double) component) : component;
    }

    private static String channel(double number) {
        return "C"
                + new BigDecimal(Double.toString(number)).stripTrailingZeros().toPlainString();
    }

    /** A component without its optional around it, null for an absent one. */
    static Object present(Object component) {
        if (component instanceof OptionalDouble number) {
            return number.isPresent() ? number.getAsDouble() : null;
        }
        return component instanceof Optional<?> optional ? optional.orElse(null) : component;
    }

    /** What the record holds that the defaults of its other fields depend on. */
    static Map<String, Object> siblings(Section section, Record element) {
        Map<String, Object> siblings = new LinkedHashMap<>();
        for (int i = 0; i < section.fields().size(); i++) {
            Field field = section.fields().get(i);
            Object component = present(section.component(element, i));
            if (component != null && field.kind() == Field.Kind.CHOICE) {
                siblings.put(field.name(), component);
            }
        }
        return siblings;
    }

    /** The default of a field, an object that is left out as the record of its own defaults being none of these. */
    static Object byDefault(Field field, Map<String, Object> siblings) {
        Object value = field.byDefault().given(siblings);
        return field.kind() == Field.Kind.COUNT && value instanceof Number number ? (Object) number.intValue() : value;
    }
}

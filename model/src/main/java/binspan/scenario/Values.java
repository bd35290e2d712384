package binspan.scenario;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What one object of a scenario file states, before defaults: field names with numbers ({@code Double}), texts,
 * {@link Choice} words, objects ({@code Values}) and lists of objects.
 */
public final class Values {
    private final String type;
    private final Map<String, Object> given = new LinkedHashMap<>();

    /** An object without a type. */
    public Values() {
        this("");
    }

    /** An object of a type. */
    public Values(String type) {
        this.type = type;
    }

    /** The {@code type} it states, empty if none. */
    public String type() {
        return type;
    }

    /** States one field, a later statement replacing the earlier. */
    public Values put(String name, Object value) {
        given.put(name, value);
        return this;
    }

    /** An object that states the same; later statements of either do not reach the other. */
    public Values copy() {
        Values copy = new Values(type);
        copy.given.putAll(given);
        return copy;
    }

    /** Whether a field is stated. */
    public boolean has(String name) {
        return given.containsKey(name);
    }

    /** The value of a field, or null. */
    public Object get(String name) {
        return given.get(name);
    }

    /** An object, empty if it is not stated. */
    public Values section(String name) {
        return given.get(name) instanceof Values values ? values : new Values();
    }

    /** A list of objects, empty if it is not stated. */
    public List<Values> list(String name) {
        return given.get(name) instanceof List<?> items
                ? items.stream().map(Values.class::cast).toList()
                : List.of();
    }

    /** A text. */
    public Optional<String> text(String name) {
        return given.get(name) instanceof String text ? Optional.of(text) : Optional.empty();
    }

    /** All that is stated, in its order. */
    public Map<String, Object> asMap() {
        return Collections.unmodifiableMap(given);
    }
}

package binspan.scenario;

import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * One kind of object in the scenario file and the record it becomes; its fields stand in the order of the record's
 * components.
 */
public final class Section {
    private final String name;
    private final Class<? extends Record> type;
    private final List<Field> fields;
    private final Constructor<?> constructor;
    private final List<Alternatives> alternatives = new ArrayList<>();
    private volatile Method[] accessors;

    /**
     * Fields of which at most one may be given.
     *
     * @param fields their names
     * @param needed whether one of them must be given
     */
    public record Alternatives(List<String> fields, boolean needed) {}

    /**
     * Describes a record.
     *
     * @param name word for the object in listings
     * @param type its record
     * @param fields its fields in the order of the components
     */
    public Section(String name, Class<? extends Record> type, Field... fields) {
        this.name = name;
        this.type = type;
        this.fields = List.of(fields);
        this.constructor = type.getDeclaredConstructors()[0];
    }

    /** Declares fields of which exactly one must be given. */
    Section exactlyOneOf(String... names) {
        alternatives.add(new Alternatives(List.of(names), true));
        return this;
    }

    /** Declares fields of which at most one may be given. */
    Section atMostOneOf(String... names) {
        alternatives.add(new Alternatives(List.of(names), false));
        return this;
    }

    /** Groups of fields that exclude one another. */
    public List<Alternatives> alternatives() {
        return List.copyOf(alternatives);
    }

    /** Word for the object in listings. */
    public String name() {
        return name;
    }

    /** Its fields in the order of the record's components. */
    public List<Field> fields() {
        return fields;
    }

    /** The record that the object becomes. */
    public Class<? extends Record> type() {
        return type;
    }

    /** The field of a name. */
    public Optional<Field> field(String fieldName) {
        int index = indexOf(fieldName);
        return index < 0 ? Optional.empty() : Optional.of(fields.get(index));
    }

    /** Position of a field, -1 if there is none of that name. */
    public int indexOf(String fieldName) {
        for (int i = 0; i < fields.size(); i++) {
            if (fields.get(i).name().equals(fieldName)) {
                return i;
            }
        }
        return -1;
    }

    /** Whether a record is one of this section. */
    public boolean describes(Record element) {
        return type.isInstance(element);
    }

    /** Makes the record from its components. */
    Record construct(Object[] values) {
        try {
            return (Record) constructor.newInstance(values);
        } catch (InvocationTargetException e) {
            throw new IllegalStateException("section " + name, e.getCause());
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("section " + name, e);
        }
    }

    /**
     * Reads one component of a record that the section describes.
     *
     * @param element the record
     * @param index position of the field
     */
    public Object component(Record element, int index) {
        try {
            return accessors()[index].invoke(element);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("section " + name, e);
        }
    }

    /** Reads all components of a record. */
    Object[] components(Record element) {
        Object[] values = new Object[fields.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = component(element, i);
        }
        return values;
    }

    /** Makes the record from the given components with one of them exchanged. */
    Record construct(Object[] values, int index, Object value) {
        Object[] changed = values.clone();
        changed[index] = value;
        return construct(changed);
    }

    /**
     * The object that stands in a record and leaves no room for a field, such as the gate of a detector for its dark
     * counts.
     *
     * @param element record that the section describes
     * @param field one of its fields
     */
    public Optional<Field> excluding(Record element, Field field) {
        for (Alternatives group : alternatives) {
            if (group.fields().contains(field.name())) {
                for (String other : group.fields()) {
                    int index = indexOf(other);
                    if (component(element, index) instanceof Optional<?> found && found.isPresent()) {
                        return Optional.of(fields.get(index));
                    }
                }
            }
        }
        return Optional.empty();
    }

    /** The components of a record without the numbers that a field excludes, ready for that field to be stated. */
    Object[] componentsFor(Record element, Field field) {
        Object[] values = components(element);
        for (Alternatives group : alternatives) {
            if (group.fields().contains(field.name())) {
                group.fields().forEach(name -> clear(values, name, field.name()));
            }
        }
        return values;
    }

    private void clear(Object[] values, String name, String kept) {
        int index = indexOf(name);
        Field field = fields.get(index);
        if (!name.equals(kept)
                && field.presence() == Field.Presence.OPTIONAL
                && field.kind().numeric()) {
            values[index] = field.absent();
        }
    }

    /** Found when first needed; two threads that find them at once find the same. */
    private Method[] accessors() {
        Method[] found = accessors;
        if (found == null) {
            found = Stream.of(type.getRecordComponents())
                    .map(RecordComponent::getAccessor)
                    .toArray(Method[]::new);
            accessors = found;
        }
        return found;
    }
}

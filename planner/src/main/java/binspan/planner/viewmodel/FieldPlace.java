package binspan.planner.viewmodel;

import binspan.scenario.Field;
import binspan.scenario.Section;
import java.util.List;
import java.util.stream.Stream;

/**
 * A field at its place in a scenario.
 *
 * @param parent scenario path of the object that has it, elements of lists by their index; empty for the whole file
 * @param section what that object is
 * @param field the field in the registry
 */
public record FieldPlace(String parent, Section section, Field field) {
    /** Its scenario path. */
    public String path() {
        return beside(field.name());
    }

    /** The path of another field of the same object. */
    public String beside(String name) {
        return parent.isEmpty() ? name : parent + "." + name;
    }

    /** Fields that may not be given together with it. */
    public List<String> rivals() {
        return section.alternatives().stream()
                .filter(group -> group.fields().contains(field.name()))
                .flatMap(group -> group.fields().stream())
                .filter(name -> !name.equals(field.name()))
                .toList();
    }

    /** The places of the fields of an object in it, such as the gate of a detector. */
    Stream<FieldPlace> inside() {
        Section inner = field.content().section("").orElseThrow();
        return inner.fields().stream().map(each -> new FieldPlace(path(), inner, each));
    }
}

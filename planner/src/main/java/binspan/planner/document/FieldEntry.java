package binspan.planner.document;

import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import binspan.planner.io.TypedValue;
import binspan.scenario.Field;

/** What a person typed into the field of a form: a change, or a refusal in the words of the command line. */
public sealed interface FieldEntry {
    /**
     * It can be made a change; whether the whole scenario allows it is for the document to say.
     *
     * @param change the value put, or removed where nothing was typed
     */
    record Accepted(Change change) implements FieldEntry {}

    /**
     * It is not allowed in this field.
     *
     * @param problem what was found and what is allowed
     */
    record Refused(EditProblem problem) implements FieldEntry {}

    /**
     * Reads what was typed. Blanks around it do not count; nothing at all leaves the field to its default.
     *
     * @param field the registry's entry, neither an object nor a list
     * @param path scenario path of the field
     * @param typed what was typed
     */
    static FieldEntry read(Field field, String path, String typed) {
        String text = typed.strip();
        if (text.isEmpty()) {
            return field.presence() == Field.Presence.REQUIRED
                    ? new Refused(new EditProblem(path, field.missing()))
                    : new Accepted(new Remove(path));
        }
        TypedValue value = TypedValue.of(field, text);
        return value.error().isEmpty()
                ? new Accepted(new Put(path, value.value()))
                : new Refused(new EditProblem(path, value.error()));
    }
}

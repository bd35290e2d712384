package binspan.planner.viewmodel;

import java.util.stream.Stream;

/** A row of the form. */
public sealed interface FormRow permits FieldModel, AlternativesModel, GroupRow, AddRow, ClassRow {
    /** The fields in it. */
    default Stream<FieldModel> fields() {
        return Stream.empty();
    }

    /** Follows the scenario. */
    void refresh();
}

package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.EditProblem;
import binspan.scenario.Scenario;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

/** The form of the selected part of the link: all its fields, as rows. */
public final class FormModel {
    private final ObservableList<FormRow> rows = FXCollections.observableArrayList();
    private final ObservableList<LinkPart> parts = FXCollections.observableArrayList();
    private final ReadOnlyObjectWrapper<LinkPart> part = new ReadOnlyObjectWrapper<>(this, "part");
    private final ReadOnlyStringWrapper title = new ReadOnlyStringWrapper(this, "title", "");
    private final Design design;
    private final FormEdits edits;
    private String structure = "";

    /** Where edits go. */
    @FunctionalInterface
    public interface Editing {
        /**
         * Makes changes of the document.
         *
         * @param what the change in words, for undo
         * @param drag something that stands for one movement of the hand, so that all of it is undone at once; null for
         *     a single change
         * @param changes what to change
         * @return why it is refused, empty if it was done
         */
        List<EditProblem> apply(String what, Object drag, List<Change> changes);
    }

    /**
     * Follows a design.
     *
     * @param design the link and the selected part
     * @param states whether the file states the value of a path, as the document is at the time of asking
     * @param editing where edits go
     */
    public FormModel(Design design, Predicate<String> states, Editing editing) {
        this.design = design;
        this.edits = new FormEdits(design, states, editing);
        design.turnsProperty().addListener((source, before, now) -> forget());
        design.selectionProperty().addListener((source, before, now) -> follow());
        design.scenarioProperty().addListener((source, before, now) -> follow());
        design.savedProperty().addListener((source, before, now) -> follow());
        follow();
    }

    /** The rows of the selected part. They are made anew only when another part is selected or its fields change. */
    public ObservableList<FormRow> rows() {
        return rows;
    }

    /** All parts of the link, in the order in which one walks along it. */
    public ObservableList<LinkPart> parts() {
        return parts;
    }

    /** The part that is shown. */
    public ReadOnlyObjectProperty<LinkPart> partProperty() {
        return part.getReadOnlyProperty();
    }

    /** Its name. */
    public ReadOnlyStringProperty titleProperty() {
        return title.getReadOnlyProperty();
    }

    /** The name of a part. */
    public String name(LinkPart each) {
        return PartName.of(design.scenario(), each);
    }

    /** Selects a part. */
    public void select(LinkPart wanted) {
        design.selectionProperty().set(wanted);
    }

    /**
     * An entry that is not part of the design.
     *
     * @param part name of the part whose form has it
     * @param path its field's scenario path, elements by their labels
     * @param text what is typed
     * @param error why it is not allowed
     */
    public record RefusedEntry(String part, String path, String text, String error) {}

    /** The first field that shows a refused entry, absent while all that is shown is in the design. */
    public Optional<RefusedEntry> refused() {
        return fields().filter(field -> !field.errorProperty().get().isEmpty())
                .findFirst()
                .map(field -> new RefusedEntry(
                        title.get(),
                        field.writtenPath(),
                        field.textProperty().get(),
                        field.errorProperty().get()));
    }

    private Stream<FieldModel> fields() {
        return rows.stream().flatMap(FormRow::fields);
    }

    /** What is undone or opened anew is not to be mixed with what was typed before. */
    private void forget() {
        fields().forEach(FieldModel::forget);
    }

    /** Gives up entries that are not allowed, or else takes the last change of the link back. */
    public void undo() {
        if (!givenUp()) {
            design.undo();
        }
    }

    /** Gives up entries that are not allowed, or else does the change again that was taken back last. */
    public void redo() {
        if (!givenUp()) {
            design.redo();
        }
    }

    private boolean givenUp() {
        return fields().toList().stream().filter(FieldModel::giveUp).count() > 0;
    }

    private void follow() {
        edits.follow();
        Scenario scenario = design.scenario();
        List<LinkPart> present = PartName.all(scenario);
        LinkPart wanted = design.selectionProperty().get();
        part.set(present.contains(wanted) ? wanted : new LinkPart.Plan());
        if (!parts.equals(present)) {
            parts.setAll(present);
        }
        title.set(name(part.get()));
        List<FormLayout.Group> groups = FormLayout.of(scenario, part.get());
        String now = structure(scenario, groups);
        if (now.equals(structure)) {
            rows.forEach(FormRow::refresh);
        } else {
            structure = now;
            rows.setAll(made(scenario, groups));
        }
    }

    /** What decides which rows there are. */
    private String structure(Scenario scenario, List<FormLayout.Group> groups) {
        StringBuilder text = new StringBuilder(part.get().toString());
        for (FormLayout.Group group : groups) {
            text.append('\n').append(group.object()).append(group.title()).append(group.inList());
            for (FieldPlace place : group.fields()) {
                boolean idle = WithoutEffect.reason(scenario, place).isPresent();
                text.append(' ').append(place.field().name());
                text.append(idle ? edits.statedIn(place) == null ? "-" : "!" : "");
            }
        }
        return text.toString();
    }

    /** What can be added to the part: a classical channel to a fibre, a second detector to a side that has one. */
    private Optional<AddRow> adding(Scenario scenario) {
        String list = FormLayout.listOf(scenario, part.get());
        if (list.isEmpty()) {
            return Optional.empty();
        }
        int size = ((List<?>) PlannedValue.at(scenario, list).orElseThrow()).size();
        if (!(part.get() instanceof LinkPart.Port)) {
            return Optional.of(AddRow.channel(edits, list, size));
        }
        Section section =
                PlannedValue.place(scenario, list).field().content().section("").orElseThrow();
        return size == 1 ? Optional.of(AddRow.port(edits, list, section)) : Optional.empty();
    }

    private List<FormRow> made(Scenario scenario, List<FormLayout.Group> groups) {
        List<FormRow> made = new ArrayList<>();
        List<FormRow> idle = new ArrayList<>();
        for (FormLayout.Group group : groups) {
            if (!group.title().isEmpty()) {
                made.add(new GroupRow(edits, group));
            }
            rows(scenario, group, made, idle);
        }
        adding(scenario).ifPresent(made::add);
        if (!idle.isEmpty()) {
            made.add(new GroupRow(edits, new FormLayout.Group(Words.of("form.group.idle"), "", List.of(), false)));
        }
        made.addAll(idle);
        return made;
    }

    private void rows(Scenario scenario, FormLayout.Group group, List<FormRow> made, List<FormRow> idle) {
        Set<String> done = new HashSet<>();
        for (FieldPlace place : group.fields()) {
            boolean without = WithoutEffect.reason(scenario, place).isPresent();
            if (without && edits.statedIn(place) != null) {
                idle.add(new FieldModel(edits, place));
            } else if (!without && done.add(place.field().name())) {
                done.addAll(place.rivals());
                FormRow row = row(place);
                made.add(row);
                if (row instanceof FieldModel field && field.isClass()) {
                    made.add(new ClassRow(edits, place));
                }
            }
        }
    }

    private FormRow row(FieldPlace place) {
        List<String> rivals = place.rivals();
        if (rivals.isEmpty()) {
            return new FieldModel(edits, place);
        }
        List<FieldPlace> forms = place.section().fields().stream()
                .filter(each -> each.equals(place.field()) || rivals.contains(each.name()))
                .map(each -> new FieldPlace(place.parent(), place.section(), each))
                .toList();
        return new AlternativesModel(edits, forms);
    }
}

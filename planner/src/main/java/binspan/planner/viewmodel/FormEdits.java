package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.EditProblem;
import binspan.planner.document.PumpChange;
import binspan.planner.report.ParameterWords;
import binspan.scenario.Field;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.Section;
import binspan.scenario.Values;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import java.util.stream.Stream;

/** What the rows of a form read and change: the scenario, what its file states, and the edits of both. */
final class FormEdits {
    private static final String PUMP_MODE = "source.pump.mode";

    private final Design design;
    private final Predicate<String> states;
    private final Map<String, Values> objects = new HashMap<>();
    private final FormModel.Editing editing;

    FormEdits(Design design, Predicate<String> states, FormModel.Editing editing) {
        this.design = design;
        this.states = states;
        this.editing = editing;
    }

    Scenario scenario() {
        return design.scenario();
    }

    Scenario saved() {
        return design.savedProperty().get();
    }

    /** Looks at the file anew. */
    void follow() {
        objects.clear();
    }

    /** What the file states of the object of a field. */
    Values stated(FieldPlace place) {
        return stated(place.parent(), place.section());
    }

    /** What the file states of an object, empty if it has no such object. */
    Values stated(String object, Section section) {
        return objects.computeIfAbsent(object, path -> read(path, section));
    }

    private Values read(String object, Section section) {
        Values values = new Values();
        for (Field field : section.fields()) {
            FieldPlace place = new FieldPlace(object, section, field);
            if (states.test(place.path())) {
                PlannedValue.at(scenario(), place.path()).ifPresent(value -> values.put(field.name(), value));
            }
        }
        return values;
    }

    /** What the file states in a field, null if its default stands. */
    Object statedIn(FieldPlace place) {
        return stated(place).get(place.field().name());
    }

    /** States a field. */
    String put(FieldPlace place, Object value) {
        boolean pump = place.path().equals(PUMP_MODE);
        return apply(what(place), place.path(), pump ? pumping(value) : List.of(putting(place, value)));
    }

    /** Another pump brings along what it needs and drops what it does not read. */
    private List<Change> pumping(Object mode) {
        return Stream.of(PumpMode.values())
                .filter(each -> each.text().equals(mode))
                .findFirst()
                .map(each -> PumpChange.to(scenario(), each))
                .orElseThrow();
    }

    /** A gate that is only that of the class is written out as a whole. */
    private Change putting(FieldPlace place, Object value) {
        boolean gateOfClass =
                place.section().name().equals("gate") && stated(place).asMap().isEmpty();
        if (!gateOfClass) {
            return new Change.Put(place.path(), value);
        }
        Map<String, Object> gate = new LinkedHashMap<>();
        PlannedValue.at(scenario(), place.beside("widthNs")).ifPresent(width -> gate.put("widthNs", width));
        PlannedValue.at(scenario(), place.beside("darkProbability"))
                .ifPresent(dark -> gate.put("darkProbability", dark));
        gate.put(place.field().name(), value);
        return new Change.Put(place.parent(), gate);
    }

    /** Leaves a field to its default. */
    String remove(FieldPlace place) {
        return apply(what(place), place.path(), List.of(new Change.Remove(place.path())));
    }

    /** A single change of its own. */
    String apply(String what, List<Change> changes) {
        return apply(what, null, changes);
    }

    /** Does it and gives the refusal, empty if there is none. */
    private String apply(String what, String drag, List<Change> changes) {
        List<EditProblem> problems = editing.apply(what, drag, changes);
        for (EditProblem problem : problems) {
            if (problem.path().equals(drag)) {
                return problem.message();
            }
        }
        return problems.isEmpty() ? "" : line(problems.get(0));
    }

    private static String line(EditProblem problem) {
        return problem.path().isEmpty() ? problem.message() : problem.path() + ": " + problem.message();
    }

    private String what(FieldPlace place) {
        return ParameterWords.name(ElementPath.labelled(scenario(), place.path()));
    }

    /** What follows is a change of its own. */
    void settle() {
        design.settle();
    }
}

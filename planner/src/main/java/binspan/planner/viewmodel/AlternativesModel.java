package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.report.ParameterWords;
import binspan.scenario.Detector;
import binspan.scenario.Field;
import binspan.scenario.Gate;
import binspan.scenario.Range;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** Forms of stating one thing, of which the file has one at most: a wavelength, a frequency or a channel. */
public final class AlternativesModel implements FormRow {
    private final ReadOnlyIntegerWrapper shown = new ReadOnlyIntegerWrapper(this, "shown");
    private final ReadOnlyStringWrapper error = new ReadOnlyStringWrapper(this, "error", "");
    private final List<Form> forms = new ArrayList<>();
    private final FormEdits edits;
    private int stands;

    /**
     * One form.
     *
     * @param label what it is, in words
     * @param place its field, or the object that holds its fields
     * @param models its fields
     */
    public record Form(String label, FieldPlace place, List<FieldModel> models) {}

    AlternativesModel(FormEdits edits, List<FieldPlace> places) {
        this.edits = edits;
        for (FieldPlace place : places) {
            Stream<FieldPlace> fields = isObject(place) ? place.inside() : Stream.of(place);
            List<FieldModel> models =
                    fields.map(each -> new FieldModel(edits, each)).toList();
            forms.add(new Form(ParameterWords.name(place.field().name()), place, models));
        }
        stands = standing();
        shown.set(Math.max(0, stands));
    }

    private static boolean isObject(FieldPlace place) {
        return place.field().kind() == Field.Kind.SECTION;
    }

    /** The forms there are. */
    public List<Form> forms() {
        return List.copyOf(forms);
    }

    /** The form whose fields are shown. */
    public ReadOnlyIntegerProperty shownProperty() {
        return shown.getReadOnlyProperty();
    }

    /** Why the form could not be changed, in the command line's words; empty if all is well. */
    public ReadOnlyStringProperty errorProperty() {
        return error.getReadOnlyProperty();
    }

    /**
     * Chooses another form. Where it can say the same, it does so at once; where it cannot, its field is empty and the
     * old form stands until something is typed.
     */
    public void choose(int form) {
        if (form == shown.get()) {
            return;
        }
        Form wanted = forms.get(form);
        error.set(standing() < 0 ? "" : restate(wanted.place()));
        if (error.get().isEmpty()) {
            shown.set(form);
        }
    }

    private String restate(FieldPlace place) {
        if (isObject(place)) {
            return edits.apply(Words.of("form.restated"), List.of(new Change.Put(place.path(), gate(place))));
        }
        OptionalDouble value = Equivalent.of(edits.scenario(), place);
        if (value.isEmpty()) {
            return "";
        }
        Object written = place.field().kind() == Field.Kind.CHANNEL
                ? "C" + Range.plain(value.getAsDouble())
                : (Object) value.getAsDouble();
        return edits.apply(Words.of("form.restated"), List.of(new Change.Put(place.path(), written)));
    }

    private Map<String, Object> gate(FieldPlace place) {
        Detector detector =
                (Detector) PlannedValue.at(edits.scenario(), place.parent()).orElseThrow();
        Gate gate = Equivalent.gate(detector);
        Map<String, Object> written = new LinkedHashMap<>();
        gate.rateMHz().ifPresent(rate -> written.put("rateMHz", rate));
        written.put("widthNs", gate.widthNs());
        written.put("darkProbability", gate.darkProbability());
        return written;
    }

    /** The form that is in force: stated, or brought in by a class; -1 if none is. */
    private int standing() {
        for (int i = 0; i < forms.size(); i++) {
            FieldPlace place = forms.get(i).place();
            if (edits.statedIn(place) != null) {
                return i;
            }
        }
        for (int i = forms.size() - 1; i >= 0; i--) {
            if (PlannedValue.at(edits.scenario(), forms.get(i).place().path()).isPresent()) {
                return i;
            }
        }
        return -1;
    }

    @Override
    public Stream<FieldModel> fields() {
        return forms.stream().flatMap(form -> form.models().stream());
    }

    @Override
    public void refresh() {
        forms.forEach(form -> form.models().forEach(FieldModel::refresh));
        int now = standing();
        if (now != stands && now >= 0) {
            shown.set(now);
        }
        stands = now;
    }
}

package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.FieldEntry;
import binspan.planner.report.ParameterWords;
import binspan.scenario.Choice;
import binspan.scenario.Field;
import binspan.scenario.Range;
import binspan.scenario.Values;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;

/**
 * One field of the form. What is typed into it changes the design at once if it is allowed; what is not stays in the
 * field with the reason beside it.
 */
public final class FieldModel implements FormRow {
    private static final Set<String> CLASSES = Set.of("class", "fibre");
    private static final String NO_CHANNEL = "C";

    private final StringProperty text = new SimpleStringProperty(this, "text", "");
    private final ReadOnlyStringWrapper error = new ReadOnlyStringWrapper(this, "error", "");
    private final ReadOnlyBooleanWrapper stated = new ReadOnlyBooleanWrapper(this, "stated");
    private final ReadOnlyBooleanWrapper changed = new ReadOnlyBooleanWrapper(this, "changed");
    private final ReadOnlyStringWrapper byDefault = new ReadOnlyStringWrapper(this, "byDefault", "");
    private final ReadOnlyStringWrapper prompt = new ReadOnlyStringWrapper(this, "prompt", "");
    private final ReadOnlyObjectWrapper<Origin> origin = new ReadOnlyObjectWrapper<>(this, "origin");
    private final ReadOnlyStringWrapper provenance = new ReadOnlyStringWrapper(this, "provenance", "");
    private final ReadOnlyDoubleWrapper value = new ReadOnlyDoubleWrapper(this, "value", Double.NaN);
    private final ReadOnlyObjectWrapper<SliderScale> slider = new ReadOnlyObjectWrapper<>(this, "slider");
    private final FormEdits edits;
    private final FieldPlace place;
    private final ReadOnlyStringWrapper idle = new ReadOnlyStringWrapper(this, "withoutEffect", "");
    private boolean showing;
    private boolean typing;
    private boolean sliding;
    private boolean editing;
    private Object seen;
    private Object before;

    FieldModel(FormEdits edits, FieldPlace place) {
        this.edits = edits;
        this.place = place;
        refresh();
        text.addListener((source, old, typed) -> {
            if (!showing) {
                typed(typed.strip());
            }
        });
    }

    /** Whether it names a class of the catalogue. */
    public boolean isClass() {
        return CLASSES.contains(place.field().name());
    }

    /** Its scenario path, elements of lists by their index. */
    public String path() {
        return place.path();
    }

    /** Its scenario path as people write it, elements by their labels. */
    public String writtenPath() {
        return ElementPath.labelled(edits.scenario(), place.path());
    }

    /** The registry's entry. */
    public Field field() {
        return place.field();
    }

    /** What it is, in words and without its place: "dead time". */
    public String label() {
        return ParameterWords.name(place.field().name());
    }

    /** Its unit, empty for a bare number or a word. */
    public String unit() {
        return place.field().unit();
    }

    /** What is allowed, in words. */
    public String allowed() {
        return place.field().allowed();
    }

    /** What it means, one phrase. */
    public String meaning() {
        return place.field().meaning();
    }

    /** The words of a choice, none for other fields. */
    public List<String> choices() {
        return place.field().choices().stream().map(Choice::text).toList();
    }

    /** Whether it may be left empty. */
    public boolean optional() {
        return place.field().presence() != Field.Presence.REQUIRED;
    }

    /** Why it has no meaning at present, empty for a field that counts. */
    public String withoutEffect() {
        return idle.get();
    }

    /** The same, as it changes. */
    public ReadOnlyStringProperty withoutEffectProperty() {
        return idle.getReadOnlyProperty();
    }

    /** Whether it keeps its place among the others while it has no meaning, as that may end with what is typed next. */
    public boolean idleInPlace() {
        return WithoutEffect.inPlace(place);
    }

    /** What else is to be known of it as the link is now, empty for most. */
    public String remark() {
        boolean fixed = place.field().name().equals("lengthKm") && WithoutEffect.measured(edits.scenario(), place);
        return fixed ? Words.of("form.remark.length") : "";
    }

    /** What is typed, or what the file states; empty where the default stands. */
    public StringProperty textProperty() {
        return text;
    }

    /** Why what is typed is not allowed, in the command line's words; empty if it is. */
    public ReadOnlyStringProperty errorProperty() {
        return error.getReadOnlyProperty();
    }

    /** Whether the file states it, so that no default stands. */
    public ReadOnlyBooleanProperty statedProperty() {
        return stated.getReadOnlyProperty();
    }

    /** Whether its value differs from the saved one. */
    public ReadOnlyBooleanProperty changedProperty() {
        return changed.getReadOnlyProperty();
    }

    /** What stands if it is left empty, in words with number and unit. */
    public ReadOnlyStringProperty defaultProperty() {
        return byDefault.getReadOnlyProperty();
    }

    /** The same, short enough to stand in the empty field. */
    public ReadOnlyStringProperty promptProperty() {
        return prompt.getReadOnlyProperty();
    }

    /** Where its value comes from, as the file says; empty if it does not. */
    public ReadOnlyStringProperty provenanceProperty() {
        return provenance.getReadOnlyProperty();
    }

    /** The path under which the file says so, which may stand for both arms or ports. */
    public String provenancePath() {
        return origin.get().key();
    }

    /** Its number, stated or by default; NaN where there is none. */
    public ReadOnlyDoubleProperty valueProperty() {
        return value.getReadOnlyProperty();
    }

    /** The stretch of its slider, null where there is no number to begin from. */
    public ReadOnlyObjectProperty<SliderScale> sliderProperty() {
        return slider.getReadOnlyProperty();
    }

    /** Moves the slider to a position, 0 to 1; all until {@link #settle} is one change. */
    public void slide(double position) {
        SliderScale scale = slider.get();
        if (scale != null && withoutEffect().isEmpty()) {
            begin();
            sliding = true;
            double moved = scale.value(position);
            error.set(put(written(moved)));
            show(spelled(moved));
        }
    }

    private Object written(double number) {
        return place.field().kind() == Field.Kind.CHANNEL ? (Object) (NO_CHANNEL + Range.plain(number)) : number;
    }

    private void typed(String typed) {
        begin();
        FieldEntry entry = FieldEntry.read(place.field(), place.path(), typed);
        String refusal = refusal(entry);
        if (!refusal.isEmpty()) {
            // What was typed on the way, such as the 1 of 1.2, does not stay in the link.
            restore();
        }
        error.set(refusal);
    }

    private String refusal(FieldEntry entry) {
        if (entry instanceof FieldEntry.Refused refused) {
            return refused.problem().message();
        }
        return ((FieldEntry.Accepted) entry).change() instanceof Change.Put put ? put(put.value()) : remove();
    }

    /** Gives the link the value that it had before the typing. */
    private void restore() {
        Object now = edits.statedIn(place);
        if (before == null && now != null) {
            remove();
        } else if (before != null && !before.equals(now)) {
            put(before instanceof Double number ? written(number) : before);
        }
    }

    private String put(Object value) {
        editing = true;
        String refusal = edits.put(place, value);
        editing = false;
        return refusal;
    }

    private String remove() {
        editing = true;
        String refusal = edits.remove(place);
        editing = false;
        return refusal;
    }

    private void begin() {
        if (!typing) {
            typing = true;
            before = edits.statedIn(place);
        }
    }

    /** Ends the typing or sliding: what follows is a change of its own. What is not allowed stays with its error. */
    public void settle() {
        if (typing) {
            typing = false;
            sliding = false;
            edits.settle();
            refresh();
        }
    }

    /** Takes back what was typed since the last {@link #settle}. */
    public void takeBack() {
        if (typing) {
            restore();
        }
        error.set("");
        settle();
        show(spelled(edits.statedIn(place)));
    }

    /** Gives up what was typed, allowed or not, and shows what stands. */
    void forget() {
        typing = false;
        sliding = false;
        error.set("");
        show(spelled(edits.statedIn(place)));
    }

    /** Ends the typing and gives up what is not allowed; whether there was any. */
    boolean giveUp() {
        boolean refused = !error.get().isEmpty();
        if (refused) {
            takeBack();
        }
        settle();
        return refused;
    }

    /** Says where the value comes from; an empty text takes the saying back. */
    public void source(String said) {
        String path = "provenance." + origin.get().key();
        Change change = said.isBlank() ? new Change.Remove(path) : new Change.Put(path, said.strip());
        edits.apply(Words.of("form.source", label()), List.of(change));
    }

    @Override
    public Stream<FieldModel> fields() {
        return Stream.of(this);
    }

    @Override
    public void refresh() {
        Values object = edits.stated(place);
        Object now = object.get(place.field().name());
        stated.set(now != null);
        idle.set(WithoutEffect.reason(edits.scenario(), place)
                .or(() -> WithoutEffect.replaced(edits.scenario(), place))
                .orElse(""));
        if (!editing && !Objects.equals(now, seen)) {
            forget();
        }
        seen = now;
        DefaultWords words = new DefaultWords(
                edits.scenario(),
                place,
                Optional.ofNullable(place.field().byDefault().given(object.asMap())));
        byDefault.set(words.words());
        prompt.set(words.value());
        origin.set(Origin.of(edits.scenario(), place.path()));
        provenance.set(origin.get().text());
        changed.set(differs());
        measure(words);
        if (!typing && error.get().isEmpty()) {
            show(spelled(now));
        }
    }

    private void measure(DefaultWords words) {
        Object planned = PlannedValue.at(edits.scenario(), place.path()).orElse(null);
        value.set(planned instanceof Double number ? number : words.number().orElse(Double.NaN));
        SliderScale scale = slider.get();
        if (!sliding && place.field().kind().numeric()) {
            SliderScale fresh = SliderScale.around(place.field(), value.get()).orElse(null);
            slider.set(scale != null && fresh != null && scale.serves(value.get(), fresh) ? scale : fresh);
        }
    }

    private boolean differs() {
        Optional<Object> now = PlannedValue.at(edits.scenario(), place.path());
        return !ElementPath.in(edits.saved(), edits.scenario(), place.path())
                .flatMap(path -> PlannedValue.at(edits.saved(), path))
                .equals(now);
    }

    private void show(String shown) {
        showing = true;
        text.set(shown);
        showing = false;
    }

    private String spelled(Object stands) {
        if (stands instanceof Double number) {
            return (place.field().kind() == Field.Kind.CHANNEL ? NO_CHANNEL : "") + Range.plain(number);
        }
        return stands instanceof Choice choice ? choice.text() : stands == null ? "" : stands.toString();
    }
}

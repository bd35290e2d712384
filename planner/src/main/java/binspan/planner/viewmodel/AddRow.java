package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.scenario.Choice;
import binspan.scenario.Field;
import binspan.scenario.Section;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** Adds an object to a list: classical light to a fibre, a second detector to a side. */
public final class AddRow implements FormRow {
    private static final double LAUNCH_DBM = 0.0;
    private static final double WAVELENGTH_NM = 1310.0;
    private static final double RAMAN_PER_KM_NM = 1e-10;

    private final ReadOnlyStringWrapper error = new ReadOnlyStringWrapper(this, "error", "");
    private final FormEdits edits;
    private final String key;
    private final Change.Insert change;

    private AddRow(FormEdits edits, String key, Change.Insert change) {
        this.edits = edits;
        this.key = key;
        this.change = change;
    }

    /** Adds a channel of ordinary values (common practice), to be edited. */
    static AddRow channel(FormEdits edits, String list, int size) {
        Map<String, Object> channel = new LinkedHashMap<>();
        channel.put("launchDbm", LAUNCH_DBM);
        channel.put("wavelengthNm", WAVELENGTH_NM);
        channel.put("ramanCoefficientPerKmNm", RAMAN_PER_KM_NM);
        return new AddRow(edits, "form.add.channel", new Change.Insert(list, size, channel));
    }

    /** Adds a detector at the second port, like the one at the first. */
    static AddRow port(FormEdits edits, String list, Section section) {
        return new AddRow(edits, "form.add.port", new Change.Insert(list, 1, stated(edits, list + "[0]", section)));
    }

    private static Map<String, Object> stated(FormEdits edits, String object, Section section) {
        Map<String, Object> copy = new LinkedHashMap<>();
        edits.stated(object, section).asMap().forEach((name, value) -> {
            Field field = section.field(name).orElseThrow();
            if (field.kind() == Field.Kind.SECTION) {
                Section inside = field.content().section("").orElseThrow();
                copy.put(name, stated(edits, object + "." + name, inside));
            } else {
                copy.put(name, value instanceof Choice choice ? choice.text() : value);
            }
        });
        return copy;
    }

    /** What it adds, in words. */
    public String text() {
        return Words.of(key);
    }

    /** Adds it. */
    public void add() {
        error.set(edits.apply(Words.of(key + ".done"), List.of(change)));
    }

    /** Why it could not be added, in the command line's words; empty if all is well. */
    public ReadOnlyStringProperty errorProperty() {
        return error.getReadOnlyProperty();
    }

    @Override
    public void refresh() {
        error.set("");
    }
}

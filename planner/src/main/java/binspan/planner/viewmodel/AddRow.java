package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** Adds classical light to a fibre. */
public final class AddRow implements FormRow {
    private static final double LAUNCH_DBM = 0.0;
    private static final double WAVELENGTH_NM = 1310.0;
    private static final double RAMAN_PER_KM_NM = 1e-10;

    private final ReadOnlyStringWrapper error = new ReadOnlyStringWrapper(this, "error", "");
    private final FormEdits edits;
    private final String list;
    private final int size;

    AddRow(FormEdits edits, String list, int size) {
        this.edits = edits;
        this.list = list;
        this.size = size;
    }

    /** Adds a channel of ordinary values (common practice), to be edited. */
    public void add() {
        Map<String, Object> channel = new LinkedHashMap<>();
        channel.put("launchDbm", LAUNCH_DBM);
        channel.put("wavelengthNm", WAVELENGTH_NM);
        channel.put("ramanCoefficientPerKmNm", RAMAN_PER_KM_NM);
        error.set(edits.apply(Words.of("form.added"), List.of(new Change.Insert(list, size, channel))));
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

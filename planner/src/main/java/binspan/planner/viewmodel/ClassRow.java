package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.scenario.Detector;
import binspan.scenario.DetectorClass;
import binspan.scenario.OperatingPoint;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/** The values of the catalogue class that stands in the field above. */
public final class ClassRow implements FormRow {
    private final ReadOnlyObjectWrapper<Optional<ClassTable>> table =
            new ReadOnlyObjectWrapper<>(this, "table", Optional.empty());
    private final FormEdits edits;
    private final FieldPlace place;

    ClassRow(FormEdits edits, FieldPlace place) {
        this.edits = edits;
        this.place = place;
        refresh();
    }

    /** The class's values, absent where no class is named. */
    public ReadOnlyObjectProperty<Optional<ClassTable>> tableProperty() {
        return table.getReadOnlyProperty();
    }

    /** Settings between which a detector of the class can be operated, in words; none where it has no trade to offer. */
    public List<String> operatingPoints() {
        List<OperatingPoint> points =
                detectorClass().map(DetectorClass::operatingPoints).orElse(List.of());
        return points.size() < 2
                ? List.of()
                : points.stream().map(OperatingPoint::meaning).toList();
    }

    /** States the values of one of these settings, all at once. */
    public void operate(int point) {
        OperatingPoint chosen = detectorClass().orElseThrow().operatingPoints().get(point);
        List<Change> changes = new ArrayList<>();
        changes.add(put("efficiency", chosen.values().efficiency()));
        changes.add(chosen.gate()
                .map(gate -> put("gate", written(gate.widthNs(), gate.darkProbability())))
                .orElseGet(() -> put("darkCountsPerSecond", chosen.values().darkCountsPerSecond())));
        changes.add(put("deadTimeNs", chosen.values().deadTimeNs()));
        changes.add(put("afterpulseProbability", chosen.values().afterpulseProbability()));
        edits.apply(Words.of("form.operated", chosen.meaning()), changes);
    }

    private Change put(String field, Object value) {
        return new Change.Put(place.beside(field), value);
    }

    private static Map<String, Object> written(double widthNs, double darkProbability) {
        Map<String, Object> gate = new LinkedHashMap<>();
        gate.put("widthNs", widthNs);
        gate.put("darkProbability", darkProbability);
        return gate;
    }

    private Optional<DetectorClass> detectorClass() {
        return PlannedValue.at(edits.scenario(), place.parent())
                .filter(Detector.class::isInstance)
                .flatMap(detector -> ((Detector) detector).detectorClass());
    }

    @Override
    public void refresh() {
        table.set(ClassTable.of(edits.scenario(), place.parent(), edits.stated(place)));
    }
}

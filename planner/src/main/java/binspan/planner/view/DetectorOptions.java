package binspan.planner.view;

import binspan.planner.viewmodel.DetectorsModel;
import binspan.planner.viewmodel.Words;
import binspan.scenario.Choice;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import java.util.List;
import java.util.function.Function;
import javafx.collections.ObservableSet;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.VBox;

/** What the comparison exchanges. */
final class DetectorOptions extends VBox {
    DetectorOptions(DetectorsModel model, Look look) {
        OptionRow row = new OptionRow(model.name(), look);
        row.choice(
                "kind",
                model.fibresProperty().asObject(),
                List.of(false, true),
                fibres -> Words.of(fibres ? "studies.compare.fibres" : "studies.compare.detectors"));
        row.check("present", model.presentProperty());
        CheckBox mixed = row.check("mixed", model.mixedProperty());
        mixed.disableProperty().bind(model.fibresProperty());
        row.check("retuned", model.retunedProperty());
        StudyPages.aim(row, model.aimProperty());
        OptionRow detectors = ticks(
                model.name(), look, List.of(DetectorClass.values()), model.detectorClasses(), DetectorClass::meaning);
        OptionRow fibres =
                ticks(model.name(), look, List.of(FibreClass.values()), model.fibreClasses(), FibreClass::meaning);
        fibres.visibleProperty().bind(model.fibresProperty());
        fibres.managedProperty().bind(fibres.visibleProperty());
        detectors.visibleProperty().bind(model.fibresProperty().not());
        detectors.managedProperty().bind(detectors.visibleProperty());
        getChildren().addAll(row, detectors, fibres);
    }

    private static <E extends Enum<E> & Choice> OptionRow ticks(
            String study, Look look, List<E> classes, ObservableSet<E> chosen, Function<E, String> meaning) {
        OptionRow row = new OptionRow(study, look);
        for (E each : classes) {
            CheckBox box = new CheckBox(each.text());
            box.setId(study + "-" + each.text());
            box.setTooltip(new Tooltip(meaning.apply(each)));
            box.setAccessibleText(each.text() + ", " + meaning.apply(each));
            box.setSelected(chosen.contains(each));
            box.selectedProperty().addListener((source, before, after) -> {
                if (after) {
                    chosen.add(each);
                } else {
                    chosen.remove(each);
                }
            });
            row.with(box);
        }
        return row;
    }
}

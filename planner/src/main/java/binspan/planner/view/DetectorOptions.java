package binspan.planner.view;

import binspan.planner.viewmodel.DetectorsModel;
import binspan.planner.viewmodel.DetectorsModel.Kind;
import binspan.planner.viewmodel.Words;
import binspan.scenario.Choice;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import java.util.List;
import java.util.function.Function;
import javafx.collections.ObservableSet;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.VBox;

/** What the comparison exchanges. */
final class DetectorOptions extends VBox {
    private final DetectorsModel model;
    private final Look look;

    DetectorOptions(DetectorsModel model, Look look) {
        this.model = model;
        this.look = look;
        OptionRow row = new OptionRow(model.name(), look);
        row.choice("kind", model.kindProperty(), List.of(Kind.values()), DetectorOptions::words);
        row.check("present", model.presentProperty());
        CheckBox mixed = row.check("mixed", model.mixedProperty());
        mixed.visibleProperty().bind(model.kindProperty().isEqualTo(Kind.DETECTORS));
        mixed.managedProperty().bind(mixed.visibleProperty());
        row.check("retuned", model.retunedProperty());
        StudyPages.aim(row, model.aimProperty());
        getChildren().add(row);
        classes(Kind.DETECTORS, List.of(DetectorClass.values()), model.detectorClasses(), DetectorClass::meaning);
        classes(Kind.FIBRES, List.of(FibreClass.values()), model.fibreClasses(), FibreClass::meaning);
        elements();
    }

    private static String words(Kind kind) {
        return switch (kind) {
            case DETECTORS -> Words.of("studies.compare.kind.detectors");
            case FIBRES -> Words.of("studies.compare.kind.fibres");
            case WITHOUT -> Words.of("studies.compare.kind.without");
        };
    }

    private <E extends Enum<E> & Choice> void classes(
            Kind kind, List<E> classes, ObservableSet<E> chosen, Function<E, String> meaning) {
        OptionRow row = row(kind);
        for (E each : classes) {
            CheckBox box = tick(each, each.text(), chosen);
            box.setId(model.name() + "-" + each.text());
            box.setTooltip(new Tooltip(meaning.apply(each)));
            box.setAccessibleText(each.text() + ", " + meaning.apply(each));
            row.with(box);
        }
    }

    private void elements() {
        OptionRow row = row(Kind.WITHOUT);
        list(row);
        model.design().scenarioProperty().addListener((source, before, after) -> {
            if (!DetectorsModel.labels(before).equals(DetectorsModel.labels(after))) {
                list(row);
            }
        });
    }

    private void list(OptionRow row) {
        row.getChildren().clear();
        List<String> labels = DetectorsModel.labels(model.design().scenario());
        model.leftOut().retainAll(labels);
        for (int i = 0; i < labels.size(); i++) {
            CheckBox box = tick(labels.get(i), labels.get(i), model.leftOut());
            box.setId(model.name() + "-without-" + i);
            row.with(box);
        }
        if (labels.isEmpty()) {
            row.with(new Label(Words.of("studies.compare.without.none")));
        }
    }

    private OptionRow row(Kind kind) {
        OptionRow row = new OptionRow(model.name(), look);
        row.visibleProperty().bind(model.kindProperty().isEqualTo(kind));
        row.managedProperty().bind(row.visibleProperty());
        getChildren().add(row);
        return row;
    }

    private static <E> CheckBox tick(E each, String words, ObservableSet<E> chosen) {
        CheckBox box = new CheckBox(words);
        box.setMnemonicParsing(false);
        box.setSelected(chosen.contains(each));
        box.selectedProperty().addListener((source, before, after) -> {
            if (after) {
                chosen.add(each);
            } else {
                chosen.remove(each);
            }
        });
        return box;
    }
}

package binspan.planner.view;

import binspan.planner.viewmodel.DetectorsModel;
import binspan.planner.viewmodel.Words;
import binspan.study.comparison.Comparison;
import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.util.StringConverter;

/** One of the compared links, to be taken over. */
final class ChosenEntry extends HBox {
    private final ComboBox<Comparison.Entry> box = new ComboBox<>();

    ChosenEntry(DetectorsModel model) {
        getStyleClass().add("study-apply");
        setAlignment(Pos.CENTER_LEFT);
        Label label = new Label(Words.of("studies.compare.apply"));
        label.setLabelFor(box);
        box.setId("compare-entry");
        box.setConverter(new StringConverter<>() {
            @Override
            public String toString(Comparison.Entry entry) {
                return entry == null ? "" : words(entry);
            }

            @Override
            public Comparison.Entry fromString(String text) {
                return box.getValue();
            }
        });
        Button apply = new Button(Words.of("studies.apply"));
        apply.setId("compare-apply");
        apply.disableProperty()
                .bind(model.run().staleProperty().or(box.valueProperty().isNull()));
        apply.setOnAction(event -> model.apply(box.getValue()));
        label.setMinWidth(USE_PREF_SIZE);
        apply.setMinWidth(USE_PREF_SIZE);
        getChildren().addAll(label, box, apply);
        model.run().resultProperty().addListener((source, before, after) -> fill(after.found()));
    }

    private void fill(List<Comparison.Entry> entries) {
        box.getItems().setAll(entries);
        box.setValue(entries.get(0));
    }

    private String words(Comparison.Entry entry) {
        String sign = Words.of(entry.meets() ? "studies.compare.met" : "studies.compare.missed");
        String rank = Integer.toString(box.getItems().indexOf(entry) + 1);
        return Words.of("studies.compare.entry", rank, entry.option().name(), sign);
    }
}

package binspan.planner.view;

import binspan.planner.viewmodel.AlternativesModel;
import binspan.planner.viewmodel.AlternativesModel.Form;
import binspan.planner.viewmodel.FieldModel;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.function.BiConsumer;
import javafx.geometry.Pos;
import javafx.scene.control.ComboBox;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** Forms of stating one thing: a choice of the form, beside or below it the fields of the form. */
final class AlternativesBox extends VBox {
    private static final int LONG_NAME = 11;

    private final AlternativesModel model;
    private final BiConsumer<FieldModel, Boolean> explain;
    private final ComboBox<String> chooser = new ComboBox<>();

    AlternativesBox(AlternativesModel model, BiConsumer<FieldModel, Boolean> explain) {
        this.model = model;
        this.explain = explain;
        getStyleClass().add("form-alternatives");
        chooser.setId(FieldRow.id("form-form", model.forms().get(0).place().path()));
        chooser.getItems().setAll(model.forms().stream().map(Form::label).toList());
        chooser.getStyleClass().add("form-chooser");
        chooser.setMaxWidth(Double.MAX_VALUE);
        chooser.accessibleTextProperty().bind(chooser.valueProperty().map(form -> Words.of("form.alternatives", form)));
        model.shownProperty().addListener((source, before, now) -> show());
        chooser.valueProperty().addListener((source, before, now) -> choose());
        show();
    }

    private void choose() {
        int chosen = chooser.getSelectionModel().getSelectedIndex();
        if (chosen >= 0 && chosen != model.shownProperty().get()) {
            model.choose(chosen);
            chooser.getSelectionModel().select(model.shownProperty().get());
        }
    }

    private void show() {
        Form form = model.forms().get(model.shownProperty().get());
        boolean focused = chooser.isFocused();
        getChildren().clear();
        if (form.models().size() > 1) {
            getChildren().add(headed(List.of(), "form-labels"));
            form.models().forEach(each -> getChildren().add(new FieldRow(each, null, explain)));
        } else if (longNames()) {
            HBox below = new HBox(FieldRow.mark(form.models()));
            below.getStyleClass().add("form-labels");
            getChildren()
                    .addAll(
                            headed(List.of(), "form-labels-wide"),
                            new FieldRow(form.models().get(0), below, explain));
        } else {
            HBox beside = headed(form.models(), "form-labels");
            getChildren().add(new FieldRow(form.models().get(0), beside, explain));
        }
        getChildren().add(new ErrorLine(model.errorProperty()));
        chooser.getSelectionModel().select(model.shownProperty().get());
        if (focused) {
            chooser.requestFocus();
        }
    }

    private boolean longNames() {
        return model.forms().stream().anyMatch(form -> form.label().length() > LONG_NAME);
    }

    private HBox headed(List<FieldModel> changing, String style) {
        HBox both = new HBox(FieldRow.mark(changing), chooser);
        both.getStyleClass().add(style);
        both.setAlignment(Pos.CENTER_LEFT);
        HBox.setHgrow(chooser, Priority.ALWAYS);
        return both;
    }
}

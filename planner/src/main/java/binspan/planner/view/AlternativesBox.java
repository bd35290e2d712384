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
        chooser.accessibleTextProperty()
                .bind(chooser.valueProperty().map(form -> Words.of("form.alternatives", form)));
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
        if (form.models().size() == 1) {
            FieldModel only = form.models().get(0);
            getChildren().add(new FieldRow(only, headed(only), explain));
        } else {
            getChildren().add(new HBox(headed(null)));
            form.models().forEach(each -> getChildren().add(new FieldRow(each, null, explain)));
        }
        getChildren().add(new ErrorLine(model.errorProperty()));
        chooser.getSelectionModel().select(model.shownProperty().get());
        if (focused) {
            chooser.requestFocus();
        }
    }

    private HBox headed(FieldModel changing) {
        List<FieldModel> fields = changing == null ? List.of() : List.of(changing);
        HBox both = new HBox(FieldRow.mark(fields), chooser);
        both.getStyleClass().add("form-labels");
        both.setAlignment(Pos.CENTER_LEFT);
        HBox.setHgrow(chooser, Priority.ALWAYS);
        return both;
    }
}

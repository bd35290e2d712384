package binspan.planner.view;

import binspan.planner.viewmodel.FieldModel;
import binspan.planner.viewmodel.Words;
import javafx.beans.binding.Bindings;
import javafx.scene.control.ComboBox;
import javafx.util.StringConverter;

/** A choice between the words of a field; the empty one leaves it to the default. */
final class ChoiceEntry extends ComboBox<String> {
    private final FieldModel model;

    ChoiceEntry(FieldModel model) {
        this.model = model;
        getStyleClass().add("form-choice");
        if (model.optional()) {
            getItems().add("");
        }
        getItems().addAll(model.choices());
        setConverter(new Shown());
        setMaxWidth(Double.MAX_VALUE);
        model.textProperty().addListener((source, before, now) -> setValue(now));
        model.defaultProperty().addListener((source, before, now) -> renew());
        setValue(model.textProperty().get());
        valueProperty().addListener((source, before, chosen) -> chosen(chosen));
        Marks.error(this, model.errorProperty());
        accessibleTextProperty()
                .bind(Bindings.createStringBinding(
                        () -> model.label() + ", " + getConverter().toString(getValue())
                                + (model.errorProperty().get().isEmpty()
                                        ? ""
                                        : ", " + model.errorProperty().get()),
                        valueProperty(),
                        model.errorProperty()));
    }

    /** Shows a new default in the list and on the button. */
    private void renew() {
        setConverter(new Shown());
    }

    private void chosen(String word) {
        if (word != null && !word.equals(model.textProperty().get())) {
            model.textProperty().set(word);
            model.settle();
        }
    }

    private final class Shown extends StringConverter<String> {
        @Override
        public String toString(String word) {
            if (word == null) {
                return "";
            }
            return word.isEmpty()
                    ? Words.of("form.default", model.defaultProperty().get())
                    : word;
        }

        @Override
        public String fromString(String shown) {
            return shown;
        }
    }
}

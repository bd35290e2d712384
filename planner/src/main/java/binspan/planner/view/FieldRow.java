package binspan.planner.view;

import binspan.planner.viewmodel.FieldModel;
import binspan.planner.viewmodel.SliderScale;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Locale;
import java.util.function.BiConsumer;
import javafx.beans.binding.Bindings;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** One field: label, slider, entry and unit on a line, below it what is wrong. */
final class FieldRow extends VBox {
    private static final double SLIDER_STEP = 0.01;
    private static final double SLIDER_PAGE = 0.1;

    private final FieldModel model;
    private final Control entry;

    /**
     * Shows a field.
     *
     * @param model the field
     * @param heading stands in place of the label, such as the choice of a form; null for the label
     * @param explain takes the field when it is focused (true) or pointed at (false), null when it no longer is
     */
    FieldRow(FieldModel model, Node heading, BiConsumer<FieldModel, Boolean> explain) {
        this.model = model;
        this.entry = model.choices().isEmpty() ? text() : new ChoiceEntry(model);
        entry.setId(id("form", model.path()));
        entry.setDisable(!model.withoutEffect().isEmpty());
        getStyleClass().add("form-field");
        HBox line = new HBox(label(heading));
        line.getStyleClass().add("form-line");
        line.setAlignment(Pos.CENTER_LEFT);
        if (model.choices().isEmpty() && model.field().kind().numeric()) {
            line.getChildren().addAll(slider(), entry, unit());
        } else {
            line.getChildren().add(entry);
            entry.getStyleClass().add("form-wide");
        }
        entry.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(entry, Priority.ALWAYS);
        if (!model.withoutEffect().isEmpty() && model.optional()) {
            line.getChildren()
                    .add(Buttons.remove(
                            id("form-drop", model.path()),
                            () -> model.textProperty().set("")));
        }
        getChildren().addAll(line, new ErrorLine(model.errorProperty()));
        idle();
        explained(explain);
    }

    /** An id for a control of a path. */
    static String id(String prefix, String path) {
        String words = path.replaceAll("([a-z])([A-Z])", "$1-$2").replaceAll("[^A-Za-z0-9]+", "-");
        return (prefix + "-" + words).toLowerCase(Locale.ROOT).replaceAll("-+$", "");
    }

    /** What the keyboard reaches first. */
    Control entry() {
        return entry;
    }

    private Node label(Node heading) {
        if (heading != null) {
            return heading;
        }
        Label label = new Label(model.label());
        label.setLabelFor(entry);
        label.getStyleClass().add("form-label");
        label.setWrapText(true);
        HBox both = new HBox(mark(List.of(model)), label);
        both.getStyleClass().add("form-labels");
        both.setAlignment(Pos.CENTER_LEFT);
        return both;
    }

    /** The sign of a change against the saved link; room for it where there is none. */
    static Label mark(List<FieldModel> models) {
        Label mark = new Label("\u25cf");
        mark.getStyleClass().add("form-changed");
        mark.setTooltip(new Tooltip(Words.of("form.changed")));
        mark.setVisible(false);
        models.forEach(each -> mark.visibleProperty().bind(each.changedProperty()));
        return mark;
    }

    private TextField text() {
        TextField field = new TextField();
        field.textProperty().bindBidirectional(model.textProperty());
        field.promptTextProperty().bind(model.promptProperty());
        field.getStyleClass().add("form-entry");
        field.setOnAction(event -> model.settle());
        field.focusedProperty().addListener((source, before, focused) -> left(field, focused));
        field.addEventFilter(KeyEvent.KEY_PRESSED, event -> {
            if (event.getCode() == KeyCode.ESCAPE) {
                model.takeBack();
                field.selectAll();
                event.consume();
            }
        });
        Marks.error(field, model.errorProperty());
        field.accessibleTextProperty()
                .bind(Bindings.createStringBinding(
                        this::spoken, model.errorProperty(), model.promptProperty(), model.statedProperty()));
        return field;
    }

    private void left(TextField field, boolean focused) {
        if (focused) {
            field.selectAll();
        } else {
            model.settle();
        }
    }

    private String spoken() {
        String unit = model.unit().isEmpty() ? "" : ", " + model.unit();
        String error = model.errorProperty().get();
        String stands = model.statedProperty().get()
                ? ""
                : ", " + Words.of("form.default", model.defaultProperty().get());
        return model.label() + unit + stands + (error.isEmpty() ? "" : ", " + error);
    }

    private Label unit() {
        Label unit = new Label(model.unit());
        unit.getStyleClass().addAll("form-unit", "soft");
        unit.setTooltip(unit.getText().isEmpty() ? null : new Tooltip(unit.getText()));
        return unit;
    }

    private Node slider() {
        Slider slider = new Slider(0.0, 1.0, 0.0);
        slider.setId(id("form-slide", model.path()));
        slider.getStyleClass().add("form-slider");
        slider.setBlockIncrement(SLIDER_STEP);
        slider.setAccessibleText(Words.of("form.slider", model.label()));
        boolean[] following = {false};
        Runnable follow = () -> {
            SliderScale scale = model.sliderProperty().get();
            slider.setDisable(scale == null || !model.withoutEffect().isEmpty());
            slider.setVisible(scale != null);
            if (scale != null && !slider.isValueChanging()) {
                following[0] = true;
                slider.setValue(scale.position(model.valueProperty().get()));
                following[0] = false;
            }
        };
        model.valueProperty().addListener((source, before, now) -> follow.run());
        model.sliderProperty().addListener((source, before, now) -> follow.run());
        slider.valueProperty().addListener((source, before, now) -> {
            if (!following[0]) {
                model.slide(now.doubleValue());
            }
        });
        slider.valueChangingProperty().addListener((source, before, changing) -> {
            if (!changing) {
                model.settle();
                follow.run();
            }
        });
        slider.focusedProperty().addListener((source, before, focused) -> model.settle());
        slider.addEventFilter(KeyEvent.KEY_PRESSED, event -> keys(slider, event));
        follow.run();
        slider.managedProperty().bind(slider.visibleProperty());
        return slider;
    }

    /** Page keys move by a tenth, Escape takes the movement back. */
    private void keys(Slider slider, KeyEvent event) {
        if (event.getCode() == KeyCode.ESCAPE) {
            model.takeBack();
        } else if (event.getCode() == KeyCode.PAGE_UP) {
            slider.setValue(slider.getValue() + SLIDER_PAGE);
        } else if (event.getCode() == KeyCode.PAGE_DOWN) {
            slider.setValue(slider.getValue() - SLIDER_PAGE);
        } else {
            return;
        }
        event.consume();
    }

    private void idle() {
        if (!model.withoutEffect().isEmpty()) {
            Label reason = new Label(model.withoutEffect());
            reason.getStyleClass().addAll("form-note", "soft");
            reason.setWrapText(true);
            getChildren().add(reason);
        }
    }

    private void explained(BiConsumer<FieldModel, Boolean> explain) {
        setOnMouseEntered(event -> explain.accept(model, false));
        setOnMouseExited(event -> explain.accept(null, false));
        focusWithinProperty().addListener((source, before, within) -> {
            if (within) {
                explain.accept(model, true);
            }
        });
    }
}

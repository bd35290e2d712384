package binspan.planner.view;

import binspan.planner.viewmodel.FieldModel;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Locale;
import java.util.function.BiConsumer;
import javafx.beans.binding.Bindings;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** One field: label, slider, entry and unit on a line, below it what is wrong. */
final class FieldRow extends VBox {
    private static final int MOST_DIGITS = 13;
    private static final double NARROWEST = 4.6;
    private static final double AROUND = 1.0;
    private static final double PER_DIGIT = 0.64;

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
        entry.disableProperty().bind(model.withoutEffectProperty().isNotEmpty());
        getStyleClass().add("form-field");
        HBox line = new HBox(label(heading));
        line.getStyleClass().add("form-line");
        line.setAlignment(Pos.CENTER_LEFT);
        if (model.choices().isEmpty() && model.field().kind().numeric()) {
            Label unit = unit();
            line.getChildren().addAll(new FieldSlider(model), entry, unit);
            if (model.idleInPlace()) {
                Label reason = stoppedBy();
                unit.visibleProperty().bind(reason.visibleProperty().not());
                unit.managedProperty().bind(unit.visibleProperty());
                line.getChildren().add(reason);
            }
        } else {
            line.getChildren().add(entry);
            entry.getStyleClass().add("form-wide");
        }
        entry.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(entry, Priority.ALWAYS);
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
        if (model.field().kind().numeric()) {
            field.textProperty().addListener((source, before, now) -> fit(field));
            fit(field);
        }
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

    /** As wide as its number, within bounds; lengths in em. */
    private static void fit(TextField field) {
        int digits = Math.min(MOST_DIGITS, field.getText().length());
        double width = Math.max(NARROWEST, AROUND + PER_DIGIT * digits);
        field.setStyle(String.format(Locale.ROOT, "-fx-pref-width: %1$.2fem; -fx-min-width: %1$.2fem", width));
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

    /** The reason in place of slider and unit, for a field that keeps its place. */
    private Label stoppedBy() {
        Label reason = new Label();
        reason.textProperty().bind(model.withoutEffectProperty());
        reason.getStyleClass().addAll("form-note", "soft");
        reason.setMinWidth(USE_PREF_SIZE);
        reason.visibleProperty().bind(model.withoutEffectProperty().isNotEmpty());
        reason.managedProperty().bind(reason.visibleProperty());
        return reason;
    }

    private void idle() {
        if (model.idleInPlace() || model.withoutEffect().isEmpty()) {
            return;
        }
        Label reason = new Label(model.withoutEffect());
        reason.getStyleClass().addAll("form-note", "soft");
        reason.setWrapText(true);
        reason.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(reason, Priority.ALWAYS);
        HBox line = new HBox(reason);
        line.getStyleClass().add("form-idle");
        if (model.optional()) {
            line.getChildren().add(Buttons.remove(id("form-drop", model.path()), this::drop));
        }
        getChildren().add(line);
    }

    private void drop() {
        model.textProperty().set("");
        model.settle();
    }

    /** Cells of a list that is still closed claim the focus too. */
    private boolean ownsFocus() {
        Node owner = getScene() == null ? null : getScene().getFocusOwner();
        while (owner != null && owner != this) {
            owner = owner.getParent();
        }
        return owner == this;
    }

    private void explained(BiConsumer<FieldModel, Boolean> explain) {
        setOnMouseEntered(event -> explain.accept(model, false));
        setOnMouseExited(event -> explain.accept(null, false));
        focusWithinProperty().addListener((source, before, within) -> {
            if (within && ownsFocus()) {
                explain.accept(model, true);
            }
        });
    }
}

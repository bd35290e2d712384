package binspan.planner.view;

import binspan.planner.viewmodel.FieldModel;
import binspan.planner.viewmodel.Words;
import java.util.List;
import javafx.beans.value.ChangeListener;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** Explains the field that is focused or pointed at: what it means, what is allowed, what stands by default, where its value comes from. */
final class Explanation extends VBox {
    private final Label path = new Label();
    private final Label meaning = new Label();
    private final Label allowed = new Label();
    private final HBox line = new HBox();
    private final TextField source = new TextField();
    private final ChangeListener<Object> renew = (changed, before, now) -> show();
    private FieldModel focused;
    private FieldModel shown;

    Explanation() {
        getStyleClass().add("form-explanation");
        path.getStyleClass().add("form-path");
        path.setTextOverrun(OverrunStyle.LEADING_ELLIPSIS);
        meaning.getStyleClass().add("form-meaning");
        meaning.setWrapText(true);
        meaning.setMinHeight(USE_PREF_SIZE);
        allowed.setMinHeight(USE_PREF_SIZE);
        allowed.getStyleClass().addAll("form-allowed", "soft");
        allowed.setWrapText(true);
        source.setId("form-source");
        source.setPromptText(Words.of("form.source.prompt"));
        source.setOnAction(event -> said());
        source.focusedProperty().addListener((changed, before, now) -> said());
        Label words = new Label(Words.of("form.source.label"));
        words.setMinWidth(USE_PREF_SIZE);
        words.setLabelFor(source);
        line.getChildren().setAll(words, source);
        line.getStyleClass().add("form-source");
        HBox.setHgrow(source, Priority.ALWAYS);
        getChildren().addAll(path, meaning, allowed, line);
        show();
    }

    /** Explains a focused field, which stays until another one is. */
    void focused(FieldModel field) {
        setMinHeight(USE_PREF_SIZE);
        focused = field;
        explain(field);
    }

    /** Explains a field that is pointed at; null for none, which brings back the focused one. */
    void pointed(FieldModel field) {
        if (!source.isFocused()) {
            // It does not shrink under the pointer: the rows above would move to and fro.
            setMinHeight(Math.max(getMinHeight(), getHeight()));
            explain(field == null ? focused : field);
        }
    }

    /** Forgets fields that are no longer there. */
    void clear() {
        focused(null);
    }

    private void explain(FieldModel field) {
        if (shown != null) {
            shown.defaultProperty().removeListener(renew);
            shown.provenanceProperty().removeListener(renew);
        }
        shown = field;
        if (field != null) {
            field.defaultProperty().addListener(renew);
            field.provenanceProperty().addListener(renew);
        }
        show();
    }

    private void show() {
        boolean none = shown == null;
        path.setText(none ? "" : shown.writtenPath());
        meaning.setText(none ? Words.of("form.explain.none") : capital(shown.meaning()) + "." + remark());
        allowed.setText(none ? "" : allowed());
        for (Node each : List.of(path, allowed, line)) {
            each.setVisible(!none);
            each.setManaged(!none);
        }
        if (allowed.getText().isEmpty()) {
            allowed.setManaged(false);
        }
        source.setDisable(none);
        if (!source.isFocused()) {
            source.setText(none ? "" : shown.provenanceProperty().get());
        }
        String key = none ? "" : shown.provenancePath();
        source.setAccessibleText(none ? "" : Words.of("form.source", shown.label()));
        source.setTooltip(none ? null : new Tooltip(Words.of("form.source.help", key, source.getText())));
    }

    private String remark() {
        return shown.remark().isEmpty() ? "" : " " + shown.remark();
    }

    private String allowed() {
        String stands = shown.defaultProperty().get();
        if (!shown.choices().isEmpty()) {
            return shown.optional() ? Words.of("form.explain.default", stands) : "";
        }
        return shown.optional()
                ? Words.of("form.explain.allowed", shown.allowed(), stands)
                : Words.of("form.explain.required", shown.allowed());
    }

    private void said() {
        if (shown != null
                && !source.getText().strip().equals(shown.provenanceProperty().get())) {
            shown.source(source.getText());
        }
    }

    private static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }
}

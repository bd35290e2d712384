package binspan.planner.view;

import binspan.planner.viewmodel.AddRow;
import binspan.planner.viewmodel.AlternativesModel;
import binspan.planner.viewmodel.ClassRow;
import binspan.planner.viewmodel.FieldModel;
import binspan.planner.viewmodel.FormModel;
import binspan.planner.viewmodel.FormRow;
import binspan.planner.viewmodel.GroupRow;
import binspan.planner.viewmodel.LinkPart;
import binspan.planner.viewmodel.Words;
import javafx.application.Platform;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;

/** The form of the selected part: a choice of the part, its fields, and what the present field means. */
public final class FormPane extends VBox {
    private final FormModel model;
    private final ComboBox<LinkPart> part = new ComboBox<>();
    private final VBox fields = new VBox();
    private final ScrollPane scroll = new ScrollPane(fields);
    private final Explanation explanation = new Explanation();
    private boolean following;
    private ClassTablePane table;
    private final BooleanProperty classOpen = new SimpleBooleanProperty(this, "classOpen", false);

    /** Shows the form of a model. */
    public FormPane(FormModel model) {
        this.model = model;
        getStyleClass().addAll("panel", "form");
        fields.getStyleClass().add("form-fields");
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.getStyleClass().add("form-scroll");
        scroll.setFocusTraversable(false);
        VBox.setVgrow(scroll, Priority.ALWAYS);
        getChildren().addAll(parts(), scroll, explanation);
        addEventFilter(KeyEvent.KEY_PRESSED, this::undoing);
        model.rows().addListener((ListChangeListener<FormRow>) change -> fill());
        fill();
    }

    private ComboBox<LinkPart> parts() {
        part.setId("form-part");
        part.setMaxWidth(Double.MAX_VALUE);
        part.setAccessibleText(Words.of("form.part"));
        part.setConverter(new Names());
        part.setVisibleRowCount(20);
        model.titleProperty().addListener((source, before, now) -> part.setConverter(new Names()));
        model.partProperty().addListener((source, before, now) -> follow());
        model.parts().addListener((ListChangeListener<LinkPart>) change -> follow());
        follow();
        part.valueProperty().addListener((source, before, now) -> {
            if (now != null && !following) {
                model.select(now);
            }
        });
        return part;
    }

    /** New entries take the value of a choice away; the part that is shown stays in it. */
    private void follow() {
        following = true;
        if (!part.getItems().equals(model.parts())) {
            part.getItems().setAll(model.parts());
        }
        part.setValue(model.partProperty().get());
        following = false;
    }

    /** Undo is that of the link in an entry, too: the entry's own would count as typing. */
    private void undoing(KeyEvent event) {
        if (event.isShortcutDown() && !event.isAltDown() && event.getCode() == KeyCode.Z) {
            if (event.isShiftDown()) {
                model.redo();
            } else {
                model.undo();
            }
            event.consume();
        }
    }

    private void fill() {
        String focused = focusedId();
        explanation.clear();
        fields.getChildren().setAll(model.rows().stream().map(this::node).toList());
        scroll.setVvalue(0.0);
        if (!focused.isEmpty()) {
            Platform.runLater(
                    () -> fields.lookupAll("#" + focused).stream().findFirst().ifPresent(this::reveal));
        }
    }

    private String focusedId() {
        Node owner = getScene() == null ? null : getScene().getFocusOwner();
        boolean inside = owner != null && owner.getId() != null && fields.lookup("#" + owner.getId()) == owner;
        return inside ? owner.getId() : "";
    }

    private void reveal(Node control) {
        control.requestFocus();
    }

    private Node node(FormRow row) {
        if (row instanceof FieldModel field) {
            return new FieldRow(field, null, this::explain);
        }
        if (row instanceof AlternativesModel alternatives) {
            return new AlternativesBox(alternatives, this::explain);
        }
        if (row instanceof ClassRow known) {
            classOpen.unbind();
            table = new ClassTablePane(known, classOpen);
            return table;
        }
        return row instanceof GroupRow group ? heading(group) : adding((AddRow) row);
    }

    private static Node heading(GroupRow group) {
        Label title = new Label(group.title());
        title.getStyleClass().add("heading");
        HBox line = new HBox(title);
        line.getStyleClass().add("form-heading");
        line.setAlignment(Pos.CENTER_LEFT);
        if (group.removable()) {
            Region space = new Region();
            HBox.setHgrow(space, Priority.ALWAYS);
            line.getChildren().addAll(space, Buttons.remove(FieldRow.id("form-remove", group.title()), group::remove));
        }
        return line;
    }

    private static Node adding(AddRow row) {
        Button add = new Button(row.text());
        add.setId("form-add");
        add.getStyleClass().add("form-button");
        add.setOnAction(event -> row.add());
        VBox box = new VBox(add, new ErrorLine(row.errorProperty()));
        box.getStyleClass().add("form-adding");
        return box;
    }

    private void explain(FieldModel field, boolean focused) {
        if (focused) {
            explanation.focused(field);
            if (field.isClass() && table != null) {
                table.unfold();
            }
        } else {
            explanation.pointed(field);
        }
    }

    private final class Names extends StringConverter<LinkPart> {
        @Override
        public String toString(LinkPart each) {
            return each == null ? "" : model.name(each);
        }

        @Override
        public LinkPart fromString(String name) {
            return model.parts().stream()
                    .filter(each -> model.name(each).equals(name))
                    .findFirst()
                    .orElse(null);
        }
    }
}

package binspan.planner.view;

import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.Property;
import javafx.beans.property.StringProperty;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.util.StringConverter;

/** Options side by side, in further lines where one is too narrow. Words and ids follow from the names of the options. */
final class OptionRow extends FlowPane {
    private final String study;
    private final Look look;

    /**
     * An empty row.
     *
     * @param study name of the study, which the ids begin with
     * @param look gives the widths
     */
    OptionRow(String study, Look look) {
        this.study = study;
        this.look = look;
        getStyleClass().add("study-options");
    }

    /** Adds anything. */
    OptionRow with(Node... nodes) {
        getChildren().addAll(nodes);
        return this;
    }

    /** Adds what belongs together and stays in one line. */
    HBox together(Node... nodes) {
        HBox group = new HBox(nodes);
        group.getStyleClass().add("study-option");
        group.setAlignment(Pos.CENTER_LEFT);
        getChildren().add(group);
        return group;
    }

    /** Adds a choice. */
    <T> ComboBox<T> choice(String name, Property<T> value, List<T> items, Function<T, String> words) {
        ComboBox<T> box = new ComboBox<>();
        box.getItems().setAll(items);
        box.setConverter(new StringConverter<>() {
            @Override
            public String toString(T item) {
                return item == null ? "" : words.apply(item);
            }

            @Override
            public T fromString(String text) {
                return value.getValue();
            }
        });
        box.valueProperty().bindBidirectional(value);
        getChildren().add(labelled(name, box));
        return box;
    }

    /** Adds a text to write, its width in em. */
    TextField text(String name, StringProperty value, double ems) {
        TextField field = field(name, value, ems);
        getChildren().add(labelled(name, field));
        return field;
    }

    /** A text to write without a label of its own. */
    TextField field(String name, StringProperty value, double ems) {
        TextField field = new TextField();
        field.textProperty().bindBidirectional(value);
        look.follow(() -> field.setPrefWidth(look.em(ems)));
        field.setMinWidth(Region.USE_PREF_SIZE);
        return named(name, field);
    }

    /** Adds something to tick. */
    CheckBox check(String name, BooleanProperty value) {
        CheckBox box = tick(name, value);
        getChildren().add(box);
        return box;
    }

    /** Something to tick. */
    CheckBox tick(String name, BooleanProperty value) {
        CheckBox box = named(name, new CheckBox(word(name)));
        box.selectedProperty().bindBidirectional(value);
        box.setMinWidth(Region.USE_PREF_SIZE);
        return box;
    }

    /** Both ends of a range, their ids ending as given. */
    List<Node> ends(String number, StringProperty from, StringProperty to, double ems) {
        TextField lower = field("from", from, ems);
        TextField upper = field("to", to, ems);
        lower.setId(study + "-from-" + number);
        upper.setId(study + "-to-" + number);
        Label until = new Label(Words.of("studies.to"));
        until.setMinWidth(Region.USE_PREF_SIZE);
        return List.of(lower, until, upper);
    }

    /** A control with its label before it. */
    HBox labelled(String name, Control control) {
        Label label = new Label(word(name));
        label.setLabelFor(control);
        label.setMinWidth(Region.USE_PREF_SIZE);
        HBox pair = new HBox(label, named(name, control));
        pair.getStyleClass().add("study-option");
        pair.setAlignment(Pos.CENTER_LEFT);
        return pair;
    }

    private <C extends Control> C named(String name, C control) {
        control.setId(study + "-" + name);
        control.setAccessibleText(word(name));
        key(name + ".hint").ifPresent(hint -> control.setTooltip(new Tooltip(Words.of(hint))));
        return control;
    }

    private String word(String name) {
        return key(name).map(Words::of).orElse(name);
    }

    /** The text of this study, or the one that all studies share. */
    private Optional<String> key(String name) {
        return List.of("studies." + study + "." + name, "studies." + name).stream()
                .filter(Words::has)
                .findFirst();
    }
}

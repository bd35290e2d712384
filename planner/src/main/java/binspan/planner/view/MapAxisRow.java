package binspan.planner.view;

import binspan.planner.report.ParameterWords;
import binspan.planner.viewmodel.MapAxis;
import binspan.planner.viewmodel.MapModel;
import binspan.planner.viewmodel.Words;
import binspan.scenario.ParameterPaths;
import binspan.study.Axis;
import binspan.units.Digits;
import java.util.List;
import java.util.function.Predicate;
import javafx.css.PseudoClass;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.util.StringConverter;

/** The controls of one axis: parameter, ends, spacing. */
final class MapAxisRow {
    private static final PseudoClass REFUSED = PseudoClass.getPseudoClass("refused");
    private static final int DIGITS = 6;

    private final MapModel model;
    private final MapAxis axis;
    private final Predicate<String> choose;
    private final String id;
    private final Label name;
    private final ComboBox<String> parameter = new ComboBox<>();
    private final TextField from;
    private final TextField to;
    private final Label unit = new Label();
    private final CheckBox logarithmic = new CheckBox(Words.of("map.logarithmic"));
    private boolean showing;

    /**
     * Controls of an axis.
     *
     * @param model the map
     * @param axis the axis
     * @param choose takes a path, false where it leads nowhere
     * @param name what the axis is called
     * @param id of the parameter's control, and the first part of those of the others
     */
    MapAxisRow(MapModel model, MapAxis axis, Predicate<String> choose, String name, String id) {
        this.model = model;
        this.axis = axis;
        this.choose = choose;
        this.id = id;
        this.name = new Label(name);
        this.name.setLabelFor(parameter);
        this.from = end("from", axis::from);
        this.to = end("to", axis::to);
        parameter();
        spacing();
        unit.getStyleClass().add("soft");
        axis.axisProperty().addListener((source, before, after) -> show());
        axis.errorProperty().addListener((source, before, after) -> mark(!after.isEmpty()));
        show();
    }

    /** The controls from left to right. */
    List<Node> nodes() {
        Label until = new Label(Words.of("map.to"));
        until.setLabelFor(to);
        return List.of(name, parameter, from, until, to, unit, logarithmic);
    }

    private void parameter() {
        parameter.setId(id);
        parameter.setEditable(true);
        parameter.setMaxWidth(Double.MAX_VALUE);
        parameter.setVisibleRowCount(16);
        parameter.setTooltip(new Tooltip(Words.of("map.parameter.tip")));
        parameter.setAccessibleText(name.getText() + ": " + Words.of("map.parameter.tip"));
        parameter.setConverter(new StringConverter<>() {
            @Override
            public String toString(String path) {
                return path == null ? "" : words(path);
            }

            @Override
            public String fromString(String text) {
                return path(text);
            }
        });
        parameter.setOnShowing(event -> offer());
        parameter.valueProperty().addListener((source, before, after) -> chosen(after));
        offer();
    }

    private void offer() {
        showing = true;
        parameter.getItems().setAll(model.offered());
        parameter.setValue(axis.path());
        showing = false;
    }

    /** A parameter in words with its unit; a path that leads nowhere stays as it is. */
    private String words(String path) {
        try {
            String of = ParameterPaths.find(model.design().scenario(), path).unit();
            return ParameterWords.title(path) + (of.isEmpty() ? "" : " (" + of + ")");
        } catch (IllegalArgumentException e) {
            return path;
        }
    }

    private String path(String text) {
        return parameter.getItems().stream()
                .filter(path -> words(path).equalsIgnoreCase(text.strip()))
                .findFirst()
                .orElse(text.strip());
    }

    private void chosen(String path) {
        if (!showing && path != null && !path.equals(axis.path()) && choose.test(path)) {
            show();
        }
    }

    private TextField end(String which, Predicate<String> take) {
        TextField field = new TextField();
        field.setId(id + "-" + which);
        field.setAccessibleText(name.getText() + " " + Words.of("map." + which));
        field.setOnAction(event -> take(field, take));
        field.focusedProperty().addListener((source, before, after) -> {
            if (!after) {
                take(field, take);
            }
        });
        return field;
    }

    private void take(TextField field, Predicate<String> take) {
        String shown =
                field == from ? text(axis.axis().from()) : text(axis.axis().to());
        if (!field.getText().strip().equals(shown) && take.test(field.getText())) {
            show();
        }
    }

    private void spacing() {
        logarithmic.setId(id + "-log");
        logarithmic.setOnAction(event -> {
            axis.logarithmic(logarithmic.isSelected());
            show();
        });
    }

    private void show() {
        showing = true;
        Axis shown = axis.axis();
        parameter.setValue(axis.path());
        parameter.getEditor().setText(words(axis.path()));
        from.setText(text(shown.from()));
        to.setText(text(shown.to()));
        unit.setText(shown.parameter().unit());
        logarithmic.setSelected(shown.logarithmic());
        showing = false;
    }

    private static String text(double value) {
        return Digits.shortest(value, DIGITS);
    }

    private void mark(boolean refused) {
        List.of(parameter, from, to).forEach(control -> control.pseudoClassStateChanged(REFUSED, refused));
    }
}

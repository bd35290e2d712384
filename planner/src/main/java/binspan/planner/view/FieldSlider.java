package binspan.planner.view;

import binspan.planner.viewmodel.FieldModel;
import binspan.planner.viewmodel.SliderScale;
import binspan.planner.viewmodel.Words;
import javafx.scene.control.Slider;
import javafx.scene.input.KeyEvent;

/** Moves the number of a field while it is dragged; arrow keys move it by a hundredth, page keys by a tenth. */
final class FieldSlider extends Slider {
    private static final double STEP = 0.01;
    private static final double PAGE = 0.1;

    private final FieldModel model;
    private boolean following;

    FieldSlider(FieldModel model) {
        super(0.0, 1.0, 0.0);
        this.model = model;
        setId(FieldRow.id("form-slide", model.path()));
        getStyleClass().add("form-slider");
        setBlockIncrement(STEP);
        setAccessibleText(Words.of("form.slider", model.label()));
        managedProperty().bind(visibleProperty());
        model.valueProperty().addListener((source, before, now) -> follow());
        model.withoutEffectProperty().addListener((source, before, now) -> follow());
        model.sliderProperty().addListener((source, before, now) -> follow());
        valueProperty().addListener((source, before, now) -> moved(now.doubleValue()));
        valueChangingProperty().addListener((source, before, changing) -> released(changing));
        focusedProperty().addListener((source, before, focused) -> model.settle());
        addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        follow();
    }

    /** Stands where the value is, unless it is being dragged. */
    private void follow() {
        SliderScale scale = model.sliderProperty().get();
        setVisible(scale != null && model.withoutEffect().isEmpty());
        if (scale != null && !isValueChanging()) {
            following = true;
            setValue(scale.position(model.valueProperty().get()));
            following = false;
        }
    }

    private void moved(double position) {
        if (!following) {
            model.slide(position);
        }
    }

    private void released(boolean changing) {
        if (!changing) {
            model.settle();
            follow();
        }
    }

    private void key(KeyEvent event) {
        switch (event.getCode()) {
            case ESCAPE -> model.takeBack();
            case PAGE_UP -> setValue(getValue() + PAGE);
            case PAGE_DOWN -> setValue(getValue() - PAGE);
            default -> {
                return;
            }
        }
        event.consume();
    }
}

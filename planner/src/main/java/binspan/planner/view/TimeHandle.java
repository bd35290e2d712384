package binspan.planner.view;

import java.util.function.DoubleConsumer;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;

/** A line of a time axis that one can take hold of: by the mouse, or focused by the arrow keys. */
final class TimeHandle extends Region {
    private static final double WIDTH = 0.9;

    private final Look look;
    private final Runnable settle;
    private boolean held;

    /**
     * A handle.
     *
     * @param look scale
     * @param style style class
     * @param move takes the pixel to which the mouse has taken it
     * @param settle hears that it was let go
     */
    TimeHandle(Look look, String style, DoubleConsumer move, Runnable settle) {
        this.look = look;
        this.settle = settle;
        getStyleClass().addAll("time-handle", style);
        setCursor(Cursor.H_RESIZE);
        setAccessibleRole(AccessibleRole.SLIDER);
        Region grip = new Region();
        grip.getStyleClass().add("grip");
        getChildren().add(grip);
        addEventHandler(MouseEvent.MOUSE_PRESSED, event -> {
            held = true;
            requestFocus();
            event.consume();
        });
        addEventHandler(MouseEvent.MOUSE_DRAGGED, event -> {
            move.accept(getParent()
                    .sceneToLocal(event.getSceneX(), event.getSceneY())
                    .getX());
            event.consume();
        });
        addEventHandler(MouseEvent.MOUSE_RELEASED, event -> {
            held = false;
            settle.run();
            event.consume();
        });
    }

    /** Whether the mouse holds it. */
    boolean held() {
        return held;
    }

    /**
     * Lets the arrow keys move it.
     *
     * @param step moves it by steps: 1 or -1, ten times that with the shift key
     */
    void steps(DoubleConsumer step) {
        setFocusTraversable(true);
        focusedProperty().addListener((source, before, focused) -> {
            if (!focused) {
                settle.run();
            }
        });
        addEventHandler(KeyEvent.KEY_PRESSED, event -> {
            double size = event.isShiftDown() ? 10.0 : 1.0;
            switch (event.getCode()) {
                case RIGHT, UP -> step.accept(size);
                case LEFT, DOWN -> step.accept(-size);
                default -> {
                    return;
                }
            }
            event.consume();
        });
    }

    /** Puts it at a pixel. */
    void place(double x, double top, double height) {
        double width = look.em(WIDTH);
        resizeRelocate(x - width / 2.0, top, width, height);
    }

    @Override
    protected void layoutChildren() {
        double line = Math.max(1.0, look.em(0.12));
        getChildren().get(0).resizeRelocate((getWidth() - line) / 2.0, 0.0, line, getHeight());
    }
}

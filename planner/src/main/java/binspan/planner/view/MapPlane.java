package binspan.planner.view;

import binspan.planner.plot.Point;
import binspan.planner.report.AxisWords;
import binspan.planner.report.ParameterWords;
import binspan.planner.viewmodel.MapModel;
import binspan.planner.viewmodel.MapReading;
import binspan.planner.viewmodel.MapShape;
import binspan.planner.viewmodel.Words;
import binspan.study.Axis;
import binspan.study.region.MapPoint;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Stream;
import javafx.event.EventType;
import javafx.scene.AccessibleAttribute;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;

/** The map itself: two canvases, so that a moving handle leaves the drawing of the region as it is. */
final class MapPlane extends Region {
    private static final double LEAST = 8.0;
    private static final double USUAL = 32.0;
    private static final double LOWER = 0.97;

    private final MapModel model;
    private final Look look;
    private final Canvas still = new Canvas();
    private final Canvas moving = new Canvas();
    private final Label message = new Label();
    private final Label computing = new Label(Words.of("map.computing"));
    private MapFrame frame;
    private boolean dragging;

    MapPlane(MapModel model, Look look) {
        this.model = model;
        this.look = look;
        setId("map-plane");
        getStyleClass().add("map-plane");
        setFocusTraversable(true);
        message.setId("map-message");
        message.getStyleClass().add("map-message");
        message.setWrapText(true);
        message.setMouseTransparent(true);
        message.textProperty().bind(model.messageProperty());
        message.visibleProperty().bind(model.messageProperty().isNotEmpty());
        computing.setId("map-computing");
        computing.getStyleClass().add("soft");
        computing.setMouseTransparent(true);
        computing.visibleProperty().bind(model.computingBinding());
        getChildren().addAll(still, moving, message, computing);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setAccessibleRoleDescription(Words.of("map.role"));
        setAccessibleHelp(Words.of("map.help"));
        follow();
        hear();
    }

    private void follow() {
        look.follow(this::redraw);
        model.shapeProperty().addListener((source, before, after) -> redraw());
        model.recommendedProperty().addListener((source, before, after) -> redraw());
        model.boxProperty().addListener((source, before, after) -> redraw());
        model.horizontal().axisProperty().addListener((source, before, after) -> redraw());
        model.vertical().axisProperty().addListener((source, before, after) -> redraw());
        model.messageProperty().addListener((source, before, after) -> requestLayout());
        model.design().scenarioProperty().addListener((source, before, after) -> redrawMoving());
        model.reader().pickedProperty().addListener((source, before, after) -> redrawMoving());
        model.reader().readingProperty().addListener((source, before, after) -> tell(after));
        tell(model.reader().readingProperty().get());
    }

    private void hear() {
        take(MouseEvent.MOUSE_PRESSED, this::pressed);
        take(MouseEvent.MOUSE_DRAGGED, this::dragged);
        take(MouseEvent.MOUSE_RELEASED, event -> settle());
        addEventHandler(MouseEvent.MOUSE_MOVED, this::moved);
        addEventHandler(MouseEvent.MOUSE_EXITED, event -> model.reader().leave());
        addEventHandler(KeyEvent.KEY_PRESSED, this::key);
        addEventHandler(KeyEvent.KEY_RELEASED, event -> settle());
        focusedProperty().addListener((source, before, after) -> settle());
    }

    /** Hears what nobody else may hear: a pane of tabs would take the focus at a press, and the drag would end. */
    private void take(EventType<MouseEvent> type, Consumer<MouseEvent> heard) {
        addEventHandler(type, event -> {
            heard.accept(event);
            event.consume();
        });
    }

    @Override
    protected double computePrefWidth(double height) {
        return look.em(USUAL);
    }

    @Override
    protected double computePrefHeight(double width) {
        return look.em(USUAL);
    }

    @Override
    protected double computeMinWidth(double height) {
        return look.em(LEAST);
    }

    @Override
    protected double computeMinHeight(double width) {
        return look.em(LEAST);
    }

    @Override
    protected void layoutChildren() {
        if (still.getWidth() != getWidth() || still.getHeight() != getHeight()) {
            for (Canvas canvas : new Canvas[] {still, moving}) {
                canvas.setWidth(getWidth());
                canvas.setHeight(getHeight());
            }
            redraw();
        }
        placeMessage();
        double width = computing.prefWidth(-1.0);
        double height = computing.prefHeight(-1.0);
        computing.resizeRelocate(getWidth() - width - look.em(0.3), getHeight() - height, width, height);
    }

    private void placeMessage() {
        double width = frame.width() - look.em(2.0);
        double height = message.prefHeight(width);
        double wanted = Math.min(width, message.prefWidth(-1.0));
        double top = messageShare() * (frame.height() - height);
        message.resizeRelocate(frame.left() + look.em(1.0) + (width - wanted) / 2.0, frame.top() + top, wanted, height);
    }

    /** In the middle of an empty map, else on the side that has fewer lines. */
    private double messageShare() {
        MapShape shape = model.shapeProperty().get();
        if (shape == null) {
            return 0.5;
        }
        long upper = corners(shape).filter(at -> at.y() > 0.5).count();
        return 2L * upper > corners(shape).count() ? LOWER : 1.0 - LOWER;
    }

    private static Stream<Point> corners(MapShape shape) {
        return shape.contours().stream().flatMap(each -> each.lines().stream()).flatMap(List::stream);
    }

    private void redraw() {
        frame = MapFrame.of(
                look,
                getWidth(),
                getHeight(),
                model.horizontal().axis(),
                model.vertical().axis());
        new MapDrawing(still.getGraphicsContext2D(), look, frame)
                .draw(
                        model.shapeProperty().get(),
                        model.recommendedProperty().get(),
                        model.boxProperty().get(),
                        model.handle().shown().orElse(null));
        redrawMoving();
        requestLayout();
    }

    private void redrawMoving() {
        new MapOverlay(moving.getGraphicsContext2D(), look, frame).draw(model);
    }

    private boolean onHandle(MouseEvent event) {
        Optional<MapPoint> at = model.handle().shown();
        return at.isPresent()
                && Math.hypot(
                                event.getX() - frame.xOf(at.get().x()),
                                event.getY() - frame.yOf(at.get().y()))
                        <= look.em(MapOverlay.HOLD);
    }

    private void pressed(MouseEvent event) {
        requestFocus();
        event.consume(); // or the pages take the focus, which lets go of the handle
        if (event.getButton() != MouseButton.PRIMARY) {
            return;
        }
        dragging = onHandle(event);
        if (dragging) {
            model.reader().leave();
            model.reader().unpick();
        } else if (frame.contains(event.getX(), event.getY())) {
            double x = frame.valueAtX(event.getX());
            double y = frame.valueAtY(event.getY());
            model.reader().pick(x, y);
            if (event.getClickCount() == 2) {
                model.reader().moveToPicked();
                model.reader().unpick();
            }
        }
    }

    private void dragged(MouseEvent event) {
        if (dragging) {
            model.handle().dragTo(frame.valueAtX(event.getX()), frame.valueAtY(event.getY()));
        }
    }

    private void moved(MouseEvent event) {
        boolean inside = frame.contains(event.getX(), event.getY());
        boolean held = onHandle(event);
        setCursor(held ? Cursor.OPEN_HAND : inside ? Cursor.CROSSHAIR : Cursor.DEFAULT);
        if (inside && !held) {
            model.reader().hover(frame.valueAtX(event.getX()), frame.valueAtY(event.getY()));
        } else {
            model.reader().leave();
        }
    }

    private void settle() {
        dragging = false;
        model.handle().settle();
    }

    private void key(KeyEvent event) {
        boolean large = event.isShiftDown();
        boolean taken = true;
        switch (event.getCode()) {
            case LEFT -> model.handle().step(-1, 0, large);
            case RIGHT -> model.handle().step(1, 0, large);
            case UP -> model.handle().step(0, 1, large);
            case DOWN -> model.handle().step(0, -1, large);
            case ENTER -> model.reader().pickPresent();
            case ESCAPE -> model.reader().unpick();
            case HOME -> model.resetAxes();
            default -> taken = false;
        }
        if (taken && event.getCode() != KeyCode.ESCAPE) {
            event.consume();
        }
    }

    /** What a screen reader says: the point that is read and whether it meets everything. */
    private void tell(MapReading reading) {
        setAccessibleText(reading == null ? model.messageProperty().get() : words(reading));
        notifyAccessibleAttributeChanged(AccessibleAttribute.TEXT);
    }

    private String words(MapReading reading) {
        return Words.of("map.kind." + reading.kind()) + ": "
                + words(model.horizontal().axis(), reading.x()) + ", "
                + words(model.vertical().axis(), reading.y()) + "; "
                + Words.of(reading.verdict().met() ? "map.all.met" : "map.not.met");
    }

    private static String words(Axis axis, double value) {
        return ParameterWords.name(axis.parameter().path()) + " " + AxisWords.plain(axis, value);
    }
}

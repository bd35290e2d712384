package binspan.planner.view;

import binspan.planner.plot.Picture;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.LatestTask;
import binspan.planner.viewmodel.Words;
import java.util.function.Supplier;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.image.Image;
import javafx.scene.image.ImageView;
import javafx.scene.layout.Region;
import javafx.stage.Window;

/**
 * A picture of the plotting library in the size, theme and sharpness of the screen. It is drawn in the background; while
 * one is drawn, newer sizes wait and replace each other, and the old image is stretched.
 */
final class StudyPicture extends Region {
    private static final double SMALLEST = 40.0;

    private final Look look;
    private final LatestTask drawing;
    private final ImageView view = new ImageView();
    private final Label message = new Label();
    private Supplier<Picture> picture;

    StudyPicture(Look look, Background background) {
        this.look = look;
        this.drawing = LatestTask.quick(background);
        getStyleClass().add("study-picture");
        message.getStyleClass().add("soft");
        message.setWrapText(true);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setFocusTraversable(true);
        getChildren().addAll(view, message);
        widthProperty().addListener((source, before, after) -> draw());
        heightProperty().addListener((source, before, after) -> draw());
        sceneProperty()
                .flatMap(scene -> scene.windowProperty())
                .flatMap(Window::renderScaleXProperty)
                .addListener((source, before, after) -> draw());
        look.follow(this::draw);
    }

    /** Shows another picture; null for none. */
    void show(Supplier<Picture> another, String title) {
        picture = another;
        setAccessibleText(title);
        view.setImage(null);
        message.setText(Words.of(another == null ? "studies.picture.none" : "studies.drawing"));
        draw();
    }

    /** What is to be seen, null before it is drawn. */
    Image image() {
        return view.getImage();
    }

    private void draw() {
        Supplier<Picture> shown = picture;
        if (shown == null || getWidth() < SMALLEST || getHeight() < SMALLEST) {
            return;
        }
        ScreenPicture size = new ScreenPicture(
                getWidth(),
                getHeight(),
                look.em(1.0),
                sharpness(),
                look.themeProperty().get());
        drawing.run(progress -> size.drawn(shown.get()), image -> place(shown, image), this::refuse);
    }

    private double sharpness() {
        Window window = getScene() == null ? null : getScene().getWindow();
        return window == null ? 1.0 : Math.max(1.0, window.getRenderScaleX());
    }

    private void place(Supplier<Picture> drawn, Image image) {
        if (drawn == picture) {
            view.setImage(image);
            message.setText("");
            requestLayout();
        }
    }

    private void refuse(RuntimeException failure) {
        message.setText(Words.of("studies.failed", failure.toString()));
    }

    @Override
    protected void layoutChildren() {
        view.setFitWidth(getWidth());
        view.setFitHeight(getHeight());
        message.resizeRelocate(0.0, 0.0, getWidth(), message.prefHeight(getWidth()));
    }
}

package binspan.planner.view;

import binspan.planner.plot.Picture;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.LatestTask;
import binspan.planner.viewmodel.Words;
import java.util.function.Supplier;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.image.Image;
import javafx.scene.image.ImageView;
import javafx.scene.layout.BorderPane;
import javafx.stage.Window;

/**
 * A picture of the plotting library in the size, theme and sharpness of the screen; it scrolls where there is too little
 * room to read it. It is drawn in the background; while one is drawn, newer sizes wait and replace each other.
 */
final class StudyPicture extends BorderPane {
    private static final double SMALLEST = 40.0;
    private static final double SCROLL_BAR = 1.4;

    private final Look look;
    private final LatestTask drawing;
    private final ImageView view = new ImageView();
    private final ScrollPane scroll = new ScrollPane(view);
    private final Label words = new Label();
    private Supplier<Picture> picture;

    StudyPicture(Look look, Background background) {
        this.look = look;
        this.drawing = LatestTask.quick(background);
        getStyleClass().add("study-picture");
        words.getStyleClass().add("soft");
        words.setWrapText(true);
        scroll.setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        scroll.setFocusTraversable(true);
        setTop(words);
        setCenter(scroll);
        scroll.widthProperty().addListener((source, before, after) -> draw());
        scroll.heightProperty().addListener((source, before, after) -> draw());
        sceneProperty()
                .flatMap(scene -> scene.windowProperty())
                .flatMap(Window::renderScaleXProperty)
                .addListener((source, before, after) -> draw());
        look.follow(this::draw);
    }

    /** Shows another picture; null for none. */
    void show(Supplier<Picture> another, String title) {
        picture = another;
        scroll.setAccessibleText(title);
        view.setImage(null);
        words.setText(Words.of(another == null ? "studies.picture.none" : "studies.drawing"));
        draw();
    }

    /** What is to be seen, null before it is drawn. */
    Image image() {
        return view.getImage();
    }

    private void draw() {
        Supplier<Picture> shown = picture;
        double width = scroll.getWidth() - look.em(SCROLL_BAR);
        if (shown == null || width < SMALLEST || scroll.getHeight() < SMALLEST) {
            return;
        }
        ScreenPicture size = new ScreenPicture(
                width,
                scroll.getHeight() - 2.0,
                look.em(1.0),
                sharpness(),
                look.themeProperty().get());
        drawing.run(progress -> size.drawn(shown.get()), drawn -> place(shown, drawn), this::refuse);
    }

    private double sharpness() {
        Window window = getScene() == null ? null : getScene().getWindow();
        return window == null ? 1.0 : Math.max(1.0, window.getRenderScaleX());
    }

    private void place(Supplier<Picture> shown, ScreenPicture.Drawn drawn) {
        if (shown == picture) {
            view.setImage(drawn.image());
            view.setFitWidth(drawn.width());
            view.setFitHeight(drawn.height());
            words.setText(drawn.subtitle());
        }
    }

    private void refuse(RuntimeException failure) {
        words.setText(Words.of("studies.failed", failure.toString()));
    }
}

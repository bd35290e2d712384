package binspan.planner.view;

import binspan.planner.plot.Picture;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.LatestTask;
import binspan.planner.viewmodel.Words;
import java.util.function.Supplier;
import javafx.geometry.Dimension2D;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.image.Image;
import javafx.scene.image.ImageView;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.stage.Window;

/**
 * A picture of the plotting library in the size, theme and sharpness of the screen; it fits its
 * place, or shows all its panels and scrolls. It is drawn in the background; while one is drawn, newer sizes wait and replace each other.
 */
final class StudyPicture extends BorderPane {
    private static final double SMALLEST = 40.0;
    private static final double SCROLL_BAR = 1.4;

    private final Look look;
    private final LatestTask drawing;
    private final ImageView view = new ImageView();
    private final ScrollPane scroll = new ScrollPane(view);
    private final Label words = new Label();
    private final FitChoice fit;
    private Supplier<Picture> picture;

    StudyPicture(String study, Look look, Background background) {
        this.look = look;
        this.drawing = LatestTask.quick(background);
        getStyleClass().add("study-picture");
        words.getStyleClass().add("soft");
        Tooltip whole = new Tooltip();
        whole.textProperty().bind(words.textProperty());
        words.setTooltip(whole);
        words.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(words, Priority.ALWAYS);
        fit = new FitChoice(study);
        fit.wholeProperty().addListener((source, before, after) -> draw());
        scroll.setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        scroll.setFocusTraversable(true);
        setTop(head());
        setCenter(scroll);
        scroll.widthProperty().addListener((source, before, after) -> draw());
        scroll.heightProperty().addListener((source, before, after) -> draw());
        sceneProperty()
                .flatMap(scene -> scene.windowProperty())
                .flatMap(Window::renderScaleXProperty)
                .addListener((source, before, after) -> draw());
        look.follow(this::draw);
    }

    private HBox head() {
        HBox head = new HBox(words, fit);
        head.getStyleClass().add("study-picture-head");
        head.setAlignment(Pos.CENTER_LEFT);
        return head;
    }

    /** Shows another picture; null for none. */
    void show(Supplier<Picture> another, String title) {
        picture = another;
        scroll.setAccessibleText(title);
        view.setImage(null);
        words.setWrapText(false);
        fit.setNeeded(false);
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
                new Dimension2D(width, scroll.getHeight() - 2.0),
                fit.wholeProperty().get(),
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
            fit.setNeeded(drawn.crowded());
        }
    }

    private void refuse(RuntimeException failure) {
        words.setWrapText(true);
        words.setText(Words.of("studies.failed", failure.toString()));
    }
}

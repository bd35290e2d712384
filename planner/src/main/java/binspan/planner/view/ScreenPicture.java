package binspan.planner.view;

import binspan.planner.plot.Picture;
import binspan.planner.plot.PictureImage;
import binspan.planner.plot.PlotTheme;
import javafx.scene.image.Image;

/**
 * How a picture is drawn for the screen.
 *
 * @param width of the place that it fills
 * @param height of that place; a picture that needs more is higher
 * @param em size of ordinary text
 * @param sharpness pixels of the screen for each of these lengths
 * @param theme light or dark
 */
record ScreenPicture(double width, double height, double em, double sharpness, Theme theme) {
    /** Size of ordinary text in a picture, points. */
    private static final double TEXT = 14.0;

    /**
     * A drawn picture.
     *
     * @param image it
     * @param width width on the screen
     * @param height height on the screen
     * @param subtitle what it says below its title
     */
    record Drawn(Image image, double width, double height, String subtitle) {}

    /** Draws it without its titles; takes its time. */
    Drawn drawn(Picture picture) {
        double scale = em / TEXT;
        Picture bare = picture.untitled();
        double full = scale * bare.fullHeight((int) Math.floor(width / scale));
        double high = Math.max(height, full);
        PlotTheme colours = theme == Theme.DARK ? PlotTheme.DARK : PlotTheme.LIGHT;
        Image image = FxImages.of(PictureImage.of(bare, colours, pixels(width), pixels(high), scale * sharpness));
        return new Drawn(image, width, high, picture.subtitle());
    }

    private int pixels(double length) {
        return (int) Math.round(length * sharpness);
    }
}

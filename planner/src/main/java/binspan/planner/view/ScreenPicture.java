package binspan.planner.view;

import binspan.planner.plot.Picture;
import binspan.planner.plot.PictureImage;
import binspan.planner.plot.PlotTheme;
import javafx.geometry.Dimension2D;
import javafx.scene.image.Image;

/**
 * How a picture is drawn for the screen.
 *
 * @param place which it fills
 * @param whole whether all panels are drawn, if it must be higher than the place for them; otherwise those that have no
 *     room are left out, down to one
 * @param em size of ordinary text
 * @param sharpness pixels of the screen for each of these lengths
 * @param theme light or dark
 */
record ScreenPicture(Dimension2D place, boolean whole, double em, double sharpness, Theme theme) {
    /** Size of ordinary text in a picture, points. */
    private static final double TEXT = 14.0;

    /**
     * A drawn picture.
     *
     * @param image it
     * @param width width on the screen
     * @param height height on the screen
     * @param subtitle what it says below its title
     * @param crowded whether some of its panels have no room in the place
     */
    record Drawn(Image image, double width, double height, String subtitle, boolean crowded) {}

    /** Draws it without its titles; takes its time. */
    Drawn drawn(Picture picture) {
        double scale = em / TEXT;
        Picture bare = picture.untitled();
        int points = (int) Math.floor(place.getWidth() / scale);
        boolean crowded = bare.leftOut(points, (int) Math.floor(place.getHeight() / scale)) > 0;
        int wanted = whole && crowded ? bare.fullHeight(points) : bare.leastHeight(points);
        double high = Math.max(place.getHeight(), scale * wanted);
        PlotTheme colours = theme == Theme.DARK ? PlotTheme.DARK : PlotTheme.LIGHT;
        Image image =
                FxImages.of(PictureImage.of(bare, colours, pixels(place.getWidth()), pixels(high), scale * sharpness));
        return new Drawn(image, place.getWidth(), high, picture.subtitle(), crowded);
    }

    private int pixels(double length) {
        return (int) Math.round(length * sharpness);
    }
}

package binspan.planner.view;

import binspan.planner.plot.PanelChart;
import binspan.planner.plot.Picture;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import javafx.scene.image.Image;

/**
 * How a picture is drawn for the screen.
 *
 * @param width of the place that it fills
 * @param height of that place
 * @param em size of ordinary text
 * @param sharpness pixels of the screen for each of these lengths
 * @param theme light or dark
 */
record ScreenPicture(double width, double height, double em, double sharpness, Theme theme) {
    /** Size of ordinary text in a picture of the plotting library, as a share of that of the window. */
    private static final double TEXT = 13.5 * 1.1;

    Image drawn(Picture picture) {
        double scale = em / TEXT * sharpness;
        int wide = (int) Math.round(width * sharpness);
        int high = (int) Math.round(height * sharpness);
        BufferedImage image = new BufferedImage(wide, high, BufferedImage.TYPE_INT_ARGB);
        Graphics2D g2 = image.createGraphics();
        g2.scale(scale, scale);
        PanelChart chart = picture.chart();
        chart.chart().draw(g2, new Rectangle2D.Double(0.0, 0.0, wide / scale, high / scale));
        g2.dispose();
        return FxImages.of(image);
    }
}

package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;

/** A picture as an image of a given size, for a screen. */
public final class PictureImage {
    private PictureImage() {}

    /**
     * Draws a picture so that it fills an image. Words keep their size: where there is little room, panels stand differently, and those for which there is
     * none are left out, which the legend then says; see {@link Picture#fullHeight}.
     *
     * @param picture what to draw
     * @param theme its colours
     * @param widthPixels width of the image, at least 1
     * @param heightPixels height of the image, at least 1
     * @param scale pixels for each point, above 0: 1 on a plain screen, 2 on a fine one
     * @return an opaque image
     * @throws IllegalArgumentException if a size or the scale is not positive
     */
    public static BufferedImage of(Picture picture, PlotTheme theme, int widthPixels, int heightPixels, double scale) {
        if (widthPixels < 1 || heightPixels < 1 || !(scale > 0.0) || Double.isInfinite(scale)) {
            throw new IllegalArgumentException("found an image of " + widthPixels + " x " + heightPixels + " at scale "
                    + scale + "; allowed positive ones");
        }
        Room room = new Room(widthPixels / scale, heightPixels / scale);
        BufferedImage image = new BufferedImage(widthPixels, heightPixels, BufferedImage.TYPE_INT_RGB);
        Graphics2D g2 = image.createGraphics();
        g2.setPaint(theme.ground().background());
        g2.fillRect(0, 0, widthPixels, heightPixels);
        g2.scale(scale, scale);
        g2.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        picture.chart(theme, room).chart().draw(g2, new Rectangle2D.Double(0.0, 0.0, room.width(), room.height()));
        g2.dispose();
        return image;
    }
}

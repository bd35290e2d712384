package binspan.planner.plot;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import javax.imageio.ImageIO;

/** A picture as PNG, two pixels for each point of its size. */
public final class PngImage {
    static final int SCALE = 2;

    private PngImage() {}

    static byte[] of(PanelChart chart) {
        BufferedImage image =
                new BufferedImage(SCALE * chart.width(), SCALE * chart.height(), BufferedImage.TYPE_INT_RGB);
        Graphics2D g2 = image.createGraphics();
        g2.scale(SCALE, SCALE);
        g2.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        chart.chart().draw(g2, new Rectangle2D.Double(0.0, 0.0, chart.width(), chart.height()));
        g2.dispose();
        return encoded(image);
    }

    /** An image as the bytes of a PNG file. */
    public static byte[] encoded(BufferedImage image) {
        ImageIO.setUseCache(false);
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            ImageIO.write(image, "png", bytes);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }
}

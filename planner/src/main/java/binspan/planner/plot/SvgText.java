package binspan.planner.plot;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.awt.image.RenderedImage;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.DefaultImageHandler;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGGraphics2DIOException;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** A picture as SVG: the same bytes for the same picture, texts as texts, images inside the file. */
final class SvgText {
    private static final String SVG = "http://www.w3.org/2000/svg";
    private static final String XLINK = "http://www.w3.org/1999/xlink";
    private static final String HEADER = "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n";
    private static final int DECIMALS = 4;

    private SvgText() {}

    static byte[] of(Picture picture, PanelChart chart) {
        SVGGraphics2D g2 = graphics();
        g2.setSVGCanvasSize(new Dimension(chart.width(), chart.height()));
        chart.chart().draw(g2, new Rectangle2D.Double(0.0, 0.0, chart.width(), chart.height()));
        Element root = g2.getRoot();
        root.setAttributeNS(null, "viewBox", "0 0 " + chart.width() + " " + chart.height());
        Element title = root.getOwnerDocument().createElementNS(SVG, "title");
        title.setTextContent(picture.title());
        root.insertBefore(title, root.getFirstChild());
        return text(g2, root).getBytes(StandardCharsets.UTF_8);
    }

    private static SVGGraphics2D graphics() {
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document());
        context.setComment(null);
        context.setPrecision(DECIMALS);
        context.setImageHandler(new InlineImages());
        return new SVGGraphics2D(context, false);
    }

    private static Document document() {
        try {
            return DocumentBuilderFactory.newDefaultInstance()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument(SVG, "svg", null);
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException(e);
        }
    }

    /** Without the declaration of a document type, which points to a network address. */
    private static String text(SVGGraphics2D g2, Element root) {
        StringWriter written = new StringWriter();
        try {
            g2.stream(root, written);
        } catch (SVGGraphics2DIOException e) {
            throw new UncheckedIOException(e);
        }
        String text = written.toString();
        return HEADER + text.substring(text.indexOf("<svg"));
    }

    /** Images as data in the file, so that it stands alone. */
    private static final class InlineImages extends DefaultImageHandler {
        @Override
        protected void handleHREF(Image image, Element element, SVGGeneratorContext context) {
            BufferedImage copy =
                    new BufferedImage(image.getWidth(null), image.getHeight(null), BufferedImage.TYPE_INT_ARGB);
            Graphics2D g2 = copy.createGraphics();
            g2.drawImage(image, 0, 0, null);
            g2.dispose();
            handleHREF((RenderedImage) copy, element, context);
        }

        @Override
        protected void handleHREF(RenderedImage image, Element element, SVGGeneratorContext context) {
            String data = Base64.getEncoder().encodeToString(PngImage.encoded((BufferedImage) image));
            element.setAttributeNS(XLINK, "xlink:href", "data:image/png;base64," + data);
            element.setAttributeNS(null, "preserveAspectRatio", "none");
        }
    }
}

package binspan.planner.plot;

import java.awt.Graphics;
import java.awt.Image;
import java.awt.Shape;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;
import java.awt.image.ImageObserver;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;

/** Keeps where the words of a drawing stand, as the outlines of their letters measure them. */
final class TextBoxes extends SVGGraphics2D {
    private static final FontRenderContext CONTEXT = new FontRenderContext(null, true, true);

    private final List<Box> boxes;

    /**
     * Words that were drawn.
     *
     * @param text the words
     * @param box the rectangle around them on the page
     */
    record Box(String text, Rectangle2D box) {}

    private TextBoxes(SVGGeneratorContext context) {
        super(context, false);
        this.boxes = new ArrayList<>();
    }

    private TextBoxes(TextBoxes other) {
        super(other);
        this.boxes = other.boxes;
    }

    /** All words of a chart drawn into a room. */
    static List<Box> of(PanelChart chart, Room room) throws Exception {
        TextBoxes drawing = new TextBoxes(SVGGeneratorContext.createDefault(DocumentBuilderFactory.newDefaultInstance()
                .newDocumentBuilder()
                .getDOMImplementation()
                .createDocument("http://www.w3.org/2000/svg", "svg", null)));
        chart.chart().draw(drawing, new Rectangle2D.Double(0.0, 0.0, room.width(), room.height()));
        return drawing.boxes;
    }

    @Override
    public Graphics create() {
        return new TextBoxes(this);
    }

    @Override
    public void drawString(String text, float x, float y) {
        Shape letters = getFont().createGlyphVector(CONTEXT, text).getOutline(x, y);
        Rectangle2D box = getTransform().createTransformedShape(letters).getBounds2D();
        if (!text.isBlank()) {
            boxes.add(new Box(text, box));
        }
    }

    @Override
    public boolean drawImage(Image image, int x, int y, ImageObserver observer) {
        return true;
    }
}

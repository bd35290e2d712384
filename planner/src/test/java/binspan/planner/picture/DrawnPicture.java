package binspan.planner.picture;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.plot.Picture;
import binspan.planner.plot.PictureFile;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Document;
import org.w3c.dom.NodeList;

/** A study's picture drawn to a file and read back. */
final class DrawnPicture {
    private static final int WHITE = 0xffffffff;

    private DrawnPicture() {}

    /** A shipped scenario. */
    static Scenario shipped(String name) {
        try {
            return ScenarioReader.read(
                    Path.of("..", "scenarios", name + ".json").toString());
        } catch (InvalidScenarioException e) {
            throw new IllegalArgumentException(name, e);
        }
    }

    /** A linear axis of a scenario's parameter. */
    static Axis axis(Scenario scenario, String path, double from, double to, int steps) {
        return new Axis(ParameterPaths.find(scenario, path), from, to, steps, false);
    }

    /** All words of the picture as SVG, read by the platform's own parser, thin blanks as plain ones. */
    static List<String> texts(Picture picture, Path directory) throws Exception {
        Path file = directory.resolve("picture.svg");
        PictureFile.of(file.toString()).write(picture, true);
        Document document =
                DocumentBuilderFactory.newDefaultInstance().newDocumentBuilder().parse(file.toFile());
        NodeList found = document.getElementsByTagName("text");
        List<String> texts = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            texts.add(found.item(i).getTextContent().replace('\u2009', ' '));
        }
        return texts;
    }

    /** Which share of the pixels of the picture as PNG is not white. */
    static double inked(Picture picture, Path directory) throws Exception {
        Path file = directory.resolve("picture.png");
        PictureFile.of(file.toString()).write(picture, true);
        BufferedImage image = ImageIO.read(file.toFile());
        int[] pixels = image.getRGB(0, 0, image.getWidth(), image.getHeight(), null, 0, image.getWidth());
        return (double) Arrays.stream(pixels).filter(pixel -> pixel != WHITE).count() / pixels.length;
    }
}

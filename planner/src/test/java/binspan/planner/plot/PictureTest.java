package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.GraphicsEnvironment;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.NodeList;

final class PictureTest {
    private static byte[] svg(Picture picture) {
        return SvgText.of(picture, picture.chart());
    }

    /** The texts of an SVG file, read back by the platform's own parser. */
    private static List<String> texts(Picture picture) throws Exception {
        Document document = DocumentBuilderFactory.newDefaultInstance()
                .newDocumentBuilder()
                .parse(new ByteArrayInputStream(svg(picture)));
        NodeList found = document.getElementsByTagName("text");
        List<String> texts = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            texts.add(found.item(i).getTextContent());
        }
        return texts;
    }

    static Stream<String> kinds() {
        return SamplePictures.all().keySet().stream();
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void everyKindIsDrawnWithoutADisplay(String kind) throws Exception {
        assertThat(GraphicsEnvironment.isHeadless()).isTrue();
        PanelChart chart = SamplePictures.all().get(kind).chart();
        BufferedImage image = ImageIO.read(new ByteArrayInputStream(PngImage.of(chart)));
        assertThat(image.getWidth()).isEqualTo(2 * chart.width()).isGreaterThanOrEqualTo(2400);
        assertThat(image.getHeight()).isEqualTo(2 * chart.height());
        assertThat(image.getRGB(0, 0)).isEqualTo(0xffffffff);
        assertThat(share(image)).isBetween(0.01, 0.8);
    }

    /** Which share of the pixels is not white. */
    private static double share(BufferedImage image) {
        int[] pixels = image.getRGB(0, 0, image.getWidth(), image.getHeight(), null, 0, image.getWidth());
        long drawn = Arrays.stream(pixels).filter(pixel -> pixel != 0xffffffff).count();
        return (double) drawn / pixels.length;
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void everyKindHasTheTitlesAndTheSameBytesEachTime(String kind) throws Exception {
        Picture picture = SamplePictures.all().get(kind);
        assertThat(texts(picture)).contains("Kestrel Dam to Millbrook", "42 km of fibre; all else as written");
        assertThat(svg(picture)).isEqualTo(svg(SamplePictures.all().get(kind)));
        assertThat(new String(svg(picture), StandardCharsets.UTF_8)).doesNotContain("DOCTYPE");
    }

    @Test
    void curvesSayAxesRequirementsMarksAndLegend() throws Exception {
        assertThat(texts(SamplePictures.page(SamplePictures.curves())))
                .contains("Window width (ps)", "Visibility", "Key rate (bit/s)", "as written", "tuned")
                .contains("required \u2265 0.88", "required \u2265 20\u2009bit/s")
                .contains("deployed fibre", "patch cord", "all requirements met", "failing side of a requirement");
    }

    @Test
    void seriesAreNotListedWhereEachPanelHasOne() throws Exception {
        CurvePanel panel = new CurvePanel(
                Axis.linear("Visibility", ""), List.of(SamplePictures.series("only", w -> 0.9)), Optional.empty());
        Picture picture =
                SamplePictures.page(new Curves("", SamplePictures.WINDOW, List.of(panel), List.of(), List.of()));
        assertThat(texts(picture)).contains("Visibility").doesNotContain("only", "all requirements met");
    }

    @Test
    void mapSaysAxesColourBarContoursPointsAndBoxes() throws Exception {
        assertThat(texts(SamplePictures.all().get("map")))
                .contains("short arm", "long arm", "Mean pairs per bin", "Window width (ps)", "Key rate (bit/s)")
                .contains("1  visibility 0.88", "2  key rate 100 bit/s", "not all requirements met", "no key")
                .contains("as planned", "recommended", "tolerance box", "1", "2");
        assertThat(new String(svg(SamplePictures.all().get("map")), StandardCharsets.UTF_8))
                .contains("data:image/png;base64,");
    }

    @Test
    void commonLegendNamesEachThingOnce() throws Exception {
        assertThat(texts(SamplePictures.all().get("map"))).containsOnlyOnce("1  visibility 0.88", "no key");
    }

    @Test
    void barsSayLabelsValuesAndRequirement() throws Exception {
        assertThat(texts(SamplePictures.all().get("bars")))
                .contains("as written", "wider window", "cooler detector", "120", "45", "no key")
                .contains("Key rate (bit/s)", "Change of visibility", "required \u2265 100\u2009bit/s")
                .contains("meets the requirements", "does not meet them", "failing side of a requirement");
    }

    @Test
    void histogramSaysTitleRequirementAndQuantiles() throws Exception {
        assertThat(texts(SamplePictures.all().get("histograms")))
                .contains("Spread of the visibility", "Visibility", "Count", "required \u2265 0.88")
                .contains("5 % of trials lie below", "median");
    }

    @Test
    void rangesSayEndsWithUnitsAndLeaveOutWhatTheyShare() throws Exception {
        assertThat(texts(SamplePictures.all().get("ranges")))
                .contains("Window width", "50\u2009ps", "2000\u2009ps", "410\u2009ps", "950\u2009ps", "500\u2009ps")
                .contains("\u221250\u2009GHz", "\u221212.5\u2009GHz", "0\u2009GHz", "whole range", "allowed", "planned")
                .containsOnlyOnce("50\u2009GHz");
    }

    @Test
    void emptyPanelsSaySo() throws Exception {
        CurvePanel panel = new CurvePanel(
                Axis.logarithmic("Key rate", "bit/s"),
                List.of(SamplePictures.series("key", w -> 0.0)),
                Optional.of(RequirementLine.of("5\u2009bit/s", 5.0, true)));
        Curves curves = new Curves("", SamplePictures.WINDOW, List.of(panel), List.of(), List.of());
        Histogram histogram =
                new Histogram("", Axis.linear("Key rate", "bit/s"), List.of(), Optional.empty(), List.of());
        Lattice none = Lattices.of(new double[] {1.0, 2.0}, new double[] {1.0, 2.0}, (x, y) -> Double.NaN);
        HeatMap map = new HeatMap(
                "",
                SamplePictures.PAIRS,
                SamplePictures.WINDOW,
                new HeatLayer(Axis.linear("Key rate", "bit/s"), none, "no key"),
                Overlays.NONE);
        for (Panel each : List.of(curves, histogram, map)) {
            assertThat(texts(SamplePictures.page(each))).contains("no values to show");
        }
    }

    @Test
    void wordsWithSignsOfTheFormatArriveWhole() throws Exception {
        Picture picture = new Picture("S < 2 & \"key\"", "", SamplePictures.ranges());
        assertThat(texts(picture)).contains("S < 2 & \"key\"");
    }
}

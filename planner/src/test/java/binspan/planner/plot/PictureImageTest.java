package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.image.BufferedImage;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

final class PictureImageTest {
    private static final Room SMALL = new Room(560.0, 380.0);

    static Stream<String> kinds() {
        return SamplePictures.all().keySet().stream();
    }

    private static Picture curves(int panels) {
        CurvePanel panel = SamplePictures.curves().panels().get(0);
        List<CurvePanel> all = IntStream.range(0, panels)
                .mapToObj(i -> new CurvePanel(Axis.linear("Figure " + i, ""), panel.series(), Optional.empty()))
                .toList();
        return new Picture("", "", new Curves("", SamplePictures.WINDOW, all, List.of(), List.of()));
    }

    private static List<String> words(Picture picture, Room room) throws Exception {
        return TextBoxes.of(picture.chart(PlotTheme.LIGHT, room), room).stream()
                .map(TextBoxes.Box::text)
                .toList();
    }

    @ParameterizedTest
    @CsvSource({"560, 380, 1", "1120, 760, 2", "901, 333, 1.25"})
    void imageHasTheSizeAndTheBackgroundAskedFor(int width, int height, double scale) {
        for (Picture picture : SamplePictures.all().values()) {
            BufferedImage image = PictureImage.of(picture, PlotTheme.DARK, width, height, scale);
            assertThat(image.getWidth()).isEqualTo(width);
            assertThat(image.getHeight()).isEqualTo(height);
            assertThat(image.getRGB(0, 0))
                    .isEqualTo(PlotTheme.DARK.ground().background().getRGB());
            assertThat(image.getRGB(width - 1, height - 1)).isEqualTo(image.getRGB(0, 0));
        }
    }

    @ParameterizedTest
    @CsvSource({"1, 1, 1", "1, 1, 3", "20, 900, 1", "900, 20, 1", "100, 80, 2", "160, 120, 1", "4000, 30, 1"})
    void noSizeIsTooSmall(int width, int height, double scale) {
        for (Picture picture : SamplePictures.all().values()) {
            assertThat(PictureImage.of(picture, PlotTheme.LIGHT, width, height, scale)
                            .getWidth())
                    .isEqualTo(width);
        }
    }

    @Test
    void sizesThatAreNoneAreRefused() {
        Picture picture = curves(1);
        assertThatThrownBy(() -> PictureImage.of(picture, PlotTheme.LIGHT, 0, 10, 1.0))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> PictureImage.of(picture, PlotTheme.LIGHT, 10, 10, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class);
    }

    /** Against the outlines of all letters, pair by pair; numbers of contours, which stand on plates upon their lines, are left out. */
    @ParameterizedTest
    @MethodSource("kinds")
    void wordsInASmallWindowStayOnThePageAndApart(String kind) throws Exception {
        Picture picture = SamplePictures.all().get(kind).untitled();
        List<TextBoxes.Box> boxes = TextBoxes.of(picture.chart(PlotTheme.LIGHT, SMALL), SMALL);
        boxes.removeIf(word -> word.text().matches("\\d") && kind.equals("map"));
        assertThat(boxes).hasSizeGreaterThan(5);
        for (int i = 0; i < boxes.size(); i++) {
            assertThat(boxes.get(i).box().getMinX()).as(boxes.get(i).text()).isGreaterThanOrEqualTo(0.0);
            assertThat(boxes.get(i).box().getMaxX()).as(boxes.get(i).text()).isLessThanOrEqualTo(SMALL.width());
            assertThat(boxes.get(i).box().getMinY()).as(boxes.get(i).text()).isGreaterThanOrEqualTo(0.0);
            assertThat(boxes.get(i).box().getMaxY()).as(boxes.get(i).text()).isLessThanOrEqualTo(SMALL.height());
            for (int j = 0; j < i; j++) {
                assertThat(boxes.get(i).box().intersects(boxes.get(j).box()))
                        .as("\"%s\" and \"%s\"", boxes.get(i), boxes.get(j))
                        .isFalse();
            }
        }
    }

    @Test
    void panelsThatHaveNoRoomAreCounted() throws Exception {
        List<String> small = words(curves(8), new Room(300.0, 205.0));
        assertThat(small)
                .contains("Figure 0", "7 more panels need a larger picture")
                .doesNotContain("Figure 1");
        assertThat(words(curves(2), new Room(300.0, 205.0))).contains("1 more panel needs a larger picture");
    }

    @Test
    void theLeastHeightShowsAPanelAndTheLegendWithinIt() throws Exception {
        Picture picture = curves(8);
        Room room = new Room(300.0, picture.leastHeight(300));
        assertThat(picture.leftOut(300, picture.leastHeight(300))).isEqualTo(7);
        assertThat(picture.leftOut(300, picture.fullHeight(300))).isZero();
        assertThat(TextBoxes.of(picture.chart(PlotTheme.LIGHT, room), room))
                .allSatisfy(word -> assertThat(word.box().getMaxY()).isLessThanOrEqualTo(room.height()));
    }

    @Test
    void lowPanelsStandInTwoColumns() throws Exception {
        assertThat(words(curves(6), SMALL)).contains("Figure 0", "Figure 5").noneMatch(word -> word.contains("more"));
    }

    @ParameterizedTest
    @CsvSource({"400", "560", "800", "1200"})
    void fullHeightShowsEverything(int width) throws Exception {
        for (Picture picture :
                List.of(curves(1), curves(8), SamplePictures.all().get("map"))) {
            Room room = new Room(width, picture.fullHeight(width));
            assertThat(words(picture, room)).noneMatch(word -> word.contains("larger picture"));
        }
    }

    @Test
    void untitledPictureLeavesOnlyTheTitlesOut() throws Exception {
        Picture picture = SamplePictures.page(SamplePictures.ranges());
        assertThat(words(picture, SMALL)).contains("Kestrel Dam to Millbrook", "planned");
        assertThat(words(picture.untitled(), SMALL))
                .doesNotContain("Kestrel Dam to Millbrook")
                .contains("planned");
    }

    @Test
    void longWordsAreBrokenAndCut() {
        List<String> lines = Words.lines("Rank correlation with the margin", PlotStyle.AXIS, 120.0, 2);
        assertThat(lines).hasSize(2);
        assertThat(lines.get(0)).isEqualTo("Rank correlation");
        assertThat(lines)
                .allSatisfy(
                        line -> assertThat(Words.length(line, PlotStyle.AXIS)).isLessThanOrEqualTo(120.0));
        assertThat(Words.shortened("efficiency", PlotStyle.AXIS, 40.0))
                .startsWith("e")
                .endsWith("\u2026");
        assertThat(Words.shortened("width", PlotStyle.AXIS, 400.0)).isEqualTo("width");
    }
}

package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Against the contrast of WCAG 2.1: 4.5 to 1 for words (criterion 1.4.3), 3 to 1 for parts of graphics (criterion 1.4.11). */
final class PlotThemeTest {
    private static final double WORDS = 4.5;
    private static final double GRAPHICS = 3.0;

    static Stream<PlotTheme> themes() {
        return Stream.of(PlotTheme.LIGHT, PlotTheme.DARK);
    }

    /** By the definitions white on black has 21 to 1, equal colours 1 to 1. */
    @Test
    void contrastOfExtremes() {
        assertThat(Contrast.of(Color.WHITE, Color.BLACK)).isEqualTo(21.0);
        assertThat(Contrast.of(Color.GRAY, Color.GRAY)).isEqualTo(1.0);
    }

    @ParameterizedTest
    @MethodSource("themes")
    void wordsStandOutFromAllThatLiesBelowThem(PlotTheme theme) {
        Color background = theme.ground().background();
        List<Color> below =
                new ArrayList<>(List.of(background, Contrast.over(theme.fill().met(), background)));
        for (int i = 0; i <= 10; i++) {
            below.add(Contrast.over(theme.halo(), new Color(ColourScale.rgb(i / 10.0))));
        }
        for (Color colour : below) {
            assertThat(Contrast.of(theme.ink().text(), colour)).isGreaterThanOrEqualTo(WORDS);
        }
        assertThat(Contrast.of(theme.ink().soft(), background)).isGreaterThanOrEqualTo(WORDS);
    }

    @ParameterizedTest
    @MethodSource("themes")
    void linesAndBarsStandOutFromTheBackground(PlotTheme theme) {
        List<Color> lines = new ArrayList<>(theme.series());
        lines.addAll(
                List.of(theme.fill().metEdge(), theme.fill().bar(), theme.ink().soft()));
        for (Color line : lines) {
            assertThat(Contrast.of(line, theme.ground().background())).isGreaterThanOrEqualTo(GRAPHICS);
        }
    }

    @ParameterizedTest
    @MethodSource("themes")
    void contoursStandOutFromTheirCasing(PlotTheme theme) {
        assertThat(Contrast.of(theme.ink().text(), theme.ground().background())).isGreaterThanOrEqualTo(GRAPHICS);
    }

    @ParameterizedTest
    @EnumSource(Vision.class)
    void eightColoursOfTheDarkThemeAreApartForAllEyes(Vision vision) {
        for (int i = 0; i < 8; i++) {
            for (int j = 0; j < i; j++) {
                int one = PlotTheme.DARK.seriesRgb(i);
                assertThat(vision.distance(one, PlotTheme.DARK.seriesRgb(j))).isGreaterThan(0.1);
            }
        }
    }

    /** Own past output: files look as they always did. */
    @Test
    void lightThemeKeepsItsColours() {
        PlotTheme light = PlotTheme.LIGHT;
        assertThat(Stream.of(
                        light.ink().text(),
                        light.ink().soft(),
                        light.ink().hatch(),
                        light.ink().grid()))
                .containsExactly(new Color(0x1f2328), new Color(0x50575e), new Color(0xb4b9bf), new Color(0xe2e4e7));
        assertThat(light.ground().background()).isEqualTo(Color.WHITE);
        assertThat(light.veil()).isEqualTo(new Color(0xff, 0xff, 0xff, 0x73));
        assertThat(light.mapHatch()).isEqualTo(new Color(0x1f, 0x23, 0x28, 0x88));
    }

    static Stream<String> kinds() {
        return SamplePictures.all().keySet().stream();
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void chartIsLightUnlessAskedOtherwise(String kind) {
        Picture picture = SamplePictures.all().get(kind);
        assertThat(SvgText.of(picture, picture.chart())).isEqualTo(SvgText.of(picture, picture.chart(PlotTheme.LIGHT)));
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void darkPicturesHaveNoColourOfTheLightOnes(String kind) {
        Picture picture = SamplePictures.all().get(kind);
        String dark = new String(SvgText.of(picture, picture.chart(PlotTheme.DARK)), StandardCharsets.UTF_8)
                .toLowerCase(Locale.ROOT);
        assertThat(dark).contains(written(PlotTheme.DARK.ground().background()));
        assertThat(dark).doesNotContain("fill=\"white\"", "fill:white", "stroke=\"white\"", "stroke:white");
        PlotTheme light = PlotTheme.LIGHT;
        for (Color colour :
                List.of(light.ink().text(), light.ink().soft(), light.ground().background())) {
            assertThat(dark).doesNotContain(written(colour));
        }
    }

    private static String written(Color colour) {
        return "rgb(" + colour.getRed() + "," + colour.getGreen() + "," + colour.getBlue() + ")";
    }
}

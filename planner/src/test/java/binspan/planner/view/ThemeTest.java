package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.view.Theme.Palette;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import javafx.scene.paint.Color;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * Colours of the themes. Contrast: W3C, Web Content Accessibility Guidelines 2.1, success criterion 1.4.3 (4.5:1 for text of
 * ordinary size) with its definitions of "relative luminance" and "contrast ratio".
 */
class ThemeTest {
    private static final double ENOUGH = 4.5;
    private static final Pattern COLOUR = Pattern.compile("(-[a-z-]+):\\s*(#[0-9a-f]{6,8});");
    private static final List<String> TEXTS = List.of("-ink", "-soft", "-good", "-bad", "-warn", "-accent");
    private static final List<String> WITH_GROUND = List.of("-good", "-bad", "-warn", "-accent");

    private static Map<String, Color> sheet(Theme theme) {
        try (InputStream in = Theme.class.getResourceAsStream(theme.text() + ".css")) {
            Map<String, Color> colours = new LinkedHashMap<>();
            COLOUR.matcher(new String(in.readAllBytes(), StandardCharsets.UTF_8))
                    .results()
                    .forEach(match -> colours.put(match.group(1), Color.web(match.group(2))));
            return colours;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static double contrast(Color one, Color other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(Color colour) {
        return 0.2126 * linear(colour.getRed())
                + 0.7152 * linear(colour.getGreen())
                + 0.0722 * linear(colour.getBlue());
    }

    private static double linear(double channel) {
        return channel <= 0.04045 ? channel / 12.92 : Math.pow((channel + 0.055) / 1.055, 2.4);
    }

    /** The guidelines: black on white is 21:1; #767676 is the lightest grey that white text may stand on (common practice). */
    @Test
    void contrastIsThatOfTheGuidelines() {
        assertThat(contrast(Color.BLACK, Color.WHITE)).isEqualTo(21.0);
        assertThat(contrast(Color.web("#767676"), Color.WHITE)).isBetween(4.5, 4.6);
        assertThat(contrast(Color.web("#777777"), Color.WHITE)).isBetween(4.4, 4.5);
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void textsStandOutOnPanelAndGround(Theme theme) {
        Map<String, Color> colours = sheet(theme);
        for (String text : TEXTS) {
            for (String ground : List.of("-panel", "-ground")) {
                assertThat(contrast(colours.get(text), colours.get(ground)))
                        .as("%s on %s, %s", text, ground, theme)
                        .isGreaterThanOrEqualTo(ENOUGH);
            }
        }
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void signalColoursStandOutOnTheirOwnGroundAndInkOnAllOfThem(Theme theme) {
        Map<String, Color> colours = sheet(theme);
        for (String text : WITH_GROUND) {
            Color ground = colours.get(text + "-ground");
            assertThat(contrast(colours.get(text), ground))
                    .as("%s, %s", text, theme)
                    .isGreaterThanOrEqualTo(ENOUGH);
            assertThat(contrast(colours.get("-ink"), ground))
                    .as("ink on %s-ground, %s", text, theme)
                    .isGreaterThanOrEqualTo(ENOUGH);
        }
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void whatIsDrawnHasTheColoursOfTheSheet(Theme theme) {
        Map<String, Color> colours = sheet(theme);
        Palette palette = theme.palette();
        assertThat(palette.window()).isEqualTo(colours.get("-ground"));
        assertThat(palette.panel()).isEqualTo(colours.get("-panel"));
        assertThat(palette.ink()).isEqualTo(colours.get("-ink"));
        assertThat(palette.soft()).isEqualTo(colours.get("-soft"));
        assertThat(palette.accent()).isEqualTo(colours.get("-accent"));
        assertThat(palette.good()).isEqualTo(colours.get("-good"));
        assertThat(palette.bad()).isEqualTo(colours.get("-bad"));
        assertThat(palette.warn()).isEqualTo(colours.get("-warn"));
    }

    /** Faint lines of drawings are fainter than the borders of controls, and both are weaker than any text. */
    @ParameterizedTest
    @EnumSource(Theme.class)
    void gridIsFainterThanBordersAndBothThanTexts(Theme theme) {
        Map<String, Color> colours = sheet(theme);
        Color panel = colours.get("-panel");
        double grid = contrast(theme.palette().grid(), panel);
        double line = contrast(colours.get("-line"), panel);
        assertThat(grid).isGreaterThan(1.2).isLessThanOrEqualTo(line);
        assertThat(line).isLessThan(contrast(colours.get("-soft"), panel));
    }

    @Test
    void bothSheetsNameTheSameColours() {
        assertThat(sheet(Theme.DARK).keySet().stream().filter(name -> !name.startsWith("-fx")))
                .containsExactlyElementsOf(sheet(Theme.LIGHT).keySet().stream()
                        .filter(name -> !name.startsWith("-fx"))
                        .toList());
    }

    @Test
    void namesOfThemesAreReadBackAndOthersAreLight() {
        for (Theme theme : Theme.values()) {
            assertThat(Theme.of(theme.text())).isSameAs(theme);
        }
        assertThat(Theme.of("plaid")).isSameAs(Theme.LIGHT);
    }
}
